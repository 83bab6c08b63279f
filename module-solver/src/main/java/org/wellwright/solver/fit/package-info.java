/**
 * Which model holds, and how firmly: residuals, least squares, covariance, comparison, prediction.
 *
 * <p>Knows {@code model} and {@code radial}; solves through a {@link org.wellwright.solver.fit.SpectrumSource}, so it
 * needs no service. Read {@link org.wellwright.solver.fit.FitResult} and {@link org.wellwright.solver.fit.ResidualRow}
 * first.
 */
package org.wellwright.solver.fit;
