/**
 * What the models say of levels that were not measured.
 *
 * <p>Knows {@code picture}, {@code plot} and the solved models. Read
 * {@link org.wellwright.viewer.predictions.PredictionsViewModel} first.
 */
package org.wellwright.viewer.predictions;
