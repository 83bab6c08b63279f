/**
 * What a user types, pastes or imports, read into numbers of the data model: quantities with units, measured values
 * with their uncertainties, rows of spreadsheets and files.
 *
 * <p>Knows the solver's records only: no window, no file format. Read {@link org.wellwright.project.entry.MeasuredText}
 * and {@link org.wellwright.project.entry.QuantityText} first.
 */
package org.wellwright.project.entry;
