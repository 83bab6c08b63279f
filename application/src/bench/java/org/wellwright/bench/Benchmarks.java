package org.wellwright.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collection;
import java.util.List;
import org.openide.util.Lookup;

/** Runs all benchmarks, or those named: {@code Benchmarks FOLDER [NAME…]}. */
public final class Benchmarks {
    private Benchmarks() {}

    /** The first argument is the folder for the files. */
    public static void main(String[] arguments) throws IOException, InterruptedException {
        Path folder = Files.createDirectories(Path.of(arguments[0]));
        Collection<? extends Benchmark> all = Lookup.getDefault().lookupAll(Benchmark.class);
        if (all.isEmpty()) {
            throw new IllegalStateException("no benchmark is registered");
        }
        for (Benchmark benchmark : all) {
            if (arguments.length == 1 || List.of(arguments).contains(benchmark.name())) {
                System.out.println("== " + benchmark.name());
                benchmark.run(folder.resolve(benchmark.name() + ".csv"), System.out);
            }
        }
    }
}
