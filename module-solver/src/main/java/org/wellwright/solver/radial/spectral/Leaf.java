package org.wellwright.solver.radial.spectral;

import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;

/** One element of a mesh under construction: its samples of V, its classical integrals, and once asked its matrices. */
final class Leaf {
    final double from;
    final double to;
    final double unit;
    final ElementBasis[] basis;
    /** V of all channels at the assembly nodes, {@code [c * C + d][g]}; see {@link ChannelPotentials#sample}. */
    final double[][] potential;

    final double[] radius;
    final double[] envelope;
    private final double kinetic;
    private double[] known = new double[0];
    private double[] forbidden = new double[0];
    private double[] phase = new double[0];
    private double[] time = new double[0];
    private double[] kineticTime = new double[0];
    private double[] potentialTime = new double[0];
    private int cached;
    private Element element;

    Leaf(ChannelPotentials potentials, int degree, double from, double to) {
        this.from = from;
        this.to = to;
        kinetic = potentials.kinetic();
        basis = bases(potentials, degree, from);
        unit = from == 0 ? to : 0.5 * (to - from);
        radius = nodes(basis[0].assembly, from, to);
        potential = potentials.sample(radius, radius.length);
        envelope = new double[radius.length];
        potentials.envelope(potential, radius, radius.length, envelope);
    }

    static ElementBasis[] bases(ChannelPotentials potentials, int degree, double from) {
        ElementBasis[] bases = new ElementBasis[potentials.channels()];
        for (int c = 0; c < bases.length; c++) {
            bases[c] = from == 0
                    ? ElementBasis.origin(degree, potentials.exponent(c), potentials.leastExponent())
                    : ElementBasis.ordinary(degree);
        }
        return bases;
    }

    static double[] nodes(ElementBasis.Table table, double from, double to) {
        double[] r = new double[table.size];
        double width = to - from;
        for (int g = 0; g < r.length; g++) {
            r[g] = from + width * table.position[g];
        }
        return r;
    }

    boolean atOrigin() {
        return from == 0;
    }

    /** Position of the classical integrals at E, computed at the first call. */
    int at(double energy) {
        for (int i = 0; i < cached; i++) {
            if (known[i] == energy) {
                return i;
            }
        }
        if (cached == known.length) {
            int size = Math.max(4, 2 * cached);
            known = java.util.Arrays.copyOf(known, size);
            forbidden = java.util.Arrays.copyOf(forbidden, size);
            phase = java.util.Arrays.copyOf(phase, size);
            time = java.util.Arrays.copyOf(time, size);
            kineticTime = java.util.Arrays.copyOf(kineticTime, size);
            potentialTime = java.util.Arrays.copyOf(potentialTime, size);
        }
        double[] weight = basis[0].assembly.weight;
        double f = 0;
        double p = 0;
        double t = 0;
        double k = 0;
        double v = 0;
        double softening = kinetic / (unit * unit);
        for (int g = 0; g < radius.length; g++) {
            double w = weight[g] * unit;
            if (atOrigin()) {
                // The rule holds t^{2b−2} there; only a rough integral is needed.
                w = unit / radius.length;
            }
            double excess = energy - envelope[g];
            if (excess > 0) {
                double root = Math.sqrt(excess / kinetic);
                p += w * root;
                double slow = w / Math.sqrt((excess + softening) / kinetic);
                t += slow;
                k += slow * excess;
                v += slow * Math.abs(potential[0][g]);
            } else {
                f += w * Math.sqrt(-excess / kinetic);
            }
        }
        known[cached] = energy;
        forbidden[cached] = atOrigin() ? 0 : f;
        phase[cached] = p;
        time[cached] = t;
        kineticTime[cached] = k;
        potentialTime[cached] = v;
        return cached++;
    }

    /** ∫ √((V − E)/κ) dr over the forbidden part. */
    double forbidden(int at) {
        return forbidden[at];
    }

    /** ∫ √((E − V)/κ) dr over the allowed part. */
    double phase(int at) {
        return phase[at];
    }

    /** ∫ dr/k over the allowed part, softened at turning points. */
    double time(int at) {
        return time[at];
    }

    /** The same with weight E − V: kinetic energy. */
    double kineticTime(int at) {
        return kineticTime[at];
    }

    /** The same with weight |V|. */
    double potentialTime(int at) {
        return potentialTime[at];
    }

    /** The matrices, built at the first call. */
    Element element(ChannelPotentials potentials, Element.Scratch scratch) {
        if (element == null) {
            element = new Element(basis, kinetic, unit, effective(potentials, potential, radius, atOrigin()), scratch);
        }
        return element;
    }

    /** V with the centrifugal term, or at the origin without what the exponents hold. */
    static double[][] effective(ChannelPotentials potentials, double[][] potential, double[] radius, boolean origin) {
        int channels = potentials.channels();
        double[][] w = potential.clone();
        for (int c = 0; c < channels; c++) {
            double strength = origin ? -potentials.inverseSquare(c) : potentials.kinetic() * potentials.centrifugal(c);
            if (strength != 0) {
                double[] own = potential[c * channels + c].clone();
                for (int g = 0; g < own.length; g++) {
                    own[g] += strength / (radius[g] * radius[g]);
                }
                w[c * channels + c] = own;
            }
        }
        return w;
    }
}
