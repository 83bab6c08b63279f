package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/** An application folder as packaged, or a copy of it from which something was taken away. */
final class PackagedApplication {
    private static final long PATIENCE_SECONDS = 180;

    private final Path folder;

    private PackagedApplication(Path folder) {
        this.folder = folder;
    }

    /** What a process left behind. */
    record Outcome(int status, String output, String errors) {}

    /** The folder that the build has just made. */
    static PackagedApplication built() {
        Path folder = Path.of("target/wellwright").toAbsolutePath();
        assertThat(folder.resolve("bin/wellwright"))
                .as("run the phase package first")
                .exists();
        return new PackagedApplication(folder);
    }

    /** A copy made of hard links, so it costs no space; deleting in it leaves the original whole. */
    PackagedApplication copyTo(Path target) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            for (Path file : (Iterable<Path>) files::iterator) {
                Path copy = target.resolve(folder.relativize(file).toString());
                if (Files.isDirectory(file)) {
                    Files.createDirectories(copy);
                } else {
                    linkOrCopy(file, copy);
                }
            }
        }
        return new PackagedApplication(target);
    }

    private static void linkOrCopy(Path file, Path copy) throws IOException {
        try {
            Files.createLink(copy, file);
        } catch (UnsupportedOperationException | java.nio.file.FileSystemException otherDisk) {
            Files.copy(file, copy, java.nio.file.StandardCopyOption.COPY_ATTRIBUTES);
        }
    }

    Path folder() {
        return folder;
    }

    /** Runs {@code bin/wellwright-batch} with these arguments, without a display. */
    Outcome batch(Path scratch, String... arguments) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>();
        command.add(folder.resolve("bin/wellwright-batch").toString());
        command.addAll(List.of(arguments));
        ProcessBuilder process = new ProcessBuilder(command);
        process.environment().remove("DISPLAY");
        return run(process, scratch);
    }

    static Outcome run(ProcessBuilder process, Path scratch) throws IOException, InterruptedException {
        Path output = Files.createTempFile(scratch, "output", ".txt");
        Path errors = Files.createTempFile(scratch, "errors", ".txt");
        Process running = process.redirectInput(ProcessBuilder.Redirect.from(new java.io.File("/dev/null")))
                .redirectOutput(output.toFile())
                .redirectError(errors.toFile())
                .start();
        boolean ended = running.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS);
        if (!ended) {
            running.descendants().forEach(ProcessHandle::destroyForcibly);
            running.destroyForcibly();
        }
        assertThat(ended)
                .as("ended within %d s; errors: %s", PATIENCE_SECONDS, read(errors))
                .isTrue();
        return new Outcome(running.exitValue(), read(output), read(errors));
    }

    private static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }
}
