/**
 * What a central potential is made of: terms as the user writes them, and the evaluators that compute them.
 *
 * <p>Evaluators work in the problem's own energy and length unit and know nothing of units. The subpackages
 * {@code family}, {@code formula} and {@code table} know this package, never the reverse. Read
 * {@link org.wellwright.solver.potential.TermEvaluator} and {@link org.wellwright.solver.potential.PotentialFamily}
 * first.
 */
package org.wellwright.solver.potential;
