package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;

/** V = −k e^(−αr)/r. */
@ServiceProvider(service = PotentialFamily.class)
public final class YukawaFamily extends BuiltInFamily {
    /** The family. */
    public YukawaFamily() {
        super(
                new Description(
                        "yukawa",
                        "Yukawa (screened Coulomb)",
                        "-k*exp(-alpha*r)/r",
                        "Exchange of one massive quantum, static screening; alpha = 0 is Coulomb.",
                        "Yukawa 1935"),
                new FamilyParameter("strength", "k", ENERGY_LENGTH, 1, "positive attracts"),
                new FamilyParameter("screening", "alpha", INVERSE_LENGTH, 0.1, "inverse range, zero or positive"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requireNotNegative(1, values[1]);
        return new Yukawa(values);
    }

    private static final class Yukawa extends ClosedForm {
        Yukawa(double[] values) {
            super("yukawa", values);
        }

        @Override
        public double value(double r) {
            return -p[0] * Math.exp(-p[1] * r) / r;
        }

        @Override
        public void values(double[] radii, double[] into, int count) {
            double k = -p[0];
            double a = -p[1];
            for (int i = 0; i < count; i++) {
                into[i] = k * Math.exp(a * radii[i]) / radii[i];
            }
        }

        @Override
        public double slope(double r) {
            return p[0] * Math.exp(-p[1] * r) * (1 + p[1] * r) / r / r;
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double e = Math.exp(-p[1] * r);
            return parameter == 0 ? -e / r : p[0] * e;
        }

        @Override
        public double roundingBound(double r) {
            return Rounding.relative(value(r), p[1] * r + 5) + Math.abs(p[0] / r) * Double.MIN_VALUE;
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.power(-1, -p[0]);
        }

        @Override
        public TailBehaviour tail() {
            return p[1] > 0 ? TailBehaviour.ZERO : TailBehaviour.power(-1, -p[0]);
        }
    }
}
