package org.wellwright.solver.angular;

import java.math.BigInteger;
import org.apache.commons.math3.fraction.BigFraction;

/** The coefficients of {@link Coupling} as exact square roots of rationals; same arguments, same rules, same faults. */
public final class ExactCoupling {
    private ExactCoupling() {}

    /** The Clebsch–Gordan coefficient ⟨j₁m₁j₂m₂|JM⟩. */
    public static RootOfRational clebschGordan(
            int twiceJ1, int twiceM1, int twiceJ2, int twiceM2, int twiceTotal, int twiceTotalM) {
        RootOfRational symbol = threeJ(twiceJ1, twiceJ2, twiceTotal, twiceM1, twiceM2, -twiceTotalM);
        return symbol.sign() == 0
                ? symbol
                : new RootOfRational(symbol.signedSquare()
                        .multiply(Coupling.sign(twiceJ1 - twiceJ2 + twiceTotalM) * (twiceTotal + 1)));
    }

    /** The 3j symbol (j₁ j₂ j₃; m₁ m₂ m₃). */
    public static RootOfRational threeJ(int twiceJ1, int twiceJ2, int twiceJ3, int twiceM1, int twiceM2, int twiceM3) {
        Coupling.check(twiceJ1, twiceJ2, twiceJ3);
        RacahSum sum = RacahSum.threeJ(twiceJ1, twiceJ2, twiceJ3, twiceM1, twiceM2, twiceM3);
        return sum == null ? RootOfRational.ZERO : sum.exact();
    }

    /** The 6j symbol {j₁ j₂ j₃; j₄ j₅ j₆}. */
    public static RootOfRational sixJ(int twiceJ1, int twiceJ2, int twiceJ3, int twiceJ4, int twiceJ5, int twiceJ6) {
        Coupling.check(twiceJ1, twiceJ2, twiceJ3, twiceJ4, twiceJ5, twiceJ6);
        RacahSum sum = RacahSum.sixJ(twiceJ1, twiceJ2, twiceJ3, twiceJ4, twiceJ5, twiceJ6);
        return sum == null ? RootOfRational.ZERO : sum.exact();
    }

    /** The 9j symbol with rows (j₁ j₂ j₃), (j₄ j₅ j₆), (j₇ j₈ j₉). */
    public static RootOfRational nineJ(int j1, int j2, int j3, int j4, int j5, int j6, int j7, int j8, int j9) {
        Coupling.check(j1, j2, j3, j4, j5, j6, j7, j8, j9);
        if (!nineTriangles(j1, j2, j3, j4, j5, j6, j7, j8, j9)) {
            return RootOfRational.ZERO;
        }
        int from = Math.max(Math.abs(j1 - j9), Math.max(Math.abs(j4 - j8), Math.abs(j2 - j6)));
        int to = Math.min(j1 + j9, Math.min(j4 + j8, j2 + j6));
        // The triads with x occur twice each, so their Δ are squared and the sum is rational.
        BigFraction sum = BigFraction.ZERO;
        for (int x = from; x <= to; x += 2) {
            BigInteger product = RacahSum.sixJSum(j1, j4, j7, j8, j9, x)
                    .multiply(RacahSum.sixJSum(j2, j5, j8, j4, x, j6))
                    .multiply(RacahSum.sixJSum(j3, j6, j9, x, j1, j2))
                    .multiply(BigInteger.valueOf(x + 1));
            sum = sum.add(RacahSum.deltaSquared(j1, j9, x)
                    .multiply(RacahSum.deltaSquared(j8, j4, x))
                    .multiply(RacahSum.deltaSquared(j2, j6, x))
                    .multiply(product));
        }
        sum = from % 2 == 0 ? sum : sum.negate();
        BigFraction square = RacahSum.deltaSquared(j7, j8, j9)
                .multiply(RacahSum.deltaSquared(j4, j5, j6))
                .multiply(RacahSum.deltaSquared(j1, j2, j3))
                .divide(RacahSum.deltaSquared(j1, j4, j7))
                .divide(RacahSum.deltaSquared(j2, j5, j8))
                .divide(RacahSum.deltaSquared(j3, j6, j9))
                .multiply(sum.multiply(sum));
        return new RootOfRational(sum.getNumerator().signum() < 0 ? square.negate() : square);
    }

    static boolean nineTriangles(int j1, int j2, int j3, int j4, int j5, int j6, int j7, int j8, int j9) {
        return RacahSum.triangle(j1, j2, j3)
                && RacahSum.triangle(j4, j5, j6)
                && RacahSum.triangle(j7, j8, j9)
                && RacahSum.triangle(j1, j4, j7)
                && RacahSum.triangle(j2, j5, j8)
                && RacahSum.triangle(j3, j6, j9);
    }
}
