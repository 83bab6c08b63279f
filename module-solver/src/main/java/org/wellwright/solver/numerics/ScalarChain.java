package org.wellwright.solver.numerics;

import java.util.Arrays;

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
    private final int stride;
    private final double[] lambda;
    /** How near σ must come to a mode for it to be kept as an unknown. */
    private final double[] reach;

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
    private final double[] vertexWeight;

    /** The state of one shift; made once per thread and used again and again. */
    private final class State implements Work {
        private final double[] leftLeft = new double[count];
        private final double[] leftRight = new double[count];
        private final double[] rightRight = new double[count];
        private final int[] nearest = new int[count];
        private final double[] delta = new double[count];
        private final boolean[] near = new boolean[count];
        private final double[] nearLeft = new double[count];
        private final double[] nearRight = new double[count];
        private final int[] position = new int[count];
        /** Amplitude of the explicit mode of each element that has one. */
        private final double[] explicit = new double[count];

        private final double[] poleLeftLeft = new double[stride * count];
        private final double[] poleLeftRight = new double[stride * count];
        private final double[] poleRightRight = new double[stride * count];
        private final double[] leftValue = new double[count];
        private final double[] rightValue = new double[count];
        private final double[] own = new double[count];
        private final double[] forward = new double[count];
        private final double[] backward = new double[count];
        private final double[] vertex = new double[Math.max(0, count - 1)];
        private final double[] amplitude = new double[stride * count];

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
            int held = ScalarChain.this.count(at, this);
            int e = count - 1;
            double d = forward[e - 1] + leftLeft[e];
            double s = leftRight[e];
            double end = rightRight[e] + boundary[0];
            if (near[e]) {
                double l = nearLeft[e];
                double r = nearRight[e];
                double det = d * delta[e] - l * l;
                end -= (s * s * delta[e] - 2 * s * l * r + r * r * d) / safe(det, l);
            } else {
                end -= s * s / awayFromZero(d, e);
            }
            return held + (end < 0 ? 1 : 0);
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
            return e * stride;
        }

        @Override
        public int step() {
            return 1;
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
        stride = (modes + 3) / 4 * 4;
        int total = count * stride;
        lambda = new double[total];
        Arrays.fill(lambda, Double.POSITIVE_INFINITY);
        reach = new double[total];
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
        vertexWeight = new double[count - 1];
        for (int e = 0; e < count; e++) {
            Element one = elements[e];
            for (int k = 0; k < modes; k++) {
                int at = e * stride + k;
                lambda[at] = one.lambda[k];
                alphaLeft[at] = one.alphaLeft[k];
                betaLeft[at] = one.betaLeft[k];
                alphaRight[at] = one.alphaRight[k];
                betaRight[at] = one.betaRight[k];
                double left = one.alphaLeft[k] - one.lambda[k] * one.betaLeft[k];
                double right = one.alphaRight[k] - one.lambda[k] * one.betaRight[k];
                reach[at] = Math.max(left * left, right * right) * one.unit / (16 * one.kinetic);
            }
            aLeftLeft[e] = one.aLeftLeft[0];
            aLeftRight[e] = one.aLeftRight[0];
            aRightRight[e] = one.aRightRight[0];
            mLeftLeft[e] = one.mLeftLeft[0];
            mLeftRight[e] = one.mLeftRight[0];
            mRightRight[e] = one.mRightRight[0];
            natural[e] = one.kinetic / one.unit;
        }
        for (int v = 0; v < count - 1; v++) {
            vertexWeight[v] = 1 / (mRightRight[v] + mLeftLeft[v + 1]);
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
        return work.below;
    }

    private void condense(double shift, State work) {
        int n = count;
        ChainKernels.shifted(shift, aLeftLeft, mLeftLeft, work.leftLeft, n);
        ChainKernels.shifted(shift, aLeftRight, mLeftRight, work.leftRight, n);
        ChainKernels.shifted(shift, aRightRight, mRightRight, work.rightRight, n);
        ChainKernels.poles(
                shift,
                lambda,
                alphaLeft,
                betaLeft,
                alphaRight,
                betaRight,
                work.poleLeftLeft,
                work.poleLeftRight,
                work.poleRightRight,
                n * stride);
        work.shift = shift;
        work.below = ChainKernels.nearest(
                shift,
                lambda,
                reach,
                alphaLeft,
                betaLeft,
                alphaRight,
                betaRight,
                work.position,
                work.nearest,
                work.delta,
                work.nearLeft,
                work.nearRight,
                work.near,
                stride,
                modes,
                n);
        for (int e = 0; e < n; e++) {
            if (work.near[e]) {
                int at = e * stride + work.nearest[e];
                work.poleLeftLeft[at] = 0;
                work.poleLeftRight[at] = 0;
                work.poleRightRight[at] = 0;
            }
        }
        ChainKernels.subtractSums(work.poleLeftLeft, stride, work.leftLeft, n);
        ChainKernels.subtractSums(work.poleLeftRight, stride, work.leftRight, n);
        ChainKernels.subtractSums(work.poleRightRight, stride, work.rightRight, n);
    }

    private double couplingLeft(int e, int k, double shift) {
        int at = e * stride + k;
        return alphaLeft[at] - shift * betaLeft[at];
    }

    private double couplingRight(int e, int k, double shift) {
        int at = e * stride + k;
        return alphaRight[at] - shift * betaRight[at];
    }

    private double awayFromZero(double pivot, int e) {
        double least = natural[e] * 0x1p-200;
        return Math.abs(pivot) < least ? least : pivot;
    }

    /** λ − σ of the explicit mode of an end element, kept away from zero. */
    private double endDelta(int e, State work) {
        double least = natural[e] / element[e].unit * 0x1p-200;
        double delta = work.delta[e];
        return Math.abs(delta) < least ? least : delta;
    }

    /** What the first element leaves at its right edge. */
    private double firstPivot(State work) {
        if (!work.near[0]) {
            return work.rightRight[0];
        }
        double delta = endDelta(0, work);
        if (delta < 0) {
            work.below++;
        }
        double r = work.nearRight[0];
        return work.rightRight[0] - r * r / delta;
    }

    /** What the last element leaves at its left edge. */
    private double lastPivot(State work) {
        int e = count - 1;
        if (!work.near[e]) {
            return work.leftLeft[e];
        }
        double l = work.nearLeft[e];
        return work.leftLeft[e] - l * l / endDelta(e, work);
    }

    /** Pivots from the left: forward[e] is what elements 0 … e leave at the right edge of e. Completes the count. */
    private void eliminateForward(State work) {
        double f = firstPivot(work);
        double[] forward = work.forward;
        double[] leftLeft = work.leftLeft;
        double[] leftRight = work.leftRight;
        double[] rightRight = work.rightRight;
        boolean[] near = work.near;
        int below = work.below;
        int last = count - 1;
        forward[0] = f;
        for (int e = 1; e < last; e++) {
            double d = f + leftLeft[e];
            double s = leftRight[e];
            if (near[e]) {
                double delta = work.delta[e];
                double l = work.nearLeft[e];
                double r = work.nearRight[e];
                double det = d * delta - l * l;
                if (det < 0) {
                    below++;
                } else if (d < 0) {
                    below += 2;
                }
                f = rightRight[e] - (s * s * delta - 2 * s * l * r + r * r * d) / safe(det, l);
            } else {
                d = d == 0 ? awayFromZero(d, e) : d;
                below += d < 0 ? 1 : 0;
                f = rightRight[e] - s * s / d;
            }
            forward[e] = f;
        }
        if (near[last] && endDelta(last, work) < 0) {
            below++;
        }
        if (f + lastPivot(work) < 0) {
            below++;
        }
        work.below = below;
    }

    private static double safe(double det, double coupling) {
        return det == 0 ? coupling * coupling * 0x1p-60 + Double.MIN_NORMAL : det;
    }

    /** Pivots from the right: backward[e] is what elements e … end leave at the left edge of e. */
    private void eliminateBackward(State work) {
        double b = lastPivot(work);
        double[] backward = work.backward;
        double[] leftLeft = work.leftLeft;
        double[] leftRight = work.leftRight;
        double[] rightRight = work.rightRight;
        boolean[] near = work.near;
        backward[count - 1] = b;
        for (int e = count - 2; e > 0; e--) {
            double d = b + rightRight[e];
            double s = leftRight[e];
            if (near[e]) {
                double delta = work.delta[e];
                double l = work.nearLeft[e];
                double r = work.nearRight[e];
                double det = d * delta - r * r;
                b = leftLeft[e] - (s * s * delta - 2 * s * l * r + l * l * d) / safe(det, r);
            } else {
                b = leftLeft[e] - s * s / (d == 0 ? awayFromZero(d, e) : d);
            }
            backward[e] = b;
        }
    }

    private void solve(double shift, State work, boolean[] allowed) {
        condense(shift, work);
        eliminateForward(work);
        eliminateBackward(work);
        chooseTwist(work, allowed);
        fill(work);
    }

    private void chooseTwist(State work, boolean[] allowed) {
        double best = Double.POSITIVE_INFINITY;
        work.twistVertex = -1;
        work.twistElement = -1;
        for (int v = 0; v < count - 1; v++) {
            double g = work.forward[v] + work.backward[v + 1];
            double measure = Math.abs(g) * vertexWeight[v];
            if (measure < best && (allowed == null || allowed[v])) {
                best = measure;
                work.twistVertex = v;
                work.gamma = g;
            }
        }
        for (int e = 0; e < count; e++) {
            if (work.near[e] && (allowed == null || allowed[e])) {
                double g = modeGamma(e, work);
                if (Math.abs(g) < best) {
                    best = Math.abs(g);
                    work.twistVertex = -1;
                    work.twistElement = e;
                    work.gamma = g;
                }
            }
        }
        if (work.twistVertex < 0 && work.twistElement < 0) {
            work.twistVertex = 0;
            work.gamma = work.forward[0] + work.backward[1];
        }
    }

    /** γ of the explicit mode of an element: λ − σ minus what the rest of the chain takes. */
    private double modeGamma(int e, State work) {
        double delta = work.delta[e];
        double l = work.nearLeft[e];
        double r = work.nearRight[e];
        if (e == 0) {
            return delta - r * r / awayFromZero(work.rightRight[e] + work.backward[1], 0);
        }
        double da = work.forward[e - 1] + work.leftLeft[e];
        if (e == count - 1) {
            return delta - l * l / awayFromZero(da, e);
        }
        double db = work.backward[e + 1] + work.rightRight[e];
        double lr = work.leftRight[e];
        double det = da * db - lr * lr;
        return delta - (l * l * db - 2 * l * r * lr + r * r * da) / det;
    }

    private void fill(State work) {
        double[] y = work.vertex;
        int leftFrom;
        int rightFrom;
        int t = work.twistElement;
        if (t >= 0) {
            besideMode(t, work);
            leftFrom = t - 1;
            rightFrom = t;
        } else {
            y[work.twistVertex] = 1;
            leftFrom = work.twistVertex;
            rightFrom = work.twistVertex;
        }
        double[] a = work.explicit;
        // To the left: element e ties y[e] (known) to y[e - 1].
        for (int e = leftFrom; e > 0; e--) {
            double d = work.forward[e - 1] + work.leftLeft[e];
            double s = work.leftRight[e];
            if (work.near[e]) {
                double l = work.nearLeft[e];
                double r = work.nearRight[e];
                double delta = work.delta[e];
                double det = safe(d * delta - l * l, l);
                y[e - 1] = -y[e] * (s * delta - l * r) / det;
                a[e] = -y[e] * (r * d - l * s) / det;
            } else {
                y[e - 1] = -y[e] * s / awayFromZero(d, e);
            }
        }
        for (int e = rightFrom + 1; e < count - 1; e++) {
            double d = work.backward[e + 1] + work.rightRight[e];
            double s = work.leftRight[e];
            if (work.near[e]) {
                double l = work.nearLeft[e];
                double r = work.nearRight[e];
                double delta = work.delta[e];
                double det = safe(d * delta - r * r, r);
                y[e] = -y[e - 1] * (s * delta - l * r) / det;
                a[e] = -y[e - 1] * (l * d - r * s) / det;
            } else {
                y[e] = -y[e - 1] * s / awayFromZero(d, e);
            }
        }
        int last = count - 1;
        if (work.near[0] && t != 0) {
            a[0] = -work.nearRight[0] * y[0] / endDelta(0, work);
        }
        if (work.near[last] && t != last) {
            a[last] = -work.nearLeft[last] * y[last - 1] / endDelta(last, work);
        }
        amplitudes(work);
    }

    /** The twist's mode is 1; the two edges of its element follow. */
    private void besideMode(int e, State work) {
        double[] y = work.vertex;
        work.explicit[e] = 1;
        double l = work.nearLeft[e];
        double r = work.nearRight[e];
        if (e == 0) {
            y[0] = -r / awayFromZero(work.rightRight[e] + work.backward[1], 0);
        } else if (e == count - 1) {
            y[e - 1] = -l / awayFromZero(work.forward[e - 1] + work.leftLeft[e], e);
        } else {
            double da = work.forward[e - 1] + work.leftLeft[e];
            double db = work.backward[e + 1] + work.rightRight[e];
            double lr = work.leftRight[e];
            double det = da * db - lr * lr;
            y[e - 1] = -(l * db - lr * r) / det;
            y[e] = -(r * da - lr * l) / det;
        }
    }

    private void amplitudes(State work) {
        double shift = work.shift;
        double[] a = work.amplitude;
        double[] left = work.leftValue;
        double[] right = work.rightValue;
        double[] own = work.own;
        int n = count;
        left[0] = 0;
        right[n - 1] = 0;
        System.arraycopy(work.vertex, 0, left, 1, n - 1);
        System.arraycopy(work.vertex, 0, right, 0, n - 1);
        for (int e = 0; e < n; e++) {
            own[e] = mLeftLeft[e] * left[e] * left[e]
                    + 2 * mLeftRight[e] * left[e] * right[e]
                    + mRightRight[e] * right[e] * right[e];
        }
        double[] leftAll = work.poleLeftLeft;
        double[] rightAll = work.poleLeftRight;
        ChainKernels.spread(left, leftAll, stride, n);
        ChainKernels.spread(right, rightAll, stride, n);
        ChainKernels.responses(
                shift,
                lambda,
                alphaLeft,
                betaLeft,
                alphaRight,
                betaRight,
                leftAll,
                rightAll,
                a,
                work.poleRightRight,
                n * stride);
        // What is subtracted is the norm, so the vertices' part goes in with the same sign.
        for (int e = 0; e < n; e++) {
            own[e] = -own[e];
        }
        ChainKernels.subtractSums(work.poleRightRight, stride, own, n);
        double mass = 0;
        for (int e = 0; e < n; e++) {
            if (work.near[e]) {
                a[e * stride + work.nearest[e]] = work.explicit[e];
                mass += massOn(e, work);
            } else {
                mass -= own[e];
            }
        }
        work.mass = mass;
    }

    private double massOn(int e, State work) {
        double left = work.leftValue[e];
        double right = work.rightValue[e];
        double sum = mLeftLeft[e] * left * left + 2 * mLeftRight[e] * left * right + mRightRight[e] * right * right;
        for (int k = 0; k < modes; k++) {
            int at = e * stride + k;
            double value = work.amplitude[at];
            sum += value * (value + 2 * (betaLeft[at] * left + betaRight[at] * right));
        }
        return sum;
    }

    private boolean explicit(int e, int k, State work) {
        return work.near[e] && k == work.nearest[e];
    }

    private void respond(double[] load, double[] modeLoad, State work) {
        double shift = work.shift;
        double[] y = work.vertex;
        double[] a = work.amplitude;
        int t = work.twistElement;
        int inner = count - 1;
        for (int e = 0; e < count; e++) {
            for (int k = 0; k < modes; k++) {
                boolean end = e != t && (e == 0 || e == inner);
                if (end || !explicit(e, k, work)) {
                    double delta = end && explicit(e, k, work) ? endDelta(e, work) : lambda[e * stride + k] - shift;
                    double scaled = modeLoad[e * stride + k] / delta;
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
                int at = e * stride + k;
                if (explicit(e, k, work)) {
                    if (e == t) {
                        a[at] = 0;
                    } else if (e == 0) {
                        a[at] = (modeLoad[at] - couplingRight(0, k, shift) * right) / endDelta(0, work);
                    } else if (e == inner) {
                        a[at] = (modeLoad[at] - couplingLeft(e, k, shift) * left) / endDelta(e, work);
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
        double b = modeLoad[e * stride + k];
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
        double b2 = modeLoad[e * stride + k] - other * y[known];
        y[unknown] = (b1 * delta - own * b2) / det;
        work.amplitude[e * stride + k] = (d * b2 - own * b1) / det;
    }

    /** The twist's mode is zero; the two edges of its element remain. */
    private void betweenEdgesOf(int e, double[] load, State work) {
        double[] y = work.vertex;
        double ll = work.leftLeft[e];
        double lr = work.leftRight[e];
        double rr = work.rightRight[e];
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
