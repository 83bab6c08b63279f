package org.wellwright.driver;

import java.util.List;

/** A command of the script language, registered with {@code @ServiceProvider(service = DriverCommand.class)}. */
public interface DriverCommand {
    /** The word that starts its line. */
    String name();

    /** What follows the word, for the list of commands: "NAME TEXT". */
    String arguments();

    /**
     * Does it. Called on the script's thread, never on the event thread; see {@link Screen#onEventThread}.
     *
     * @param script tells where files belong
     * @param arguments the words after the name, as many as {@link #arguments} lists
     * @throws ScriptFailure if what was asked for is not there
     */
    void run(Script script, List<String> arguments);
}
