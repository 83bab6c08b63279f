package org.wellwright.solver.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.wellwright.solver.fit.Documents.document;
import static org.wellwright.solver.fit.Documents.fixed;
import static org.wellwright.solver.fit.Documents.hydrogens;
import static org.wellwright.solver.fit.Documents.level;
import static org.wellwright.solver.fit.Documents.number;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.model.SpinScheme;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.potential.AngularFactor;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.ChannelFilter;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.ExactNumber;

/** The chain rule from levels back to the pool, for every kind of parameter, on closed-form levels. */
class PoolGradientTest {
    private static final SpectrumSource SOURCE = new HydrogenicSource();

    private static Setting setting(String value) {
        return Setting.free(number(value));
    }

    private static Parameter shaped(String name, String unit, ParameterShape shape) {
        return new Parameter(name, unit, "", shape);
    }

    @Test
    void scalarOriginScaleAndTie() {
        List<Parameter> pool = List.of(
                fixed("k", "eV angstrom", "12"),
                fixed("shift", "cm^-1", "400"),
                fixed("s", "", "1.1"),
                shaped("origin", "meV", new ParameterShape.Tied("shift/8 + k^2")),
                shaped("part", "eV nm", new ParameterShape.Tied("0.01*k*s^2")));
        Term coulomb = new FamilyTerm(
                TermFrame.named("a").withScale(Argument.named("s")),
                "coulomb",
                Map.of("strength", Argument.named("k")));
        Term tied = new FormulaTerm(TermFrame.named("b"), "-part/r", Map.of());
        Model model = Model.of(
                "m", List.of(Curve.of("ground", List.of(coulomb, tied)).withEnergyOrigin(Argument.named("origin"))));
        int compared = PoolGradients.assertAgreeWithDifferences(
                document("eV-nm", hydrogens(), pool, List.of(model), List.of(), List.of()),
                List.of(level("H", 0, 0), level("D", 1, 2)),
                SOURCE,
                1e-2,
                1e-6);
        assertThat(compared).isEqualTo(6);
    }

    @Test
    void numbersByOrbitalAndBySystem() {
        List<Parameter> pool = List.of(
                shaped(
                        "k",
                        "hartree bohr",
                        new ParameterShape.ByOrbital(
                                List.of(
                                        new ParameterShape.ByOrbital.Entry(0, setting("1.02")),
                                        new ParameterShape.ByOrbital.Entry(2, setting("1.01"))),
                                setting("0.99"))),
                shaped(
                        "d",
                        "hartree bohr",
                        new ParameterShape.BySystem(
                                List.of(new ParameterShape.BySystem.Entry("D", setting("0.02"))), setting("0.01"))));
        Term term = new FormulaTerm(TermFrame.named("a"), "-(k + d)/r", Map.of());
        int compared = PoolGradients.assertAgreeWithDifferences(
                document(
                        "atomic",
                        hydrogens(),
                        pool,
                        List.of(Model.of("m", List.of(Curve.of("ground", List.of(term))))),
                        List.of(),
                        List.of()),
                List.of(level("H", 0, 0), level("D", 1, 0), level("D", 2, 1)),
                SOURCE,
                1e-2,
                1e-6);
        assertThat(compared).isEqualTo(6);
    }

    @Test
    void numbersByOrbitalAndTotalUnderASpinOperator() {
        List<Parameter> pool = List.of(
                fixed("k", "hartree bohr", "1"),
                shaped(
                        "c",
                        "hartree bohr",
                        new ParameterShape.ByTotal(
                                List.of(
                                        new ParameterShape.ByTotal.Entry(1, 1, setting("0.02")),
                                        new ParameterShape.ByTotal.Entry(1, 3, setting("0.03"))),
                                null)));
        Term main = new FormulaTerm(TermFrame.named("a"), "-k/r", Map.of());
        Term spin = new FormulaTerm(
                TermFrame.named("b").withAngular(AngularFactor.SPIN_ORBIT).withChannels(ChannelFilter.orbitals(1, 1)),
                "c/r",
                Map.of());
        Curve curve = Curve.of("ground", List.of(main, spin)).withSpinScheme(SpinScheme.ONE_SPIN);
        int compared = PoolGradients.assertAgreeWithDifferences(
                document("atomic", hydrogens(), pool, List.of(Model.of("m", List.of(curve))), List.of(), List.of()),
                List.of(
                        new LevelKey("H", "ground", ChannelKey.ofTotal(1, 1), 0),
                        new LevelKey("H", "ground", ChannelKey.ofTotal(1, 3), 0),
                        new LevelKey("H", "ground", ChannelKey.ofTotal(0, 1), 1)),
                SOURCE,
                1e-2,
                1e-6);
        assertThat(compared).isEqualTo(5);
    }

    @Test
    void massesScaledParametersAndSystemNames() {
        List<Parameter> pool = List.of(
                fixed("heavy", "u", "1.1"),
                fixed("light", "MeV", "0.6"),
                shaped("a", "eV nm", new ParameterShape.MassScaled(setting("0.3"), "D", -1.5)));
        Body nucleus = new Body("", new BodyMass.FromParameter("heavy"), ExactNumber.ONE, 1);
        Body electron = new Body("", new BodyMass.FromParameter("light"), number("-1"), 1);
        List<PairSystem> systems =
                List.of(PairSystem.of("H", electron, nucleus), hydrogens().get(1));
        Term term = new FormulaTerm(TermFrame.named("a"), "-(coulomb*reduced_mass + a)/r", Map.of());
        int compared = PoolGradients.assertAgreeWithDifferences(
                document(
                        "eV-nm",
                        systems,
                        pool,
                        List.of(Model.of("m", List.of(Curve.of("ground", List.of(term))))),
                        List.of(),
                        List.of()),
                List.of(level("H", 0, 0), level("D", 0, 1)),
                SOURCE,
                1e-2,
                1e-6);
        assertThat(compared).isEqualTo(4);
    }
}
