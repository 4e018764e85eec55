/**
 * How well and how fast the search finds the best design: on the standard test functions of global
 * optimisation and on real stacks, beside two other methods that may evaluate as often.
 *
 * <p>{@code java -jar engine/bench/target/benchmarks.jar search} prints the tables of
 * DEVELOPERS.md.
 */
package evensun.bench.search;
