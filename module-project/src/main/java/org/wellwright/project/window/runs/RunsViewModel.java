package org.wellwright.project.window.runs;

import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.wellwright.project.file.Json;
import org.wellwright.project.file.JsonValue;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.project.run.Run;
import org.wellwright.project.run.RunHistory;

/**
 * What the window of runs shows.
 *
 * @param rows the runs, latest first
 * @param message how many lines of the history are damaged; empty if none
 */
record RunsViewModel(List<Row> rows, String message) {
    private static final DateTimeFormatter TIME = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss", Locale.ROOT);

    /**
     * One run.
     *
     * @param time when it ended, local time
     * @param kind what it was
     * @param model the model, if it was about one
     * @param quality χ²/ν, if it has one
     * @param program versions of program and solver
     * @param input the first digits of its input's digest, and whether the project is that now
     * @param command the command that does it again
     * @param result what came out, as JSON
     */
    record Row(
            String time,
            String kind,
            String model,
            String quality,
            String program,
            String input,
            String command,
            String result) {}

    RunsViewModel {
        rows = List.copyOf(rows);
    }

    static RunsViewModel of(RunHistory.Content history, String digest, ZoneId zone) {
        List<Row> rows = new ArrayList<>();
        for (Run run : history.runs()) {
            rows.add(0, row(run, digest, zone));
        }
        int damaged = history.damaged().size();
        String message = damaged == 0
                ? ""
                : "%d line%s of the history %s damaged and left out"
                        .formatted(damaged, damaged == 1 ? "" : "s", damaged == 1 ? "is" : "are");
        return new RunsViewModel(rows, message);
    }

    private static Row row(Run run, String digest, ZoneId zone) {
        String input = run.digest().substring(0, Math.min(8, run.digest().length()));
        return new Row(
                TIME.format(run.time().atZone(zone)),
                run.kind(),
                text(member(run.result(), "model")),
                quality(run.result()),
                run.program() + ", " + run.solver(),
                run.digest().equals(digest) ? input + " (as now)" : input,
                String.join(" ", run.command()),
                Json.compact(run.result()));
    }

    private static String quality(JsonValue result) {
        JsonValue chi = member(result, "chiSquare");
        JsonValue freedom = member(result, "degreesOfFreedom");
        if (!(chi instanceof JsonNumber chiSquare) || !(freedom instanceof JsonNumber degrees)) {
            return "";
        }
        double nu = Double.parseDouble(degrees.text());
        return nu > 0 ? String.format(Locale.ROOT, "%.4g", Double.parseDouble(chiSquare.text()) / nu) : "";
    }

    private static JsonValue member(JsonValue value, String key) {
        return value instanceof JsonObject object ? object.members().get(key) : null;
    }

    private static String text(JsonValue value) {
        return value instanceof JsonText text ? text.value() : "";
    }
}
