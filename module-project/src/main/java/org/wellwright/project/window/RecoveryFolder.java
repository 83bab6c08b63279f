package org.wellwright.project.window;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Properties;
import org.wellwright.project.Project;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.project.file.SafeFile;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;

/**
 * Unsaved changes of open projects, kept in a folder of the user so that a crash costs at most the last seconds. Each
 * project has two files there: its text, and what it belongs to. An entry is removed when its project is saved or
 * closed; what is left at a start is what a crash left.
 */
final class RecoveryFolder {
    private static final String ABOUT = ".about";

    private final Path folder;

    RecoveryFolder(Path folder) {
        this.folder = folder;
    }

    /**
     * Unsaved changes that were kept.
     *
     * @param id name of the entry
     * @param title name of the project on screen
     * @param file where it is saved, if it ever was
     * @param time when the changes were kept
     */
    record Entry(String id, String title, Optional<Path> file, Instant time) {}

    /**
     * Keeps the present state of a project.
     *
     * @throws WellwrightException if it cannot be written
     */
    void keep(String id, Project project, String title, Optional<Path> file, Instant now) {
        try {
            Files.createDirectories(folder);
            Properties about = new Properties();
            about.setProperty("title", title);
            about.setProperty("time", now.toString());
            file.ifPresent(path -> about.setProperty("file", path.toString()));
            StringWriter text = new StringWriter();
            about.store(text, null);
            SafeFile.replace(
                    folder.resolve(id + ProjectFile.ENDING),
                    ProjectFile.text(project).getBytes(StandardCharsets.UTF_8),
                    false);
            SafeFile.replace(folder.resolve(id + ABOUT), text.toString().getBytes(StandardCharsets.UTF_8), false);
        } catch (IOException e) {
            throw new WellwrightException(
                    new Problem(
                            "unsaved changes cannot be kept: " + SafeFile.reason(e),
                            folder.toString(),
                            "save the project"),
                    e);
        }
    }

    /** Forgets an entry, if there is one. */
    void forget(String id) {
        for (String ending : List.of(ABOUT, ProjectFile.ENDING)) {
            try {
                Files.deleteIfExists(folder.resolve(id + ending));
            } catch (IOException e) {
                // It will be offered at the next start, which loses nothing.
                continue;
            }
        }
    }

    /** What is kept, oldest first. */
    List<Entry> entries() {
        List<Entry> entries = new ArrayList<>();
        if (!Files.isDirectory(folder)) {
            return entries;
        }
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*" + ABOUT)) {
            for (Path file : files) {
                String name = file.getFileName().toString();
                entry(file, name.substring(0, name.length() - ABOUT.length())).ifPresent(entries::add);
            }
        } catch (IOException e) {
            return List.of();
        }
        entries.sort(Comparator.comparing(Entry::time));
        return entries;
    }

    private Optional<Entry> entry(Path file, String id) {
        Properties about = new Properties();
        try (InputStream in = Files.newInputStream(file)) {
            about.load(new InputStreamReader(in, StandardCharsets.UTF_8));
            if (!Files.exists(folder.resolve(id + ProjectFile.ENDING))) {
                return Optional.empty();
            }
            return Optional.of(new Entry(
                    id,
                    about.getProperty("title", ""),
                    Optional.ofNullable(about.getProperty("file")).map(Path::of),
                    Instant.parse(about.getProperty("time", ""))));
        } catch (IOException | DateTimeParseException | IllegalArgumentException e) {
            // A torn note: the project beside it is of no use without knowing whose it is.
            return Optional.empty();
        }
    }

    /**
     * The project of an entry.
     *
     * @throws WellwrightException if it cannot be read
     */
    Project project(Entry entry) {
        return ProjectFile.read(folder.resolve(entry.id() + ProjectFile.ENDING));
    }
}
