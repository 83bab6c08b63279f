/**
 * Radial functions of selected levels.
 *
 * <p>Knows {@code plot}, the solved models and the look. Read {@link org.wellwright.viewer.radial.RadialFigure} first.
 */
package org.wellwright.viewer.radial;
