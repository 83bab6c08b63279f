/**
 * The physics of two bodies bound by a central force: what every other package of this module shares when something
 * goes wrong.
 *
 * <p>Knows only the JDK. Read {@link org.wellwright.solver.Problem} and
 * {@link org.wellwright.solver.WellwrightException} first.
 */
package org.wellwright.solver;
