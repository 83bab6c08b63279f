package org.wellwright.solver.potential.formula;

import org.apache.commons.math3.dfp.Dfp;
import org.apache.commons.math3.dfp.DfpField;
import org.apache.commons.math3.dfp.DfpMath;

/**
 * A formula at 60 decimal digits in the arbitrary-precision arithmetic of Apache Commons Math; the doubles in the
 * formula count as exact.
 */
final class PreciseEvaluation {
    static final DfpField FIELD = new DfpField(60);

    private PreciseEvaluation() {}

    static Dfp value(Graph graph, double[] parameters, int orbital, Dfp r) {
        Dfp[] v = new Dfp[graph.size()];
        for (int i = 0; i < v.length; i++) {
            v[i] = switch (graph.operation(i)) {
                case LITERAL -> FIELD.newDfp(graph.literal(i));
                case PI -> FIELD.getPi();
                case PARAMETER -> FIELD.newDfp(parameters[graph.left(i)]);
                case ORBITAL -> FIELD.newDfp(orbital);
                case RADIUS -> r;
                default ->
                    apply(
                            graph.operation(i),
                            v[graph.left(i)],
                            graph.operation(i).arity() == 2 ? v[graph.right(i)] : null);
            };
        }
        return v[v.length - 1];
    }

    /** Below 1e-20 two terms of a series are good to 40 digits, while 60 digits of 1 + x are not. */
    private static boolean tiny(Dfp x) {
        return x.abs().lessThan(FIELD.newDfp("1e-20"));
    }

    private static Dfp exp(Dfp x) {
        return DfpMath.exp(x);
    }

    private static Dfp apply(Operation operation, Dfp a, Dfp b) {
        Dfp one = FIELD.getOne();
        return switch (operation) {
            case ADD -> a.add(b);
            case SUBTRACT -> a.subtract(b);
            case MULTIPLY -> a.multiply(b);
            case DIVIDE -> a.divide(b);
            case NEGATE -> a.negate();
            case POWER -> power(a, b);
            case EXP -> exp(a);
            case EXPM1 -> tiny(a) ? a.add(a.multiply(a).divide(2)) : exp(a).subtract(one);
            case LN -> DfpMath.log(a);
            case LOG1P -> tiny(a) ? a.subtract(a.multiply(a).divide(2)) : DfpMath.log(a.add(one));
            case SQRT -> a.sqrt();
            case SIN -> DfpMath.sin(a);
            case COS -> DfpMath.cos(a);
            case TAN -> DfpMath.sin(a).divide(DfpMath.cos(a));
            case ASIN -> DfpMath.asin(a);
            case ACOS -> FIELD.getPi().divide(2).subtract(DfpMath.asin(a));
            case ATAN -> DfpMath.atan(a);
            case SINH -> exp(a).subtract(exp(a.negate())).divide(2);
            case COSH -> exp(a).add(exp(a.negate())).divide(2);
            case TANH -> one.subtract(one.multiply(2).divide(exp(a.multiply(2)).add(one)));
            case ERF -> erf(a);
            case ERFC -> a.greaterThan(FIELD.newDfp(6)) ? farErfc(a) : one.subtract(erf(a));
            case ABS -> a.abs();
            case STEP -> a.negativeOrNull() && !a.isZero() ? FIELD.getZero() : one;
            case MIN -> a.lessThan(b) ? a : b;
            case MAX -> a.greaterThan(b) ? a : b;
            default -> throw new IllegalArgumentException(operation.toString());
        };
    }

    private static Dfp power(Dfp a, Dfp b) {
        if (b.rint().equals(b) && b.abs().lessThan(FIELD.newDfp(10_000))) {
            int n = b.intValue();
            Dfp result = FIELD.getOne();
            for (int i = 0; i < Math.abs(n); i++) {
                result = result.multiply(a);
            }
            return n < 0 ? FIELD.getOne().divide(result) : result;
        }
        return exp(b.multiply(DfpMath.log(a)));
    }

    /** Maclaurin series up to |x| = 6, where it loses 16 digits; the continued fraction of erfc beyond. */
    private static Dfp erf(Dfp x) {
        if (x.abs().greaterThan(FIELD.newDfp(6))) {
            Dfp size = FIELD.getOne().subtract(farErfc(x.abs()));
            return x.toDouble() < 0 ? size.negate() : size;
        }
        Dfp square = x.multiply(x).negate();
        Dfp power = x;
        Dfp sum = x;
        for (int n = 1; n < 300; n++) {
            power = power.multiply(square).divide(n);
            sum = sum.add(power.divide(2 * n + 1));
        }
        return sum.multiply(2).divide(FIELD.getPi().sqrt());
    }

    /** Abramowitz and Stegun (1964), 7.1.14: √π e^(x²) erfc x = 1/(x + ½/(x + 1/(x + 3/2/(x + …)))). */
    private static Dfp farErfc(Dfp x) {
        Dfp fraction = x;
        for (int n = 300; n >= 1; n--) {
            fraction = x.add(FIELD.newDfp(n).divide(2).divide(fraction));
        }
        return exp(x.multiply(x).negate()).divide(fraction).divide(FIELD.getPi().sqrt());
    }
}
