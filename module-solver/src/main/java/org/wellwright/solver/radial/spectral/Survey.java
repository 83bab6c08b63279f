package org.wellwright.solver.radial.spectral;

/**
 * A first look at the lower envelope of a problem over sixty decades of r, two radii an octave: where its minimum is,
 * how deep, and beyond which radius nothing is classically allowed. Values that overflow are taken as forbidden.
 */
final class Survey {
    private static final int HALF_OCTAVES = 200;

    private final double[] radius;
    private final double[] envelope;
    private final double kinetic;
    private final int lowest;

    private Survey(double[] radius, double[] envelope, double kinetic) {
        this.radius = radius;
        this.envelope = envelope;
        this.kinetic = kinetic;
        int at = -1;
        for (int i = 0; i < radius.length; i++) {
            // Strength against the kinetic energy decides, so that a constant V has no preferred radius.
            if (!Double.isNaN(envelope[i]) && (at < 0 || envelope[i] < envelope[at])) {
                at = i;
            }
        }
        lowest = Math.max(at, 0);
    }

    static Survey of(ChannelPotentials potentials) {
        double inner = potentials.problem().innerWall();
        double outer = potentials.problem().outerWall();
        double[] radius = new double[2 * HALF_OCTAVES + 1 + 2 * potentials.breaks().length];
        int count = 0;
        for (int i = -HALF_OCTAVES; i <= HALF_OCTAVES; i++) {
            double r = Math.scalb(i % 2 == 0 ? 1 : 0x1.6a09e667f3bcdp0, Math.floorDiv(i, 2));
            if (r > inner && r < outer) {
                radius[count++] = r;
            }
        }
        for (double edge : potentials.breaks()) {
            radius[count++] = edge * (1 - 1e-6);
            radius[count++] = edge * (1 + 1e-6);
        }
        if (count == 0) {
            radius = new double[] {0.5 * (inner + outer)};
            count = 1;
        }
        radius = java.util.Arrays.copyOf(radius, count);
        java.util.Arrays.sort(radius);
        return new Survey(radius, potentials.roughEnvelope(radius), potentials.kinetic());
    }

    /** Least value of the envelope seen. */
    double floor() {
        return envelope[lowest];
    }

    /** Where it is. */
    double deepest() {
        return radius[lowest];
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
        double sum = 0;
        for (int i = 0; i + 1 < radius.length; i++) {
            double here = Math.sqrt(Math.max(0, energy - envelope[i]) / kinetic) * radius[i];
            double next = Math.sqrt(Math.max(0, energy - envelope[i + 1]) / kinetic) * radius[i + 1];
            if (here + next > 0) {
                sum += 0.5 * (here + next) * Math.log(radius[i + 1] / radius[i]);
            }
        }
        return sum / Math.PI;
    }

    /** An energy below {@code top} with about {@code wanted} levels under it; {@code top} if there are fewer. */
    double energyOf(double wanted, double top) {
        double low = floor();
        double high = top;
        if (Double.isInfinite(high)) {
            double step = Math.max(Math.abs(low), kinetic / deepest() / deepest());
            high = low + step;
            for (int k = 0; k < 2000 && levels(high) < wanted; k++) {
                step *= 2;
                high = low + step;
            }
        } else if (levels(high) <= wanted) {
            return top;
        }
        // Relative to the top, since series crowd there.
        for (int k = 0; k < 60 && levels(high) > wanted * 1.02; k++) {
            double middle = Double.isInfinite(top) ? 0.5 * (low + high) : between(low, high, top);
            if (levels(middle) >= wanted) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    private static double between(double low, double high, double top) {
        double a = top - low;
        double b = top - high;
        if (b <= 0) {
            return top - a * 1e-4 > low ? (low + top) / 2 + 0.4999 * (top - low) : low;
        }
        return top - Math.sqrt(a * b);
    }
}
