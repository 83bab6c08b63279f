package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelCheck;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ModelError;
import org.wellwright.solver.model.ParameterPool;
import org.wellwright.solver.model.PoolNumber;
import org.wellwright.solver.model.Prior;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * Puts all models of a document beside its data at the values of the document, with group errors at their best, and
 * ranks them.
 *
 * <p>The rank follows χ² + 2k where σ is known (Akaike 1974), and N ln(χ²/N) + 2k + 2k(k + 1)/(N − k − 1) where its
 * scale is not (Hurvich and Tsai 1989), over the data that all models predict.
 */
public final class ModelComparer {
    private final ModelDocument document;
    private final SpectrumSource source;
    private final SolveMonitor monitor;
    private final ParameterPool pool;

    private ModelComparer(ModelDocument document, SpectrumSource source, SolveMonitor monitor) {
        this.document = document;
        this.source = source;
        this.monitor = monitor;
        this.pool = ParameterPool.of(document);
    }

    /**
     * Compares.
     *
     * @throws org.wellwright.solver.InvalidModelException if the document is faulty; a fault of one model alone is kept
     *     with it
     * @throws CancellationException if the monitor says so
     */
    public static Comparison compare(ModelDocument document, SpectrumSource source, SolveMonitor monitor) {
        ModelCheck.require(document);
        return new ModelComparer(document, source, monitor).run();
    }

    /** What one model says of all data. */
    private record Judged(
            String model,
            FitObjective.Setup setup,
            Weights weights,
            List<Quantity> quantities,
            int free,
            double priorSquares,
            int priors,
            List<Problem> doubts) {}

    private Comparison run() {
        List<Judged> judged = new ArrayList<>();
        List<ModelComparison> unusable = new ArrayList<>();
        for (int m = 0; m < document.models().size(); m++) {
            if (monitor.cancelled()) {
                throw new CancellationException("the comparison was cancelled");
            }
            Model model = document.models().get(m);
            monitor.progress((double) m / document.models().size(), "model " + model.name());
            try {
                judged.add(judge(model));
            } catch (WellwrightException fault) {
                unusable.add(unusable(model, fault.problem()));
            }
        }
        List<Integer> common = common(judged);
        List<ModelComparison> compared = new ArrayList<>();
        for (Judged one : judged) {
            compared.add(compare(one, common));
        }
        compared.addAll(unusable);
        // Stable: equal models keep the order of the document.
        compared.sort(Comparator.<ModelComparison>comparingInt(c -> -c.quality().observations())
                .thenComparingDouble(c -> Double.isNaN(c.commonCriterion()) ? Double.MAX_VALUE : c.commonCriterion()));
        List<ModelComparison> ranked = new ArrayList<>();
        for (ModelComparison one : compared) {
            ranked.add(one.withRank(ranked.size() + 1));
        }
        return new Comparison(document.weighting(), ranked, common.size());
    }

    private Judged judge(Model model) {
        Assembly assembly = Assembly.of(document, model.name(), pool);
        DataModel says = new DataModel(assembly);
        double[] values = pool.typedValues();
        LevelTable table = LevelTable.solve(assembly, LevelDemand.forData(document.data()), values, source, monitor);
        List<Quantity> quantities = new ArrayList<>();
        for (Datum datum : document.data()) {
            quantities.add(says.quantity(datum, table, values));
        }
        Weights weights = Weights.of(document.data(), model.error(), document.weighting(), says, pool.units());
        List<Integer> rows = new ArrayList<>();
        for (int i = 0; i < quantities.size(); i++) {
            boolean weighed = weights.sigma(i, true) > 0 && weights.sigma(i, false) > 0;
            if (document.data().get(i).used() && quantities.get(i).found() && weighed) {
                rows.add(i);
            }
        }
        boolean[] used =
                LevelTable.dependencies(assembly, LevelDemand.forData(DataModel.used(document.data())), values);
        int free = 0;
        int priors = 0;
        double squares = 0;
        for (int i = 0; i < used.length; i++) {
            PoolNumber number = pool.numbers().get(i);
            if (used[i] && number.setting().free()) {
                free++;
                Prior prior = number.setting().prior();
                if (prior != null) {
                    priors++;
                    double residual =
                            (prior.value().value() - values[i]) / prior.sigma().value();
                    squares += residual * residual;
                }
            }
        }
        List<Double> base = Arrays.stream(values).boxed().toList();
        FitObjective.Setup setup = new FitObjective.Setup(
                assembly,
                says,
                document.data(),
                GroupErrors.of(document, pool.units()),
                rows,
                List.of(),
                List.of(),
                base);
        return new Judged(model.name(), setup, weights, quantities, free, squares, priors, table.doubts());
    }

    private static List<Integer> common(List<Judged> judged) {
        if (judged.isEmpty()) {
            return List.of();
        }
        List<Integer> common = new ArrayList<>(judged.get(0).setup().rows());
        for (Judged one : judged) {
            common.retainAll(new HashSet<>(one.setup().rows()));
        }
        return common;
    }

    private ModelComparison compare(Judged one, List<Integer> common) {
        Reweighting own = groupErrors(one, one.setup().rows());
        double[] b = own.point();
        double[] unknown = new double[document.data().size()];
        Arrays.fill(unknown, Double.NaN);
        List<ResidualRow> rows = RowReport.rows(one.setup(), one.weights(), one.quantities(), b, unknown);
        FitQuality quality = quality(one, own, one.setup().rows().size(), rows);
        Reweighting shared = common.equals(one.setup().rows()) ? own : groupErrors(one, common);
        double criterion = criterion(quality(one, shared, common.size(), rows));
        List<GroupError> errors = new ArrayList<>();
        for (int k = 0; k < b.length; k++) {
            errors.add(new GroupError(
                    one.setup().groups().group(k).id(),
                    b[k],
                    Math.sqrt(own.linearization().covariance(k, k)),
                    one.setup().groups().group(k).unit()));
        }
        List<Problem> problems = new ArrayList<>(one.doubts());
        for (ResidualRow row : rows) {
            if (row.problem() != null) {
                problems.add(new Problem(
                        "the datum '%s' has no prediction: %s"
                                .formatted(row.datum(), row.problem().what()),
                        row.problem().where(),
                        row.problem().remedy()));
            }
        }
        return new ModelComparison(one.model(), 1, quality, criterion, rows, worst(rows), errors, problems);
    }

    private Reweighting groupErrors(Judged one, List<Integer> rows) {
        FitObjective.Setup setup = new FitObjective.Setup(
                one.setup().assembly(),
                one.setup().model(),
                one.setup().data(),
                one.setup().groups(),
                rows,
                List.of(),
                List.of(),
                one.setup().base());
        List<Quantity> quantities = rows.stream().map(one.quantities()::get).toList();
        Reweighting search = new Reweighting(setup, values -> quantities, FitRequest.STANDARD_ITERATIONS);
        search.run(one.weights(), new double[setup.variables()], Weighting.KNOWN, ModelError.NONE, 1);
        return search;
    }

    private FitQuality quality(Judged one, Reweighting search, int data, List<ResidualRow> rows) {
        double sum = one.priorSquares() + search.minimum().evaluation().sumOfSquares();
        int observations = data + one.priors() + one.setup().knownGroups().size();
        int adjusted = one.free() + one.setup().groups().count();
        boolean missing = document.weighting() == Weighting.MISSING;
        return new FitQuality(sum, observations, adjusted, missing ? Double.NaN : RowReport.logLikelihood(rows));
    }

    private double criterion(FitQuality quality) {
        if (document.weighting() == Weighting.KNOWN) {
            return quality.criterion();
        }
        double n = quality.observations();
        double k = quality.adjusted();
        if (!(n - k - 1 > 0)) {
            return Double.NaN;
        }
        return n * Math.log(quality.chiSquare() / n) + 2 * k + 2 * k * (k + 1) / (n - k - 1);
    }

    private static String worst(List<ResidualRow> rows) {
        String worst = "";
        double largest = -1;
        for (ResidualRow row : rows) {
            if (row.used() && Math.abs(row.residual()) > largest) {
                largest = Math.abs(row.residual());
                worst = row.datum();
            }
        }
        return worst;
    }

    private ModelComparison unusable(Model model, Problem problem) {
        FitQuality none = new FitQuality(Double.NaN, 0, 0, Double.NaN);
        List<ResidualRow> rows = document.data().stream()
                .map(datum -> new ResidualRow(
                        datum.id(),
                        datum.value().value(),
                        Double.NaN,
                        Double.NaN,
                        0,
                        Double.NaN,
                        Double.NaN,
                        datum.unit(),
                        false,
                        problem))
                .toList();
        return new ModelComparison(model.name(), 1, none, Double.NaN, rows, "", List.of(), List.of(problem));
    }
}
