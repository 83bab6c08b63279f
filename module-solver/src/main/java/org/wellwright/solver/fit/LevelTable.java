package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.model.AssembledProblem;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelOutcome;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.MissingLevel;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/** Levels of one model at one set of values, with their exact gradients over the pool's numbers. */
final class LevelTable {
    private final Map<LevelKey, Entry> entries = new HashMap<>();
    private final int numbers;
    private final Set<LevelKey> states;
    private final Map<String, List<ChannelPlace>> doubts = new LinkedHashMap<>();

    /**
     * One level: energy with origin, gradient, half-width of the bounds, state if it was asked for; or why there is
     * none.
     */
    record Entry(
            double energy,
            Gradient gradient,
            double halfWidth,
            RadialState state,
            AssembledProblem assembled,
            Problem problem) {
        static Entry missing(Problem problem) {
            return new Entry(Double.NaN, null, Double.NaN, null, null, problem);
        }

        boolean found() {
            return problem == null;
        }
    }

    /** A gradient over the pool's numbers. */
    static final class Gradient {
        private final double[] slopes;

        private Gradient(double[] slopes) {
            this.slopes = slopes;
        }

        void addTo(double[] sum, double weight) {
            for (int i = 0; i < slopes.length; i++) {
                sum[i] += weight * slopes[i];
            }
        }
    }

    private record ChannelPlace(String system, String curve, ChannelKey channel) {}

    private record Wanted(ChannelPlace place, Set<Integer> indices, AssembledProblem problem) {
        int count() {
            return Collections.max(indices) + 1;
        }
    }

    private LevelTable(int numbers, Set<LevelKey> states) {
        this.states = states;
        this.numbers = numbers;
    }

    /** Solves every channel that the keys need; a channel that fails keeps its reason. */
    static LevelTable solve(
            Assembly assembly, LevelDemand demand, double[] values, SpectrumSource source, SolveMonitor monitor) {
        LevelTable table = new LevelTable(values.length, demand.states());
        Map<ChannelPlace, Set<Integer>> indices = new LinkedHashMap<>();
        for (LevelKey key : demand.levels()) {
            indices.computeIfAbsent(
                            new ChannelPlace(key.system(), key.curve(), key.channel()), place -> new TreeSet<>())
                    .add(key.index());
        }
        List<Wanted> wanted = new ArrayList<>();
        for (Map.Entry<ChannelPlace, Set<Integer>> entry : indices.entrySet()) {
            ChannelPlace place = entry.getKey();
            try {
                AssembledProblem problem = assembly.problem(place.system(), place.curve(), place.channel(), values);
                wanted.add(new Wanted(place, entry.getValue(), problem));
            } catch (WellwrightException fault) {
                table.fail(place, entry.getValue(), fault.problem());
            }
        }
        table.solveAll(wanted, source, monitor);
        return table;
    }

    /** Which numbers of the pool the levels of some keys depend on, without solving. */
    static boolean[] dependencies(Assembly assembly, LevelDemand demand, double[] values) {
        boolean[] used = new boolean[values.length];
        Set<ChannelPlace> places = new LinkedHashSet<>();
        demand.levels().forEach(key -> places.add(new ChannelPlace(key.system(), key.curve(), key.channel())));
        for (ChannelPlace place : places) {
            try {
                assembly.problem(place.system(), place.curve(), place.channel(), values)
                        .markUsed(used);
            } catch (WellwrightException reportedLater) {
                // Solving the channel reports the same fault with the datum that needs it.
            }
        }
        return used;
    }

    /** Where a level may have been missed, so that an index may be wrong; one problem per reason. */
    List<Problem> doubts() {
        List<Problem> problems = new ArrayList<>();
        doubts.forEach((message, places) -> {
            ChannelPlace first = places.get(0);
            String others = places.size() == 1 ? "" : " and %d more channels".formatted(places.size() - 1);
            problems.add(new Problem(
                    "the levels with %s of '%s'%s may not be complete: %s"
                            .formatted(first.channel().describe(), first.system(), others, message),
                    "",
                    "check the indices of the data there"));
        });
        return List.copyOf(problems);
    }

    /** Whether it has an entry for everything in a demand. */
    boolean covers(LevelDemand demand) {
        return entries.keySet().containsAll(demand.levels())
                && demand.states().stream()
                        .allMatch(key -> entries.get(key).state() != null
                                || !entries.get(key).found());
    }

    /** The entry of a key that was asked for. */
    Entry entry(LevelKey key) {
        return entries.get(key);
    }

    private void solveAll(List<Wanted> wanted, SpectrumSource source, SolveMonitor monitor) {
        List<SpectrumSource.Wanted> questions = new ArrayList<>();
        for (Wanted one : wanted) {
            questions.add(new SpectrumSource.Wanted(one.problem().problem(), LevelSearch.first(one.count())));
        }
        List<Spectrum> spectra;
        try {
            spectra = source.solve(questions, monitor);
        } catch (WellwrightException oneFailed) {
            solveOneByOne(wanted, questions, source, monitor);
            return;
        }
        for (int i = 0; i < wanted.size(); i++) {
            record(wanted.get(i), spectra.get(i));
        }
    }

    /** After a fault: finds out which channel it belongs to and keeps the others. */
    private void solveOneByOne(
            List<Wanted> wanted, List<SpectrumSource.Wanted> questions, SpectrumSource source, SolveMonitor monitor) {
        for (int i = 0; i < wanted.size(); i++) {
            try {
                record(
                        wanted.get(i),
                        source.solve(List.of(questions.get(i)), monitor).get(0));
            } catch (WellwrightException fault) {
                fail(wanted.get(i).place(), wanted.get(i).indices(), fault.problem());
            }
        }
    }

    private void record(Wanted wanted, Spectrum spectrum) {
        for (int index : wanted.indices()) {
            entries.put(wanted.problem().key(index), missing(wanted, spectrum, index));
        }
        if (spectrum.completeness() == Completeness.NO) {
            doubts.computeIfAbsent(spectrum.message(), message -> new ArrayList<>())
                    .add(wanted.place());
        }
        for (LevelOutcome outcome : spectrum.outcomes()) {
            if (!wanted.indices().contains(outcome.index())) {
                continue;
            }
            LevelKey key = wanted.problem().key(outcome.index());
            if (outcome instanceof MissingLevel missing) {
                entries.put(key, Entry.missing(missing.problem()));
            } else if (outcome instanceof Level level) {
                double[] slopes = new double[numbers];
                RadialState state = spectrum.state(level.index());
                wanted.problem().addGradient(state.gradient(), 1, slopes);
                double energy = level.energy() + wanted.problem().energyOrigin().value();
                double halfWidth = (level.upper() - level.lower()) / 2;
                entries.put(
                        key,
                        new Entry(
                                energy,
                                new Gradient(slopes),
                                halfWidth,
                                states.contains(key) ? state : null,
                                wanted.problem(),
                                null));
            }
        }
    }

    private static Entry missing(Wanted wanted, Spectrum spectrum, int index) {
        ChannelPlace place = wanted.place();
        int there = spectrum.levels().size();
        String what = "there is no level of index %d with %s: the curve '%s' binds %s for '%s'"
                .formatted(
                        index,
                        place.channel().describe(),
                        place.curve(),
                        there == 0 ? "none" : "only " + there,
                        place.system());
        Problem problem = new Problem(what, "", "change the level, do not use the datum, or deepen the potential");
        return Entry.missing(problem);
    }

    private void fail(ChannelPlace place, Set<Integer> indices, Problem problem) {
        for (int index : indices) {
            LevelKey key = new LevelKey(place.system(), place.curve(), place.channel(), index);
            entries.put(key, Entry.missing(problem));
        }
    }
}
