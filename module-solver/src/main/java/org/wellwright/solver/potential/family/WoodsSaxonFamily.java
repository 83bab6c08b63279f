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

/** V = −V₀/(1 + e^((r − R)/a)). */
@ServiceProvider(service = PotentialFamily.class)
public final class WoodsSaxonFamily extends BuiltInFamily {
    /** The family. */
    public WoodsSaxonFamily() {
        super(
                new Description(
                        "woods-saxon",
                        "Woods-Saxon",
                        "-V0/(1+exp((r-R)/a))",
                        "A nucleon in the mean field of a nucleus.",
                        "Woods and Saxon 1954"),
                new FamilyParameter("depth", "V0", Dimension.ENERGY, 1, "positive attracts"),
                new FamilyParameter("radius", "R", Dimension.LENGTH, 5, "where V = -V0/2"),
                new FamilyParameter("diffuseness", "a", Dimension.LENGTH, 0.5, "positive"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(2, values[2]);
        return new WoodsSaxon(values);
    }

    private static final class WoodsSaxon extends ClosedForm {
        WoodsSaxon(double[] values) {
            super("woods-saxon", values);
        }

        @Override
        public double value(double r) {
            return -p[0] / (1 + Math.exp((r - p[1]) / p[2]));
        }

        @Override
        public void values(double[] radii, double[] into, int count) {
            double depth = -p[0];
            for (int i = 0; i < count; i++) {
                into[i] = depth / (1 + Math.exp((radii[i] - p[1]) / p[2]));
            }
        }

        /** f(1 − f) with f = 1/(1 + e^z), without overflow. */
        private static double bump(double z) {
            double e = Math.exp(-Math.abs(z));
            return e / ((1 + e) * (1 + e));
        }

        @Override
        public double slope(double r) {
            return p[0] * bump((r - p[1]) / p[2]) / p[2];
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double z = (r - p[1]) / p[2];
            return switch (parameter) {
                case 0 -> -1 / (1 + Math.exp(z));
                case 1 -> -p[0] * bump(z) / p[2];
                default -> -p[0] * bump(z) * z / p[2];
            };
        }

        @Override
        public double roundingBound(double r) {
            double z = (r - p[1]) / p[2];
            double e = Math.exp(z);
            // The exponential has relative error (2|z| + 2)u, of which the share e/(1 + e) reaches V.
            double share = e > 1 ? 1 : e;
            return Rounding.relative(value(r), 3 + share * (2 * Math.abs(z) + 2)) + Math.abs(p[0]) * Double.MIN_NORMAL;
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
