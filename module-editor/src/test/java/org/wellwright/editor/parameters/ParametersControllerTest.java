package org.wellwright.editor.parameters;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wellwright.editor.TestProjects;
import org.wellwright.editor.edit.ParameterEdits;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.model.ParameterShape;

class ParametersControllerTest {
    private final ProjectSession session = TestProjects.session();
    private final ParametersController controller = new ParametersController(session);

    private ParametersViewModel.Row row(String name) {
        return ParametersViewModel.of(session.project().document()).rows().stream()
                .filter(row -> row.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void showsEveryNumberWithItsBounds() {
        ParametersViewModel model = ParametersViewModel.of(session.project().document());
        assertThat(model.rows()).extracting(ParametersViewModel.Row::name).containsExactly("k", "depth", "radius");
        assertThat(model.rows()).extracting(ParametersViewModel.Row::value).containsExactly("1.440", "5000", "1.5");
        assertThat(row("radius").upper()).isEqualTo("4");
        assertThat(model.summary()).isEqualTo("3 numbers, 2 free");
    }

    /** 1 eV = 8065.543937… cm⁻¹ (CODATA 2022, exact). */
    @Test
    void takesElectronvoltsInAFieldOfWavenumbers() {
        assertThat(controller.setValue(row("depth"), "1.2 eV")).isEmpty();
        assertThat(Double.parseDouble(row("depth").value())).isCloseTo(1.2 * 8065.543937, within(1e-5));
        assertThat(session.undoLabel()).contains("Change depth");
        session.undo();
        assertThat(row("depth").value()).isEqualTo("5000");
    }

    @Test
    void badInputChangesNothingAndSaysWhatToDo() {
        assertThat(controller.setValue(row("depth"), "1.2 nm"))
                .hasValueSatisfying(problem ->
                        assertThat(problem.sentence()).contains("does not fit").contains("cm^-1"));
        assertThat(controller.setValue(row("radius"), "9"))
                .hasValueSatisfying(problem -> assertThat(problem.sentence()).contains("above the upper bound 4"));
        assertThat(controller.rename(row("k"), "depth")).isPresent();
        assertThat(controller.rename(row("k"), "2k")).isPresent();
        assertThat(controller.setPrior(row("k"), "1.4")).isPresent();
        assertThat(session.modified()).isFalse();
        assertThat(session.undoLabel()).isEmpty();
    }

    @Test
    void anEqualsSignTiesAParameterAndANumberUntiesIt() {
        assertThat(controller.setValue(row("depth"), "= 3*k")).isEmpty();
        assertThat(row("depth").status()).isEqualTo("tied");
        assertThat(row("depth").value()).isEqualTo("= 3*k");
        assertThat(controller.setValue(row("depth"), "= 3*(k"))
                .hasValueSatisfying(problem -> assertThat(problem.sentence()).contains("column"));
        assertThat(controller.setValue(row("depth"), "12")).isEmpty();
        assertThat(row("depth").status()).isEqualTo("fixed");
    }

    @Test
    void aTieToItselfIsShownAsAFault() {
        assertThat(controller.setValue(row("depth"), "= 2*depth")).isEmpty();
        assertThat(row("depth").problem()).contains("tied to itself");
    }

    @Test
    void knowsValuesFromElsewhereInAnotherUnit() {
        assertThat(controller.setPrior(row("radius"), "0.15(1) nm")).isEmpty();
        assertThat(row("radius").prior()).isEqualTo("1.5(1)");
        assertThat(controller.setPrior(row("radius"), "")).isEmpty();
        assertThat(row("radius").prior()).isEmpty();
    }

    @Test
    void aDragIsOneStep() {
        ParametersViewModel.Row row = row("radius");
        SliderScale scale = new SliderScale(0.5, 4);
        for (int tick = 0; tick <= SliderScale.STEPS; tick += 10) {
            controller.slide(row.parameter(), row.entry(), row.name(), scale.value(tick), scale.step());
        }
        controller.endSlide();
        assertThat(row("radius").value()).isEqualTo("4");
        controller.slide(row.parameter(), row.entry(), row.name(), 2, scale.step());
        controller.endSlide();
        session.undo();
        assertThat(row("radius").value()).isEqualTo("4");
        session.undo();
        assertThat(row("radius").value()).isEqualTo("1.5");
        assertThat(session.undoLabel()).isEmpty();
    }

    @Test
    void aSliderStaysWithinTheBounds() {
        ParametersViewModel.Row row = row("radius");
        controller.slide(row.parameter(), row.entry(), row.name(), 7.3, 0.001);
        assertThat(row("radius").value()).isEqualTo("4");
    }

    @Test
    void sliderValuesCarryNoMoreDigitsThanAStepIsWorth() {
        SliderScale scale = new SliderScale(1, 3);
        assertThat(SliderScale.rounded(scale.value(1), scale.step()).text()).isEqualTo("1.001");
        assertThat(scale.tick(2)).isEqualTo(SliderScale.STEPS / 2);
        assertThat(SliderScale.rounded(1.23456789e-9, 1e-13).text()).isEqualTo("1.23457E-9");
        assertThat(SliderScale.rounded(1234567.8, 100).text()).isEqualTo("1234570");
    }

    @Test
    void addsDuplicatesMovesAndRemoves() {
        int added = controller.add(0);
        assertThat(added).isEqualTo(1);
        assertThat(controller.duplicate(1)).isEqualTo(2);
        assertThat(controller.move(2, 1)).isEqualTo(3);
        assertThat(ParametersViewModel.of(session.project().document()).rows())
                .extracting(ParametersViewModel.Row::name)
                .containsExactly("k", "p1", "depth", "p1_2", "radius");
        assertThat(controller.remove(List.of(1, 3))).isEmpty();
        assertThat(session.undoLabel()).contains("Remove parameters");
        assertThat(controller.remove(List.of(0))).isPresent();
    }

    @Test
    void dependencesCarryNumbersOver() {
        var document = session.project().document();
        ParameterShape byL =
                Dependence.ORBITAL.shape(document.parameters().get(2).shape(), "0, 1", true, document);
        assertThat(ParametersViewModel.places(byL)).containsExactly("l = 0", "l = 1", "others");
        assertThat(controller.setShape(2, byL)).isEmpty();
        assertThat(ParametersViewModel.of(session.project().document()).rows())
                .filteredOn(row -> row.name().equals("radius"))
                .extracting(ParametersViewModel.Row::value)
                .containsOnly("1.5");
        ParameterShape scaled = Dependence.MASS.shape(byL, "X -1", false, document);
        assertThat(scaled).isInstanceOf(ParameterShape.MassScaled.class);
        assertThat(Dependence.places(scaled, document)).isEqualTo("X -1");
        assertThat(SliderScale.around(ParameterEdits.settings(byL).get(0)).high())
                .isEqualTo(4);
    }
}
