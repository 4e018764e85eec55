/**
 * The laws that every solver of the contract obeys, as plain Java: each has a name, a promise, and
 * a check that ends with the smallest case that breaks it.
 */
package evensun.testkit;
