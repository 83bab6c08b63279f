package org.wellwright.viewer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import javax.xml.parsers.ParserConfigurationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.openide.util.Lookup;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.PictureText.Text;
import org.xml.sax.SAXException;

/** What holds for every figure: it is found, paints at all sizes, and no text is cut or covered by another. */
class FiguresTest {
    @Test
    void allSixAreFoundThroughTheLookup() {
        assertThat(figures())
                .extracting(FigureProvider::id)
                .containsExactlyInAnyOrder("levels", "comparison", "potential", "radial", "density", "spectrum");
        assertThat(figures()).extracting(FigureProvider::position).doesNotHaveDuplicates();
        assertThat(figures()).allSatisfy(figure -> assertThat(figure.variants()).isNotEmpty());
    }

    @ParameterizedTest
    @CsvSource({
        "640, 420, 6, 2",
        "900, 600, 12, 3",
        "1920, 1080, 6, 3",
        "640, 420, 60, 3",
        "1280, 720, 60, 4",
        "320, 200, 5, 2",
        "480, 900, 5, 2"
    })
    void textIsNeitherCutNorOverlapping(int width, int height, int n, int largest)
            throws IOException, ParserConfigurationException, SAXException {
        FigureInput input = Samples.atom(n, largest);
        for (FigureProvider figure : figures()) {
            for (FigureProvider.Variant variant : figure.variants()) {
                FigureRequest request = Samples.request(input, selection(), variant.id(), false, 12);
                List<Text> texts = PictureText.of(figure, request, width, height);
                assertThat(texts).as(figure.id()).hasSizeGreaterThan(4);
                assertThat(faults(texts, width, height))
                        .as("%s %s %dx%d", figure.id(), variant.id(), width, height)
                        .isEmpty();
            }
        }
    }

    @Test
    void longNamesAreShortenedNotCut() throws IOException, ParserConfigurationException, SAXException {
        FigureInput input = Samples.atom(
                "A project whose title was written by somebody who likes to say everything at once, with the date and the place",
                List.of(
                        "a model with a very long name that nobody shortened (2nd try)",
                        "b",
                        "another long name of a model, also long",
                        "d",
                        "e",
                        "f"),
                8,
                3);
        for (FigureProvider figure : figures()) {
            List<Text> texts = PictureText.of(figure, Samples.request(input, selection(), "", false, 12), 640, 420);
            assertThat(faults(texts, 640, 420)).as(figure.id()).isEmpty();
        }
    }

    @Test
    void everyPictureFillsLightAndDarkGround() {
        FigureInput input = Samples.atom(5, 2);
        for (FigureProvider figure : figures()) {
            for (boolean dark : new boolean[] {false, true}) {
                BufferedImage image = new BufferedImage(640, 420, BufferedImage.TYPE_INT_RGB);
                Graphics2D g = image.createGraphics();
                figure.paint(g, 640, 420, Samples.request(input, selection(), "", dark, 12));
                g.dispose();
                int corner = image.getRGB(1, 1) & 0xff;
                assertThat(dark ? corner < 80 : corner > 230).as(figure.id()).isTrue();
                assertThat(image.getRGB(638, 418)).as(figure.id()).isEqualTo(image.getRGB(1, 1));
                assertThat(colours(image)).as(figure.id()).isGreaterThan(8);
            }
        }
    }

    @Test
    void axesNameTheirUnits() throws IOException, ParserConfigurationException, SAXException {
        FigureInput input = Samples.atom(5, 2);
        for (FigureProvider figure : figures()) {
            String all = String.join(
                    " ",
                    PictureText.of(figure, Samples.request(input, selection(), "", false, 12), 900, 600).stream()
                            .map(Text::text)
                            .toList());
            String unit = switch (figure.id()) {
                case "levels", "spectrum" -> "(hartree)";
                case "comparison" -> "/σ";
                default -> "(bohr)";
            };
            assertThat(all).as(figure.id()).contains(unit);
        }
    }

    @Test
    void whatIsMissingIsSaidAndNothingIsPainted() {
        FigureInput full = Samples.atom(4, 1);
        FigureInput empty = new FigureInput("", "", full.document(), List.of(), List.of(), null, List.of());
        for (FigureProvider figure : figures()) {
            FigureRequest request = Samples.request(empty, FigureSelection.NONE, "", false, 12);
            assertThat(figure.missing(request)).as(figure.id()).isPresent();
            Graphics2D g = new BufferedImage(10, 10, BufferedImage.TYPE_INT_RGB).createGraphics();
            assertThatThrownBy(() -> figure.paint(g, 640, 420, request))
                    .as(figure.id())
                    .isInstanceOf(InvalidModelException.class);
        }
        FigureSelection unknown = new FigureSelection("", List.of(key(1, 17)), 0);
        for (FigureProvider figure : figures()) {
            boolean needsState = List.of("potential", "radial", "density").contains(figure.id());
            assertThat(figure.missing(Samples.request(full, unknown, "", false, 12))
                            .isPresent())
                    .as(figure.id())
                    .isEqualTo(needsState);
        }
        FigureSelection tilted = new FigureSelection("", List.of(key(1, 0)), 2);
        FigureProvider density = figures().stream()
                .filter(figure -> figure.id().equals("density"))
                .findFirst()
                .orElseThrow();
        assertThat(density.missing(Samples.request(full, tilted, "", false, 12))
                        .orElseThrow()
                        .sentence())
                .contains("m = 2", "l = 1");
    }

    private static List<String> faults(List<Text> texts, int width, int height) {
        List<String> faults = new ArrayList<>();
        Rectangle2D page = new Rectangle2D.Double(0, 0, width, height);
        for (int i = 0; i < texts.size(); i++) {
            Text one = texts.get(i);
            if (!page.contains(one.box())) {
                faults.add("cut: " + one);
            }
            for (int k = 0; k < i; k++) {
                Rectangle2D common = one.box().createIntersection(texts.get(k).box());
                // Runs of one text (raised signs) touch; a pixel is not seen.
                if (common.getWidth() > 1 && common.getHeight() > 1) {
                    faults.add("overlap: " + one + " and " + texts.get(k));
                }
            }
        }
        return faults;
    }

    private static int colours(BufferedImage image) {
        return (int) Arrays.stream(image.getRGB(0, 0, image.getWidth(), image.getHeight(), null, 0, image.getWidth()))
                .distinct()
                .count();
    }

    private static FigureSelection selection() {
        return new FigureSelection("", List.of(key(0, 1), key(1, 0), key(2, 1)), 0);
    }

    private static LevelKey key(int orbital, int index) {
        return new LevelKey(Samples.SYSTEM, Samples.CURVE, ChannelKey.ofOrbital(orbital), index);
    }

    private static List<? extends FigureProvider> figures() {
        return List.copyOf(Lookup.getDefault().lookupAll(FigureProvider.class));
    }
}
