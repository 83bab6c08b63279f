package org.wellwright.solver.service.internal;

import java.util.List;
import java.util.Locale;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialSolver;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/**
 * Confirms a spectrum by the second method: its count at the end of the search always, its energies if asked. A
 * difference beyond the bounds is our fault and said so.
 */
final class CrossCheck {
    private final RadialSolver second;

    CrossCheck(RadialSolver second) {
        this.second = second;
    }

    Spectrum check(Spectrum spectrum, boolean verify, SolveMonitor monitor) {
        if (spectrum.completeness() == Completeness.NO) {
            return spectrum;
        }
        int expected = spectrum.outcomes().size();
        int counted;
        try {
            counted = second.countBelow(spectrum.problem(), spectrum.searchedBelow());
        } catch (WellwrightException e) {
            return with(
                    spectrum,
                    Completeness.NO,
                    "the second method could not count: " + e.problem().sentence());
        }
        if (counted != expected) {
            return with(
                    spectrum,
                    Completeness.NO,
                    "%d levels were found below %.9g, but the second method counts %d"
                            .formatted(expected, spectrum.searchedBelow(), counted));
        }
        if (verify) {
            compare(spectrum, monitor);
        }
        return with(spectrum, Completeness.COUNTED, spectrum.message());
    }

    private void compare(Spectrum spectrum, SolveMonitor monitor) {
        LevelSearch search =
                new LevelSearch(Math.max(1, spectrum.outcomes().size()), spectrum.searchedBelow(), LevelSearch.FULL);
        List<Level> others = second.solve(spectrum.problem(), search, monitor).levels();
        for (Level level : spectrum.levels()) {
            for (Level other : others) {
                if (other.index() == level.index() && !agree(level, other)) {
                    throw new SolverException(
                            String.format(
                                    Locale.ROOT,
                                    "the two methods differ by %.2g, more than their bounds: %.17g and %.17g",
                                    Math.abs(level.energy() - other.energy()),
                                    level.energy(),
                                    other.energy()),
                            "level %d, l = %d"
                                    .formatted(
                                            level.index(),
                                            spectrum.problem().channels().get(0).orbital()),
                            "this is a fault of the solver; declare every jump or kink as the end of a range and report it");
                }
            }
        }
    }

    private static boolean agree(Level level, Level other) {
        double slack = other.errorEstimate() + 4 * Math.ulp(1.0) * Math.max(level.scale(), other.scale());
        return other.energy() >= level.lower() - slack && other.energy() <= level.upper() + slack;
    }

    private static Spectrum with(Spectrum spectrum, Completeness completeness, String message) {
        List<RadialState> states = spectrum.levels().stream()
                .map(level -> spectrum.state(level.index()))
                .toList();
        return new Spectrum(
                spectrum.problem(),
                spectrum.search(),
                spectrum.outcomes(),
                states,
                completeness,
                spectrum.searchedBelow(),
                message,
                spectrum.effort());
    }
}
