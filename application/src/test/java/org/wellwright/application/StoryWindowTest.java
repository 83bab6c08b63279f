package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A day's work in the packaged window, and the same file in the packaged command. */
class StoryWindowTest {
    private static VirtualDisplay display;

    @TempDir
    Path folder;

    @BeforeAll
    static void openDisplay() throws IOException {
        display = VirtualDisplay.open(1400, 900);
    }

    @AfterAll
    static void closeDisplay() {
        if (display != null) {
            display.close();
        }
    }

    /**
     * Opens the example, changes a parameter in its field, undoes, drags another, pastes three rows, fits, accepts,
     * saves and quits. The next start has the same project, windows, selection and values, and the command finds the
     * same χ² in the file.
     */
    @Test
    void aDaysWorkIsThereTheNextDayAndInTheCommand() throws Exception {
        WindowSession session =
                new WindowSession(PackagedApplication.built(), display, Files.createDirectory(folder.resolve("story")));
        Path file = folder.resolve("story/ion.wellwright");
        Files.writeString(
                folder.resolve("story/rows.txt"),
                "levels\tquantity\tvalue\tunit\tsigma\n"
                        + "5p - 3s\tvacuum wavelength\t160.6\tnm\t3\n"
                        + "6p - 3s\tvacuum wavelength\t147\tnm\t4\n"
                        + "5d - 3s\tvacuum wavelength\t147\tnm\t6\n");
        session.play(
                "size 1280 800",
                "wait-text start.example.1 Ol",
                "screenshot start-page.png",
                "click start.example.1",
                "wait-title \"invented ion\"",
                "wait-cell parameters.table 5 2 0.0548",
                "cell parameters.table 5 2 \"0.55 angstrom\"",
                "wait-cell parameters.table 5 2 0.055",
                "refused-cell parameters.table 5 2 \"0.55 eV\"",
                "refused-cell parameters.table 5 2 7",
                "action Edit/org-openide-actions-UndoAction",
                "wait-cell parameters.table 5 2 0.0548",
                "select-row parameters.table 5",
                "slide parameters.slider 1500 30",
                "rows parameters.table dragged.txt",
                "action Edit/org-openide-actions-UndoAction",
                "wait-cell parameters.table 5 2 0.0548",
                "action Window/org-wellwright-editor-data-DataTopComponent",
                "wait-rows data.table 14",
                "paste data.table rows.txt",
                "wait-rows data.table 17",
                "action Window/org-wellwright-editor-fit-FitTopComponent",
                "choose fit.model \"Gaussian core\"",
                "wait-enabled fit.run",
                "click fit.run",
                "wait-enabled fit.accept",
                "screenshot fitted.png",
                "components fitted.txt",
                "click fit.accept",
                "wait-enabled fit.run",
                "action Window/org-wellwright-editor-parameters-ParametersTopComponent",
                "rows parameters.table before.txt",
                "action File/org-wellwright-project-window-SaveProjectAction",
                "choose-file ion.wellwright",
                "wait-file ion.wellwright \"Gaussian core\"",
                "sleep 500",
                "rows projects.list projects-before.txt",
                "rows models.tree models-before.txt",
                "windows windows-before.txt");
        session.play(
                "wait-title \"invented ion\"",
                "wait-rows parameters.table 18",
                "sleep 500",
                "rows parameters.table after.txt",
                "rows projects.list projects-after.txt",
                "rows models.tree models-after.txt",
                "windows windows-after.txt",
                "screenshot next-day.png");
        assertThat(session.lines("dragged.txt").get(5)).doesNotContain("0.0548");
        assertThat(unselected(session.lines("after.txt"))).isEqualTo(unselected(session.lines("before.txt")));
        assertThat(session.lines("projects-after.txt")).isEqualTo(session.lines("projects-before.txt"));
        assertThat(session.lines("models-after.txt")).isEqualTo(session.lines("models-before.txt"));
        assertThat(session.lines("models-after.txt")).contains("selected [5]");
        assertThat(session.lines("windows-after.txt")).isEqualTo(session.lines("windows-before.txt"));
        session.picture("start-page.png");
        session.picture("fitted.png");
        session.picture("next-day.png");
        assertThat(chiSquareOfTheCommand(file)).isEqualTo(chiSquareOfTheWindow(session.lines("fitted.txt")));
    }

    private static List<String> unselected(List<String> rows) {
        return rows.stream().filter(line -> !line.startsWith("selected")).toList();
    }

    /** "χ² = 12.345, ν = 6" in the fit window: five digits. */
    private static String chiSquareOfTheWindow(List<String> components) {
        Matcher matcher = Pattern.compile("χ² = ([0-9.e+-]+), ν").matcher(String.join("\n", components));
        assertThat(matcher.find()).as("χ² in the fit window").isTrue();
        return matcher.group(1);
    }

    private String chiSquareOfTheCommand(Path file) throws IOException, InterruptedException {
        PackagedApplication.Outcome outcome =
                PackagedApplication.built().batch(folder, "compare", file.toString(), "--format", "json");
        assertThat(outcome.status()).as(outcome.errors()).isZero();
        Matcher matcher = Pattern.compile(
                        "\"model\"\\s*:\\s*\"Gaussian core\".*?\"chiSquare\"\\s*:\\s*([0-9.eE+-]+)", Pattern.DOTALL)
                .matcher(outcome.output());
        assertThat(matcher.find()).as(outcome.output()).isTrue();
        return new BigDecimal(matcher.group(1))
                .round(new MathContext(5))
                .stripTrailingZeros()
                .toPlainString();
    }
}
