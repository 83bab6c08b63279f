package org.wellwright.solver.potential.family;

import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/** V = −V₀ for r < R, 0 for r ≥ R. */
@ServiceProvider(service = PotentialFamily.class)
public final class SquareWellFamily extends BuiltInFamily {
    /** The family. */
    public SquareWellFamily() {
        super(
                new Description(
                        "square-well",
                        "Square well",
                        "-V0*step(R-r)",
                        "Shortest-range model of two nucleons, of a dot with sharp walls; negative V0 is a barrier.",
                        "common practice, no source"),
                new FamilyParameter("depth", "V0", Dimension.ENERGY, 1, "positive attracts"),
                new FamilyParameter("radius", "R", Dimension.LENGTH, 3, "positive"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(1, values[1]);
        return new SquareWell(values);
    }

    private static final class SquareWell extends ClosedForm {
        SquareWell(double[] values) {
            super("square-well", values);
        }

        @Override
        public double value(double r) {
            return r < p[1] ? -p[0] : 0;
        }

        @Override
        public double slope(double r) {
            return 0;
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            return parameter == 0 && r < p[1] ? -1 : 0;
        }

        @Override
        public List<BreakPoint> breakPoints() {
            return List.of(new BreakPoint(p[1], BreakPoint.Kind.JUMP, p[0], List.of(0.0, 1.0)));
        }

        @Override
        public Interval enclose(double from, double to) {
            return Interval.of(value(from)).hull(Interval.of(value(to)));
        }

        @Override
        public double roundingBound(double r) {
            return 0;
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
