package org.wellwright.solver.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.radial.SolveMonitor;

/** Compares dE/d(pool number) with differences of energies. */
final class PoolGradients {
    private PoolGradients() {}

    /**
     * Every number of the pool, against a central difference of sixth order, whose error is far below 1e-7 of the
     * derivative.
     *
     * @param step relative step of the difference
     * @param floor derivatives this small (energy per relative change) are compared with it instead of with themselves
     */
    static int assertAgreeWithDifferences(
            ModelDocument document, List<LevelKey> keys, SpectrumSource source, double step, double floor) {
        Assembly assembly = Assembly.of(document, document.models().get(0).name());
        double[] values = assembly.pool().typedValues();
        LevelTable table = LevelTable.solve(assembly, LevelDemand.of(keys), values, source, SolveMonitor.NONE);
        int compared = 0;
        for (int i = 0; i < values.length; i++) {
            double h = step * Math.abs(values[i]);
            assertThat(h)
                    .as("start value of %s", assembly.pool().numbers().get(i).name())
                    .isPositive();
            for (LevelKey key : keys) {
                double[] gradient = new double[values.length];
                assertThat(table.entry(key).problem()).isNull();
                table.entry(key).gradient().addTo(gradient, 1);
                double difference = (45 * odd(assembly, key, values, i, h, source)
                                - 9 * odd(assembly, key, values, i, 2 * h, source)
                                + odd(assembly, key, values, i, 3 * h, source))
                        / (60 * h);
                double scale = Math.max(Math.abs(difference), floor / Math.abs(values[i]));
                assertThat(gradient[i])
                        .as("dE/d(%s) of %s", assembly.pool().numbers().get(i).name(), key)
                        .isCloseTo(difference, within(1e-7 * scale));
                compared += gradient[i] == 0 ? 0 : 1;
            }
        }
        return compared;
    }

    private static double odd(
            Assembly assembly, LevelKey key, double[] values, int index, double h, SpectrumSource source) {
        return energy(assembly, key, values, index, h, source) - energy(assembly, key, values, index, -h, source);
    }

    private static double energy(
            Assembly assembly, LevelKey key, double[] values, int index, double h, SpectrumSource source) {
        double[] moved = values.clone();
        moved[index] += h;
        LevelTable table = LevelTable.solve(assembly, LevelDemand.of(List.of(key)), moved, source, SolveMonitor.NONE);
        assertThat(table.entry(key).problem()).isNull();
        return table.entry(key).energy();
    }

    /** Every number of the pool against a difference of what the model says of one datum. */
    static int assertDatumAgreesWithDifferences(
            ModelDocument document, Datum datum, SpectrumSource source, double step, double floor) {
        Assembly assembly = Assembly.of(document, document.models().get(0).name());
        double[] values = assembly.pool().typedValues();
        Quantity quantity = quantity(assembly, datum, values, source);
        int compared = 0;
        for (int i = 0; i < values.length; i++) {
            double h = step * Math.abs(values[i]);
            double sum = 0;
            double[] weights = {45, -9, 1};
            for (int k = 0; k < 3; k++) {
                for (int sign : new int[] {1, -1}) {
                    double[] moved = values.clone();
                    moved[i] += sign * (k + 1) * h;
                    sum += sign
                            * weights[k]
                            * quantity(assembly, datum, moved, source).value();
                }
            }
            double difference = sum / (60 * h);
            double scale = Math.max(Math.abs(difference), floor / Math.abs(values[i]));
            assertThat(quantity.derivative(i))
                    .as(
                            "d(%s)/d(%s)",
                            datum.id(), assembly.pool().numbers().get(i).name())
                    .isCloseTo(difference, within(1e-7 * scale));
            compared += quantity.derivative(i) == 0 ? 0 : 1;
        }
        return compared;
    }

    private static Quantity quantity(Assembly assembly, Datum datum, double[] values, SpectrumSource source) {
        LevelTable table =
                LevelTable.solve(assembly, LevelDemand.forData(List.of(datum)), values, source, SolveMonitor.NONE);
        Quantity quantity = new DataModel(assembly).quantity(datum, table, values);
        assertThat(quantity.problem()).isNull();
        return quantity;
    }
}
