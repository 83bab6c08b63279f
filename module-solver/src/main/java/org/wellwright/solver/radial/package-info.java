/**
 * The radial Schrödinger equation: problem, search, levels with bounds, states.
 *
 * <p>Solved is −κ u″ + [V(r) + κ λ/r²] u = E u with κ = ħ²/2μ in (energy unit)·(length unit)², λ = l(l+1) as a rule,
 * u(0) = 0 and ∫ Σ_c u_c² dr = 1; u > 0 near the inner end (in a coupled problem: of the first channel that is not zero
 * there). The package is unit-blind. It knows {@code potential} and {@code numerics}. Read
 * {@link org.wellwright.solver.radial.RadialProblem} and {@link org.wellwright.solver.radial.Spectrum} first.
 */
package org.wellwright.solver.radial;
