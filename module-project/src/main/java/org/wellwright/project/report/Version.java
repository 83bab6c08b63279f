package org.wellwright.project.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import org.wellwright.project.Project;

/** The version of this program. */
public final class Version {
    private Version() {}

    /** Its text ("0.1.0"). */
    public static String text() {
        try (InputStream in = Project.class.getResourceAsStream("version.txt")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8).strip();
        } catch (IOException e) {
            throw new UncheckedIOException("the version is part of the program", e);
        }
    }
}
