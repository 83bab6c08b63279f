package org.wellwright.project.file;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.wellwright.project.Project;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelCheck;

/** Reads and saves project files. */
public final class ProjectFile {
    /** The ending of a project file's name. */
    public static final String ENDING = ".wellwright";

    private ProjectFile() {}

    /**
     * A project as it was read.
     *
     * @param project the project
     * @param unknown pointers of the members that are kept but not used
     * @param problems what is wrong between the parts of the document, each with line and pointer: names that lead
     *     nowhere, units that do not fit, circular ties
     */
    public record Content(Project project, List<String> unknown, List<Problem> problems) {
        /** Copies the lists. */
        public Content {
            unknown = List.copyOf(unknown);
            problems = List.copyOf(problems);
        }

        /**
         * The project, if its parts fit each other.
         *
         * @throws ProjectFileException with every fault found
         */
        public Project sound() {
            if (!problems.isEmpty()) {
                throw new ProjectFileException(problems.subList(0, Math.min(Faults.MOST, problems.size())));
            }
            return project;
        }
    }

    /**
     * Reads a project. Checks everything that the file says by itself; what refers to something else is checked where
     * it is used.
     *
     * @throws ProjectFileException with every fault found, each with line and JSON pointer
     */
    public static Project read(Path file) {
        return open(file).project();
    }

    /**
     * Reads a project and says what is wrong with it.
     *
     * @throws ProjectFileException if the file itself cannot be used
     */
    public static Content open(Path file) {
        return parse(SafeFile.read(file), file.toString());
    }

    /**
     * Reads a project from a text.
     *
     * @param bytes UTF-8 JSON
     * @param file name for messages
     * @throws ProjectFileException as {@link #read}
     */
    public static Content parse(byte[] bytes, String file) {
        JsonDocument json = JsonParsing.parse(bytes, file);
        Faults faults = new Faults(file, json);
        ObjectIn.Reading reading = new ObjectIn.Reading(faults);
        Project project = null;
        try {
            project = ProjectFormat.read(ObjectIn.root(reading, json.root()), reading);
        } catch (Faults.Noted noted) {
            // check() below throws what was noted.
        }
        faults.check();
        return new Content(
                project, reading.unknownPointers(), located(ModelCheck.problems(project.document()), faults));
    }

    /** The checker says where by pointer, perhaps with a column after a comma. */
    private static List<Problem> located(List<Problem> problems, Faults faults) {
        return problems.stream()
                .map(problem -> {
                    String where = problem.where();
                    int comma = where.indexOf(", ");
                    String pointer = comma < 0 ? where : where.substring(0, comma);
                    return new Problem(
                            problem.what(),
                            faults.where(pointer) + where.substring(pointer.length()),
                            problem.remedy());
                })
                .toList();
    }

    /**
     * Saves a project: writes a new file, forces it to disk, keeps the previous one as NAME.bak and renames.
     *
     * @throws ProjectFileException if it cannot be written; the file is then as before
     */
    public static void save(Path file, Project project) {
        SafeFile.replace(file, text(project).getBytes(StandardCharsets.UTF_8), true);
    }

    /** The text of a project's file; equal projects give equal texts. */
    public static String text(Project project) {
        return JsonWriting.pretty(ProjectFormat.write(project));
    }
}
