package org.wellwright.project;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.model.AssembledProblem;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.SpinScheme;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/** Solves the channels of a document's models that its data name, and some around them. */
public final class ProjectSolver {
    /** Levels beyond those that the data name, in channels that they name or that lie between. */
    private static final int MORE = 2;

    /** Without data: so many l, and so many levels each. */
    private static final int ORBITALS = 3;

    private static final int LEVELS = 4;

    private final ModelDocument document;
    private final SolverService solver;

    /** A solver of one document. */
    public ProjectSolver(ModelDocument document, SolverService solver) {
        this.document = document;
        this.solver = solver;
    }

    /**
     * One channel to solve.
     *
     * @param system id of the pair system
     * @param curve name of the curve
     * @param channel the channel
     * @param count levels wanted
     */
    public record Wanted(String system, String curve, ChannelKey channel, int count) {}

    /** The channels of a model in the order of its curves, of the systems, and of l. */
    public List<Wanted> wanted(Model model, SolveScope scope) {
        List<Wanted> wanted = new ArrayList<>();
        for (Curve curve : model.curves()) {
            for (PairSystem system : document.systems()) {
                if (model.serves(system.id())) {
                    wanted.addAll(wanted(curve, system, scope));
                }
            }
        }
        return List.copyOf(wanted);
    }

    private List<Wanted> wanted(Curve curve, PairSystem system, SolveScope scope) {
        Set<ChannelKey> named = new LinkedHashSet<>();
        int deepest = -1;
        for (Datum datum : document.data()) {
            for (LevelKey key : levels(datum)) {
                if (key.system().equals(system.id()) && key.curve().equals(curve.name())) {
                    named.add(key.channel());
                    deepest = Math.max(deepest, key.index());
                }
            }
        }
        int count = scope.count() > 0 ? scope.count() : deepest < 0 ? LEVELS : deepest + 1 + MORE;
        List<Wanted> wanted = new ArrayList<>();
        for (int orbital : orbitals(named, scope)) {
            for (ChannelKey channel : channels(curve.spinScheme(), orbital)) {
                wanted.add(new Wanted(system.id(), curve.name(), channel, count));
            }
        }
        if (scope.orbitals().isEmpty()) {
            for (ChannelKey channel : named) {
                if (wanted.stream().noneMatch(w -> w.channel().equals(channel))) {
                    wanted.add(new Wanted(system.id(), curve.name(), channel, count));
                }
            }
        }
        return wanted;
    }

    private Iterable<Integer> orbitals(Set<ChannelKey> named, SolveScope scope) {
        if (!scope.orbitals().isEmpty()) {
            return scope.orbitals();
        }
        Set<Integer> orbitals = new TreeSet<>();
        named.stream().filter(channel -> !channel.coupled()).forEach(channel -> orbitals.add(channel.orbital()));
        if (document.labels() != LabelConvention.VIBRATIONAL || named.isEmpty()) {
            for (int orbital = 0; orbital < ORBITALS; orbital++) {
                orbitals.add(orbital);
            }
        }
        return orbitals;
    }

    /** The channels of one l under a spin scheme. */
    private static List<ChannelKey> channels(SpinScheme scheme, int orbital) {
        return switch (scheme) {
            case NONE -> List.of(ChannelKey.ofOrbital(orbital));
            case ONE_SPIN ->
                orbital == 0
                        ? List.of(ChannelKey.ofTotal(0, 1))
                        : List.of(
                                ChannelKey.ofTotal(orbital, 2 * orbital - 1),
                                ChannelKey.ofTotal(orbital, 2 * orbital + 1));
            case TWO_SPINS -> {
                List<ChannelKey> channels = new ArrayList<>(List.of(ChannelKey.ofSpins(orbital, 0, 2 * orbital)));
                for (int total = Math.abs(orbital - 1); total <= orbital + 1; total++) {
                    channels.add(ChannelKey.ofSpins(orbital, 2, 2 * total));
                }
                yield channels;
            }
        };
    }

    /**
     * Solves a model. A channel that has no answer is left out and its reason kept.
     *
     * @throws java.util.concurrent.CancellationException if the monitor says so
     */
    public SolvedModel solve(Model model, SolveScope scope, SolveMonitor monitor) {
        List<Problem> problems = new ArrayList<>();
        List<Wanted> wanted = new ArrayList<>();
        List<AssembledProblem> assembled = new ArrayList<>();
        try {
            Assembly assembly = Assembly.of(document, model.name());
            for (Wanted channel : wanted(model, scope)) {
                try {
                    assembled.add(assembly.problem(channel.system(), channel.curve(), channel.channel()));
                    wanted.add(channel);
                } catch (WellwrightException e) {
                    problems.add(placed(e.problem(), channel));
                }
            }
        } catch (WellwrightException e) {
            problems.add(e.problem());
        }
        List<SolveRequest> requests = new ArrayList<>();
        for (int i = 0; i < wanted.size(); i++) {
            requests.add(SolveRequest.of(
                    assembled.get(i).problem(), LevelSearch.first(wanted.get(i).count())));
        }
        List<SolvedChannel> channels = new ArrayList<>();
        List<Spectrum> spectra = spectra(requests, wanted, problems, monitor);
        for (int i = 0; i < wanted.size(); i++) {
            if (spectra.get(i) != null) {
                Wanted channel = wanted.get(i);
                channels.add(new SolvedChannel(
                        channel.system(),
                        channel.curve(),
                        channel.channel(),
                        assembled.get(i).energyOrigin().value(),
                        spectra.get(i)));
            }
        }
        return new SolvedModel(
                model.name(), channels, problems.stream().distinct().toList());
    }

    /** All at once on all cores; if one of them has no answer, one by one, so that the others are kept. */
    private List<Spectrum> spectra(
            List<SolveRequest> requests, List<Wanted> wanted, List<Problem> problems, SolveMonitor monitor) {
        try {
            return solver.solveAll(requests, monitor);
        } catch (WellwrightException one) {
            List<Spectrum> spectra = new ArrayList<>();
            for (int i = 0; i < requests.size(); i++) {
                try {
                    spectra.add(solver.solve(requests.get(i), monitor));
                } catch (WellwrightException e) {
                    problems.add(placed(e.problem(), wanted.get(i)));
                    spectra.add(null);
                }
            }
            return spectra;
        }
    }

    private static Problem placed(Problem problem, Wanted channel) {
        String place = channel.system() + ", curve '" + channel.curve() + "', "
                + channel.channel().describe();
        return new Problem(
                problem.what(), problem.where().isEmpty() ? place : place + ", " + problem.where(), problem.remedy());
    }

    private static List<LevelKey> levels(Datum datum) {
        List<LevelKey> keys = new ArrayList<>();
        datum.levels().forEach(contribution -> keys.add(contribution.level()));
        datum.denominator().forEach(contribution -> keys.add(contribution.level()));
        return keys;
    }
}
