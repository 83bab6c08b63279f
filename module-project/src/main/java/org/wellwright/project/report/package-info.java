/**
 * Reports and the files of figures.
 *
 * <p>Knows {@code project}, the solver and {@code java.awt} for Graphics2D; no window. Read
 * {@link org.wellwright.project.report.FigureExport} first.
 */
package org.wellwright.project.report;
