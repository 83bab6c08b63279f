package org.wellwright.solver.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.wellwright.solver.fit.Documents.document;
import static org.wellwright.solver.fit.Documents.energy;
import static org.wellwright.solver.fit.Documents.free;
import static org.wellwright.solver.fit.Documents.hydrogens;
import static org.wellwright.solver.fit.Documents.level;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.units.ExactNumber;

/**
 * Whether the stated σ covers the truth as often as it says: simulated data from a known truth with Gaussian errors and
 * a calibration offset, fitted; 68.27 % of the parameters and predictions must lie within 1 σ, 95.45 % within 2 σ.
 */
class CoverageTest {
    private static final int SETS = "full".equals(System.getProperty("wellwright.campaign")) ? 1000 : 200;
    private static final double STRENGTH = 1.44;
    private static final double ORIGIN = 0.05;

    @Test
    void oneAndTwoSigmaCoverTheTruth() {
        Model model = Model.of("m", List.of(Documents.curve("-k/r", Argument.named("origin"))));
        List<Parameter> truth = List.of(free("k", "eV nm", "1.44"), free("origin", "eV", "0.05"));
        List<Parameter> start = List.of(free("k", "eV nm", "1.3"), free("origin", "eV", "0"));
        DataGroup group = new DataGroup("g", "", DataGroup.Kind.ADDITIVE, ExactNumber.of(0.03), "eV");
        List<Datum> empty = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            Datum datum = energy("n" + i, level("H", 0, i), 0, "eV", 0.01 + 0.002 * i);
            empty.add(i % 2 == 0 ? datum : datum.withGroups(List.of("g")));
        }
        ModelDocument exact = document("eV-nm", hydrogens(), truth, List.of(model), empty, List.of(group));
        Comparison predicted = ModelComparer.compare(exact, new HydrogenicSource(), SolveMonitor.NONE);
        List<Datum> noiseFree = Documents.withPredictedValues(exact, predicted);
        double tenth = ModelFit.fit(
                        new FitRequest(exact.withData(noiseFree), "m", List.of(level("D", 0, 9)), 100),
                        new HydrogenicSource(),
                        SolveMonitor.NONE)
                .predictions()
                .get(0)
                .energy();
        Random random = new Random(20250301);
        Tally tally = new Tally();
        for (int set = 0; set < SETS; set++) {
            double offset = 0.03 * random.nextGaussian();
            List<Datum> noisy = new ArrayList<>();
            for (Datum datum : noiseFree) {
                double error = datum.sigmaPlus().value() * random.nextGaussian()
                        + (datum.groups().isEmpty() ? 0 : offset);
                noisy.add(datum.withValue(
                        ExactNumber.of(datum.value().value() + error),
                        datum.sigmaMinus(),
                        datum.sigmaPlus(),
                        Datum.Limit.NONE,
                        "eV"));
            }
            FitRequest request =
                    new FitRequest(exact.withParameters(start).withData(noisy), "m", List.of(level("D", 0, 9)), 100);
            FitResult result = ModelFit.fit(request, new HydrogenicSource(), SolveMonitor.NONE);
            tally.add(
                    result.parameters().get(0).value() - STRENGTH,
                    result.parameters().get(0).sigma());
            tally.add(
                    result.parameters().get(1).value() - ORIGIN,
                    result.parameters().get(1).sigma());
            tally.add(
                    result.groupErrors().get(0).value() - offset,
                    result.groupErrors().get(0).sigma());
            Prediction prediction = result.predictions().get(0);
            tally.add(prediction.energy() - tenth, prediction.parameterSigma());
        }
        assertThat(tally.total).isEqualTo(4 * SETS);
        assertThat(tally.within(1)).isBetween(0.61, 0.75);
        assertThat(tally.within(2)).isBetween(0.92, 0.98);
    }

    private static final class Tally {
        private int total;
        private int one;
        private int two;

        void add(double error, double sigma) {
            total++;
            one += Math.abs(error) <= sigma ? 1 : 0;
            two += Math.abs(error) <= 2 * sigma ? 1 : 0;
        }

        double within(int sigmas) {
            return (double) (sigmas == 1 ? one : two) / total;
        }
    }
}
