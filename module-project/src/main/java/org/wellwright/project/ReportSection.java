package org.wellwright.project;

import java.util.List;

/**
 * A section of a report. Registered with {@code @ServiceProvider(service = ReportSection.class)} and found through the
 * Lookup, so that a module adds one by being there. Implementations hold no state.
 */
public interface ReportSection {
    /** Identifier, unique; lower case with hyphens. */
    String id();

    /** Heading. */
    String title();

    /** Place in the report; lower comes first. The program's own are 100, 200, … */
    int position();

    /** HTML of the section without its heading; empty to leave it out. Text from the project must be escaped. */
    String html(ReportInput input);

    /** Tables to write beside the report. */
    default List<ReportTable> tables(ReportInput input) {
        return List.of();
    }
}
