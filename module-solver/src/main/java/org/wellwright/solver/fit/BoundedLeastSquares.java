package org.wellwright.solver.fit;

import java.util.Arrays;
import org.apache.commons.math3.exception.ConvergenceException;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.apache.commons.math3.exception.TooManyIterationsException;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresBuilder;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresOptimizer;
import org.apache.commons.math3.fitting.leastsquares.LevenbergMarquardtOptimizer;
import org.apache.commons.math3.fitting.leastsquares.MultivariateJacobianFunction;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import org.apache.commons.math3.util.Pair;
import org.wellwright.solver.Problem;
import org.wellwright.solver.SolverException;

/**
 * Least squares within bounds: the method of Levenberg (1944) and Marquardt (1963) in the form of Moré (1978), around
 * it an active set. A variable that ends at a bound which the gradient presses it against is held there; it is let go
 * when the gradient turns (the conditions of Karush, Kuhn and Tucker).
 *
 * <p>A trial point where the residuals do not exist counts as worse than any other, so the step is shortened.
 */
final class BoundedLeastSquares {
    /** Larger than any residual, small enough to be squared and summed. */
    private static final double IMPOSSIBLE = 1e100;

    private static final double TOLERANCE = 1e-12;

    /** Cosine between residuals and a column of the Jacobian below which a point counts as stationary. */
    private static final double STATIONARY = 1e-5;

    private static final int POLISHING_STEPS = 3;

    private final ResidualFunction function;
    private final double[] lower;
    private final double[] upper;
    private final int maximumIterations;

    private double[] best;
    private ResidualFunction.Evaluation bestEvaluation;
    private Problem lastImpossible;
    private int iterations;

    private BoundedLeastSquares(ResidualFunction function, double[] lower, double[] upper, int maximumIterations) {
        this.function = function;
        this.lower = lower.clone();
        this.upper = upper.clone();
        this.maximumIterations = maximumIterations;
    }

    /** Where a search ended. */
    static final class Minimum {
        private final double[] point;
        private final ResidualFunction.Evaluation evaluation;
        private final int[] bounds;
        private final int iterations;
        private final boolean converged;

        private Minimum(
                double[] point,
                ResidualFunction.Evaluation evaluation,
                int[] bounds,
                int iterations,
                boolean converged) {
            this.point = point;
            this.evaluation = evaluation;
            this.bounds = bounds;
            this.iterations = iterations;
            this.converged = converged;
        }

        double[] point() {
            return point.clone();
        }

        ResidualFunction.Evaluation evaluation() {
            return evaluation;
        }

        /** −1 where the lower, +1 where the upper bound holds a variable, otherwise 0. */
        int bound(int variable) {
            return bounds[variable];
        }

        int iterations() {
            return iterations;
        }

        boolean converged() {
            return converged;
        }
    }

    /**
     * Finds a minimum.
     *
     * @param start first point, within the bounds; the residuals must exist there
     * @throws SolverException if the residuals do not exist at the start, or the search is stopped by points where they
     *     do not
     */
    static Minimum minimize(
            ResidualFunction function, double[] start, double[] lower, double[] upper, int maximumIterations) {
        return new BoundedLeastSquares(function, lower, upper, maximumIterations).run(start);
    }

    private Minimum run(double[] start) {
        int n = start.length;
        best = start.clone();
        bestEvaluation = function.evaluate(best);
        if (!bestEvaluation.possible()) {
            Problem problem = bestEvaluation.problem();
            throw new SolverException(problem.what(), problem.where(), problem.remedy());
        }
        int[] held = new int[n];
        boolean converged = n == 0;
        for (int round = 0; n > 0 && round < 4 * n + 4; round++) {
            converged = search(held);
            if (!regroup(held)) {
                break;
            }
        }
        polish(held);
        if (n > 0) {
            boolean stationary = stationary(held);
            if (!stationary && lastImpossible != null) {
                throw new SolverException(
                        "the fit was stopped by trial values for which there is no result: " + lastImpossible.what(),
                        lastImpossible.where(),
                        "start closer to the solution, set bounds, or leave that datum out");
            }
            converged |= stationary;
        }
        return new Minimum(best, bestEvaluation, held, iterations, converged);
    }

    /** One search over the variables that are not held; false if it ran out of iterations. */
    private boolean search(int[] held) {
        int[] free = indices(held);
        if (free.length == 0) {
            return true;
        }
        double[] base = best.clone();
        MultivariateJacobianFunction model = point -> {
            double[] x = spread(base, free, point.toArray());
            ResidualFunction.Evaluation evaluation = visit(x);
            double[] residuals = new double[function.rows()];
            double[][] jacobian = new double[function.rows()][free.length];
            for (int i = 0; i < residuals.length; i++) {
                residuals[i] = evaluation.possible() ? evaluation.residual(i) : IMPOSSIBLE;
                for (int j = 0; evaluation.possible() && j < free.length; j++) {
                    jacobian[i][j] = evaluation.slope(i, free[j]);
                }
            }
            RealVector values = new ArrayRealVector(residuals, false);
            RealMatrix slopes = new Array2DRowRealMatrix(jacobian, false);
            return new Pair<>(values, slopes);
        };
        LeastSquaresBuilder builder = new LeastSquaresBuilder()
                .model(model)
                .start(gather(best, free))
                .target(new double[function.rows()])
                .maxIterations(Math.max(1, maximumIterations - iterations))
                .maxEvaluations(20 * maximumIterations + 100)
                .parameterValidator(point -> clamp(point, free));
        try {
            LeastSquaresOptimizer.Optimum optimum = new LevenbergMarquardtOptimizer()
                    .withCostRelativeTolerance(TOLERANCE)
                    .withParameterRelativeTolerance(TOLERANCE)
                    .withOrthoTolerance(TOLERANCE)
                    .optimize(builder.build());
            iterations += optimum.getIterations();
            return true;
        } catch (ConvergenceException limitOfArithmetic) {
            // The tolerances are below what rounding allows: the best point so far is the answer.
            iterations++;
            return true;
        } catch (TooManyIterationsException | TooManyEvaluationsException ended) {
            iterations = maximumIterations;
            return false;
        }
    }

    private ResidualFunction.Evaluation visit(double[] x) {
        if (Arrays.equals(x, best)) {
            return bestEvaluation;
        }
        ResidualFunction.Evaluation evaluation = function.evaluate(x);
        if (!evaluation.possible()) {
            lastImpossible = evaluation.problem();
        } else if (evaluation.sumOfSquares() < bestEvaluation.sumOfSquares()) {
            best = x.clone();
            bestEvaluation = evaluation;
        }
        return evaluation;
    }

    /** Holds what presses against a bound, lets go what does not; whether anything changed. */
    private boolean regroup(int[] held) {
        boolean changed = false;
        for (int j = 0; j < held.length; j++) {
            double gradient = gradient(j);
            int pressed = best[j] <= lower[j] && gradient > 0 ? -1 : best[j] >= upper[j] && gradient < 0 ? 1 : 0;
            changed |= pressed != held[j];
            held[j] = pressed;
        }
        return changed;
    }

    /** Gauss–Newton steps from the end of the search, as long as they lower the sum: their error is quadratic. */
    private void polish(int[] held) {
        int[] free = indices(held);
        for (int step = 0; step < POLISHING_STEPS && free.length > 0; step++) {
            double before = bestEvaluation.sumOfSquares();
            double[] scales = new double[free.length];
            RealMatrix scaled = new Array2DRowRealMatrix(function.rows(), free.length);
            for (int j = 0; j < free.length; j++) {
                scales[j] = columnNorm(free[j]);
                for (int i = 0; scales[j] > 0 && i < function.rows(); i++) {
                    scaled.setEntry(i, j, bestEvaluation.slope(i, free[j]) / scales[j]);
                }
            }
            RealVector target = new ArrayRealVector(bestEvaluation.residuals()).mapMultiply(-1);
            double[] move = new SingularValueDecomposition(scaled)
                    .getSolver()
                    .solve(target)
                    .toArray();
            double[] x = best.clone();
            for (int j = 0; j < free.length; j++) {
                double changed = x[free[j]] + (scales[j] > 0 ? move[j] / scales[j] : 0);
                x[free[j]] = Math.min(upper[free[j]], Math.max(lower[free[j]], changed));
            }
            visit(x);
            if (!(bestEvaluation.sumOfSquares() < before)) {
                return;
            }
        }
    }

    private boolean stationary(int[] held) {
        double length = Math.sqrt(bestEvaluation.sumOfSquares());
        if (length < 1e-8 * Math.sqrt(function.rows())) {
            return true;
        }
        for (int j : indices(held)) {
            double norm = columnNorm(j);
            if (norm > 0 && Math.abs(gradient(j)) > STATIONARY * norm * length) {
                return false;
            }
        }
        return true;
    }

    private double gradient(int variable) {
        double sum = 0;
        for (int i = 0; i < function.rows(); i++) {
            sum += bestEvaluation.residual(i) * bestEvaluation.slope(i, variable);
        }
        return sum;
    }

    private double columnNorm(int variable) {
        double sum = 0;
        for (int i = 0; i < function.rows(); i++) {
            sum = Math.hypot(sum, bestEvaluation.slope(i, variable));
        }
        return sum;
    }

    private RealVector clamp(RealVector point, int[] free) {
        RealVector inside = point.copy();
        for (int j = 0; j < free.length; j++) {
            inside.setEntry(j, Math.min(upper[free[j]], Math.max(lower[free[j]], point.getEntry(j))));
        }
        return inside;
    }

    private static int[] indices(int[] held) {
        int count = 0;
        int[] free = new int[held.length];
        for (int j = 0; j < held.length; j++) {
            if (held[j] == 0) {
                free[count++] = j;
            }
        }
        return Arrays.copyOf(free, count);
    }

    private static double[] gather(double[] x, int[] free) {
        double[] part = new double[free.length];
        for (int j = 0; j < free.length; j++) {
            part[j] = x[free[j]];
        }
        return part;
    }

    private static double[] spread(double[] base, int[] free, double[] part) {
        double[] x = base.clone();
        for (int j = 0; j < free.length; j++) {
            x[free[j]] = part[j];
        }
        return x;
    }
}
