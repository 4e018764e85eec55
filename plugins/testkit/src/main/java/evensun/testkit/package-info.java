/** The testkit part of the plugins. */
package evensun.testkit;
