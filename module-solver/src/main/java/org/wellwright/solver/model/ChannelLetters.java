package org.wellwright.solver.model;

/** The letters of l: s, p, d, f, then the alphabet without j and without the letters used before. */
final class ChannelLetters {
    private static final String LETTERS = "spdfghiklmnoqrtuvwxyz";

    private ChannelLetters() {}

    /** The lower-case letter of l, or "(l=21)" beyond the alphabet. */
    static String letter(int orbital) {
        return orbital < LETTERS.length() ? LETTERS.substring(orbital, orbital + 1) : "(l=" + orbital + ")";
    }

    /** The l of a letter in either case; −1 if it is none. */
    static int orbital(char letter) {
        return LETTERS.indexOf(Character.toLowerCase(letter));
    }
}
