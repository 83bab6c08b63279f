/**
 * Two bodies and what binds them apart from the potential: particles, masses, charges, spins.
 *
 * <p>Knows {@code units} only. Read {@link org.wellwright.solver.pair.PairSystem} and
 * {@link org.wellwright.solver.pair.Body} first.
 */
package org.wellwright.solver.pair;
