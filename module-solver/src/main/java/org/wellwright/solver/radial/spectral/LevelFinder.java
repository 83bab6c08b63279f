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

    /** Extrapolates the levels found so far as a polynomial in their index, or halves the bracket. */
    private double guess(int i, List<Trial> found) {
        double a = low[i];
        double b = high[i];
        double value = Double.NaN;
        if (i >= 6) {
            value = 4 * (shift(found, 1) + shift(found, 3)) - 6 * shift(found, 2) - shift(found, 4);
        } else if (i >= 3) {
            value = 3 * (shift(found, 1) - shift(found, 2)) + shift(found, 3);
        }
        return value > a && value < b ? value : 0.5 * (a + b);
    }

    private static double shift(List<Trial> found, int back) {
        return found.get(found.size() - back).shift();
    }

    private Trial refine(int i, List<Trial> found, double[] edges) {
        double shift = guess(i, found);
        double before = i > 0 ? found.get(i - 1).shift() : floor;
        double lastMove = Double.POSITIVE_INFINITY;
        for (int step = 0; step < 300; step++) {
            counts++;
            work.solve(shift, null);
            note(shift, work.below());
            double next = shift + work.correction();
            double move = Math.abs(work.correction());
            double noise = blur(shift);
            boolean inside = next >= low[i] - noise && next <= high[i] + noise;
            double gap = Math.min(next - before, top - next);
            if (inside && move <= Math.max(1e-7 * gap, noise)) {
                counts++;
                work.solve(next, null);
                double settled = next + work.correction();
                if (Math.abs(work.correction()) <= 100 * noise && confirmed(i, settled)) {
                    Trial trial = Trial.of(pencil.elements(), edges, work, settled);
                    if (i == 0 || settled - before > 1e5 * noise || independent(trial, found)) {
                        return trial;
                    }
                    return cluster(i, settled, found, edges);
                }
                inside = false;
            }
            double width = high[i] - low[i];
            if (width <= noise) {
                return cluster(i, 0.5 * (low[i] + high[i]), found, edges);
            }
            boolean shrinking = move < 0.5 * lastMove;
            lastMove = inside && shrinking ? move : Double.POSITIVE_INFINITY;
            shift = inside && shrinking ? Math.min(Math.max(next, low[i]), high[i]) : 0.5 * (low[i] + high[i]);
        }
        return cluster(i, 0.5 * (low[i] + high[i]), found, edges);
    }

    /** How far counts may be off by rounding. */
    private double blur(double energy) {
        return 0x1p-50 * Math.max(Math.abs(energy), 0.1 * Math.abs(top - floor));
    }

    /** Whether level i lies where it was found: at most i levels below, at least i + 1 above. */
    private boolean confirmed(int i, double energy) {
        double offset = 16 * blur(energy);
        if (low[i] < energy - offset) {
            count(energy - offset);
        }
        if (high[i] > energy + offset) {
            count(energy + offset);
        }
        // Never below the last count that showed rounding.
        return low[i] >= energy - offset && high[i] <= energy + offset;
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
