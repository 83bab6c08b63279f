package org.wellwright.solver.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.wellwright.solver.fit.Documents.document;
import static org.wellwright.solver.fit.Documents.energy;
import static org.wellwright.solver.fit.Documents.fixed;
import static org.wellwright.solver.fit.Documents.free;
import static org.wellwright.solver.fit.Documents.hydrogens;
import static org.wellwright.solver.fit.Documents.level;
import static org.wellwright.solver.fit.Documents.line;
import static org.wellwright.solver.fit.Documents.model;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.wellwright.solver.PublishedDigits;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.observable.StandardAir;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.radial.SolveMonitor;

/** What models say of data, and their ranking. */
class ModelComparerTest {
    private static final SolveMonitor QUIET = SolveMonitor.NONE;

    /** Lines and levels of the point Coulomb force, with the strength that the system's charges give. */
    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "coulomb-lines.csv", numLinesToSkip = 2)
    void coulombLinesAgreeWithTheRecomputedOnes(
            String id,
            String quantity,
            String value,
            String unit,
            int digits,
            String source,
            String provenance,
            String pair,
            int upper,
            int lower,
            Transform transform) {
        PairSystem system = ParticleCatalogue.STANDARD.pair(pair);
        Datum datum = lower == 0
                ? energy(id, level(pair, 0, upper - 1), Double.parseDouble(value), unit, 1)
                : line(
                        id,
                        level(pair, 0, upper - 1),
                        level(pair, 0, lower - 1),
                        transform,
                        Double.parseDouble(value),
                        unit,
                        1);
        ModelDocument document = document(
                "eV-nm", List.of(system), List.of(), List.of(model("m", "-coulomb/r")), List.of(datum), List.of());
        Comparison comparison = ModelComparer.compare(document, new HydrogenicSource(), QUIET);
        ResidualRow row = comparison.models().get(0).rows().get(0);
        assertThat(row.problem()).isNull();
        PublishedDigits.assertAgree(id, row.predicted(), value, digits);
    }

    @Test
    void ranksByCriterionAndNamesTheWorstDatum() {
        List<Parameter> pool = List.of(fixed("good", "eV nm", "1.44"), free("poor", "eV nm", "1.40"));
        List<Datum> data = List.of(
                energy("n1", level("H", 0, 0), -13.6, "eV", 0.1),
                energy("n2", level("H", 0, 1), -3.4, "eV", 0.1),
                energy("n3", level("H", 0, 2), -1.51, "eV", 0.1));
        Comparison comparison = ModelComparer.compare(
                document(
                        "eV-nm",
                        hydrogens(),
                        pool,
                        List.of(model("worse", "-poor/r"), model("better", "-good/r")),
                        data,
                        List.of()),
                new HydrogenicSource(),
                QUIET);
        assertThat(comparison.models()).extracting(ModelComparison::model).containsExactly("better", "worse");
        assertThat(comparison.models()).extracting(ModelComparison::rank).containsExactly(1, 2);
        ModelComparison worse = comparison.models().get(1);
        assertThat(worse.worstDatum()).isEqualTo("n1");
        assertThat(worse.commonCriterion()).isCloseTo(worse.quality().chiSquare() + 2, within(1e-9));
        assertThat(worse.quality().degreesOfFreedom()).isEqualTo(2);
        double sum = worse.rows().stream()
                .mapToDouble(row -> row.residual() * row.residual())
                .sum();
        assertThat(worse.quality().chiSquare()).isCloseTo(sum, within(1e-9));
        assertThat(comparison.commonData()).isEqualTo(3);
    }

    @Test
    void modelThatPredictsFewerDataComesLastAndSaysWhich() {
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.0"));
        List<Datum> data = List.of(
                energy("n1", level("H", 0, 0), -13.6, "eV", 0.1),
                new Datum(
                        "absent",
                        List.of(Documents.times("1", new LevelKey("H", "second", ChannelKey.ofOrbital(0), 0))),
                        List.of(),
                        Transform.NONE,
                        Datum.Detail.STANDARD,
                        Documents.number("-6.5"),
                        "eV",
                        Documents.number("0.1"),
                        Documents.number("0.1"),
                        Datum.Limit.NONE,
                        List.of(),
                        "",
                        true,
                        ""));
        Model two = Model.of(
                "two",
                List.of(
                        Documents.curve("-k/r", Argument.ZERO),
                        Documents.curve("-k/r", Argument.ZERO).withName("second")));
        Comparison comparison = ModelComparer.compare(
                document("eV-nm", hydrogens(), pool, List.of(model("one", "-1.44/r"), two), data, List.of()),
                new HydrogenicSource(),
                QUIET);
        assertThat(comparison.models()).extracting(ModelComparison::model).containsExactly("two", "one");
        assertThat(comparison.commonData()).isEqualTo(1);
        assertThat(comparison.models().get(1).problems())
                .singleElement()
                .satisfies(problem -> assertThat(problem.sentence())
                        .contains("the datum 'absent' has no prediction")
                        .contains("there is no curve 'second'"));
    }

    @Test
    void airWavelengthOfTheSodiumLinesAgreesWithTheHandbook() {
        // Na I 3p levels (NIST ASD, Sansonetti 2008): 16956.17025 and 16973.36619 cm^-1; air wavelengths 589.592424 and
        // 588.995095 nm (NIST ASD; values from memory).
        assertThat(air(16956.17025)).isCloseTo(589.592424, within(2e-6));
        assertThat(air(16973.36619)).isCloseTo(588.995095, within(2e-6));
    }

    private static double air(double wavenumber) {
        double vacuum = 1e7 / wavenumber;
        return vacuum / StandardAir.index(vacuum);
    }
}
