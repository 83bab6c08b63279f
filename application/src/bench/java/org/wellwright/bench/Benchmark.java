package org.wellwright.bench;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Path;

/** What one area measures. Registered with {@code @ServiceProvider(service = Benchmark.class, position = …)}. */
public interface Benchmark {
    /** The area's name; its figures are in {@code NAME.csv}. */
    String name();

    /**
     * Measures, prints a table and writes the file.
     *
     * @param csv the file to write
     * @param out where the table goes
     */
    void run(Path csv, PrintStream out) throws IOException, InterruptedException;
}
