package org.wellwright.solver.radial.spectral;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.wellwright.solver.numerics.CondensedPencil;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * Isolates the levels of a condensed pencil by counting and refines each by Rayleigh quotients on the twisted
 * factorisation; every shift also counts, so every step narrows the brackets of all levels (Dhillon and Parlett 2004;
 * Wittrick and Williams 1971).
 */
final class LevelFinder {
    private final CondensedPencil pencil;
    private final CondensedPencil.Work work;
    private final SolveMonitor monitor;
    private final int wanted;
    private final double[] low;
    private final double[] high;
    private final double floor;
    private final double top;
    private int counts;

    /**
     * A finder for the first {@code wanted} levels.
     *
     * @param floor an energy with no level below
     * @param top an energy with at least {@code wanted} levels below
     */
    LevelFinder(CondensedPencil pencil, int wanted, double floor, double top, SolveMonitor monitor) {
        this.pencil = pencil;
        this.wanted = wanted;
        this.floor = floor;
        this.top = top;
        this.monitor = monitor;
        work = pencil.work();
        low = new double[wanted];
        high = new double[wanted];
        Arrays.fill(low, floor);
        Arrays.fill(high, top);
    }

    int counts() {
        return counts;
    }

    private void note(double shift, int below) {
        for (int i = 0; i < wanted; i++) {
            if (i < below) {
                high[i] = Math.min(high[i], shift);
            } else {
                low[i] = Math.max(low[i], shift);
            }
        }
    }

    private int count(double shift) {
        counts++;
        int below = work.count(shift);
        note(shift, below);
        return below;
    }

    /** All wanted levels in order. */
    List<Trial> find(double[] edges) {
        List<Trial> found = new ArrayList<>(wanted);
        for (int i = 0; i < wanted; i++) {
            if (monitor.cancelled()) {
                throw new java.util.concurrent.CancellationException("cancelled after %d levels".formatted(i));
            }
            found.add(refine(i, found, edges));
        }
        return found;
    }

    private double guess(int i, List<Trial> found) {
        double a = low[i];
        double b = high[i];
        double value = Double.NaN;
        if (i >= 3) {
            double e1 = found.get(i - 1).shift();
            double e2 = found.get(i - 2).shift();
            double e3 = found.get(i - 3).shift();
            value = e1 + (e1 - e2) + ((e1 - e2) - (e2 - e3));
            double d1 = e1 - e2;
            double d2 = e2 - e3;
            // Spacings of most spectra shrink or grow in a steady ratio.
            value = d2 > 0 ? e1 + d1 * Math.min(d1 / d2, 2) : value;
        }
        return value > a && value < b ? value : 0.5 * (a + b);
    }

    private Trial refine(int i, List<Trial> found, double[] edges) {
        double shift = guess(i, found);
        double before = i > 0 ? found.get(i - 1).shift() : Double.NaN;
        for (int step = 0; step < 200; step++) {
            counts++;
            work.solve(shift, null);
            note(shift, work.below());
            double next = shift + work.correction();
            double move = Math.abs(work.correction());
            double width = high[i] - low[i];
            boolean isolated = next > low[i] && next < high[i];
            double gap = gap(i, next, before);
            if (isolated && move <= 1e-7 * gap) {
                work.solve(next, null);
                counts++;
                double settled = next + work.correction();
                if (confirmed(i, settled, gap)) {
                    return Trial.of(pencil.elements(), edges, work, settled);
                }
            }
            double resolution = 4 * Math.ulp(Math.max(Math.abs(low[i]), Math.abs(high[i])));
            if (width <= resolution) {
                return cluster(i, found, edges);
            }
            shift = isolated && move < 0.3 * width ? next : 0.5 * (low[i] + high[i]);
            if (shift == low[i] || shift == high[i]) {
                shift = 0.5 * (low[i] + high[i]);
            }
        }
        return cluster(i, found, edges);
    }

    private double gap(int i, double energy, double before) {
        double gap = Math.min(top - energy, energy - floor);
        if (i > 0) {
            gap = Math.min(gap, energy - before);
        }
        if (i + 1 < wanted && low[i + 1] > energy) {
            gap = Math.min(gap, low[i + 1] - energy);
        }
        return Math.max(gap, 0);
    }

    /** The index of a refined level by two counts; a third and fourth further off where rounding blurs the first. */
    private boolean confirmed(int i, double energy, double gap) {
        double offset = Math.min(1e-3 * gap, 64 * Math.ulp(energy) + 1e-6 * gap);
        if (!(offset > 0)) {
            return false;
        }
        if (low[i] < energy - offset || low[i] > energy) {
            if (count(energy - offset) != i) {
                return false;
            }
        }
        return count(energy + offset) == i + 1;
    }

    /** Levels nearer to each other than rounding: vectors from twists in different wells. */
    private Trial cluster(int i, List<Trial> found, double[] edges) {
        double energy = 0.5 * (low[i] + high[i]);
        List<Trial> mates = new ArrayList<>();
        for (int j = i - 1; j >= 0; j--) {
            double distance = Math.abs(found.get(j).shift() - energy);
            if (distance <= 1e-12 * Math.max(Math.abs(energy), Math.abs(top - floor))) {
                mates.add(found.get(j));
            } else {
                break;
            }
        }
        Element[] elements = pencil.elements();
        boolean[] allowed = null;
        if (!mates.isEmpty()) {
            allowed = new boolean[elements.length];
            Arrays.fill(allowed, true);
            for (Trial mate : mates) {
                for (int e = 0; e < elements.length; e++) {
                    if (mate.share(e) > 1e-6) {
                        allowed[e] = false;
                    }
                }
            }
        }
        work.solve(energy, allowed);
        counts++;
        Trial trial = Trial.of(elements, edges, work, energy);
        return mates.isEmpty() ? trial : trial.orthogonalTo(mates);
    }

    /** An energy with exactly {@code wanted} levels below, well above the last: half way to the next one. */
    double above(double last) {
        double from = Math.max(last, floor);
        double to = top;
        if (count(to) == wanted) {
            return to;
        }
        double least = from;
        for (int step = 0; step < 60; step++) {
            double middle = 0.5 * (from + to);
            if (middle <= from || middle >= to) {
                break;
            }
            int below = count(middle);
            if (below == wanted) {
                least = middle;
                // Near the next level enough.
                if (to - middle < 0.5 * (middle - last)) {
                    return last + 0.6 * (middle - last);
                }
                from = middle;
            } else if (below > wanted) {
                to = middle;
            } else {
                from = middle;
            }
        }
        return least;
    }
}
