package org.wellwright.solver.potential.formula;

import java.util.ArrayList;
import java.util.List;

/** Splits a text into {@link Lexeme}s; never fails. */
final class Lexer {
    private static final String SIGNS = "+-*/^()[],=";
    private static final String CONTINUES = "+-*/^([,=";

    private final String text;
    private final List<Lexeme> found = new ArrayList<>();
    private int depth;

    private Lexer(String text) {
        this.text = text;
    }

    /** The words of a text, an END at its end. A line break inside parentheses or after an operator is a blank. */
    static List<Lexeme> split(String text) {
        return new Lexer(text).run();
    }

    private List<Lexeme> run() {
        int at = 0;
        while (at < text.length()) {
            at = next(at);
        }
        found.add(new Lexeme(Lexeme.Kind.END, "", text.length(), text.length()));
        return found;
    }

    private int next(int start) {
        char c = text.charAt(start);
        if (c == '\n' || c == '\r') {
            if (depth == 0 && !continues()) {
                add(Lexeme.Kind.SEPARATOR, "\n", start, start + 1);
            }
            return start + 1;
        }
        if (Character.isWhitespace(c) || c == '\u00a0') {
            return start + 1;
        }
        if (isDigit(c) || c == '.' && start + 1 < text.length() && isDigit(text.charAt(start + 1))) {
            int end = endOfNumber(start);
            return add(Lexeme.Kind.NUMBER, text.substring(start, end), start, end);
        }
        if (Character.isLetter(c) || c == '_') {
            int end = start;
            while (end < text.length() && (Character.isLetterOrDigit(text.charAt(end)) || text.charAt(end) == '_')) {
                end++;
            }
            return add(Lexeme.Kind.NAME, text.substring(start, end), start, end);
        }
        if (c == ';') {
            return add(Lexeme.Kind.SEPARATOR, ";", start, start + 1);
        }
        char plain = plain(c);
        if (SIGNS.indexOf(plain) >= 0) {
            depth += plain == '(' || plain == '[' ? 1 : plain == ')' || plain == ']' ? -1 : 0;
            return add(Lexeme.Kind.SIGN, String.valueOf(plain), start, start + 1);
        }
        int end = start + Character.charCount(text.codePointAt(start));
        return add(Lexeme.Kind.FAULTY, text.substring(start, end), start, end);
    }

    private int add(Lexeme.Kind kind, String word, int start, int end) {
        found.add(new Lexeme(kind, word, start, end));
        return end;
    }

    /** Whether the last word asks for more. */
    private boolean continues() {
        if (found.isEmpty()) {
            return true;
        }
        Lexeme last = found.get(found.size() - 1);
        return last.kind() == Lexeme.Kind.SEPARATOR
                || last.kind() == Lexeme.Kind.SIGN && CONTINUES.contains(last.text());
    }

    private int endOfNumber(int start) {
        int end = digits(start);
        if (end < text.length() && text.charAt(end) == '.') {
            end = digits(end + 1);
        }
        if (end < text.length() && (text.charAt(end) == 'e' || text.charAt(end) == 'E')) {
            int exponent = end + 1;
            if (exponent < text.length() && (text.charAt(exponent) == '+' || text.charAt(exponent) == '-')) {
                exponent++;
            }
            if (exponent < text.length() && isDigit(text.charAt(exponent))) {
                return digits(exponent);
            }
        }
        return end;
    }

    private int digits(int start) {
        int end = start;
        while (end < text.length() && isDigit(text.charAt(end))) {
            end++;
        }
        return end;
    }

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }

    /** The plain form of typographic signs that come in with pasted text. */
    private static char plain(char c) {
        return switch (c) {
            case '\u2212', '\u2013' -> '-';
            case '\u00b7', '\u00d7', '\u22c5' -> '*';
            case '\u00f7' -> '/';
            default -> c;
        };
    }
}
