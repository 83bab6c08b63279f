package org.wellwright.viewer.potential;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.radial.Level;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.LevelText;
import org.wellwright.viewer.plot.Picks;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.Points;
import org.wellwright.viewer.plot.XyPlotModel;

/**
 * Computes the picture of the potentials of all models in one channel, with the levels of the model in front between
 * their turning points.
 */
final class PotentialPlot {
    private static final int SAMPLES = 1200;

    /** Levels whose outer turning points set the range: higher ones are drawn as far as they are seen. */
    private static final int LEVELS_IN_RANGE = 5;

    private PotentialPlot() {}

    /**
     * The picture.
     *
     * @param effective whether the centrifugal term is added
     */
    static XyPlotModel of(FigureInput input, FigureSelection selection, boolean effective) {
        SolvedModel front = Picks.model(input, selection);
        SolvedChannel channel = Picks.channel(front, selection);
        LevelText names = LevelText.of(input.document());
        PotentialCurve curve = new PotentialCurve(channel, effective);
        List<Level> levels = channel.spectrum().levels();
        Range range = range(curve, levels);
        List<XyPlotModel.Curve> curves = new ArrayList<>();
        for (int i = 0; i < input.models().size(); i++) {
            SolvedModel model = input.models().get(i);
            SolvedChannel same = model.channelOf(channel.key(0));
            if (same != null) {
                Points points = sample(new PotentialCurve(same, effective), range);
                curves.add(new XyPlotModel.Curve(model.model(), points, i, model != front));
            }
        }
        List<XyPlotModel.Rung> rungs = new ArrayList<>();
        for (Level level : levels) {
            LevelKey key = channel.key(level.index());
            rungs.addAll(rungs(
                    curve,
                    level,
                    names.level(key),
                    input.models().indexOf(front),
                    selection.levels().contains(key),
                    range,
                    spot(
                            front.model(),
                            channel,
                            level,
                            names.full(key),
                            input.units().energy().printed())));
        }
        String energy = input.units().energy().printed();
        String what = effective ? "V(r) + centrifugal term" : "V(r)";
        return new XyPlotModel(
                "Potential with levels",
                "%s, channel %s".formatted(front.model(), names.channel(channel.key(0))),
                AxisSpec.of("r (%s)".formatted(input.units().length().printed()), range.left(), range.right()),
                AxisSpec.of("%s (%s)".formatted(what, energy), range.bottom(), range.top()),
                curves,
                rungs,
                true);
    }

    private record Range(double left, double right, double bottom, double top) {}

    private static Range range(PotentialCurve curve, List<Level> levels) {
        double inner = Double.POSITIVE_INFINITY;
        double outer = 0;
        for (Level level : levels.subList(0, Math.min(LEVELS_IN_RANGE, levels.size()))) {
            PotentialCurve.Allowed span = curve.span(level);
            if (span != null) {
                inner = Math.min(inner, span.from());
                outer = Math.max(outer, span.to());
            }
        }
        double right = outer + 0.3 * (outer - Math.min(inner, outer));
        double origin = curve.channel().origin();
        double lowest = levels.get(0).energy() + origin;
        double highest =
                levels.get(Math.min(LEVELS_IN_RANGE, levels.size()) - 1).energy() + origin;
        double threshold = levels.get(0).threshold() + origin;
        double span = highest - lowest;
        if (Double.isFinite(threshold) && threshold - highest <= Math.max(span, 0.3 * (threshold - lowest))) {
            highest = Math.max(highest, threshold);
        }
        double floor = Double.POSITIVE_INFINITY;
        for (int i = 1; i <= SAMPLES; i++) {
            floor = Math.min(floor, curve.at(right * i / SAMPLES));
        }
        span = highest > lowest ? highest - lowest : Math.max(1, Math.abs(lowest));
        // A bottomless potential is cut below the lowest level; a bottom near by is shown.
        double bottom = lowest - floor <= 1.5 * span ? floor - 0.06 * span : lowest - 0.5 * span;
        double top = highest + 0.22 * (highest - bottom);
        return new Range(left(curve, right, top), right, bottom, top);
    }

    /** The centre, or for a potential that is repulsive far out a little inside its wall. */
    private static double left(PotentialCurve curve, double right, double top) {
        for (int i = 1; i <= SAMPLES; i++) {
            double r = right * i / SAMPLES;
            if (curve.at(r) < top) {
                return r < 0.25 * right ? 0 : r - 0.06 * (right - r);
            }
        }
        return 0;
    }

    private static Points sample(PotentialCurve curve, Range range) {
        double[] x = new double[SAMPLES];
        double[] y = new double[SAMPLES];
        double cut = range.top() - range.bottom();
        for (int i = 0; i < SAMPLES; i++) {
            // Denser towards the origin, where potentials are steep.
            double t = (i + 1.0) / SAMPLES;
            x[i] = range.right() * t * Math.sqrt(t);
            double value = curve.at(x[i]);
            y[i] = Math.min(Math.max(value, range.bottom() - cut), range.top() + cut);
        }
        return Points.of(x, y);
    }

    private static Picture.Spot spot(String model, SolvedChannel channel, Level level, String name, String unit) {
        String text = "%s, %s\nE = %s %s\nat least %s\nat most %s"
                .formatted(
                        name,
                        model,
                        level.energy() + channel.origin(),
                        unit,
                        level.lower() + channel.origin(),
                        level.upper() + channel.origin());
        return new Picture.Spot(text, model, channel.key(level.index()));
    }

    private static List<XyPlotModel.Rung> rungs(
            PotentialCurve curve,
            Level level,
            String label,
            int series,
            boolean selected,
            Range range,
            Picture.Spot spot) {
        double energy = level.energy() + curve.channel().origin();
        List<XyPlotModel.Rung> rungs = new ArrayList<>();
        List<PotentialCurve.Allowed> allowed = curve.allowed(energy, range.right());
        for (int i = 0; i < allowed.size(); i++) {
            String text = i == allowed.size() - 1 ? label : "";
            PotentialCurve.Allowed piece = allowed.get(i);
            rungs.add(new XyPlotModel.Rung(piece.from(), piece.to(), energy, text, series, selected, spot));
        }
        return rungs;
    }
}
