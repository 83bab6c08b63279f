package org.wellwright.solver.radial.spectral;

/**
 * The canonical edges from which all meshes of a potential are cut: powers of 4 between the break points and walls, so
 * that channels which share a potential meet the same elements and an element is the same whichever way a mesh grew.
 */
final class Ladder {
    private final double inner;
    private final double outer;
    private final double[] breaks;

    Ladder(double inner, double outer, double[] breaks) {
        this.inner = inner;
        this.outer = outer;
        this.breaks = breaks;
    }

    /** The panel between neighbouring break points or walls that holds r, upper end included if {@code closedAbove}. */
    private double panelStart(double r, boolean closedAbove) {
        double start = inner;
        for (double edge : breaks) {
            if (closedAbove ? edge < r : edge <= r) {
                start = edge;
            }
        }
        return start;
    }

    private double panelEnd(double r, boolean closedAbove) {
        for (double edge : breaks) {
            if (closedAbove ? edge >= r : edge > r) {
                return edge;
            }
        }
        return outer;
    }

    /** The edge next to r on its outer side. */
    double outward(double r) {
        double start = panelStart(r, false);
        double end = panelEnd(r, false);
        double next;
        if (start > 0) {
            next = start;
            while (next <= r) {
                next *= 4;
            }
        } else if (Double.isInfinite(end)) {
            next = 0x1p-1000;
            int power = Math.floorDiv(Math.getExponent(r), 2);
            next = Math.scalb(1.0, 2 * power + 2);
        } else {
            next = end;
            while (next * 0.25 > r) {
                next *= 0.25;
            }
            return next;
        }
        return next * 1.5 >= end ? end : next;
    }

    /** The edge next to r on its inner side; 0 is never reached. */
    double inward(double r) {
        double start = panelStart(r, true);
        double end = panelEnd(r, true);
        if (start > 0) {
            double next = start;
            double edge = start;
            while (edge < r) {
                next = edge;
                edge *= 4;
                if (edge * 1.5 >= end && edge < end) {
                    break;
                }
            }
            return next;
        }
        if (Double.isInfinite(end)) {
            int exponent = Math.getExponent(r);
            int power = Math.floorDiv(exponent, 2);
            double edge = Math.scalb(1.0, 2 * power);
            return edge < r ? edge : edge * 0.25;
        }
        double edge = end;
        while (edge >= r) {
            edge *= 0.25;
        }
        return edge;
    }

    /** Where an element is cut in two: geometrically if it spans more than an octave, else in the middle. */
    static double cut(double from, double to) {
        return to > 2.01 * from && from > 0 ? (to >= 2.9 * from ? 2 * from : 0.5 * (from + to)) : 0.5 * (from + to);
    }
}
