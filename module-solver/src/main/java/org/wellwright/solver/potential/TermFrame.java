package org.wellwright.solver.potential;

import java.util.Objects;

/**
 * What every term has besides its shape: V(r) = scale · shape(r) for from ≤ r ≤ to, 0 elsewhere.
 *
 * @param name name on screen, unique in its curve
 * @param enabled whether it counts; a term that is off is kept and ignored
 * @param scale pure number that multiplies the shape
 * @param from radius where it starts; {@link Argument#ZERO} if it is not restricted
 * @param to radius where it ends; {@link Argument#UNBOUNDED} if it is not restricted
 * @param channels where it acts
 * @param angular operator that multiplies it
 */
public record TermFrame(
        String name,
        boolean enabled,
        Argument scale,
        Argument from,
        Argument to,
        ChannelFilter channels,
        AngularFactor angular) {

    /** Checks that nothing is missing. */
    public TermFrame {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(scale, "scale");
        Objects.requireNonNull(from, "from");
        Objects.requireNonNull(to, "to");
        Objects.requireNonNull(channels, "channels");
        Objects.requireNonNull(angular, "angular");
    }

    /** A term that is on, unscaled, unrestricted, in every channel. */
    public static TermFrame named(String name) {
        return new TermFrame(
                name, true, Argument.ONE, Argument.ZERO, Argument.UNBOUNDED, ChannelFilter.ALL, AngularFactor.UNITY);
    }

    /** The same with another name. */
    public TermFrame withName(String newName) {
        return new TermFrame(newName, enabled, scale, from, to, channels, angular);
    }

    /** The same, on or off. */
    public TermFrame withEnabled(boolean on) {
        return new TermFrame(name, on, scale, from, to, channels, angular);
    }

    /** The same with another scale. */
    public TermFrame withScale(Argument newScale) {
        return new TermFrame(name, enabled, newScale, from, to, channels, angular);
    }

    /** The same with another radial range. */
    public TermFrame withRange(Argument newFrom, Argument newTo) {
        return new TermFrame(name, enabled, scale, newFrom, newTo, channels, angular);
    }

    /** The same in other channels. */
    public TermFrame withChannels(ChannelFilter filter) {
        return new TermFrame(name, enabled, scale, from, to, filter, angular);
    }

    /** The same with another angular operator. */
    public TermFrame withAngular(AngularFactor factor) {
        return new TermFrame(name, enabled, scale, from, to, channels, factor);
    }
}
