package org.wellwright.solver.radial.spectral;

import java.util.function.DoubleUnaryOperator;
import org.wellwright.solver.numerics.CondensedPencil;
import org.wellwright.solver.radial.EnergyGradient;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialState;

/** A state on spectral elements; also a first-order response on the same mesh. */
final class ElementState implements RadialState {
    private final RadialProblem problem;
    private final Level level;
    private final Trial trial;
    private final CondensedPencil pencil;
    private final double shift;

    /**
     * A state.
     *
     * @param shift the energy at which the pencil is nearly singular
     */
    ElementState(RadialProblem problem, Level level, Trial trial, CondensedPencil pencil, double shift) {
        this.problem = problem;
        this.level = level;
        this.trial = trial;
        this.pencil = pencil;
        this.shift = shift;
    }

    Trial trial() {
        return trial;
    }

    CondensedPencil pencil() {
        return pencil;
    }

    double shift() {
        return shift;
    }

    @Override
    public RadialProblem problem() {
        return problem;
    }

    @Override
    public Level level() {
        return level;
    }

    @Override
    public double value(int channel, double r) {
        return trial.value(channel, r);
    }

    @Override
    public double slope(int channel, double r) {
        return trial.slope(channel, r);
    }

    @Override
    public double innerRadius() {
        return trial.edges()[0];
    }

    @Override
    public double outerRadius() {
        double[] edges = trial.edges();
        return edges[edges.length - 1];
    }

    @Override
    public double[] elementEdges() {
        return trial.edges().clone();
    }

    @Override
    public double expectation(DoubleUnaryOperator weight) {
        return StateIntegral.integrate(trial.edges(), exponentAtOrigin(), r -> {
            double sum = 0;
            for (int c = 0; c < trial.channels(); c++) {
                double u = trial.value(c, r);
                sum += u * u;
            }
            return sum == 0 ? 0 : sum * weight.applyAsDouble(r);
        });
    }

    private double exponentAtOrigin() {
        return trial.elements()[0].basis[0].atOrigin() ? trial.elements()[0].basis[0].exponent : Double.NaN;
    }

    @Override
    public double overlap(int channel, RadialState other, int otherChannel, DoubleUnaryOperator weight) {
        double[] edges = StateIntegral.common(trial.edges(), other.elementEdges());
        if (edges.length < 2) {
            return 0;
        }
        return StateIntegral.integrate(edges, exponentAtOrigin(), r -> {
            double product = trial.value(channel, r) * other.value(otherChannel, r);
            return product == 0 ? 0 : product * weight.applyAsDouble(r);
        });
    }

    @Override
    public double kineticEnergy() {
        return StateGradient.kineticEnergy(problem, trial);
    }

    @Override
    public EnergyGradient gradient() {
        return StateGradient.of(problem, trial);
    }

    @Override
    public RadialState response(SourceFunction source) {
        Trial w = Response.solve(this, source);
        return new ElementState(problem, level, w, pencil, shift);
    }
}
