package org.wellwright.project.file;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.Problem;

/** Collects the faults of one file, each with its pointer and line, so that a user sees them together. */
final class Faults {
    /** After so many the rest is not listed. */
    static final int MOST = 20;

    private final String file;
    private final JsonDocument document;
    private final List<Problem> problems = new ArrayList<>();

    Faults(String file, JsonDocument document) {
        this.file = file;
        this.document = document;
    }

    /** Thrown to leave an item whose fault has been noted. */
    static final class Noted extends RuntimeException {
        private static final long serialVersionUID = 1L;

        Noted() {
            super(null, null, false, false);
        }
    }

    /** Notes a fault and returns what to throw where reading cannot go on. */
    Noted note(String pointer, String what, String remedy) {
        if (problems.size() < MOST) {
            problems.add(new Problem(what, where(pointer), remedy));
        }
        return new Noted();
    }

    /** File, line and pointer of a place. */
    String where(String pointer) {
        return file + " line " + document.line(pointer) + (pointer.isEmpty() ? "" : " at " + pointer);
    }

    /** Throws if anything was noted. */
    void check() {
        if (!problems.isEmpty()) {
            throw new ProjectFileException(problems);
        }
    }
}
