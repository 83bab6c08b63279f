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

/** V = b r + c. */
@ServiceProvider(service = PotentialFamily.class)
public final class LinearFamily extends BuiltInFamily {
    /** The family. */
    public LinearFamily() {
        super(
                new Description(
                        "linear",
                        "Linear",
                        "b*r+c",
                        "Confinement by a constant force; c shifts every level.",
                        "common practice, no source"),
                new FamilyParameter("tension", "b", Dimension.ENERGY.times(INVERSE_LENGTH), 1, "positive confines"),
                new FamilyParameter("offset", "c", Dimension.ENERGY, 0, "value at r = 0"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        return new Linear(values);
    }

    private static final class Linear extends ClosedForm {
        Linear(double[] values) {
            super("linear", values);
        }

        @Override
        public double value(double r) {
            return p[0] * r + p[1];
        }

        @Override
        public void values(double[] radii, double[] into, int count) {
            for (int i = 0; i < count; i++) {
                into[i] = p[0] * radii[i] + p[1];
            }
        }

        @Override
        public double slope(double r) {
            return p[0];
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            return parameter == 0 ? r : 1;
        }

        @Override
        public double roundingBound(double r) {
            return Rounding.relative(p[0] * r, 1) + (p[1] == 0 ? 0 : Rounding.relative(value(r), 1));
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.FINITE;
        }

        @Override
        public TailBehaviour tail() {
            return p[0] == 0 ? TailBehaviour.constant(p[1]) : TailBehaviour.power(1, p[0]);
        }
    }
}
