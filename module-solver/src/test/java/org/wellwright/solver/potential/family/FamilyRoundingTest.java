package org.wellwright.solver.potential.family;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.apache.commons.math3.dfp.Dfp;
import org.apache.commons.math3.dfp.DfpField;
import org.apache.commons.math3.dfp.DfpMath;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * Rounding bounds of the families in closed form against the arbitrary-precision arithmetic of Apache Commons Math at
 * 50 digits.
 */
class FamilyRoundingTest {
    private static final DfpField FIELD = new DfpField(50);

    private static Dfp of(double x) {
        return FIELD.newDfp(x);
    }

    private interface Exact {
        Dfp at(Dfp[] p, Dfp r);
    }

    private static Dfp integerPower(Dfp x, int n) {
        Dfp result = FIELD.getOne();
        for (int i = 0; i < n; i++) {
            result = result.multiply(x);
        }
        return result;
    }

    enum Case {
        COULOMB("coulomb", (p, r) -> p[0].negate().divide(r), 2),
        YUKAWA(
                "yukawa",
                (p, r) -> p[0].negate()
                        .multiply(DfpMath.exp(p[1].multiply(r).negate()))
                        .divide(r),
                2,
                0.3),
        MORSE(
                "morse",
                (p, r) -> {
                    Dfp y = DfpMath.exp(p[1].multiply(r.subtract(p[2])).negate());
                    return p[0].multiply(y).multiply(y.subtract(2));
                },
                0.7,
                1.3,
                2.1),
        LENNARD_JONES(
                "lennard-jones",
                (p, r) -> {
                    Dfp s = integerPower(p[1].divide(r), 6);
                    return p[0].multiply(4).multiply(s).multiply(s.subtract(1));
                },
                0.3,
                1.7),
        HARMONIC(
                "harmonic",
                (p, r) -> integerPower(r.subtract(p[1]), 2).multiply(p[0]).divide(2),
                0.7,
                1.1),
        LINEAR("linear", (p, r) -> p[0].multiply(r).add(p[1]), 0.7, -1.1),
        POWER(
                "power",
                (p, r) -> p[0].multiply(DfpMath.exp(DfpMath.log(r.divide(p[1])).multiply(p[2]))),
                0.7,
                1.1,
                -0.37),
        WOODS_SAXON(
                "woods-saxon",
                (p, r) -> p[0].negate()
                        .divide(FIELD.getOne().add(DfpMath.exp(r.subtract(p[1]).divide(p[2])))),
                50,
                5,
                0.6);

        private final String id;
        private final Exact exact;
        private final double[] values;

        Case(String id, Exact exact, double... values) {
            this.id = id;
            this.exact = exact;
            this.values = values;
        }
    }

    @ParameterizedTest
    @EnumSource
    void holdsAndIsNotAbsurdlyWide(Case row) {
        Random random = new Random(17);
        double worst = 0;
        double widest = 0;
        for (int i = 0; i < 2_000; i++) {
            double[] values = row.values.clone();
            Dfp[] precise = new Dfp[values.length];
            for (int j = 0; j < values.length; j++) {
                values[j] *= 0.8 + 0.4 * random.nextDouble();
                precise[j] = of(values[j]);
            }
            TermEvaluator v = FamilyCatalogue.require(row.id).bind(values, ChannelFacts.ofOrbital(0));
            double r = Math.pow(10, -2 + 4 * random.nextDouble());
            double value = v.value(r);
            Dfp exact = row.exact.at(precise, of(r));
            double error = exact.subtract(of(value)).abs().toDouble();
            assertThat(error).as("%s at %s", v.canonical(), r).isLessThanOrEqualTo(v.roundingBound(r));
            worst = Math.max(worst, error / v.roundingBound(r));
            widest = Math.max(widest, v.roundingBound(r) / (Math.abs(value) + 1e-300));
        }
        assertThat(worst).as("largest error over bound").isGreaterThan(0.1);
        assertThat(widest).isGreaterThan(1e-17);
    }
}
