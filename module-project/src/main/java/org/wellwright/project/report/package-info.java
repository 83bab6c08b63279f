/**
 * Results as people read them: digits that fit their uncertainty, the report page, figures in files.
 *
 * <p>Knows {@code project}, the solver and {@code java.awt} for Graphics2D; no window. Read
 * {@link org.wellwright.project.report.Digits} and {@link org.wellwright.project.report.FigureExport} first.
 */
package org.wellwright.project.report;
