package org.wellwright.solver.radial.steps;

import java.util.Arrays;
import org.wellwright.solver.InvalidModelException;

/**
 * V sampled over every scale of r: where motion is allowed at an energy, and a lower bound for all levels.
 *
 * <p>Radii run geometrically from 2⁻⁷⁰ to 2⁹⁰, densely where r²|V − V(∞)|/κ is neither negligible nor overwhelming,
 * evenly across that region as well, and lie on both sides of every break point. Immutable.
 */
final class PotentialScan {
    private static final int LOWEST_OCTAVE = -70;
    private static final int HIGHEST_OCTAVE = 90;
    private static final int DENSE = 24;
    private static final int SPARSE = 2;
    private static final int EVEN = 400;
    private static final double GOLDEN = 0.381966011250105;

    private final double[] radii;
    private final double[] values;
    /** min over j ≥ i of V + κλ/r². */
    private final double[] outerMinimum;
    /** min over j ≤ i of V + κλ/r². */
    private final double[] innerMinimum;

    private final double anchor;
    private final double hardyBound;

    private PotentialScan(
            double[] radii, double[] values, double kinetic, double centrifugal, double anchor, double hardyBound) {
        this.radii = radii;
        this.values = values;
        this.anchor = anchor;
        this.hardyBound = hardyBound;
        int n = radii.length;
        innerMinimum = new double[n];
        outerMinimum = new double[n];
        for (int i = 0; i < n; i++) {
            innerMinimum[i] = values[i] + kinetic * centrifugal / (radii[i] * radii[i]);
        }
        outerMinimum[n - 1] = innerMinimum[n - 1];
        for (int i = n - 2; i >= 0; i--) {
            outerMinimum[i] = Math.min(innerMinimum[i], outerMinimum[i + 1]);
        }
        for (int i = 1; i < n; i++) {
            innerMinimum[i] = Math.min(innerMinimum[i - 1], innerMinimum[i]);
        }
    }

    /**
     * Samples V.
     *
     * @param where names the channel in a message
     * @throws InvalidModelException if V is not a number where it matters; names the radius
     */
    static PotentialScan of(
            SampledPotential potential,
            double kinetic,
            double centrifugal,
            double innerWall,
            double outerWall,
            String where) {
        double[] radii = chooseRadii(potential, kinetic, innerWall, outerWall);
        double[] values = new double[radii.length];
        potential.values(radii, values, radii.length);
        // Hardy's inequality: every level lies above the least V + κ(λ + ¼)/r² (Hardy 1920).
        for (int i = 0; i < radii.length; i++) {
            if (values[i] == Double.NEGATIVE_INFINITY) {
                throw notFinite(values[i], radii[i], where);
            }
        }
        int best = lowest(values, radii, kinetic, centrifugal);
        // A minimum that is made of rounding, as of a difference of nearly equal numbers over r³, is none.
        while (best >= 0 && isRounding(potential, values[best], radii[best])) {
            values[best] = Math.abs(values[best]) + potential.roundingBound(radii[best]);
            best = lowest(values, radii, kinetic, centrifugal);
        }
        if (best < 0) {
            throw notFinite(values[0], radii[0], where);
        }
        int first = best;
        while (first > 0 && Double.isFinite(values[first - 1])) {
            first--;
        }
        int last = best;
        while (last < radii.length - 1 && Double.isFinite(values[last + 1])) {
            last++;
        }
        checkInnerEnd(values, radii, first, kinetic, where);
        checkOuterEnd(potential, values, radii, last, kinetic, where);
        double[] r = Arrays.copyOfRange(radii, first, last + 1);
        double[] v = Arrays.copyOfRange(values, first, last + 1);
        best -= first;
        double low = best > 0 ? r[best - 1] : r[best];
        double high = best < r.length - 1 ? r[best + 1] : r[best];
        double anchor = r[best];
        double bound = v[best] + kinetic * (centrifugal + 0.25) / (anchor * anchor);
        for (int i = 0; i < 24 && high > low; i++) {
            boolean right = high - anchor > anchor - low;
            double trial = right ? anchor + GOLDEN * (high - anchor) : anchor - GOLDEN * (anchor - low);
            double value = potential.value(trial) + kinetic * (centrifugal + 0.25) / (trial * trial);
            if (value < bound) {
                if (right) {
                    low = anchor;
                } else {
                    high = anchor;
                }
                anchor = trial;
                bound = value;
            } else if (right) {
                high = trial;
            } else {
                low = trial;
            }
        }
        return new PotentialScan(r, v, kinetic, centrifugal, anchor, bound);
    }

    private static int lowest(double[] values, double[] radii, double kinetic, double centrifugal) {
        int best = -1;
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < radii.length; i++) {
            double value = hardy(values, radii, i, kinetic, centrifugal);
            if (Math.abs(values[i]) <= Double.MAX_VALUE && value < least) {
                least = value;
                best = i;
            }
        }
        return best;
    }

    private static boolean isRounding(SampledPotential potential, double value, double radius) {
        return value < 0 && potential.roundingBound(radius) > 0.01 * -value;
    }

    private static double hardy(double[] values, double[] radii, int i, double kinetic, double centrifugal) {
        return values[i] + kinetic * (centrifugal + 0.25) / radii[i] / radii[i];
    }

    private static double[] chooseRadii(
            SampledPotential potential, double kinetic, double innerWall, double outerWall) {
        double from = Math.max(innerWall, Math.scalb(1.0, LOWEST_OCTAVE));
        double to = Math.min(outerWall, Math.scalb(1.0, HIGHEST_OCTAVE));
        int octaves = (int) Math.max(1, Math.ceil(Math.log(to / from) / Math.log(2)));
        int coarse = octaves * SPARSE + 1;
        double[] sparse = new double[coarse];
        for (int i = 0; i < coarse; i++) {
            sparse[i] = from * Math.pow(to / from, (i + 0.5) / coarse);
        }
        double[] values = new double[coarse];
        potential.values(sparse, values, coarse);
        double limit = potential.tail().known() && potential.tail().power() < 0
                ? potential.tail().limit()
                : 0;
        double[] radii = new double[coarse * (1 + DENSE / SPARSE) + 3 * EVEN + 2 * potential.breaks().length];
        int n = 0;
        double lowest = Double.POSITIVE_INFINITY;
        double highest = 0;
        double ratio = Math.pow(to / from, 1.0 / coarse);
        for (int i = 0; i < coarse; i++) {
            radii[n++] = sparse[i];
            double strength = sparse[i] * sparse[i] * Math.abs(values[i] - limit) / kinetic;
            if (strength > 1e-3 && strength < 1e8) {
                for (int j = 0; j < DENSE / SPARSE; j++) {
                    double r = sparse[i] * Math.pow(ratio, (j + 0.7) / (DENSE / SPARSE) - 0.5);
                    radii[n++] = r;
                    lowest = Math.min(lowest, r);
                    highest = Math.max(highest, r);
                }
            }
        }
        if (highest > lowest) {
            for (int i = 0; i < EVEN; i++) {
                radii[n++] = lowest + (highest - lowest) * (i + 0.37) / EVEN;
            }
        } else {
            // Nothing seen so far: a narrow well may lie between.
            for (int i = 0; i < 3 * EVEN; i++) {
                radii[n++] = Math.pow(10, 1 + i / EVEN) * (i % EVEN + 0.37) / EVEN;
            }
        }
        for (double edge : potential.breaks()) {
            radii[n++] = edge * (1 - 1e-6);
            radii[n++] = edge * (1 + 1e-6);
        }
        double[] chosen = Arrays.copyOf(radii, n);
        Arrays.sort(chosen);
        int kept = 0;
        for (double r : chosen) {
            if (r > innerWall && r < outerWall && (kept == 0 || r > chosen[kept - 1])) {
                chosen[kept++] = r;
            }
        }
        return Arrays.copyOf(chosen, kept);
    }

    /** Nothing finite further in is a wall if V rises towards it; anything else is a fault of the potential. */
    private static void checkInnerEnd(double[] values, double[] radii, int first, double kinetic, String where) {
        if (first == 0 || values[first - 1] == Double.POSITIVE_INFINITY) {
            return;
        }
        double strength = radii[first] * radii[first] * values[first] / kinetic;
        if (!(strength > 1e6 && values[first] > values[first + 1])) {
            throw notFinite(values[first - 1], radii[first - 1], where);
        }
    }

    /**
     * Beyond the last number V is a wall if infinite, its limit if it had already reached it, and a fault otherwise.
     */
    private static void checkOuterEnd(
            SampledPotential potential, double[] values, double[] radii, int last, double kinetic, String where) {
        if (last == radii.length - 1 || values[last + 1] == Double.POSITIVE_INFINITY) {
            return;
        }
        double limit = potential.tail().known() && potential.tail().power() < 0
                ? potential.tail().limit()
                : values[last];
        double before = last > 1 ? values[last - 1] : values[last];
        double strength = radii[last]
                * radii[last]
                * Math.max(Math.abs(values[last] - limit), Math.abs(before - limit))
                / kinetic;
        if (!(strength < 1e-12)) {
            throw notFinite(values[last + 1], radii[last + 1], where);
        }
        potential.cutAt(radii[last], limit);
    }

    private static InvalidModelException notFinite(double value, double radius, String where) {
        return new InvalidModelException(
                "the potential is %s at r = %s".formatted(Double.isNaN(value) ? "not a number" : "infinite", radius),
                where,
                "write the formula so that it stays finite there, or limit its range");
    }

    /** Every level lies above this energy, as far as V was sampled. */
    double hardyBound() {
        return hardyBound;
    }

    /** Radius where V + κ(λ + ¼)/r² is least. */
    double anchor() {
        return anchor;
    }

    /** Smallest radius sampled where V is finite. */
    double innermost() {
        return radii[0];
    }

    /** Largest radius sampled where V is finite. */
    double outermost() {
        return radii[radii.length - 1];
    }

    /** V at the i-th radius from inside, or from outside if negative (−1 is the outermost). */
    double sample(int i) {
        return values[i >= 0 ? i : values.length + i];
    }

    /** The i-th radius, counted as for {@link #sample}. */
    double radius(int i) {
        return radii[i >= 0 ? i : radii.length + i];
    }

    int size() {
        return radii.length;
    }

    /** Index of the first radius above r. */
    int firstAbove(double r) {
        int at = Arrays.binarySearch(radii, r);
        return at >= 0 ? at + 1 : -at - 1;
    }

    /** Innermost sampled radius where V + κλ/r² is below the energy, NaN if there is none. */
    double firstAllowed(double energy) {
        if (!(innerMinimum[radii.length - 1] < energy)) {
            return Double.NaN;
        }
        int low = 0;
        int high = radii.length - 1;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (innerMinimum[middle] < energy) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return radii[low];
    }

    /** Outermost sampled radius where V + κλ/r² is below the energy, NaN if there is none. */
    double lastAllowed(double energy) {
        if (!(outerMinimum[0] < energy)) {
            return Double.NaN;
        }
        int low = 0;
        int high = radii.length - 1;
        while (low < high) {
            int middle = (low + high + 1) >>> 1;
            if (outerMinimum[middle] < energy) {
                low = middle;
            } else {
                high = middle - 1;
            }
        }
        return radii[low];
    }
}
