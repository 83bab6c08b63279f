package org.wellwright.solver.potential.formula;

import org.wellwright.solver.potential.Rounding;

/**
 * Value, derivative and rounding bound in {@link Scaled} numbers, for radii where a double overflows or underflows on
 * the way. Slower than the other passes and used only there.
 */
final class ScaledPass {
    /** Parameter index that asks for the derivative with respect to r. */
    static final int RADIUS = -1;

    private final Program program;
    private final Graph graph;
    private final Scaled[] value;
    private final Scaled[] tangent;
    private final Scaled[] error;

    private ScaledPass(Program program, double r, int parameter) {
        this.program = program;
        this.graph = program.graph();
        int n = program.size();
        this.value = new Scaled[n];
        this.tangent = new Scaled[n];
        this.error = new Scaled[n];
        for (int i = 0; i < n; i++) {
            if (graph.operation(i).arity() == 0) {
                leaf(i, r, parameter);
            } else {
                inner(i);
            }
        }
    }

    static double value(Program program, double r) {
        return new ScaledPass(program, r, RADIUS).value[program.root()].toDouble();
    }

    /** dV/dr for {@link #RADIUS}, otherwise ∂V/∂p. */
    static double derivative(Program program, double r, int parameter) {
        return new ScaledPass(program, r, parameter).tangent[program.root()].toDouble();
    }

    /**
     * To first order in the roundings, doubled; the errors of the parts are below 1e-6 of themselves wherever this pass
     * is needed.
     */
    static double bound(Program program, double r) {
        ScaledPass pass = new ScaledPass(program, r, RADIUS);
        double bound = 2 * pass.error[program.root()].toDouble() + Double.MIN_VALUE;
        return bound >= 0 && !Double.isNaN(pass.value[program.root()].mantissa()) ? bound : Double.POSITIVE_INFINITY;
    }

    private void leaf(int i, double r, int parameter) {
        boolean isRadius = graph.operation(i) == Operation.RADIUS;
        value[i] = Scaled.of(isRadius ? r : program.constant(i));
        error[i] = Scaled.of(program.errorOf(i));
        boolean wanted = isRadius
                ? parameter == RADIUS
                : graph.operation(i) == Operation.PARAMETER && graph.left(i) == parameter;
        tangent[i] = wanted ? Scaled.ONE : Scaled.ZERO;
    }

    private void inner(int i) {
        Operation operation = graph.operation(i);
        int left = graph.left(i);
        int right = operation.arity() == 2 ? graph.right(i) : left;
        Scaled a = value[left];
        Scaled b = value[right];
        value[i] = apply(operation, a, b);
        Scaled partial = leftPartial(operation, a, b, value[i]);
        tangent[i] = product(partial, tangent[left]);
        error[i] = product(partial.abs(), error[left]).plus(value[i].abs().times(units(operation, b) * Rounding.UNIT));
        if (operation.arity() == 2 && !(tangent[right].isZero() && error[right].isZero())) {
            Scaled other = rightPartial(operation, a, b, value[i]);
            tangent[i] = tangent[i].plus(product(other, tangent[right]));
            error[i] = error[i].plus(product(other.abs(), error[right]));
        }
    }

    private static Scaled product(Scaled partial, Scaled change) {
        return change.isZero() ? Scaled.ZERO : partial.times(change);
    }

    private static double units(Operation operation, Scaled b) {
        return switch (operation) {
            case NEGATE, ABS, STEP, MIN, MAX -> 0;
            case ADD, SUBTRACT, MULTIPLY, DIVIDE, SQRT -> 1;
            case POWER ->
                Real.isSmallInteger(b.toDouble()) ? Math.abs(b.toDouble()) + 1 : 8 + 1500 * Math.abs(b.toDouble());
            case ERFC -> 16;
            case DAMP, SPHERICAL_BESSEL -> 1_000;
            default -> 8;
        };
    }

    private static Scaled apply(Operation operation, Scaled a, Scaled b) {
        return switch (operation) {
            case ADD -> a.plus(b);
            case SUBTRACT -> a.minus(b);
            case MULTIPLY -> a.times(b);
            case DIVIDE -> a.over(b);
            case NEGATE -> a.negate();
            case POWER -> a.power(b);
            case EXP -> a.exp();
            case EXPM1 -> a.toDouble() > 1 ? a.exp().minus(Scaled.ONE) : Scaled.of(Math.expm1(a.toDouble()));
            case LN -> a.ln();
            case LOG1P -> a.toDouble() > 1 ? Scaled.ONE.plus(a).ln() : Scaled.of(Math.log1p(a.toDouble()));
            case SQRT -> a.sqrt();
            case SINH ->
                Math.abs(a.toDouble()) < 1
                        ? Scaled.of(Math.sinh(a.toDouble()))
                        : a.exp().minus(a.negate().exp()).times(0.5);
            case COSH -> a.exp().plus(a.negate().exp()).times(0.5);
            case ABS -> a.abs();
            case MIN -> a.compare(b) <= 0 ? a : b;
            case MAX -> a.compare(b) >= 0 ? a : b;
            default -> Scaled.of(Real.apply(operation, a.toDouble(), b.toDouble()));
        };
    }

    private static Scaled leftPartial(Operation operation, Scaled a, Scaled b, Scaled v) {
        return switch (operation) {
            case ADD, SUBTRACT -> Scaled.ONE;
            case MULTIPLY -> b;
            case DIVIDE -> Scaled.ONE.over(b);
            case NEGATE -> Scaled.ONE.negate();
            case POWER -> b.isZero() ? Scaled.ZERO : b.times(a.power(b.minus(Scaled.ONE)));
            case EXP -> v;
            case EXPM1 -> a.exp();
            case LN -> Scaled.ONE.over(a);
            case LOG1P -> Scaled.ONE.over(Scaled.ONE.plus(a));
            case SQRT -> Scaled.of(0.5).over(v);
            case SINH -> a.exp().plus(a.negate().exp()).times(0.5);
            case COSH -> a.exp().minus(a.negate().exp()).times(0.5);
            case TANH -> {
                Scaled e = a.abs().negate().exp();
                Scaled half = e.over(Scaled.ONE.plus(e.times(e)));
                yield half.times(half).times(4);
            }
            case ERF, ERFC ->
                a.times(a).negate().exp().times((operation == Operation.ERF ? 2 : -2) / Math.sqrt(Math.PI));
            case ABS -> a.signum() < 0 ? Scaled.ONE.negate() : Scaled.ONE;
            case STEP -> Scaled.ZERO;
            case MIN -> a.compare(b) <= 0 ? Scaled.ONE : Scaled.ZERO;
            case MAX -> a.compare(b) >= 0 ? Scaled.ONE : Scaled.ZERO;
            default -> Scaled.of(Real.leftPartial(operation, a.toDouble(), b.toDouble(), v.toDouble()));
        };
    }

    private static Scaled rightPartial(Operation operation, Scaled a, Scaled b, Scaled v) {
        return switch (operation) {
            case ADD -> Scaled.ONE;
            case SUBTRACT -> Scaled.ONE.negate();
            case MULTIPLY -> a;
            case DIVIDE -> v.over(b).negate();
            case POWER -> v.isZero() ? Scaled.ZERO : v.times(a.ln());
            case MIN -> a.compare(b) <= 0 ? Scaled.ZERO : Scaled.ONE;
            case MAX -> a.compare(b) >= 0 ? Scaled.ZERO : Scaled.ONE;
            default -> Scaled.of(Real.rightPartial(operation, a.toDouble(), b.toDouble(), v.toDouble()));
        };
    }
}
