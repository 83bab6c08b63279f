/**
 * The measured data of a project: a table to type and paste into, import with a preview, data groups.
 *
 * <p>The view models and controllers know no window. Read {@code DataViewModel} and {@code DataController} first.
 */
package org.wellwright.editor.data;
