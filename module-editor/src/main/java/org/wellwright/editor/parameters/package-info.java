/**
 * The parameters of a project: a table of all numbers of the pool, and a slider on the selected one.
 *
 * <p>The view model and the controller know no window. Read
 * {@link org.wellwright.editor.parameters.ParametersViewModel} and {@code ParametersController} first.
 */
package org.wellwright.editor.parameters;
