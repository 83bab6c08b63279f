package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.wellwright.solver.model.ModelError;
import org.wellwright.solver.model.Weighting;

/** Repeats a least-squares search while the scale of σ, or σ_mod, follows the residuals, and keeps where it ended. */
final class Reweighting {
    private static final double STEADY = 1e-7;

    private final FitObjective.Setup setup;
    private final FitObjective.QuantitySource quantities;
    private final double[] lower;
    private final double[] upper;
    private final int maximumIterations;

    private Weights weights;
    private double searchedScale = 1;
    private double[] x;
    private BoundedLeastSquares.Minimum minimum;
    private Linearization linearization;
    private List<Integer> columns = List.of();
    private int iterations;

    Reweighting(FitObjective.Setup setup, FitObjective.QuantitySource quantities, int maximumIterations) {
        this.setup = setup;
        this.quantities = quantities;
        this.maximumIterations = maximumIterations;
        int n = setup.variables();
        this.lower = new double[n];
        this.upper = new double[n];
        for (int j = 0; j < n; j++) {
            boolean number = j < setup.free().size();
            lower[j] = number && setup.number(j).setting().lower() != null
                    ? setup.number(j).setting().lower().value()
                    : Double.NEGATIVE_INFINITY;
            upper[j] = number && setup.number(j).setting().upper() != null
                    ? setup.number(j).setting().upper().value()
                    : Double.POSITIVE_INFINITY;
        }
    }

    void run(Weights start, double[] from, Weighting mode, ModelError error, int most) {
        weights = start;
        x = from.clone();
        boolean fitted = error.parts().stream().anyMatch(ModelError.Part::fitted);
        boolean absolute = !setup.priors().isEmpty() || !setup.knownGroups().isEmpty();
        search();
        if (mode == Weighting.KNOWN && !fitted) {
            return;
        }
        for (int round = 0; round < most; round++) {
            Weights next = mode == Weighting.KNOWN ? withModelErrors(error) : weights.withScale(estimatedScale());
            boolean steady = steady(next, error.parts().size());
            weights = next;
            boolean last = mode != Weighting.KNOWN && (!absolute || !(weights.scale() > 0));
            if (last || steady) {
                linearize();
                return;
            }
            search();
        }
    }

    private void search() {
        FitObjective objective = new FitObjective(setup, weights, quantities);
        searchedScale = weights.scale();
        minimum = BoundedLeastSquares.minimize(objective, x, lower, upper, maximumIterations);
        x = minimum.point();
        iterations += minimum.iterations();
        linearize();
    }

    /** Covariance at the point reached, with the weights of now: data rows were found with those of the last search. */
    private void linearize() {
        columns = new ArrayList<>();
        for (int j = 0; j < x.length; j++) {
            if (minimum.bound(j) == 0) {
                columns.add(j);
            }
        }
        double[][] jacobian = minimum.evaluation().jacobian();
        double rescale = weights.scale() > 0 ? searchedScale / weights.scale() : 1;
        double[][] rescaled = new double[jacobian.length][];
        for (int i = 0; i < jacobian.length; i++) {
            rescaled[i] = jacobian[i].clone();
            for (int j = 0; i < setup.rows().size() && j < rescaled[i].length; j++) {
                rescaled[i][j] *= rescale;
            }
        }
        linearization = Linearization.of(rescaled, columns);
    }

    private double estimatedScale() {
        double sum = 0;
        double freedom = 0;
        for (int i = 0; i < setup.rows().size(); i++) {
            double stated = minimum.evaluation().residual(i) * searchedScale;
            sum += stated * stated;
            freedom += 1 - linearization.leverage(i);
        }
        return freedom > 1e-6 ? Math.sqrt(sum / freedom) : Double.NaN;
    }

    private Weights withModelErrors(ModelError error) {
        Weights next = weights;
        for (int k = 0; k < error.parts().size(); k++) {
            if (error.parts().get(k).fitted()) {
                next = next.withModelSigma(k, likeliest(k));
            }
        }
        return next;
    }

    /** The σ_mod of a part that maximises the likelihood of the residuals as they are. */
    private double likeliest(int part) {
        List<double[]> terms = new ArrayList<>();
        double largest = 0;
        for (int row = 0; row < setup.rows().size(); row++) {
            int i = setup.rows().get(row);
            if (weights.part(i) != part) {
                continue;
            }
            double residual = minimum.evaluation().residual(row);
            boolean above = residual < 0;
            double difference = residual * weights.sigma(i, above);
            double stated = weights.statedSigma(i, above);
            double factor = weights.partFactor(i);
            terms.add(new double[] {difference * difference, stated * stated, factor * factor});
            largest = Math.max(largest, Math.abs(difference) / factor);
        }
        if (!(largest > 0)) {
            return 0;
        }
        UnivariateObjectiveFunction objective =
                new UnivariateObjectiveFunction(logSigma -> misfit(terms, Math.exp(2 * logSigma)));
        double top = Math.log(largest) + 2;
        double best = new BrentOptimizer(1e-10, 1e-14)
                .optimize(
                        objective,
                        GoalType.MINIMIZE,
                        new SearchInterval(top - 30, top, Math.log(largest) - 1),
                        new MaxEval(500))
                .getPoint();
        return misfit(terms, 0) <= misfit(terms, Math.exp(2 * best)) ? 0 : Math.exp(best);
    }

    private static double misfit(List<double[]> terms, double square) {
        double sum = 0;
        for (double[] term : terms) {
            double variance = term[1] + square * term[2];
            sum += term[0] / variance + Math.log(variance);
        }
        return sum;
    }

    private boolean steady(Weights next, int parts) {
        boolean steady = Math.abs(next.scale() - weights.scale()) <= STEADY * weights.scale();
        for (int k = 0; k < parts; k++) {
            steady &= Math.abs(next.modelSigma(k) - weights.modelSigma(k)) <= STEADY * weights.modelSigma(k);
        }
        return steady;
    }

    Weights weights() {
        return weights;
    }

    /**
     * What the covariance is multiplied by where the scale is 0 or could not be found and so is not in the weights;
     * otherwise 1.
     */
    double covarianceFactor() {
        return weights.scale() > 0 ? 1 : weights.scale() * weights.scale() / (searchedScale * searchedScale);
    }

    /** Scale of the weights that the minimum's residuals were found with. */
    double searchedScale() {
        return searchedScale;
    }

    double[] point() {
        return x.clone();
    }

    BoundedLeastSquares.Minimum minimum() {
        return minimum;
    }

    Linearization linearization() {
        return linearization;
    }

    /** The variables that are not held at a bound, in the order of the linearization's columns. */
    List<Integer> columns() {
        return columns;
    }

    boolean converged() {
        return minimum.converged();
    }

    int iterations() {
        return iterations;
    }
}
