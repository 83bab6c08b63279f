package org.wellwright.solver.fit;

import org.wellwright.solver.model.ModelError;

/**
 * σ_mod of a group of data.
 *
 * @param group id of the group; empty for all data that no other part names
 * @param measure absolute or relative
 * @param value σ_mod, absolute in {@code unit}
 * @param unit unit of an absolute one
 * @param fitted whether it was found by maximum likelihood
 */
public record ModelErrorEstimate(String group, ModelError.Measure measure, double value, String unit, boolean fitted) {}
