package org.wellwright.viewer;

import java.util.List;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;

/** −Z/r. */
record CoulombTerm(double charge) implements TermEvaluator {
    @Override
    public String canonical() {
        return "test coulomb " + Double.toHexString(charge);
    }

    @Override
    public int parameterCount() {
        return 0;
    }

    @Override
    public double value(double r) {
        return -charge / r;
    }

    @Override
    public double slope(double r) {
        return charge / (r * r);
    }

    @Override
    public double parameterDerivative(int parameter, double r) {
        throw new IllegalArgumentException("no parameter " + parameter);
    }

    @Override
    public List<BreakPoint> breakPoints() {
        return List.of();
    }

    @Override
    public Interval enclose(double from, double to) {
        return Interval.ENTIRE;
    }

    @Override
    public double roundingBound(double r) {
        return Math.ulp(charge / r);
    }

    @Override
    public OriginBehaviour origin() {
        return OriginBehaviour.power(-1, -charge);
    }

    @Override
    public TailBehaviour tail() {
        return TailBehaviour.power(-1, -charge);
    }
}
