package org.wellwright.solver.service;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.wellwright.solver.fit.Documents.document;
import static org.wellwright.solver.fit.Documents.energy;
import static org.wellwright.solver.fit.Documents.fixed;
import static org.wellwright.solver.fit.Documents.free;
import static org.wellwright.solver.fit.Documents.level;
import static org.wellwright.solver.fit.Documents.line;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.openide.util.Lookup;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.Documents;
import org.wellwright.solver.fit.FitRequest;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.FittedParameter;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.units.ExactNumber;

/** Comparison and fit as a client looks them up, on the solver that ships. */
class FitServiceTest {
    private final FitService service = Lookup.getDefault().lookup(FitService.class);

    /** Two isotopologues on one Morse curve: rovibrational lines, cm⁻¹ and Å. */
    private static ModelDocument molecule(List<Parameter> pool) {
        List<PairSystem> systems = List.of(pair("light", "12", "1.00782503"), pair("heavy", "12", "2.01410178"));
        Curve curve = Curve.of(
                "ground",
                List.of(new FamilyTerm(
                        TermFrame.named("morse"),
                        "morse",
                        Map.of(
                                "depth", Argument.named("D"),
                                "steepness", Argument.named("a"),
                                "equilibrium", Argument.named("re")))));
        List<Datum> data = new ArrayList<>();
        for (String system : List.of("light", "heavy")) {
            for (int j = 0; j < 4; j++) {
                data.add(line(
                        "R" + j + system,
                        level(system, j + 1, 1),
                        level(system, j, 0),
                        Transform.NONE,
                        1,
                        "cm^-1",
                        0.01));
                data.add(line(
                        "S" + j + system,
                        level(system, j + 1, 2),
                        level(system, j, 0),
                        Transform.NONE,
                        1,
                        "cm^-1",
                        0.02));
            }
        }
        return document("spectroscopic", systems, pool, List.of(Model.of("morse", List.of(curve))), data, List.of());
    }

    private static PairSystem pair(String id, String first, String second) {
        return PairSystem.of(id, body(first), body(second));
    }

    private static Body body(String mass) {
        return new Body("", new BodyMass.Typed(new ExactNumber(mass), null, "u"), ExactNumber.ZERO, -1);
    }

    private static double value(FitResult result, String name) {
        return parameter(result, name).value();
    }

    private static FittedParameter parameter(FitResult result, String name) {
        return result.parameters().stream()
                .filter(p -> p.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void recoversTheCurveOfTwoIsotopologuesFromNoiseFreeLines() {
        ModelDocument truth = molecule(
                List.of(fixed("D", "eV", "4.1"), fixed("a", "1/angstrom", "1.9"), fixed("re", "angstrom", "1.25")));
        Comparison made = service.compare(truth, SolveMonitor.NONE);
        assertThat(made.models().get(0).rows()).allMatch(row -> row.problem() == null);
        ModelDocument start = truth.withData(Documents.withPredictedValues(truth, made))
                .withParameters(
                        List.of(free("D", "eV", "4.4"), free("a", "1/angstrom", "1.8"), free("re", "angstrom", "1.3")));
        FitResult result = service.fit(FitRequest.of(start, "morse"), SolveMonitor.NONE);
        assertThat(result.converged()).isTrue();
        assertThat(value(result, "D")).isCloseTo(4.1, within(4.1e-9));
        assertThat(value(result, "a")).isCloseTo(1.9, within(1.9e-9));
        assertThat(value(result, "re")).isCloseTo(1.25, within(1.25e-9));
    }

    @Test
    void recoversAScreenedCoreFromNoiseFreeLevelsAndLines() {
        List<PairSystem> systems = Documents.hydrogens();
        Curve curve = Curve.of(
                        "ground",
                        List.of(new FormulaTerm(
                                TermFrame.named("core"), "-coulomb/r*(1 + q*exp(-b*r)) + w*exp(-(r/R)^2)", Map.of())))
                .withEnergyOrigin(Argument.named("limit"));
        List<Datum> data = new ArrayList<>();
        for (int l = 0; l < 3; l++) {
            for (int n = 0; n < 4; n++) {
                data.add(energy("E" + n + l, level("H", l, n), 0, "eV", 0.001));
            }
        }
        List<Parameter> exact = List.of(
                fixed("q", "", "2"),
                fixed("b", "1/nm", "14"),
                fixed("w", "eV", "-3"),
                fixed("R", "nm", "0.2"),
                fixed("limit", "eV", "5.2"));
        ModelDocument truth =
                document("eV-nm", systems, exact, List.of(Model.of("core", List.of(curve))), data, List.of());
        Comparison made = service.compare(truth, SolveMonitor.NONE);
        ModelDocument start = truth.withData(Documents.withPredictedValues(truth, made))
                .withParameters(List.of(
                        free("q", "", "1.7"),
                        free("b", "1/nm", "13"),
                        free("w", "eV", "-2"),
                        free("R", "nm", "0.23"),
                        free("limit", "eV", "5")));
        FitResult result = service.fit(FitRequest.of(start, "core"), SolveMonitor.NONE);
        for (Parameter parameter : exact) {
            double expected =
                    truth.parameters().get(exact.indexOf(parameter)).shape() instanceof ParameterShape.Scalar scalar
                            ? scalar.setting().value().value()
                            : Double.NaN;
            assertThat(value(result, parameter.name()))
                    .as(parameter.name())
                    .isCloseTo(expected, within(1e-9 * Math.abs(expected)));
        }
    }
}
