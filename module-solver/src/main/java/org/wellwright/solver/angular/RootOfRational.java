package org.wellwright.solver.angular;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.util.Objects;
import org.apache.commons.math3.fraction.BigFraction;

/**
 * An exact number ±√(p/q), the form of every coupling coefficient.
 *
 * @param signedSquare sign(x)·x², in lowest terms
 */
public record RootOfRational(BigFraction signedSquare) {
    /** The number 0. */
    public static final RootOfRational ZERO = new RootOfRational(BigFraction.ZERO);

    private static final MathContext DIGITS = new MathContext(40);

    /** Checks that there is a number. */
    public RootOfRational {
        Objects.requireNonNull(signedSquare, "signedSquare");
    }

    /** −1, 0 or 1. */
    public int sign() {
        return signedSquare.getNumerator().signum();
    }

    /** x² in lowest terms. */
    public BigFraction square() {
        return signedSquare.abs();
    }

    /** The product with another such number. */
    public RootOfRational times(RootOfRational other) {
        BigFraction product = square().multiply(other.square());
        return new RootOfRational(sign() * other.sign() < 0 ? product.negate() : product);
    }

    /** The value to 40 digits. */
    public BigDecimal decimal() {
        BigDecimal root = new BigDecimal(square().getNumerator())
                .divide(new BigDecimal(square().getDenominator()), DIGITS)
                .sqrt(DIGITS);
        return sign() < 0 ? root.negate() : root;
    }

    /** The nearest double. */
    public double value() {
        return decimal().doubleValue();
    }

    /** Plain text, for instance "-sqrt(10/143)" or "1/2". */
    @Override
    public String toString() {
        BigInteger p = square().getNumerator();
        BigInteger q = square().getDenominator();
        String minus = sign() < 0 ? "-" : "";
        BigInteger[] rootP = p.sqrtAndRemainder();
        BigInteger[] rootQ = q.sqrtAndRemainder();
        if (rootP[1].signum() == 0 && rootQ[1].signum() == 0) {
            return minus + ratio(rootP[0], rootQ[0]);
        }
        return minus + "sqrt(" + ratio(p, q) + ")";
    }

    private static String ratio(BigInteger p, BigInteger q) {
        return q.equals(BigInteger.ONE) ? p.toString() : p + "/" + q;
    }
}
