package org.wellwright.solver.potential.family;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/**
 * The field of a charge spread as f(r) = 1/(1 + e^((r − c)/a)).
 *
 * <p>With W = c³ + π²a²c − 6a³S₃(−c/a) and S_k(x) = Σ (−1)ⁿ e^(nx)/n^k, term-by-term integration of Poisson's equation
 * gives V = −(3k/W) G, G = c²/2 + π²a²/6 − r²/6 − a²S₂(y) + 2a³[S₃(y) − S₃(−c/a)]/r, y = (r − c)/a, for r ≤ c, and V =
 * −k/r − (3k/W)[a²S₂(−y) + 2a³S₃(−y)/r] for r ≥ c (after Parpia and Mohanty 1992).
 */
@ServiceProvider(service = PotentialFamily.class)
public final class FermiNucleusFamily extends BuiltInFamily {
    /** The family. */
    public FermiNucleusFamily() {
        super(
                new Description(
                        "nucleus-fermi",
                        "Nucleus: two-parameter Fermi charge",
                        "field of the charge k spread as 1/(1+exp((r-c)/a))",
                        "A point charge in the field of a heavy nucleus; c above 2 a.",
                        "Parpia and Mohanty 1992"),
                new FamilyParameter(
                        "strength", "k", ENERGY_LENGTH, 1, "positive attracts; the charge seen from outside"),
                new FamilyParameter(
                        "halfRadius",
                        "c",
                        Dimension.LENGTH,
                        1,
                        "where the density has half its central value, above 2 a"),
                new FamilyParameter("diffuseness", "a", Dimension.LENGTH, 0.1, "skin thickness over 4 ln 3, positive"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(2, values[2]);
        require(values[1] > 2 * values[2], 1, "above twice the diffuseness", values[1]);
        return new FermiNucleus(values);
    }

    private static final class FermiNucleus extends ClosedForm {
        private static final double PI2 = Math.PI * Math.PI;
        private static final GaussIntegrator FROM_ZERO_TO_ONE = new GaussIntegratorFactory().legendre(20, 0, 1);

        private final double k;
        private final double c;
        private final double a;
        private final double w;

        FermiNucleus(double[] values) {
            super("nucleus-fermi", values);
            this.k = values[0];
            this.c = values[1];
            this.a = values[2];
            this.w = c * c * c + PI2 * a * a * c - 6 * a * a * a * AlternatingSum.fermi(3, -c / a);
        }

        private double bracket(double r) {
            double y = (r - c) / a;
            return c * c / 2
                    + PI2 * a * a / 6
                    - r * r / 6
                    - a * a * AlternatingSum.fermi(2, y)
                    + 2 * a * a * a * AlternatingSum.fermiDifference(3, y, r / a) / r;
        }

        private double skin(double r) {
            double x = (c - r) / a;
            if (x < -45) {
                return 0; // below 1e-19 of 1
            }
            return a * a * AlternatingSum.fermi(2, x) + 2 * a * a * a * AlternatingSum.fermi(3, x) / r;
        }

        @Override
        public double value(double r) {
            return r <= c ? -3 * k * bracket(r) / w : -k / r - 3 * k * skin(r) / w;
        }

        @Override
        public double slope(double r) {
            return 3 * k * enclosed(r) / w / r / r;
        }

        /** ∫ s² f ds from 0 to r. */
        private double enclosed(double r) {
            if (r < a) {
                return r * r * r * FROM_ZERO_TO_ONE.integrate(t -> t * t / (1 + Math.exp((t * r - c) / a)));
            }
            if (r <= c) {
                double y = (r - c) / a;
                return r * r * r / 3
                        + r * r * a * AlternatingSum.fermi(1, y)
                        - 2 * r * a * a * AlternatingSum.fermi(2, y)
                        + 2 * a * a * a * AlternatingSum.fermiDifference(3, y, r / a);
            }
            double x = (c - r) / a;
            return w / 3
                    + r * r * a * AlternatingSum.fermi(1, x)
                    + 2 * r * a * a * AlternatingSum.fermi(2, x)
                    + 2 * a * a * a * AlternatingSum.fermi(3, x);
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            return switch (parameter) {
                case 0 -> value(r) / k;
                case 1 -> byRadius(r);
                // V has the dimension k/length: r ∂V/∂r + c ∂V/∂c + a ∂V/∂a = −V.
                default -> -(value(r) + r * slope(r) + c * byRadius(r)) / a;
            };
        }

        private double byRadius(double r) {
            double wByC = 3 * c * c + PI2 * a * a + 6 * a * a * AlternatingSum.fermi(2, -c / a);
            if (r <= c) {
                double y = (r - c) / a;
                double bracketByC = c
                        + a * AlternatingSum.fermi(1, y)
                        - 2 * a * a * AlternatingSum.fermiDifference(2, y, r / a) / r;
                return -3 * k * (bracketByC * w - bracket(r) * wByC) / (w * w);
            }
            double x = (c - r) / a;
            double skinByC = a * AlternatingSum.fermi(1, x) + 2 * a * a * AlternatingSum.fermi(2, x) / r;
            return -3 * k * (skinByC * w - skin(r) * wByC) / (w * w);
        }

        @Override
        public double roundingBound(double r) {
            // Each sum is good to some units of its first term; arguments carry 2|y| units.
            double units = 60 + 4 * Math.min(60, Math.abs(r - c) / a);
            double size = r <= c ? Math.abs(3 * k / w) * (c * c / 2 + PI2 * a * a / 6) : Math.abs(k / r);
            return Rounding.relative(size, units);
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.FINITE;
        }

        @Override
        public TailBehaviour tail() {
            return TailBehaviour.power(-1, -k);
        }
    }
}
