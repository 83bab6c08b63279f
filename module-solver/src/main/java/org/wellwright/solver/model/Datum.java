package org.wellwright.solver.model;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.units.ExactNumber;

/**
 * One measured number: a combination of levels under a transform.
 *
 * @param id identifier, unique in the project
 * @param levels the levels with their coefficients c_k
 * @param denominator the levels with their coefficients d_k of a {@link Transform#RATIO}; empty otherwise
 * @param transform what was measured
 * @param detail what a radius or a rate needs besides
 * @param value the measured value as typed
 * @param unit its unit expression
 * @param sigmaMinus standard uncertainty downward, > 0, or null if not stated
 * @param sigmaPlus standard uncertainty upward, > 0, or null if not stated
 * @param limit whether the value is a limit
 * @param groups ids of the data groups it belongs to
 * @param source where it comes from; may be empty
 * @param used whether it counts
 * @param reason why it does not count, or a remark; may be empty
 */
public record Datum(
        String id,
        List<Contribution> levels,
        List<Contribution> denominator,
        Transform transform,
        Detail detail,
        ExactNumber value,
        String unit,
        ExactNumber sigmaMinus,
        ExactNumber sigmaPlus,
        Limit limit,
        List<String> groups,
        String source,
        boolean used,
        String reason) {

    /** c_k and the level it multiplies. */
    public record Contribution(ExactNumber coefficient, LevelKey level) {
        /** Checks the coefficient. */
        public Contribution {
            Objects.requireNonNull(level, "level");
            if (coefficient.sign() == 0) {
                throw new IllegalArgumentException("the coefficient of a level must not be 0");
            }
        }
    }

    /** Whether a value is a limit. */
    public enum Limit {
        /** An ordinary value. */
        NONE,
        /** The quantity is at most the value. */
        UPPER,
        /** The quantity is at least the value. */
        LOWER
    }

    /**
     * What a radius or a rate needs.
     *
     * @param radiusPower k of ⟨r^k⟩^(1/k), not 0; 2 for a root-mean-square radius; without meaning for other transforms
     * @param multipole electric multipole order of a rate, ≥ 1 (1 for dipole); without meaning for other transforms
     */
    public record Detail(int radiusPower, int multipole) {
        /** Root-mean-square radius, dipole rate. */
        public static final Detail STANDARD = new Detail(2, 1);

        /** Checks the numbers. */
        public Detail {
            if (radiusPower == 0 || multipole < 1) {
                throw new IllegalArgumentException(
                        "a radius needs a power other than 0 and a rate a multipole >= 1, got %d, %d"
                                .formatted(radiusPower, multipole));
            }
        }
    }

    /** Copies the lists and checks what belongs together. */
    public Datum {
        Objects.requireNonNull(transform, "transform");
        Objects.requireNonNull(detail, "detail");
        Objects.requireNonNull(value, "value");
        Objects.requireNonNull(unit, "unit");
        Objects.requireNonNull(limit, "limit");
        Objects.requireNonNull(source, "source");
        Objects.requireNonNull(reason, "reason");
        levels = List.copyOf(levels);
        denominator = List.copyOf(denominator);
        groups = List.copyOf(groups);
        if (id.isBlank()) {
            throw new IllegalArgumentException("a datum needs an id");
        }
        if (levels.isEmpty()) {
            throw new IllegalArgumentException("the datum '%s' names no level".formatted(id));
        }
        if (denominator.isEmpty() == (transform == Transform.RATIO)) {
            throw new IllegalArgumentException(
                    "the datum '%s': a ratio, and only a ratio, needs a denominator".formatted(id));
        }
        if ((sigmaMinus == null) != (sigmaPlus == null)) {
            throw new IllegalArgumentException("the datum '%s' needs both sigmas or none".formatted(id));
        }
        if (sigmaMinus != null && (sigmaMinus.sign() <= 0 || sigmaPlus.sign() <= 0)) {
            throw new IllegalArgumentException(
                    "the datum '%s' has sigma %s, %s; a sigma must be positive, or left out where it is not known"
                            .formatted(id, sigmaMinus, sigmaPlus));
        }
    }

    /** An ordinary used datum. */
    public static Datum of(
            String id,
            List<Contribution> levels,
            Transform transform,
            ExactNumber value,
            String unit,
            ExactNumber sigma) {
        return new Datum(
                id,
                levels,
                List.of(),
                transform,
                Detail.STANDARD,
                value,
                unit,
                sigma,
                sigma,
                Limit.NONE,
                List.of(),
                "",
                true,
                "");
    }

    /** The same with another id. */
    public Datum withId(String newId) {
        return new Datum(
                newId,
                levels,
                denominator,
                transform,
                detail,
                value,
                unit,
                sigmaMinus,
                sigmaPlus,
                limit,
                groups,
                source,
                used,
                reason);
    }

    /** The same with other groups. */
    public Datum withGroups(List<String> newGroups) {
        return new Datum(
                id,
                levels,
                denominator,
                transform,
                detail,
                value,
                unit,
                sigmaMinus,
                sigmaPlus,
                limit,
                newGroups,
                source,
                used,
                reason);
    }

    /** The same with another source. */
    public Datum withSource(String newSource) {
        return new Datum(
                id,
                levels,
                denominator,
                transform,
                detail,
                value,
                unit,
                sigmaMinus,
                sigmaPlus,
                limit,
                groups,
                newSource,
                used,
                reason);
    }

    /** The same with another remark. */
    public Datum withReason(String newReason) {
        return new Datum(
                id,
                levels,
                denominator,
                transform,
                detail,
                value,
                unit,
                sigmaMinus,
                sigmaPlus,
                limit,
                groups,
                source,
                used,
                newReason);
    }

    /** The same, counted or not. */
    public Datum withUsed(boolean nowUsed) {
        return new Datum(
                id,
                levels,
                denominator,
                transform,
                detail,
                value,
                unit,
                sigmaMinus,
                sigmaPlus,
                limit,
                groups,
                source,
                nowUsed,
                reason);
    }

    /** The same with other levels; {@code newDenominator} is empty unless it is a ratio. */
    public Datum withLevels(List<Contribution> newLevels, List<Contribution> newDenominator) {
        return new Datum(
                id,
                newLevels,
                newDenominator,
                transform,
                detail,
                value,
                unit,
                sigmaMinus,
                sigmaPlus,
                limit,
                groups,
                source,
                used,
                reason);
    }

    /** The same with another measured value. */
    public Datum withValue(
            ExactNumber newValue, ExactNumber newSigmaMinus, ExactNumber newSigmaPlus, Limit newLimit, String newUnit) {
        return new Datum(
                id,
                levels,
                denominator,
                transform,
                detail,
                newValue,
                newUnit,
                newSigmaMinus,
                newSigmaPlus,
                newLimit,
                groups,
                source,
                used,
                reason);
    }

    /** The same as another quantity with its unit; the levels are kept. */
    public Datum withTransform(Transform newTransform, Detail newDetail, String newUnit) {
        List<Contribution> under =
                newTransform == Transform.RATIO ? (denominator.isEmpty() ? levels : denominator) : List.of();
        return new Datum(
                id,
                levels,
                under,
                newTransform,
                newDetail,
                value,
                newUnit,
                sigmaMinus,
                sigmaPlus,
                limit,
                groups,
                source,
                used,
                reason);
    }
}
