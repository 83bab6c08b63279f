package org.wellwright.solver.model;

import java.util.Arrays;

/**
 * A number computed from the pool, with its derivative with respect to every number of the pool that it depends on.
 * Immutable.
 *
 * <p>Forward differentiation (Wengert 1964): sums, products and powers carry the chain rule along.
 */
public final class PoolValue {
    private static final int[] NONE = {};
    private static final double[] NO_SLOPES = {};

    private final double value;
    private final int[] indices;
    private final double[] slopes;

    private PoolValue(double value, int[] indices, double[] slopes) {
        this.value = value;
        this.indices = indices;
        this.slopes = slopes;
    }

    /** A number that depends on nothing. */
    public static PoolValue constant(double value) {
        return new PoolValue(value, NONE, NO_SLOPES);
    }

    /** The pool's number of an index. */
    public static PoolValue of(double value, int index) {
        return new PoolValue(value, new int[] {index}, new double[] {1});
    }

    /** Its value. */
    public double value() {
        return value;
    }

    /** Whether it depends on a number of the pool, even where the derivative happens to be 0. */
    public boolean dependsOn(int index) {
        return Arrays.binarySearch(indices, index) >= 0;
    }

    /** Whether it depends on no number of the pool. */
    public boolean constant() {
        return indices.length == 0;
    }

    /** Derivative with respect to the pool's number of an index. */
    public double derivative(int index) {
        int position = Arrays.binarySearch(indices, index);
        return position >= 0 ? slopes[position] : 0;
    }

    /** Adds {@code weight} times the derivatives to a dense gradient. */
    public void addTo(double[] gradient, double weight) {
        for (int i = 0; i < indices.length; i++) {
            gradient[indices[i]] += weight * slopes[i];
        }
    }

    /** Marks the numbers that it depends on. */
    public void markIn(boolean[] used) {
        for (int index : indices) {
            used[index] = true;
        }
    }

    /** This times a number. */
    public PoolValue times(double factor) {
        return new PoolValue(value * factor, indices, scaled(slopes, factor));
    }

    /** This plus another. */
    public PoolValue plus(PoolValue other) {
        return combined(this, 1, other, 1, value + other.value);
    }

    /** This times another. */
    public PoolValue times(PoolValue other) {
        return combined(this, other.value, other, value, value * other.value);
    }

    /** This to a power; this must be positive unless the exponent is an integer. */
    public PoolValue power(double exponent) {
        return new PoolValue(
                Math.pow(value, exponent), indices, scaled(slopes, exponent * Math.pow(value, exponent - 1)));
    }

    /** A function of other values: its value, and its derivative with respect to each of them. */
    static PoolValue chained(double value, PoolValue[] arguments, double[] partials) {
        PoolValue sum = constant(0);
        for (int i = 0; i < arguments.length; i++) {
            sum = combined(sum, 1, arguments[i], partials[i], 0);
        }
        return new PoolValue(value, sum.indices, sum.slopes);
    }

    private static PoolValue combined(PoolValue a, double weightA, PoolValue b, double weightB, double value) {
        if (b.indices.length == 0) {
            return new PoolValue(value, a.indices, scaled(a.slopes, weightA));
        }
        if (a.indices.length == 0) {
            return new PoolValue(value, b.indices, scaled(b.slopes, weightB));
        }
        int[] merged = new int[a.indices.length + b.indices.length];
        double[] slopes = new double[merged.length];
        int i = 0;
        int j = 0;
        int count = 0;
        while (i < a.indices.length || j < b.indices.length) {
            boolean fromA = j == b.indices.length || i < a.indices.length && a.indices[i] <= b.indices[j];
            boolean fromB = i == a.indices.length || j < b.indices.length && b.indices[j] <= a.indices[i];
            merged[count] = fromA ? a.indices[i] : b.indices[j];
            slopes[count] = (fromA ? weightA * a.slopes[i] : 0) + (fromB ? weightB * b.slopes[j] : 0);
            i += fromA ? 1 : 0;
            j += fromB ? 1 : 0;
            count++;
        }
        return new PoolValue(value, Arrays.copyOf(merged, count), Arrays.copyOf(slopes, count));
    }

    private static double[] scaled(double[] slopes, double factor) {
        double[] product = new double[slopes.length];
        for (int i = 0; i < slopes.length; i++) {
            product[i] = slopes[i] * factor;
        }
        return product;
    }
}
