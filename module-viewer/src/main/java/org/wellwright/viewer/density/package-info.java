/**
 * The density |R_nl Y_lm|² of one state in a plane.
 *
 * <p>Knows {@code plot}, the solved models, the harmonics and the look. Read
 * {@link org.wellwright.viewer.density.DensityFigure} first.
 */
package org.wellwright.viewer.density;
