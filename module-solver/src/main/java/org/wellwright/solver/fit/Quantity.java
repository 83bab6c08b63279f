package org.wellwright.solver.fit;

import org.wellwright.solver.Problem;

/**
 * What a model says of one datum, in the datum's unit, with its gradient over the pool's numbers; or why it says
 * nothing.
 */
final class Quantity {
    private final double value;
    private final double[] gradient;
    private final Problem problem;

    private Quantity(double value, double[] gradient, Problem problem) {
        this.value = value;
        this.gradient = gradient;
        this.problem = problem;
    }

    static Quantity of(double value, double[] gradient) {
        return new Quantity(value, gradient, null);
    }

    static Quantity missing(Problem problem) {
        return new Quantity(Double.NaN, new double[0], problem);
    }

    boolean found() {
        return problem == null;
    }

    Problem problem() {
        return problem;
    }

    double value() {
        return value;
    }

    double derivative(int number) {
        return gradient[number];
    }

    /** A function of this one quantity: its value, and its derivative by this. */
    Quantity mapped(double newValue, double slope) {
        double[] product = new double[gradient.length];
        for (int i = 0; i < product.length; i++) {
            product[i] = slope * gradient[i];
        }
        return of(newValue, product);
    }

    /** A function of this and another quantity: its value, and its derivatives by both. */
    Quantity combined(double newValue, double a, Quantity other, double b) {
        double[] sum = new double[gradient.length];
        for (int i = 0; i < sum.length; i++) {
            sum[i] = a * gradient[i] + b * other.gradient[i];
        }
        return of(newValue, sum);
    }
}
