/**
 * What every window of a project shares: it follows the selected project, undoes in it, and says so when there is none.
 *
 * <p>Read {@link org.wellwright.project.window.session.SessionWindow} first.
 */
package org.wellwright.project.window.session;
