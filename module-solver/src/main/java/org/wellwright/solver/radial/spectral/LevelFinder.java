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
    private final int[] countAtLow;
    private final int[] countAtHigh;
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
        countAtLow = new int[wanted];
        countAtHigh = new int[wanted];
        Arrays.fill(countAtHigh, Integer.MAX_VALUE);
        Arrays.fill(low, floor);
        Arrays.fill(high, top);
    }

    int counts() {
        return counts;
    }

    private void note(double shift, int below) {
        for (int i = 0; i < wanted; i++) {
            if (i < below) {
                if (shift < high[i]) {
                    high[i] = shift;
                    countAtHigh[i] = below;
                }
            } else if (shift > low[i]) {
                low[i] = shift;
                countAtLow[i] = below;
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

    /**
     * The next level from the spacings s of those before: ln s as a polynomial in the index, exact for powers of the
     * index in the limit; or half the bracket.
     */
    private double guess(int i, List<Trial> found) {
        double a = low[i];
        double b = high[i];
        double value = Double.NaN;
        if (i >= 4) {
            double s1 = shift(found, 1) - shift(found, 2);
            double s2 = shift(found, 2) - shift(found, 3);
            double s3 = shift(found, 3) - shift(found, 4);
            double next = s1 * s1 * s1 * s3 / (s2 * s2 * s2);
            if (i >= 6) {
                double s4 = shift(found, 4) - shift(found, 5);
                double ratio = s1 * s3 / (s2 * s2);
                next = s1 * s1 * s1 * s1 * s3 * s3 * s3 * s3 / (s2 * s2 * s2 * s2 * s2 * s2 * s4);
                next = ratio > 0.5 && ratio < 2 ? next : s1;
            }
            value = shift(found, 1) + next;
        }
        return value > a && value < b ? value : 0.5 * (a + b);
    }

    private static double shift(List<Trial> found, int back) {
        return found.get(found.size() - back).shift();
    }

    private Trial refine(int i, List<Trial> found, double[] edges) {
        double shift = guess(i, found);
        double before = i > 0 ? found.get(i - 1).shift() : floor;
        double lastMove = Double.NaN;
        for (int step = 0; step < 300; step++) {
            solve(shift);
            double correction = work.correction();
            double move = Math.abs(correction);
            double next = shift + correction;
            double noise = blur(shift);
            boolean inside = next >= low[i] - noise && next <= high[i] + noise;
            double gap = Math.min(next - before, top - next);
            if (inside && move <= Math.max(1e-7 * gap, noise)) {
                // The vector at this shift is good to move/gap; one more makes it good to rounding.
                if (move > Math.max(1e-13 * gap, noise)) {
                    solve(next);
                    next += work.correction();
                    inside = Math.abs(work.correction()) <= Math.max(1e-12 * gap, 100 * noise);
                }
                if (inside && confirmed(i, next, before)) {
                    Trial trial = Trial.of(pencil.elements(), edges, work, next);
                    if (i == 0 || next - before > 1e5 * noise || independent(trial, found)) {
                        return trial;
                    }
                    return cluster(i, next, found, edges);
                }
                inside = false;
            }
            double width = high[i] - low[i];
            if (width <= noise) {
                return cluster(i, 0.5 * (low[i] + high[i]), found, edges);
            }
            boolean shrinking = !(move >= 0.5 * Math.abs(lastMove));
            if (inside && shrinking) {
                shift = Math.min(Math.max(accelerated(shift, correction, lastMove), low[i]), high[i]);
                lastMove = correction;
            } else {
                shift = 0.5 * (low[i] + high[i]);
                lastMove = Double.NaN;
            }
        }
        return cluster(i, 0.5 * (low[i] + high[i]), found, edges);
    }

    /**
     * Newton's step with its error removed: corrections θ = d + c d² at distances d from the level give c after two
     * steps, so the third lands with a cubic error.
     */
    private static double accelerated(double shift, double correction, double lastMove) {
        double next = shift + correction;
        if (Double.isNaN(lastMove) || Math.abs(correction) > 0.2 * Math.abs(lastMove)) {
            return next;
        }
        double distance = lastMove + correction;
        double curvature = -correction / (distance * distance);
        double change = -curvature * correction * correction;
        return Math.abs(change) < 0.1 * Math.abs(correction) ? next + change : next;
    }

    private void solve(double shift) {
        counts++;
        work.solve(shift, null);
        note(shift, work.below());
    }

    /** How far counts may be off by rounding. */
    private double blur(double energy) {
        return 0x1p-50 * Math.max(Math.abs(energy), 0.1 * Math.abs(top - floor));
    }

    /**
     * Whether level i lies where it was found: an energy below it with exactly i levels under it and one above with i +
     * 1, both beyond the blur of counts; or, where neighbours are nearer than that, at most i below and at least i + 1
     * above.
     */
    private boolean confirmed(int i, double energy, double before) {
        double offset = 16 * blur(energy);
        double room = Math.max(offset, 0.25 * Math.min(energy - before, top - energy));
        boolean below = countAtLow[i] == i && low[i] < energy - offset || count(energy - room) == i;
        boolean above =
                below && (countAtHigh[i] == i + 1 && high[i] > energy + offset || count(energy + room) == i + 1);
        return above || count(energy - offset) <= i && count(energy + offset) > i;
    }

    private boolean independent(Trial trial, List<Trial> found) {
        for (int j = found.size() - 1; j >= 0; j--) {
            Trial other = found.get(j);
            if (Math.abs(other.shift() - trial.shift()) > 1e6 * blur(trial.shift())) {
                return true;
            }
            double cosine = trial.overlap(other) / Math.sqrt(trial.norm() * other.norm());
            if (Math.abs(cosine) > 0.1) {
                return false;
            }
        }
        return true;
    }

    /** Levels nearer to each other than rounding: vectors from twists in different wells. */
    private Trial cluster(int i, double energy, List<Trial> found, double[] edges) {
        List<Trial> mates = new ArrayList<>();
        for (int j = i - 1; j >= 0; j--) {
            double distance = Math.abs(found.get(j).shift() - energy);
            if (distance <= 1e6 * blur(energy)) {
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
            // The top itself may lie on the next level, where a count is rounding.
            return last + 0.6 * (to - last);
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
