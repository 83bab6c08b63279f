package org.wellwright.solver.potential.formula;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Recursive descent over the words of a formula; see {@link org.wellwright.solver.potential.FormulaText} for the
 * language.
 */
final class FormulaParser {
    static final int MAX_LENGTH = 10_000;
    static final int MAX_DEPTH = 200;
    static final Set<String> RESERVED = Set.of("r", "l", "pi", "sum");
    private static final int MAX_STEPS = 200_000;
    private static final int MAX_INDEX = 999;

    private final String text;
    private final List<Lexeme> words;
    private final GraphBuilder graph = new GraphBuilder();
    private final Map<String, Integer> lines = new HashMap<>();
    private final Map<String, Integer> indices = new HashMap<>();
    private int at;
    private int depth;
    private int steps;

    private FormulaParser(String text) {
        this.text = text;
        this.words = Lexer.split(text);
    }

    /**
     * The graph of a text.
     *
     * @throws FaultyFormula at the first fault
     */
    static Graph parse(String text) {
        return parse(text, List.of());
    }

    /** The same with some parameters known beforehand, which come first. */
    static Graph parse(String text, List<String> names) {
        if (text.length() > MAX_LENGTH) {
            throw new FaultyFormula(
                    MAX_LENGTH,
                    text.length(),
                    "the formula has %d characters, the limit is %d".formatted(text.length(), MAX_LENGTH),
                    "shorten it, or split it into several terms");
        }
        FormulaParser parser = new FormulaParser(text);
        for (String name : names) {
            parser.graph.name(name, 0);
        }
        return parser.graph.build(parser.program());
    }

    private int program() {
        while (true) {
            while (peek().kind() == Lexeme.Kind.SEPARATOR) {
                at++;
            }
            if (peek().kind() == Lexeme.Kind.END) {
                throw fault(
                        peek(),
                        words.size() == 1 ? "the formula is empty" : "the last line must be an expression",
                        "write V as a function of r");
            }
            if (peek().kind() == Lexeme.Kind.NAME && words.get(at + 1).is("=")) {
                line();
            } else {
                int value = expression();
                while (peek().kind() == Lexeme.Kind.SEPARATOR) {
                    at++;
                }
                if (peek().kind() != Lexeme.Kind.END) {
                    throw unexpected(peek());
                }
                return value;
            }
        }
    }

    private void line() {
        Lexeme name = next();
        if (RESERVED.contains(name.text()) || Operation.function(name.text()).isPresent()) {
            throw fault(
                    name,
                    "'" + name.text() + "' has a meaning of its own and cannot name a line",
                    "choose another name");
        }
        if (lines.containsKey(name.text()) || isUsed(name.text())) {
            throw fault(
                    name,
                    "'" + name.text() + "' is used before this line names it",
                    "choose another name, or move the line up");
        }
        next();
        int value = expression();
        if (peek().kind() != Lexeme.Kind.SEPARATOR && peek().kind() != Lexeme.Kind.END) {
            throw unexpected(peek());
        }
        lines.put(name.text(), value);
    }

    private boolean isUsed(String name) {
        for (int i = 0; i + 2 < at; i++) {
            if (words.get(i).kind() == Lexeme.Kind.NAME && words.get(i).text().equals(name)) {
                return true;
            }
        }
        return false;
    }

    private int expression() {
        int value = product();
        while (peek().is("+") || peek().is("-")) {
            Operation operation = next().is("+") ? Operation.ADD : Operation.SUBTRACT;
            value = graph.binary(operation, value, product());
        }
        return value;
    }

    private int product() {
        int value = signed();
        while (peek().is("*") || peek().is("/")) {
            Lexeme sign = next();
            if (sign.is("*") && peek().is("*")) {
                throw fault(sign.start(), peek().end(), "'**' is not an operator", "write ^ for a power");
            }
            value = graph.binary(sign.is("*") ? Operation.MULTIPLY : Operation.DIVIDE, value, signed());
        }
        return value;
    }

    private int signed() {
        if (peek().is("-") || peek().is("+")) {
            Lexeme sign = next();
            enter(sign);
            int value = signed();
            depth--;
            return sign.is("-") ? graph.unary(Operation.NEGATE, value) : value;
        }
        return power();
    }

    private int power() {
        int base = operand();
        if (!peek().is("^")) {
            return base;
        }
        enter(next());
        int exponent = signed();
        depth--;
        return graph.binary(Operation.POWER, base, exponent);
    }

    private void enter(Lexeme word) {
        if (++depth > MAX_DEPTH) {
            throw fault(
                    word,
                    "the formula is nested deeper than " + MAX_DEPTH,
                    "name intermediate lines, or split it into several terms");
        }
    }

    private int operand() {
        if (graph.isFull() || ++steps > MAX_STEPS) {
            throw fault(
                    peek(),
                    "the formula has more than %d operations".formatted(GraphBuilder.MAX_NODES),
                    "shorten its sums");
        }
        Lexeme word = next();
        if (word.kind() == Lexeme.Kind.NUMBER) {
            return number(word);
        }
        if (word.kind() == Lexeme.Kind.NAME) {
            return name(word);
        }
        if (word.is("(")) {
            enter(word);
            int value = expression();
            close(")", word);
            depth--;
            return value;
        }
        throw word.kind() == Lexeme.Kind.FAULTY ? unexpected(word) : missingOperand(word);
    }

    private int number(Lexeme word) {
        double value = Double.parseDouble(word.text());
        BigDecimal typed = exact(word);
        if (Double.isInfinite(value)) {
            throw fault(word, "the number " + word.text() + " is too large", "use another unit");
        }
        if (value == 0 && typed.signum() != 0) {
            throw fault(word, "the number " + word.text() + " is too small", "use another unit");
        }
        return graph.literal(value, typed.compareTo(new BigDecimal(value)) != 0);
    }

    private BigDecimal exact(Lexeme word) {
        try {
            return new BigDecimal(word.text());
        } catch (NumberFormatException e) {
            throw fault(word, "the exponent of " + word.text() + " is too large", "use another unit");
        }
    }

    private int name(Lexeme word) {
        String name = word.text();
        if (name.equals("sum")) {
            return sum(word);
        }
        Optional<Operation> function = Operation.function(name);
        if (function.isPresent()) {
            return call(word, function.get());
        }
        if (peek().is("(")) {
            throw RESERVED.contains(name) || lines.containsKey(name) || indices.containsKey(name)
                    ? fault(peek(), "an operator is missing between '" + name + "' and '('", "write * for a product")
                    : fault(
                            word,
                            "the function '" + name + "' is not known",
                            "use one of " + String.join(", ", Operation.functionNames())
                                    + ", sum, or write * for a product");
        }
        if (indices.containsKey(name)) {
            return graph.constant(indices.get(name));
        }
        if (lines.containsKey(name)) {
            return lines.get(name);
        }
        return switch (name) {
            case "r" -> graph.leaf(Operation.RADIUS);
            case "l" -> graph.leaf(Operation.ORBITAL);
            case "pi" -> graph.leaf(Operation.PI);
            default -> graph.parameter(peek().is("[") ? indexed(word) : name, word.start());
        };
    }

    private String indexed(Lexeme word) {
        Lexeme bracket = next();
        enter(bracket);
        int start = peek().start();
        int index = expression();
        if (!graph.isInteger(index) || graph.number(index) < 0 || graph.number(index) > MAX_INDEX) {
            throw fault(
                    start,
                    peek().start(),
                    "the index of '" + word.text() + "' must be a whole number from 0 to " + MAX_INDEX,
                    "");
        }
        close("]", bracket);
        depth--;
        return word.text() + '[' + (int) graph.number(index) + ']';
    }

    private int call(Lexeme word, Operation function) {
        if (!peek().is("(")) {
            throw fault(
                    word,
                    "'" + word.text() + "' is a function and needs its argument in parentheses",
                    "write " + word.text() + "(...)");
        }
        Lexeme open = next();
        enter(open);
        List<Integer> arguments = new ArrayList<>();
        if (!peek().is(")")) {
            arguments.add(expression());
            while (peek().is(",")) {
                at++;
                arguments.add(expression());
            }
        }
        close(")", open);
        depth--;
        if (function.takesOrder()) {
            return withOrder(word, open, function, arguments);
        }
        boolean many = function == Operation.MIN || function == Operation.MAX;
        if (many ? arguments.size() < 2 : arguments.size() != 1) {
            throw fault(
                    word,
                    "%s takes %s, got %d"
                            .formatted(word.text(), many ? "two or more arguments" : "one argument", arguments.size()),
                    "");
        }
        if (!many) {
            return graph.unary(function, arguments.get(0));
        }
        int value = arguments.get(0);
        for (int i = 1; i < arguments.size(); i++) {
            value = graph.binary(function, value, arguments.get(i));
        }
        return value;
    }

    private int withOrder(Lexeme word, Lexeme open, Operation function, List<Integer> arguments) {
        if (arguments.size() != 2) {
            throw fault(
                    word,
                    "%s takes two arguments, got %d".formatted(word.text(), arguments.size()),
                    "write " + word.text() + "(n, x)");
        }
        int order = arguments.get(0);
        if (!graph.isInteger(order) || graph.number(order) < 0 || graph.number(order) > SpecialFunctions.MAX_ORDER) {
            throw fault(
                    open.end(),
                    open.end() + 1,
                    "the order of %s must be a whole number from 0 to %d"
                            .formatted(word.text(), SpecialFunctions.MAX_ORDER),
                    "");
        }
        return graph.binary(function, order, arguments.get(1));
    }

    /** sum(i, from, to, body): the body is read once for every value of i. */
    private int sum(Lexeme word) {
        if (!peek().is("(")) {
            throw fault(word, "'sum' needs its arguments in parentheses", "write sum(i, 0, 7, ...)");
        }
        Lexeme open = next();
        enter(open);
        Lexeme index = next();
        if (index.kind() != Lexeme.Kind.NAME
                || RESERVED.contains(index.text())
                || lines.containsKey(index.text())
                || indices.containsKey(index.text())
                || Operation.function(index.text()).isPresent()) {
            throw fault(
                    index,
                    "the first argument of sum must be a name that has no meaning yet",
                    "write sum(i, 0, 7, ...)");
        }
        comma();
        int from = limit();
        comma();
        int to = limit();
        comma();
        int body = at;
        int value = -1;
        for (int i = from; i == from || i <= to; i++) {
            at = body;
            indices.put(index.text(), i);
            int term = expression();
            value = i > to ? graph.constant(0) : value < 0 ? term : graph.binary(Operation.ADD, value, term);
        }
        indices.remove(index.text());
        close(")", open);
        depth--;
        return value;
    }

    private int limit() {
        int start = peek().start();
        int value = expression();
        if (!graph.isInteger(value) || Math.abs(graph.number(value)) > MAX_INDEX) {
            throw fault(start, peek().start(), "the limits of a sum must be whole numbers up to " + MAX_INDEX, "");
        }
        return (int) graph.number(value);
    }

    private void comma() {
        Lexeme word = next();
        if (!word.is(",")) {
            throw fault(word, "sum takes four arguments: index, first, last, term", "write sum(i, 0, 7, ...)");
        }
    }

    private void close(String sign, Lexeme open) {
        Lexeme word = next();
        if (word.is(sign)) {
            return;
        }
        if (word.kind() == Lexeme.Kind.END || word.kind() == Lexeme.Kind.SEPARATOR || word.is(")") || word.is("]")) {
            throw fault(
                    word,
                    "the '%s' of %s is not closed".formatted(open.text(), FaultyFormula.place(text, open.start())),
                    "add '" + sign + "'");
        }
        throw unexpected(word);
    }

    private Lexeme peek() {
        return words.get(at);
    }

    /** The word here; moves on unless it is the end. */
    private Lexeme next() {
        Lexeme word = words.get(at);
        if (word.kind() != Lexeme.Kind.END) {
            at++;
        }
        return word;
    }

    private FaultyFormula missingOperand(Lexeme word) {
        return word.kind() == Lexeme.Kind.END
                ? fault(word, "the formula ends where a number, a name or '(' must follow", "complete it")
                : fault(word, "a number, a name or '(' is missing before " + shown(word), "");
    }

    private FaultyFormula unexpected(Lexeme word) {
        return switch (word.kind()) {
            case FAULTY -> fault(word, "the character " + shown(word) + " means nothing in a formula", "remove it");
            case NUMBER, NAME -> fault(word, "an operator is missing before " + shown(word), "write * for a product");
            case END -> missingOperand(word);
            default -> {
                if (word.is("(")) {
                    yield fault(word, "an operator is missing before '('", "write * for a product");
                }
                if (word.is("=")) {
                    yield fault(
                            word,
                            "'=' may only follow the name of a line",
                            "write name = expression on a line of its own");
                }
                yield fault(word, shown(word) + " does not belong here", "remove it, or close what is open");
            }
        };
    }

    private static String shown(Lexeme word) {
        if (word.kind() == Lexeme.Kind.SEPARATOR) {
            return word.text().equals(";") ? "';'" : "the end of the line";
        }
        if (word.kind() == Lexeme.Kind.FAULTY
                && (word.text().isBlank() || Character.isISOControl(word.text().codePointAt(0)))) {
            return "U+%04X".formatted(word.text().codePointAt(0));
        }
        return "'" + (word.text().length() > 40 ? word.text().substring(0, 40) + "…" : word.text()) + "'";
    }

    private FaultyFormula fault(Lexeme word, String what, String remedy) {
        return fault(word.start(), word.end(), what, remedy);
    }

    private FaultyFormula fault(int start, int end, String what, String remedy) {
        return new FaultyFormula(start, end, what, remedy);
    }
}
