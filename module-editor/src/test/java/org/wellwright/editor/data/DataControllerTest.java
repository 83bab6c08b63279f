package org.wellwright.editor.data;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wellwright.editor.TestProjects;
import org.wellwright.editor.data.DataViewModel.Row;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.entry.DatumTable;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.units.ExactNumber;

class DataControllerTest {
    private final ProjectSession session = TestProjects.session();
    private final DataController controller = new DataController(session);

    private List<Datum> data() {
        return session.project().document().data();
    }

    private List<Row> rows() {
        return DataViewModel.of(session.project().document(), controller.draft())
                .rows();
    }

    @Test
    void showsValuesAsPeopleWriteThem() {
        assertThat(rows()).hasSize(3);
        assertThat(rows().get(0).levels()).isEqualTo("2p - 1s");
        assertThat(rows().get(0).value()).isEqualTo("82000.1(2)");
        assertThat(rows().get(2).draft()).isTrue();
        assertThat(DataViewModel.of(session.project().document(), controller.draft())
                        .summary())
                .isEqualTo("2 values, 2 of them used");
    }

    @Test
    void theLastRowBecomesAValueOnceLevelsAndValueAreThere() {
        assertThat(controller.setLevels(rows().get(2), "3d - 2p")).isEmpty();
        assertThat(data()).hasSize(2);
        assertThat(controller.setValue(rows().get(2), "15233.21(12)")).isEmpty();
        assertThat(data()).hasSize(3);
        assertThat(data().get(2).sigmaPlus().decimal()).isEqualByComparingTo("0.12");
        assertThat(rows()).hasSize(4);
        assertThat(rows().get(3).levels()).isEmpty();
        session.undo();
        assertThat(data()).hasSize(2);
    }

    @Test
    void theLastRowRefusesWhatNamesNoLevel() {
        assertThat(controller.setLevels(rows().get(2), "2j - 1s"))
                .hasValueSatisfying(problem -> assertThat(problem.sentence()).contains("letter of an l"));
        assertThat(controller.setValue(rows().get(2), "about 5")).isPresent();
        assertThat(session.modified()).isFalse();
    }

    @Test
    void aValueTakesItsUncertaintyAndUnitWithIt() {
        assertThat(controller.setValue(rows().get(0), "10.1668(25) eV")).isEmpty();
        assertThat(data().get(0).unit()).isEqualTo("eV");
        assertThat(data().get(0).sigmaPlus().decimal()).isEqualByComparingTo("0.0025");
        assertThat(session.undoLabel()).contains("Change a value");
    }

    @Test
    void anotherQuantityBringsItsUsualUnit() {
        assertThat(controller.setQuantity(rows().get(0), "vacuum wavelength")).isEmpty();
        assertThat(data().get(0).transform()).isEqualTo(Transform.VACUUM_WAVELENGTH);
        assertThat(data().get(0).unit()).isEqualTo("nm");
        assertThat(controller.setQuantity(rows().get(0), "radius, k = 4")).isEmpty();
        assertThat(data().get(0).detail().radiusPower()).isEqualTo(4);
        assertThat(rows().get(0).quantity()).isEqualTo("radius, k = 4");
        assertThat(rows().get(0).levelProblem()).contains("one level");
        assertThat(controller.setQuantity(rows().get(0), "colour")).isPresent();
    }

    @Test
    void aRatioHasTwoCombinations() {
        assertThat(controller.setLevels(rows().get(0), "(2p - 1s) / (2s - 1s)")).isEmpty();
        assertThat(data().get(0).transform()).isEqualTo(Transform.RATIO);
        assertThat(rows().get(0).levels()).isEqualTo("(2p - 1s) / (2s - 1s)");
    }

    @Test
    void pastedRowsAreOneStep() {
        List<DatumTable.Outcome> outcomes =
                controller.read("3p - 1s\t97000.5(3)\n3s - 1s\t97000.1\t0.3\n4s - 1s\t102000\t0.5\n");
        assertThat(outcomes).extracting(DatumTable.Outcome::problem).containsOnlyNulls();
        controller.add(outcomes.stream().map(DatumTable.Outcome::datum).toList(), 0, "Paste 3 values");
        assertThat(data()).hasSize(5);
        assertThat(rows().get(1).levels()).isEqualTo("3p - 1s");
        assertThat(data()).extracting(Datum::id).doesNotHaveDuplicates();
        session.undo();
        assertThat(data()).hasSize(2);
    }

    @Test
    void groupsAreRenamedWithTheirDataAndForgottenWithThem() {
        assertThat(controller.setGroups(rows().get(0), "lamp")).isEmpty();
        assertThat(controller.setGroups(rows().get(0), "lamq"))
                .hasValueSatisfying(problem -> assertThat(problem.sentence()).contains("lamp"));
        DataGroup renamed =
                new DataGroup("neon", "neon lamp", DataGroup.Kind.ADDITIVE, new ExactNumber("0.1"), "cm^-1");
        assertThat(controller.setGroups(List.of(renamed), List.of("lamp"))).isEmpty();
        assertThat(data().get(0).groups()).containsExactly("neon");
        assertThat(controller.setGroups(List.of(), List.of())).isEmpty();
        assertThat(data().get(0).groups()).isEmpty();
    }

    @Test
    void movesRemovesDuplicatesAndLeavesOut() {
        assertThat(controller.move(0, 1)).isEqualTo(1);
        controller.duplicate(List.of(0, 1));
        assertThat(data()).extracting(Datum::id).containsExactly("d2", "d1", "d3", "d4");
        controller.setUsed(rows().subList(0, 2), false);
        assertThat(data()).extracting(Datum::used).containsExactly(false, false, true, true);
        controller.remove(List.of(0, 2));
        assertThat(data()).extracting(Datum::id).containsExactly("d1", "d4");
        assertThat(controller.setId(rows().get(0), "d4")).isPresent();
        assertThat(controller.setRemark(rows().get(2), "x")).isNotEqualTo(Optional.empty());
    }
}
