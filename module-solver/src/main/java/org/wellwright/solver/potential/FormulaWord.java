package org.wellwright.solver.potential;

/**
 * A word that a formula may use.
 *
 * @param text as it is typed, with "(" for a function
 * @param meaning one line
 */
public record FormulaWord(String text, String meaning) {}
