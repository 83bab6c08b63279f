package org.wellwright.application;

import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;

/**
 * A private X display from Xvfb, which chooses a free number itself. Where Xvfb is missing the test is skipped, but
 * fails where {@code CI} is set: a build that counts must not do without its window tests.
 */
final class VirtualDisplay implements AutoCloseable {
    private final Process server;
    private final String name;

    private VirtualDisplay(Process server, String name) {
        this.server = server;
        this.name = name;
    }

    static VirtualDisplay open(int width, int height) throws IOException {
        boolean present = Arrays.stream(System.getenv("PATH").split(":"))
                .anyMatch(folder -> Files.isExecutable(Path.of(folder, "Xvfb")));
        if (System.getenv("CI") == null) {
            assumeTrue(present, "Xvfb is not installed");
        }
        Process server = new ProcessBuilder(
                        "Xvfb", "-displayfd", "1", "-screen", "0", width + "x" + height + "x24", "-nolisten", "tcp")
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        BufferedReader answer =
                new BufferedReader(new InputStreamReader(server.getInputStream(), StandardCharsets.US_ASCII));
        String number = answer.readLine();
        if (number == null) {
            throw new IOException("Xvfb ended without a display");
        }
        return new VirtualDisplay(server, ":" + number.trim());
    }

    /** As in the variable DISPLAY. */
    String name() {
        return name;
    }

    @Override
    public void close() {
        server.destroy();
    }
}
