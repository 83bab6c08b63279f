/**
 * Pieces that the editor's windows are made of: fields that check what is typed, tables that copy to and paste from a
 * spreadsheet, forms, small icons.
 *
 * <p>Knows Swing, and nothing of projects beyond {@code Problem}. Read {@link org.wellwright.editor.parts.EntryField}
 * and {@link org.wellwright.editor.parts.Grid} first.
 */
package org.wellwright.editor.parts;
