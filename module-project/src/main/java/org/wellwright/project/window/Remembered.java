package org.wellwright.project.window;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.prefs.BackingStoreException;
import java.util.prefs.Preferences;
import org.openide.util.NbPreferences;
import org.wellwright.project.ProjectSession;

/** What is remembered from one start to the next: recent files, the projects that were open, and the selected one. */
final class Remembered {
    static final int MOST_RECENT = 12;

    private final Preferences preferences;

    Remembered() {
        this(NbPreferences.forModule(Remembered.class));
    }

    Remembered(Preferences preferences) {
        this.preferences = preferences;
    }

    /** Files that were open, latest first. */
    List<Path> recent() {
        return read("recent");
    }

    /** Puts a file in front of the recent ones. */
    void used(Path file) {
        List<Path> files = new ArrayList<>(recent());
        files.remove(file);
        files.add(0, file);
        write("recent", files.subList(0, Math.min(MOST_RECENT, files.size())));
    }

    /** Takes a file away from the recent ones. */
    void gone(Path file) {
        List<Path> files = new ArrayList<>(recent());
        files.remove(file);
        write("recent", files);
    }

    void forgetRecent() {
        write("recent", List.of());
    }

    /** The files that were open at the end. */
    List<Path> open() {
        return read("open");
    }

    /** The file that was selected at the end. */
    Optional<Path> selected() {
        return read("selected").stream().findFirst();
    }

    /** Notes what is open; projects that are in no file cannot be opened again. */
    void note(List<ProjectSession> open, Optional<ProjectSession> selected) {
        write("open", open.stream().flatMap(session -> session.file().stream()).toList());
        write("selected", selected.flatMap(ProjectSession::file).stream().toList());
    }

    private List<Path> read(String key) {
        List<Path> paths = new ArrayList<>();
        for (String line : preferences.get(key, "").split("\n")) {
            try {
                if (!line.isBlank()) {
                    paths.add(Path.of(line));
                }
            } catch (InvalidPathException e) {
                // Somebody edited the preferences; the line is lost, the others are not.
                continue;
            }
        }
        return paths;
    }

    private void write(String key, List<Path> paths) {
        preferences.put(
                key, String.join("\n", paths.stream().map(Path::toString).toList()));
        try {
            preferences.flush();
        } catch (BackingStoreException e) {
            // It is written at the end instead.
            return;
        }
    }
}
