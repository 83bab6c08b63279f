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

/** V = 4ε s (s − 1), s = (σ/r)⁶. */
@ServiceProvider(service = PotentialFamily.class)
public final class LennardJonesFamily extends BuiltInFamily {
    private static final double SIXTH_ROOT_OF_TWO = Math.pow(2, 1.0 / 6);

    /** The family. */
    public LennardJonesFamily() {
        super(
                new Description(
                        "lennard-jones",
                        "Lennard-Jones (12,6)",
                        "4*eps*((sigma/r)^12-(sigma/r)^6)",
                        "Two closed-shell atoms: dispersion tail, steep core.",
                        "Lennard-Jones 1924, 1931"),
                new FamilyParameter(
                        "depth",
                        "eps",
                        Dimension.ENERGY,
                        0.001,
                        "from the limit (V = 0) to the minimum at 2^(1/6) sigma"),
                new FamilyParameter("diameter", "sigma", Dimension.LENGTH, 5, "radius where V = 0, positive"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(1, values[1]);
        return new LennardJones(values);
    }

    private static final class LennardJones extends ClosedForm {
        LennardJones(double[] values) {
            super("lennard-jones", values);
        }

        private static double sixth(double x) {
            double square = x * x;
            return square * square * square;
        }

        @Override
        public double value(double r) {
            double s = sixth(p[1] / r);
            return 4 * p[0] * (s * (s - 1));
        }

        @Override
        public void values(double[] radii, double[] into, int count) {
            double e = 4 * p[0];
            for (int i = 0; i < count; i++) {
                double x = p[1] / radii[i];
                double square = x * x;
                double s = square * square * square;
                into[i] = e * (s * (s - 1));
            }
        }

        @Override
        public double slope(double r) {
            double s = sixth(p[1] / r);
            return -24 * p[0] * (s * (2 * s - 1)) / r;
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double s = sixth(p[1] / r);
            return parameter == 0 ? 4 * (s * (s - 1)) : 24 * p[0] * (s * (2 * s - 1)) / p[1];
        }

        @Override
        public double roundingBound(double r) {
            double s = sixth(p[1] / r);
            double relativeOfS =
                    11 * Rounding.UNIT * Rounding.SLACK; // six times u of the quotient, five multiplications' worth
            double slope = s * (Math.abs(2 * s - 1) + 2 * s * relativeOfS);
            double bound = 4
                    * Math.abs(p[0])
                    * (slope * relativeOfS + 3 * Rounding.UNIT * s * Math.abs(s - 1) + 4 * Double.MIN_VALUE);
            return Double.isNaN(bound) ? Double.POSITIVE_INFINITY : bound * Rounding.SLACK + Double.MIN_VALUE;
        }

        @Override
        double[] stationaryRadii() {
            return new double[] {SIXTH_ROOT_OF_TWO * p[1]};
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.power(-12, 4 * p[0] * Math.pow(p[1], 12));
        }

        @Override
        public TailBehaviour tail() {
            return TailBehaviour.power(-6, -4 * p[0] * Math.pow(p[1], 6));
        }
    }
}
