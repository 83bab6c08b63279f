package org.wellwright.solver.potential;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.openide.util.Lookup;

/**
 * Formulas as text: parsing, faults with columns, pieces for colouring, completion.
 *
 * <p>A formula is an expression in r (the separation), l (the channel's orbital quantum number), pi, numbers such as
 * {@code 1e-3} and parameters, which are all other names; {@code b[0]} is an indexed one. Operators by falling
 * precedence: {@code ^} (from the right; {@code -r^2} is −(r²)), {@code * /}, {@code + -}. {@code log} and {@code ln}
 * are both natural. {@code sum(i, 0, 7, b[i]*r^i)} adds terms. Lines {@code name = expression} may come before the last
 * one, separated by line breaks or semicolons. A formula has at most 10,000 characters and 200 nested parentheses.
 */
public final class FormulaText {
    private FormulaText() {}

    private static FormulaLanguage language() {
        FormulaLanguage language = Lookup.getDefault().lookup(FormulaLanguage.class);
        if (language == null) {
            throw new IllegalStateException("no formula language is registered");
        }
        return language;
    }

    /**
     * The formula that a text says.
     *
     * @throws org.wellwright.solver.InvalidModelException at the first fault; its {@code where} is "column N", or "line
     *     L, column N" in a text of several lines
     */
    public static Formula parse(String text) {
        return language().parse(text);
    }

    /** The first fault of a text, if it has one. */
    public static Optional<FormulaFault> fault(String text) {
        return language().fault(text);
    }

    /** The pieces of a text in order, faulty ones included; blanks belong to none. */
    public static List<FormulaToken> tokens(String text) {
        return language().tokens(text);
    }

    /**
     * The words that could stand where the caret is.
     *
     * @param caret index between two characters, 0 to the length of the text
     * @param parameters names of the pool, offered beside the language's own
     * @return those that begin like the word before the caret, shortest first; all of them if there is none
     */
    public static List<FormulaWord> completions(String text, int caret, List<String> parameters) {
        int start = caret;
        while (start > 0 && (Character.isLetterOrDigit(text.charAt(start - 1)) || text.charAt(start - 1) == '_')) {
            start--;
        }
        String begun = text.substring(start, caret);
        if (!begun.isEmpty() && Character.isDigit(begun.charAt(0))) {
            return List.of();
        }
        Map<String, FormulaWord> found = new LinkedHashMap<>();
        for (String parameter : parameters) {
            if (parameter.startsWith(begun)) {
                found.put(parameter, new FormulaWord(parameter, "parameter"));
            }
        }
        for (FormulaWord word : language().words()) {
            if (word.text().startsWith(begun)) {
                found.putIfAbsent(word.text(), word);
            }
        }
        List<FormulaWord> sorted = new ArrayList<>(found.values());
        sorted.sort(Comparator.comparingInt((FormulaWord word) -> word.text().length())
                .thenComparing(FormulaWord::text));
        return List.copyOf(sorted);
    }
}
