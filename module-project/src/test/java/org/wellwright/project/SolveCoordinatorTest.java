package org.wellwright.project;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.logging.Logger;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;
import org.wellwright.solver.units.ExactNumber;

/** The solver of these tests counts its solves and waits when told to; its one level is V(1). */
class SolveCoordinatorTest {
    private static final Duration LONG = Duration.ofSeconds(30);
    private final ExecutorService solving = Executors.newFixedThreadPool(4);
    private final ExecutorService worker = Executors.newSingleThreadExecutor();
    private final CountingSolver solver = new CountingSolver();
    private final ProjectSession session = new ProjectSession(Project.of("Invented", document("1", "5")), null);
    private final SolveCoordinator coordinator = new SolveCoordinator(
            session, new SolveCache(() -> solver, solving), worker, SolveCoordinator.Observer.NONE);

    @AfterEach
    void end() {
        coordinator.close();
        solver.gate = null;
        solving.shutdownNow();
        worker.shutdownNow();
    }

    @Test
    void publishesTheSolutionOfTheNewestSnapshot() {
        coordinator.start();
        await(() -> solution() != null && solution().project() == session.project());
        assertThat(first(solution(), "a")).isEqualTo(1);
        session.edit("set a", project -> project.withDocument(document("2", "5")));
        await(() -> solution().project() == session.project());
        assertThat(first(solution(), "a")).isEqualTo(2);
        assertThat(first(solution(), "b")).isEqualTo(5);
        assertThat(solution().levels()).isEqualTo(6);
        assertThat(session.getLookup().lookupAll(ProjectSolution.class)).hasSize(1);
    }

    @Test
    void anEditSolvesOnlyWhatItChangesAndUndoSolvesNothing() {
        coordinator.start();
        await(() -> solution() != null);
        int all = solver.solves.get();
        assertThat(all).isEqualTo(6);
        session.edit("set a", project -> project.withDocument(document("2", "5")));
        await(() -> solution().project() == session.project());
        assertThat(solver.solves.get()).isEqualTo(all + 3);
        session.undo();
        await(() -> solution().project() == session.project());
        assertThat(solver.solves.get()).isEqualTo(all + 3);
        assertThat(first(solution(), "a")).isEqualTo(1);
    }

    @Test
    void aNoteSolvesNothingAndPublishesNothing() throws InterruptedException {
        coordinator.start();
        await(() -> solution() != null);
        long run = solution().run();
        int all = solver.solves.get();
        session.edit("note", project -> project.withNotes("seen by nobody"));
        Thread.sleep(50);
        assertThat(solution().run()).isEqualTo(run);
        assertThat(solver.solves.get()).isEqualTo(all);
    }

    @Test
    void anEditCancelsOnlyWhatItMakesStale() {
        CountDownLatch gate = new CountDownLatch(1);
        solver.gate = gate;
        coordinator.start();
        await(() -> solver.running.size() == 3);
        // The first model's solves hang; after the edit they are stale, those of the second model are not yet started.
        Set<String> before = Set.copyOf(solver.running);
        session.edit("set a", project -> project.withDocument(document("2", "5")));
        await(() -> solver.cancelled.containsAll(before));
        await(() -> solver.running.size() == 3);
        Set<String> after = Set.copyOf(solver.running);
        assertThat(after).doesNotContainAnyElementsOf(before);
        // An edit of the other model leaves them running.
        session.edit("set b", project -> project.withDocument(document("2", "6")));
        await(() -> System.nanoTime() - solver.lastStart > 2 * SolveCoordinator.PATIENCE_NANOS);
        assertThat(solver.cancelled).containsExactlyInAnyOrderElementsOf(before);
        assertThat(solver.running).containsAll(after);
        gate.countDown();
        await(() -> solution() != null && solution().project() == session.project());
        assertThat(first(solution(), "a")).isEqualTo(2);
        assertThat(first(solution(), "b")).isEqualTo(6);
    }

    @Test
    void shortWorkIsFinishedThoughItIsOvertaken() {
        solver.millis = 20;
        coordinator.start();
        await(() -> solution() != null);
        List<Long> runs = new ArrayList<>();
        for (int i = 0; i < 60; i++) {
            String value = Integer.toString(10 + i);
            session.edit("drag", "gesture", project -> project.withDocument(document(value, "5")));
            runs.add(solution().run());
            pause(8);
        }
        await(() -> solution().project() == session.project());
        assertThat(runs.stream().distinct().count())
                .as("solutions during the drag")
                .isGreaterThan(3);
        assertThat(first(solution(), "a")).isEqualTo(69);
    }

    @Test
    void stoppingEndsWorkUntilTheNextChange() {
        CountDownLatch gate = new CountDownLatch(1);
        solver.gate = gate;
        coordinator.start();
        await(() -> solver.running.size() == 3);
        coordinator.stop();
        await(() -> solver.running.isEmpty());
        gate.countDown();
        pause(50);
        assertThat(solution()).isNull();
        session.edit("set a", project -> project.withDocument(document("3", "5")));
        await(() -> solution() != null);
        assertThat(first(solution(), "a")).isEqualTo(3);
    }

    @Test
    void closingStopsEverythingAndLeavesNothingBehind() {
        solver.gate = new CountDownLatch(1);
        coordinator.start();
        await(() -> solver.running.size() == 3);
        coordinator.close();
        await(() -> solver.running.isEmpty());
        pause(20);
        assertThat(solution()).isNull();
        session.edit("set a", project -> project.withDocument(document("3", "5")));
        pause(50);
        assertThat(solution()).isNull();
    }

    @Test
    void aFaultOfTheProgramIsShownOnceAndTheNextEditStartsAfresh() {
        // The fault is made on purpose; its trace need not fill the log of a build.
        Logger.getLogger(SolveCoordinator.class.getName()).setLevel(java.util.logging.Level.OFF);
        solver.broken = true;
        coordinator.start();
        await(() -> solution() != null);
        assertThat(solution().problem().what()).contains("the calculation failed");
        long run = solution().run();
        pause(50);
        assertThat(solution().run()).isEqualTo(run);
        solver.broken = false;
        session.edit("set a", project -> project.withDocument(document("3", "7")));
        await(() -> solution().problem() == null);
        assertThat(first(solution(), "b")).isEqualTo(7);
    }

    private ProjectSolution solution() {
        return session.getLookup().lookup(ProjectSolution.class);
    }

    private static double first(ProjectSolution solution, String model) {
        return solution.results()
                .model(model)
                .channels()
                .get(0)
                .spectrum()
                .levels()
                .get(0)
                .energy();
    }

    private static void await(BooleanSupplier condition) {
        long end = System.nanoTime() + LONG.toNanos();
        while (!condition.getAsBoolean()) {
            assertThat(System.nanoTime()).as("waited too long").isLessThan(end);
            pause(2);
        }
    }

    private static void pause(int millis) {
        try {
            Thread.sleep(millis);
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    /** Two models V = a + r and V = b + r of one electron-like body on a heavy one. */
    private static ModelDocument document(String a, String b) {
        Body light = new Body("light", new BodyMass.Typed(ExactNumber.ONE, null, "m_e"), new ExactNumber("-1"), -1);
        Body heavy = new Body("heavy", new BodyMass.Typed(new ExactNumber("1e9"), null, "m_e"), ExactNumber.ONE, -1);
        return new ModelDocument(
                "CODATA 2022",
                "CODATA 2022, AME 2020",
                "atomic",
                LabelConvention.ATOMIC,
                Weighting.KNOWN,
                List.of(PairSystem.of("pair", light, heavy)),
                List.of(parameter("pa", a), parameter("pb", b)),
                List.of(model("a", "pa"), model("b", "pb")),
                List.of(),
                List.of());
    }

    private static Parameter parameter(String name, String value) {
        return new Parameter(name, "hartree", "", new ParameterShape.Scalar(Setting.fixed(new ExactNumber(value))));
    }

    private static Model model(String name, String parameter) {
        return Model.of(
                name,
                List.of(Curve.of(
                        "V", List.of(new FormulaTerm(TermFrame.named("core"), parameter + " + r - 1", Map.of())))));
    }

    /** Counts, waits, notes what was cancelled. */
    private static final class CountingSolver implements SolverService {
        private final AtomicInteger solves = new AtomicInteger();
        private final Set<String> running = ConcurrentHashMap.newKeySet();
        private final Set<String> cancelled = ConcurrentHashMap.newKeySet();
        private volatile CountDownLatch gate;
        private volatile int millis;
        private volatile boolean broken;
        private volatile long lastStart;

        @Override
        public String id() {
            return "counting";
        }

        @Override
        public String displayName() {
            return "Counting";
        }

        @Override
        public String version() {
            return "1";
        }

        @Override
        public Spectrum solve(SolveRequest request, SolveMonitor monitor) {
            if (broken) {
                throw new IllegalStateException("broken on purpose");
            }
            String digest = request.problem().digest();
            solves.incrementAndGet();
            lastStart = System.nanoTime();
            running.add(digest);
            try {
                CountDownLatch waiting = gate;
                if (waiting != null) {
                    waiting.await();
                } else if (millis > 0) {
                    TimeUnit.MILLISECONDS.sleep(millis);
                }
            } catch (InterruptedException e) {
                cancelled.add(digest);
                throw new CancellationException("told to stop");
            } finally {
                running.remove(digest);
            }
            double energy = request.problem().common().value(1);
            Level level = new Level(
                    0, energy, energy, energy, Level.BoundKind.ESTIMATE, 0, 1, Double.NaN, Double.POSITIVE_INFINITY);
            return new Spectrum(
                    request.problem(),
                    request.search(),
                    List.of(level),
                    List.of(),
                    Completeness.NO,
                    energy,
                    "",
                    new Spectrum.Effort(1, 1, 1));
        }

        @Override
        public List<Spectrum> solveAll(List<SolveRequest> requests, SolveMonitor monitor) {
            throw new AssertionError("the cache solves one by one");
        }
    }
}
