package org.wellwright.solver.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
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
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ModelError;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Prior;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.units.UnitSystem;

/** The arithmetic of fits, on closed-form levels. */
class ModelFitTest {
    private static final List<Parameter> STRENGTH_AND_ORIGIN =
            List.of(free("k", "eV nm", "1.2"), free("origin", "eV", "0.3"));

    private static Model shifted() {
        return Model.of("shifted", List.of(Documents.curve("-k/r", Argument.named("origin"))));
    }

    private static FitResult fit(ModelDocument document) {
        return ModelFit.fit(
                FitRequest.of(document, document.models().get(0).name()), new HydrogenicSource(), SolveMonitor.NONE);
    }

    /**
     * Levels n = 1…count with l = 0 of "H", made from k = 1.44 eV nm and an origin of 0.05 eV, plus the errors given.
     */
    private static List<Datum> levels(double sigma, double... errors) {
        double kinetic = UnitSystem.EV_NM.kineticFactor() / hydrogens().get(0).reducedMass(UnitSystem.EV_NM);
        List<Datum> data = new ArrayList<>();
        for (int i = 0; i < errors.length; i++) {
            double exact = -1.44 * 1.44 / (4 * kinetic * (i + 1) * (i + 1)) + 0.05;
            data.add(energy("n" + (i + 1), level("H", 0, i), exact + errors[i], "eV", sigma));
        }
        return data;
    }

    private static ModelDocument shiftedDocument(List<Datum> data) {
        return document("eV-nm", hydrogens(), STRENGTH_AND_ORIGIN, List.of(shifted()), data, List.of());
    }

    private static FittedParameter parameter(FitResult result, String name) {
        return result.parameters().stream()
                .filter(p -> p.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void recoversNoiseFreeParameters() {
        FitResult result = fit(shiftedDocument(levels(1e-3, 0, 0, 0, 0, 0)));
        assertThat(parameter(result, "k").value()).isCloseTo(1.44, within(1e-12));
        assertThat(parameter(result, "origin").value()).isCloseTo(0.05, within(1e-12));
        assertThat(result.converged()).isTrue();
        assertThat(result.quality().chiSquare()).isLessThan(1e-20);
        assertThat(result.quality().degreesOfFreedom()).isEqualTo(3);
    }

    @Test
    void fittedDocumentHoldsTheFittedValuesAndKeepsEverythingElseAsTyped() {
        ModelDocument before = shiftedDocument(levels(1e-3, 0, 0, 0));
        FitResult result = fit(before);
        ParameterShape.Scalar fitted =
                (ParameterShape.Scalar) result.document().parameters().get(0).shape();
        assertThat(fitted.setting().value().value())
                .isEqualTo(parameter(result, "k").value());
        assertThat(result.document().data()).isEqualTo(before.data());
        assertThat(fit(result.document()).document()).isEqualTo(result.document());
    }

    @Test
    void originAloneIsTheWeightedMean() {
        // With k fixed at its true value the origin is a weighted mean: closed form for value, sigma and chi-square.
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.44"), free("origin", "eV", "0"));
        List<Datum> data = new ArrayList<>(levels(0.01, 0.013, -0.004));
        data.add(levels(0.02, 0, 0, 0.031).get(2));
        FitResult result = fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), data, List.of()));
        double weight = 2 / 1e-4 + 1 / 4e-4;
        double mean = ((0.013 - 0.004) / 1e-4 + 0.031 / 4e-4) / weight;
        FittedParameter origin = parameter(result, "origin");
        assertThat(origin.value()).isCloseTo(0.05 + mean, within(1e-12));
        assertThat(origin.sigma()).isCloseTo(Math.sqrt(1 / weight), within(1e-12));
        double chi = square((0.013 - mean) / 0.01) + square((-0.004 - mean) / 0.01) + square((0.031 - mean) / 0.02);
        assertThat(result.quality().chiSquare()).isCloseTo(chi, within(1e-9));
        assertThat(result.rows().get(0).predictedSigma()).isCloseTo(origin.sigma(), within(1e-12));
    }

    @Test
    void priorCountsAsADatum() {
        Setting prior = new Setting(number("0"), true, null, null, new Prior(number("0.1"), number("0.02")));
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.44"), Parameter.scalar("origin", "eV", prior));
        FitResult result =
                fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), levels(0.01, 0.013), List.of()));
        double weight = 1 / 1e-4 + 1 / 4e-4;
        assertThat(parameter(result, "origin").value()).isCloseTo((0.063 / 1e-4 + 0.1 / 4e-4) / weight, within(1e-12));
        assertThat(parameter(result, "origin").sigma()).isCloseTo(Math.sqrt(1 / weight), within(1e-12));
        assertThat(result.quality().degreesOfFreedom()).isEqualTo(1);
    }

    @Test
    void unknownOffsetOfAGroupIsSolvedWithTheParameters() {
        List<Datum> data = new ArrayList<>(levels(0.001, 0, 0, 0));
        for (Datum shifted : levels(0.001, 0.2, 0.2, 0.2)) {
            data.add(shifted.withId(shifted.id() + "b").withGroups(List.of("b")));
        }
        DataGroup group = new DataGroup("b", "", DataGroup.Kind.UNKNOWN_OFFSET, null, "meV");
        FitResult result =
                fit(document("eV-nm", hydrogens(), STRENGTH_AND_ORIGIN, List.of(shifted()), data, List.of(group)));
        assertThat(parameter(result, "k").value()).isCloseTo(1.44, within(1e-10));
        assertThat(result.groupErrors().get(0).value()).isCloseTo(200, within(1e-8));
        // Two means of three equal data each: sigma of their difference, in meV.
        assertThat(result.groupErrors().get(0).sigma()).isCloseTo(Math.sqrt(2.0 / 3), within(1e-9));
        assertThat(result.rows().get(3).groupShift()).isCloseTo(0.2, within(1e-10));
    }

    @Test
    void additiveGroupErrorIsHeldByItsSigma() {
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.44"), fixed("origin", "eV", "0.05"));
        List<Datum> data = levels(0.01, 0.03).stream()
                .map(datum -> datum.withGroups(List.of("g")))
                .toList();
        DataGroup group = new DataGroup("g", "", DataGroup.Kind.ADDITIVE, number("0.02"), "eV");
        FitResult result = fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), data, List.of(group)));
        // The shift b minimises ((0.03 - b)/0.01)^2 + (b/0.02)^2, so chi-square is 0.03^2/(0.01^2 + 0.02^2).
        assertThat(result.groupErrors().get(0).value()).isCloseTo(0.03 * 4 / 5, within(1e-12));
        assertThat(result.quality().chiSquare()).isCloseTo(9e-4 / 5e-4, within(1e-9));
    }

    @Test
    void multiplicativeGroupErrorScalesThePrediction() {
        List<Parameter> pool = List.of(free("k", "eV nm", "1.4"), fixed("origin", "eV", "0"));
        List<Datum> data = new ArrayList<>();
        ModelDocument bare = document("eV-nm", hydrogens(), pool, List.of(shifted()), levels(0.01, 0, 0), List.of());
        Comparison predicted = ModelComparer.compare(bare, new HydrogenicSource(), SolveMonitor.NONE);
        for (ResidualRow row : predicted.models().get(0).rows()) {
            int index = data.size() / 2;
            data.add(energy("a" + index, level("H", 0, index), row.predicted(), "eV", 0.001));
            data.add(energy("b" + index, level("H", 0, index), 1.01 * row.predicted(), "eV", 0.001)
                    .withGroups(List.of("g")));
        }
        DataGroup group = new DataGroup("g", "", DataGroup.Kind.MULTIPLICATIVE, number("0.5"), "");
        FitResult result = fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), data, List.of(group)));
        assertThat(result.groupErrors().get(0).value()).isCloseTo(0.01, within(1e-6));
        assertThat(parameter(result, "k").value()).isCloseTo(1.4, within(1e-6));
    }

    @Test
    void boundThatHoldsIsReportedAndTheRestStillReachesItsMinimum() {
        Setting bounded = new Setting(number("0.02"), true, number("0"), number("0.04"), null);
        List<Parameter> pool = List.of(free("k", "eV nm", "1.2"), Parameter.scalar("origin", "eV", bounded));
        FitResult result =
                fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), levels(1e-3, 0, 0, 0), List.of()));
        assertThat(parameter(result, "origin").value()).isEqualTo(0.04);
        assertThat(parameter(result, "origin").bound()).isEqualTo(FittedParameter.Bound.UPPER);
        assertThat(parameter(result, "origin").sigma()).isNaN();
        assertThat(result.converged()).isTrue();
        List<Parameter> held = List.of(free("k", "eV nm", "1.2"), fixed("origin", "eV", "0.04"));
        FitResult other =
                fit(document("eV-nm", hydrogens(), held, List.of(shifted()), levels(1e-3, 0, 0, 0), List.of()));
        assertThat(parameter(result, "k").value())
                .isCloseTo(parameter(other, "k").value(), within(1e-10));
        assertThat(result.remarks()).anyMatch(remark -> remark.what().contains("'origin' ended at its upper bound"));
    }

    @Test
    void boundThatIsTouchedOnTheWayIsLetGo() {
        Setting bounded = new Setting(number("0.9"), true, number("0.04"), number("1"), null);
        List<Parameter> pool = List.of(free("k", "eV nm", "0.2"), Parameter.scalar("origin", "eV", bounded));
        FitResult result =
                fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), levels(1e-3, 0, 0, 0), List.of()));
        assertThat(parameter(result, "k").value()).isCloseTo(1.44, within(1e-10));
        assertThat(parameter(result, "origin").value()).isCloseTo(0.05, within(1e-10));
    }

    @Test
    void scaleOfSigmaIsTakenFromTheScatter() {
        double[] errors = {0.013, -0.02, 0.008, 0.011, -0.016};
        FitResult known = fit(shiftedDocument(levels(0.001, errors)));
        FitResult scaled = fit(shiftedDocument(levels(0.001, errors)).withWeighting(Weighting.KNOWN_UP_TO_SCALE));
        double factor = Math.sqrt(known.quality().reducedChiSquare());
        assertThat(scaled.sigmaScale()).isCloseTo(factor, within(1e-9 * factor));
        assertThat(parameter(scaled, "k").value())
                .isEqualTo(parameter(known, "k").value());
        assertThat(parameter(scaled, "k").sigma())
                .isCloseTo(factor * parameter(known, "k").sigma(), within(1e-12));
        assertThat(scaled.quality().chiSquare()).isEqualTo(known.quality().chiSquare());
    }

    @Test
    void missingSigmasWeighAllDataAlike() {
        double[] errors = {0.013, -0.02, 0.008, 0.011, -0.016};
        List<Datum> bare = levels(1, errors).stream()
                .map(datum -> datum.withValue(datum.value(), null, null, Datum.Limit.NONE, "eV"))
                .toList();
        FitResult missing = fit(shiftedDocument(bare).withWeighting(Weighting.MISSING));
        FitResult alike = fit(shiftedDocument(levels(0.001, errors)).withWeighting(Weighting.KNOWN_UP_TO_SCALE));
        assertThat(parameter(missing, "k").value())
                .isCloseTo(parameter(alike, "k").value(), within(1e-12));
        assertThat(parameter(missing, "k").sigma())
                .isCloseTo(parameter(alike, "k").sigma(), within(1e-12));
        assertThatThrownBy(() -> fit(shiftedDocument(bare)))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("/data/0")
                .hasMessageContaining("has no sigma");
    }

    @Test
    void scaleWithAPriorLeavesThePriorItsOwnWeight() {
        // y_i = origin + error with a prior 0 ± 0.02: at the end s² = Σ(y - m)²/(N - h), h = N w/(N w + w0), w = 1/s².
        double[] errors = {0.05, 0.02, 0.06, 0.01};
        Setting prior = new Setting(number("0"), true, null, null, new Prior(number("0.05"), number("0.02")));
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.44"), Parameter.scalar("origin", "eV", prior));
        ModelDocument document =
                document("eV-nm", hydrogens(), pool, List.of(shifted()), levels(0.001, errors), List.of());
        FitResult result = fit(document.withWeighting(Weighting.KNOWN_UP_TO_SCALE));
        double s = result.sigmaScale() * 0.001;
        double w = 1 / (s * s);
        double w0 = 1 / 4e-4;
        double mean = (w * (0.05 + 0.02 + 0.06 + 0.01)) / (4 * w + w0);
        double sum = 0;
        for (double error : errors) {
            sum += square(error - mean);
        }
        assertThat(parameter(result, "origin").value()).isCloseTo(0.05 + mean, within(1e-8));
        assertThat(s * s).isCloseTo(sum / (4 - 4 * w / (4 * w + w0)), within(1e-8));
        assertThat(parameter(result, "origin").sigma()).isCloseTo(Math.sqrt(1 / (4 * w + w0)), within(1e-8));
    }

    @Test
    void modelErrorIsFoundByMaximumLikelihood() {
        // Equal sigma_exp and one mean: sigma_mod² = mean square residual - sigma_exp², in closed form.
        double[] errors = {0.05, -0.02, 0.03, -0.06, 0.01, 0.02};
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.44"), free("origin", "eV", "0"));
        ModelError error = new ModelError(
                List.of(new ModelError.Part("", ModelError.Measure.ABSOLUTE, number("0.001"), "eV", true)));
        ModelDocument document = document(
                "eV-nm", hydrogens(), pool, List.of(shifted().withError(error)), levels(0.01, errors), List.of());
        FitResult result = fit(document);
        double mean = (0.05 - 0.02 + 0.03 - 0.06 + 0.01 + 0.02) / 6;
        double sum = 0;
        for (double e : errors) {
            sum += square(e - mean);
        }
        double expected = Math.sqrt(sum / 6 - 1e-4);
        assertThat(result.modelErrors().get(0).value()).isCloseTo(expected, within(1e-6));
        assertThat(parameter(result, "origin").sigma())
                .isCloseTo(Math.sqrt((1e-4 + expected * expected) / 6), within(1e-6));
        assertThat(result.document()
                        .models()
                        .get(0)
                        .error()
                        .parts()
                        .get(0)
                        .value()
                        .value())
                .isCloseTo(expected, within(1e-6));
    }

    @Test
    void modelErrorIsZeroWhereTheScatterIsSmallerThanSigma() {
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.44"), free("origin", "eV", "0"));
        ModelError error = new ModelError(
                List.of(new ModelError.Part("", ModelError.Measure.ABSOLUTE, number("0.001"), "eV", true)));
        FitResult result = fit(document(
                "eV-nm",
                hydrogens(),
                pool,
                List.of(shifted().withError(error)),
                levels(0.01, 0.001, -0.002, 0.001),
                List.of()));
        assertThat(result.modelErrors().get(0).value()).isZero();
    }

    @Test
    void asymmetricSigmaFollowsTheSideOfThePrediction() {
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.44"), free("origin", "eV", "0"));
        Datum low = levels(1, -0.03).get(0);
        Datum high = levels(1, 0, 0.03).get(1);
        List<Datum> data = List.of(
                low.withValue(low.value(), number("0.01"), number("0.03"), Datum.Limit.NONE, "eV"),
                high.withValue(high.value(), number("0.02"), number("0.05"), Datum.Limit.NONE, "eV"));
        FitResult result = fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), data, List.of()));
        // The low value is exceeded (its sigma+), the high one is missed from below (its sigma-).
        double weight = 1 / 9e-4 + 1 / 4e-4;
        double mean = (-0.03 / 9e-4 + 0.03 / 4e-4) / weight;
        assertThat(parameter(result, "origin").value()).isCloseTo(0.05 + mean, within(1e-10));
    }

    @Test
    void limitActsOnlyWhereItIsBroken() {
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.44"), free("origin", "eV", "0"));
        Datum value = levels(0.01, 0.02).get(0);
        Datum limit = levels(0.01, 0, 0.1).get(1);
        Datum upper = limit.withValue(limit.value(), number("0.01"), number("0.01"), Datum.Limit.UPPER, "eV");
        FitResult holds =
                fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), List.of(value, upper), List.of()));
        assertThat(parameter(holds, "origin").value()).isCloseTo(0.07, within(1e-10));
        assertThat(holds.rows().get(1).residual()).isZero();
        Datum lower = limit.withValue(limit.value(), number("0.01"), number("0.01"), Datum.Limit.LOWER, "eV");
        FitResult broken =
                fit(document("eV-nm", hydrogens(), pool, List.of(shifted()), List.of(value, lower), List.of()));
        assertThat(parameter(broken, "origin").value()).isCloseTo(0.05 + 0.06, within(1e-10));
    }

    @Test
    void predictsLevelsWithPropagatedSigma() {
        ModelDocument document = shiftedDocument(levels(0.01, 0, 0, 0, 0));
        FitRequest request = new FitRequest(document, "shifted", List.of(level("H", 0, 9), level("D", 2, 0)), 50);
        FitResult result = ModelFit.fit(request, new HydrogenicSource(), SolveMonitor.NONE);
        Covariance covariance = result.covariance();
        Prediction tenth = result.predictions().get(0);
        double slope = 2 * (tenth.energy() - 0.05) / 1.44;
        double variance = slope * slope * covariance.at(0, 0) + 2 * slope * covariance.at(0, 1) + covariance.at(1, 1);
        assertThat(tenth.parameterSigma()).isCloseTo(Math.sqrt(variance), within(1e-10));
        assertThat(covariance.names()).containsExactly("k", "origin");
        assertThat(covariance.correlation(0, 0)).isCloseTo(1, within(1e-12));
        assertThat(result.predictions().get(1).energy()).isLessThan(0);
    }

    @Test
    void refusesMoreFreeNumbersThanDataAndSaysWhatToAdd() {
        assertThatThrownBy(() -> fit(shiftedDocument(levels(0.01, 0))))
                .isInstanceOf(InvalidModelException.class)
                .hasMessage(
                        "the fit has 2 free numbers and only 1 data and priors; add 1 more data or priors, or fix some of"
                                + " k, origin");
    }

    @Test
    void refusesFlatDirectionAndNamesIt() {
        List<Parameter> pool = List.of(free("a", "eV nm", "0.7"), free("b", "eV nm", "0.6"), free("origin", "eV", "0"));
        Model sum = Model.of("sum", List.of(Documents.curve("-(a + b)/r", Argument.named("origin"))));
        assertThatThrownBy(() ->
                        fit(document("eV-nm", hydrogens(), pool, List.of(sum), levels(1e-3, 0, 0, 0, 0), List.of())))
                .isInstanceOf(InvalidModelException.class)
                .hasMessage(
                        "the data determine only a combination of a, b; fix one of them, give one a prior, or add a datum"
                                + " that tells them apart");
    }

    @Test
    void refusesParameterWithoutEffect() {
        List<Parameter> pool = List.of(free("a", "eV nm", "1.3"), free("b", "eV nm", "0.6"));
        assertThatThrownBy(() -> fit(document(
                        "eV-nm",
                        hydrogens(),
                        pool,
                        List.of(model("m", "-(a + 0*b)/r")),
                        levels(1e-3, 0, 0, 0),
                        List.of())))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("no used datum tells anything of 'b'")
                .hasMessageContaining("fix it");
    }

    @Test
    void freeNumberThatNoDatumReachesIsLeftAloneWithARemark() {
        Parameter byOrbital = new Parameter(
                "k",
                "eV nm",
                "",
                new ParameterShape.ByOrbital(
                        List.of(
                                new ParameterShape.ByOrbital.Entry(0, Setting.free(number("1.2"))),
                                new ParameterShape.ByOrbital.Entry(1, Setting.free(number("1.30")))),
                        null));
        ModelDocument document = document(
                "eV-nm", hydrogens(), List.of(byOrbital), List.of(model("m", "-k/r")), levels(1e-3, 0, 0), List.of());
        FitRequest request = new FitRequest(document, "m", List.of(level("H", 1, 0)), 50);
        FitResult result = ModelFit.fit(request, new HydrogenicSource(), SolveMonitor.NONE);
        assertThat(result.remarks())
                .anyMatch(remark -> remark.what().startsWith("'k[l=1]' is free, but no used datum"));
        assertThat(parameter(result, "k[l=1]").value()).isEqualTo(1.30);
        assertThat(result.document().parameters().get(0).shape().toString()).contains("1.30");
    }

    @Test
    void datumThatNamesAMissingLevelIsRefusedByName() {
        List<Parameter> pool = List.of(free("k", "eV nm", "-1"));
        assertThatThrownBy(() -> fit(document(
                        "eV-nm", hydrogens(), pool, List.of(model("m", "-k/r")), levels(1e-3, 0, 0), List.of())))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("the datum 'n1' has no prediction: there is no level of index 0 with l = 0")
                .hasMessageContaining("binds none");
    }

    @Test
    void searchThatIsDrivenOutOfTheBoundRegionIsRefusedClearly() {
        // The data lie above the threshold, so the least squares pull k to 0, where the level ends.
        List<Parameter> pool = List.of(free("k", "eV nm", "1"));
        List<Datum> data =
                List.of(energy("up", level("H", 0, 0), 5, "eV", 0.1), energy("up2", level("H", 0, 1), 5, "eV", 0.1));
        HydrogenicSource source = new HydrogenicSource();
        ModelDocument document =
                document("eV-nm", hydrogens(), pool, List.of(model("m", "-(k - 0.5)/r")), data, List.of());
        assertThatThrownBy(() -> ModelFit.fit(FitRequest.of(document, "m"), source, SolveMonitor.NONE))
                .isInstanceOfAny(SolverException.class, InvalidModelException.class)
                .hasMessageMatching("(?s).*('up'|'k').*");
    }

    @Test
    void wavelengthsRecoilMassesAndRatiosAreFittedToo() {
        List<Parameter> pool = List.of(free("k", "eV nm", "1.44"), free("origin", "eV", "0"));
        List<Datum> data = List.of(
                line("vac", level("H", 1, 0), level("H", 0, 0), Transform.VACUUM_WAVELENGTH, 1, "nm", 1e-4),
                line("air", level("H", 1, 1), level("H", 0, 1), Transform.NONE, 1, "cm^-1", 1e-2),
                line("air2", level("H", 0, 2), level("H", 1, 0), Transform.AIR_WAVELENGTH, 1, "nm", 1e-3),
                line("freq", level("D", 1, 1), level("D", 0, 0), Transform.FREQUENCY, 1, "THz", 1e-2),
                line("photon", level("H", 1, 0), level("H", 0, 0), Transform.PHOTON_EMISSION, 1, "eV", 1e-6),
                line("taken", level("H", 1, 0), level("H", 0, 0), Transform.PHOTON_ABSORPTION, 1, "eV", 1e-6),
                energy("mass", level("H", 0, 0), 1, "MeV", 1e-3));
        List<Datum> all = new ArrayList<>(data.subList(0, 6));
        all.add(data.get(6).withTransform(Transform.ABSOLUTE_MASS, Datum.Detail.STANDARD, "MeV"));
        all.add(new Datum(
                "ratio",
                List.of(Documents.times("1", level("H", 1, 0)), Documents.times("-1", level("H", 0, 0))),
                List.of(Documents.times("1", level("H", 0, 2)), Documents.times("-1", level("H", 0, 0))),
                Transform.RATIO,
                Datum.Detail.STANDARD,
                number("1"),
                "",
                number("1e-3"),
                number("1e-3"),
                Datum.Limit.NONE,
                List.of(),
                "",
                true,
                ""));
        ModelDocument document = document("eV-nm", hydrogens(), pool, List.of(shifted()), all, List.of());
        // l does not split the levels of the stand-in, so the second line has no energy: leave it out.
        document = document.withData(document.data().stream()
                .map(d -> d.withUsed(!d.id().equals("air")))
                .toList());
        Comparison made = ModelComparer.compare(document, new HydrogenicSource(), SolveMonitor.NONE);
        assertThat(made.models().get(0).problems()).isEmpty();
        ModelDocument exact = document.withData(Documents.withPredictedValues(document, made))
                .withParameters(List.of(free("k", "eV nm", "1.5"), free("origin", "eV", "0.2")));
        FitResult result = fit(exact);
        assertThat(parameter(result, "k").value()).isCloseTo(1.44, within(1e-10));
        assertThat(result.quality().chiSquare()).isLessThan(1e-12);
    }

    @Test
    void cancellingStopsTheFit() {
        SolveMonitor cancelled = new SolveMonitor() {
            @Override
            public void progress(double fraction, String what) {}

            @Override
            public boolean cancelled() {
                return true;
            }
        };
        ModelDocument document = shiftedDocument(levels(0.01, 0, 0, 0));
        assertThatThrownBy(() -> ModelFit.fit(FitRequest.of(document, "shifted"), new HydrogenicSource(), cancelled))
                .isInstanceOf(CancellationException.class);
    }

    @Test
    void equalRequestsGiveEqualResults() {
        ModelDocument document = shiftedDocument(levels(0.01, 0.003, -0.007, 0.012, 0.001));
        FitResult one = fit(document);
        FitResult other = fit(document);
        assertThat(one.parameters()).isEqualTo(other.parameters());
        assertThat(one.rows()).isEqualTo(other.rows());
    }

    @Test
    void needsFewSolves() {
        HydrogenicSource source = new HydrogenicSource();
        ModelDocument document = shiftedDocument(levels(0.01, 0.003, -0.007, 0.012, 0.001));
        ModelFit.fit(FitRequest.of(document, "shifted"), source, SolveMonitor.NONE);
        assertThat(source.solves()).isLessThan(25);
    }

    private static double square(double x) {
        return x * x;
    }
}
