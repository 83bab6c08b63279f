package org.wellwright.viewer.comparison;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wellwright.project.FigureInput;
import org.wellwright.viewer.Samples;
import org.wellwright.viewer.plot.TableText;

class ComparisonViewModelTest {
    private final FigureInput input = Samples.atom(5, 1);

    @Test
    void everyModelHasItsRankAndEveryDatumWhatTheModelsSay() {
        ComparisonViewModel model = ComparisonViewModel.of(input);
        assertThat(model.ranked()).containsExactly("screened core", "polarised core", "point charge");
        assertThat(texts(model.ranking().rows().get(0))).startsWith("1", "screened core");
        assertThat(model.data().columns())
                .extracting(TableText.Column::title)
                .containsExactly(
                        "Datum",
                        "What",
                        "Measured",
                        "σ",
                        "Unit",
                        "screened core",
                        "residual/σ",
                        "polarised core",
                        "residual/σ",
                        "point charge",
                        "residual/σ");
        assertThat(model.data().rows()).hasSameSizeAs(input.document().data());
        List<String> first = texts(model.data().rows().get(0));
        assertThat(first.subList(0, 5))
                .containsExactly(
                        "d0", "1s", input.document().data().get(0).value().text(), "0.0025", "hartree");
        // Rounded to the second digit of σ = 0.0025: the point charge's −0.5.
        assertThat(first.get(9)).isEqualTo("−0.5000");
        assertThat(model.levels().get(0))
                .containsExactly(input.models().get(0).channels().get(0).key(0));
    }

    @Test
    void withoutAComparisonTheDataStandAlone() {
        FigureInput bare = new FigureInput("", "", input.document(), input.models(), List.of(), null, List.of());
        ComparisonViewModel model = ComparisonViewModel.of(bare);
        assertThat(model.ranking().rows()).isEmpty();
        assertThat(model.data().columns()).hasSize(5);
    }

    private static List<String> texts(List<TableText.Cell> row) {
        return row.stream().map(TableText.Cell::text).toList();
    }
}
