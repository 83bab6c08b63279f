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

    /** slope times the gradient, offset and slope applied to the value: slope·value + offset is the caller's. */
    Quantity mapped(double newValue, double slope) {
        double[] product = new double[gradient.length];
        for (int i = 0; i < product.length; i++) {
            product[i] = slope * gradient[i];
        }
        return of(newValue, product);
    }

    /** newValue with gradient a·this + b·other. */
    Quantity combined(double newValue, double a, Quantity other, double b) {
        double[] sum = new double[gradient.length];
        for (int i = 0; i < sum.length; i++) {
            sum[i] = a * gradient[i] + b * other.gradient[i];
        }
        return of(newValue, sum);
    }
}
