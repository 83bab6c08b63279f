package org.wellwright.project.window;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.WeakHashMap;
import org.openide.util.Lookup;
import org.openide.util.lookup.ServiceProvider;
import org.openide.util.lookup.ServiceProviders;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.ViewStateProvider;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;

/**
 * Keeps the selected model and levels of each project: while another one is selected, and in its file. Event thread
 * only.
 */
@ServiceProviders({@ServiceProvider(service = ViewStateProvider.class), @ServiceProvider(service = SelectionKept.class)
})
public final class SelectionKept implements ViewStateProvider {
    private final Map<ProjectSession, FigureSelection> kept = new WeakHashMap<>();
    private ProjectSession last;

    @Override
    public String id() {
        return "org.wellwright.project.selection";
    }

    /** Notes the present selection; brings back that of a project that is selected again. */
    void follow(OpenProjects open) {
        ProjectSession selected = open.selected().orElse(null);
        FigureSelection now = present(open);
        if (selected != null && selected != last && FigureSelection.NONE.equals(now) && kept.containsKey(selected)) {
            last = selected;
            open.select(kept.get(selected));
            return;
        }
        last = selected;
        if (selected != null) {
            kept.put(selected, now);
        }
    }

    private static FigureSelection present(OpenProjects open) {
        for (FigureSelection selection : open.getLookup().lookupAll(FigureSelection.class)) {
            return selection;
        }
        return FigureSelection.NONE;
    }

    @Override
    public Map<String, String> state(ProjectSession session) {
        FigureSelection selection = kept.getOrDefault(session, FigureSelection.NONE);
        return text(selection);
    }

    @Override
    public void restore(ProjectSession session, Map<String, String> state) {
        FigureSelection selection = selection(state);
        kept.put(session, selection);
        OpenProjects open = Lookup.getDefault().lookup(OpenProjects.class);
        if (open.selected().filter(selected -> selected == session).isPresent()) {
            open.select(selection);
        }
    }

    static Map<String, String> text(FigureSelection selection) {
        Map<String, String> state = new LinkedHashMap<>();
        if (!selection.model().isEmpty()) {
            state.put("model", selection.model());
        }
        for (int i = 0; i < selection.levels().size(); i++) {
            LevelKey level = selection.levels().get(i);
            ChannelKey channel = level.channel();
            state.put(
                    "level " + (i + 1),
                    "%d %d %d %d %d\n%s\n%s"
                            .formatted(
                                    channel.orbital(),
                                    channel.twiceTotal(),
                                    channel.twiceSpin(),
                                    channel.parity(),
                                    level.index(),
                                    level.system(),
                                    level.curve()));
        }
        if (selection.magnetic() != 0) {
            state.put("m", Integer.toString(selection.magnetic()));
        }
        return state;
    }

    /** What cannot be read is left out: it may be of another version, or edited by hand. */
    static FigureSelection selection(Map<String, String> state) {
        List<LevelKey> levels = new ArrayList<>();
        for (int i = 1; state.containsKey("level " + i); i++) {
            String[] lines = state.get("level " + i).split("\n", -1);
            String[] numbers = lines[0].split(" ");
            try {
                ChannelKey channel = new ChannelKey(
                        Integer.parseInt(numbers[0]),
                        Integer.parseInt(numbers[1]),
                        Integer.parseInt(numbers[2]),
                        Integer.parseInt(numbers[3]));
                levels.add(new LevelKey(lines[1], lines[2], channel, Integer.parseInt(numbers[4])));
            } catch (IllegalArgumentException | ArrayIndexOutOfBoundsException e) {
                continue;
            }
        }
        String m = state.getOrDefault("m", "0");
        return new FigureSelection(
                state.getOrDefault("model", ""), levels, m.matches("-?\\d{1,3}") ? Integer.parseInt(m) : 0);
    }
}
