package org.wellwright.bench;

/** The program that does nothing: what the start of Java itself costs. */
public final class Nothing {
    private Nothing() {}

    /** Does nothing. */
    public static void main(String[] arguments) {
        // Nothing.
    }
}
