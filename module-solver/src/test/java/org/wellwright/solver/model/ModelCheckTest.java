package org.wellwright.solver.model;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.wellwright.solver.fit.Documents.document;
import static org.wellwright.solver.fit.Documents.energy;
import static org.wellwright.solver.fit.Documents.fixed;
import static org.wellwright.solver.fit.Documents.free;
import static org.wellwright.solver.fit.Documents.hydrogens;
import static org.wellwright.solver.fit.Documents.level;
import static org.wellwright.solver.fit.Documents.line;
import static org.wellwright.solver.fit.Documents.model;
import static org.wellwright.solver.fit.Documents.number;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.ExchangeSymmetry;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.ExactNumber;

/** Faults between records are found, each with its JSON pointer. */
class ModelCheckTest {
    private static final List<Parameter> POOL = List.of(free("k", "eV nm", "1.44"), fixed("w", "eV", "0.5"));

    private static ModelDocument sound() {
        return document(
                "eV-nm",
                hydrogens(),
                POOL,
                List.of(model("m", "-k/r")),
                List.of(energy("n1", level("H", 0, 0), -13.6, "eV", 0.1)),
                List.of(new DataGroup("g", "", DataGroup.Kind.ADDITIVE, number("0.1"), "eV")));
    }

    private static ModelDocument withPool(Parameter... added) {
        List<Parameter> pool = new ArrayList<>(POOL);
        pool.addAll(List.of(added));
        return sound().withParameters(pool);
    }

    private static ModelDocument withTerm(Term term) {
        return sound().withModels(List.of(Model.of("m", List.of(Curve.of("ground", List.of(term))))));
    }

    private static ModelDocument withDatum(Datum datum) {
        return sound().withData(List.of(datum));
    }

    private static Term family(String id, Map<String, Argument> arguments) {
        return new FamilyTerm(TermFrame.named("t"), id, arguments);
    }

    private static Parameter tied(String name, String formula) {
        return new Parameter(name, "eV", "", new ParameterShape.Tied(formula));
    }

    private static Datum good() {
        return sound().data().get(0);
    }

    @Test
    void soundDocumentHasNoFault() {
        assertThat(ModelCheck.problems(sound())).isEmpty();
        ModelCheck.require(sound());
    }

    static Stream<Arguments> faults() {
        Body muon = new Body("", new BodyMass.Catalogued("moun"), ExactNumber.ONE, 1);
        Body quark = new Body("", new BodyMass.FromParameter("w"), ExactNumber.ONE, 1);
        Body strange = new Body("", new BodyMass.FromParameter("k"), ExactNumber.ONE, 1);
        PairSystem h = hydrogens().get(0);
        PairSystem twins = new PairSystem(
                "H",
                "",
                h.first(),
                h.second(),
                h.massConvention(),
                ExchangeSymmetry.IDENTICAL_FERMIONS,
                ExactNumber.ONE,
                null);
        return Stream.of(
                Arguments.of("unit system", withUnits("ev-nm"), "/units", "the unit system 'ev-nm' is not known"),
                Arguments.of(
                        "same parameter twice",
                        withPool(fixed("k", "eV nm", "1")),
                        "/parameters/2",
                        "there are two of the parameter 'k'"),
                Arguments.of(
                        "unit of a parameter",
                        withPool(fixed("c", "eW", "1")),
                        "/parameters/2/unit",
                        "the unit 'eW' is not known"),
                Arguments.of("tie with a fault", withPool(tied("c", "2*")), "/parameters/2, column 3", ""),
                Arguments.of(
                        "tie to nothing",
                        withPool(tied("c", "2*q")),
                        "/parameters/2",
                        "the parameter 'q' is not in the pool"),
                Arguments.of("tie with r", withPool(tied("c", "2*r")), "/parameters/2", "the tie of 'c' uses r"),
                Arguments.of(
                        "circular tie",
                        withPool(tied("c", "d + 1"), tied("d", "2*c")),
                        "/parameters/2",
                        "the parameter 'c' is tied to itself"),
                Arguments.of(
                        "scaled by nothing",
                        withPool(new Parameter(
                                "c", "eV", "", new ParameterShape.MassScaled(Setting.fixed(number("1")), "T", 1))),
                        "/parameters/2",
                        "the pair system 'T' does not exist"),
                Arguments.of(
                        "unknown particle",
                        sound().withSystems(List.of(PairSystem.of("H", muon, muon))),
                        "/systems/0/first/mass",
                        "the particle 'moun' is not known"),
                Arguments.of(
                        "mass of a wrong unit",
                        sound().withSystems(List.of(PairSystem.of("H", quark, strange))),
                        "/systems/0/second/mass",
                        "the unit 'eV nm' of the parameter 'k' does not fit here"),
                Arguments.of(
                        "unknown family",
                        withTerm(family("coulom", Map.of())),
                        "/models/0/curves/0/terms/0/family",
                        "the family of potentials 'coulom' is not known"),
                Arguments.of(
                        "missing argument",
                        withTerm(family("coulomb", Map.of())),
                        "/models/0/curves/0/terms/0/arguments",
                        "the family 'coulomb' needs a value for 'strength'"),
                Arguments.of(
                        "argument of a wrong unit",
                        withTerm(family("coulomb", Map.of("strength", Argument.named("w")))),
                        "/models/0/curves/0/terms/0/arguments/strength",
                        "the unit 'eV' of the parameter 'w' does not fit here"),
                Arguments.of(
                        "argument too many",
                        withTerm(family("coulomb", Map.of("strength", Argument.named("k"), "range", Argument.of(1)))),
                        "/models/0/curves/0/terms/0/arguments/range",
                        "the family 'coulomb' has no parameter 'range'"),
                Arguments.of(
                        "unknown name in a formula",
                        sound().withModels(List.of(model("m", "-q/r"))),
                        "/models/0/curves/0/terms/0/formula",
                        "the parameter 'q' is not in the pool"),
                Arguments.of(
                        "mistyped formula",
                        sound().withModels(List.of(model("m", "-k//r"))),
                        "/models/0/curves/0/terms/0/formula, column 4",
                        ""),
                Arguments.of(
                        "range of a wrong unit",
                        withTerm(family("coulomb", Map.of("strength", Argument.named("k")))
                                .withFrame(TermFrame.named("t").withRange(Argument.named("w"), Argument.UNBOUNDED))),
                        "/models/0/curves/0/terms/0/from",
                        "the unit 'eV' of the parameter 'w' does not fit here"),
                Arguments.of(
                        "energy origin",
                        sound().withModels(List.of(Model.of(
                                "m",
                                List.of(sound().models()
                                        .get(0)
                                        .curves()
                                        .get(0)
                                        .withEnergyOrigin(Argument.named("k")))))),
                        "/models/0/curves/0/energyOrigin",
                        "the unit 'eV nm' of the parameter 'k' does not fit here"),
                Arguments.of(
                        "model error of no group",
                        sound().withModels(List.of(sound().models()
                                .get(0)
                                .withError(new ModelError(List.of(new ModelError.Part(
                                        "far", ModelError.Measure.RELATIVE, number("0.1"), "", false)))))),
                        "/models/0/error",
                        "the model error names the data group 'far'"),
                Arguments.of(
                        "no such system",
                        withDatum(energy("n1", level("Hd", 0, 0), 1, "eV", 1)),
                        "/data/0/levels/0",
                        "the pair system 'Hd' does not exist"),
                Arguments.of(
                        "no such curve",
                        withDatum(good().withLevels(
                                        List.of(new Datum.Contribution(
                                                ExactNumber.ONE,
                                                new LevelKey("H", "excited", ChannelKey.ofOrbital(0), 0))),
                                        List.of())),
                        "/data/0/levels/0",
                        "no model has a curve 'excited'"),
                Arguments.of(
                        "unit of a datum",
                        withDatum(energy("n1", level("H", 0, 0), 1, "nm", 1)),
                        "/data/0/unit",
                        "the unit 'nm' does not fit here"),
                Arguments.of(
                        "frequency in eV",
                        withDatum(line("n1", level("H", 0, 1), level("H", 0, 0), Transform.FREQUENCY, 1, "eV", 1)),
                        "/data/0/unit",
                        "a frequency needs a unit like MHz"),
                Arguments.of(
                        "no such group",
                        withDatum(good().withGroups(List.of("h"))),
                        "/data/0/groups",
                        "the data group 'h' does not exist"),
                Arguments.of(
                        "group of another unit",
                        withDatum(
                                line("n1", level("H", 0, 1), level("H", 0, 0), Transform.VACUUM_WAVELENGTH, 1, "nm", 1)
                                        .withGroups(List.of("g"))),
                        "/data/0/groups",
                        "cannot be added to the datum 'n1'"),
                Arguments.of(
                        "photon of one level",
                        withDatum(good().withTransform(Transform.PHOTON_EMISSION, Datum.Detail.STANDARD, "eV")),
                        "/data/0/levels",
                        "a photon belongs to one upper level"),
                Arguments.of(
                        "identical fermions",
                        sound().withSystems(List.of(twins))
                                .withData(List.of(good().withLevels(
                                                List.of(new Datum.Contribution(
                                                        ExactNumber.ONE,
                                                        new LevelKey("H", "ground", ChannelKey.ofSpins(0, 2, 2), 0))),
                                                List.of()))),
                        "/data/0/levels/0",
                        "identical bodies have no level with l = 0, S = 1"));
    }

    private static ModelDocument withUnits(String units) {
        return sound().withUnits(units);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("faults")
    void findsTheFaultWithItsPlace(String name, ModelDocument document, String where, String what) {
        List<Problem> problems = ModelCheck.problems(document);
        assertThat(problems).as(name).hasSizeBetween(1, 2);
        assertThat(problems.get(0).where()).isEqualTo(where);
        assertThat(problems.get(0).what()).contains(what);
        assertThat(problems.get(0).sentence()).doesNotContain("\n");
        assertThatThrownBy(() -> ModelCheck.require(document)).isInstanceOf(InvalidModelException.class);
    }

    @Test
    void recordsRefuseWhatTheyCanKnowThemselves() {
        assertThatThrownBy(() -> energy("n", level("H", 0, 0), 1, "eV", 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("a sigma must be positive");
        assertThatThrownBy(() -> new Setting(number("2"), true, number("3"), null, null))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("outside its bounds");
        assertThatThrownBy(() -> fixed("2k", "", "1")).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new DataGroup("g", "", DataGroup.Kind.ADDITIVE, null, "eV"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("needs a sigma");
        assertThatThrownBy(() -> new Prior(number("1"), number("0"))).isInstanceOf(IllegalArgumentException.class);
    }
}
