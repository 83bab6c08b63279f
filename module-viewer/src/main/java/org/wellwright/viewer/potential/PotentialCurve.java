package org.wellwright.viewer.potential;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.SolvedChannel;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.RadialProblem;

/**
 * V(r) of one solved channel on the project's energy zero, with or without the centrifugal term. The first channel of a
 * coupled block is shown.
 *
 * @param channel the solved channel
 * @param centrifugal whether κλ/r² is added
 */
record PotentialCurve(SolvedChannel channel, boolean centrifugal) {
    private static final int SCAN = 2000;

    /** An interval of r in which E > V. */
    record Allowed(double from, double to) {}

    /** The value at r > 0. */
    double at(double r) {
        RadialProblem problem = channel.spectrum().problem();
        if (r < problem.innerWall() || r > problem.outerWall()) {
            return Double.POSITIVE_INFINITY;
        }
        double value = problem.common().value(r) + problem.channels().get(0).threshold() + channel.origin();
        for (ChannelTerm term : problem.rest()) {
            if (term.row() == 0 && term.column() == 0) {
                value += term.potential().value(r);
            }
        }
        return centrifugal
                ? value + problem.kinetic() * problem.channels().get(0).centrifugal() / (r * r)
                : value;
    }

    /**
     * Where a level is classically allowed, from the scan of a logarithmic grid, each end bisected.
     *
     * @param energy on the project's zero
     * @param farthest where the scan ends
     */
    List<Allowed> allowed(double energy, double farthest) {
        double ratio = Math.pow(1e6, 1.0 / SCAN);
        List<Allowed> allowed = new ArrayList<>();
        double before = 0;
        double start = Double.NaN;
        double r = farthest / 1e6;
        for (int i = 0; i <= SCAN; i++) {
            boolean inside = at(r) < energy;
            if (inside && Double.isNaN(start)) {
                start = i == 0 ? 0 : edge(before, r, energy);
            } else if (!inside && !Double.isNaN(start)) {
                allowed.add(new Allowed(start, edge(before, r, energy)));
                start = Double.NaN;
            }
            before = r;
            r *= ratio;
        }
        if (!Double.isNaN(start)) {
            allowed.add(new Allowed(start, before));
        }
        return allowed;
    }

    private double edge(double low, double high, double energy) {
        boolean left = at(low) < energy;
        double a = low;
        double b = high;
        for (int i = 0; i < 40; i++) {
            double middle = 0.5 * (a + b);
            if (at(middle) < energy == left) {
                a = middle;
            } else {
                b = middle;
            }
        }
        return 0.5 * (a + b);
    }

    /**
     * From the innermost to the outermost turning point of a level; null if it is nowhere allowed or there is no state.
     */
    Allowed span(Level level) {
        double end = channel.spectrum().state(level.index()).outerRadius();
        List<Allowed> allowed = allowed(level.energy() + channel.origin(), end);
        return allowed.isEmpty()
                ? null
                : new Allowed(
                        allowed.get(0).from(), allowed.get(allowed.size() - 1).to());
    }
}
