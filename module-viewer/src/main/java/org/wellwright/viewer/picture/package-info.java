/**
 * The window of a figure: a canvas that paints pictures off the event thread, zooms, moves and is pointed at; and what
 * computes the picture when the project, the selection or the variant changes.
 *
 * <p>Knows {@code plot}, the project's session and the window system.
 * {@link org.wellwright.viewer.picture.FigureController} and {@link org.wellwright.viewer.picture.FigureViewModel} know
 * no Swing. Read {@link org.wellwright.viewer.picture.FigureWindow} first.
 */
package org.wellwright.viewer.picture;
