package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.wellwright.solver.model.Datum;

/** Makes the rows that a user sees from what a model says of the data. */
final class RowReport {
    private RowReport() {}

    /**
     * One row per datum.
     *
     * @param x the point: free numbers, then group errors
     * @param predictedSigma σ of each prediction; NaN without a fit
     */
    static List<ResidualRow> rows(
            FitObjective.Setup setup, Weights weights, List<Quantity> quantities, double[] x, double[] predictedSigma) {
        List<ResidualRow> rows = new ArrayList<>();
        Set<Integer> counted = new HashSet<>(setup.rows());
        for (int i = 0; i < setup.data().size(); i++) {
            Datum datum = setup.data().get(i);
            Quantity quantity = quantities.get(i);
            double measured = datum.value().value();
            if (!quantity.found()) {
                rows.add(new ResidualRow(
                        datum.id(),
                        measured,
                        Double.NaN,
                        Double.NaN,
                        0,
                        weights.sigma(i, false),
                        Double.NaN,
                        datum.unit(),
                        false,
                        quantity.problem()));
                continue;
            }
            double shift =
                    setup.groups().shift(i, quantity.value(), x, setup.free().size());
            double difference = measured - quantity.value() - shift;
            boolean above = difference < 0;
            double sigma = weights.sigma(i, above);
            boolean holds = datum.limit() == Datum.Limit.UPPER && !above || datum.limit() == Datum.Limit.LOWER && above;
            rows.add(new ResidualRow(
                    datum.id(),
                    measured,
                    quantity.value(),
                    predictedSigma[i],
                    shift,
                    sigma,
                    holds ? 0 : difference / sigma,
                    datum.unit(),
                    counted.contains(i),
                    null));
        }
        return rows;
    }

    /** Normalised logarithm of the likelihood of the used data: −½ Σ [r² + ln 2πσ²]; NaN where a σ is missing. */
    static double logLikelihood(List<ResidualRow> rows) {
        double sum = 0;
        for (ResidualRow row : rows) {
            if (row.used()) {
                sum -= 0.5 * (row.residual() * row.residual() + Math.log(2 * Math.PI * row.sigma() * row.sigma()));
            }
        }
        return sum;
    }
}
