/**
 * What is computed from levels and states: line positions, wavelengths, radii.
 *
 * <p>Read {@link org.wellwright.solver.observable.StandardAir} first.
 */
package org.wellwright.solver.observable;
