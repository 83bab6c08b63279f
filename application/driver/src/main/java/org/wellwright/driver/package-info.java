/** Drives the window from a script, inside the application's own process. Tests only, never shipped. */
package org.wellwright.driver;
