/**
 * The second method, independent of the first down to its own scan of V: piecewise constant-reference perturbation with
 * shooting (one channel) and log-derivative propagation (coupled channels). It confirms counts and energies; it makes
 * no states.
 *
 * <p>Knows {@code potential} and {@code radial} only; it shares no code with the first method. Read
 * {@link org.wellwright.solver.radial.steps.PerturbedStepSolver} and
 * {@link org.wellwright.solver.radial.steps.StepMesh} first.
 */
package org.wellwright.solver.radial.steps;
