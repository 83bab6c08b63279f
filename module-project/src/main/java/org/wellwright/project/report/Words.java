package org.wellwright.project.report;

import java.util.Locale;
import org.wellwright.solver.fit.FitQuality;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.FittedParameter;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.model.LevelSums;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.model.Weighting;

/** The words that tables of the command and reports share. */
public final class Words {
    private Words() {}

    /** The combination of levels of a datum ("4p - 4s"); empty if there is no such datum. */
    public static String levels(ModelDocument document, String datum) {
        for (Datum candidate : document.data()) {
            if (candidate.id().equals(datum)) {
                LevelNames names = LevelNames.of(document);
                String over = LevelSums.text(candidate.levels(), names);
                return candidate.denominator().isEmpty()
                        ? over
                        : "(" + over + ") / (" + LevelSums.text(candidate.denominator(), names) + ")";
            }
        }
        return "";
    }

    /** What the uncertainties mean. */
    public static String weighting(Weighting weighting) {
        return switch (weighting) {
            case KNOWN -> "standard uncertainties as stated";
            case KNOWN_UP_TO_SCALE -> "as stated up to one common factor, taken as √(χ²/ν)";
            case MISSING -> "not stated; all data weigh alike and the scatter gives σ";
        };
    }

    /** What was measured. */
    public static String transform(Transform transform) {
        return switch (transform) {
            case NONE -> "energy";
            case VACUUM_WAVELENGTH -> "wavelength in vacuum";
            case AIR_WAVELENGTH -> "wavelength in standard air";
            case FREQUENCY -> "frequency";
            case PHOTON_EMISSION -> "energy of the emitted photon";
            case PHOTON_ABSORPTION -> "energy of the absorbed photon";
            case ABSOLUTE_MASS -> "mass";
            case RATIO -> "ratio";
            case RADIUS -> "radius";
            case WIDTH -> "width";
            case RATE -> "rate";
        };
    }

    /** The word of an enumeration constant: lower case with hyphens. */
    static String hyphenated(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** Whether a fit could change a parameter, and what holds it. */
    public static String state(FittedParameter parameter) {
        if (!parameter.free()) {
            return "fixed";
        }
        return switch (parameter.bound()) {
            case NONE -> "free";
            case LOWER -> "at its lower bound";
            case UPPER -> "at its upper bound";
        };
    }

    /** χ², degrees of freedom and what the uncertainties mean, in one line. */
    public static String quality(FitResult fit) {
        FitQuality quality = fit.quality();
        StringBuilder text = new StringBuilder("χ² = ").append(Digits.significant(quality.chiSquare(), 4));
        text.append(", ν = ").append(quality.degreesOfFreedom());
        if (quality.degreesOfFreedom() > 0) {
            text.append(", χ²/ν = ").append(Digits.significant(quality.reducedChiSquare(), 3));
        }
        text.append("; uncertainties ").append(weighting(fit.mode()));
        if (fit.sigmaScale() != 1) {
            text.append(" (factor ")
                    .append(Digits.significant(fit.sigmaScale(), 3))
                    .append(')');
        }
        return text.append("; ")
                .append(fit.iterations())
                .append(fit.iterations() == 1 ? " step" : " steps")
                .toString();
    }
}
