/**
 * Measurements of speed, run by the Maven profile {@code bench}, never by the tests.
 *
 * <p>Each area of the application has one {@link org.wellwright.bench.Benchmark}, registered with the Lookup, which
 * prints a table and writes a CSV file. Read {@link org.wellwright.bench.StartBenchmark} as the model.
 */
package org.wellwright.bench;
