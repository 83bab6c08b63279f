/**
 * The built-in families of potentials, each found through the Lookup as a
 * {@link org.wellwright.solver.potential.PotentialFamily}.
 *
 * <p>Knows {@code potential} and its {@code formula} subpackage. Read
 * {@link org.wellwright.solver.potential.family.BuiltInFamily} and
 * {@link org.wellwright.solver.potential.family.MorseFamily} first.
 */
package org.wellwright.solver.potential.family;
