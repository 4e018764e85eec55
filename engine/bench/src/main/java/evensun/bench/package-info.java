/**
 * Benchmarks of the thin-film solver, with JMH; those of the search are in {@code
 * evensun.bench.search}.
 *
 * <p>From the top of the project:
 *
 * <pre>
 * mvn -q -Pbench -Dquick -pl engine/bench -am package -DskipTests
 * java -jar engine/bench/target/benchmarks.jar [REGEX] [--forks N] [--seconds S]
 * </pre>
 *
 * <p>prints µs per evaluation, ns per layer and wavelength, and bytes allocated per evaluation.
 * Timings of one JVM are no evidence, since code placement and inlining vary: each benchmark runs
 * in fresh ones, and the median over all their measurements is shown beside the smallest.
 */
package evensun.bench;
