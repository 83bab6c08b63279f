/**
 * Lines of a spectrum: where they lie, how strong they are, and what was measured.
 *
 * <p>Knows {@code plot}, the solved models and the look. Read {@link org.wellwright.viewer.spectrum.SpectrumFigure}
 * first.
 */
package org.wellwright.viewer.spectrum;
