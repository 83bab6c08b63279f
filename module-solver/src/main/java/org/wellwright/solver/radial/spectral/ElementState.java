package org.wellwright.solver.radial.spectral;

import java.util.function.DoubleUnaryOperator;
import org.wellwright.solver.radial.EnergyGradient;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialState;

/** A state on spectral elements; also a first-order response on the same mesh. */
final class ElementState implements RadialState {
    private final RadialProblem problem;
    private final Level level;
    private final Trial variational;
    private final MeshData mesh;
    private volatile Trial fine;

    /** A state from its variational solution; values and slopes are refined when first asked for. */
    ElementState(RadialProblem problem, Level level, Trial variational, MeshData mesh) {
        this.problem = problem;
        this.level = level;
        this.variational = variational;
        this.mesh = mesh;
    }

    private ElementState(ElementState of, Trial response) {
        problem = of.problem;
        level = of.level;
        mesh = of.mesh;
        variational = response;
        fine = response;
    }

    /** The function that values and integrals are taken of. Computed twice at worst, to the same bits. */
    private Trial trial() {
        Trial known = fine;
        if (known == null) {
            known = StateRefinement.refine(mesh, variational);
            fine = known;
        }
        return known;
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
        return trial().value(channel, r);
    }

    @Override
    public double slope(int channel, double r) {
        return trial().slope(channel, r);
    }

    @Override
    public double innerRadius() {
        return variational.edges()[0];
    }

    @Override
    public double outerRadius() {
        double[] edges = variational.edges();
        return edges[edges.length - 1];
    }

    @Override
    public double[] elementEdges() {
        return variational.edges().clone();
    }

    @Override
    public double expectation(DoubleUnaryOperator weight) {
        Trial u = trial();
        return StateIntegral.integrate(u.edges(), r -> {
            double sum = 0;
            for (int c = 0; c < u.channels(); c++) {
                double value = u.value(c, r);
                sum += value * value;
            }
            return sum == 0 ? 0 : sum * weight.applyAsDouble(r);
        });
    }

    @Override
    public double overlap(int channel, RadialState other, int otherChannel, DoubleUnaryOperator weight) {
        Trial u = trial();
        double[] edges = StateIntegral.common(u.edges(), other.elementEdges());
        if (edges.length < 2) {
            return 0;
        }
        return StateIntegral.integrate(edges, r -> {
            double product = u.value(channel, r) * other.value(otherChannel, r);
            return product == 0 ? 0 : product * weight.applyAsDouble(r);
        });
    }

    @Override
    public double kineticEnergy() {
        return StateGradient.kineticEnergy(problem, variational);
    }

    @Override
    public EnergyGradient gradient() {
        return StateGradient.of(problem, variational);
    }

    @Override
    public RadialState response(SourceFunction source) {
        return new ElementState(this, Response.solve(mesh, trial(), source));
    }
}
