package org.wellwright.viewer;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.special.Gamma;
import org.wellwright.solver.radial.EnergyGradient;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialState;

/**
 * The closed form of a hydrogen-like state in atomic units (Bethe and Salpeter 1957, eq. 3.16): u = N ρ^{l+1} e^{−ρ/2}
 * L^{2l+1}_{n−l−1}(ρ), ρ = 2Zr/n. Pictures are tested with it, so that they need no solver.
 */
public final class CoulombState implements RadialState {
    private final RadialProblem problem;
    private final Level level;
    private final double charge;
    private final int n;
    private final int l;
    private final double logNorm;

    /** The state of charge Z, principal quantum number n, orbital l. */
    public CoulombState(RadialProblem problem, Level level, double charge, int n, int l) {
        this.problem = problem;
        this.level = level;
        this.charge = charge;
        this.n = n;
        this.l = l;
        this.logNorm = 0.5 * (Math.log(charge) + Gamma.logGamma(n - l) - 2 * Math.log(n) - Gamma.logGamma(n + l + 1));
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
        if (r <= 0) {
            return 0;
        }
        double rho = 2 * charge * r / n;
        return Math.exp(logNorm + (l + 1) * Math.log(rho) - rho / 2) * laguerre(n - l - 1, 2 * l + 1, rho);
    }

    @Override
    public double slope(int channel, double r) {
        double h = 1e-5 * outerRadius();
        return (value(0, r + h) - value(0, Math.max(0, r - h))) / (r + h - Math.max(0, r - h));
    }

    @Override
    public double innerRadius() {
        return 0;
    }

    @Override
    public double outerRadius() {
        return (2.0 * n * n + 30 * n) / charge;
    }

    @Override
    public double[] elementEdges() {
        double[] edges = new double[41];
        for (int i = 0; i <= 40; i++) {
            edges[i] = outerRadius() * i * i / 1600;
        }
        return edges;
    }

    @Override
    public double expectation(DoubleUnaryOperator weight) {
        return overlap(0, this, 0, weight);
    }

    @Override
    public double overlap(int channel, RadialState other, int otherChannel, DoubleUnaryOperator weight) {
        GaussIntegratorFactory rules = new GaussIntegratorFactory();
        double[] edges = elementEdges();
        double sum = 0;
        for (int i = 1; i < edges.length; i++) {
            GaussIntegrator rule = rules.legendre(24, edges[i - 1], edges[i]);
            sum += rule.integrate(r -> weight.applyAsDouble(r) * value(channel, r) * other.value(otherChannel, r));
        }
        return sum;
    }

    @Override
    public double kineticEnergy() {
        return charge * charge / (2.0 * n * n);
    }

    @Override
    public EnergyGradient gradient() {
        return new EnergyGradient(0, new double[0], new double[0][], new double[] {1}, 0, 0);
    }

    @Override
    public RadialState response(SourceFunction source) {
        throw new IllegalStateException("pictures need no response");
    }

    private static double laguerre(int degree, int order, double x) {
        double before = 0;
        double here = 1;
        for (int k = 0; k < degree; k++) {
            double next = ((2 * k + 1 + order - x) * here - (k + order) * before) / (k + 1);
            before = here;
            here = next;
        }
        return here;
    }
}
