package org.wellwright.solver.fit;

/**
 * The shared error of a data group, found together with the parameters.
 *
 * @param group id of the group
 * @param value its value in {@code unit}; a pure number for a multiplicative one
 * @param sigma its standard uncertainty
 * @param unit its unit
 */
public record GroupError(String group, double value, double sigma, String unit) {}
