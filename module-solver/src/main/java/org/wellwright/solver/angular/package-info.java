/**
 * Angular momentum: coupling coefficients (exact and floating), rotations, spherical harmonics, spin operators.
 *
 * <p>Phases are those of Condon and Shortley (1935). Rotations are D^j_{m'm}(α, β, γ) = e^{−im'α} d^j_{m'm}(β) e^{−imγ}
 * with d^j_{m'm}(β) = ⟨jm'|e^{−iβJ_y}|jm⟩ (z-y-z, active). Quantum numbers that may be half-integer are passed as twice
 * their value ({@code twiceJ} = 2j); orbital ones as they are. The package knows the JDK and Commons Math. Read
 * {@link org.wellwright.solver.angular.Coupling} and {@link org.wellwright.solver.angular.SphericalHarmonics} first.
 */
package org.wellwright.solver.angular;
