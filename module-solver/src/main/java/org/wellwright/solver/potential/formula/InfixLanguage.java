package org.wellwright.solver.potential.formula;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.Formula;
import org.wellwright.solver.potential.FormulaFault;
import org.wellwright.solver.potential.FormulaLanguage;
import org.wellwright.solver.potential.FormulaToken;
import org.wellwright.solver.potential.FormulaToken.Kind;
import org.wellwright.solver.potential.FormulaWord;

/** The built-in language, described at {@link org.wellwright.solver.potential.FormulaText}. */
@ServiceProvider(service = FormulaLanguage.class)
public final class InfixLanguage implements FormulaLanguage {
    /** The language; has no state. */
    public InfixLanguage() {}

    @Override
    public Formula parse(String text) {
        return parse(text, List.of());
    }

    /**
     * A formula whose names begin with the given ones, used or not, in that order.
     *
     * @throws InvalidModelException at the first fault
     */
    public Formula parse(String text, List<String> names) {
        try {
            return new ParsedFormula(text, FormulaParser.parse(text, names));
        } catch (FaultyFormula fault) {
            throw new InvalidModelException(fault.in(text).problem());
        }
    }

    @Override
    public Optional<FormulaFault> fault(String text) {
        try {
            FormulaParser.parse(text);
            return Optional.empty();
        } catch (FaultyFormula fault) {
            return Optional.of(fault.in(text));
        }
    }

    @Override
    public List<FormulaToken> tokens(String text) {
        List<Lexeme> words = Lexer.split(text);
        Set<String> locals = new HashSet<>();
        for (int i = 0; i + 1 < words.size(); i++) {
            boolean isName = words.get(i).kind() == Lexeme.Kind.NAME;
            boolean named = words.get(i + 1).is("=");
            boolean index = i >= 2
                    && words.get(i - 1).is("(")
                    && words.get(i - 2).text().equals("sum");
            if (isName && (named || index)) {
                locals.add(words.get(i).text());
            }
        }
        List<FormulaToken> tokens = new ArrayList<>();
        for (Lexeme word : words) {
            if (word.kind() != Lexeme.Kind.END) {
                tokens.add(new FormulaToken(kind(word, locals), word.start(), word.end()));
            }
        }
        return List.copyOf(tokens);
    }

    private static Kind kind(Lexeme word, Set<String> locals) {
        return switch (word.kind()) {
            case NUMBER -> Kind.NUMBER;
            case SEPARATOR -> Kind.PUNCTUATION;
            case SIGN -> "+-*/^=".contains(word.text()) ? Kind.OPERATOR : Kind.PUNCTUATION;
            case NAME -> nameKind(word.text(), locals);
            default -> Kind.FAULTY;
        };
    }

    private static Kind nameKind(String name, Set<String> locals) {
        if (name.equals("r")) {
            return Kind.RADIUS;
        }
        if (name.equals("pi")) {
            return Kind.CONSTANT;
        }
        if (name.equals("sum") || Operation.function(name).isPresent()) {
            return Kind.FUNCTION;
        }
        return locals.contains(name) ? Kind.LOCAL : Kind.PARAMETER;
    }

    @Override
    public List<FormulaWord> words() {
        List<FormulaWord> words = new ArrayList<>();
        words.add(new FormulaWord("r", "separation of the two bodies"));
        words.add(new FormulaWord("l", "orbital quantum number of the channel"));
        words.add(new FormulaWord("pi", "3.14159..."));
        words.add(new FormulaWord("sum(", "sum(i, first, last, term): adds terms"));
        for (Operation operation : Operation.values()) {
            for (String name : operation.names()) {
                words.add(new FormulaWord(name + "(", operation.meaning()));
            }
        }
        return List.copyOf(words);
    }
}
