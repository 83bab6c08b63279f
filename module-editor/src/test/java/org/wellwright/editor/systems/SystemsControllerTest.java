package org.wellwright.editor.systems;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.wellwright.editor.TestProjects;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.MassConvention;
import org.wellwright.solver.pair.PairSystem;

class SystemsControllerTest {
    private final ProjectSession session = TestProjects.session();
    private final SystemsController controller = new SystemsController(session);

    private PairSystem system() {
        return session.project().document().systems().get(0);
    }

    /** m_µ = 0.1134289257 u, m_p = 1.0072764665789 u (CODATA 2022): m_µ m_p/(m_µ + m_p) = 0.10194854… u. */
    @Test
    void aParticleOfTheTableBringsItsChargeAndSpin() {
        assertThat(controller.setMass(0, true, "mu-")).isEmpty();
        assertThat(system().first().charge().text()).isEqualTo("-1");
        assertThat(system().first().twiceSpin()).isEqualTo(1);
        assertThat(SystemsViewModel.of(session.project().document())
                        .systems()
                        .get(0)
                        .derived())
                .startsWith("reduced mass 0.10194854");
    }

    @Test
    void aMassIsTypedWithItsUnitOrNamedAsAParameter() {
        assertThat(controller.setMass(0, true, "0.067 m_e")).isEmpty();
        assertThat(system().first().mass()).isInstanceOf(BodyMass.Typed.class);
        assertThat(controller.setMass(0, true, "38.96(1) u")).isEmpty();
        assertThat(controller.setMass(0, true, "0.067"))
                .hasValueSatisfying(p -> assertThat(p.sentence()).contains("no unit"));
        assertThat(controller.setMass(0, true, "0.067 nm"))
                .hasValueSatisfying(p -> assertThat(p.sentence()).contains("not a unit of mass"));
        assertThat(controller.setMass(0, true, "protn"))
                .hasValueSatisfying(p -> assertThat(p.sentence()).contains("neither a particle"));
        assertThat(controller.setMass(0, true, "depth")).isEmpty();
        assertThat(system().massConvention()).isEqualTo(MassConvention.MODEL_PARAMETER);
    }

    @Test
    void spinsAbundancesAndPermittivities() {
        assertThat(controller.setSpin(0, true, "3/2")).isEmpty();
        assertThat(system().first().twiceSpin()).isEqualTo(3);
        assertThat(controller.setSpin(0, true, "")).isEmpty();
        assertThat(system().first().twiceSpin()).isEqualTo(-1);
        assertThat(controller.setSpin(0, true, "half")).isPresent();
        assertThat(controller.setAbundance(0, "98.93 %")).isEmpty();
        assertThat(system().abundance().text()).isEqualTo("0.9893");
        assertThat(controller.setAbundance(0, "1.2")).isPresent();
        assertThat(controller.setPermittivity(0, "-2")).isPresent();
        assertThat(controller.setPermittivity(0, "12.5")).isEmpty();
    }

    @Test
    void aSystemWithDataStaysAndItsNewIdIsFollowed() {
        assertThat(controller.remove(0))
                .hasValueSatisfying(p -> assertThat(p.sentence()).contains("2 measured values"));
        assertThat(controller.rename(0, "ion")).isEmpty();
        assertThat(session.project()
                        .document()
                        .data()
                        .get(0)
                        .levels()
                        .get(0)
                        .level()
                        .system())
                .isEqualTo("ion");
        int copy = controller.duplicate(0);
        assertThat(controller.rename(copy, "ion")).isPresent();
        assertThat(controller.rename(copy, "a:b")).isPresent();
        assertThat(controller.remove(copy)).isEmpty();
    }
}
