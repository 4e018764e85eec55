/** The laws as JUnit tests; needs JUnit 5 on the class path, which the laws themselves do not. */
package evensun.testkit.junit;
