/**
 * The models of a project: a tree of models, curves and terms, and a form for the selected one.
 *
 * <p>The view model and the controller know no window. Read {@code ModelsViewModel} and {@code ModelsController} first.
 */
package org.wellwright.editor.models;
