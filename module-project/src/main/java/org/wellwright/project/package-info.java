/**
 * The project as the rest of the application knows it: the snapshot, the session with its undo history, the projects
 * that are open, and what figures, reports and windows may know of them.
 *
 * <p>Knows the solver and the Lookup; no files, no windows. Read {@link org.wellwright.project.Project},
 * {@link org.wellwright.project.ProjectSession} and {@link org.wellwright.project.OpenProjects} first.
 */
package org.wellwright.project;
