package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.solver.model.LevelKey;

/** What the metadata of an exported figure say. */
record FigureFacts(String title, String project, String digest, String model, String state, String creator) {
    static FigureFacts of(FigureProvider figure, FigureRequest request, String version) {
        FigureSelection selection = request.selection();
        List<String> states = new ArrayList<>();
        for (LevelKey key : selection.levels()) {
            states.add(text(key));
        }
        String state = String.join("; ", states);
        if (!states.isEmpty() && figure.id().equals("density")) {
            state += ", m = " + selection.magnetic();
        }
        String model = selection.model();
        if (model.isEmpty() && !request.input().models().isEmpty()) {
            model = request.input().models().get(0).model();
        }
        return new FigureFacts(
                figure.title(),
                request.input().title(),
                request.input().digest(),
                model,
                state,
                "Wellwright " + version);
    }

    /** The facts by name, without those that are empty. */
    Map<String, String> named() {
        Map<String, String> named = new LinkedHashMap<>();
        named.put("Title", title);
        named.put("Project", project);
        named.put("Project-Digest", digest);
        named.put("Model", model);
        named.put("State", state);
        named.put("Software", creator);
        named.values().removeIf(String::isEmpty);
        return named;
    }

    private static String text(LevelKey key) {
        StringBuilder text = new StringBuilder(key.system()).append(", ").append(key.curve());
        if (key.channel().coupled()) {
            text.append(", parity ").append(key.channel().parity());
        } else {
            text.append(", l = ").append(key.channel().orbital());
        }
        if (key.channel().twiceTotal() >= 0) {
            text.append(", 2J = ").append(key.channel().twiceTotal());
        }
        return text.append(", index ").append(key.index()).toString();
    }
}
