/**
 * The level diagram.
 *
 * <p>Knows the window system and the look. Read {@link org.wellwright.viewer.levels.LevelsTopComponent} first.
 */
package org.wellwright.viewer.levels;
