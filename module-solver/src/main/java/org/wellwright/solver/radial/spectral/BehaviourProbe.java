package org.wellwright.solver.radial.spectral;

import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;

/**
 * Looks numerically how a potential starts and ends when its own text does not say: exponents from values at radii in
 * geometric progression.
 */
final class BehaviourProbe {
    /** V of a channel at a radius. */
    interface Values {
        double at(int channel, double r);
    }

    private final Values values;
    private final double kinetic;
    private final int channel;

    BehaviourProbe(Values values, double kinetic, int channel) {
        this.values = values;
        this.kinetic = kinetic;
        this.channel = channel;
    }

    private double value(double r) {
        return values.at(channel, r);
    }

    /** Strength r²V/κ at the smallest radii where V can be computed decides. */
    OriginBehaviour origin() {
        double last = Double.NaN;
        double radius = 0;
        double smallest = 0x1p-100;
        // The smallest radius from which V is finite upwards.
        for (double r = 0x1p-20; r > smallest; r *= 0.25) {
            double v = value(r);
            if (v == Double.POSITIVE_INFINITY || v > 1e250) {
                return OriginBehaviour.power(-4, 1);
            }
            if (!(Math.abs(v) < Double.POSITIVE_INFINITY)) {
                break;
            }
            last = v;
            radius = r;
        }
        if (radius == 0) {
            return OriginBehaviour.FINITE;
        }
        double near = radius * radius * last / kinetic;
        double twice = 4 * radius * radius * value(2 * radius) / kinetic;
        if (Math.abs(near) < 1e-9) {
            return OriginBehaviour.FINITE;
        }
        if (Math.abs(near - twice) < 1e-6 * Math.abs(near)) {
            return new OriginBehaviour(near * kinetic, 0, 0, true);
        }
        double slope = Math.log(Math.abs(near / twice)) / Math.log(2);
        if (slope > 1e-3) {
            return new OriginBehaviour(0, -2 - slope, Math.signum(near), true);
        }
        return OriginBehaviour.FINITE;
    }

    /** The limit and the exponent of approach from values up to 2^100. */
    TailBehaviour tail() {
        double r = 1;
        double previous = value(r);
        double before = previous;
        int step = 0;
        double last = previous;
        double lastRadius = r;
        for (double next = 2; next < 0x1p100; next *= 2, step++) {
            double v = value(next);
            if (v == Double.POSITIVE_INFINITY) {
                return new TailBehaviour(0, Double.POSITIVE_INFINITY, 1, true);
            }
            if (!(Math.abs(v) < Double.POSITIVE_INFINITY)) {
                break;
            }
            before = previous;
            previous = last;
            last = v;
            lastRadius = next;
        }
        if (Double.isNaN(last)) {
            return TailBehaviour.UNKNOWN;
        }
        double change = last - previous;
        double changeBefore = previous - before;
        if (change == 0 || Math.abs(change) < 1e-14 * Math.abs(last)) {
            return tailToward(last, lastRadius);
        }
        double ratio = change / changeBefore;
        double power = ratio > 0 ? Math.log(ratio) / Math.log(2) : Double.NEGATIVE_INFINITY;
        if (Math.abs(power) < 1e-3) {
            power = 0;
        }
        if (power >= 0) {
            return new TailBehaviour(0, power, Math.signum(change), true);
        }
        if (power < -20) {
            return TailBehaviour.constant(Math.abs(last) < 1e-60 ? 0 : last);
        }
        // V = limit + c r^p: the change over one octave is c r^p (1 − 2^−p).
        double coefficient = change / (Math.pow(lastRadius, power) * (1 - Math.pow(2, -power)));
        return new TailBehaviour(last - coefficient * Math.pow(lastRadius, power), power, coefficient, true);
    }

    /** The limit is reached; the approach is measured where the difference can still be seen. */
    private TailBehaviour tailToward(double limit, double lastRadius) {
        double far = 0;
        for (double r = lastRadius; r > 0x1p-60; r *= 0.5) {
            double difference = value(r) - limit;
            if (Math.abs(difference) > 1e-9 * Math.max(Math.abs(limit), Double.MIN_NORMAL)
                    && Math.abs(difference) > 1e-290) {
                far = r;
                break;
            }
        }
        if (far == 0) {
            return TailBehaviour.constant(limit);
        }
        double here = value(far) - limit;
        double there = value(far / 2) - limit;
        double half = value(far / 4) - limit;
        double power = Math.log(here / there) / Math.log(2);
        double powerBefore = Math.log(there / half) / Math.log(2);
        if (Double.isNaN(power) || Double.isNaN(powerBefore) || Math.abs(power - powerBefore) > 0.05) {
            return TailBehaviour.constant(limit);
        }
        double rounded = Math.rint(power * 2) / 2;
        power = Math.abs(rounded - power) < 0.02 ? rounded : power;
        return new TailBehaviour(limit, power, here / Math.pow(far, power), true);
    }
}
