package org.wellwright.solver.fit;

import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.radial.SolveMonitor;

/** Solves a model at sets of values and keeps the last few, since a search comes back to where it was. */
final class SolvedPoints {
    private static final int KEPT = 8;

    private final Assembly assembly;
    private final SpectrumSource source;
    private final SolveMonitor monitor;
    private final Deque<Point> points = new ArrayDeque<>();
    private int solves;

    SolvedPoints(Assembly assembly, SpectrumSource source, SolveMonitor monitor) {
        this.assembly = assembly;
        this.source = source;
        this.monitor = monitor;
    }

    /** The levels at a set of values. */
    LevelTable at(double[] values, LevelDemand demand) {
        for (Point point : points) {
            if (Arrays.equals(point.values, values) && point.table.covers(demand)) {
                return point.table;
            }
        }
        solves++;
        // The end is not known beforehand: the bar slows down instead of jumping back.
        monitor.progress(solves / (solves + 10.0), "trial " + solves + " of the fit");
        LevelTable table = LevelTable.solve(assembly, demand, values, source, new Quiet(monitor));
        points.addFirst(new Point(values.clone(), table));
        if (points.size() > KEPT) {
            points.removeLast();
        }
        return table;
    }

    /** Hands on the wish to stop, and keeps the progress of single solves to itself. */
    private record Quiet(SolveMonitor outer) implements SolveMonitor {
        @Override
        public void progress(double fraction, String what) {}

        @Override
        public boolean cancelled() {
            return outer.cancelled();
        }
    }

    private static final class Point {
        private final double[] values;
        private final LevelTable table;

        Point(double[] values, LevelTable table) {
            this.values = values;
            this.table = table;
        }
    }
}
