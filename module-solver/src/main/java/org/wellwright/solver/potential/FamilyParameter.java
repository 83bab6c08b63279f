package org.wellwright.solver.potential;

import org.wellwright.solver.units.Dimension;

/**
 * One parameter of a family.
 *
 * @param name short name used in projects and on screen ("depth", "radius")
 * @param symbol symbol in the family's formula ("V0", "R")
 * @param dimension its dimension
 * @param suggested a value to start with, in atomic units
 * @param meaning one line for the user, with the convention where there is a choice
 */
public record FamilyParameter(String name, String symbol, Dimension dimension, double suggested, String meaning) {}
