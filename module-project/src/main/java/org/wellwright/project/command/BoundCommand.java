package org.wellwright.project.command;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import org.wellwright.project.command.json.LevelListing;
import org.wellwright.project.command.json.LevelListing.ChannelRow;
import org.wellwright.project.command.json.LevelListing.LevelRow;
import org.wellwright.project.command.json.LevelListing.Place;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.Formula;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.RangedTerm;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;
import org.wellwright.solver.units.Names;

/** {@code bound}: every bound level of a formula. */
final class BoundCommand implements Command {
    private final Supplier<SolverService> solver;

    BoundCommand() {
        this(Services::solver);
    }

    BoundCommand(Supplier<SolverService> solver) {
        this.solver = solver;
    }

    @Override
    public Syntax syntax() {
        return new Syntax("bound", "Levels of one formula, with a bound on each and a count that none is missing.")
                .option("formula", "TEXT", "V(r), for example \"-a/r + b*r\"; log and ln are natural")
                .option("set", "NAME=VALUE", "the value of a parameter of the formula; once for each")
                .option("kinetic", "K", "kinetic constant, ħ²/2μ in the formula's units")
                .option("reduced-mass", "M", "reduced mass μ instead, in the units' mass; needs --units")
                .option("pair", "A,B", "two particles of the catalogue instead (e-,p); needs --units")
                .option("units", "NAME", "unit system of the formula and the result: atomic, eV-nm, …")
                .option("l", "RANGE", "angular momenta: 2, 0..3 or 0,2,4 (without it 0)")
                .option("count", "N", "the first N levels of each l; needed where there are infinitely many")
                .option("range", "R1,R2", "the formula holds from R1 to R2, V = 0 elsewhere")
                .option(
                        "tolerance",
                        "T",
                        "accuracy asked for, relative to max(|E|, ⟨T⟩ + ⟨|V|⟩)\n(without it the limit of the arithmetic)")
                .flag("verify", "compute every level by a second method and compare")
                .result("table|csv|json");
    }

    @Override
    public int run(Input input, Console console) {
        Input.Format format = input.format();
        Kinetic kinetic = Kinetic.of(input);
        List<Integer> orbitals = input.has("l") ? Orbitals.parse(input.value("l")) : List.of(0);
        LevelSearch search = search(input);
        Formula formula = FormulaText.parse(input.required("formula", "\"-a/r\""));
        double[] values = values(formula, input.values("set"));
        double[] range = range(input.value("range"));
        List<SolveRequest> requests = new ArrayList<>();
        TermEvaluator shared = null;
        for (int orbital : orbitals) {
            if (shared == null || formula.dependsOnChannel()) {
                TermEvaluator whole = formula.bind(values, ChannelFacts.ofOrbital(orbital));
                shared = range == null ? whole : new RangedTerm(whole, 1, range[0], range[1]);
            }
            requests.add(new SolveRequest(
                    RadialProblem.single(kinetic.constant(), orbital, shared), search, input.has("verify")));
        }
        List<Spectrum> spectra = solver.get().solveAll(requests, SolveMonitor.NONE);
        List<ChannelRow> channels = new ArrayList<>();
        List<LevelRow> levels = new ArrayList<>();
        boolean whole = true;
        for (int i = 0; i < spectra.size(); i++) {
            Place place = new Place(null, null, null, ChannelKey.ofOrbital(orbitals.get(i)));
            whole &= Spectra.list(place, null, 0, spectra.get(i), channels, levels, console);
        }
        LevelListing listing = new LevelListing(kinetic.energyUnit(), kinetic.lengthUnit(), channels, levels);
        console.result(input, LevelListings.print(listing, format));
        if (levels.isEmpty() && whole) {
            console.say("no bound level: nothing lies below the threshold in any of these channels");
        }
        return whole ? 0 : 1;
    }

    private static LevelSearch search(Input input) {
        double tolerance = input.number("tolerance", LevelSearch.FULL);
        if (!(tolerance >= 0 && tolerance < 1)) {
            throw new UsageException(
                    "--tolerance is " + input.value("tolerance"), "write a number from 0 to 1, such as 1e-12");
        }
        return new LevelSearch(input.count("count", 1, LevelSearch.ALL), Double.POSITIVE_INFINITY, tolerance);
    }

    private static double[] range(String text) {
        if (text == null) {
            return null;
        }
        String[] parts = text.split(",", -1);
        if (parts.length != 2) {
            throw new UsageException(
                    "--range is '" + Names.shortened(text) + "'",
                    "write two radii with a comma between them, such as 0,5");
        }
        double from = Input.number("--range", parts[0]);
        double to = parts[1].strip().equals("inf") ? Double.POSITIVE_INFINITY : Input.number("--range", parts[1]);
        if (!(from >= 0 && to > from)) {
            throw new UsageException("--range is " + Names.shortened(text), "write two radii R1,R2 with 0 <= R1 < R2");
        }
        return new double[] {from, to};
    }

    /** The values of the formula's parameters in its order. */
    private static double[] values(Formula formula, List<String> settings) {
        Map<String, Double> given = new LinkedHashMap<>();
        for (String setting : settings) {
            int equals = setting.indexOf('=');
            if (equals < 1) {
                throw new UsageException("--set is '" + Names.shortened(setting) + "'", "write --set NAME=VALUE");
            }
            String name = setting.substring(0, equals).strip();
            if (given.put(name, Input.number("--set " + Names.shortened(name), setting.substring(equals + 1)))
                    != null) {
                throw new UsageException("--set " + name + " is given twice", "give it once");
            }
        }
        List<String> names = formula.names();
        for (String name : given.keySet()) {
            if (!names.contains(name)) {
                throw new UsageException(
                        "the formula has no parameter '" + Names.shortened(name) + "'",
                        names.isEmpty() ? "leave --set out" : "it has " + String.join(", ", names));
            }
        }
        List<String> missing = new ArrayList<>(names);
        missing.removeAll(given.keySet());
        if (!missing.isEmpty()) {
            throw new UsageException(
                    "the formula's " + String.join(", ", missing)
                            + (missing.size() == 1 ? " has no value" : " have no values"),
                    "add --set " + missing.get(0) + "=VALUE");
        }
        double[] values = new double[names.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = given.get(names.get(i));
        }
        return values;
    }
}
