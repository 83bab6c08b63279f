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

/**
 * V = −(k/r)(2α/3π) K(2r/λ), K(x) = ∫₁^∞ e^(−xt)(1 + 1/2t²)√(t² − 1)/t² dt.
 *
 * <p>With t = cosh u the integrand is even and analytic in |Im u| < π/2, so that the trapezoidal rule of step h errs by
 * e^(−π²/h) (Goodwin 1949): below 1e-17 for h = ¼.
 */
@ServiceProvider(service = PotentialFamily.class)
public final class VacuumPolarizationFamily extends BuiltInFamily {
    /** The family. */
    public VacuumPolarizationFamily() {
        super(
                new Description(
                        "vacuum-polarization",
                        "Vacuum polarisation, first order",
                        "-k/r*2*alpha/(3*pi)*K(2*r/lambda), K(x) = integral over t > 1 of exp(-x*t)*(1+1/(2*t^2))*sqrt(t^2-1)/t^2",
                        "Correction to the Coulomb field of a point charge by virtual electron pairs; largest in muonic atoms.",
                        "Uehling 1935"),
                new FamilyParameter("strength", "k", ENERGY_LENGTH, 1, "that of the Coulomb term, positive attracts"),
                new FamilyParameter(
                        "coupling",
                        "alpha",
                        Dimension.NONE,
                        0.0072973525643,
                        "fine-structure constant (CODATA 2022); fixed"),
                new FamilyParameter(
                        "wavelength",
                        "lambda",
                        Dimension.LENGTH,
                        0.0072973525643,
                        "reduced Compton wavelength of the electron, positive"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(2, values[2]);
        return new VacuumPolarization(values);
    }

    private static final class VacuumPolarization extends ClosedForm {
        private static final double STEP = 0.25;
        private static final int NODES = 160;
        private static final double[] COSH = new double[NODES];
        private static final double[] WEIGHT = new double[NODES];

        static {
            for (int i = 0; i < NODES; i++) {
                double c = Math.cosh(i * STEP);
                double t = Math.tanh(i * STEP);
                COSH[i] = c;
                WEIGHT[i] = STEP
                        * t
                        * t
                        * (1 + 1 / (2 * c * c)); // t² from √(t² − 1) dt/t² = sinh² u/cosh² u du; zero at u = 0
            }
        }

        VacuumPolarization(double[] values) {
            super("vacuum-polarization", values);
        }

        /** ∫ t^power e^(−xt) (1 + 1/2t²)√(t² − 1)/t² dt for power 0 or 1. */
        private static double integral(double x, int power) {
            double sum = 0;
            for (int i = 1; i < NODES; i++) {
                double exponent = x * COSH[i];
                if (exponent > 745) {
                    break;
                }
                double term = WEIGHT[i] * Math.exp(-exponent);
                sum += power == 0 ? term : term * COSH[i];
            }
            return sum;
        }

        private double factor() {
            return -p[0] * 2 * p[1] / (3 * Math.PI);
        }

        private double argument(double r) {
            return 2 * r / p[2];
        }

        @Override
        public double value(double r) {
            return factor() / r * integral(argument(r), 0);
        }

        @Override
        public double slope(double r) {
            double x = argument(r);
            return -factor() / r * (integral(x, 0) + x * integral(x, 1)) / r;
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double x = argument(r);
            return switch (parameter) {
                case 0 -> -2 * p[1] / (3 * Math.PI) / r * integral(x, 0);
                case 1 -> -p[0] * 2 / (3 * Math.PI) / r * integral(x, 0);
                default -> factor() / r * integral(x, 1) * x / p[2];
            };
        }

        @Override
        public double roundingBound(double r) {
            double x = argument(r);
            double inside = x * integral(x, 1) * 5
                    + integral(x, 0) * 200; // the exponents carry 4 units of x t each, the sum its terms
            return Rounding.relative(factor() / r * inside, 1) + Math.abs(factor() / r) * Double.MIN_NORMAL;
        }

        @Override
        public OriginBehaviour origin() {
            // −(2αk/3π)(−ln x − γ − 5/6)/r: a logarithm on top of 1/r.
            return new OriginBehaviour(0, -1, factor(), false);
        }

        @Override
        public TailBehaviour tail() {
            return TailBehaviour.ZERO;
        }
    }
}
