package org.wellwright.viewer.radial;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.LevelText;
import org.wellwright.viewer.plot.Picks;
import org.wellwright.viewer.plot.Points;
import org.wellwright.viewer.plot.XyPlotModel;

/** Computes the picture of radial functions: several levels of the model in front, or one level of all models. */
final class RadialPlot {
    private static final int SAMPLES = 900;
    private static final int MOST_LEVELS = 8;
    private static final int USUAL_LEVELS = 3;

    /** The probability that is left out on either side. */
    private static final double TAIL = 2e-4;

    private RadialPlot() {}

    private record Drawn(String name, RadialState state, int series, boolean quiet) {}

    static XyPlotModel of(FigureInput input, FigureSelection selection, RadialQuantity quantity) {
        SolvedModel front = Picks.model(input, selection);
        List<LevelKey> keys = Picks.levels(front, selection, USUAL_LEVELS);
        keys = keys.subList(0, Math.min(MOST_LEVELS, keys.size()));
        LevelText names = LevelText.of(input.document());
        List<Drawn> drawn = keys.size() == 1 ? ofAllModels(input, front, keys.get(0)) : ofOneModel(front, keys, names);
        double left = Double.POSITIVE_INFINITY;
        double right = 0;
        for (Drawn one : drawn) {
            left = Math.min(left, radiusHolding(one.state(), TAIL));
            right = Math.max(right, radiusHolding(one.state(), 1 - TAIL));
        }
        // Functions that live far out need not be shown from the centre.
        left = left < 0.3 * right ? 0 : left - 0.1 * (right - left);
        double[] radii = radii(right);
        List<XyPlotModel.Curve> curves = new ArrayList<>();
        double lowest = 0;
        double highest = 0;
        for (Drawn one : drawn) {
            double[] values = quantity.sample(one.state(), radii);
            for (double value : values) {
                lowest = Math.min(lowest, value);
                highest = Math.max(highest, value);
            }
            curves.add(new XyPlotModel.Curve(one.name(), Points.of(radii, values), one.series(), one.quiet()));
        }
        double margin = 0.06 * (highest - lowest);
        String of = keys.size() == 1 ? "%s in all models".formatted(names.full(keys.get(0))) : front.model();
        return new XyPlotModel(
                "Radial functions",
                of,
                AxisSpec.of("r (%s)".formatted(input.units().length().printed()), left, right),
                AxisSpec.of(
                        quantity.label(input.units().length().printed()),
                        lowest < 0 ? lowest - margin : 0,
                        highest + margin),
                curves,
                List.of(),
                true);
    }

    private static List<Drawn> ofOneModel(SolvedModel model, List<LevelKey> keys, LevelText names) {
        List<Drawn> drawn = new ArrayList<>();
        for (LevelKey key : keys) {
            drawn.add(new Drawn(
                    names.full(key), model.channelOf(key).spectrum().state(key.index()), drawn.size(), false));
        }
        return drawn;
    }

    private static List<Drawn> ofAllModels(FigureInput input, SolvedModel front, LevelKey key) {
        List<Drawn> drawn = new ArrayList<>();
        for (int i = 0; i < input.models().size(); i++) {
            SolvedModel model = input.models().get(i);
            SolvedChannel channel = model.channelOf(key);
            if (channel != null && channel.level(key.index()) != null) {
                drawn.add(new Drawn(model.model(), channel.spectrum().state(key.index()), i, model != front));
            }
        }
        return drawn;
    }

    /** The radius within which a share of the probability lies. */
    private static double radiusHolding(RadialState state, double share) {
        double[] radii = radii(state.outerRadius());
        double[] within = RadialQuantity.CUMULATIVE.sample(state, radii);
        for (int i = 0; i < radii.length; i++) {
            if (within[i] > share) {
                return radii[i];
            }
        }
        return state.outerRadius();
    }

    /** Denser towards the origin: r = R t^1.5. */
    private static double[] radii(double right) {
        double[] radii = new double[SAMPLES];
        for (int i = 0; i < SAMPLES; i++) {
            double t = (i + 1.0) / SAMPLES;
            radii[i] = right * t * Math.sqrt(t);
        }
        return radii;
    }
}
