package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelCheck;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.PoolNumber;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * Fits one model: prepares the residuals, searches the minimum, estimates the scale of σ or σ_mod where asked, and
 * reports.
 *
 * <p>Where σ is known up to a scale (or missing), the scale is s² = Σ r²/(N − Σ h) over the data, with h the leverage
 * of each datum: χ²/ν where there are no priors, and with priors weighing as stated. A fitted σ_mod maximises −½ Σ
 * [r²/σ² + ln σ²].
 */
public final class ModelFit {
    private static final int MOST_REWEIGHTINGS = 100;

    private final FitRequest request;
    private final ModelDocument document;
    private final SolveMonitor monitor;
    private final Assembly assembly;
    private final DataModel model;
    private final List<PoolNumber> numbers;
    private final List<Problem> remarks = new ArrayList<>();
    private final SolvedPoints solved;

    private ModelFit(FitRequest request, SpectrumSource source, SolveMonitor monitor) {
        this.request = request;
        this.document = request.document();
        this.monitor = monitor;
        this.assembly = Assembly.of(document, request.model());
        this.model = new DataModel(assembly);
        this.numbers = assembly.pool().numbers();
        this.solved = new SolvedPoints(assembly, source, monitor);
    }

    /**
     * Fits.
     *
     * @throws InvalidModelException if the document is faulty, a used datum names a missing level, or the data do not
     *     determine the free numbers; says what to add
     * @throws org.wellwright.solver.SolverException if the search cannot go on
     * @throws CancellationException if the monitor says so
     */
    public static FitResult fit(FitRequest request, SpectrumSource source, SolveMonitor monitor) {
        ModelCheck.require(request.document());
        return new ModelFit(request, source, monitor).run();
    }

    private FitResult run() {
        Weights weights = Weights.of(
                document.data(),
                assembly.model().error(),
                document.weighting(),
                model,
                assembly.pool().units());
        FitObjective.Setup setup = setup(weights);
        refuseTooFew(setup);
        double[] x = start(setup);
        FitObjective.QuantitySource quantities = values -> usedQuantities(setup, values);
        ResidualFunction.Evaluation first = new FitObjective(setup, weights, quantities).evaluate(x);
        if (!first.possible()) {
            throw new InvalidModelException(first.problem());
        }
        Reweighting search = new Reweighting(setup, quantities, request.maximumIterations());
        search.run(weights, x, document.weighting(), assembly.model().error(), MOST_REWEIGHTINGS);
        refuseFlat(setup, search.columns(), search.linearization());
        if (!search.converged()) {
            remarks.add(new Problem(
                    "the fit did not reach a minimum in %d steps".formatted(request.maximumIterations()),
                    "",
                    "start closer to the solution or allow more steps"));
        }
        return new FitReport(request, assembly, model, setup, search, solved, remarks).result();
    }

    /** Chooses the rows and the free numbers. */
    private FitObjective.Setup setup(Weights weights) {
        List<Integer> rows = new ArrayList<>();
        List<Datum> counted = new ArrayList<>();
        for (int i = 0; i < document.data().size(); i++) {
            Datum datum = document.data().get(i);
            if (!datum.used()) {
                continue;
            }
            if (!(weights.sigma(i, true) > 0) || !(weights.sigma(i, false) > 0)) {
                leaveOut(datum);
                continue;
            }
            rows.add(i);
            counted.add(datum);
        }
        if (rows.isEmpty()) {
            throw new InvalidModelException(
                    "there is no datum to fit to", "", "add measured levels or lines, or mark some as used");
        }
        double[] typed = assembly.pool().typedValues();
        boolean[] used = LevelTable.dependencies(assembly, LevelDemand.forData(counted), typed);
        List<Integer> free = new ArrayList<>();
        List<Integer> priors = new ArrayList<>();
        List<Double> base = new ArrayList<>();
        for (int i = 0; i < numbers.size(); i++) {
            base.add(typed[i]);
            if (numbers.get(i).setting().free() && used[i]) {
                if (numbers.get(i).setting().prior() != null) {
                    priors.add(free.size());
                }
                free.add(i);
            }
        }
        GroupErrors groups = GroupErrors.of(document, assembly.pool().units());
        return new FitObjective.Setup(assembly, model, document.data(), groups, rows, free, priors, base);
    }

    private void leaveOut(Datum datum) {
        if (datum.limit() == Datum.Limit.NONE) {
            throw new InvalidModelException(
                    "the datum '%s' has no sigma that it could be weighed by".formatted(datum.id()),
                    "",
                    "give it one or do not use it");
        }
        remarks.add(new Problem(
                "the limit '%s' has no sigma and does not enter the fit".formatted(datum.id()),
                "",
                "give it a sigma to let it act"));
    }

    private void refuseTooFew(FitObjective.Setup setup) {
        int known = setup.rows().size()
                + setup.priors().size()
                + setup.knownGroups().size();
        int wanted = setup.variables();
        if (wanted > known) {
            throw new InvalidModelException(
                    "the fit has %d free numbers and only %d data and priors".formatted(wanted, known),
                    "",
                    "add %d more data or priors, or fix some of %s"
                            .formatted(wanted - known, String.join(", ", names(setup))));
        }
    }

    private static List<String> names(FitObjective.Setup setup) {
        List<String> names = new ArrayList<>();
        for (int j = 0; j < setup.free().size(); j++) {
            names.add(setup.number(j).name());
        }
        for (int k = 0; k < setup.groups().count(); k++) {
            names.add("group " + setup.groups().group(k).id());
        }
        return names;
    }

    private void refuseFlat(FitObjective.Setup setup, List<Integer> columns, Linearization linear) {
        if (linear.flat().isEmpty()) {
            return;
        }
        List<String> all = names(setup);
        List<String> members = linear.flat().get(0).stream()
                .map(position -> all.get(columns.get(position)))
                .toList();
        if (members.size() == 1) {
            throw new InvalidModelException(
                    "no used datum tells anything of '%s'".formatted(members.get(0)),
                    "",
                    "fix it, give it a prior, or add a datum that depends on it");
        }
        throw new InvalidModelException(
                "the data determine only a combination of %s".formatted(String.join(", ", members)),
                "",
                "fix one of them, give one a prior, or add a datum that tells them apart");
    }

    private double[] start(FitObjective.Setup setup) {
        double[] x = new double[setup.variables()];
        for (int j = 0; j < setup.free().size(); j++) {
            x[j] = setup.base().get(setup.free().get(j));
        }
        return x;
    }

    private List<Quantity> usedQuantities(FitObjective.Setup setup, double[] values) {
        if (monitor.cancelled()) {
            throw new CancellationException("the fit was cancelled");
        }
        List<Datum> counted = setup.rows().stream().map(setup.data()::get).toList();
        LevelTable table = solved.at(values, LevelDemand.forData(counted));
        List<Quantity> quantities = new ArrayList<>();
        for (Datum datum : counted) {
            quantities.add(model.quantity(datum, table, values));
        }
        return quantities;
    }

    /** The levels of all data and of the predictions asked for. */
    static LevelDemand everything(FitRequest request) {
        return LevelDemand.forData(request.document().data()).plus(request.predict());
    }
}
