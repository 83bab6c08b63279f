package org.wellwright.solver.potential.family;

import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.HardWalls;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/** V = D(6e^(s(1 − r/r_e)) − s(r_e/r)⁶)/(s − 6) beyond its inner maximum, where a wall stands. */
@ServiceProvider(service = PotentialFamily.class)
public final class ExponentialSixFamily extends BuiltInFamily {
    /** The family. */
    public ExponentialSixFamily() {
        super(
                new Description(
                        "exp-6",
                        "Exponential-6",
                        "D/(s-6)*(6*exp(s*(1-r/re))-s*(re/r)^6)",
                        "Two closed-shell atoms; a hard wall stands at the inner maximum, below which the formula would fall to -infinity.",
                        "Buckingham 1938; Mason 1954"),
                new FamilyParameter("depth", "D", Dimension.ENERGY, 0.001, "from the limit (V = 0) to the minimum"),
                new FamilyParameter("equilibrium", "re", Dimension.LENGTH, 5, "radius of the minimum, positive"),
                new FamilyParameter("steepness", "s", Dimension.NONE, 13, "of the repulsion, above 7"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(1, values[1]);
        require(values[2] > 7, 2, "above 7", values[2]);
        return new ExponentialSix(values);
    }

    private static final class ExponentialSix extends ClosedForm {
        private final double summit;

        ExponentialSix(double[] values) {
            super("exp-6", values);
            this.summit = summit(values[2]);
        }

        /** The root x < 7/s of 7 ln x + s(1 − x) = 0, where dV/dr = 0, in units of the equilibrium radius. */
        private static double summit(double s) {
            double low = Math.exp(-s / 7);
            double high = 7 / s;
            while (true) {
                double middle = low + (high - low) / 2;
                if (middle <= low || middle >= high) {
                    return high;
                }
                if (7 * Math.log(middle) + s * (1 - middle) < 0) {
                    low = middle;
                } else {
                    high = middle;
                }
            }
        }

        private double scaled(double r) {
            return Math.max(r / p[1], summit);
        }

        private static double sixth(double x) {
            double square = x * x;
            return 1 / (square * square * square);
        }

        @Override
        public double value(double r) {
            double x = scaled(r);
            return p[0] * (6 * Math.exp(p[2] * (1 - x)) - p[2] * sixth(x)) / (p[2] - 6);
        }

        @Override
        public double slope(double r) {
            double x = r / p[1];
            if (x <= summit) {
                return 0;
            }
            return 6 * p[0] * p[2] / (p[2] - 6) * (sixth(x) / x - Math.exp(p[2] * (1 - x))) / p[1];
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double x = scaled(r);
            double e = Math.exp(p[2] * (1 - x));
            double six = sixth(x);
            double d = p[2] - 6;
            return switch (parameter) {
                case 0 -> (6 * e - p[2] * six) / d;
                case 1 -> -x * slope(r);
                default -> p[0] * ((6 * (1 - x) * e - six) / d - (6 * e - p[2] * six) / (d * d));
            };
        }

        @Override
        public double roundingBound(double r) {
            double x = scaled(r);
            double u = Rounding.UNIT;
            double repulsion = 6 * Math.exp(p[2] * (1 - x)) * u * (p[2] * (x + 4 * Math.abs(1 - x)) + 6);
            double attraction = p[2] * sixth(x) * u * 16;
            double scale = Math.abs(p[0]) / (p[2] - 6);
            double bound = (scale * (repulsion + attraction) + 4 * u * Math.abs(value(r))) * Rounding.SLACK
                    + Double.MIN_NORMAL;
            return bound <= Double.MAX_VALUE ? bound : Double.POSITIVE_INFINITY;
        }

        @Override
        double[] stationaryRadii() {
            return new double[] {p[1], summit * p[1]};
        }

        @Override
        public HardWalls walls() {
            double bySteepness = -(1 - summit) / (7 / summit - p[2]) * p[1];
            return new HardWalls(summit * p[1], Double.POSITIVE_INFINITY, List.of(0.0, summit, bySteepness), List.of());
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.FINITE;
        }

        @Override
        public TailBehaviour tail() {
            return TailBehaviour.power(-6, -p[0] * p[2] / (p[2] - 6) * Math.pow(p[1], 6));
        }
    }
}
