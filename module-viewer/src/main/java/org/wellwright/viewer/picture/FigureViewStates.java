package org.wellwright.viewer.picture;

import java.util.LinkedHashMap;
import java.util.Map;
import org.openide.util.lookup.ServiceProvider;
import org.openide.windows.TopComponent;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.ViewStateProvider;

/** Keeps variants and axes of the figures' windows with the project. */
@ServiceProvider(service = ViewStateProvider.class)
public final class FigureViewStates implements ViewStateProvider {
    /** For the Lookup. */
    public FigureViewStates() {}

    @Override
    public String id() {
        return "org.wellwright.viewer";
    }

    @Override
    public Map<String, String> state(ProjectSession session) {
        Map<String, String> all = new LinkedHashMap<>();
        for (TopComponent window : TopComponent.getRegistry().getOpened()) {
            if (window instanceof FigureWindow shown) {
                shown.state().forEach((key, value) -> all.put(shown.stateId() + "." + key, value));
            }
        }
        return all;
    }

    @Override
    public void restore(ProjectSession session, Map<String, String> state) {
        for (TopComponent window : TopComponent.getRegistry().getOpened()) {
            if (window instanceof FigureWindow shown) {
                Map<String, String> own = new LinkedHashMap<>();
                String start = shown.stateId() + ".";
                state.forEach((key, value) -> {
                    if (key.startsWith(start)) {
                        own.put(key.substring(start.length()), value);
                    }
                });
                shown.restore(own);
            }
        }
    }
}
