package org.wellwright.editor.parts;

import java.util.Optional;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;

/** Takes up what was typed into a field or cell. */
@FunctionalInterface
public interface Entry {
    /**
     * Takes up a text.
     *
     * @return why it cannot be used, if so; nothing is changed then
     */
    Optional<Problem> take(String text);

    /** What may fail when a text is taken up. */
    @FunctionalInterface
    interface Attempt {
        /**
         * Takes up a text.
         *
         * @throws WellwrightException if it cannot be used
         * @throws IllegalArgumentException if a record refuses it
         */
        void run();
    }

    /** Does something and turns its failure into a problem. */
    static Optional<Problem> attempt(Attempt attempt) {
        try {
            attempt.run();
            return Optional.empty();
        } catch (WellwrightException e) {
            return Optional.of(e.problem());
        } catch (IllegalArgumentException e) {
            return Optional.of(new Problem(e.getMessage(), "", ""));
        }
    }
}
