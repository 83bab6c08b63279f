package org.wellwright.solver.potential.table;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.apache.commons.math3.dfp.Dfp;
import org.apache.commons.math3.dfp.DfpField;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableInterpolation;
import org.wellwright.solver.potential.TableInterpolation.Abscissa;
import org.wellwright.solver.potential.TableInterpolation.Quantity;
import org.wellwright.solver.potential.TableInterpolation.Spline;

/**
 * The reference solves for the second derivatives of the natural spline at 50 digits (Apache Commons Math), the code
 * under test for its slopes.
 */
class TableRoundingTest {
    private static final DfpField FIELD = new DfpField(50);

    private static Dfp[] secondDerivatives(Dfp[] x, Dfp[] y) {
        int n = x.length;
        Dfp[] c = new Dfp[n];
        Dfp[] d = new Dfp[n];
        c[0] = FIELD.getZero();
        d[0] = FIELD.getZero();
        for (int i = 1; i + 1 < n; i++) {
            Dfp h0 = x[i].subtract(x[i - 1]);
            Dfp h1 = x[i + 1].subtract(x[i]);
            Dfp right = y[i + 1].subtract(y[i])
                    .divide(h1)
                    .subtract(y[i].subtract(y[i - 1]).divide(h0))
                    .multiply(6);
            Dfp pivot = h0.add(h1).multiply(2).subtract(h0.multiply(c[i - 1]));
            c[i] = h1.divide(pivot);
            d[i] = right.subtract(h0.multiply(d[i - 1])).divide(pivot);
        }
        Dfp[] m = new Dfp[n];
        m[n - 1] = FIELD.getZero();
        for (int i = n - 2; i >= 0; i--) {
            m[i] = d[i].subtract(c[i].multiply(m[i + 1]));
        }
        return m;
    }

    private static Dfp spline(Dfp[] x, Dfp[] y, Dfp[] m, Dfp at) {
        int i = 0;
        while (i + 2 < x.length && x[i + 1].lessThan(at)) {
            i++;
        }
        Dfp h = x[i + 1].subtract(x[i]);
        Dfp a = x[i + 1].subtract(at).divide(h);
        Dfp b = at.subtract(x[i]).divide(h);
        Dfp cubicA = a.multiply(a).multiply(a).subtract(a).multiply(m[i]);
        Dfp cubicB = b.multiply(b).multiply(b).subtract(b).multiply(m[i + 1]);
        return a.multiply(y[i])
                .add(b.multiply(y[i + 1]))
                .add(cubicA.add(cubicB).multiply(h).multiply(h).divide(6));
    }

    @Test
    void boundHoldsForNaturalSplines() {
        Random random = new Random(31);
        double widest = 0;
        for (int round = 0; round < 40; round++) {
            boolean squared = round % 2 == 0;
            boolean inverse = round / 2 % 2 == 0;
            int n = 8 + random.nextInt(20);
            double[] radii = new double[n];
            double[] values = new double[n];
            double r = 0.5;
            for (int i = 0; i < n; i++) {
                r += 0.02 + random.nextDouble();
                radii[i] = r;
                values[i] = 100 * Math.exp(-3 * r) - 1 / r + 0.01 * random.nextDouble();
            }
            TabulatedPotential v = TabulatedPotential.of(
                    radii,
                    values,
                    new TableInterpolation(
                            squared ? Quantity.RADIUS_SQUARED_TIMES_POTENTIAL : Quantity.POTENTIAL,
                            inverse ? Abscissa.INVERSE_RADIUS : Abscissa.RADIUS,
                            Spline.NATURAL),
                    new TabulatedPotential.Inner(InnerContinuation.Kind.WALL, 0),
                    new TabulatedPotential.Outer(OuterContinuation.Kind.CONSTANT, 0, 0, 1));
            Dfp[] x = new Dfp[n];
            Dfp[] y = new Dfp[n];
            for (int k = 0; k < n; k++) {
                int i = inverse ? n - 1 - k : k;
                Dfp radius = FIELD.newDfp(radii[i]);
                x[k] = inverse ? FIELD.getOne().divide(radius) : radius;
                y[k] = squared ? radius.multiply(radius).multiply(FIELD.newDfp(values[i])) : FIELD.newDfp(values[i]);
            }
            Dfp[] m = secondDerivatives(x, y);
            for (int k = 0; k < 200; k++) {
                double at = radii[0] + (radii[n - 1] - radii[0]) * random.nextDouble();
                Dfp exactRadius = FIELD.newDfp(at);
                Dfp q = spline(x, y, m, inverse ? FIELD.getOne().divide(exactRadius) : exactRadius);
                Dfp exact = squared ? q.divide(exactRadius).divide(exactRadius) : q;
                double error = exact.subtract(FIELD.newDfp(v.value(at))).abs().toDouble();
                double bound = v.roundingBound(at);
                assertThat(error).as("%s at %s", v.canonical(), at).isLessThanOrEqualTo(bound);
                widest = Math.max(widest, bound / 50);
            }
        }
        assertThat(widest).as("bound against the largest value in a table").isLessThan(1e-12);
    }
}
