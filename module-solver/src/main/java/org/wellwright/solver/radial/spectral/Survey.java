package org.wellwright.solver.radial.spectral;

import java.util.Arrays;

/**
 * A first look at the lower envelope of a problem over sixty decades of r: two radii an octave, then closer and closer
 * around each minimum until a well of any width that shows in the first samples is resolved, then, once it is known up
 * to which energy, wherever the interval bounds of V leave room for a well that does not. Values that overflow are
 * taken as forbidden.
 */
final class Survey {
    private static final int HALF_OCTAVES = 200;

    private final ChannelPotentials potentials;
    private final double kinetic;
    private double[] radius;
    private double[] envelope;
    private int lowest;
    private double[] weight = new double[0];

    private Survey(ChannelPotentials potentials, double[] radius) {
        this.potentials = potentials;
        kinetic = potentials.kinetic();
        this.radius = radius;
        envelope = potentials.roughEnvelope(radius);
        findLowest();
    }

    static Survey of(ChannelPotentials potentials) {
        double inner = potentials.problem().innerWall();
        double outer = potentials.problem().outerWall();
        double[] breaks = potentials.breaks();
        double[] radius = new double[2 * HALF_OCTAVES + 4 + 4 * breaks.length];
        int count = 0;
        for (int i = -HALF_OCTAVES; i <= HALF_OCTAVES; i++) {
            double r = Math.scalb(i % 2 == 0 ? 1 : 0x1.6a09e667f3bcdp0, Math.floorDiv(i, 2));
            if (r > inner && r < outer) {
                radius[count++] = r;
            }
        }
        double previous = inner;
        for (double edge : breaks) {
            radius[count++] = edge * (1 - 1e-9);
            radius[count++] = edge * (1 + 1e-9);
            radius[count++] = 0.5 * (previous + edge);
            previous = edge;
        }
        if (Double.isFinite(outer)) {
            radius[count++] = 0.5 * (previous + outer);
        }
        radius = Arrays.copyOf(radius, count);
        Arrays.sort(radius);
        Survey survey = new Survey(potentials, radius);
        survey.closeIn();
        return survey;
    }

    /**
     * The lowest sample that is not made of rounding: where V's own rounding exceeds the envelope (a difference of
     * nearly equal numbers over a power of r), the sample is raised by it.
     */
    private void findLowest() {
        for (int round = 0; round <= radius.length; round++) {
            lowest = 0;
            for (int i = 0; i < radius.length; i++) {
                if (envelope[i] < envelope[lowest]) {
                    lowest = i;
                }
            }
            double bound = potentials.roundingBound(radius[lowest]);
            if (!(bound > 1e-3 * Math.abs(envelope[lowest]))) {
                return;
            }
            envelope[lowest] = Math.abs(envelope[lowest]) + 2 * bound;
        }
    }

    /** Adds radii and keeps the order. */
    private void insert(double[] more, int count) {
        double[] added = Arrays.copyOf(more, count);
        double[] values = potentials.roughEnvelope(added);
        int n = radius.length;
        double[] r = new double[n + count];
        double[] v = new double[n + count];
        int a = 0;
        int b = 0;
        for (int i = 0; i < r.length; i++) {
            if (b >= count || a < n && radius[a] <= added[b]) {
                r[i] = radius[a];
                v[i] = envelope[a++];
            } else {
                r[i] = added[b];
                v[i] = values[b++];
            }
        }
        radius = r;
        envelope = v;
        findLowest();
    }

    /**
     * Halves the intervals beside every local minimum until no phase hides in them, and the intervals in which a high
     * wall ends, since a well may lie at its foot.
     */
    private void closeIn() {
        double threshold = potentials.threshold();
        double[] more = new double[64];
        for (int round = 0; round < 60; round++) {
            int count = 0;
            for (int i = 1; i + 1 < radius.length && count + 3 <= more.length; i++) {
                if (footOfWall(i, threshold)) {
                    more[count++] = 0.5 * (radius[i] + radius[i + 1]);
                }
                boolean minimum = envelope[i] <= envelope[i - 1] && envelope[i] <= envelope[i + 1];
                if (!minimum || envelope[i] == envelope[i - 1] && envelope[i] == envelope[i + 1]) {
                    continue;
                }
                double ceiling = Math.min(threshold, Math.max(envelope[i - 1], envelope[i + 1]));
                double width = radius[i + 1] - radius[i - 1];
                double phase = Math.sqrt(Math.max(0, ceiling - envelope[i]) / kinetic) * width;
                if (phase > 1.5 && width > 1e-12 * radius[i]) {
                    more[count++] = 0.5 * (radius[i - 1] + radius[i]);
                    more[count++] = 0.5 * (radius[i] + radius[i + 1]);
                }
            }
            if (count == 0) {
                return;
            }
            Arrays.sort(more, 0, count);
            insert(more, distinct(more, count));
        }
    }

    private boolean footOfWall(int i, double threshold) {
        if (Double.isInfinite(threshold) || radius[i + 1] - radius[i] < 1e-6 * radius[i]) {
            return false;
        }
        double here = (envelope[i] - threshold) * radius[i] * radius[i] / kinetic;
        double next = (envelope[i + 1] - threshold) * radius[i + 1] * radius[i + 1] / kinetic;
        return here > 1e3 && Math.abs(next) < 10 || next > 1e3 && Math.abs(here) < 10;
    }

    private static int distinct(double[] sorted, int count) {
        int kept = 0;
        for (int i = 0; i < count; i++) {
            if (kept == 0 || sorted[i] > sorted[kept - 1]) {
                sorted[kept++] = sorted[i];
            }
        }
        return kept;
    }

    /** Samples wells below an energy that interval bounds of V allow and no sample has met. */
    void lookForHidden(double level) {
        double[] found = new HiddenWells(potentials, level).search(radius, envelope);
        if (found.length > 0) {
            insert(found, found.length);
            closeIn();
        }
    }

    /** Least value of the envelope seen. */
    double floor() {
        return envelope[lowest];
    }

    /** Where it is. */
    double deepest() {
        return radius[lowest];
    }

    /** Whether E is above the envelope at a radius seen in (from, to). */
    boolean allowed(double energy, double from, double to) {
        int at = Arrays.binarySearch(radius, from);
        for (int i = at < 0 ? -at - 1 : at + 1; i < radius.length && radius[i] < to; i++) {
            if (envelope[i] < energy) {
                return true;
            }
        }
        return false;
    }

    /** The largest radius seen at which E is above the envelope; 0 if none. */
    double lastAllowed(double energy) {
        for (int i = radius.length - 1; i >= 0; i--) {
            if (envelope[i] < energy) {
                return radius[i];
            }
        }
        return 0;
    }

    /** The smallest radius seen at which E is above the envelope; +∞ if none. */
    double firstAllowed(double energy) {
        for (int i = 0; i < radius.length; i++) {
            if (envelope[i] < energy) {
                return radius[i];
            }
        }
        return Double.POSITIVE_INFINITY;
    }

    /** Rough number of levels below E: (1/π) ∫ √((E − envelope)/κ) dr by trapezoids in ln r. */
    double levels(double energy) {
        if (weight.length != radius.length) {
            weight = weights();
        }
        return sum(energy, envelope, weight, radius.length);
    }

    private double[] weights() {
        int n = radius.length;
        double[] w = new double[n];
        for (int i = 0; i + 1 < n; i++) {
            double half = 0.5 * Math.log(radius[i + 1] / radius[i]) / (Math.PI * Math.sqrt(kinetic));
            w[i] += half * radius[i];
            w[i + 1] += half * radius[i + 1];
        }
        return w;
    }

    private static double sum(double energy, double[] envelope, double[] weight, int n) {
        double sum = 0;
        for (int i = 0; i < n; i++) {
            if (envelope[i] < energy) {
                sum += weight[i] * Math.sqrt(energy - envelope[i]);
            }
        }
        return sum;
    }

    /** An energy below {@code top} with about {@code wanted} levels under it; {@code top} if there are fewer. */
    double energyOf(double wanted, double top) {
        if (!(floor() < top)) {
            return top;
        }
        double low = floor();
        double high = top;
        if (Double.isInfinite(high)) {
            double step = kinetic / deepest() / deepest();
            high = low + step;
            for (int k = 0; k < 2000 && levels(high) < wanted; k++) {
                step *= 2;
                high = low + step;
            }
        } else if (levels(high) <= wanted) {
            return top;
        }
        for (int k = 0; k < 60 && levels(high) > wanted * 1.05 + 0.02; k++) {
            double middle = Double.isInfinite(top) ? 0.5 * (low + high) : between(low, high, top);
            if (levels(middle) >= wanted) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    /** Geometric in the distance to the top, since series crowd there. */
    private static double between(double low, double high, double top) {
        double a = top - low;
        double b = top - high;
        return b <= 0 ? top - 1e-4 * a : top - Math.sqrt(a * b);
    }
}
