/**
 * The fit of a model to the data: choose, run, watch, inspect, accept or discard.
 *
 * <p>The view model and the controller know no window. Read {@code FitController} and {@code FitViewModel} first.
 */
package org.wellwright.editor.fit;
