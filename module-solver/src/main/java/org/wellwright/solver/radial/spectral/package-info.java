/**
 * The primary method: hp spectral elements with static condensation, levels isolated by counting and refined by
 * Rayleigh quotients, each with a two-sided bound.
 *
 * <p>Knows {@code radial}, {@code potential} and {@code numerics}. Read
 * {@link org.wellwright.solver.radial.spectral.SpectralElementSolver} first, then {@code Layout} (where the elements
 * come from) and {@code LevelFinder}.
 */
package org.wellwright.solver.radial.spectral;
