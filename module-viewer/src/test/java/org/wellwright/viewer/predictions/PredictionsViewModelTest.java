package org.wellwright.viewer.predictions;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.wellwright.project.FigureInput;
import org.wellwright.viewer.Samples;
import org.wellwright.viewer.plot.TableText;

class PredictionsViewModelTest {
    @Test
    void listsLevelsThatNoDatumNamesWithTheSpreadOfTheModels() {
        FigureInput input = Samples.atom(6, 1);
        PredictionsViewModel model = PredictionsViewModel.of(input);
        // The samples measure the lowest four levels of each channel.
        assertThat(model.table().rows()).extracting(row -> row.get(0).text()).containsExactly("5s", "6s", "6p");
        assertThat(model.table().columns())
                .extracting(TableText.Column::title)
                .containsExactly(
                        "Level",
                        "screened core (hartree)",
                        "polarised core (hartree)",
                        "point charge (hartree)",
                        "Models differ by (hartree)");
        TableText.Cell exact = model.table().rows().get(0).get(3);
        assertThat(exact.text()).isEqualTo("−0.02");
        assertThat(exact.hint()).startsWith("-0.02, between -0.0200000000001 and ");
        double first =
                Double.parseDouble(model.table().rows().get(0).get(1).hint().split(",")[0]);
        double spread = Double.parseDouble(model.table().rows().get(0).get(4).hint());
        assertThat(spread).isEqualTo(-0.02 - first);
    }
}
