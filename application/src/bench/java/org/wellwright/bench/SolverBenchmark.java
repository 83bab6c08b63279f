package org.wellwright.bench;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.openide.util.Lookup;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.steps.PerturbedStepSolver;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/**
 * The solver against methods that general-purpose libraries offer, each at the best setting found for it: a dense
 * spectral mesh (EJML), adaptive shooting (Commons Math) and 3-point differences (EJML).
 *
 * <p>Times are for all levels of a problem on one warm thread, the least of several runs. Errors are relative to ⟨T⟩ +
 * ⟨|V|⟩, against the closed form or, where there is none, against the project's second method. A column that is not
 * measured here is empty.
 */
@ServiceProvider(service = Benchmark.class, position = 200)
public final class SolverBenchmark implements Benchmark {
    private static final String HEADER =
            "problem,levels,error,ours_ms,floor_ms,enclosure_ms,proof_ms,dense_ms,dense_error,"
                    + "ode_ms,ode_error,second_ms,second_error,difference_ms,difference_error,dense_setting,ode_setting,"
                    + "difference_setting,evaluations";

    @Override
    public String name() {
        return "solver";
    }

    @Override
    public void run(Path csv, PrintStream out) throws IOException {
        SolverService service = Lookup.getDefault().lookup(SolverService.class);
        PerturbedStepSolver second = new PerturbedStepSolver();
        List<String> lines = new ArrayList<>(List.of(HEADER));
        out.printf(
                "%-15s %6s %9s %9s | %9s %9s | %9s %9s | %9s %9s | %9s %9s%n",
                "problem", "levels", "error", "ms", "second", "ms", "dense", "ms", "ODE", "ms", "3-point", "ms");
        for (BoundCase problem : BoundCase.all()) {
            SolveRequest request = SolveRequest.of(problem.problem(), problem.search());
            var spectrum = service.solve(request, SolveMonitor.NONE);
            List<Level> confirmed = second.solve(problem.problem(), problem.search(), SolveMonitor.NONE)
                    .levels();
            ReferenceTask task = new ReferenceTask(problem, confirmed);
            double ours = warm(() ->
                    service.solve(request, SolveMonitor.NONE).levels().get(0).energy());
            double other = warm(() -> second.solve(problem.problem(), problem.search(), SolveMonitor.NONE)
                    .levels()
                    .get(0)
                    .energy());
            double error = task.error(energies(spectrum.levels()));
            double otherError = problem.exact() == null ? Double.NaN : task.error(energies(confirmed));
            ReferenceResult dense = DenseSpectralMesh.best(task);
            ReferenceResult ode = OdeShooting.best(task);
            ReferenceResult difference = FiniteDifferences.best(task);
            out.printf(
                    Locale.ROOT,
                    "%-15s %6d %9.1e %9.2f | %9.1e %9.2f | %9.1e %9.1f | %9.1e %9.0f | %9.1e %9.0f%n",
                    problem.name(),
                    confirmed.size(),
                    error,
                    ours,
                    otherError,
                    other,
                    dense.error(),
                    dense.millis(),
                    ode.error(),
                    ode.millis(),
                    difference.error(),
                    difference.millis());
            lines.add(String.join(
                    ",",
                    problem.name(),
                    Integer.toString(confirmed.size()),
                    number(error),
                    number(ours),
                    "",
                    "",
                    "",
                    number(dense.millis()),
                    number(dense.error()),
                    number(ode.millis()),
                    number(ode.error()),
                    number(other),
                    number(otherError),
                    number(difference.millis()),
                    number(difference.error()),
                    quoted(dense),
                    quoted(ode),
                    quoted(difference),
                    Long.toString(spectrum.effort().evaluations())));
        }
        Files.write(csv, lines);
    }

    /** Runs until the compiler has had 300 ms, then takes the least of the next 200 ms, in ms. */
    private static double warm(java.util.function.DoubleSupplier work) {
        double sum = 0;
        long begin = System.nanoTime();
        while (System.nanoTime() - begin < 300_000_000L) {
            sum += work.getAsDouble();
        }
        double best = Double.POSITIVE_INFINITY;
        begin = System.nanoTime();
        while (System.nanoTime() - begin < 200_000_000L) {
            long start = System.nanoTime();
            sum += work.getAsDouble();
            best = Math.min(best, (System.nanoTime() - start) / 1e6);
        }
        if (Double.isNaN(sum)) {
            throw new IllegalStateException("a level has no energy");
        }
        return best;
    }

    private static double[] energies(List<Level> levels) {
        return levels.stream().mapToDouble(Level::energy).toArray();
    }

    private static String number(double value) {
        return Double.isNaN(value) ? "" : String.format(Locale.ROOT, "%.4g", value);
    }

    private static String quoted(ReferenceResult result) {
        return '"' + result.setting() + '"';
    }
}
