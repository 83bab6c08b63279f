package org.wellwright.viewer.predictions;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.wellwright.project.FigureInput;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.radial.Level;
import org.wellwright.viewer.plot.LevelText;
import org.wellwright.viewer.plot.TableText;
import org.wellwright.viewer.plot.TableText.Cell;
import org.wellwright.viewer.plot.TableText.Column;
import org.wellwright.viewer.plot.Ticks;

/**
 * The table of predictions: levels that no datum names, with every model's energy and how far the models differ.
 *
 * @param table one row per level
 * @param levels the levels of the rows
 */
record PredictionsViewModel(TableText table, List<LevelKey> levels) {
    PredictionsViewModel {
        levels = List.copyOf(levels);
    }

    static PredictionsViewModel of(FigureInput input) {
        Set<LevelKey> named = new HashSet<>();
        for (Datum datum : input.document().data()) {
            datum.levels().forEach(part -> named.add(part.level()));
            datum.denominator().forEach(part -> named.add(part.level()));
        }
        Set<LevelKey> levels = new LinkedHashSet<>();
        for (SolvedModel model : input.models()) {
            for (SolvedChannel channel : model.channels()) {
                levels.addAll(channel.keys());
            }
        }
        levels.removeAll(named);
        String unit = input.units().energy().printed();
        List<Column> columns = new ArrayList<>();
        columns.add(new Column("Level", false));
        for (SolvedModel model : input.models()) {
            columns.add(new Column("%s (%s)".formatted(model.model(), unit), true));
        }
        if (input.models().size() > 1) {
            columns.add(new Column("Models differ by (%s)".formatted(unit), true));
        }
        LevelText names = LevelText.of(input.document());
        List<List<Cell>> rows = new ArrayList<>();
        for (LevelKey key : levels) {
            rows.add(row(input, key, names));
        }
        return new PredictionsViewModel(new TableText(columns, rows), List.copyOf(levels));
    }

    private static List<Cell> row(FigureInput input, LevelKey key, LevelText names) {
        List<Cell> row = new ArrayList<>();
        row.add(Cell.of(names.full(key)));
        double lowest = Double.POSITIVE_INFINITY;
        double highest = Double.NEGATIVE_INFINITY;
        int count = 0;
        for (SolvedModel model : input.models()) {
            SolvedChannel channel = model.channelOf(key);
            Level level = channel == null ? null : channel.level(key.index());
            if (level == null) {
                row.add(Cell.of("–"));
                continue;
            }
            double energy = level.energy() + channel.origin();
            lowest = Math.min(lowest, energy);
            highest = Math.max(highest, energy);
            count++;
            String bounds = "%s, between %s and %s"
                    .formatted(energy, level.lower() + channel.origin(), level.upper() + channel.origin());
            row.add(new Cell(Ticks.number(energy, 8), bounds));
        }
        if (input.models().size() > 1) {
            row.add(
                    count > 1
                            ? new Cell(Ticks.number(highest - lowest, 3), Double.toString(highest - lowest))
                            : Cell.of("–"));
        }
        return row;
    }
}
