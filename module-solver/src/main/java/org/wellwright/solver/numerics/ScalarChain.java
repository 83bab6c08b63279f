package org.wellwright.solver.numerics;

/**
 * A chain of elements of one channel, zero at both ends, as a condensed pencil in the element edges: counts of levels
 * and null vectors at any shift.
 *
 * <p>At a shift σ each element contributes S_ij = a_ij − σ m_ij − Σ_k e_ik e_jk/(λ_k − σ), e = α − σβ; the number of
 * levels below σ is Σ #(λ_k &lt; σ) plus the negative pivots of the tridiagonal S (Wittrick and Williams 1971;
 * Sylvester). Near a pole λ_k the mode is kept as an unknown of its own and eliminated with its left neighbour by a 2×2
 * pivot, so that nothing is lost where a level vanishes at an element edge. Vectors come from the twisted factorisation
 * at the unknown whose γ over mass is least (Dhillon and Parlett 2004).
 */
public final class ScalarChain implements CondensedPencil {
    private final Element[] element;
    private final int count;
    private final int modes;
    private final double[] lambda;
    private final double[] lambdaByElement;
    private final double[] alphaLeft;
    private final double[] betaLeft;
    private final double[] alphaRight;
    private final double[] betaRight;
    private final double[] aLeftLeft;
    private final double[] aLeftRight;
    private final double[] aRightRight;
    private final double[] mLeftLeft;
    private final double[] mLeftRight;
    private final double[] mRightRight;
    private final double[] natural;

    /** The state of one shift; made once per thread and used again and again. */
    private final class State implements Work {
        private final double[] leftLeft = new double[count];
        private final double[] leftRight = new double[count];
        private final double[] rightRight = new double[count];
        private final int[] nearest = new int[count];
        private final double[] delta = new double[count];
        private final boolean[] near = new boolean[count];
        private final double[] forward = new double[count];
        private final double[] backward = new double[count];
        private final double[] vertex = new double[Math.max(0, count - 1)];
        private final double[] amplitude = new double[modes * count];

        private double shift;
        private int below;
        private int twistVertex;
        private int twistElement;
        private double gamma;
        private double mass;

        @Override
        public int count(double at) {
            return ScalarChain.this.count(at, this);
        }

        @Override
        public int countOpen(double at, double[] boundary) {
            int below = ScalarChain.this.count(at, this);
            int e = count - 1;
            double d = forward[e - 1] + leftLeft[e];
            double end = rightRight[e] - leftRight[e] * leftRight[e] / awayFromZero(d, e) + boundary[0];
            return below + (end < 0 ? 1 : 0);
        }

        @Override
        public void solve(double at, boolean[] allowed) {
            ScalarChain.this.solve(at, this, allowed);
        }

        @Override
        public void respond(double[] vertexLoad, double[] modeLoad) {
            ScalarChain.this.respond(vertexLoad, modeLoad, this);
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
            return e;
        }

        @Override
        public int step() {
            return count;
        }
    }

    /** A chain of at least two elements; none of their arrays is copied more than once. */
    public ScalarChain(Element[] elements) {
        if (elements.length < 2) {
            throw new IllegalArgumentException("a chain needs at least two elements, got " + elements.length);
        }
        element = elements;
        count = elements.length;
        modes = elements[0].modes;
        int total = count * modes;
        lambda = new double[total];
        lambdaByElement = new double[total];
        alphaLeft = new double[total];
        betaLeft = new double[total];
        alphaRight = new double[total];
        betaRight = new double[total];
        aLeftLeft = new double[count];
        aLeftRight = new double[count];
        aRightRight = new double[count];
        mLeftLeft = new double[count];
        mLeftRight = new double[count];
        mRightRight = new double[count];
        natural = new double[count];
        for (int e = 0; e < count; e++) {
            Element one = elements[e];
            for (int k = 0; k < modes; k++) {
                int at = k * count + e;
                lambda[at] = one.lambda[k];
                lambdaByElement[e * modes + k] = one.lambda[k];
                alphaLeft[at] = one.alphaLeft[k];
                betaLeft[at] = one.betaLeft[k];
                alphaRight[at] = one.alphaRight[k];
                betaRight[at] = one.betaRight[k];
            }
            aLeftLeft[e] = one.aLeftLeft[0];
            aLeftRight[e] = one.aLeftRight[0];
            aRightRight[e] = one.aRightRight[0];
            mLeftLeft[e] = one.mLeftLeft[0];
            mLeftRight[e] = one.mLeftRight[0];
            mRightRight[e] = one.mRightRight[0];
            natural[e] = one.kinetic / one.unit;
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

    private int count(double shift, State work) {
        condense(shift, work);
        eliminateForward(work);
        double last = work.leftLeft[count - 1] + work.forward[count - 2];
        return work.below + (last < 0 ? 1 : 0);
    }

    private void condense(double shift, State work) {
        int n = count;
        double[] ll = work.leftLeft;
        double[] lr = work.leftRight;
        double[] rr = work.rightRight;
        for (int e = 0; e < n; e++) {
            ll[e] = aLeftLeft[e] - shift * mLeftLeft[e];
            lr[e] = aLeftRight[e] - shift * mLeftRight[e];
            rr[e] = aRightRight[e] - shift * mRightRight[e];
        }
        for (int k = 0; k < modes; k++) {
            int base = k * n;
            for (int e = 0; e < n; e++) {
                double inverse = 1 / (lambda[base + e] - shift);
                double left = alphaLeft[base + e] - shift * betaLeft[base + e];
                double right = alphaRight[base + e] - shift * betaRight[base + e];
                ll[e] -= left * left * inverse;
                lr[e] -= left * right * inverse;
                rr[e] -= right * right * inverse;
            }
        }
        int below = 0;
        for (int e = 0; e < n; e++) {
            int first = e * modes;
            int k = 0;
            while (k < modes && lambdaByElement[first + k] < shift) {
                k++;
            }
            below += k;
            if (k == modes || (k > 0 && shift - lambdaByElement[first + k - 1] < lambdaByElement[first + k] - shift)) {
                k--;
            }
            double delta = lambdaByElement[first + k] - shift;
            work.nearest[e] = k;
            work.delta[e] = delta;
            int at = k * n + e;
            double left = alphaLeft[at] - shift * betaLeft[at];
            double right = alphaRight[at] - shift * betaRight[at];
            double size = Math.max(left * left, right * right);
            // Not "size > …": a zero delta must be near, and NaN must not pass.
            boolean near = !(size <= 4 * natural[e] * Math.abs(delta));
            if (near && (e == 0 || e == n - 1) && delta != 0) {
                near = false;
            }
            work.near[e] = near;
            if (near) {
                withoutMode(e, k, shift, work);
                if (delta < 0) {
                    below--;
                }
            }
        }
        work.below = below;
        work.shift = shift;
    }

    private void withoutMode(int e, int skip, double shift, State work) {
        double ll = aLeftLeft[e] - shift * mLeftLeft[e];
        double lr = aLeftRight[e] - shift * mLeftRight[e];
        double rr = aRightRight[e] - shift * mRightRight[e];
        for (int k = 0; k < modes; k++) {
            if (k != skip) {
                int at = k * count + e;
                double inverse = 1 / (lambda[at] - shift);
                double left = alphaLeft[at] - shift * betaLeft[at];
                double right = alphaRight[at] - shift * betaRight[at];
                ll -= left * left * inverse;
                lr -= left * right * inverse;
                rr -= right * right * inverse;
            }
        }
        work.leftLeft[e] = ll;
        work.leftRight[e] = lr;
        work.rightRight[e] = rr;
    }

    private double couplingLeft(int e, int k, double shift) {
        int at = k * count + e;
        return alphaLeft[at] - shift * betaLeft[at];
    }

    private double couplingRight(int e, int k, double shift) {
        int at = k * count + e;
        return alphaRight[at] - shift * betaRight[at];
    }

    private double awayFromZero(double pivot, int e) {
        double least = natural[e] * 0x1p-200;
        return Math.abs(pivot) < least ? least : pivot;
    }

    /** Pivots from the left: forward[e] is what elements 0 … e leave at the right edge of e. */
    private void eliminateForward(State work) {
        double shift = work.shift;
        double f;
        if (work.near[0]) {
            // Only at delta = 0: the mode ties the first edge to zero.
            double r = couplingRight(0, work.nearest[0], shift);
            double pivot = awayFromZero(work.delta[0], 0);
            f = work.rightRight[0] - r * r / pivot;
        } else {
            f = work.rightRight[0];
        }
        work.forward[0] = f;
        for (int e = 1; e < count - 1; e++) {
            double d = f + work.leftLeft[e];
            if (work.near[e]) {
                int k = work.nearest[e];
                double delta = work.delta[e];
                double l = couplingLeft(e, k, shift);
                double r = couplingRight(e, k, shift);
                double s = work.leftRight[e];
                double det = d * delta - l * l;
                if (det < 0) {
                    work.below++;
                } else if (d < 0) {
                    work.below += 2;
                }
                det = det == 0 ? l * l * 0x1p-60 + Double.MIN_NORMAL : det;
                f = work.rightRight[e] - (s * s * delta - 2 * s * l * r + r * r * d) / det;
            } else {
                d = awayFromZero(d, e);
                if (d < 0) {
                    work.below++;
                }
                double s = work.leftRight[e];
                f = work.rightRight[e] - s * s / d;
            }
            work.forward[e] = f;
        }
        if (work.near[count - 1]) {
            int e = count - 1;
            double l = couplingLeft(e, work.nearest[e], shift);
            work.leftLeft[e] -= l * l / awayFromZero(work.delta[e], e);
            work.near[e] = false;
        }
    }

    /** Pivots from the right: backward[e] is what elements e … end leave at the left edge of e. */
    private void eliminateBackward(State work) {
        double shift = work.shift;
        double b = work.leftLeft[count - 1];
        work.backward[count - 1] = b;
        for (int e = count - 2; e > 0; e--) {
            double d = b + work.rightRight[e];
            double s = work.leftRight[e];
            if (work.near[e]) {
                int k = work.nearest[e];
                double delta = work.delta[e];
                double l = couplingLeft(e, k, shift);
                double r = couplingRight(e, k, shift);
                double det = d * delta - r * r;
                det = det == 0 ? r * r * 0x1p-60 + Double.MIN_NORMAL : det;
                b = work.leftLeft[e] - (s * s * delta - 2 * s * l * r + l * l * d) / det;
            } else {
                d = awayFromZero(d, e);
                b = work.leftLeft[e] - s * s / d;
            }
            work.backward[e] = b;
        }
    }

    private void solve(double shift, State work, boolean[] allowed) {
        condense(shift, work);
        eliminateForward(work);
        double last = work.leftLeft[count - 1] + work.forward[count - 2];
        if (last < 0) {
            work.below++;
        }
        eliminateBackward(work);
        chooseTwist(work, allowed);
        fill(work);
    }

    private void chooseTwist(State work, boolean[] allowed) {
        double best = Double.POSITIVE_INFINITY;
        work.twistVertex = -1;
        work.twistElement = -1;
        for (int v = 0; v < count - 1; v++) {
            if (allowed != null && !allowed[v]) {
                continue;
            }
            double g = work.forward[v] + work.backward[v + 1];
            double measure = Math.abs(g) / (mRightRight[v] + mLeftLeft[v + 1]);
            if (measure < best) {
                best = measure;
                work.twistVertex = v;
                work.gamma = g;
            }
        }
        for (int e = 0; e < count; e++) {
            if (allowed != null && !allowed[e]) {
                continue;
            }
            double g = modeGamma(e, work);
            if (Math.abs(g) < best) {
                best = Math.abs(g);
                work.twistVertex = -1;
                work.twistElement = e;
                work.gamma = g;
            }
        }
        if (work.twistVertex < 0 && work.twistElement < 0) {
            work.twistVertex = 0;
            work.gamma = work.forward[0] + work.backward[1];
        }
    }

    /** γ of the nearest mode of an element: λ − σ minus what the rest of the chain takes. */
    private double modeGamma(int e, State work) {
        int k = work.nearest[e];
        double delta = work.delta[e];
        double l = couplingLeft(e, k, work.shift);
        double r = couplingRight(e, k, work.shift);
        double ll = work.leftLeft[e];
        double lr = work.leftRight[e];
        double rr = work.rightRight[e];
        if (!work.near[e] && delta != 0) {
            ll += l * l / delta;
            lr += l * r / delta;
            rr += r * r / delta;
        }
        if (e == 0) {
            return delta - r * r / awayFromZero(rr + work.backward[1], 0);
        }
        double da = work.forward[e - 1] + ll;
        if (e == count - 1) {
            return delta - l * l / awayFromZero(da, e);
        }
        double db = work.backward[e + 1] + rr;
        double det = da * db - lr * lr;
        return delta - (l * l * db - 2 * l * r * lr + r * r * da) / det;
    }

    private void fill(State work) {
        double shift = work.shift;
        double[] y = work.vertex;
        int explicit = -1;
        int leftFrom;
        int rightFrom;
        double z = 0;
        if (work.twistElement >= 0) {
            int e = work.twistElement;
            explicit = e;
            z = 1;
            int k = work.nearest[e];
            double delta = work.delta[e];
            double l = couplingLeft(e, k, shift);
            double r = couplingRight(e, k, shift);
            double ll = work.leftLeft[e];
            double lr = work.leftRight[e];
            double rr = work.rightRight[e];
            if (!work.near[e] && delta != 0) {
                ll += l * l / delta;
                lr += l * r / delta;
                rr += r * r / delta;
            }
            if (e == 0) {
                y[0] = -r / awayFromZero(rr + work.backward[1], 0);
            } else if (e == count - 1) {
                y[e - 1] = -l / awayFromZero(work.forward[e - 1] + ll, e);
            } else {
                double da = work.forward[e - 1] + ll;
                double db = work.backward[e + 1] + rr;
                double det = da * db - lr * lr;
                y[e - 1] = -(l * db - lr * r) / det;
                y[e] = -(r * da - lr * l) / det;
            }
            leftFrom = e - 1;
            rightFrom = e;
        } else {
            y[work.twistVertex] = 1;
            leftFrom = work.twistVertex;
            rightFrom = work.twistVertex;
        }
        double[] a = work.amplitude;
        // To the left: element e ties y[e] (known) to y[e - 1].
        for (int e = leftFrom; e > 0; e--) {
            double d = work.forward[e - 1] + work.leftLeft[e];
            if (work.near[e]) {
                int k = work.nearest[e];
                double l = couplingLeft(e, k, shift);
                double r = couplingRight(e, k, shift);
                double delta = work.delta[e];
                double s = work.leftRight[e];
                double det = d * delta - l * l;
                det = det == 0 ? l * l * 0x1p-60 + Double.MIN_NORMAL : det;
                y[e - 1] = -y[e] * (s * delta - l * r) / det;
                a[k * count + e] = -y[e] * (r * d - l * s) / det;
            } else {
                y[e - 1] = -y[e] * work.leftRight[e] / awayFromZero(d, e);
            }
        }
        for (int e = rightFrom + 1; e < count - 1; e++) {
            double d = work.backward[e + 1] + work.rightRight[e];
            if (work.near[e]) {
                int k = work.nearest[e];
                double l = couplingLeft(e, k, shift);
                double r = couplingRight(e, k, shift);
                double delta = work.delta[e];
                double s = work.leftRight[e];
                double det = d * delta - r * r;
                det = det == 0 ? r * r * 0x1p-60 + Double.MIN_NORMAL : det;
                y[e] = -y[e - 1] * (s * delta - l * r) / det;
                a[k * count + e] = -y[e - 1] * (l * d - r * s) / det;
            } else {
                y[e] = -y[e - 1] * work.leftRight[e] / awayFromZero(d, e);
            }
        }
        amplitudes(work, explicit, z);
    }

    private void amplitudes(State work, int explicit, double z) {
        double shift = work.shift;
        double[] y = work.vertex;
        double[] a = work.amplitude;
        double mass = 0;
        for (int e = 0; e < count; e++) {
            double left = e == 0 ? 0 : y[e - 1];
            double right = e == count - 1 ? 0 : y[e];
            double own = mLeftLeft[e] * left * left + 2 * mLeftRight[e] * left * right + mRightRight[e] * right * right;
            int skip = work.near[e] || e == explicit ? work.nearest[e] : -1;
            for (int k = 0; k < modes; k++) {
                int at = k * count + e;
                double value;
                if (k == skip) {
                    if (e == explicit) {
                        a[at] = z;
                    } else if (e == 0) {
                        a[at] = -couplingRight(e, k, shift) * right / awayFromZero(work.delta[e], e);
                    }
                    value = a[at];
                } else {
                    double coupling = (alphaLeft[at] - shift * betaLeft[at]) * left
                            + (alphaRight[at] - shift * betaRight[at]) * right;
                    double d = lambda[at] - shift;
                    value = coupling == 0 ? 0 : -coupling / d;
                    a[at] = value;
                }
                own += value * (value + 2 * (betaLeft[at] * left + betaRight[at] * right));
            }
            mass += own;
        }
        work.mass = mass;
    }

    /** Whether a mode is an unknown of its own at the current shift. */
    private boolean explicit(int e, int k, State work) {
        return k == work.nearest[e] && (work.near[e] || e == work.twistElement);
    }

    private void respond(double[] load, double[] modeLoad, State work) {
        double shift = work.shift;
        double[] y = work.vertex;
        double[] a = work.amplitude;
        int t = work.twistElement;
        int inner = count - 1;
        for (int e = 0; e < count; e++) {
            for (int k = 0; k < modes; k++) {
                if (!explicit(e, k, work)) {
                    double scaled = modeLoad[k * count + e] / (lambda[k * count + e] - shift);
                    if (e > 0) {
                        load[e - 1] -= couplingLeft(e, k, shift) * scaled;
                    }
                    if (e < inner) {
                        load[e] -= couplingRight(e, k, shift) * scaled;
                    }
                }
            }
        }
        int leftEnd = t >= 0 ? t - 1 : work.twistVertex;
        int rightEnd = t >= 0 ? t : work.twistVertex;
        // Sweep from both ends; load[v] becomes what is left for edge v after all beyond it is eliminated.
        for (int e = 1; e <= leftEnd; e++) {
            eliminateLoad(e, e - 1, e, work.forward[e - 1] + work.leftLeft[e], true, load, modeLoad, work);
        }
        for (int e = inner - 1; e > rightEnd; e--) {
            eliminateLoad(e, e, e - 1, work.backward[e + 1] + work.rightRight[e], false, load, modeLoad, work);
        }
        if (t >= 0) {
            betweenEdgesOf(t, load, work);
        } else {
            y[work.twistVertex] = 0;
        }
        for (int e = leftEnd; e > 0; e--) {
            back(e, e - 1, e, work.forward[e - 1] + work.leftLeft[e], true, load, modeLoad, work);
        }
        for (int e = rightEnd + 1; e < inner; e++) {
            back(e, e, e - 1, work.backward[e + 1] + work.rightRight[e], false, load, modeLoad, work);
        }
        for (int e = 0; e < count; e++) {
            double left = e == 0 ? 0 : y[e - 1];
            double right = e == inner ? 0 : y[e];
            for (int k = 0; k < modes; k++) {
                int at = k * count + e;
                if (explicit(e, k, work)) {
                    if (e == t) {
                        a[at] = 0;
                    }
                } else {
                    double coupling = couplingLeft(e, k, shift) * left + couplingRight(e, k, shift) * right;
                    a[at] = (modeLoad[at] - coupling) / (lambda[at] - shift);
                }
            }
        }
    }

    private void eliminateLoad(
            int e, int from, int to, double d, boolean rightward, double[] load, double[] modeLoad, State work) {
        double s = work.leftRight[e];
        if (!work.near[e]) {
            load[to] -= s * load[from] / awayFromZero(d, e);
            return;
        }
        int k = work.nearest[e];
        double own = rightward ? couplingLeft(e, k, work.shift) : couplingRight(e, k, work.shift);
        double other = rightward ? couplingRight(e, k, work.shift) : couplingLeft(e, k, work.shift);
        double delta = work.delta[e];
        double det = d * delta - own * own;
        double b = modeLoad[k * count + e];
        double p = (load[from] * delta - own * b) / det;
        double q = (d * b - own * load[from]) / det;
        load[to] -= s * p + other * q;
    }

    private void back(
            int e, int unknown, int known, double d, boolean leftward, double[] load, double[] modeLoad, State work) {
        double s = work.leftRight[e];
        double[] y = work.vertex;
        if (!work.near[e]) {
            y[unknown] = (load[unknown] - s * y[known]) / awayFromZero(d, e);
            return;
        }
        int k = work.nearest[e];
        double own = leftward ? couplingLeft(e, k, work.shift) : couplingRight(e, k, work.shift);
        double other = leftward ? couplingRight(e, k, work.shift) : couplingLeft(e, k, work.shift);
        double delta = work.delta[e];
        double det = d * delta - own * own;
        double b1 = load[unknown] - s * y[known];
        double b2 = modeLoad[k * count + e] - other * y[known];
        y[unknown] = (b1 * delta - own * b2) / det;
        work.amplitude[k * count + e] = (d * b2 - own * b1) / det;
    }

    /** The twist's mode is zero; the two edges of its element remain. */
    private void betweenEdgesOf(int e, double[] load, State work) {
        double[] y = work.vertex;
        double l = couplingLeft(e, work.nearest[e], work.shift);
        double r = couplingRight(e, work.nearest[e], work.shift);
        double ll = work.leftLeft[e];
        double lr = work.leftRight[e];
        double rr = work.rightRight[e];
        if (!work.near[e] && work.delta[e] != 0) {
            ll += l * l / work.delta[e];
            lr += l * r / work.delta[e];
            rr += r * r / work.delta[e];
        }
        if (e == 0) {
            y[0] = load[0] / awayFromZero(rr + work.backward[1], e);
        } else if (e == count - 1) {
            y[e - 1] = load[e - 1] / awayFromZero(work.forward[e - 1] + ll, e);
        } else {
            double da = work.forward[e - 1] + ll;
            double db = work.backward[e + 1] + rr;
            double det = da * db - lr * lr;
            y[e - 1] = (load[e - 1] * db - lr * load[e]) / det;
            y[e] = (load[e] * da - lr * load[e - 1]) / det;
        }
    }
}
