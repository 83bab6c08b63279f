/**
 * The pair systems of a project: which two bodies, with which masses, charges and spins.
 *
 * <p>The view model and the controller know no window. Read {@code SystemsViewModel} and {@code SystemsController}
 * first.
 */
package org.wellwright.editor.systems;
