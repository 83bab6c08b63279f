package org.wellwright.editor.edit;

import java.util.List;
import java.util.stream.Collectors;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelCheck;
import org.wellwright.solver.model.ModelDocument;

/**
 * What is wrong in a document, by place. Immutable.
 *
 * @param problems the faults, whose places start with a JSON pointer
 */
public record Faults(List<Problem> problems) {
    /** Copies the list. */
    public Faults {
        problems = List.copyOf(problems);
    }

    /** The faults of a document. */
    public static Faults of(ModelDocument document) {
        return new Faults(ModelCheck.problems(document));
    }

    /** What is wrong at a place or below it, in one line; empty if nothing is. */
    public String at(String pointer) {
        return problems.stream()
                .filter(problem -> under(problem.where(), pointer))
                .map(problem -> sentence(problem, pointer))
                .distinct()
                .collect(Collectors.joining(" · "));
    }

    private static boolean under(String where, String pointer) {
        return where.startsWith(pointer)
                && (where.length() == pointer.length() || "/,".indexOf(where.charAt(pointer.length())) >= 0);
    }

    /** The pointer says nothing to someone who looks at the place; a column in a formula does. */
    private static String sentence(Problem problem, String pointer) {
        int comma = problem.where().indexOf(", ", pointer.length());
        String detail = comma < 0 ? "" : problem.where().substring(comma + 2);
        return new Problem(problem.what(), detail, problem.remedy()).sentence();
    }
}
