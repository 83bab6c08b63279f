package org.wellwright.viewer.levels;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.branding.ChartTheme;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.Samples;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Viewport;

class LevelDiagramTest {
    private static final LevelKey TWO_P = new LevelKey(Samples.SYSTEM, Samples.CURVE, ChannelKey.ofOrbital(1), 0);

    @Test
    void showsMeasuredLevelsThenEveryModelByChannel() {
        LevelDiagram diagram = LevelDiagram.of(Samples.atom(5, 2), FigureSelection.NONE);
        assertThat(diagram.groups())
                .extracting(LevelDiagram.Group::header)
                .containsExactly("measured", "screened core", "polarised core", "point charge");
        assertThat(diagram.groups().get(1).columns())
                .extracting(LevelDiagram.Column::header)
                .containsExactly("s", "p", "d");
        assertThat(diagram.groups().get(1).columns().get(1).bars())
                .extracting(LevelDiagram.Bar::label)
                .containsExactly("2p", "3p", "4p", "5p");
        assertThat(diagram.groups().get(3).columns().get(1).measured())
                .extracting(LevelDiagram.Bar::label)
                .containsExactly("2p", "3p", "4p", "5p");
        assertThat(diagram.groups().get(3).threshold()).isZero();
        assertThat(diagram.energy().label()).isEqualTo("Energy (hartree)");
    }

    @Test
    void aSelectedLevelIsSelectedInEveryGroup() {
        LevelDiagram diagram = LevelDiagram.of(Samples.atom(4, 2), new FigureSelection("", List.of(TWO_P), 0));
        assertThat(diagram.groups().stream()
                        .flatMap(group -> group.columns().stream())
                        .flatMap(column -> column.bars().stream()))
                .filteredOn(LevelDiagram.Bar::selected)
                .hasSize(4)
                .allSatisfy(bar -> assertThat(bar.key()).isEqualTo(TWO_P));
    }

    @Test
    void barsStandAtTheirEnergies() {
        FigureInput input = Samples.atom(4, 1);
        LevelDiagramPainter.Painted painted = paint(input, 900, 600);
        for (LevelDiagramLayout.PlacedBar bar : painted.layout().bars()) {
            assertThat(painted.area().valueAtY(bar.y())).isCloseTo(bar.bar().energy(), within(1e-12));
        }
        LevelDiagramLayout.PlacedBar deepest = painted.layout().bars().stream()
                .max((a, b) -> Double.compare(a.y(), b.y()))
                .orElseThrow();
        assertThat(painted.layout().at(deepest.left() + 1, deepest.y() + 2, 4)).isSameAs(deepest);
        assertThat(painted.layout().at(deepest.left() + 1, deepest.y() + 40, 4)).isNull();
    }

    @ParameterizedTest
    @ValueSource(ints = {4, 12, 60})
    void labelsOfOneColumnNeverOverlapAndNameEveryLevel(int n) {
        LevelDiagramLayout layout = paint(Samples.atom(n, 3), 1280, 720).layout();
        List<LevelDiagramLayout.PlacedLabel> labels = layout.labels();
        for (int i = 0; i < labels.size(); i++) {
            for (int k = 0; k < i; k++) {
                assertThat(labels.get(i).box().intersects(labels.get(k).box()))
                        .as("%s, %s", labels.get(i), labels.get(k))
                        .isFalse();
            }
        }
        assertThat(labels)
                .allSatisfy(label -> assertThat(Math.abs(label.box().getCenterY() - label.barY()))
                        .isLessThan(30));
        if (n == 60) {
            assertThat(labels)
                    .extracting(LevelDiagramLayout.PlacedLabel::text)
                    .anyMatch(text -> text.matches("\\d+s? ?– ?60s?"));
        }
    }

    private static LevelDiagramPainter.Painted paint(FigureInput input, int width, int height) {
        Graphics2D g = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB).createGraphics();
        PlotStyle style = new PlotStyle(ChartTheme.light(), new Font(Font.SANS_SERIF, Font.PLAIN, 12));
        return LevelDiagramPainter.paint(
                g, width, height, LevelDiagram.of(input, FigureSelection.NONE), style, Viewport.ALL);
    }
}
