package org.wellwright.solver.potential.formula;

import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.potential.FormulaFault;

/**
 * Carries the first fault out of the parser; callers see it as a {@link FormulaFault} or an
 * {@link InvalidModelException}.
 */
final class FaultyFormula extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final int start;
    private final int end;
    private final String remedy;

    FaultyFormula(int start, int end, String what, String remedy) {
        super(what, null, false, false);
        this.start = start;
        this.end = Math.max(start, end);
        this.remedy = remedy;
    }

    FormulaFault in(String text) {
        return new FormulaFault(start, end, new Problem(getMessage(), place(text, start), remedy));
    }

    /** "column N", in a text of several lines "line L, column N"; both from 1. */
    static String place(String text, int index) {
        if (text.indexOf('\n') < 0) {
            return "column " + (index + 1);
        }
        String before = text.substring(0, index);
        long line = before.chars().filter(c -> c == '\n').count() + 1;
        return "line %d, column %d".formatted(line, index - before.lastIndexOf('\n'));
    }
}
