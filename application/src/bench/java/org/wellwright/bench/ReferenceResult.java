package org.wellwright.bench;

/**
 * What a reference method reached on one problem.
 *
 * @param millis time for all levels, grid and potential included
 * @param error largest |E − reference|/(⟨T⟩ + ⟨|V|⟩) over the levels
 * @param setting the grid or tolerance that did best
 */
record ReferenceResult(double millis, double error, String setting) {}
