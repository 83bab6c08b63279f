package org.wellwright.project;

import java.util.List;
import java.util.Map;

/**
 * What a project file said beyond the data model, so that saving gives it back: members under keys that this version
 * does not know, and the spelling of numbers that the model holds as doubles.
 *
 * <p>Places are paths such as {@code /models/screened/curves/V/terms/core}: the steps are keys, and in lists the item's
 * name or id (its position where it has neither). An item that is renamed or removed takes its entries with it.
 *
 * @param unknown members by the place of the object that holds them
 * @param spellings texts of numbers by their place
 */
public record FileTrace(Map<String, List<UnknownMember>> unknown, Map<String, String> spellings) {
    /** Nothing beyond the model. */
    public static final FileTrace NONE = new FileTrace(Map.of(), Map.of());

    /**
     * A member that this version does not know.
     *
     * @param key its key
     * @param after the known key it followed; empty at the start of the object
     * @param json its value as JSON text
     */
    public record UnknownMember(String key, String after, String json) {}

    /** Copies the maps. */
    public FileTrace {
        unknown = Map.copyOf(unknown);
        spellings = Map.copyOf(spellings);
    }
}
