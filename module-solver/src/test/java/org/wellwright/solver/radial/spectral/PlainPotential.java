package org.wellwright.solver.radial.spectral;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;

/** A potential for tests: V as a function, with its ends stated, one optional parameter derivative and break points. */
record PlainPotential(
        String canonical,
        DoubleUnaryOperator v,
        OriginBehaviour origin,
        TailBehaviour tail,
        List<BreakPoint> breakPoints,
        List<DoubleUnaryOperator> derivatives)
        implements TermEvaluator {

    static PlainPotential of(String name, DoubleUnaryOperator v, OriginBehaviour origin, TailBehaviour tail) {
        return new PlainPotential(name, v, origin, tail, List.of(), List.of());
    }

    static PlainPotential unknown(String name, DoubleUnaryOperator v) {
        return of(name, v, OriginBehaviour.UNKNOWN, TailBehaviour.UNKNOWN);
    }

    static PlainPotential coulomb(double strength) {
        return new PlainPotential(
                "coulomb " + strength,
                r -> -strength / r,
                OriginBehaviour.power(-1, -strength),
                TailBehaviour.power(-1, -strength),
                List.of(),
                List.of(r -> -1 / r));
    }

    static PlainPotential power(double factor, double exponent) {
        return new PlainPotential(
                "power " + factor + " " + exponent,
                r -> factor * Math.pow(r, exponent),
                OriginBehaviour.power(exponent, factor),
                TailBehaviour.power(exponent, factor),
                List.of(),
                List.of(r -> Math.pow(r, exponent), r -> factor * Math.pow(r, exponent) * Math.log(r)));
    }

    static PlainPotential morse(double depth, double range, double radius) {
        return of(
                "morse " + depth + " " + range + " " + radius,
                r -> {
                    double x = Math.exp(-range * (r - radius));
                    return depth * x * (x - 2);
                },
                OriginBehaviour.FINITE,
                TailBehaviour.ZERO);
    }

    static PlainPotential squareWell(double depth, double radius) {
        return new PlainPotential(
                "square " + depth + " " + radius,
                r -> r < radius ? -depth : 0,
                OriginBehaviour.FINITE,
                TailBehaviour.ZERO,
                List.of(new BreakPoint(radius, BreakPoint.Kind.JUMP, depth, List.of(0.0, 1.0))),
                List.of(r -> r < radius ? -1 : 0, r -> 0));
    }

    @Override
    public int parameterCount() {
        return derivatives.size();
    }

    @Override
    public double value(double r) {
        return v.applyAsDouble(r);
    }

    @Override
    public double slope(double r) {
        double h = 1e-5 * r;
        return (value(r + h) - value(r - h)) / (2 * h);
    }

    @Override
    public double parameterDerivative(int parameter, double r) {
        return derivatives.get(parameter).applyAsDouble(r);
    }

    @Override
    public Interval enclose(double from, double to) {
        return Interval.ENTIRE;
    }

    @Override
    public double roundingBound(double r) {
        return Math.ulp(value(r));
    }
}
