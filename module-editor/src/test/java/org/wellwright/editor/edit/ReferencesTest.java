package org.wellwright.editor.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wellwright.editor.TestProjects;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.ModelCheck;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;

class ReferencesTest {
    private final ModelDocument document = TestProjects.document();

    @Test
    void aParametersNewNameIsFollowedInTermsFormulasAndTies() {
        ModelDocument tied = ParameterEdits.withShape(document, 1, new ParameterShape.Tied("2*k + k2/k"));
        ModelDocument renamed = References.renameParameter(tied, "k", "strength");
        FamilyTerm tail = (FamilyTerm) ModelEdits.term(renamed, new TermPath(0, 0, 0));
        FormulaTerm well = (FormulaTerm) ModelEdits.term(renamed, new TermPath(1, 0, 0));
        assertThat(tail.arguments()).containsEntry("strength", Argument.named("strength"));
        assertThat(well.text()).isEqualTo("-strength/(r+radius)");
        assertThat(renamed.parameters().get(1).shape()).isEqualTo(new ParameterShape.Tied("2*strength + k2/strength"));
        assertThat(renamed.parameters().get(0).name()).isEqualTo("strength");
    }

    @Test
    void usersAreNamedByModelAndTerm() {
        assertThat(References.usersOf(document, "k")).containsExactly("screened, tail", "soft, well");
        assertThat(References.usersOf(document, "depth")).containsExactly("screened, core");
        assertThat(References.usersOf(document, "free")).isEmpty();
    }

    @Test
    void aSystemsNewIdIsFollowedInDataAndParameters() {
        ModelDocument bySystem = ParameterEdits.withShape(
                document,
                1,
                new ParameterShape.BySystem(
                        List.of(new ParameterShape.BySystem.Entry(
                                "X",
                                ParameterEdits.setting(document.parameters().get(1), 0))),
                        null));
        ModelDocument renamed = References.renameSystem(bySystem, "X", "Y");
        assertThat(renamed.data())
                .allMatch(datum ->
                        datum.levels().stream().allMatch(c -> c.level().system().equals("Y")));
        assertThat(ModelCheck.problems(renamed)).isEmpty();
    }

    @Test
    void dataFollowACurveOnlyIfNoOtherModelKeepsItsName() {
        ModelDocument one = References.renameCurve(document, TermPath.curve(0, 0), "W");
        assertThat(one.data().get(0).levels().get(0).level().curve()).isEqualTo("V");
        ModelDocument both = References.renameCurve(one, TermPath.curve(1, 0), "W");
        assertThat(both.data().get(0).levels().get(0).level().curve()).isEqualTo("W");
        assertThat(ModelCheck.problems(both)).isEmpty();
    }

    @Test
    void aParameterInUseIsNotRemoved() {
        assertThatThrownBy(() -> ParameterEdits.remove(document, 0))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("screened, tail");
    }

    @Test
    void anotherUnitConvertsTheNumbers() {
        ModelDocument changed = ParameterEdits.withUnit(document, 2, "nm");
        assertThat(ParameterEdits.setting(changed.parameters().get(2), 0)
                        .value()
                        .value())
                .isEqualTo(0.15);
        assertThat(ParameterEdits.setting(changed.parameters().get(2), 0)
                        .upper()
                        .value())
                .isEqualTo(0.4);
        ModelDocument kept = ParameterEdits.withUnit(document, 2, "eV");
        assertThat(ParameterEdits.setting(kept.parameters().get(2), 0).value().text())
                .isEqualTo("1.5");
    }
}
