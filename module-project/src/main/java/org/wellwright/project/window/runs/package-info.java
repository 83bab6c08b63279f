/**
 * The window of the run history of a project, and the writing of accepted fits into it.
 *
 * <p>The view model knows no window. Read {@code RunsViewModel} first.
 */
package org.wellwright.project.window.runs;
