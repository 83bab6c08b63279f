/**
 * The language of formulas: text → graph of operations → evaluator.
 *
 * <p>A formula becomes a graph whose nodes are in the order of evaluation, equal subexpressions shared; every pass over
 * it is one loop. Knows {@code potential} only. Read {@link org.wellwright.solver.potential.formula.Graph} and
 * {@link org.wellwright.solver.potential.formula.BoundFormula} first.
 */
package org.wellwright.solver.potential.formula;
