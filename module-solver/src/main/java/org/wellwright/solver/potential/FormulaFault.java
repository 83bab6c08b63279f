package org.wellwright.solver.potential;

import org.wellwright.solver.Problem;

/**
 * The first fault of a formula.
 *
 * @param start index of the first faulty character, from 0; the length of the text if something is missing at its end
 * @param end index after the last faulty character, at least {@code start}
 * @param problem what is wrong, in which column (counted from 1), and how to mend it
 */
public record FormulaFault(int start, int end, Problem problem) {}
