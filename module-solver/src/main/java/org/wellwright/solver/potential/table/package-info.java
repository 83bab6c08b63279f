/**
 * Tabulated potentials: piecewise cubics of V or r²V in r or 1/r with continuation at both ends.
 *
 * <p>Knows {@code potential} only. Read {@link org.wellwright.solver.potential.table.TabulatedPotential} and
 * {@link org.wellwright.solver.potential.table.SplineSlopes} first.
 */
package org.wellwright.solver.potential.table;
