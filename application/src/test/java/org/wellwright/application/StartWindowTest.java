package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Starts the packaged application on a display of its own. Every window test's class name ends in {@code WindowTest}:
 * the build server counts them.
 */
class StartWindowTest {
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

    @Test
    void startsInTheLightLookWithOurTitleAndWindowsAndNothingLeftOver() throws Exception {
        WindowSession session = session(PackagedApplication.built(), "light");
        session.play(
                "wait-title Wellwright",
                "wait-title Models",
                "wait-title \"Level diagram\"",
                "size 1280 800",
                "screenshot start.png",
                "title title.txt",
                "configuration Menu menu.txt",
                "configuration Toolbars toolbars.txt",
                "configuration OptionsDialog options.txt",
                "menus menus.txt");
        assertThat(session.lines("title.txt")).containsExactly("Wellwright");
        BufferedImage picture = session.picture("start.png");
        assertThat(picture.getWidth()).isEqualTo(1280);
        assertThat(meanBrightness(picture)).isGreaterThan(180);
        assertThat(colours(picture)).as("text and icons were painted").hasSizeGreaterThan(30);
        assertOnlyKnown(session.lines("menu.txt"), "known-menu.txt");
        assertOnlyKnown(session.lines("toolbars.txt"), "known-toolbars.txt");
        assertOnlyKnown(session.lines("options.txt"), "known-options.txt");
        List<String> menus = session.lines("menus.txt");
        assertThat(menus).contains("Window > Models", "Window > Level diagram", "Help > About", "Tools > Options");
        assertThat(menus).noneMatch(entry -> entry.matches("(?i).*(netbeans|\\bIDE\\b|document group|output|web).*"));
    }

    @Test
    void theLookChosenInTheOptionsIsThatOfTheNextStart() throws Exception {
        WindowSession session = session(PackagedApplication.built(), "look");
        session.play(
                "action Window/org-netbeans-modules-options-OptionsWindowAction",
                "wait-text look.dark Dark",
                "screenshot options.png",
                "click look.dark",
                "press OK");
        session.play("wait-title \"Level diagram\"", "size 1280 800", "screenshot dark.png");
        assertThat(meanBrightness(session.picture("options.png"))).isGreaterThan(180);
        assertThat(meanBrightness(session.picture("dark.png"))).isLessThan(90);
    }

    @Test
    void theAboutBoxNamesTheProgramAndItsLicence() throws Exception {
        WindowSession session = session(PackagedApplication.built(), "about");
        session.play(
                "action Help/org-netbeans-core-actions-AboutAction",
                "sleep 2000",
                "screenshot about.png",
                "components components.txt",
                "press Close");
        session.picture("about.png");
        String shown = String.join("\n", session.lines("components.txt"));
        assertThat(shown).contains("Wellwright 0.1", "Apache License, Version 2.0", "JFreeChart");
    }

    @Test
    void startsWithoutTheViewer() throws Exception {
        PackagedApplication copy = PackagedApplication.built().copyTo(folder.resolve("application"));
        Files.delete(copy.folder().resolve("wellwright/modules/org-wellwright-viewer.jar"));
        WindowSession session = session(copy, "no-viewer");
        session.play("wait-title Models", "menus menus.txt");
        assertThat(session.lines("menus.txt")).contains("Window > Models").doesNotContain("Window > Level diagram");
    }

    @Test
    void startsWithoutTheEditor() throws Exception {
        PackagedApplication copy = PackagedApplication.built().copyTo(folder.resolve("application"));
        Files.delete(copy.folder().resolve("wellwright/modules/org-wellwright-editor.jar"));
        WindowSession session = session(copy, "no-editor");
        session.play("wait-title \"Level diagram\"", "menus menus.txt");
        assertThat(session.lines("menus.txt"))
                .contains("Window > Level diagram")
                .doesNotContain("Window > Models");
    }

    @Test
    void aModuleFromOutsideAddsItsPotentialFamily() throws Exception {
        WindowSession session =
                session(PackagedApplication.built(), "plug-in", Path.of(WindowSession.cluster("example-family")));
        session.play("wait-title Models", "services org.wellwright.solver.potential.PotentialFamily families.txt");
        assertThat(session.lines("families.txt"))
                .contains("org.wellwright.example.GaussianFamily")
                .hasSizeGreaterThan(1);
    }

    private WindowSession session(PackagedApplication application, String name, Path... moreClusters)
            throws IOException {
        return new WindowSession(application, display, Files.createDirectory(folder.resolve(name)), moreClusters);
    }

    /** Entries of our own modules are always right; those of the platform must stand in the list. */
    private static void assertOnlyKnown(List<String> entries, String resource) throws IOException {
        Set<String> known;
        try (var stream = StartWindowTest.class.getResourceAsStream(resource)) {
            known = new String(stream.readAllBytes(), java.nio.charset.StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .collect(Collectors.toSet());
        }
        assertThat(entries).isNotEmpty();
        assertThat(entries.stream().filter(entry -> !entry.contains("org-wellwright-") && !known.contains(entry)))
                .as("entries that nobody chose; add what the application really has to %s, hide the rest", resource)
                .isEmpty();
    }

    private static double meanBrightness(BufferedImage picture) {
        return pixels(picture)
                .mapToDouble(rgb -> {
                    Color colour = new Color(rgb);
                    return (colour.getRed() + colour.getGreen() + colour.getBlue()) / 3.0;
                })
                .average()
                .orElseThrow();
    }

    private static Set<Integer> colours(BufferedImage picture) {
        return pixels(picture).boxed().collect(Collectors.toSet());
    }

    private static IntStream pixels(BufferedImage picture) {
        return IntStream.range(0, picture.getHeight())
                .flatMap(y -> IntStream.range(0, picture.getWidth()).map(x -> picture.getRGB(x, y)));
    }
}
