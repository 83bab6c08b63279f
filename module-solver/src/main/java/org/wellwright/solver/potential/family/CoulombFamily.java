package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;

/** V = −k/r. */
@ServiceProvider(service = PotentialFamily.class)
public final class CoulombFamily extends BuiltInFamily {
    /** The family. */
    public CoulombFamily() {
        super(
                new Description(
                        "coulomb",
                        "Coulomb",
                        "-k/r",
                        "Two point charges at rest; k = Z1 Z2 e^2/(4 pi eps0 epsr) for opposite charges.",
                        "Coulomb 1785"),
                new FamilyParameter(
                        "strength",
                        "k",
                        ENERGY_LENGTH,
                        1,
                        "positive attracts; in atomic units the product of the charges"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        return new Coulomb(values);
    }

    private static final class Coulomb extends ClosedForm {
        Coulomb(double[] values) {
            super("coulomb", values);
        }

        @Override
        public double value(double r) {
            return -p[0] / r;
        }

        @Override
        public void values(double[] radii, double[] into, int count) {
            double k = -p[0];
            for (int i = 0; i < count; i++) {
                into[i] = k / radii[i];
            }
        }

        @Override
        public double slope(double r) {
            return p[0] / r / r;
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            return -1 / r;
        }

        @Override
        public double roundingBound(double r) {
            return Rounding.relative(value(r), 1);
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.power(-1, -p[0]);
        }

        @Override
        public TailBehaviour tail() {
            return TailBehaviour.power(-1, -p[0]);
        }
    }
}
