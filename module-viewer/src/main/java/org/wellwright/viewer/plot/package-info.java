/**
 * What all figures share: style, text with raised and lowered signs, the frame of title, legend and axes, curves.
 *
 * <p>Knows the look, JFreeChart and {@code java.awt}; no window, no physics. Every picture is a model record that is
 * computed without a display and then painted. Read {@link org.wellwright.viewer.plot.PlotFrame} and
 * {@link org.wellwright.viewer.plot.PlotStyle} first.
 */
package org.wellwright.viewer.plot;
