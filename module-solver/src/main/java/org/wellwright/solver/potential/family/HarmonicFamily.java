package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/** V = ½ k (r − r₀)². */
@ServiceProvider(service = PotentialFamily.class)
public final class HarmonicFamily extends BuiltInFamily {
    /** The family. */
    public HarmonicFamily() {
        super(
                new Description(
                        "harmonic",
                        "Harmonic",
                        "k/2*(r-r0)^2",
                        "Isotropic oscillator with r0 = 0, small vibrations about r0 otherwise; k = mu omega^2.",
                        "Hooke 1678"),
                new FamilyParameter(
                        "stiffness", "k", Dimension.ENERGY.times(Dimension.LENGTH.power(-2)), 1, "force constant"),
                new FamilyParameter("centre", "r0", Dimension.LENGTH, 0, "radius of the minimum"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        return new Harmonic(values);
    }

    private static final class Harmonic extends ClosedForm {
        Harmonic(double[] values) {
            super("harmonic", values);
        }

        @Override
        public double value(double r) {
            double d = r - p[1];
            return 0.5 * p[0] * (d * d);
        }

        @Override
        public void values(double[] radii, double[] into, int count) {
            double half = 0.5 * p[0];
            for (int i = 0; i < count; i++) {
                double d = radii[i] - p[1];
                into[i] = half * (d * d);
            }
        }

        @Override
        public double slope(double r) {
            return p[0] * (r - p[1]);
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double d = r - p[1];
            return parameter == 0 ? 0.5 * (d * d) : -p[0] * d;
        }

        @Override
        public double roundingBound(double r) {
            return Rounding.relative(value(r), p[1] == 0 ? 2 : 4) + Math.abs(p[0]) * Double.MIN_VALUE;
        }

        @Override
        double[] stationaryRadii() {
            return new double[] {p[1]};
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.FINITE;
        }

        @Override
        public TailBehaviour tail() {
            return TailBehaviour.power(2, 0.5 * p[0]);
        }
    }
}
