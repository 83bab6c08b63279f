package org.wellwright.solver.potential.formula;

/**
 * A word of a formula's text.
 *
 * @param kind what it looks like
 * @param text its characters; for an operator the plain form ("-" also for the sign U+2212)
 * @param start index of its first character, from 0
 * @param end index after its last character
 */
record Lexeme(Kind kind, String text, int start, int end) {
    enum Kind {
        NUMBER,
        NAME,
        /** One character: an operator, a parenthesis, a bracket, a comma, an equals sign. */
        SIGN,
        /** A semicolon or the end of a line. */
        SEPARATOR,
        END,
        /** A character that means nothing. */
        FAULTY
    }

    boolean is(String sign) {
        return kind == Kind.SIGN && text.equals(sign);
    }
}
