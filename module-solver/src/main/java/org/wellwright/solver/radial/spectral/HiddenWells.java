package org.wellwright.solver.radial.spectral;

import java.util.Arrays;
import java.util.Comparator;
import java.util.PriorityQueue;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;

/**
 * Looks for wells that no sample has met, with the interval bounds of the terms: intervals whose bound lies below a
 * level are halved, the lowest first, until the bound rises above it or a sample falls below it. Where a term gives no
 * bounds nothing can be found (Moore 1966, chapter 6, for the search).
 */
final class HiddenWells {
    private static final int BUDGET = 600;

    private final ChannelPotentials potentials;
    private final double level;

    private record Piece(double from, double to, double bound) {}

    HiddenWells(ChannelPotentials potentials, double level) {
        this.potentials = potentials;
        this.level = level;
    }

    /** Radii at which the envelope is below the level although no given sample near them is. */
    double[] search(double[] radius, double[] envelope) {
        double r = radius[radius.length / 2];
        if (lowerBound(r, r * (1 + 1e-12)) == Double.NEGATIVE_INFINITY) {
            return new double[0];
        }
        PriorityQueue<Piece> open = new PriorityQueue<>(Comparator.comparingDouble(Piece::bound));
        int n = radius.length;
        int start = 0;
        // Runs of forbidden samples, whole first: one bound often settles thousands of octaves.
        for (int i = 0; i <= n; i++) {
            boolean allowed = i == n || envelope[i] < level;
            if (allowed) {
                if (i - start > 1) {
                    add(open, radius[start], radius[i - 1]);
                }
                start = i + 1;
            }
        }
        double[] found = new double[64];
        int count = 0;
        for (int used = 0; used < BUDGET && !open.isEmpty() && count < found.length; used++) {
            Piece piece = open.poll();
            double middle =
                    piece.to > 4 * piece.from ? Math.sqrt(piece.from * piece.to) : 0.5 * (piece.from + piece.to);
            if (!(middle > piece.from && middle < piece.to)) {
                continue;
            }
            double value = potentials.roughEnvelope(new double[] {middle})[0];
            if (value + potentials.roundingBound(middle) < level) {
                found[count++] = middle;
                continue;
            }
            add(open, piece.from, middle);
            add(open, middle, piece.to);
        }
        double[] result = Arrays.copyOf(found, count);
        Arrays.sort(result);
        return result;
    }

    private void add(PriorityQueue<Piece> open, double from, double to) {
        double bound = lowerBound(from, to);
        if (bound < level && bound != Double.NEGATIVE_INFINITY && to > from * (1 + 1e-9)) {
            open.add(new Piece(from, to, bound));
        } else if (bound == Double.NEGATIVE_INFINITY && to > 2 * from && open.size() < 64) {
            // Unbounded on a wide piece only because it is wide, perhaps.
            open.add(new Piece(from, to, bound));
        }
    }

    private double lowerBound(double from, double to) {
        Interval common = potentials.problem().common().enclose(from, to);
        if (common.lower() == Double.NEGATIVE_INFINITY) {
            return Double.NEGATIVE_INFINITY;
        }
        int channels = potentials.channels();
        double[] rows = new double[channels];
        for (int c = 0; c < channels; c++) {
            double strength = potentials.kinetic() * (potentials.centrifugal(c) + 0.25);
            rows[c] = common.lower()
                    + potentials.problem().channels().get(c).threshold()
                    + strength / (strength > 0 ? to * to : from * from);
        }
        for (ChannelTerm term : potentials.problem().rest()) {
            TermEvaluator evaluator = term.potential();
            Interval range = evaluator.enclose(from, to);
            if (term.row() == term.column()) {
                rows[term.row()] += range.lower();
            } else {
                double size = Math.max(Math.abs(range.lower()), Math.abs(range.upper()));
                rows[term.row()] -= size;
                rows[term.column()] -= size;
            }
        }
        double least = Double.POSITIVE_INFINITY;
        for (double row : rows) {
            least = Math.min(least, row);
        }
        return Double.isNaN(least) ? Double.NEGATIVE_INFINITY : least;
    }
}
