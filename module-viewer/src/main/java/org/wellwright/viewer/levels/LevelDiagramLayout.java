package org.wellwright.viewer.levels;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.wellwright.viewer.levels.LevelDiagram.Bar;
import org.wellwright.viewer.levels.LevelDiagram.Column;
import org.wellwright.viewer.levels.LevelDiagram.Group;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.ScriptText;

/**
 * Where everything of a level diagram stands. Labels never overlap: one that has no room beside its level moves by less
 * than a line; levels too close for that share one label from the first to the last.
 *
 * @param groups the groups from left to right
 * @param bars the levels
 * @param labels the labels
 */
record LevelDiagramLayout(List<PlacedGroup> groups, List<PlacedBar> bars, List<PlacedLabel> labels) {
    /** A group between two horizontal places. */
    record PlacedGroup(Group group, double left, double right, List<PlacedColumn> columns) {}

    /** A column: its levels are drawn from {@code left} to {@code right}, its labels up to {@code end}. */
    record PlacedColumn(Column column, double left, double right, double end) {}

    /** A level's line. */
    record PlacedBar(Bar bar, int series, double left, double right, double y) {}

    /** A label with the place of the first level it names. */
    record PlacedLabel(String text, Rectangle2D box, double barEnd, double barY, boolean selected) {}

    private static final double MOST_SHIFT = 0.75;

    /** Columns with more levels than this are given room for the label of a run. */
    private static final int FEW = 3;

    LevelDiagramLayout {
        groups = List.copyOf(groups);
        bars = List.copyOf(bars);
        labels = List.copyOf(labels);
    }

    static LevelDiagramLayout of(LevelDiagram diagram, PlotFrame.Area area, PlotStyle style) {
        double em = style.em();
        Rectangle2D box = area.area();
        double groupGap = Math.min(
                em * 1.6, box.getWidth() * 0.25 / Math.max(1, diagram.groups().size()));
        List<Double> widths =
                widths(diagram, box.getWidth() - groupGap * diagram.groups().size(), style);
        List<PlacedGroup> groups = new ArrayList<>();
        List<PlacedBar> bars = new ArrayList<>();
        List<PlacedLabel> labels = new ArrayList<>();
        double x = box.getX() + groupGap / 2;
        for (int i = 0; i < diagram.groups().size(); i++) {
            Group group = diagram.groups().get(i);
            double left = x;
            double slot = widths.get(i) / Math.max(1, group.columns().size());
            List<PlacedColumn> columns = new ArrayList<>();
            for (Column column : group.columns()) {
                columns.add(place(column, group, x, slot, area, style, bars, labels));
                x += slot;
            }
            x = left + widths.get(i);
            groups.add(new PlacedGroup(group, left, x, List.copyOf(columns)));
            x += groupGap;
        }
        return new LevelDiagramLayout(groups, bars, labels);
    }

    /** Widths of the groups: by their columns, but none narrower than its header as long as there is room. */
    private static List<Double> widths(LevelDiagram diagram, double room, PlotStyle style) {
        double fair = 0.9 * room / Math.max(1, diagram.groups().size());
        double columns = diagram.groups().stream()
                .mapToInt(group -> group.columns().size())
                .sum();
        List<Double> wanted = new ArrayList<>();
        double sum = 0;
        for (Group group : diagram.groups()) {
            double header = Math.min(fair, ScriptText.width(style.font(), group.header()));
            double width = Math.max(header, room * group.columns().size() / Math.max(1, columns));
            wanted.add(width);
            sum += width;
        }
        double scale = sum > 0 ? room / sum : 1;
        return wanted.stream().map(width -> width * scale).toList();
    }

    private static PlacedColumn place(
            Column column,
            Group group,
            double x,
            double slot,
            PlotFrame.Area area,
            PlotStyle style,
            List<PlacedBar> bars,
            List<PlacedLabel> labels) {
        double em = style.em();
        double least = em * 0.9;
        double room = slot - least - em * 0.7;
        boolean named = Math.max(widest(column, style, false), runWidth(column, style)) <= room;
        boolean numbered = !named && widest(column, style, true) <= room;
        double wanted = Math.max(widest(column, style, numbered), runWidth(column, style));
        double labelWidth = named || numbered ? Math.min(wanted, room) : 0;
        double barWidth = Math.min(slot - labelWidth - em * (labelWidth > 0 ? 0.7 : 0.3), em * 5);
        double left = x + em * 0.1;
        double right = left + Math.max(barWidth, labelWidth > 0 ? least : slot * 0.5);
        List<PlacedBar> here = new ArrayList<>();
        for (Bar bar : column.bars()) {
            double y = area.y(bar.energy());
            if (y >= area.area().getMinY() && y <= area.area().getMaxY()) {
                here.add(new PlacedBar(bar, group.series(), left, right, y));
            }
        }
        bars.addAll(here);
        double end = x + slot - em * 0.2;
        if (named || numbered) {
            labels.addAll(labels(here, numbered, right + em * 0.3, end, area.area(), style));
        }
        return new PlacedColumn(column, left, right, end);
    }

    private static double widest(Column column, PlotStyle style, boolean numbered) {
        double widest = 0;
        for (Bar bar : column.bars()) {
            widest = Math.max(widest, ScriptText.width(style.smallFont(), numbered ? bar.shortLabel() : bar.label()));
        }
        return widest;
    }

    /** Width of the label of a run of levels; 0 where a column has too few for one. */
    private static double runWidth(Column column, PlotStyle style) {
        int count = column.bars().size();
        if (count <= FEW) {
            return 0;
        }
        return ScriptText.width(
                style.smallFont(),
                column.bars().get(0).shortLabel() + "–"
                        + column.bars().get(count - 1).shortLabel());
    }

    /** Greedy from the lowest level up. */
    private static List<PlacedLabel> labels(
            List<PlacedBar> bars, boolean numbered, double x, double end, Rectangle2D area, PlotStyle style) {
        double line = ScriptText.lineHeight(style.smallFont());
        List<List<PlacedBar>> runs = new ArrayList<>();
        List<Double> places = new ArrayList<>();
        double last = Double.POSITIVE_INFINITY;
        for (PlacedBar bar : bars) {
            double natural = Math.min(Math.max(bar.y(), area.getMinY() + line / 2), area.getMaxY() - line / 2);
            double place = Math.min(natural, last - line);
            boolean fits = natural - place <= MOST_SHIFT * line && place >= area.getMinY() + line * 0.4;
            if (fits || runs.isEmpty()) {
                runs.add(new ArrayList<>(List.of(bar)));
                places.add(place);
                last = place;
            } else {
                runs.get(runs.size() - 1).add(bar);
            }
        }
        List<PlacedLabel> labels = new ArrayList<>();
        for (int i = 0; i < runs.size(); i++) {
            List<PlacedBar> run = runs.get(i);
            PlacedBar first = run.get(0);
            String text = text(run, numbered, end - x, style);
            Rectangle2D box = new Rectangle2D.Double(
                    x, places.get(i) - line / 2, ScriptText.width(style.smallFont(), text), line);
            boolean selected = run.stream().anyMatch(bar -> bar.bar().selected());
            labels.add(new PlacedLabel(text, box, first.right(), first.y(), selected));
        }
        return labels;
    }

    private static String text(List<PlacedBar> run, boolean numbered, double room, PlotStyle style) {
        Bar first = run.get(0).bar();
        String alone = numbered ? first.shortLabel() : first.label();
        if (run.stream().allMatch(bar -> bar.bar().shortLabel().equals(first.shortLabel()))) {
            return alone;
        }
        Bar last = run.get(run.size() - 1).bar();
        if (first.key().equals(last.key())) {
            // The same level, measured twice.
            return alone;
        }
        for (String text : List.of(
                alone + " – " + (numbered ? last.shortLabel() : last.label()),
                first.shortLabel() + "–" + last.shortLabel(),
                alone + "…")) {
            if (ScriptText.width(style.smallFont(), text) <= room) {
                return text;
            }
        }
        return alone;
    }

    /** The level nearest to a point within a few units of it, or null. */
    PlacedBar at(double x, double y, double reach) {
        PlacedBar nearest = null;
        double best = reach;
        for (PlacedBar bar : bars) {
            boolean beside = x >= bar.left() - reach && x <= bar.right() + 6 * reach;
            double distance = Math.abs(bar.y() - y);
            if (beside && distance <= best) {
                best = distance;
                nearest = bar;
            }
        }
        return nearest;
    }
}
