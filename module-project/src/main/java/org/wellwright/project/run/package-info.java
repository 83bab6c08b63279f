/**
 * The run history: what was computed from a project, when and by what, one checked line a run.
 *
 * <p>Knows {@code file} for JSON. Read {@link org.wellwright.project.run.RunHistory} first.
 */
package org.wellwright.project.run;
