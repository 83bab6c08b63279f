package org.wellwright.project.run;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.Instant;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.project.file.Json;
import org.wellwright.project.file.JsonValue;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.project.file.ProjectFileException;
import org.wellwright.project.file.SafeFile;
import org.wellwright.solver.Problem;

/**
 * NAME.runs.jsonl beside a project: one object a line, {@code {"run": …, "sha256": …}}, where the checksum is that of
 * the text of {@code run}. Lines are only ever added, so a torn or damaged line costs itself alone.
 */
public final class RunHistory {
    private final Path file;

    private RunHistory(Path file) {
        this.file = file;
    }

    /** The history beside a project file. */
    public static RunHistory of(Path project) {
        String name = project.getFileName().toString();
        String stem = name.endsWith(ProjectFile.ENDING)
                ? name.substring(0, name.length() - ProjectFile.ENDING.length())
                : name;
        return new RunHistory(project.resolveSibling(stem + ".runs.jsonl"));
    }

    /** Where it is. */
    public Path file() {
        return file;
    }

    /**
     * What a history holds.
     *
     * @param runs the runs whose checksum holds, oldest first
     * @param damaged numbers (from 1) of the lines that are torn or changed
     */
    public record Content(List<Run> runs, List<Integer> damaged) {
        /** Copies the lists. */
        public Content {
            runs = List.copyOf(runs);
            damaged = List.copyOf(damaged);
        }
    }

    /**
     * All runs; none if there is no file.
     *
     * @throws ProjectFileException if the file cannot be read
     */
    public Content read() {
        if (!Files.exists(file)) {
            return new Content(List.of(), List.of());
        }
        String[] lines = new String(SafeFile.read(file), StandardCharsets.UTF_8).split("\n", -1);
        List<Run> runs = new ArrayList<>();
        List<Integer> damaged = new ArrayList<>();
        for (int i = 0; i < lines.length; i++) {
            if (lines[i].isBlank()) {
                continue;
            }
            Run run = checked(lines[i]);
            if (run == null) {
                damaged.add(i + 1);
            } else {
                runs.add(run);
            }
        }
        return new Content(runs, damaged);
    }

    /**
     * Adds a run and forces it to disk.
     *
     * @throws ProjectFileException if the file cannot be written
     */
    public void add(Run run) {
        String text = Json.compact(json(run));
        String line = "{\"run\": " + text + ", \"sha256\": \"" + sha256(text) + "\"}\n";
        try (FileChannel channel = FileChannel.open(
                        file, StandardOpenOption.CREATE, StandardOpenOption.READ, StandardOpenOption.WRITE);
                FileLock lock = channel.lock()) {
            long end = channel.size();
            ByteBuffer last = ByteBuffer.allocate(1);
            boolean torn = lock.isValid() && end > 0 && channel.read(last, end - 1) == 1 && last.get(0) != '\n';
            channel.position(end);
            ByteBuffer bytes = ByteBuffer.wrap(((torn ? "\n" : "") + line).getBytes(StandardCharsets.UTF_8));
            while (bytes.hasRemaining()) {
                channel.write(bytes);
            }
            channel.force(true);
        } catch (IOException e) {
            throw new ProjectFileException(
                    new Problem(
                            "the run history cannot be written: " + SafeFile.reason(e),
                            file.toString(),
                            "check the folder's permissions"),
                    e);
        }
    }

    private static JsonObject json(Run run) {
        Map<String, JsonValue> members = new LinkedHashMap<>();
        members.put("time", new JsonText(run.time().toString()));
        members.put("kind", new JsonText(run.kind()));
        members.put("digest", new JsonText(run.digest()));
        members.put("program", new JsonText(run.program()));
        members.put("solver", new JsonText(run.solver()));
        members.put(
                "command",
                new JsonArray(
                        run.command().stream().<JsonValue>map(JsonText::new).toList()));
        members.put("result", run.result());
        return new JsonObject(members);
    }

    /** The run of a line, or null if its checksum does not hold. */
    private static Run checked(String line) {
        try {
            if (!(Json.parse(line, "run") instanceof JsonObject object
                    && object.members().get("run") instanceof JsonObject run
                    && object.members().get("sha256") instanceof JsonText sum
                    && sum.value().equals(sha256(Json.compact(run))))) {
                return null;
            }
            List<String> command = new ArrayList<>();
            if (run.members().get("command") instanceof JsonArray words) {
                words.items().forEach(word -> command.add(((JsonText) word).value()));
            }
            return new Run(
                    Instant.parse(text(run, "time")),
                    text(run, "kind"),
                    text(run, "digest"),
                    text(run, "program"),
                    text(run, "solver"),
                    command,
                    run.members().get("result"));
        } catch (ProjectFileException | ClassCastException | DateTimeParseException | NullPointerException e) {
            // Whatever is wrong with it, the line is damaged.
            return null;
        }
    }

    private static String text(JsonObject object, String key) {
        return ((JsonText) object.members().get(key)).value();
    }

    private static String sha256(String text) {
        try {
            return HexFormat.of()
                    .formatHex(MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8)));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
