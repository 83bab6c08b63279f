package org.wellwright.solver.potential.formula;

import java.util.Random;

/** Makes seeded random formulas: sensible potentials for the laws, and arbitrary text for the search for crashes. */
final class RandomFormulas {
    private static final String[] FUNCTIONS = {
        "exp", "ln", "sqrt", "sin", "cos", "tan", "sinh", "cosh", "tanh", "asin", "acos", "atan", "erf", "erfc", "abs",
        "step", "expm1", "log1p"
    };
    private static final String[] SMOOTH = {
        "exp(-@)",
        "ln(1+@)",
        "sqrt(1+@^2)",
        "sin(@)",
        "cos(@)",
        "tanh(@)",
        "atan(@)",
        "erf(@)",
        "1-exp(-@)",
        "1/(1+exp(@))",
        "sinh(@/4)",
        "erfc(@)",
        "cosh(@/4)"
    };
    private static final String[] PIECES = {
        "r",
        "l",
        "pi",
        "a",
        "b",
        "b[0]",
        "1",
        "2.5",
        "1e-3",
        "0.1",
        "(",
        ")",
        "[",
        "]",
        ",",
        "+",
        "-",
        "*",
        "/",
        "^",
        "=",
        ";",
        "\n",
        "exp(",
        "ln(",
        "sum(i,0,3,",
        "min(",
        "max(",
        "step(",
        "x",
        "i",
        " ",
        "**",
        "1e",
        ".",
        "e",
        "$",
        "²",
        "é",
        "\u2212",
        "_",
        "\"",
        "log",
        "1e999",
        "\t",
        "\ud83d"
    };

    private final Random random;

    RandomFormulas(long seed) {
        this.random = new Random(seed);
    }

    private String number() {
        return switch (random.nextInt(5)) {
            case 0 -> String.valueOf(1 + random.nextInt(4));
            case 1 -> "0.1";
            default -> String.format(java.util.Locale.ROOT, "%.3g", 0.05 + 3 * random.nextDouble());
        };
    }

    /** A formula that is smooth and finite for r in (0, ∞) with parameters a, b > 0, as a rule. */
    String smooth(int depth) {
        if (depth == 0) {
            return switch (random.nextInt(6)) {
                case 0 -> "a";
                case 1 -> "b";
                case 2 -> number();
                default -> "r";
            };
        }
        String x = smooth(depth - 1);
        String y = smooth(depth - 1);
        return switch (random.nextInt(9)) {
            case 0 -> "(" + x + "+" + y + ")";
            case 1 -> "(" + x + "-" + y + ")";
            case 2, 3 -> "(" + x + ")*(" + y + ")";
            case 4 -> "(" + x + ")/(1+(" + y + ")^2)";
            case 5 -> "(" + x + ")^" + (1 + random.nextInt(4));
            case 6 -> "-(" + x + ")/r";
            default -> "(" + SMOOTH[random.nextInt(SMOOTH.length)].replace("@", "(" + x + ")") + ")";
        };
    }

    /** Any formula of the grammar, undefined somewhere as often as not. */
    String any(int depth) {
        if (depth == 0) {
            return switch (random.nextInt(8)) {
                case 0 -> "a";
                case 1 -> "b";
                case 2 -> "l";
                case 3 -> "pi";
                case 4, 5 -> number();
                default -> "r";
            };
        }
        String x = any(depth - 1);
        String y = any(random.nextInt(depth));
        return switch (random.nextInt(8)) {
            case 0 -> x + "+" + y;
            case 1 -> x + "-" + y;
            case 2 -> "(" + x + ")*" + y;
            case 3 -> x + "/(" + y + ")";
            case 4 -> "(" + x + ")^(" + y + ")";
            case 5 -> (random.nextBoolean() ? "min(" : "max(") + x + "," + y + ")";
            case 6 -> "-" + x;
            default -> FUNCTIONS[random.nextInt(FUNCTIONS.length)] + "(" + x + ")";
        };
    }

    /** Text that need not be a formula: pieces in a row, or a formula with some characters changed. */
    String text() {
        if (random.nextBoolean()) {
            StringBuilder text = new StringBuilder();
            int n = random.nextInt(random.nextInt(20) == 0 ? 400 : 20);
            for (int i = 0; i < n; i++) {
                text.append(PIECES[random.nextInt(PIECES.length)]);
            }
            return text.toString();
        }
        StringBuilder text = new StringBuilder(any(1 + random.nextInt(4)));
        for (int i = random.nextInt(4); i > 0; i--) {
            int at = random.nextInt(text.length() + 1);
            switch (random.nextInt(3)) {
                case 0 -> text.insert(at, PIECES[random.nextInt(PIECES.length)]);
                case 1 -> text.delete(at, Math.min(text.length(), at + 1 + random.nextInt(3)));
                default -> {
                    if (at < text.length()) {
                        text.setCharAt(at, (char) (32 + random.nextInt(96)));
                    }
                }
            }
        }
        return text.toString();
    }

    double radius() {
        return Math.pow(10, -3 + 5 * random.nextDouble());
    }

    Random random() {
        return random;
    }
}
