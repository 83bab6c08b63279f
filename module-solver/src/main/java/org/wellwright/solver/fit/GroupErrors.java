package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** How the shared errors b_k of the data groups act on the data: value = Q + Σ b_k, or Q (1 + Σ b_k). Immutable. */
final class GroupErrors {
    private final List<DataGroup> groups;
    private final double[][] factors;
    private final boolean[][] multiplies;

    private GroupErrors(List<DataGroup> groups, double[][] factors, boolean[][] multiplies) {
        this.groups = groups;
        this.factors = factors;
        this.multiplies = multiplies;
    }

    /** The groups that used data belong to. */
    static GroupErrors of(ModelDocument document, UnitSystem units) {
        List<DataGroup> groups = new ArrayList<>();
        for (DataGroup group : document.groups()) {
            boolean occurs = group.kind() != DataGroup.Kind.PLAIN
                    && document.data().stream()
                            .anyMatch(datum -> datum.used() && datum.groups().contains(group.id()));
            if (occurs) {
                groups.add(group);
            }
        }
        int count = document.data().size();
        double[][] factors = new double[count][groups.size()];
        boolean[][] multiplies = new boolean[count][groups.size()];
        for (int i = 0; i < count; i++) {
            Datum datum = document.data().get(i);
            for (int k = 0; k < groups.size(); k++) {
                DataGroup group = groups.get(k);
                if (!datum.groups().contains(group.id())) {
                    continue;
                }
                multiplies[i][k] = group.kind() == DataGroup.Kind.MULTIPLICATIVE;
                factors[i][k] = multiplies[i][k] ? 1 : factor(group, datum, units);
            }
        }
        return new GroupErrors(List.copyOf(groups), factors, multiplies);
    }

    private static double factor(DataGroup group, Datum datum, UnitSystem units) {
        UnitExpression own = UnitExpression.parse(group.unit());
        Dimension dimension = own.dimension();
        return own.factorTo(units, dimension)
                / UnitExpression.parse(datum.unit()).factorTo(units, dimension);
    }

    int count() {
        return groups.size();
    }

    DataGroup group(int index) {
        return groups.get(index);
    }

    /** Standard uncertainty known beforehand; NaN for an unknown offset. */
    double priorSigma(int index) {
        return groups.get(index).sigma() == null
                ? Double.NaN
                : groups.get(index).sigma().value();
    }

    /** What the errors b, taken from {@code x[first…]}, add to a model value Q of a datum. */
    double shift(int datum, double quantity, double[] x, int first) {
        double sum = 0;
        for (int k = 0; k < groups.size(); k++) {
            sum += x[first + k] * slope(datum, k, quantity);
        }
        return sum;
    }

    /** d(value)/dQ: 1 plus the multiplicative errors. */
    double gain(int datum, double[] x, int first) {
        double gain = 1;
        for (int k = 0; k < groups.size(); k++) {
            gain += multiplies[datum][k] ? x[first + k] : 0;
        }
        return gain;
    }

    /** d(value)/db_k. */
    double slope(int datum, int index, double quantity) {
        return multiplies[datum][index] ? quantity : factors[datum][index];
    }
}
