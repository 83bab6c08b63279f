package org.wellwright.solver.numerics;

import java.util.Arrays;

/**
 * A chain of elements of several coupled channels, zero at both ends, as a condensed pencil: {@link ScalarChain} with
 * C×C blocks.
 *
 * <p>The unknowns of block v are the C values at edge v and the modes of the element to its right that lie near the
 * shift (block 0 also has those of the first element), so that no pole is ever condensed. Unknowns are scaled to unit
 * mass; small blocks are inverted through their eigenvalues, which also give the inertia and, at the twist, the null
 * vector.
 */
public final class BlockChain implements CondensedPencil {
    private static final int MOST_EXPLICIT = 8;

    private final Element[] element;
    private final int count;
    private final int blocks;
    private final int channels;
    private final int modes;
    private final double[] edgeScale;

    /** A chain of at least two elements. */
    public BlockChain(Element[] elements) {
        if (elements.length < 2) {
            throw new IllegalArgumentException("a chain needs at least two elements, got " + elements.length);
        }
        element = elements;
        count = elements.length;
        blocks = count - 1;
        channels = elements[0].channels;
        modes = elements[0].modes;
        edgeScale = new double[blocks * channels];
        for (int v = 0; v < blocks; v++) {
            for (int c = 0; c < channels; c++) {
                double mass = elements[v].mRightRight[c] + elements[v + 1].mLeftLeft[c];
                edgeScale[v * channels + c] = 1 / Math.sqrt(mass);
            }
        }
    }

    @Override
    public Work work() {
        return new State();
    }

    @Override
    public Element[] elements() {
        return element;
    }

    private final class State implements Work {
        private final double[][] leftLeft = new double[count][channels * channels];
        private final double[][] leftRight = new double[count][channels * channels];
        private final double[][] rightRight = new double[count][channels * channels];
        private final int[][] explicit = new int[count][];
        private final int[] size = new int[blocks];
        /** Own block with what is eliminated on the left, inverted. */
        private final double[][] forwardInverse = new double[blocks][];

        private final double[][] forward = new double[blocks][];
        /** Own block with what is eliminated on the right, inverted. */
        private final double[][] backwardInverse = new double[blocks][];

        private final double[][] fromRight = new double[blocks][];
        private final double[] vertex = new double[blocks * channels];
        private final double[] amplitude = new double[count * modes];

        private double shift;
        private int below;
        private int twist;
        private double[] direction;
        private double gamma;
        private double[] twistValues;
        private double[] twistVectors;
        private double mass;

        @Override
        public int count(double at) {
            condense(at);
            eliminateForward();
            return below;
        }

        @Override
        public int countOpen(double at, double[] boundary) {
            condense(at);
            eliminateForward();
            double[] end = outerBlock();
            double scale = element[count - 1].unit / element[count - 1].kinetic;
            for (int c = 0; c < channels; c++) {
                end[c * channels + c] += boundary[c];
            }
            for (int i = 0; i < end.length; i++) {
                end[i] *= scale;
            }
            double[] values = new double[channels];
            SymmetricEigen.decompose(end, channels, values, new double[channels + channels * channels]);
            int more = 0;
            for (double value : values) {
                more += value < 0 ? 1 : 0;
            }
            return below + more;
        }

        /** What all elements leave at the outer end. */
        private double[] outerBlock() {
            int e = count - 1;
            int v = blocks - 1;
            double[] end = rightRight[e].clone();
            int s = size[v];
            double[] coupling = new double[s * channels];
            for (int c = 0; c < channels; c++) {
                for (int d = 0; d < channels; d++) {
                    coupling[c * channels + d] = edgeScale[v * channels + c] * leftRight[e][c * channels + d];
                }
            }
            int at = s - explicit[e].length;
            for (int z = 0; z < explicit[e].length; z++) {
                for (int d = 0; d < channels; d++) {
                    coupling[(at + z) * channels + d] = right(e, explicit[e][z], d);
                }
            }
            for (int c = 0; c < channels; c++) {
                for (int d = 0; d < channels; d++) {
                    double sum = 0;
                    for (int i = 0; i < s; i++) {
                        for (int j = 0; j < s; j++) {
                            sum += coupling[i * channels + c]
                                    * forwardInverse[v][i * s + j]
                                    * coupling[j * channels + d];
                        }
                    }
                    end[c * channels + d] -= sum;
                }
            }
            return end;
        }

        @Override
        public void solve(double at, boolean[] allowed) {
            condense(at);
            eliminateForward();
            eliminateBackward();
            chooseTwist(allowed);
            fill();
        }

        @Override
        public int below() {
            return below;
        }

        @Override
        public double correction() {
            return gamma / mass;
        }

        @Override
        public double[] vertices() {
            return vertex;
        }

        @Override
        public double[] amplitudes() {
            return amplitude;
        }

        @Override
        public int first(int e) {
            return e * modes;
        }

        @Override
        public int step() {
            return 1;
        }

        private double left(int e, int k, int c) {
            return element[e].alphaLeft[c * modes + k] - shift * element[e].betaLeft[c * modes + k];
        }

        private double right(int e, int k, int c) {
            return element[e].alphaRight[c * modes + k] - shift * element[e].betaRight[c * modes + k];
        }

        private void condense(double at) {
            shift = at;
            below = 0;
            for (int e = 0; e < count; e++) {
                explicit[e] = nearModes(e);
                condense(e);
            }
            for (int v = 0; v < blocks; v++) {
                size[v] = channels + explicit[v + 1].length + (v == 0 ? explicit[0].length : 0);
            }
        }

        private int[] nearModes(int e) {
            Element one = element[e];
            double natural = 4 * one.kinetic / one.unit;
            int nearest = 0;
            int[] near = new int[MOST_EXPLICIT];
            int n = 0;
            for (int k = 0; k < modes; k++) {
                double delta = Math.abs(one.lambda[k] - shift);
                if (delta < Math.abs(one.lambda[nearest] - shift)) {
                    nearest = k;
                }
                double strength = 0;
                for (int c = 0; c < channels; c++) {
                    double l = left(e, k, c);
                    double r = right(e, k, c);
                    strength += l * l + r * r;
                }
                if (!(strength <= natural * delta) && n < MOST_EXPLICIT) {
                    near[n++] = k;
                }
            }
            if (n == 0) {
                near[n++] = nearest;
            }
            return Arrays.copyOf(near, n);
        }

        private boolean isExplicit(int e, int k) {
            for (int z : explicit[e]) {
                if (z == k) {
                    return true;
                }
            }
            return false;
        }

        private void condense(int e) {
            Element one = element[e];
            int c2 = channels * channels;
            for (int i = 0; i < c2; i++) {
                leftLeft[e][i] = one.aLeftLeft[i];
                leftRight[e][i] = one.aLeftRight[i];
                rightRight[e][i] = one.aRightRight[i];
            }
            for (int c = 0; c < channels; c++) {
                int cc = c * channels + c;
                leftLeft[e][cc] -= shift * one.mLeftLeft[c];
                leftRight[e][cc] -= shift * one.mLeftRight[c];
                rightRight[e][cc] -= shift * one.mRightRight[c];
            }
            for (int k = 0; k < modes; k++) {
                double delta = one.lambda[k] - shift;
                if (isExplicit(e, k)) {
                    continue;
                }
                if (delta < 0) {
                    below++;
                }
                double inverse = 1 / delta;
                for (int c = 0; c < channels; c++) {
                    double l = left(e, k, c) * inverse;
                    double r = right(e, k, c) * inverse;
                    for (int d = 0; d < channels; d++) {
                        double rd = right(e, k, d);
                        leftLeft[e][c * channels + d] -= l * left(e, k, d);
                        leftRight[e][c * channels + d] -= l * rd;
                        rightRight[e][c * channels + d] -= r * rd;
                    }
                }
            }
        }

        /**
         * Own matrix of a block in scaled unknowns: edge values, modes to the right, for block 0 modes of element 0.
         */
        private double[] own(int v) {
            int s = size[v];
            double[] m = new double[s * s];
            for (int c = 0; c < channels; c++) {
                for (int d = 0; d < channels; d++) {
                    m[c * s + d] = edgeScale[v * channels + c]
                            * edgeScale[v * channels + d]
                            * (rightRight[v][c * channels + d] + leftLeft[v + 1][c * channels + d]);
                }
            }
            int at = channels;
            if (v == 0) {
                // Modes of the first element come before those of the second.
                for (int k : explicit[0]) {
                    m[at * s + at] = element[0].lambda[k] - shift;
                    for (int c = 0; c < channels; c++) {
                        double x = edgeScale[c] * right(0, k, c);
                        m[at * s + c] = x;
                        m[c * s + at] = x;
                    }
                    at++;
                }
            }
            for (int k : explicit[v + 1]) {
                m[at * s + at] = element[v + 1].lambda[k] - shift;
                for (int c = 0; c < channels; c++) {
                    double x = edgeScale[v * channels + c] * left(v + 1, k, c);
                    m[at * s + c] = x;
                    m[c * s + at] = x;
                }
                at++;
            }
            return m;
        }

        /** Coupling of block v to the edge values of block v + 1, {@code [i * C + d]}. */
        private double[] coupling(int v) {
            int s = size[v];
            int e = v + 1;
            double[] w = new double[s * channels];
            for (int d = 0; d < channels; d++) {
                double scale = edgeScale[e * channels + d];
                for (int c = 0; c < channels; c++) {
                    w[c * channels + d] = edgeScale[v * channels + c] * leftRight[e][c * channels + d] * scale;
                }
                int at = s - explicit[e].length;
                for (int z = 0; z < explicit[e].length; z++) {
                    w[(at + z) * channels + d] = right(e, explicit[e][z], d) * scale;
                }
            }
            return w;
        }

        /** Inverse through eigenvalues; returns the number of negative ones. */
        private int invert(double[] m, int s, double[] into) {
            double[] vectors = m.clone();
            double[] values = new double[s];
            SymmetricEigen.decompose(vectors, s, values, new double[s + s * s]);
            int negative = 0;
            double largest = 0;
            for (int k = 0; k < s; k++) {
                largest = Math.max(largest, Math.abs(values[k]));
            }
            Arrays.fill(into, 0);
            for (int k = 0; k < s; k++) {
                if (values[k] < 0) {
                    negative++;
                }
                double safe = Math.abs(values[k]) < 0x1p-300 * largest ? 0x1p-300 * largest : values[k];
                for (int i = 0; i < s; i++) {
                    double x = vectors[k * s + i] / safe;
                    for (int j = 0; j < s; j++) {
                        into[i * s + j] += x * vectors[k * s + j];
                    }
                }
            }
            return negative;
        }

        private void eliminateForward() {
            double[] carried = null;
            for (int v = 0; v < blocks; v++) {
                int s = size[v];
                double[] m = own(v);
                if (carried != null) {
                    for (int c = 0; c < channels; c++) {
                        for (int d = 0; d < channels; d++) {
                            m[c * s + d] -= carried[c * channels + d];
                        }
                    }
                }
                forward[v] = m;
                forwardInverse[v] = new double[s * s];
                below += invert(m, s, forwardInverse[v]);
                if (v < blocks - 1) {
                    carried = sandwich(coupling(v), forwardInverse[v], s);
                }
            }
        }

        /** wᵀ m w with w s×C. */
        private double[] sandwich(double[] w, double[] m, int s) {
            double[] half = new double[s * channels];
            for (int i = 0; i < s; i++) {
                for (int j = 0; j < s; j++) {
                    double x = m[i * s + j];
                    for (int d = 0; d < channels; d++) {
                        half[i * channels + d] += x * w[j * channels + d];
                    }
                }
            }
            double[] result = new double[channels * channels];
            for (int i = 0; i < s; i++) {
                for (int c = 0; c < channels; c++) {
                    for (int d = 0; d < channels; d++) {
                        result[c * channels + d] += w[i * channels + c] * half[i * channels + d];
                    }
                }
            }
            return result;
        }

        /** fromRight[v] is what the blocks right of v take from it. */
        private void eliminateBackward() {
            for (int v = blocks - 1; v >= 0; v--) {
                int s = size[v];
                double[] m = own(v);
                fromRight[v] = new double[s * s];
                if (v < blocks - 1) {
                    double[] w = coupling(v);
                    int t = size[v + 1];
                    double[] inner = backwardInverse[v + 1];
                    for (int i = 0; i < s; i++) {
                        for (int j = 0; j < s; j++) {
                            double sum = 0;
                            for (int c = 0; c < channels; c++) {
                                for (int d = 0; d < channels; d++) {
                                    sum += w[i * channels + c] * inner[c * t + d] * w[j * channels + d];
                                }
                            }
                            fromRight[v][i * s + j] = sum;
                            m[i * s + j] -= sum;
                        }
                    }
                }
                backwardInverse[v] = new double[s * s];
                invert(m, s, backwardInverse[v]);
            }
        }

        private void chooseTwist(boolean[] allowed) {
            double best = Double.POSITIVE_INFINITY;
            twist = -1;
            for (int v = 0; v < blocks; v++) {
                if (allowed != null && !allowed[v + 1]) {
                    continue;
                }
                int s = size[v];
                double[] m = forward[v].clone();
                for (int i = 0; i < m.length; i++) {
                    m[i] -= fromRight[v][i];
                }
                double[] values = new double[s];
                SymmetricEigen.decompose(m, s, values, new double[s + s * s]);
                for (int k = 0; k < s; k++) {
                    if (Math.abs(values[k]) < best) {
                        best = Math.abs(values[k]);
                        twist = v;
                        gamma = values[k];
                        direction = Arrays.copyOfRange(m, k * s, k * s + s);
                        twistValues = values;
                        twistVectors = m;
                    }
                }
            }
            if (twist < 0) {
                chooseTwist(null);
            }
        }

        private void fill() {
            double[][] x = new double[blocks][];
            x[twist] = direction;
            spread(x, null);
            unpack(x, null);
            mass();
        }

        /** From the twist outward; with loads already eliminated to each block if given. */
        private void spread(double[][] x, double[][] load) {
            for (int v = twist - 1; v >= 0; v--) {
                int s = size[v];
                double[] w = coupling(v);
                double[] b = load == null ? new double[s] : load[v].clone();
                for (int i = 0; i < s; i++) {
                    for (int d = 0; d < channels; d++) {
                        b[i] -= w[i * channels + d] * x[v + 1][d];
                    }
                }
                x[v] = product(forwardInverse[v], b, s);
            }
            for (int v = twist + 1; v < blocks; v++) {
                int s = size[v];
                double[] w = coupling(v - 1);
                double[] b = load == null ? new double[s] : load[v].clone();
                for (int d = 0; d < channels; d++) {
                    for (int i = 0; i < size[v - 1]; i++) {
                        b[d] -= w[i * channels + d] * x[v - 1][i];
                    }
                }
                x[v] = product(backwardInverse[v], b, s);
            }
        }

        private double[] product(double[] m, double[] b, int s) {
            double[] x = new double[s];
            for (int i = 0; i < s; i++) {
                for (int j = 0; j < s; j++) {
                    x[i] += m[i * s + j] * b[j];
                }
            }
            return x;
        }

        private void unpack(double[][] x, double[] modeLoad) {
            Arrays.fill(amplitude, 0);
            for (int v = 0; v < blocks; v++) {
                for (int c = 0; c < channels; c++) {
                    vertex[v * channels + c] = edgeScale[v * channels + c] * x[v][c];
                }
                int at = channels;
                if (v == 0) {
                    for (int k : explicit[0]) {
                        amplitude[k] = x[0][at++];
                    }
                }
                for (int k : explicit[v + 1]) {
                    amplitude[(v + 1) * modes + k] = x[v][at++];
                }
            }
            for (int e = 0; e < count; e++) {
                for (int k = 0; k < modes; k++) {
                    if (!isExplicit(e, k)) {
                        double sum = modeLoad == null ? 0 : modeLoad[e * modes + k];
                        for (int c = 0; c < channels; c++) {
                            sum -= left(e, k, c) * value(e - 1, c) + right(e, k, c) * value(e, c);
                        }
                        amplitude[e * modes + k] = sum / (element[e].lambda[k] - shift);
                    }
                }
            }
        }

        private double value(int v, int c) {
            return v < 0 || v >= blocks ? 0 : vertex[v * channels + c];
        }

        private void mass() {
            mass = 0;
            for (int e = 0; e < count; e++) {
                Element one = element[e];
                for (int c = 0; c < channels; c++) {
                    double l = value(e - 1, c);
                    double r = value(e, c);
                    mass += one.mLeftLeft[c] * l * l + 2 * one.mLeftRight[c] * l * r + one.mRightRight[c] * r * r;
                }
                for (int k = 0; k < modes; k++) {
                    double a = amplitude[e * modes + k];
                    double cross = 0;
                    for (int c = 0; c < channels; c++) {
                        cross += one.betaLeft[c * modes + k] * value(e - 1, c)
                                + one.betaRight[c * modes + k] * value(e, c);
                    }
                    mass += a * (a + 2 * cross);
                }
            }
        }

        @Override
        public void respond(double[] vertexLoad, double[] modeLoad) {
            double[][] load = new double[blocks][];
            for (int v = 0; v < blocks; v++) {
                load[v] = blockLoad(v, vertexLoad, modeLoad);
            }
            for (int v = 0; v < twist; v++) {
                double[] w = coupling(v);
                double[] x = product(forwardInverse[v], load[v], size[v]);
                for (int d = 0; d < channels; d++) {
                    for (int i = 0; i < size[v]; i++) {
                        load[v + 1][d] -= w[i * channels + d] * x[i];
                    }
                }
            }
            for (int v = blocks - 1; v > twist; v--) {
                double[] w = coupling(v - 1);
                double[] x = product(backwardInverse[v], load[v], size[v]);
                for (int i = 0; i < size[v - 1]; i++) {
                    for (int d = 0; d < channels; d++) {
                        load[v - 1][i] -= w[i * channels + d] * x[d];
                    }
                }
            }
            double[][] x = new double[blocks][];
            int s = size[twist];
            x[twist] = new double[s];
            for (int k = 0; k < s; k++) {
                if (twistValues[k] == gamma) {
                    continue;
                }
                double along = 0;
                for (int i = 0; i < s; i++) {
                    along += twistVectors[k * s + i] * load[twist][i];
                }
                for (int i = 0; i < s; i++) {
                    x[twist][i] += twistVectors[k * s + i] * along / twistValues[k];
                }
            }
            spread(x, load);
            unpack(x, modeLoad);
        }

        /** Load of a block with the condensed modes' part, in scaled unknowns. */
        private double[] blockLoad(int v, double[] vertexLoad, double[] modeLoad) {
            double[] b = new double[size[v]];
            for (int c = 0; c < channels; c++) {
                double sum = vertexLoad[v * channels + c];
                for (int k = 0; k < modes; k++) {
                    if (!isExplicit(v, k)) {
                        sum -= right(v, k, c) * modeLoad[v * modes + k] / (element[v].lambda[k] - shift);
                    }
                    if (!isExplicit(v + 1, k)) {
                        sum -= left(v + 1, k, c) * modeLoad[(v + 1) * modes + k] / (element[v + 1].lambda[k] - shift);
                    }
                }
                b[c] = edgeScale[v * channels + c] * sum;
            }
            int at = channels;
            if (v == 0) {
                for (int k : explicit[0]) {
                    b[at++] = modeLoad[k];
                }
            }
            for (int k : explicit[v + 1]) {
                b[at++] = modeLoad[(v + 1) * modes + k];
            }
            return b;
        }
    }
}
