/**
 * Kernels of the solver: quadrature rules, element bases, condensed pencils, small eigenproblems, bounds of
 * eigenvalues.
 *
 * <p>Knows only the JDK and Commons Math; nothing of potentials or levels. Arrays are handed over without copies and
 * are not changed after construction unless the method says so. Read
 * {@link org.wellwright.solver.numerics.ElementBasis} and {@link org.wellwright.solver.numerics.ScalarChain} first.
 */
package org.wellwright.solver.numerics;
