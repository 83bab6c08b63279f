package org.wellwright.solver.potential.family;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.EvaluatorLaws;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/** What every built-in family must obey. */
class FamilyLawsTest {
    private static final ChannelFacts CHANNEL = new ChannelFacts(1, 3, 1);

    static Stream<PotentialFamily> families() {
        return FamilyCatalogue.families().stream();
    }

    /** The suggested values times seeded factors between 0.8 and 1.25. */
    private static double[] values(PotentialFamily family, Random random) {
        return family.parameters().stream()
                .mapToDouble(parameter -> parameter.suggested() * Math.pow(1.25, 2 * random.nextDouble() - 1))
                .toArray();
    }

    private static double length(PotentialFamily family, double[] values) {
        double length = 1;
        for (int i = 0; i < values.length; i++) {
            if (family.parameters().get(i).dimension().equals(Dimension.LENGTH) && values[i] > 0) {
                length = Math.max(length, values[i]);
            }
        }
        return length;
    }

    @Test
    void theLookupFindsEveryFamily() {
        List<String> ids =
                FamilyCatalogue.families().stream().map(PotentialFamily::id).toList();
        assertThat(ids).isSorted().doesNotHaveDuplicates();
        assertThat(ids)
                .contains(
                        "coulomb",
                        "yukawa",
                        "morse",
                        "lennard-jones",
                        "harmonic",
                        "linear",
                        "power",
                        "woods-saxon",
                        "square-well");
        assertThatThrownBy(() -> FamilyCatalogue.require("coulom"))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("'coulom' is not known; use one of ")
                .hasMessageContaining("coulomb, ");
    }

    @ParameterizedTest
    @MethodSource("families")
    void isDescribed(PotentialFamily family) {
        assertThat(family.id()).matches("[a-z0-9-]+");
        assertThat(List.of(family.displayName(), family.formula(), family.validity(), family.source()))
                .noneMatch(String::isBlank);
        assertThat(family.parameters()).isNotEmpty();
        assertThat(family.parameters().stream().map(FamilyParameter::name))
                .doesNotHaveDuplicates()
                .allMatch(name -> name.matches("[a-zA-Z][a-zA-Z0-9]*"));
        for (FamilyParameter parameter : family.parameters()) {
            assertThat(parameter.meaning()).isNotBlank();
            assertThat(family.formula()).as("symbol of %s", parameter.name()).contains(parameter.symbol());
        }
    }

    @ParameterizedTest
    @MethodSource("families")
    void derivativesAgreeWithDifferences(PotentialFamily family) {
        Random random = new Random(family.id().hashCode());
        for (int i = 0; i < 10; i++) {
            double[] values = values(family, random);
            double length = length(family, values);
            EvaluatorLaws.derivativesAgreeWithDifferences(
                    p -> family.bind(p, CHANNEL), values, 0.2 * length, 4 * length, 100, random);
        }
    }

    @ParameterizedTest
    @MethodSource("families")
    void enclosuresContainSamplesAndAreSharp(PotentialFamily family) {
        Random random = new Random(family.id().hashCode() + 1);
        for (int i = 0; i < 50; i++) {
            double[] values = values(family, random);
            double length = length(family, values);
            TermEvaluator v = family.bind(values, CHANNEL);
            EvaluatorLaws.enclosuresContainSamples(v, 1e-3 * length, 1e2 * length, 10, 200, random);
            double a = length * (0.5 + random.nextDouble());
            double b = a * 1.01;
            double least = Double.POSITIVE_INFINITY;
            double most = Double.NEGATIVE_INFINITY;
            for (int k = 0; k <= 1_000; k++) {
                double value = v.value(a + (b - a) * k / 1_000);
                least = Math.min(least, value);
                most = Math.max(most, value);
            }
            double slack = 0.02 * (most - least) + 1e-12 * Math.max(Math.abs(least), Math.abs(most));
            assertThat(v.enclose(a, b).width())
                    .as("%s on [%s, %s]", v.canonical(), a, b)
                    .isLessThanOrEqualTo(most - least + slack);
        }
    }

    @ParameterizedTest
    @MethodSource("families")
    void blocksHaveTheBitsOfSingleValues(PotentialFamily family) {
        Random random = new Random(family.id().hashCode() + 2);
        EvaluatorLaws.blocksHaveTheBitsOfSingleValues(family.bind(values(family, random), CHANNEL), 1e-3, 1e3, random);
    }

    @ParameterizedTest
    @MethodSource("families")
    void behavioursHold(PotentialFamily family) {
        Random random = new Random(family.id().hashCode() + 3);
        for (int i = 0; i < 10; i++) {
            EvaluatorLaws.behavioursHold(family.bind(values(family, random), CHANNEL));
        }
    }

    @ParameterizedTest
    @MethodSource("families")
    void refusesWhatIsNotFiniteAndNamesTheParameter(PotentialFamily family) {
        double[] values = values(family, new Random(1));
        values[0] = Double.NaN;
        assertThatThrownBy(() -> family.bind(values, CHANNEL))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("'" + family.parameters().get(0).name() + "' must be finite, got NaN")
                .hasMessageStartingWith("family " + family.id());
    }

    @ParameterizedTest
    @MethodSource("families")
    void theDigestTextTellsValuesApart(PotentialFamily family) {
        double[] values = values(family, new Random(1));
        String text = family.bind(values, CHANNEL).canonical();
        assertThat(family.bind(values.clone(), CHANNEL).canonical()).isEqualTo(text);
        for (int j = 0; j < values.length; j++) {
            double[] changed = values.clone();
            changed[j] = Math.nextUp(changed[j]);
            assertThat(family.bind(changed, CHANNEL).canonical()).isNotEqualTo(text);
        }
    }
}
