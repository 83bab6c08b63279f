/**
 * Models beside the data: residuals in σ.
 *
 * <p>Knows {@code plot}, the comparison of the fit package and the look. Read
 * {@link org.wellwright.viewer.comparison.ComparisonFigure} first.
 */
package org.wellwright.viewer.comparison;
