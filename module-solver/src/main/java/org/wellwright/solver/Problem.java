package org.wellwright.solver;

import java.util.Objects;

/**
 * One fault in a user's words: what is wrong, where, and how to mend it.
 *
 * @param what what is wrong, without a full stop ("the unit 'eW' is not known")
 * @param where the place: file and JSON pointer, line, column, channel; empty if there is none
 * @param remedy what the user can do, without a full stop ("use one of eV, meV, cm^-1"); empty if there is none
 */
public record Problem(String what, String where, String remedy) {
    /** Checks that no part is missing. */
    public Problem {
        Objects.requireNonNull(what, "what");
        Objects.requireNonNull(where, "where");
        Objects.requireNonNull(remedy, "remedy");
    }

    /** One line: place, fault, remedy; line breaks inside the parts become spaces. */
    public String sentence() {
        StringBuilder line = new StringBuilder();
        if (!where.isEmpty()) {
            line.append(where).append(": ");
        }
        line.append(what);
        if (!remedy.isEmpty()) {
            line.append("; ").append(remedy);
        }
        return line.toString().replaceAll("\\s*\\R\\s*", " ");
    }
}
