/**
 * The window's side of projects: the File menu, the windows of projects and runs, the start page, asking before
 * anything is lost, recovery after a crash, and what is restored at the next start.
 *
 * <p>The only package beside {@code window.session} that knows Swing and the window system. Read
 * {@link org.wellwright.project.window.ProjectDesk} first.
 */
package org.wellwright.project.window;
