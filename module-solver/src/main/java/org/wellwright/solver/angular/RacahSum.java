package org.wellwright.solver.angular;

import java.math.BigInteger;
import org.apache.commons.math3.fraction.BigFraction;

/**
 * A coupling coefficient as √(Π over! / Π under!) · sum with an exact integer sum, which alternates and would lose all
 * digits in floating arithmetic.
 *
 * <p>Racah's sums (Racah 1942, eqs. 15 and 36) written with binomials, so that every term is an integer (Wei 1999);
 * each term follows from the one before by an exact ratio of small integers.
 */
final class RacahSum {
    /** Largest argument of a factorial: j₁ + j₂ + j₃ + 1 of any triad. */
    static final int LARGEST = 1000;

    private static final BigInteger[] FACTORIALS = new BigInteger[LARGEST + 1];
    private static final double[] MANTISSAS = new double[LARGEST + 1];
    private static final int[] EXPONENTS = new int[LARGEST + 1];

    static {
        FACTORIALS[0] = BigInteger.ONE;
        for (int n = 0; n <= LARGEST; n++) {
            if (n > 0) {
                FACTORIALS[n] = FACTORIALS[n - 1].multiply(BigInteger.valueOf(n));
            }
            EXPONENTS[n] = FACTORIALS[n].bitLength();
            MANTISSAS[n] = mantissa(FACTORIALS[n]);
        }
    }

    private final int[] over;
    private final int[] under;
    private final BigInteger sum;

    private RacahSum(int[] over, int[] under, BigInteger sum) {
        this.over = over;
        this.under = under;
        this.sum = sum;
    }

    /** Whether three quantum numbers (doubled) satisfy the triangle rule and sum to an integer. */
    static boolean triangle(int twiceA, int twiceB, int twiceC) {
        return (twiceA + twiceB + twiceC) % 2 == 0 && twiceC <= twiceA + twiceB && twiceC >= Math.abs(twiceA - twiceB);
    }

    /** The 3j symbol (all arguments doubled), or null where a selection rule makes it 0. */
    static RacahSum threeJ(int j1, int j2, int j3, int m1, int m2, int m3) {
        if (m1 + m2 + m3 != 0
                || !triangle(j1, j2, j3)
                || !projection(j1, m1)
                || !projection(j2, m2)
                || !projection(j3, m3)) {
            return null;
        }
        int a = (j1 + j2 - j3) / 2;
        int b = (j1 - j2 + j3) / 2;
        int c = (-j1 + j2 + j3) / 2;
        int d = (j1 - m1) / 2;
        int e = (j2 + m2) / 2;
        int from = Math.max(0, Math.max(d - b, e - c));
        int to = Math.min(a, Math.min(d, e));
        // Σ_k (−1)^k C(a, k) C(b, d − k) C(c, e − k)
        BigInteger term = binomial(a, from).multiply(binomial(b, d - from)).multiply(binomial(c, e - from));
        term = from % 2 == 0 ? term : term.negate();
        BigInteger sum = term;
        for (int k = from; k < to; k++) {
            long up = (long) (a - k) * (d - k) * (e - k);
            long down = (long) (k + 1) * (b - d + k + 1) * (c - e + k + 1);
            term = term.multiply(BigInteger.valueOf(-up)).divide(BigInteger.valueOf(down));
            sum = sum.add(term);
        }
        boolean odd = (j1 - j2 - m3) / 2 % 2 != 0;
        int[] over = {(j1 + m1) / 2, d, e, (j2 - m2) / 2, (j3 + m3) / 2, (j3 - m3) / 2};
        int[] under = {(j1 + j2 + j3) / 2 + 1, a, b, c};
        return new RacahSum(over, under, odd ? sum.negate() : sum);
    }

    /** The 6j symbol {a b c; d e f} (all arguments doubled), or null where a triangle rule makes it 0. */
    static RacahSum sixJ(int a, int b, int c, int d, int e, int f) {
        if (!triangle(a, b, c) || !triangle(a, e, f) || !triangle(d, b, f) || !triangle(d, e, c)) {
            return null;
        }
        int[] over = {
            half(a, e, -f),
            half(a, -e, f),
            half(-a, e, f),
            half(d, b, -f),
            half(d, -b, f),
            half(-d, b, f),
            half(d, e, -c),
            half(d, -e, c),
            half(-d, e, c),
            half(a, b, c) + 1
        };
        int[] under = {
            half(a, e, f) + 1, half(d, b, f) + 1, half(d, e, c) + 1, half(a, b, -c), half(a, -b, c), half(-a, b, c)
        };
        return new RacahSum(over, under, sixJSum(a, b, c, d, e, f));
    }

    /** Σ_n (−1)^n C(n+1, abc+1) C(a+b−c, n−dec) C(a−b+c, n−dbf) C(−a+b+c, n−aef), arguments doubled, triads checked. */
    static BigInteger sixJSum(int a, int b, int c, int d, int e, int f) {
        int abc = half(a, b, c);
        int aef = half(a, e, f);
        int dbf = half(d, b, f);
        int dec = half(d, e, c);
        int abde = (a + b + d + e) / 2;
        int acdf = (a + c + d + f) / 2;
        int bcef = (b + c + e + f) / 2;
        int from = Math.max(Math.max(abc, aef), Math.max(dbf, dec));
        int to = Math.min(abde, Math.min(acdf, bcef));
        BigInteger term = binomial(from + 1, abc + 1)
                .multiply(binomial(half(a, b, -c), from - dec))
                .multiply(binomial(half(a, -b, c), from - dbf))
                .multiply(binomial(half(-a, b, c), from - aef));
        term = from % 2 == 0 ? term : term.negate();
        BigInteger sum = term;
        for (int n = from; n < to; n++) {
            long up = (long) (n + 2) * (abde - n) * (acdf - n) * (bcef - n);
            long down = (long) (n + 1 - abc) * (n + 1 - dec) * (n + 1 - dbf) * (n + 1 - aef);
            term = term.multiply(BigInteger.valueOf(-up)).divide(BigInteger.valueOf(down));
            sum = sum.add(term);
        }
        return sum;
    }

    /** Δ²(abc) = (a+b−c)! (a−b+c)! (−a+b+c)! / (a+b+c+1)!, arguments doubled. */
    static BigFraction deltaSquared(int a, int b, int c) {
        BigInteger over =
                factorial(half(a, b, -c)).multiply(factorial(half(a, -b, c))).multiply(factorial(half(-a, b, c)));
        return new BigFraction(over, factorial(half(a, b, c) + 1));
    }

    /** The coefficient, to a few units of the last place. */
    double value() {
        if (sum.signum() == 0) {
            return 0;
        }
        double mantissa = 1;
        int exponent = 0;
        for (int n : over) {
            mantissa *= MANTISSAS[n];
            exponent += EXPONENTS[n];
        }
        for (int n : under) {
            mantissa /= MANTISSAS[n];
            exponent -= EXPONENTS[n];
        }
        if (exponent % 2 != 0) {
            mantissa *= 2;
            exponent--;
        }
        return Math.scalb(Math.sqrt(mantissa) * mantissa(sum), exponent / 2 + sum.bitLength());
    }

    /** The coefficient, exactly. */
    RootOfRational exact() {
        BigInteger p = sum.multiply(sum);
        for (int n : over) {
            p = p.multiply(factorial(n));
        }
        BigInteger q = BigInteger.ONE;
        for (int n : under) {
            q = q.multiply(factorial(n));
        }
        return new RootOfRational(new BigFraction(sum.signum() < 0 ? p.negate() : p, q));
    }

    private static boolean projection(int twiceJ, int twiceM) {
        return Math.abs(twiceM) <= twiceJ && (twiceJ - twiceM) % 2 == 0;
    }

    private static int half(int a, int b, int c) {
        return (a + b + c) / 2;
    }

    static BigInteger factorial(int n) {
        return FACTORIALS[n];
    }

    private static BigInteger binomial(int n, int k) {
        return FACTORIALS[n].divide(FACTORIALS[k].multiply(FACTORIALS[n - k]));
    }

    /** The number divided by 2^bitLength, in [½, 1) up to sign, rounded once. */
    private static double mantissa(BigInteger number) {
        int excess = number.bitLength() - 64;
        BigInteger leading = excess > 0 ? number.shiftRight(excess) : number;
        return Math.scalb(leading.doubleValue(), -(number.bitLength() - Math.max(excess, 0)));
    }
}
