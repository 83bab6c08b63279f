package org.wellwright.viewer.radial;

import org.wellwright.project.FigureProvider.Variant;
import org.wellwright.solver.radial.RadialState;

/**
 * What is drawn of a radial function; a block of several channels is summed where squares are shown, otherwise its
 * first channel is drawn.
 */
enum RadialQuantity {
    /** u(r) = r R(r). */
    REDUCED("reduced", "u(r) = r R(r)", "√(1/%s)"),
    /** R(r) = u(r)/r. */
    FULL("full", "R(r)", "√(1/%s³)"),
    /** r² R² = u². */
    DENSITY("density", "r² R(r)²", "1/%s"),
    /** ∫₀^r u² dr. */
    CUMULATIVE("cumulative", "Probability within r", "");

    private final Variant variant;
    private final String unit;

    RadialQuantity(String id, String title, String unit) {
        this.variant = new Variant(id, title);
        this.unit = unit;
    }

    Variant variant() {
        return variant;
    }

    /** The axis label with its unit. */
    String label(String length) {
        return unit.isEmpty() ? variant.title() : "%s (%s)".formatted(variant.title(), unit.formatted(length));
    }

    static RadialQuantity of(String id) {
        for (RadialQuantity quantity : values()) {
            if (quantity.variant.id().equals(id)) {
                return quantity;
            }
        }
        return REDUCED;
    }

    /**
     * Samples at ascending radii.
     *
     * @param radii r > 0, shape [n]
     * @return shape [n]
     */
    double[] sample(RadialState state, double[] radii) {
        int channels = state.problem().channels().size();
        double[] values = new double[radii.length];
        double sum = 0;
        double before = 0;
        double from = 0;
        for (int i = 0; i < radii.length; i++) {
            double r = radii[i];
            switch (this) {
                case REDUCED -> values[i] = state.value(0, r);
                case FULL -> values[i] = state.value(0, r) / r;
                case DENSITY -> values[i] = square(state, channels, r);
                default -> {
                    // Simpson's rule over each piece.
                    double here = square(state, channels, r);
                    sum += (r - from) / 6 * (before + 4 * square(state, channels, 0.5 * (from + r)) + here);
                    before = here;
                    from = r;
                    values[i] = Math.min(1, sum);
                }
            }
        }
        return values;
    }

    private static double square(RadialState state, int channels, double r) {
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            double u = state.value(c, r);
            sum += u * u;
        }
        return sum;
    }
}
