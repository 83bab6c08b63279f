package org.wellwright.viewer.levels;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.MeasuredLevel;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.radial.Level;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.LevelText;
import org.wellwright.viewer.plot.Ticks;

/**
 * What a level diagram shows: the measured levels, then every model, each a group of columns by channel.
 *
 * @param title title
 * @param subtitle the project
 * @param energy the energy axis
 * @param groups measured levels and models, system by system and curve by curve
 */
record LevelDiagram(String title, String subtitle, AxisSpec energy, List<Group> groups) {
    /**
     * One model (or the measured levels) for one system and curve.
     *
     * @param header the model's name
     * @param note what stands under it
     * @param series index of its colour; −1 for measured levels
     * @param threshold where the continuum starts; NaN for none
     * @param columns its channels
     */
    record Group(String header, String note, int series, double threshold, List<Column> columns) {
        Group {
            columns = List.copyOf(columns);
        }
    }

    /**
     * The levels of one channel.
     *
     * @param header name of the channel
     * @param bars its levels, lowest first
     * @param measured measured levels of the same channel, drawn behind
     */
    record Column(String header, List<Bar> bars, List<Bar> measured) {
        Column {
            bars = List.copyOf(bars);
            measured = List.copyOf(measured);
        }
    }

    /**
     * One level.
     *
     * @param key its key
     * @param model its model; empty if measured
     * @param label its name
     * @param shortLabel its number alone, for narrow columns
     * @param energy its energy
     * @param below distance of its lower bound or σ⁻, ≥ 0
     * @param above distance of its upper bound or σ⁺, ≥ 0
     * @param selected whether it is selected
     */
    record Bar(
            LevelKey key,
            String model,
            String label,
            String shortLabel,
            double energy,
            double below,
            double above,
            boolean selected) {}

    LevelDiagram {
        groups = List.copyOf(groups);
    }

    /** The same over another range of energies. */
    LevelDiagram over(AxisSpec newEnergy) {
        return new LevelDiagram(title, subtitle, newEnergy, groups);
    }

    /** The diagram of everything that is solved and measured. */
    static LevelDiagram of(FigureInput input, FigureSelection selection) {
        LevelText names = LevelText.of(input.document());
        List<Group> groups = new ArrayList<>();
        Map<Place, List<MeasuredLevel>> measured = new LinkedHashMap<>();
        for (MeasuredLevel level : input.measured()) {
            measured.computeIfAbsent(Place.of(level.key()), place -> new ArrayList<>())
                    .add(level);
        }
        boolean several = places(input, measured).size() > 1;
        for (Map.Entry<Place, List<MeasuredLevel>> entry : measured.entrySet()) {
            groups.add(measuredGroup(entry.getKey(), entry.getValue(), several, names, selection));
        }
        for (int i = 0; i < input.models().size(); i++) {
            groups.addAll(modelGroups(input, i, measured, several, names, selection));
        }
        String axis = "Energy (%s)".formatted(input.units().energy().printed());
        return new LevelDiagram("Levels", input.title(), range(axis, groups), groups);
    }

    private record Place(String system, String curve) {
        static Place of(LevelKey key) {
            return new Place(key.system(), key.curve());
        }

        String text() {
            return system + " · " + curve;
        }
    }

    private static List<Place> places(FigureInput input, Map<Place, List<MeasuredLevel>> measured) {
        List<Place> places = new ArrayList<>(measured.keySet());
        for (SolvedModel model : input.models()) {
            for (SolvedChannel channel : model.channels()) {
                Place place = new Place(channel.system(), channel.curve());
                if (!places.contains(place)) {
                    places.add(place);
                }
            }
        }
        return places;
    }

    private static Group measuredGroup(
            Place place, List<MeasuredLevel> levels, boolean several, LevelText names, FigureSelection selection) {
        Map<ChannelKey, List<Bar>> columns = new LinkedHashMap<>();
        levels.stream()
                .sorted((a, b) -> compare(a.key().channel(), b.key().channel()))
                .forEach(level -> columns.computeIfAbsent(level.key().channel(), channel -> new ArrayList<>())
                        .add(bar(level, names, selection)));
        List<Column> list = new ArrayList<>();
        columns.forEach((channel, bars) -> {
            bars.sort((a, b) -> Double.compare(a.energy(), b.energy()));
            list.add(new Column(names.channel(bars.get(0).key()), bars, List.of()));
        });
        return new Group("measured", several ? place.text() : "", -1, Double.NaN, list);
    }

    private static List<Group> modelGroups(
            FigureInput input,
            int index,
            Map<Place, List<MeasuredLevel>> measured,
            boolean several,
            LevelText names,
            FigureSelection selection) {
        SolvedModel model = input.models().get(index);
        Map<Place, List<SolvedChannel>> places = new LinkedHashMap<>();
        for (SolvedChannel channel : model.channels()) {
            places.computeIfAbsent(new Place(channel.system(), channel.curve()), place -> new ArrayList<>())
                    .add(channel);
        }
        ModelComparison compared = input.compared(model.model());
        double reduced = compared == null ? Double.NaN : compared.quality().reducedChiSquare();
        String note = Double.isNaN(reduced) ? "" : "χ²/ν = " + Ticks.number(reduced, 3);
        List<Group> groups = new ArrayList<>();
        places.forEach((place, channels) -> {
            List<Column> columns = new ArrayList<>();
            double threshold = Double.NaN;
            channels.sort((a, b) -> compare(a.channel(), b.channel()));
            for (SolvedChannel channel : channels) {
                List<Bar> bars = new ArrayList<>();
                for (Level level : channel.spectrum().levels()) {
                    bars.add(bar(channel, level, model.model(), names, selection));
                    double edge = level.threshold() + channel.origin();
                    if (Double.isFinite(edge) && !(edge >= threshold)) {
                        threshold = edge;
                    }
                }
                List<Bar> behind = new ArrayList<>();
                for (MeasuredLevel level : measured.getOrDefault(place, List.of())) {
                    if (channel.holds(level.key())) {
                        behind.add(bar(level, names, selection));
                    }
                }
                columns.add(new Column(names.channel(channel.key(0)), bars, behind));
            }
            groups.add(new Group(model.model(), several ? place.text() : note, index, threshold, columns));
        });
        return groups;
    }

    private static Bar bar(MeasuredLevel level, LevelText names, FigureSelection selection) {
        double below = Double.isNaN(level.sigmaMinus()) ? 0 : level.sigmaMinus();
        double above = Double.isNaN(level.sigmaPlus()) ? 0 : level.sigmaPlus();
        boolean selected = selection.levels().contains(level.key());
        return new Bar(
                level.key(),
                "",
                names.level(level.key()),
                names.number(level.key()),
                level.energy(),
                below,
                above,
                selected);
    }

    private static Bar bar(
            SolvedChannel channel, Level level, String model, LevelText names, FigureSelection selection) {
        LevelKey key = channel.key(level.index());
        return new Bar(
                key,
                model,
                names.level(key),
                names.number(key),
                level.energy() + channel.origin(),
                level.energy() - level.lower(),
                level.upper() - level.energy(),
                selection.levels().contains(key));
    }

    static int compare(ChannelKey a, ChannelKey b) {
        int byOrbital = Integer.compare(a.orbital(), b.orbital());
        int byTotal = byOrbital != 0 ? byOrbital : Integer.compare(a.twiceTotal(), b.twiceTotal());
        return byTotal != 0 ? byTotal : Integer.compare(a.twiceSpin(), b.twiceSpin());
    }

    private static AxisSpec range(String label, List<Group> groups) {
        double lowest = Double.POSITIVE_INFINITY;
        double highest = Double.NEGATIVE_INFINITY;
        for (Group group : groups) {
            for (Column column : group.columns()) {
                for (Bar bar : column.bars()) {
                    lowest = Math.min(lowest, bar.energy() - bar.below());
                    highest = Math.max(highest, bar.energy() + bar.above());
                }
            }
        }
        if (!(lowest <= highest)) {
            return AxisSpec.of(label, 0, 1);
        }
        double span = highest - lowest;
        // A threshold just above the levels is shown; one far away would squeeze them.
        for (Group group : groups) {
            if (group.threshold() <= highest + 0.35 * span) {
                highest = Math.max(highest, group.threshold());
            }
        }
        span = highest - lowest;
        double margin = span > 0 ? 0.06 * span : Math.max(1, Math.abs(highest)) * 0.1;
        return AxisSpec.of(label, lowest - margin, highest + margin);
    }
}
