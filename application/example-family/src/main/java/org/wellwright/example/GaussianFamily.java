package org.wellwright.example;

import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/** V = −V0 e^(−(r/a)²). */
@ServiceProvider(service = PotentialFamily.class)
public final class GaussianFamily implements PotentialFamily {
    @Override
    public String id() {
        return "example-gaussian";
    }

    @Override
    public String displayName() {
        return "Gaussian well (example module)";
    }

    @Override
    public String formula() {
        return "-V0*exp(-(r/a)^2)";
    }

    @Override
    public String validity() {
        return "A soft well of short range; shows how a module adds a family.";
    }

    @Override
    public String source() {
        return "common practice, no source";
    }

    @Override
    public List<FamilyParameter> parameters() {
        return List.of(
                new FamilyParameter("depth", "V0", Dimension.ENERGY, 1, "positive attracts"),
                new FamilyParameter("range", "a", Dimension.LENGTH, 1, "where V has fallen to 1/e; above zero"));
    }

    @Override
    public TermEvaluator bind(double[] values, ChannelFacts channel) {
        if (!(values[1] > 0)) {
            throw new InvalidModelException(
                    "the range a must be above zero, got " + values[1], "family " + id(), "give a positive length");
        }
        return new Gaussian(values[0], values[1]);
    }

    private record Gaussian(double depth, double range) implements TermEvaluator {
        @Override
        public String canonical() {
            return "example-gaussian " + Double.toHexString(depth) + " " + Double.toHexString(range);
        }

        @Override
        public int parameterCount() {
            return 2;
        }

        @Override
        public double value(double r) {
            return -depth * bell(r);
        }

        @Override
        public double slope(double r) {
            return 2 * depth * r / (range * range) * bell(r);
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double x = r / range;
            return parameter == 0 ? -bell(r) : -2 * depth * x * x / range * bell(r);
        }

        @Override
        public List<BreakPoint> breakPoints() {
            return List.of();
        }

        @Override
        public Interval enclose(double from, double to) {
            // V has one sign of slope, so its extremes are at the ends.
            return around(from).hull(to == Double.POSITIVE_INFINITY ? Interval.ZERO : around(to));
        }

        @Override
        public double roundingBound(double r) {
            double x = r / range;
            return Rounding.relative(value(r), 2 * x * x + 5) + Math.abs(depth) * Double.MIN_VALUE;
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.FINITE;
        }

        @Override
        public TailBehaviour tail() {
            return TailBehaviour.ZERO;
        }

        private double bell(double r) {
            double x = r / range;
            return Math.exp(-x * x);
        }

        private Interval around(double r) {
            return Interval.around(value(r), roundingBound(r));
        }
    }
}
