package org.wellwright.project;

import java.util.Map;

/**
 * A window whose state (camera, axes, selection) is kept with a project. Found by Lookup when a project is saved and
 * after it was opened.
 */
public interface ViewStateProvider {
    /** Identifier in project files, unique and stable ("org.wellwright.viewer.levels"). */
    String id();

    /** The present state for a project; empty if there is nothing to keep. Called on the event thread. */
    Map<String, String> state(ProjectSession session);

    /** Takes up a state that was kept; unknown or missing entries are ignored. Called on the event thread. */
    void restore(ProjectSession session, Map<String, String> state);
}
