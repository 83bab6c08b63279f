package org.wellwright.project.window;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.Project;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.solver.WellwrightException;

/** The example projects that are packaged with the application. */
final class Examples {
    private Examples() {}

    /**
     * One example.
     *
     * @param file its file in the application's folder
     * @param title its title
     * @param note what it is about, the first sentences of its notes
     */
    record Example(Path file, String title, String note) {}

    /** Where they are: beside the platform's folder. */
    static Path folder() {
        return Path.of(System.getProperty("netbeans.home", ".")).resolveSibling("examples");
    }

    /** All of them, by file name; a file that cannot be read is left out. */
    static List<Example> all(Path folder) {
        List<Example> examples = new ArrayList<>();
        if (!Files.isDirectory(folder)) {
            return examples;
        }
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*" + ProjectFile.ENDING)) {
            for (Path file : files) {
                try {
                    Project project = ProjectFile.read(file);
                    examples.add(new Example(file, project.title(), firstSentences(project.notes())));
                } catch (WellwrightException e) {
                    // The user can do nothing about a damaged example, and needs none of them.
                    continue;
                }
            }
        } catch (IOException e) {
            return List.of();
        }
        examples.sort((a, b) -> a.file().compareTo(b.file()));
        return examples;
    }

    /** An example as a project of the user's own: in no file yet, so that the packaged one stays as it is. */
    static Project copy(Example example) {
        return ProjectFile.read(example.file());
    }

    private static String firstSentences(String notes) {
        String text = notes.strip().replaceAll("\\s+", " ");
        if (text.length() <= 220) {
            return text;
        }
        int end = text.lastIndexOf(". ", 220);
        return end > 60 ? text.substring(0, end + 1) : text.substring(0, 219) + "…";
    }
}
