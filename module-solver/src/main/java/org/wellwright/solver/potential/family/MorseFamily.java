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

/** V = D y (y − 2), y = e^(−a(r − r_e)): D[(1 − y)² − 1]. */
@ServiceProvider(service = PotentialFamily.class)
public final class MorseFamily extends BuiltInFamily {
    /** The family. */
    public MorseFamily() {
        super(
                new Description(
                        "morse",
                        "Morse",
                        "D*((1-exp(-a*(r-re)))^2-1)",
                        "Vibration of a diatomic molecule near its minimum; zero at dissociation, finite at r = 0.",
                        "Morse 1929"),
                new FamilyParameter(
                        "depth", "D", Dimension.ENERGY, 0.1, "from the dissociation limit (V = 0) to the minimum"),
                new FamilyParameter("steepness", "a", INVERSE_LENGTH, 1, "positive"),
                new FamilyParameter("equilibrium", "re", Dimension.LENGTH, 2, "radius of the minimum"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(1, values[1]);
        return new Morse(values);
    }

    private static final class Morse extends ClosedForm {
        Morse(double[] values) {
            super("morse", values);
        }

        private double y(double r) {
            return Math.exp(-p[1] * (r - p[2]));
        }

        @Override
        public double value(double r) {
            double y = y(r);
            return p[0] * (y * (y - 2));
        }

        @Override
        public void values(double[] radii, double[] into, int count) {
            double a = -p[1];
            for (int i = 0; i < count; i++) {
                double y = Math.exp(a * (radii[i] - p[2]));
                into[i] = p[0] * (y * (y - 2));
            }
        }

        @Override
        public double slope(double r) {
            return -p[1] * yTimesDerivative(r);
        }

        /** D y d/dy [y (y − 2)]; y − 1 by expm1 where it cancels. */
        private double yTimesDerivative(double r) {
            double z = -p[1] * (r - p[2]);
            return 2 * p[0] * Math.exp(z) * Math.expm1(z);
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double y = y(r);
            return switch (parameter) {
                case 0 -> y * (y - 2);
                case 1 -> -(r - p[2]) * yTimesDerivative(r);
                default -> p[1] * yTimesDerivative(r);
            };
        }

        @Override
        public double roundingBound(double r) {
            double y = y(r);
            double relativeOfY = (2 * Math.abs(p[1] * (r - p[2])) + 2) * Rounding.UNIT * Rounding.SLACK;
            double slope = 2 * y * (Math.abs(y - 1) + y * relativeOfY);
            double own = 3 * Rounding.UNIT * y * Math.abs(y - 2);
            double bound = Math.abs(p[0]) * (slope * relativeOfY + own + 4 * Double.MIN_VALUE) * Rounding.SLACK;
            return Double.isNaN(bound) ? Double.POSITIVE_INFINITY : bound + Double.MIN_VALUE;
        }

        @Override
        double[] stationaryRadii() {
            return new double[] {p[2]};
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.FINITE;
        }

        @Override
        public TailBehaviour tail() {
            return TailBehaviour.ZERO;
        }
    }
}
