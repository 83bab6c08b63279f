package org.wellwright.solver.potential.formula;

import org.wellwright.solver.potential.Rounding;

/**
 * Running error analysis (Wilkinson 1963; Higham 2002, section 3.3): bounds |computed − exact| node by node, exact
 * meaning the formula as typed with its decimal numbers and the given doubles of its parameters.
 */
final class RoundingPass {
    private static final double U = Rounding.UNIT;

    private RoundingPass() {}

    /** The bound at r; +∞ where none could be found. */
    static double bound(Program program, double r) {
        double[] v = program.frame();
        double[] e = program.errorFrame();
        Graph graph = program.graph();
        for (int k = 0; k < program.varyingCount(); k++) {
            int i = program.varying(k);
            Operation operation = graph.operation(i);
            if (operation == Operation.RADIUS) {
                v[i] = r;
                continue;
            }
            int left = graph.left(i);
            int right = operation.arity() == 2 ? graph.right(i) : left;
            v[i] = Real.apply(operation, v[left], v[right]);
            e[i] = error(operation, v[i], v[left], e[left], v[right], e[right]);
        }
        double bound = e[program.root()] * Rounding.SLACK;
        return bound >= 0 ? bound : Double.POSITIVE_INFINITY;
    }

    /**
     * Bound of one operation.
     *
     * @param v its computed result
     * @param a computed left operand with error at most {@code ea}
     * @param b computed right operand with error at most {@code eb}
     */
    static double error(Operation operation, double v, double a, double ea, double b, double eb) {
        double size = Math.abs(v);
        if (!(size <= Double.MAX_VALUE)) {
            return Double.POSITIVE_INFINITY;
        }
        return switch (operation) {
            case ADD, SUBTRACT -> ea + eb + U * size;
            case MULTIPLY -> Math.abs(a) * eb + Math.abs(b) * ea + ea * eb + under(U * size, size);
            case DIVIDE -> quotient(size, ea, b, eb);
            case NEGATE, ABS -> ea;
            // Operands further apart than their errors cannot change places.
            case MIN -> a + ea < b - eb ? ea : b + eb < a - ea ? eb : Math.max(ea, eb);
            case MAX -> a - ea > b + eb ? ea : b - eb > a + ea ? eb : Math.max(ea, eb);
            case POWER -> power(size, a, ea, b, eb);
            case EXP -> library(Math.max(size, Double.MIN_VALUE) * Math.expm1(ea) * (1 + 4 * U), size);
            // The slope e^a is v + 1, next to nothing for large negative a.
            case EXPM1 -> library((v + 1 + 4 * U) * Math.expm1(ea) * (1 + 4 * U), size);
            case LN -> logarithm(a, ea, size);
            case LOG1P -> logarithm(1 + a, ea * (1 + 2 * U), size);
            case SQRT -> U * size + (a > 2 * ea ? ea / Math.sqrt(a - ea) : Math.sqrt(ea) * (1 + 4 * U));
            case SIN, COS -> library(ea, size);
            case TAN -> tangent(v, ea, size);
            case ASIN, ACOS -> arc(a, ea, size);
            case ATAN -> library(ea, size);
            case SINH, COSH -> 5 * U * size + (Math.exp(Math.abs(a)) + 1) * Math.expm1(ea) + Double.MIN_VALUE;
            case TANH -> 5 * U * size + ea / square(Math.cosh(Math.max(0, Math.abs(a) - ea))) + Double.MIN_VALUE;
            case ERF -> 6 * U * size + 1.13 * ea * Math.exp(-square(Math.max(0, Math.abs(a) - ea))) + Double.MIN_VALUE;
            case ERFC ->
                16 * U * size + 1.13 * ea * Math.exp(-square(Math.max(0, Math.abs(a) - ea))) + Double.MIN_VALUE;
            case DAMP ->
                SpecialFunctions.DAMP_UNITS * U * size + eb * largestDampSlope((int) a, b, eb) + Double.MIN_VALUE;
            case SPHERICAL_BESSEL -> SpecialFunctions.sphericalBesselError((int) a, b) + 0.5 * eb;
            case STEP -> Math.abs(a) > ea || a == 0 && ea == 0 ? 0 : 1;
            default -> 0;
        };
    }

    /** Adds what underflow can cost. */
    private static double under(double error, double size) {
        return size < Double.MIN_NORMAL ? error + Double.MIN_VALUE : error;
    }

    private static double library(double inherited, double size) {
        return inherited + under(Rounding.LIBRARY * size, size);
    }

    private static double quotient(double size, double ea, double b, double eb) {
        double least = Math.abs(b) - eb;
        if (!(least > 0)) {
            return Double.POSITIVE_INFINITY;
        }
        return (ea + size * eb) / least + under(U * size, size) * (1 + eb / least);
    }

    private static double power(double size, double a, double ea, double b, double eb) {
        if (Real.isSmallInteger(b) && eb == 0) {
            if (b < 0 && size > 1e307) {
                return Double.POSITIVE_INFINITY; // 1/x^n with x^n below the normal numbers
            }
            int n = (int) Math.abs(b);
            double roundings = (b < 0 ? n : Math.max(0, n - 1)) * U * 1.01;
            double relative = ea == 0
                    ? 0
                    : ea < Math.abs(a) ? Math.expm1(n * -Math.log1p(-ea / Math.abs(a))) : Double.POSITIVE_INFINITY;
            if (relative == Double.POSITIVE_INFINITY && b > 0) {
                return Math.pow(Math.abs(a) + ea, n) * (1 + 8 * U) + size;
            }
            double inherited = relative == 0 ? 0 : relative * size * (1 + 2 * roundings);
            return inherited + roundings * size + (size < 1e-290 ? Double.MIN_NORMAL : 0);
        }
        if (a == 0 && ea == 0 && eb == 0) {
            return 0;
        }
        double share = Math.abs(a) - ea;
        if (!(share > 0) || a < 0 && eb > 0) {
            return Double.POSITIVE_INFINITY;
        }
        double exponent = (Math.abs(b) + eb) * -Math.log1p(-ea / Math.abs(a)) + eb * Math.abs(Math.log(Math.abs(a)));
        return library(exponent == 0 ? 0 : size * Math.expm1(exponent * (1 + 8 * U)) * (1 + 4 * U), size);
    }

    private static double logarithm(double a, double ea, double size) {
        return ea == 0
                ? library(0, size)
                : ea < a ? library(-Math.log1p(-ea / a) * (1 + 4 * U), size) : Double.POSITIVE_INFINITY;
    }

    private static double tangent(double v, double ea, double size) {
        // |tan x − tan y| ≤ |x − y| (1 + t²) with t the largest |tangent| between; within 0.1/(1 + |v|) it grows by
        // less than a quarter.
        return ea * (1 + size) <= 0.1 ? library(ea * (1 + square(1.25 * v + 0.25)), size) : Double.POSITIVE_INFINITY;
    }

    private static double arc(double a, double ea, double size) {
        if (ea == 0) {
            return library(0, size);
        }
        double far = Math.abs(a) + ea;
        return far < 1
                ? library(ea / Math.sqrt((1 - far) * (1 + far)) * (1 + 8 * U), size)
                : 2 * Math.sqrt(2 * ea) + library(0, size);
    }

    /** The slope xⁿe^(−x)/n! is largest at x = n. */
    private static double largestDampSlope(int n, double x, double error) {
        double nearest = x + error < n ? x + error : x - error > n ? x - error : n;
        return SpecialFunctions.dampSlope(n, nearest) * 1.01;
    }

    private static double square(double x) {
        return x * x;
    }
}
