package org.wellwright.solver.angular;

/** x^n times a factor, with the exponent kept apart so that x^n alone may underflow. */
final class ScaledPower {
    private ScaledPower() {}

    /** factor · base^power for power ≥ 0; 0⁰ = 1. */
    static double times(double factor, double base, int power) {
        if (power == 0) {
            return factor;
        }
        if (base == 0) {
            return 0;
        }
        int exponent = Math.getExponent(base) + 1;
        double mantissa = Math.scalb(base, -exponent);
        // |mantissa| is in [½, 1): up to the 500th power stays above 1e-151.
        double value = factor;
        int left = power;
        long scale = (long) exponent * power;
        while (left > 500) {
            value *= Math.pow(mantissa, 500);
            scale += Math.getExponent(value);
            value = Math.scalb(value, -Math.getExponent(value));
            left -= 500;
        }
        value *= Math.pow(mantissa, left);
        return Math.scalb(value, (int) Math.max(scale, -5000));
    }
}
