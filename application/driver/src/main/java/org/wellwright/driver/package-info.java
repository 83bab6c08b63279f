/**
 * Drives the window from a script, inside the application's own process: {@code wellwright --ui-script FILE}. For tests
 * only, never shipped.
 *
 * <p>A script has one command a line; the words are separated by blanks, a word with blanks stands in double quotes, a
 * line that starts with # is a remark. Commands are {@link org.wellwright.driver.DriverCommand}s found through the
 * Lookup, so another test module adds its own by registering them. Read {@link org.wellwright.driver.ScriptRunner} and
 * {@link org.wellwright.driver.WindowCommands} first.
 */
package org.wellwright.driver;
