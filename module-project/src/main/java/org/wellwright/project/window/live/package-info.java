/**
 * Keeps the solutions of open projects up to date while the window is there, and tells in the status line how it goes.
 *
 * <p>Knows the window system. Read {@link org.wellwright.project.window.live.LiveSolves} first.
 */
package org.wellwright.project.window.live;
