/**
 * Benchmarks of what an evaluation's hours go to, on the vector kernels and on the plain ones. Nothing here is part of
 * the tool, and no test depends on a figure of it. What must be right is tested beside the code that it measures.
 *
 * <p>To run: {@code mvn -q -pl engine/bench -am -DskipTests package}, then {@code java -jar
 * engine/bench/target/nearlimit-bench.jar}, with a part of a benchmark's name to run that alone.
 */
package dev.nearlimit.bench;
