package org.wellwright.editor.models;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.wellwright.editor.TestProjects;
import org.wellwright.editor.edit.ModelEdits;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TableKnot;

class ModelsControllerTest {
    private static final TermPath CORE = new TermPath(0, 0, 1);

    private final ProjectSession session = TestProjects.session();
    private final ModelsController controller = new ModelsController(session);

    private ModelDocument document() {
        return session.project().document();
    }

    @Test
    void showsModelsCurvesAndTerms() {
        ModelsViewModel model = ModelsViewModel.of(document());
        assertThat(model.models()).extracting(ModelsViewModel.Node::title).containsExactly("screened", "soft");
        ModelsViewModel.Node curve = model.models().get(0).children().get(0);
        assertThat(curve.detail()).isEqualTo("2 terms");
        assertThat(curve.children())
                .extracting(ModelsViewModel.Node::detail)
                .containsExactly("Coulomb", "-depth*exp(-(r/radius)^2)");
        assertThat(model.node(CORE).title()).isEqualTo("core");
    }

    @Test
    void aBurstOfTypingIsOneStepAndAFaultyFormulaIsKept() {
        String typed = "";
        for (char c : "-depth*exp(-r/radius".toCharArray()) {
            typed += c;
            assertThat(controller.setFormula(CORE, typed)).isEmpty();
        }
        assertThat(ModelsViewModel.of(document()).node(CORE).problem()).contains("column");
        controller.setFormula(CORE, typed + ")");
        controller.endTyping();
        assertThat(ModelsViewModel.of(document()).node(CORE).problem()).isEmpty();
        session.undo();
        assertThat(((FormulaTerm) ModelEdits.term(document(), CORE)).text()).isEqualTo("-depth*exp(-(r/radius)^2)");
        assertThat(session.undoLabel()).isEmpty();
    }

    @Test
    void aFamilyBringsItsParametersInTheProjectsUnits() {
        PotentialFamily morse = FamilyCatalogue.require("morse");
        Map<String, String> names = controller.suggestedNames(morse);
        assertThat(names).containsEntry("depth", "depth_2").containsEntry("steepness", "steepness");
        TermPath at = controller.insertedAt(TermPath.model(1));
        assertThat(controller.addFamily(TermPath.model(1), morse, names)).isEmpty();
        assertThat(ModelEdits.term(document(), at).frame().name()).isEqualTo("Morse");
        Parameter depth = document().parameters().stream()
                .filter(parameter -> parameter.name().equals("depth_2"))
                .findFirst()
                .orElseThrow();
        assertThat(depth.unit()).isEqualTo("cm^-1");
        assertThat(ModelsViewModel.of(document()).node(at).problem()).isEmpty();
        session.undo();
        assertThat(document()).isEqualTo(TestProjects.document());
    }

    @Test
    void aFamilysArgumentMayBeANumberOrAParameterThatIsThere() {
        PotentialFamily morse = FamilyCatalogue.require("morse");
        assertThat(controller.addFamily(
                        CORE, morse, Map.of("depth", "depth", "steepness", "1.1 angstrom^-1", "equilibrium", "radius")))
                .isEmpty();
        FamilyTerm term = (FamilyTerm) ModelEdits.term(document(), new TermPath(0, 0, 2));
        assertThat(term.arguments().get("steepness")).isEqualTo(new Argument.Literal(1.1, "angstrom^-1"));
        assertThat(document().parameters()).hasSize(3);
        assertThat(controller.addFamily(CORE, morse, Map.of("depth", "radius", "steepness", "1", "equilibrium", "1")))
                .hasValueSatisfying(problem -> assertThat(problem.sentence()).contains("does not fit"));
    }

    @Test
    void theStrengthBetweenChargesFollowsFromTheSystem() {
        assertThat(controller.suggestedNames(FamilyCatalogue.require("coulomb")))
                .containsValue("coulomb");
    }

    @Test
    void anotherFamilyKeepsWhatBothHave() {
        controller.addFamily(
                CORE,
                FamilyCatalogue.require("morse"),
                Map.of("depth", "depth", "steepness", "1", "equilibrium", "radius"));
        TermPath at = new TermPath(0, 0, 2);
        assertThat(controller.setFamily(at, "woods-saxon")).isEmpty();
        FamilyTerm term = (FamilyTerm) ModelEdits.term(document(), at);
        assertThat(term.family()).isEqualTo("woods-saxon");
        assertThat(term.arguments()).containsEntry("depth", Argument.named("depth"));
        assertThat(term.frame().name())
                .isEqualTo(FamilyCatalogue.require("woods-saxon").displayName());
        assertThat(ModelsViewModel.of(document()).node(at).problem()).isEmpty();
    }

    @Test
    void missingNamesOfAFormulaBecomeParameters() {
        controller.setFormula(CORE, "-a/r + b*r + depth*0");
        assertThat(ModelsController.missing(document(), CORE)).containsExactlyInAnyOrder("a", "b");
        assertThat(controller.addMissing(CORE)).isEmpty();
        assertThat(ModelsController.missing(document(), CORE)).isEmpty();
        assertThat(document().parameters()).extracting(Parameter::name).contains("a", "b");
    }

    @Test
    void duplicatesMovesAndRemovesAtEveryDepth() {
        assertThat(controller.duplicate(CORE)).isEqualTo(new TermPath(0, 0, 2));
        assertThat(ModelEdits.term(document(), new TermPath(0, 0, 2)).frame().name())
                .isEqualTo("core 2");
        assertThat(controller.move(new TermPath(0, 0, 2), -1)).isEqualTo(CORE);
        assertThat(ModelEdits.term(document(), CORE).frame().name()).isEqualTo("core 2");
        assertThat(controller.move(TermPath.model(0), 1)).isEqualTo(TermPath.model(1));
        assertThat(document().models()).extracting(Model::name).containsExactly("soft", "screened");
        assertThat(controller.duplicate(TermPath.model(0))).isEqualTo(TermPath.model(1));
        assertThat(document().models().get(1).name()).isEqualTo("soft copy");
        assertThat(controller.remove(TermPath.curve(0, 0)))
                .hasValueSatisfying(problem -> assertThat(problem.sentence()).contains("only curve"));
        assertThat(controller.remove(TermPath.model(1))).isEmpty();
        while (session.undoLabel().isPresent()) {
            session.undo();
        }
        assertThat(document()).isEqualTo(TestProjects.document());
    }

    @Test
    void aTermIsSwitchedOffAndKept() {
        assertThat(controller.setEnabled(CORE, false)).isEmpty();
        assertThat(ModelsViewModel.of(document()).node(CORE).enabled()).isFalse();
        assertThat(session.undoLabel()).contains("Switch off core");
    }

    @Test
    void rangesChannelsAndWallsAreChecked() {
        assertThat(controller.setTo(CORE, "0.4 nm")).isEmpty();
        assertThat(controller.setTo(CORE, "depth")).isPresent();
        assertThat(controller.setTo(CORE, "")).isEmpty();
        assertThat(controller.setChannels(CORE, "l = 1..2")).isEmpty();
        assertThat(controller.setChannels(CORE, "p waves")).isPresent();
        assertThat(controller.setOuterWall(TermPath.curve(0, 0), "30")).isEmpty();
        assertThat(controller.setOccupied(TermPath.curve(0, 0), "1s")).isEmpty();
        assertThat(controller.setOccupied(TermPath.curve(0, 0), "1q")).isPresent();
        assertThat(controller.rename(CORE, "tail")).isPresent();
        assertThat(controller.rename(CORE, "  ")).isPresent();
    }

    @Test
    void pastedPointsAreSortedAndFaultyOnesNamed() {
        List<TableKnot> knots = TableForm.points(
                "r\tV\n2\t-1\n1\t-3\n3 -0.5\n4,-0.1\n".replace(" ", "\t").replace(",", "\t"));
        assertThat(knots).extracting(TableKnot::radius).containsExactly(1.0, 2.0, 3.0, 4.0);
        assertThatThrownBy(() -> TableForm.points("1;2\n2;x\n")).hasMessageContaining("line 2");
    }
}
