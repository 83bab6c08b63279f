package org.wellwright.solver.model;

/** How levels are named on screen and in reports. */
public enum LabelConvention {
    /** n = n_r + l + 1 and the letter of l: 2p. */
    ATOMIC,
    /** n = n_r + 1 and the letter of L: 1P. */
    RADIAL,
    /** v and J. */
    VIBRATIONAL
}
