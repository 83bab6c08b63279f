package org.wellwright.driver;

/** A step that could not be done, or whose expectation does not hold; ends the script. */
public final class ScriptFailure extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** With a sentence that names the step's object and what was found in its place. */
    public ScriptFailure(String message) {
        super(message);
    }

    /** As above, keeping the cause. */
    public ScriptFailure(String message, Throwable cause) {
        super(message, cause);
    }
}
