/**
 * Edits of a project's document: pure functions from one document to the next, and the texts in which windows show and
 * take its values.
 *
 * <p>Knows the solver's records and {@code project.entry}; no window. Read
 * {@link org.wellwright.editor.edit.ParameterEdits} and {@link org.wellwright.editor.edit.ModelEdits} first.
 */
package org.wellwright.editor.edit;
