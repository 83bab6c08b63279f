/**
 * Potentials with their levels.
 *
 * <p>Knows {@code plot}, the solved models and the look. Read {@link org.wellwright.viewer.potential.PotentialFigure}
 * first.
 */
package org.wellwright.viewer.potential;
