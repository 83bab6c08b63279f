package org.wellwright.project.command;

import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;

/** The arguments of the command cannot be used. Exit status 2. */
final class UsageException extends WellwrightException {
    private static final long serialVersionUID = 1L;

    UsageException(String what, String remedy) {
        super(new Problem(what, "", remedy));
    }
}
