package org.wellwright.solver.fit;

import java.util.List;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelError;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** The uncertainty by which each datum's residual is measured: σ² = (scale·σ_stated)² + σ_mod². Immutable. */
final class Weights {
    private final double[] minus;
    private final double[] plus;
    private final int[] part;
    private final double[] partFactor;
    private final double[] modelSigma;
    private final double scale;

    private Weights(double[] minus, double[] plus, int[] part, double[] partFactor, double[] modelSigma, double scale) {
        this.minus = minus;
        this.plus = plus;
        this.part = part;
        this.partFactor = partFactor;
        this.modelSigma = modelSigma;
        this.scale = scale;
    }

    /** The weights of data as stated, with σ_mod as typed. */
    static Weights of(List<Datum> data, ModelError error, Weighting mode, DataModel model, UnitSystem units) {
        if (mode != Weighting.KNOWN && !error.parts().isEmpty()) {
            throw new InvalidModelException(
                    "a model error needs data whose sigmas are known",
                    "",
                    "remove the model error or state the sigmas as known");
        }
        int count = data.size();
        double[] minus = new double[count];
        double[] plus = new double[count];
        int[] part = new int[count];
        double[] factor = new double[count];
        for (int i = 0; i < count; i++) {
            Datum datum = data.get(i);
            if (mode == Weighting.MISSING && datum.limit() == Datum.Limit.NONE) {
                minus[i] = model.energyWeight(datum);
                plus[i] = minus[i];
            } else {
                minus[i] = datum.sigmaMinus() == null
                        ? Double.NaN
                        : datum.sigmaMinus().value();
                plus[i] = datum.sigmaPlus() == null
                        ? Double.NaN
                        : datum.sigmaPlus().value();
            }
            part[i] = part(datum, error);
            factor[i] = part[i] < 0 ? 0 : factor(datum, error.parts().get(part[i]), model, units);
        }
        double[] modelSigma =
                error.parts().stream().mapToDouble(p -> p.value().value()).toArray();
        return new Weights(minus, plus, part, factor, modelSigma, 1);
    }

    /** Standard uncertainty of a datum in its unit; NaN if it has none. */
    double sigma(int datum, boolean predictedAbove) {
        double stated = scale * (predictedAbove ? plus[datum] : minus[datum]);
        return part[datum] < 0 ? stated : Math.hypot(stated, modelSigma[part[datum]] * partFactor[datum]);
    }

    /** Stated part of the uncertainty alone. */
    double statedSigma(int datum, boolean predictedAbove) {
        return scale * (predictedAbove ? plus[datum] : minus[datum]);
    }

    /** Index of the model-error part of a datum, −1 for none. */
    int part(int datum) {
        return part[datum];
    }

    /** σ_mod of a datum is this times the part's value. */
    double partFactor(int datum) {
        return partFactor[datum];
    }

    double modelSigma(int index) {
        return modelSigma[index];
    }

    double scale() {
        return scale;
    }

    Weights withScale(double newScale) {
        return new Weights(minus, plus, part, partFactor, modelSigma, newScale);
    }

    Weights withModelSigma(int index, double value) {
        double[] changed = modelSigma.clone();
        changed[index] = value;
        return new Weights(minus, plus, part, partFactor, changed, scale);
    }

    private static int part(Datum datum, ModelError error) {
        int general = -1;
        for (int k = 0; k < error.parts().size(); k++) {
            String group = error.parts().get(k).group();
            if (group.isEmpty()) {
                general = k;
            } else if (datum.groups().contains(group)) {
                return k;
            }
        }
        return general;
    }

    private static double factor(Datum datum, ModelError.Part part, DataModel model, UnitSystem units) {
        if (part.measure() == ModelError.Measure.RELATIVE) {
            return Math.abs(datum.value().value());
        }
        UnitExpression own = UnitExpression.parse(part.unit());
        if (own.fits(units, Dimension.ENERGY) && !Double.isNaN(model.energyWeight(datum))) {
            return own.factorTo(units, Dimension.ENERGY) * model.energyWeight(datum);
        }
        Dimension dimension = own.dimension();
        UnitExpression unit = UnitExpression.parse(datum.unit());
        if (unit.fits(units, dimension)) {
            return own.factorTo(units, dimension) / unit.factorTo(units, dimension);
        }
        throw new InvalidModelException(
                "the model error in '%s' cannot be added to the datum '%s' in '%s'"
                        .formatted(own.text(), datum.id(), datum.unit()),
                "",
                "make it relative or give it a group of its own");
    }
}
