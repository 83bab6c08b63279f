package org.wellwright.solver.model;

import org.wellwright.solver.potential.ChannelFacts;

/**
 * What names a channel of a curve.
 *
 * @param orbital l; −1 in a block of coupled l, which J and parity name
 * @param twiceTotal 2j or 2J; −1 without spin
 * @param twiceSpin 2S; −1 without spin
 * @param parity +1, −1, or 0 where l says it
 */
public record ChannelKey(int orbital, int twiceTotal, int twiceSpin, int parity) {
    /** Checks the labels. */
    public ChannelKey {
        if (orbital < -1 || twiceTotal < -1 || twiceSpin < -1 || parity < -1 || parity > 1) {
            throw new IllegalArgumentException(
                    "a channel needs l, 2j, 2S >= 0 (or -1 for none) and parity -1, 0 or 1, got %d, %d, %d, %d"
                            .formatted(orbital, twiceTotal, twiceSpin, parity));
        }
        if (orbital == -1 && (twiceTotal < 0 || parity == 0)) {
            throw new IllegalArgumentException("a channel without l needs its J and parity");
        }
    }

    /** A spinless channel. */
    public static ChannelKey ofOrbital(int orbital) {
        return new ChannelKey(orbital, -1, -1, 0);
    }

    /** A channel of one spin: l and 2j. */
    public static ChannelKey ofTotal(int orbital, int twiceTotal) {
        return new ChannelKey(orbital, twiceTotal, 1, 0);
    }

    /** A channel of two spins: l, 2S and 2J. */
    public static ChannelKey ofSpins(int orbital, int twiceSpin, int twiceTotal) {
        return new ChannelKey(orbital, twiceTotal, twiceSpin, 0);
    }

    /** Whether it is a block of several l. */
    public boolean coupled() {
        return orbital == -1;
    }

    /** What a term may know of it. */
    public ChannelFacts facts() {
        return new ChannelFacts(orbital, twiceTotal, twiceSpin);
    }

    /** The channel in words: "l = 1, j = 3/2" or "J = 1, parity -". */
    public String describe() {
        if (coupled()) {
            return "J = %s, parity %s".formatted(half(twiceTotal), parity > 0 ? "+" : "-");
        }
        String text = "l = " + orbital;
        if (twiceSpin > 1 || twiceSpin == 0) {
            text += ", S = " + half(twiceSpin) + ", J = " + half(twiceTotal);
        } else if (twiceTotal >= 0) {
            text += ", j = " + half(twiceTotal);
        }
        return text;
    }

    /** A half-integer in writing: 3 is "3/2", 4 is "2". */
    public static String half(int twice) {
        return twice % 2 == 0 ? Integer.toString(twice / 2) : twice + "/2";
    }
}
