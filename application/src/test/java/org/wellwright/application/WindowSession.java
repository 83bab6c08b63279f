package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javax.imageio.ImageIO;

/**
 * One user's window: a user directory of its own and a folder for scripts and what they write. Each {@link #play}
 * starts the packaged application with the driver, runs a script to its {@code exit}, and checks what must hold after
 * every run: status 0, nothing on standard error, no warning in the log.
 */
final class WindowSession {
    private static final int KILLED = 9;

    private final PackagedApplication application;
    private final VirtualDisplay display;
    private final Path folder;

    WindowSession(PackagedApplication application, VirtualDisplay display, Path folder, Path... moreClusters)
            throws IOException {
        this.application = application;
        this.display = display;
        this.folder = folder;
        List<String> clusters = new ArrayList<>();
        clusters.add(cluster("driver"));
        for (Path cluster : moreClusters) {
            clusters.add(cluster.toString());
        }
        Path configuration = Files.createDirectories(userdir().resolve("etc"));
        Files.writeString(
                configuration.resolve("wellwright.conf"),
                "extra_clusters=\"%s\"%n".formatted(String.join(":", clusters)));
    }

    /** Where the build of one of the nested modules left its cluster. */
    static String cluster(String name) {
        Path cluster = Path.of(name, "target", "nbm", "clusters", name).toAbsolutePath();
        assertThat(cluster).exists();
        return cluster.toString();
    }

    Path userdir() {
        return folder.resolve("userdir");
    }

    /** Plays a script; see the driver's commands. {@code exit 0} is added. */
    void play(String... lines) throws IOException, InterruptedException {
        playOn(new String[0], lines);
    }

    /** Plays a script in a window that was started with files of this session's folder on its command line. */
    void playOn(String[] files, String... lines) throws IOException, InterruptedException {
        PackagedApplication.Outcome outcome = run(files, "exit 0", lines);
        String log = Files.exists(log()) ? Files.readString(log()) : "no log";
        assertThat(outcome.status())
                .as("status; steps: %s; errors: %s", steps(), outcome.errors())
                .isZero();
        assertThat(outcome.errors()).as("standard error").isEmpty();
        assertThat(log.lines().filter(line -> line.startsWith("WARNING") || line.startsWith("SEVERE")))
                .as("warnings in the log")
                .isEmpty();
        assertThat(log).doesNotContain("Exception");
    }

    /** Plays a script and then kills the process. */
    void playToTheKill(String[] files, String... lines) throws IOException, InterruptedException {
        PackagedApplication.Outcome outcome = run(files, "halt " + KILLED, lines);
        assertThat(outcome.status())
                .as("status; steps: %s; errors: %s", steps(), outcome.errors())
                .isEqualTo(KILLED);
    }

    private PackagedApplication.Outcome run(String[] files, String last, String... lines)
            throws IOException, InterruptedException {
        List<String> script = new ArrayList<>(List.of(lines));
        script.add(last);
        Path file = Files.write(folder.resolve("script.txt"), script);
        Files.deleteIfExists(folder.resolve("script.txt.log"));
        List<String> command = new ArrayList<>(List.of(
                application.folder().resolve("bin/wellwright").toString(),
                "--userdir",
                userdir().toString(),
                "--ui-script",
                file.toString()));
        for (String name : files) {
            command.add(folder.resolve(name).toString());
        }
        ProcessBuilder process = new ProcessBuilder(command);
        process.environment().put("DISPLAY", display.name());
        return PackagedApplication.run(process, folder);
    }

    /** The lines that a step of the last script wrote into a file. */
    List<String> lines(String name) throws IOException {
        return Files.readAllLines(folder.resolve(name));
    }

    BufferedImage picture(String name) throws IOException {
        Path kept = Files.createDirectories(Path.of("target/screenshots")).resolve(folder.getFileName() + "-" + name);
        Files.copy(folder.resolve(name), kept, java.nio.file.StandardCopyOption.REPLACE_EXISTING);
        return ImageIO.read(folder.resolve(name).toFile());
    }

    private Path log() {
        return userdir().resolve("var/log/messages.log");
    }

    private String steps() throws IOException {
        Path steps = folder.resolve("script.txt.log");
        return Files.exists(steps) ? Files.readString(steps) : "none";
    }
}
