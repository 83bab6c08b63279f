package org.wellwright.bench;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;

/**
 * The whole process of {@code wellwright-batch bound} against a Java program that does nothing: the medians of
 * alternating runs, so that a change of the machine's load meets both.
 */
@ServiceProvider(service = Benchmark.class, position = 100)
public final class StartBenchmark implements Benchmark {
    private static final int PAIRS = 9;

    @Override
    public String name() {
        return "start";
    }

    @Override
    public void run(Path csv, PrintStream out) throws IOException, InterruptedException {
        Path scratch = Files.createTempDirectory("start");
        Files.createDirectories(scratch.resolve("org/wellwright/bench"));
        try (var code = Nothing.class.getResourceAsStream("Nothing.class")) {
            Files.copy(code, scratch.resolve("org/wellwright/bench/Nothing.class"));
        }
        List<String> ours = List.of(
                Path.of("target/wellwright/bin/wellwright-batch")
                        .toAbsolutePath()
                        .toString(),
                "bound",
                "--formula",
                "-1/r",
                "--kinetic",
                "0.5",
                "--l",
                "0..3",
                "--count",
                "5",
                "--format",
                "json");
        List<String> empty = List.of("java", "-cp", scratch.toString(), Nothing.class.getName());
        double[] oursMillis = new double[PAIRS];
        double[] emptyMillis = new double[PAIRS];
        for (int i = 0; i < PAIRS; i++) {
            emptyMillis[i] = millis(empty);
            oursMillis[i] = millis(ours);
        }
        double ratio = median(oursMillis) / median(emptyMillis);
        out.printf(
                "bound %.0f ms, empty Java program %.0f ms, ratio %.2f%n",
                median(oursMillis), median(emptyMillis), ratio);
        Files.write(
                csv,
                List.of(
                        "command,ours_ms,empty_ms,ratio",
                        "bound,%.1f,%.1f,%.3f".formatted(median(oursMillis), median(emptyMillis), ratio)));
    }

    private static double millis(List<String> command) throws IOException, InterruptedException {
        long start = System.nanoTime();
        Process process = new ProcessBuilder(command)
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start();
        int status = process.waitFor();
        double millis = (System.nanoTime() - start) / 1e6;
        if (status != 0) {
            throw new IllegalStateException(command + " ended with status " + status);
        }
        return millis;
    }

    private static double median(double[] values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        return sorted[sorted.length / 2];
    }
}
