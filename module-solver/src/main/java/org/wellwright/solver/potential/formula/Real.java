package org.wellwright.solver.potential.formula;

import org.apache.commons.numbers.gamma.Erf;
import org.apache.commons.numbers.gamma.Erfc;

/** The operations on doubles. */
final class Real {
    /** Largest |n| for which x^n is computed by multiplication. */
    static final int MAX_INTEGER_POWER = 64;

    private Real() {}

    /** The result of an operation with operands; leaves have none and are not computed here. */
    static double apply(Operation operation, double a, double b) {
        return switch (operation) {
            case ADD -> a + b;
            case SUBTRACT -> a - b;
            case MULTIPLY -> a * b;
            case DIVIDE -> a / b;
            case NEGATE -> -a;
            case POWER -> power(a, b);
            case EXP -> Math.exp(a);
            case EXPM1 -> Math.expm1(a);
            case LN -> Math.log(a);
            case LOG1P -> Math.log1p(a);
            case SQRT -> Math.sqrt(a);
            case SIN -> Math.sin(a);
            case COS -> Math.cos(a);
            case TAN -> Math.tan(a);
            case ASIN -> Math.asin(a);
            case ACOS -> Math.acos(a);
            case ATAN -> Math.atan(a);
            case SINH -> Math.sinh(a);
            case COSH -> Math.cosh(a);
            case TANH -> Math.tanh(a);
            case ERF -> Erf.value(a);
            case ERFC -> Erfc.value(a);
            case ABS -> Math.abs(a);
            case STEP -> step(a);
            case DAMP -> SpecialFunctions.damp((int) a, b);
            case SPHERICAL_BESSEL -> SpecialFunctions.sphericalBessel((int) a, b);
            case MIN -> Math.min(a, b);
            case MAX -> Math.max(a, b);
            default -> throw new IllegalArgumentException(operation + " has no operands");
        };
    }

    static double step(double x) {
        return x >= 0 ? 1 : x < 0 ? 0 : Double.NaN;
    }

    static boolean isSmallInteger(double x) {
        return x == Math.rint(x) && Math.abs(x) <= MAX_INTEGER_POWER;
    }

    static double power(double x, double y) {
        return isSmallInteger(y) ? integerPower(x, (int) y) : Math.pow(x, y);
    }

    /** x^n by repeated squaring: at most |n| − 1 roundings, one more if n < 0. */
    static double integerPower(double x, int n) {
        int left = Math.abs(n);
        if (left == 2) {
            return n > 0 ? x * x : 1 / (x * x);
        }
        double result = 1;
        double square = x;
        while (left != 0) {
            if ((left & 1) != 0) {
                result *= square;
            }
            left >>= 1;
            if (left != 0) {
                square *= square;
            }
        }
        return n < 0 ? 1 / result : result;
    }

    /** ∂f/∂a of an operation whose result is {@code v}. */
    static double leftPartial(Operation operation, double a, double b, double v) {
        return switch (operation) {
            case ADD, SUBTRACT -> 1;
            case MULTIPLY -> b;
            case DIVIDE -> 1 / b;
            case NEGATE -> -1;
            case POWER -> b == 0 ? 0 : b * power(a, b - 1);
            case EXP -> v;
            case EXPM1 -> Math.exp(a);
            case LN -> 1 / a;
            case LOG1P -> 1 / (1 + a);
            case SQRT -> 0.5 / v;
            case SIN -> Math.cos(a);
            case COS -> -Math.sin(a);
            case TAN -> 1 + v * v;
            case ASIN -> 1 / Math.sqrt((1 - a) * (1 + a));
            case ACOS -> -1 / Math.sqrt((1 - a) * (1 + a));
            case ATAN -> 1 / (1 + a * a);
            case SINH -> Math.cosh(a);
            case COSH -> Math.sinh(a);
            case TANH -> square(1 / Math.cosh(a));
            case ERF -> 2 / Math.sqrt(Math.PI) * Math.exp(-a * a);
            case ERFC -> -2 / Math.sqrt(Math.PI) * Math.exp(-a * a);
            case ABS -> a < 0 ? -1 : 1;
            case STEP, DAMP, SPHERICAL_BESSEL -> 0;
            case MIN -> a <= b ? 1 : 0;
            case MAX -> a >= b ? 1 : 0;
            default -> throw new IllegalArgumentException(operation + " has no operands");
        };
    }

    /** ∂f/∂b of an operation with two operands whose result is {@code v}. */
    static double rightPartial(Operation operation, double a, double b, double v) {
        return switch (operation) {
            case ADD -> 1;
            case SUBTRACT -> -1;
            case MULTIPLY -> a;
            case DIVIDE -> -v / b;
            case POWER -> v == 0 ? 0 : v * Math.log(a);
            case DAMP -> SpecialFunctions.dampSlope((int) a, b);
            case SPHERICAL_BESSEL -> SpecialFunctions.sphericalBesselSlope((int) a, b);
            case MIN -> a <= b ? 0 : 1;
            case MAX -> a >= b ? 0 : 1;
            default -> throw new IllegalArgumentException(operation + " has no second operand");
        };
    }

    private static double square(double x) {
        return x * x;
    }
}
