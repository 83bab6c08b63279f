/**
 * The headless command: one class per subcommand, made only when it was chosen, since most of a short run is its start.
 *
 * <p>Results go to standard output, or to a file that is written only when all is well; faults go to standard error,
 * one line each. Read {@link org.wellwright.project.command.Main} and {@link org.wellwright.project.command.Command}
 * first.
 */
package org.wellwright.project.command;
