package org.wellwright.solver.model;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/** How the value of a parameter depends on where it is used. */
public sealed interface ParameterShape {
    /**
     * One number everywhere.
     *
     * @param setting the number
     */
    record Scalar(Setting setting) implements ParameterShape {
        /** Checks that it is there. */
        public Scalar {
            Objects.requireNonNull(setting, "setting");
        }
    }

    /**
     * One number per l.
     *
     * @param entries the listed l, each once
     * @param others the number for every other l, or null if there is none
     */
    record ByOrbital(List<Entry> entries, Setting others) implements ParameterShape {
        /** The number of one l. */
        public record Entry(int orbital, Setting setting) {
            /** Checks l. */
            public Entry {
                Objects.requireNonNull(setting, "setting");
                if (orbital < 0) {
                    throw new IllegalArgumentException("l must be >= 0, got " + orbital);
                }
            }
        }

        /** Copies the list and checks that no l comes twice. */
        public ByOrbital {
            entries = List.copyOf(entries);
            Set<Integer> seen = new HashSet<>();
            for (Entry entry : entries) {
                if (!seen.add(entry.orbital())) {
                    throw new IllegalArgumentException("l = %d is listed twice".formatted(entry.orbital()));
                }
            }
            requireAny(entries, others);
        }
    }

    /**
     * One number per (l, j).
     *
     * @param entries the listed (l, j), each once
     * @param others the number for every other channel, or null if there is none
     */
    record ByTotal(List<Entry> entries, Setting others) implements ParameterShape {
        /** The number of one (l, 2j). */
        public record Entry(int orbital, int twiceTotal, Setting setting) {
            /** Checks the labels. */
            public Entry {
                Objects.requireNonNull(setting, "setting");
                if (orbital < 0 || twiceTotal < 0) {
                    throw new IllegalArgumentException(
                            "l and 2j must be >= 0, got %d, %d".formatted(orbital, twiceTotal));
                }
            }
        }

        /** Copies the list and checks that no channel comes twice. */
        public ByTotal {
            entries = List.copyOf(entries);
            Set<List<Integer>> seen = new HashSet<>();
            for (Entry entry : entries) {
                if (!seen.add(List.of(entry.orbital(), entry.twiceTotal()))) {
                    throw new IllegalArgumentException(
                            "l = %d, 2j = %d is listed twice".formatted(entry.orbital(), entry.twiceTotal()));
                }
            }
            requireAny(entries, others);
        }
    }

    /**
     * One number per pair system.
     *
     * @param entries the listed systems, each once
     * @param others the number for every other system, or null if there is none
     */
    record BySystem(List<Entry> entries, Setting others) implements ParameterShape {
        /** The number of one system. */
        public record Entry(String system, Setting setting) {
            /** Checks that both are there. */
            public Entry {
                Objects.requireNonNull(system, "system");
                Objects.requireNonNull(setting, "setting");
            }
        }

        /** Copies the list and checks that no system comes twice. */
        public BySystem {
            entries = List.copyOf(entries);
            Set<String> seen = new HashSet<>();
            for (Entry entry : entries) {
                if (!seen.add(entry.system())) {
                    throw new IllegalArgumentException("the system '%s' is listed twice".formatted(entry.system()));
                }
            }
            requireAny(entries, others);
        }
    }

    /**
     * Proportional to a power of the reduced mass: p(system) = setting · (μ(system)/μ(reference))^exponent.
     *
     * @param setting its value in the reference system
     * @param reference id of the reference system
     * @param exponent the power of the mass ratio (−1 for an adiabatic correction)
     */
    record MassScaled(Setting setting, String reference, double exponent) implements ParameterShape {
        /** Checks that the parts are there. */
        public MassScaled {
            Objects.requireNonNull(setting, "setting");
            Objects.requireNonNull(reference, "reference");
            if (!Double.isFinite(exponent)) {
                throw new IllegalArgumentException(
                        "the exponent of a mass-scaled parameter must be finite, got " + exponent);
            }
        }
    }

    /**
     * Computed from other parameters of the pool, number by number in the units they have there.
     *
     * @param formula formula in the names of other parameters; may be mistyped and fails when used
     */
    record Tied(String formula) implements ParameterShape {
        /** Checks that it is there. */
        public Tied {
            Objects.requireNonNull(formula, "formula");
        }
    }

    private static void requireAny(List<?> entries, Setting others) {
        if (entries.isEmpty() && others == null) {
            throw new IllegalArgumentException("a parameter needs at least one value");
        }
    }

    /**
     * The same with other values: one per number, the number for all others last; a value outside its bounds becomes
     * the bound.
     *
     * @param values new values; an entry that is NaN leaves its number as typed
     */
    default ParameterShape withValues(double[] values) {
        if (this instanceof Scalar scalar) {
            return new Scalar(scalar.setting().moved(values[0]));
        }
        if (this instanceof MassScaled scaled) {
            return new MassScaled(scaled.setting().moved(values[0]), scaled.reference(), scaled.exponent());
        }
        int[] next = {0};
        if (this instanceof ByOrbital byOrbital) {
            List<ByOrbital.Entry> moved = byOrbital.entries().stream()
                    .map(entry ->
                            new ByOrbital.Entry(entry.orbital(), entry.setting().moved(values[next[0]++])))
                    .toList();
            return new ByOrbital(moved, moved(byOrbital.others(), values));
        }
        if (this instanceof ByTotal byTotal) {
            List<ByTotal.Entry> moved = byTotal.entries().stream()
                    .map(entry -> new ByTotal.Entry(
                            entry.orbital(), entry.twiceTotal(), entry.setting().moved(values[next[0]++])))
                    .toList();
            return new ByTotal(moved, moved(byTotal.others(), values));
        }
        if (this instanceof BySystem bySystem) {
            List<BySystem.Entry> moved = bySystem.entries().stream()
                    .map(entry ->
                            new BySystem.Entry(entry.system(), entry.setting().moved(values[next[0]++])))
                    .toList();
            return new BySystem(moved, moved(bySystem.others(), values));
        }
        return this;
    }

    private static Setting moved(Setting others, double[] values) {
        return others == null ? null : others.moved(values[values.length - 1]);
    }
}
