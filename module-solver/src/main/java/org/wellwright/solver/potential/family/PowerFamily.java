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

/** V = A (r/b)^ν. */
@ServiceProvider(service = PotentialFamily.class)
public final class PowerFamily extends BuiltInFamily {
    /** The family. */
    public PowerFamily() {
        super(
                new Description(
                        "power",
                        "Power",
                        "A*(r/b)^nu",
                        "Any power of r; A is the value at r = b. With nu <= -2 and A < 0 the pair falls to the centre.",
                        "Quigg and Rosner 1979"),
                new FamilyParameter("amplitude", "A", Dimension.ENERGY, 1, "value at r = b"),
                new FamilyParameter(
                        "unitRadius", "b", Dimension.LENGTH, 1, "radius that scales r, positive; fixed as a rule"),
                new FamilyParameter("exponent", "nu", Dimension.NONE, 1, "any number"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(1, values[1]);
        return new Power(values);
    }

    private static final class Power extends ClosedForm {
        Power(double[] values) {
            super("power", values);
        }

        @Override
        public double value(double r) {
            return p[0] == 0 ? 0 : p[0] * Math.pow(r / p[1], p[2]);
        }

        @Override
        public double slope(double r) {
            return p[0] == 0 ? 0 : p[0] * p[2] * Math.pow(r / p[1], p[2]) / r;
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            double power = Math.pow(r / p[1], p[2]);
            return switch (parameter) {
                case 0 -> power;
                case 1 -> p[0] == 0 ? 0 : -p[0] * p[2] * power / p[1];
                default -> p[0] == 0 ? 0 : p[0] * power * Math.log(r / p[1]);
            };
        }

        @Override
        public double roundingBound(double r) {
            double units = 4 + (p[1] == 1 ? 0 : Math.abs(p[2]));
            return p[0] == 0 ? 0 : Rounding.relative(value(r), units) + Math.abs(p[0]) * Double.MIN_VALUE;
        }

        @Override
        public OriginBehaviour origin() {
            return OriginBehaviour.power(p[2], p[0] * Math.pow(p[1], -p[2]));
        }

        @Override
        public TailBehaviour tail() {
            return p[2] == 0 ? TailBehaviour.constant(p[0]) : TailBehaviour.power(p[2], p[0] * Math.pow(p[1], -p[2]));
        }
    }
}
