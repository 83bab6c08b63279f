package org.wellwright.solver.potential;

/**
 * A piece of a formula's text, for colouring.
 *
 * @param kind what it is
 * @param start index of its first character, from 0
 * @param end index after its last character
 */
public record FormulaToken(Kind kind, int start, int end) {
    /** What a piece of a formula is. */
    public enum Kind {
        /** A number. */
        NUMBER,
        /** The radius r. */
        RADIUS,
        /** A parameter, or l. */
        PARAMETER,
        /** The name of an intermediate line, or the index of a sum. */
        LOCAL,
        /** A function. */
        FUNCTION,
        /** A named constant such as pi. */
        CONSTANT,
        /** + − * / ^ = */
        OPERATOR,
        /** Parentheses, brackets, commas, semicolons. */
        PUNCTUATION,
        /** What the language does not know. */
        FAULTY
    }
}
