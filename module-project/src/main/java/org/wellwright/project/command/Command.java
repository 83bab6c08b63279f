package org.wellwright.project.command;

/** One subcommand. */
interface Command {
    /** What it accepts. */
    Syntax syntax();

    /**
     * Does it.
     *
     * @return exit status: 0 done, 1 the science failed in part
     * @throws org.wellwright.solver.WellwrightException a fault that the user can mend
     */
    int run(Input input, Console console);
}
