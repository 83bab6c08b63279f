package org.wellwright.solver.radial.spectral;

import org.wellwright.solver.SolverException;
import org.wellwright.solver.numerics.BlockChain;
import org.wellwright.solver.numerics.CondensedPencil;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ScalarChain;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * Finds the energy up to which a search must look and a mesh that carries all levels below it: semiclassical counts
 * give the first guess, counts of the condensed pencil decide.
 */
final class MeshChoice {
    private final ChannelPotentials potentials;
    private final LevelSearch search;
    private final Survey survey;
    private final Layout layout;
    private final double threshold;
    private final double limit;
    private final boolean finite;
    private final double tolerance;
    private CondensedPencil pencil;
    private CondensedPencil.Work work;
    private double[] edges;
    private double floor;
    private double bottom;
    private double top;
    private boolean complete;
    private int counts;

    /**
     * A choice not yet made.
     *
     * @param tolerance truncation of the mesh relative to ⟨T⟩ + ⟨|V|⟩
     */
    MeshChoice(ChannelPotentials potentials, LevelSearch search, double tolerance, SolveMonitor monitor) {
        this.potentials = potentials;
        this.search = search;
        this.tolerance = tolerance;
        survey = Survey.of(potentials);
        layout = new Layout(potentials, survey, SpectralElementSolver.DEGREE, monitor);
        threshold = potentials.threshold();
        limit = Math.min(threshold, search.below());
        finite = limit < threshold || !potentials.hasEndlessSeries();
    }

    boolean finite() {
        return finite;
    }

    double limit() {
        return limit;
    }

    double threshold() {
        return threshold;
    }

    Layout layout() {
        return layout;
    }

    CondensedPencil pencil() {
        return pencil;
    }

    double[] edges() {
        return edges;
    }

    /** An energy below all levels. */
    double floor() {
        return floor;
    }

    /** An energy above all wanted levels. */
    double top() {
        return top;
    }

    /** Whether there is no level between the top and the limit of the search. */
    boolean complete() {
        return complete;
    }

    int counts() {
        return counts;
    }

    /** Chooses; returns the number of levels below {@link #top}, at least the number wanted if there are so many. */
    int choose() {
        int wanted = search.count();
        double guess = wanted == LevelSearch.ALL ? limit : survey.energyOf(wanted + 0.5, limit);
        survey.lookForHidden(guess);
        if (!(survey.floor() < limit)) {
            return 0;
        }
        bottom = survey.energyOf(0.3, limit);
        if (wanted != LevelSearch.ALL) {
            int found = firstLevels(wanted);
            if (found >= wanted) {
                return found;
            }
        }
        if (limit < threshold) {
            mesh(limit);
            complete = true;
            return count(limit);
        }
        return meshToThreshold();
    }

    private int firstLevels(int wanted) {
        double guess = survey.energyOf(wanted + 0.5, limit);
        int found = 0;
        for (int step = 0; step < 60 && guess < limit; step++) {
            layout.prepare(guess, bottom);
            double semiclassical = layout.levels(guess);
            if (semiclassical < wanted + 0.2) {
                guess = raised(guess, semiclassical, wanted + 0.7);
                continue;
            }
            if (semiclassical > 1.3 * wanted + 3 && step < 6) {
                double less = lowered(guess, wanted + 0.7);
                if (less < guess) {
                    guess = less;
                    continue;
                }
            }
            mesh(guess);
            found = count(guess);
            if (found >= wanted) {
                return found;
            }
            guess = raised(guess, found, wanted + 0.7);
        }
        if (!finite) {
            throw new SolverException(
                    "only %d of %d levels found".formatted(found, wanted),
                    "l = " + potentials.problem().channels().get(0).orbital(),
                    "ask for fewer levels");
        }
        return found;
    }

    /** An energy with more levels below, by the semiclassical density. */
    private double raised(double energy, double found, double aim) {
        double distance = Double.isInfinite(limit) ? energy - bottom : limit - energy;
        double step = distance * 1e-3;
        double density = (layout.levels(energy) - layout.levels(energy - step)) / step;
        double rise = density > 0 ? (aim - found) / density : distance;
        if (Double.isInfinite(limit)) {
            return energy + Math.min(Math.max(rise, 1e-3 * distance), 2 * distance);
        }
        double next = energy + rise;
        return next < limit - 0.1 * distance ? next : limit - 0.1 * distance;
    }

    /** An energy with about {@code aim} levels below on the present elements. */
    private double lowered(double energy, double aim) {
        double low = bottom;
        double high = energy;
        for (int i = 0; i < 50 && layout.levels(high) > 1.02 * aim; i++) {
            double middle =
                    Double.isInfinite(limit) ? 0.5 * (low + high) : limit - Math.sqrt((limit - low) * (limit - high));
            if (!(middle > low && middle < high)) {
                break;
            }
            if (layout.levels(middle) >= aim) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    /**
     * A mesh for every level below the threshold, however near; returns their number. A level nearer to the threshold
     * than 1e-26 of the depth is not looked for.
     */
    private int meshToThreshold() {
        double depth = threshold - survey.floor();
        int found = 0;
        for (double step = 1e-3; step > 1e-26; step *= 1e-2) {
            mesh(threshold - depth * step);
            found = count(top);
            if (count(threshold) == found && !new ThresholdProbe(potentials, layout, pencil).moreBeyond(found)) {
                complete = true;
                break;
            }
        }
        return found;
    }

    private void mesh(double energy) {
        top = energy;
        for (int round = 0; ; round++) {
            layout.prepare(energy, bottom);
            assemble(layout.build(tolerance));
            // Levels below the semiclassical bottom: the mesh has not been tested so deep.
            if (count(bottom) == 0 || round == 3) {
                return;
            }
            bottom -= Math.abs(top - bottom);
        }
    }

    /** The pencil of a chain of elements. */
    static CondensedPencil chain(Element[] elements) {
        return elements[0].channels == 1 ? new ScalarChain(elements) : new BlockChain(elements);
    }

    /** Builds the pencil of the layout's present elements. */
    void assemble(Element[] elements) {
        edges = new double[elements.length + 1];
        edges[0] = layout.leaves().get(0).from;
        for (int i = 0; i < elements.length; i++) {
            edges[i + 1] = layout.leaves().get(i).to;
        }
        pencil = chain(elements);
        work = pencil.work();
        floor = bottom;
        double step = Math.max(Math.abs(floor) * 1e-12, Math.abs(top - floor) * 1e-3);
        while (count(floor) > 0) {
            floor -= step;
            step *= 2;
        }
    }

    /** Levels of the mesh below an energy. */
    int count(double energy) {
        counts++;
        return work.count(energy);
    }
}
