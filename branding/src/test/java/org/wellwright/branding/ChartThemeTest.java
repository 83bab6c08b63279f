package org.wellwright.branding;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.util.stream.Stream;
import org.jfree.chart.ChartFactory;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.XYPlot;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ChartThemeTest {
    static Stream<ChartTheme> themes() {
        return Stream.of(ChartTheme.light(), ChartTheme.dark());
    }

    @ParameterizedTest
    @MethodSource("themes")
    void anyTwoSeriesColoursAreToldApartByEveryKindOfColourVision(ChartTheme theme) {
        for (ColourVision vision : ColourVision.values()) {
            for (int i = 0; i < theme.series().size(); i++) {
                for (int j = 0; j < i; j++) {
                    OkLab one = vision.see(OkLab.of(theme.seriesColour(i)));
                    OkLab other = vision.see(OkLab.of(theme.seriesColour(j)));
                    assertThat(one.distance(other))
                            .as("%s: series %d and %d", vision, i, j)
                            .isGreaterThan(0.12);
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("themes")
    void linesAndTextStandOutFromTheGround(ChartTheme theme) {
        for (Color colour : theme.series()) {
            assertThat(contrast(colour, theme.ground())).as("series %s", colour).isGreaterThan(2.8);
        }
        // WCAG 2.1, criterion 1.4.3: 4.5 to 1 for text.
        assertThat(contrast(theme.text(), theme.ground())).isGreaterThan(4.5);
        assertThat(contrast(theme.selection(), theme.ground())).isGreaterThan(4.5);
    }

    @Test
    void aDressedChartPaintsItsGroundAndItsSeriesInTheThemesColours() {
        XYSeries line = new XYSeries("V");
        line.add(0, 0);
        line.add(1, 1);
        JFreeChart chart =
                ChartFactory.createXYLineChart("Title", "r (bohr)", "V (hartree)", new XYSeriesCollection(line));
        ChartTheme.dark().apply(chart);
        BufferedImage image = chart.createBufferedImage(400, 300);
        assertThat(new Color(image.getRGB(2, 2))).isEqualTo(ChartTheme.dark().ground());
        XYPlot plot = chart.getXYPlot();
        assertThat(plot.getRenderer().getSeriesPaint(0))
                .isEqualTo(ChartTheme.dark().seriesColour(0));
        assertThat(plot.getDomainAxis().getLabelPaint())
                .isEqualTo(ChartTheme.dark().text());
    }

    @Test
    void seriesBeyondTheColoursRepeatThemWithAnotherDash() {
        ChartTheme theme = ChartTheme.light();
        int round = theme.series().size();
        assertThat(theme.seriesColour(round)).isEqualTo(theme.seriesColour(0));
        assertThat(theme.seriesStroke(round)).isNotEqualTo(theme.seriesStroke(0));
    }

    /** WCAG 2.1: (L1 + 0.05)/(L2 + 0.05) with relative luminances L1 ≥ L2. */
    private static double contrast(Color one, Color other) {
        double a = luminance(one);
        double b = luminance(other);
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    private static double luminance(Color colour) {
        return 0.2126 * OkLab.toLinear(colour.getRed())
                + 0.7152 * OkLab.toLinear(colour.getGreen())
                + 0.0722 * OkLab.toLinear(colour.getBlue());
    }
}
