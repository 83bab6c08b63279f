/**
 * Constants of nature with their source, units of energy, length and mass, and the unit systems that projects use.
 *
 * <p>Knows only the JDK. The solver itself is unit-blind; units are converted in {@code model.Assembly} alone.
 */
package org.wellwright.solver.units;
