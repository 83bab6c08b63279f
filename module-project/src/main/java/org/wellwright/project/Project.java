package org.wellwright.project;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Collections;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import org.wellwright.solver.model.ModelDocument;

/**
 * A whole project at one moment. Immutable; a change makes the next one.
 *
 * @param title name on screen and at the top of reports; may be empty
 * @param document everything that determines levels, comparison and fit
 * @param notes free text for reports; may be empty
 * @param views state of windows by the id of its {@link ViewStateProvider}: cameras, axes, selections; in no digest
 * @param trace what the file said beyond the model
 */
public record Project(
        String title, ModelDocument document, String notes, Map<String, Map<String, String>> views, FileTrace trace) {
    /** Copies the views. */
    public Project {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(document, "document");
        Objects.requireNonNull(notes, "notes");
        Objects.requireNonNull(trace, "trace");
        Map<String, Map<String, String>> copy = new LinkedHashMap<>();
        views.forEach((id, state) -> copy.put(id, Collections.unmodifiableMap(new LinkedHashMap<>(state))));
        views = Collections.unmodifiableMap(copy);
    }

    /** A project without notes and views. */
    public static Project of(String title, ModelDocument document) {
        return new Project(title, document, "", Map.of(), FileTrace.NONE);
    }

    /** The same with another document. */
    public Project withDocument(ModelDocument newDocument) {
        return new Project(title, newDocument, notes, views, trace);
    }

    /** The same with another title. */
    public Project withTitle(String newTitle) {
        return new Project(newTitle, document, notes, views, trace);
    }

    /** The same with other notes. */
    public Project withNotes(String newNotes) {
        return new Project(title, document, newNotes, views, trace);
    }

    /** The same with other view states. */
    public Project withViews(Map<String, Map<String, String>> newViews) {
        return new Project(title, document, notes, newViews, trace);
    }

    /** The same with another trace. */
    public Project withTrace(FileTrace newTrace) {
        return new Project(title, document, notes, views, newTrace);
    }

    /**
     * SHA-256 of the document: 64 hexadecimal digits, equal for all projects that give the same levels, comparison and
     * fit.
     */
    public String digest() {
        // The document is records, lists and ordered maps all the way down, so its text is complete and the same
        // everywhere.
        return sha256(document.toString());
    }

    /** Whether two projects hold the same but for their views. */
    public boolean sameContent(Project other) {
        return title.equals(other.title)
                && notes.equals(other.notes)
                && document.equals(other.document)
                && trace.equals(other.trace);
    }

    private static String sha256(String text) {
        try {
            byte[] hash = MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(hash);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
