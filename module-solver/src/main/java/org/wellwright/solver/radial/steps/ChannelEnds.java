package org.wellwright.solver.radial.steps;

import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;

/**
 * How V starts and ends in one channel: what the terms declare where the scan confirms it, what the scan shows
 * otherwise. Immutable.
 */
final class ChannelEnds {
    private final ScalarPotential potential;
    private final PotentialScan scan;
    private final double kinetic;
    private final double centrifugal;
    private final String where;

    ChannelEnds(ScalarPotential potential, PotentialScan scan, double kinetic, double centrifugal, String where) {
        this.potential = potential;
        this.scan = scan;
        this.kinetic = kinetic;
        this.centrifugal = centrifugal;
        this.where = where;
    }

    /**
     * V at r → 0 in a channel that reaches the origin.
     *
     * @throws InvalidModelException if the channel falls to the centre
     */
    OriginBehaviour origin() {
        OriginBehaviour origin = confirmed(potential.origin()) ? potential.origin() : observed();
        boolean attractiveCore = origin.power() < -2 && origin.coefficient() < 0;
        boolean repulsiveCore = origin.power() < -2 && origin.coefficient() > 0;
        double total = centrifugal + origin.inverseSquare() / kinetic;
        if (attractiveCore || !repulsiveCore && total < -0.25 - 1e-14 * (1 + Math.abs(centrifugal))) {
            throw new InvalidModelException(
                    "the particle falls to the centre: near r = 0 the attraction exceeds (l + 1/2)² κ/r²",
                    where,
                    "cut the potential off at small r, or leave this channel out");
        }
        return origin;
    }

    private boolean confirmed(OriginBehaviour declared) {
        if (!declared.known()) {
            return false;
        }
        double r = scan.innermost();
        double seen = r * r * scan.sample(0) / kinetic;
        double expected =
                (declared.inverseSquare() + declared.coefficient() * Math.pow(r, declared.power() + 2)) / kinetic;
        return Double.isInfinite(expected)
                || Math.abs(seen - expected) <= 1e-5 * (1e-2 + Math.abs(seen) + Math.abs(expected));
    }

    /** The behaviour of the innermost samples: the exponent of r²V. */
    private OriginBehaviour observed() {
        double r0 = scan.radius(0);
        double w0 = r0 * r0 * scan.sample(0) / kinetic;
        int other = Math.min(8, scan.size() - 1);
        double r1 = scan.radius(other);
        double w1 = r1 * r1 * scan.sample(other) / kinetic;
        if (Math.abs(w0) < 1e-6) {
            return OriginBehaviour.FINITE;
        }
        double order = Math.log(w1 / w0) / Math.log(r1 / r0);
        if (Math.abs(order) < 1e-6) {
            return new OriginBehaviour(w0 * kinetic, 0, 0, true);
        }
        double power = order - 2;
        return new OriginBehaviour(0, power, w0 * kinetic / Math.pow(r0, order), true);
    }

    /**
     * V at r → ∞, +∞ if it rises for ever.
     *
     * @throws InvalidModelException if V falls for ever
     */
    double threshold() {
        TailBehaviour tail = potential.tail();
        if (tail.known() ? tail.falls() : observedGrowth() < 0) {
            throw new InvalidModelException(
                    "nothing is bound: the potential falls without end towards large r",
                    where,
                    "add a term that rises, or an outer wall");
        }
        if (tail.known() ? tail.rises() : observedGrowth() > 0) {
            return Double.POSITIVE_INFINITY;
        }
        return tail.known() ? tail.limit() : observedLimit();
    }

    /** Sign of V's growth over the two outermost octaves sampled: 0 if it tends to a number. */
    private int observedGrowth() {
        double[] seen = outermost();
        double last = seen[0] - seen[1];
        double before = seen[1] - seen[2];
        if (Math.abs(last) <= 1e-12 * Math.abs(seen[0]) || Math.abs(last) < 0.9 * Math.abs(before)) {
            return 0;
        }
        return last > 0 ? 1 : -1;
    }

    /** Aitken's limit of V(R/4), V(R/2), V(R), exact for a power. */
    private double observedLimit() {
        double[] seen = outermost();
        double last = seen[0] - seen[1];
        double before = seen[1] - seen[2];
        double limit = before == last ? seen[0] : seen[0] + last * last / (before - last);
        double change = Math.abs(limit - seen[0]);
        boolean reached = change < 1e-9 * Math.abs(seen[0]);
        return reached || !Double.isFinite(limit) ? seen[0] : limit;
    }

    private double[] outermost() {
        double r = scan.outermost();
        return new double[] {scan.sample(-1), potential.value(0.5 * r), potential.value(0.25 * r)};
    }

    /**
     * Whether levels crowd without end below the threshold: a tail that attracts at least as c/r² with c above the
     * critical strength.
     */
    boolean endlessTail() {
        TailBehaviour tail = potential.tail();
        if (tail.known()) {
            if (tail.coefficient() >= 0 || tail.power() < -2) {
                return false;
            }
            return tail.power() > -2 || centrifugal + tail.coefficient() / kinetic < -0.25;
        }
        double r = scan.outermost();
        return r * r * (scan.sample(-1) - threshold()) / kinetic + centrifugal < -0.25 - 1e-9;
    }
}
