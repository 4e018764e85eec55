/** The external-process part of the plugins. */
package evensun.externalprocess;
