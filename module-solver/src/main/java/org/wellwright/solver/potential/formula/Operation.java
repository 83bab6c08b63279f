package org.wellwright.solver.potential.formula;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** What a node of a formula's graph does. */
enum Operation {
    LITERAL(0),
    PI(0),
    PARAMETER(0),
    ORBITAL(0),
    RADIUS(0),
    ADD(2),
    SUBTRACT(2),
    MULTIPLY(2),
    DIVIDE(2),
    NEGATE(1),
    POWER(2),
    EXP(1, "exponential", "exp"),
    EXPM1(1, "exp(x) - 1 without cancellation", "expm1"),
    LN(1, "natural logarithm", "ln", "log"),
    LOG1P(1, "ln(1 + x) without cancellation", "log1p"),
    SQRT(1, "square root", "sqrt"),
    SIN(1, "sine, argument in rad", "sin"),
    COS(1, "cosine, argument in rad", "cos"),
    TAN(1, "tangent, argument in rad", "tan"),
    ASIN(1, "inverse sine", "asin"),
    ACOS(1, "inverse cosine", "acos"),
    ATAN(1, "inverse tangent", "atan"),
    SINH(1, "hyperbolic sine", "sinh"),
    COSH(1, "hyperbolic cosine", "cosh"),
    TANH(1, "hyperbolic tangent", "tanh"),
    ERF(1, "error function", "erf"),
    ERFC(1, "complementary error function", "erfc"),
    ABS(1, "absolute value", "abs"),
    STEP(1, "1 for x > 0, 0 for x < 0; its edge is a break point", "step", "heaviside"),
    DAMP(2, "damp(n, x): 1 - exp(-x) sum x^k/k!, k = 0..n, without cancellation", "damp"),
    SPHERICAL_BESSEL(2, "sphj(n, x): spherical Bessel function of the first kind", "sphj"),
    MIN(2, "the smaller of two", "min"),
    MAX(2, "the larger of two", "max");

    private final int arity;
    private final String meaning;
    private final List<String> names;

    Operation(int arity) {
        this(arity, "");
    }

    Operation(int arity, String meaning, String... names) {
        this.arity = arity;
        this.meaning = meaning;
        this.names = List.of(names);
    }

    int arity() {
        return arity;
    }

    String meaning() {
        return meaning;
    }

    /** The names under which a formula calls it; none for what is written with an operator. */
    List<String> names() {
        return names;
    }

    /** Whether V is not smooth where the argument (for min and max the difference of both) is zero. */
    boolean breaks() {
        return this == ABS || this == STEP || this == MIN || this == MAX;
    }

    /** Whether the first operand must be a whole number that the text states. */
    boolean takesOrder() {
        return this == DAMP || this == SPHERICAL_BESSEL;
    }

    static Optional<Operation> function(String name) {
        return Arrays.stream(values())
                .filter(operation -> operation.names.contains(name))
                .findFirst();
    }

    static List<String> functionNames() {
        return Arrays.stream(values())
                .flatMap(operation -> operation.names.stream())
                .sorted()
                .toList();
    }
}
