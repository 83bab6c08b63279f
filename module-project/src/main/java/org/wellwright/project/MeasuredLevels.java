package org.wellwright.project;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/**
 * Levels and lines that the data fix, as energies in the project's unit: what a level diagram and a spectrum show of
 * the measurements.
 *
 * <p>A datum gives an energy by correcting the energy of a model: E(measured) = E(model) + δE, where δE follows from
 * measured and calculated value. For an energy that is the measured value itself; a line fixes a difference only, so
 * its lower level comes from the model, which is named.
 */
final class MeasuredLevels {
    private final ModelDocument document;
    private final UnitSystem units;

    MeasuredLevels(ModelDocument document) {
        this.document = document;
        this.units = UnitSystem.named(document.units());
    }

    /** The levels that used data fix: those of one level, and the upper levels of lines. */
    List<MeasuredLevel> levels(ModelComparison comparison, SolvedModel solved) {
        List<MeasuredLevel> measured = new ArrayList<>();
        for (Datum datum : document.data()) {
            ResidualRow row = row(comparison, datum);
            Datum.Contribution upper = upper(datum);
            if (row == null || upper == null) {
                continue;
            }
            double energy = energy(solved, upper.level());
            double correction = correction(datum, row, solved);
            if (Double.isFinite(energy + correction)) {
                double[] sigmas = sigmas(datum, row, solved);
                String reference = datum.levels().size() == 1 ? "" : comparison.model();
                measured.add(new MeasuredLevel(
                        upper.level(), energy + correction, sigmas[0], sigmas[1], datum.id(), reference));
            }
        }
        return measured;
    }

    /** The measured lines, then those of each model. */
    List<SpectralLine> lines(List<ModelComparison> comparisons, List<SolvedModel> models) {
        List<SpectralLine> lines = new ArrayList<>();
        for (int m = 0; m < models.size(); m++) {
            SolvedModel solved = models.get(m);
            for (Datum datum : document.data()) {
                LevelKey lower = lower(datum);
                if (lower == null || datum.limit() != Datum.Limit.NONE) {
                    continue;
                }
                LevelKey upper = upper(datum).level();
                double line = energy(solved, upper) - energy(solved, lower);
                ResidualRow row = row(comparison(comparisons, solved.model()), datum);
                if (Double.isFinite(line) && row != null) {
                    if (lines.stream()
                            .noneMatch(known -> known.model().isEmpty()
                                    && known.upper().equals(upper)
                                    && known.lower().equals(lower))) {
                        double sigma = sigmas(datum, row, solved)[1];
                        lines.add(new SpectralLine(
                                "", upper, lower, line + correction(datum, row, solved), sigma, Double.NaN));
                    }
                    lines.add(new SpectralLine(solved.model(), upper, lower, line, Double.NaN, Double.NaN));
                }
            }
        }
        return lines;
    }

    private static ModelComparison comparison(List<ModelComparison> comparisons, String model) {
        for (ModelComparison comparison : comparisons) {
            if (comparison.model().equals(model)) {
                return comparison;
            }
        }
        return null;
    }

    private static ResidualRow row(ModelComparison comparison, Datum datum) {
        if (comparison == null || !datum.used()) {
            return null;
        }
        for (ResidualRow row : comparison.rows()) {
            if (row.datum().equals(datum.id()) && Double.isFinite(row.predicted())) {
                return row;
            }
        }
        return null;
    }

    /** The only level, or the upper one of a line; null for other combinations and for what is no energy. */
    private static Datum.Contribution upper(Datum datum) {
        boolean energy = switch (datum.transform()) {
            case NONE,
                    VACUUM_WAVELENGTH,
                    AIR_WAVELENGTH,
                    FREQUENCY,
                    PHOTON_EMISSION,
                    PHOTON_ABSORPTION,
                    ABSOLUTE_MASS -> true;
            case RATIO, RADIUS, WIDTH, RATE -> false;
        };
        List<Datum.Contribution> levels = datum.levels();
        if (!energy || levels.size() > 2) {
            return null;
        }
        Datum.Contribution found = null;
        for (Datum.Contribution contribution : levels) {
            double coefficient = contribution.coefficient().value();
            if (coefficient == 1 && found == null) {
                found = contribution;
            } else if (coefficient != -1) {
                return null;
            }
        }
        return found;
    }

    /** The lower level of a line, or null. */
    private static LevelKey lower(Datum datum) {
        if (upper(datum) == null || datum.levels().size() != 2) {
            return null;
        }
        for (Datum.Contribution contribution : datum.levels()) {
            if (contribution.coefficient().value() == -1) {
                return contribution.level();
            }
        }
        return null;
    }

    /** δE = E(measured) − E(model). */
    private double correction(Datum datum, ResidualRow row, SolvedModel solved) {
        double measured = row.measured() - row.groupShift();
        if (wavelength(datum)) {
            // hc/λ with the same refractive index on both sides.
            double line = energy(solved, upper(datum).level()) - lowerEnergy(datum, solved);
            return line * (row.predicted() / measured - 1);
        }
        return (measured - row.predicted()) * factor(datum);
    }

    private double[] sigmas(Datum datum, ResidualRow row, SolvedModel solved) {
        if (datum.sigmaPlus() == null) {
            return new double[] {Double.NaN, Double.NaN};
        }
        double minus = datum.sigmaMinus().value();
        double plus = datum.sigmaPlus().value();
        if (wavelength(datum)) {
            double slope =
                    Math.abs((energy(solved, upper(datum).level()) - lowerEnergy(datum, solved)) / row.measured());
            return new double[] {plus * slope, minus * slope};
        }
        double factor = factor(datum);
        return new double[] {minus * factor, plus * factor};
    }

    private static boolean wavelength(Datum datum) {
        return datum.transform() == Transform.VACUUM_WAVELENGTH || datum.transform() == Transform.AIR_WAVELENGTH;
    }

    private static double lowerEnergy(Datum datum, SolvedModel solved) {
        LevelKey lower = lower(datum);
        return lower == null ? 0 : energy(solved, lower);
    }

    /** Energies in the project's unit per unit of the datum. */
    private double factor(Datum datum) {
        UnitExpression unit = UnitExpression.parse(datum.unit());
        if (datum.transform() == Transform.ABSOLUTE_MASS) {
            return unit.factorTo(units, Dimension.MASS) * units.restEnergy();
        }
        return unit.factorTo(units, Dimension.ENERGY);
    }

    private static double energy(SolvedModel solved, LevelKey key) {
        SolvedChannel channel = solved.channelOf(key);
        Level level = channel == null ? null : channel.level(key.index());
        return level == null ? Double.NaN : level.energy() + channel.origin();
    }
}
