package org.wellwright.viewer.comparison;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.viewer.Samples;

class ResidualPlotTest {
    @Test
    void hasARowPerDatumAndAResidualPerModel() {
        FigureInput input = Samples.atom(5, 2);
        ResidualPlot plot = ResidualPlot.of(
                input,
                new FigureSelection(
                        "", List.of(input.models().get(0).channels().get(1).key(0)), 0));
        assertThat(plot.rows()).hasSameSizeAs(input.document().data());
        assertThat(plot.rows()).extracting(ResidualPlot.Row::label).startsWith("1s", "2s", "3s", "4s", "2p");
        assertThat(plot.rows())
                .filteredOn(ResidualPlot.Row::selected)
                .extracting(ResidualPlot.Row::label)
                .containsExactly("2p");
        assertThat(plot.rows().get(0).residuals().get(2))
                .isEqualTo(input.comparison().models().get(2).rows().get(0).residual());
        assertThat(plot.models().get(1).text()).startsWith("polarised core  χ²/ν = ");
    }

    @Test
    void orderAndSignSurviveTheStretchedScale() {
        ResidualPlot plot = ResidualPlot.of(Samples.atom(5, 2), FigureSelection.NONE);
        assertThat(plot.linear()).isFalse();
        assertThat(plot.place(-3)).isCloseTo(-plot.place(3), within(1e-15));
        assertThat(plot.place(0.01)).isCloseTo(0.01, within(1e-6));
        assertThat(plot.place(1000)).isGreaterThan(plot.place(100)).isLessThan(10);
        assertThat(plot.axis().ticks()).extracting(tick -> tick.text()).contains("0", "1", "−1", "−10", "−100");
        double worst = plot.rows().stream()
                .flatMap(row -> row.residuals().stream())
                .mapToDouble(Double::doubleValue)
                .min()
                .orElseThrow();
        assertThat(plot.place(worst)).isBetween(plot.axis().lower(), plot.axis().upper());
    }
}
