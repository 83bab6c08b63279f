/**
 * What a project says of itself: title, units, how levels are named, notes.
 *
 * <p>The controller knows no window. Read {@code NotesController} first.
 */
package org.wellwright.editor.notes;
