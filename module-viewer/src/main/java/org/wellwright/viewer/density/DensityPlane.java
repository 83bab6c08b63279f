package org.wellwright.viewer.density;

import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureProvider.Variant;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.viewer.plot.LevelText;
import org.wellwright.viewer.plot.Picks;

/**
 * What a picture of a density shows, before it is known how large it will be.
 *
 * @param subtitle state, model and plane
 * @param density the density
 * @param plane the plane
 * @param reach half of the shorter side, length
 * @param greatest largest density in the plane, length⁻³
 * @param lengthUnit unit of length
 */
record DensityPlane(
        String subtitle, StateDensity density, Plane plane, double reach, double greatest, String lengthUnit) {
    private static final double SHOWN = 0.995;
    private static final int SEARCH = 600;

    /** A plane through the centre. */
    enum Plane {
        /** Holds the axis of quantisation. */
        MERIDIAN("xz", "Plane through the axis", "x", "z", "y = 0"),
        /** Stands on the axis of quantisation. */
        EQUATOR("xy", "Plane across the axis", "x", "y", "z = 0");

        private final Variant variant;
        private final String across;
        private final String up;
        private final String equation;

        Plane(String id, String title, String across, String up, String equation) {
            this.variant = new Variant(id, title);
            this.across = across;
            this.up = up;
            this.equation = equation;
        }

        Variant variant() {
            return variant;
        }

        String across() {
            return across;
        }

        String up() {
            return up;
        }

        static Plane of(String id) {
            return id.equals(EQUATOR.variant.id()) ? EQUATOR : MERIDIAN;
        }
    }

    /** The density at a point of the plane. */
    double at(double across, double up) {
        return plane == Plane.MERIDIAN ? density.at(Math.abs(across), up) : density.at(Math.hypot(across, up), 0);
    }

    static DensityPlane of(FigureInput input, FigureSelection selection, Plane plane) {
        SolvedModel model = Picks.model(input, selection);
        LevelKey key = Picks.levels(model, selection, 1).get(0);
        SolvedChannel channel = model.channelOf(key);
        RadialState state = channel.spectrum().state(key.index());
        int orbital = key.channel().orbital();
        double reach = reach(state);
        // The table must hold the corners of a wide picture.
        StateDensity density =
                new StateDensity(state, orbital, selection.magnetic(), Math.min(state.outerRadius(), 3 * reach));
        String text = "%s, m = %s · %s · plane %s"
                .formatted(
                        LevelText.of(input.document()).full(key),
                        Integer.toString(selection.magnetic()).replace('-', '−'),
                        model.model(),
                        plane.equation);
        DensityPlane shown = new DensityPlane(
                text, density, plane, reach, 1, input.units().length().printed());
        return new DensityPlane(text, density, plane, reach, shown.search(), shown.lengthUnit());
    }

    /** The radius that holds nearly all, and a little more. */
    private static double reach(RadialState state) {
        double end = state.outerRadius();
        double sum = 0;
        double before = 0;
        int steps = 4000;
        double h = end / steps;
        for (int i = 1; i <= steps; i++) {
            double u = state.value(0, i * h);
            sum += 0.5 * h * (before + u * u);
            before = u * u;
            if (sum > SHOWN) {
                return 1.08 * i * h;
            }
        }
        return end;
    }

    /** The largest density in a quadrant; both planes are symmetric. */
    private double search() {
        double greatest = 0;
        for (int i = 0; i <= SEARCH; i++) {
            for (int k = 0; k <= SEARCH; k++) {
                greatest = Math.max(greatest, at(reach * i / SEARCH, reach * k / SEARCH));
                if (plane == Plane.EQUATOR) {
                    break;
                }
            }
        }
        return greatest;
    }
}
