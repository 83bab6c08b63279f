/**
 * A potential family added from outside, as a third party would: one class, registered with the Lookup, in a module of
 * its own.
 *
 * <p>Knows the exported packages of the solver. Read {@link org.wellwright.example.GaussianFamily}.
 */
package org.wellwright.example;
