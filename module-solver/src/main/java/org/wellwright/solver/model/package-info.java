/**
 * The data model: parameters, models, curves, level keys, data, and {@code Assembly}, which turns model, system and
 * units into radial problems.
 *
 * <p>The only package where units are converted. Knows {@code units}, {@code pair}, {@code potential}, {@code radial}.
 * Values are immutable; the constructors check what a record can know of itself, {@code ModelCheck} checks what refers
 * to something else. Read {@link org.wellwright.solver.model.ModelDocument} and
 * {@link org.wellwright.solver.model.Datum} first.
 */
package org.wellwright.solver.model;
