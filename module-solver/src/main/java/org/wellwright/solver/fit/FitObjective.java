package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.PoolNumber;
import org.wellwright.solver.model.Prior;

/**
 * Weighted residuals of used data, priors and group errors as functions of the free numbers, followed by the group
 * errors.
 *
 * <p>Rows: the used data with a σ in their order, then the priors of free numbers, then the groups of known σ. The
 * residual of a datum is (measured − Q − shift)/σ, of a limit its violation alone, of a prior (value − p)/σ, of a group
 * −b/σ.
 */
final class FitObjective implements ResidualFunction {
    private final Setup setup;
    private final Weights weights;
    private final QuantitySource quantities;

    /** What the model says of the data that count. */
    @FunctionalInterface
    interface QuantitySource {
        /** One quantity per entry of {@link Setup#rows}, in its order. */
        List<Quantity> at(double[] poolValues);
    }

    /**
     * What does not change during a fit.
     *
     * @param assembly the model
     * @param model what it says of data
     * @param data all data of the document
     * @param groups the shared errors
     * @param rows indices of the data that count
     * @param free indices of the pool's numbers that the fit changes
     * @param priors indices among {@code free} of those that have a prior
     * @param base values of all numbers of the pool
     */
    record Setup(
            Assembly assembly,
            DataModel model,
            List<Datum> data,
            GroupErrors groups,
            List<Integer> rows,
            List<Integer> free,
            List<Integer> priors,
            List<Double> base) {

        /** Number of variables. */
        int variables() {
            return free.size() + groups.count();
        }

        PoolNumber number(int variable) {
            return assembly.pool().numbers().get(free.get(variable));
        }

        /** Values of all numbers of the pool at a point. */
        double[] poolValues(double[] x) {
            double[] values = base.stream().mapToDouble(Double::doubleValue).toArray();
            for (int j = 0; j < free.size(); j++) {
                values[free.get(j)] = x[j];
            }
            return values;
        }

        /** Indices of the groups whose σ is known. */
        List<Integer> knownGroups() {
            List<Integer> known = new ArrayList<>();
            for (int k = 0; k < groups.count(); k++) {
                if (!Double.isNaN(groups.priorSigma(k))) {
                    known.add(k);
                }
            }
            return known;
        }
    }

    FitObjective(Setup setup, Weights weights, QuantitySource quantities) {
        this.setup = setup;
        this.weights = weights;
        this.quantities = quantities;
    }

    @Override
    public int rows() {
        return setup.rows().size() + setup.priors().size() + setup.knownGroups().size();
    }

    @Override
    public Evaluation evaluate(double[] x) {
        List<Quantity> found = quantities.at(setup.poolValues(x));
        int n = setup.variables();
        double[] residuals = new double[rows()];
        double[][] jacobian = new double[rows()][n];
        int row = 0;
        for (int i : setup.rows()) {
            Datum datum = setup.data().get(i);
            Quantity quantity = found.get(row);
            if (!quantity.found()) {
                return Evaluation.impossible(named(datum, quantity.problem()));
            }
            residuals[row] = residual(i, quantity, x, jacobian[row]);
            row++;
        }
        for (int j : setup.priors()) {
            Prior prior = setup.number(j).setting().prior();
            residuals[row] = (prior.value().value() - x[j]) / prior.sigma().value();
            jacobian[row][j] = -1 / prior.sigma().value();
            row++;
        }
        for (int k : setup.knownGroups()) {
            int j = setup.free().size() + k;
            residuals[row] = -x[j] / setup.groups().priorSigma(k);
            jacobian[row][j] = -1 / setup.groups().priorSigma(k);
            row++;
        }
        return Evaluation.of(residuals, jacobian);
    }

    private double residual(int i, Quantity quantity, double[] x, double[] slopes) {
        Datum datum = setup.data().get(i);
        int first = setup.free().size();
        GroupErrors groups = setup.groups();
        double difference = datum.value().value() - quantity.value() - groups.shift(i, quantity.value(), x, first);
        boolean above = difference < 0;
        boolean holds = datum.limit() == Datum.Limit.UPPER && !above || datum.limit() == Datum.Limit.LOWER && above;
        if (holds) {
            return 0;
        }
        double sigma = weights.sigma(i, above);
        double gain = groups.gain(i, x, first);
        for (int j = 0; j < first; j++) {
            slopes[j] = -gain * quantity.derivative(setup.free().get(j)) / sigma;
        }
        for (int k = 0; k < groups.count(); k++) {
            slopes[first + k] = -groups.slope(i, k, quantity.value()) / sigma;
        }
        return difference / sigma;
    }

    private static Problem named(Datum datum, Problem problem) {
        return new Problem(
                "the datum '%s' has no prediction: %s".formatted(datum.id(), problem.what()),
                problem.where(),
                problem.remedy());
    }
}
