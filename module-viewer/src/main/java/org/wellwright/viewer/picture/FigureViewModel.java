package org.wellwright.viewer.picture;

import org.wellwright.project.FigureRequest;
import org.wellwright.solver.Problem;
import org.wellwright.viewer.plot.Picture;

/**
 * What the window of a figure shows.
 *
 * @param picture the picture, or null
 * @param request what it was made from, or null
 * @param problem why there is no picture; null if there is one
 */
public record FigureViewModel(Picture picture, FigureRequest request, Problem problem) {}
