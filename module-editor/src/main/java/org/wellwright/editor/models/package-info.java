/**
 * The window of models, terms and parameters.
 *
 * <p>Knows the window system and the look. Read {@link org.wellwright.editor.models.ModelsTopComponent} first.
 */
package org.wellwright.editor.models;
