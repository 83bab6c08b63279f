package org.wellwright.solver.radial.spectral;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * Chooses the elements for all levels below an energy: from the ladder outward and inward until the state has decayed,
 * cut where the classical action of an element is too long, then cut where the element itself shows that it does not
 * resolve.
 *
 * <p>Everything is tested at several energies, since deep levels decay fast just outside the well. A layout is a
 * function of the problem, the energies and the tolerance alone.
 */
final class Layout {
    /** Action ∫√((V − E)/κ) dr after which the outer end is cut: the square of what is cut off is below e^−42. */
    static final double OUTER_CUT = 21;
    /** The same at the inner end. */
    static final double INNER_CUT = 25;

    private static final double[] DEPTHS = {0, 0.02, 0.2, 0.8};

    private final ChannelPotentials potentials;
    private final Survey survey;
    private final int degree;
    private final Ladder ladder;
    private final SolveMonitor monitor;
    private final Element.Scratch scratch = new Element.Scratch();
    private List<Leaf> leaves = new ArrayList<>();
    private double[] energies = new double[0];

    Layout(ChannelPotentials potentials, Survey survey, int degree, SolveMonitor monitor) {
        this.potentials = potentials;
        this.survey = survey;
        this.degree = degree;
        this.monitor = monitor;
        ladder = new Ladder(
                potentials.problem().innerWall(), potentials.problem().outerWall(), potentials.breaks());
    }

    List<Leaf> leaves() {
        return leaves;
    }

    ChannelPotentials potentials() {
        return potentials;
    }

    /** Energies at which the mesh is tested. */
    double[] energies() {
        return energies;
    }

    private Leaf leaf(double from, double to) {
        if (leaves.size() > 20000) {
            throw new SolverException(
                    "the mesh grows without end",
                    "near r = %.6g".formatted(from),
                    "declare the jump or singularity there as the end of a term's range");
        }
        if (monitor.cancelled()) {
            throw new java.util.concurrent.CancellationException("cancelled while the mesh was chosen");
        }
        return new Leaf(potentials, degree, from, to);
    }

    /** Extends to all that a level below {@code top} can reach, and cuts long elements. */
    void prepare(double top, double bottom) {
        double deepest = Math.min(bottom, top);
        energies = new double[DEPTHS.length];
        for (int i = 0; i < DEPTHS.length; i++) {
            energies[i] = top - DEPTHS[i] * (top - deepest);
        }
        cover(top);
        refine();
        trim(top);
    }

    private void cover(double top) {
        double inner = potentials.problem().innerWall();
        double outer = potentials.problem().outerWall();
        if (leaves.isEmpty()) {
            double seed = survey.deepest();
            double to = ladder.outward(seed);
            double from = ladder.inward(to);
            leaves.add(leaf(from > 0 ? from : to / 4, to));
        }
        double last = survey.lastAllowed(top);
        while (edge() < outer && (edge() <= last || actionBeyond(top) < OUTER_CUT) && edge() < 0x1p160) {
            leaves.add(leaf(edge(), ladder.outward(edge())));
        }
        double first = survey.firstAllowed(top);
        boolean wall = potentials.startsInWall();
        while (start() > inner && start() > 0) {
            double action = actionInside(top);
            if (start() <= first && action >= INNER_CUT || start() < 0x1p-200) {
                break;
            }
            if (!wall && start() <= first * 4 && originResolves(start(), top)) {
                leaves.add(0, leaf(0, start()));
                break;
            }
            leaves.add(0, leaf(ladder.inward(start()), start()));
        }
    }

    private double edge() {
        return leaves.get(leaves.size() - 1).to;
    }

    private double start() {
        return leaves.get(0).from;
    }

    /** Whether the regular solution is a power times something slow on [0, b]. */
    private boolean originResolves(double b, double top) {
        double worst = 0;
        for (double r = b; r > b / 10; r /= 2) {
            for (int c = 0; c < potentials.channels(); c++) {
                double v = potentials.channelValue(c, r) - potentials.inverseSquare(c) / (r * r);
                worst = Math.max(worst, Math.abs(v - top) * r * b / potentials.kinetic());
            }
        }
        return worst <= 40;
    }

    /** Whether an energy is classically allowed somewhere in an element, seen by its nodes or by the survey. */
    private boolean allowed(Leaf one, double energy, int at) {
        return one.phase(at) > 0 || survey.allowed(energy, one.from, one.to);
    }

    private double actionBeyond(double energy) {
        double sum = 0;
        for (int i = leaves.size() - 1; i >= 0; i--) {
            Leaf one = leaves.get(i);
            int at = one.at(energy);
            if (allowed(one, energy, at)) {
                return sum;
            }
            sum += one.forbidden(at);
        }
        return sum;
    }

    private double actionInside(double energy) {
        double sum = 0;
        for (Leaf one : leaves) {
            int at = one.at(energy);
            if (allowed(one, energy, at)) {
                return sum;
            }
            sum += one.forbidden(at);
        }
        return sum;
    }

    /** Distance in action from each element to the nearest classically allowed one. */
    private double[] distances(double energy) {
        int n = leaves.size();
        double[] distance = new double[n];
        double sum = Double.POSITIVE_INFINITY;
        for (int i = 0; i < n; i++) {
            Leaf one = leaves.get(i);
            int at = one.at(energy);
            boolean allowed = allowed(one, energy, at);
            distance[i] = allowed ? 0 : sum;
            sum = allowed ? 0 : sum + one.forbidden(at);
        }
        sum = Double.POSITIVE_INFINITY;
        for (int i = n - 1; i >= 0; i--) {
            Leaf one = leaves.get(i);
            int at = one.at(energy);
            boolean allowed = allowed(one, energy, at);
            distance[i] = allowed ? 0 : Math.min(distance[i], sum);
            sum = allowed ? 0 : sum + one.forbidden(at);
        }
        return distance;
    }

    private void refine() {
        boolean changed = true;
        while (changed) {
            changed = false;
            double[][] distance = new double[energies.length][];
            for (int i = 0; i < energies.length; i++) {
                distance[i] = distances(energies[i]);
            }
            List<Leaf> next = new ArrayList<>(leaves.size() + 8);
            for (int i = 0; i < leaves.size(); i++) {
                Leaf one = leaves.get(i);
                if (tooLong(one, i, distance)) {
                    addHalves(one, next);
                    changed = true;
                } else {
                    next.add(one);
                }
            }
            leaves = next;
        }
    }

    private void addHalves(Leaf one, List<Leaf> into) {
        double middle = one.atOrigin() ? one.to / 4 : Ladder.cut(one.from, one.to);
        if (!(middle > one.from && middle < one.to) || one.to - one.from < 1e-13 * one.to) {
            throw new SolverException(
                    "V cannot be resolved by any element",
                    "r = %.9g".formatted(one.to),
                    "declare the jump or singularity there as the end of a term's range");
        }
        into.add(leaf(one.from, middle));
        into.add(leaf(middle, one.to));
    }

    private boolean tooLong(Leaf one, int index, double[][] distance) {
        double oscillating = 0.27 * degree;
        double decaying = 0.42 * degree;
        for (int i = 0; i < energies.length; i++) {
            double d = distance[i][index];
            if (d > INNER_CUT + 2) {
                continue;
            }
            int at = one.at(energies[i]);
            double p = one.phase(at);
            double f = one.forbidden(at);
            double length = 0.5 * (p + f);
            double limit = (p * oscillating + f * decaying) / Math.max(p + f, Double.MIN_NORMAL) + 0.15 * d;
            if (length > limit) {
                return true;
            }
        }
        return false;
    }

    /** Drops elements that no level reaches. */
    private void trim(double top) {
        double[] distance = distances(top);
        int from = 0;
        int to = leaves.size();
        while (to - from > 2 && distance[to - 1] > OUTER_CUT) {
            to--;
        }
        while (to - from > 2 && distance[from] > INNER_CUT) {
            from++;
        }
        leaves = new ArrayList<>(leaves.subList(from, to));
        while (leaves.size() < 2) {
            List<Leaf> halves = new ArrayList<>();
            leaves.forEach(one -> addHalves(one, halves));
            leaves = halves;
        }
    }

    /** Semiclassical number of levels below E, (1/π)∫k dr. */
    double levels(double energy) {
        double sum = 0;
        for (Leaf one : leaves) {
            sum += one.phase(one.at(energy));
        }
        return sum / Math.PI;
    }

    /** Semiclassical ⟨T⟩ + ⟨|V|⟩ at an energy, the scale of rounding. */
    double scale(double energy) {
        double time = 0;
        double sum = 0;
        for (Leaf one : leaves) {
            int at = one.at(energy);
            time += one.time(at);
            sum += one.kineticTime(at) + one.potentialTime(at);
        }
        return time > 0 ? Math.max(sum / time, Math.abs(energy)) : Math.abs(energy);
    }

    /**
     * Builds the matrices and cuts what does not resolve.
     *
     * @param tolerance of the energy, relative to ⟨T⟩ + ⟨|V|⟩
     */
    Element[] build(double tolerance) {
        ResolutionTest test = null;
        boolean changed = true;
        while (changed) {
            changed = false;
            double[][] distance = new double[energies.length][];
            double[] scale = new double[energies.length];
            double[] time = new double[energies.length];
            for (int i = 0; i < energies.length; i++) {
                distance[i] = distances(energies[i]);
                scale[i] = scale(energies[i]);
                for (Leaf one : leaves) {
                    time[i] += one.time(one.at(energies[i]));
                }
            }
            List<Leaf> next = new ArrayList<>(leaves.size() + 8);
            for (int j = 0; j < leaves.size(); j++) {
                Leaf one = leaves.get(j);
                Element element = one.element(potentials, scratch);
                test = test == null ? new ResolutionTest(potentials.channels(), element.modes) : test;
                boolean good = true;
                for (int i = 0; i < energies.length && good; i++) {
                    double d = distance[i][j];
                    if (time[i] > 0 && d <= INNER_CUT + 5) {
                        double share = share(one, energies[i], d) / time[i];
                        double error = test.errorPerNorm(element, energies[i]);
                        good = error * Math.min(share, 1) <= tolerance * scale[i];
                    }
                }
                if (good || one.to - one.from < 1e-12 * one.to) {
                    next.add(one);
                } else {
                    addHalves(one, next);
                    changed = true;
                }
            }
            leaves = next;
            if (changed) {
                refine();
            }
        }
        return elements();
    }

    /** What part of the norm the element may hold, as ∫dr/k. */
    private static double share(Leaf one, double energy, double distance) {
        int at = one.at(energy);
        double width = one.to - one.from;
        double tail = width * width / Math.pow(Math.max(2 * one.forbidden(at), 1), 2);
        return one.time(at) + Math.exp(-2 * distance) * (one.forbidden(at) > 0 || one.atOrigin() ? tail : 0);
    }

    Element[] elements() {
        Element[] elements = new Element[leaves.size()];
        for (int i = 0; i < elements.length; i++) {
            elements[i] = leaves.get(i).element(potentials, scratch);
        }
        return elements;
    }

    /** Cuts the marked elements in two. */
    void cut(boolean[] marked) {
        List<Leaf> next = new ArrayList<>(leaves.size() + 8);
        for (int i = 0; i < leaves.size(); i++) {
            Leaf one = leaves.get(i);
            if (i < marked.length && marked[i] && one.to - one.from > 1e-12 * one.to) {
                if (one.atOrigin()) {
                    // What is singular there needs many octaves at once.
                    next.add(leaf(0, one.to / 256));
                    next.add(leaf(one.to / 256, one.to / 64));
                    next.add(leaf(one.to / 64, one.to / 16));
                    next.add(leaf(one.to / 16, one.to / 4));
                    next.add(leaf(one.to / 4, one.to));
                    continue;
                }
                addHalves(one, next);
            } else {
                next.add(one);
            }
        }
        leaves = next;
    }

    private List<Leaf> beyond = new ArrayList<>();

    /** The mesh continued outward until V differs from its limit by less than its hold on a node. */
    Element[] continued(Element[] inside) {
        beyond = new ArrayList<>();
        double edge = edge();
        while (edge < potentials.problem().outerWall()
                && edge < 0x1p120
                && potentials.strengthBeyond(edge) > 1e-7
                && beyond.size() < 40) {
            Leaf next = leaf(edge, ladder.outward(edge));
            beyond.add(next);
            edge = next.to;
        }
        Element[] all = java.util.Arrays.copyOf(inside, inside.length + beyond.size());
        for (int i = 0; i < beyond.size(); i++) {
            all[inside.length + i] = beyond.get(i).element(potentials, scratch);
        }
        return all;
    }

    /** Outer end of the continued mesh. */
    double lastEdge() {
        return beyond.isEmpty() ? edge() : beyond.get(beyond.size() - 1).to;
    }
}
