package org.wellwright.solver.numerics;

/**
 * The pencil A − σM of −κ u″ + W u on one element, with the bubbles diagonalised: everything that static condensation
 * needs at any shift σ.
 *
 * <p>With C coupled channels there are C vertex values at each end and N = C·n bubble modes. In the modes' basis A is
 * diag(λ_k), M the identity; a vertex function couples to mode k by α − σβ (Wittrick and Williams 1971; Craig and
 * Bampton 1968 for the modes). Vertex matrices are C×C.
 */
public final class Element {
    /** Extra bubbles whose couplings are kept. */
    public static final int TESTED = 2;

    /** Channels C. */
    public final int channels;
    /** Modes N = C·n. */
    public final int modes;
    /** Length unit L: half the length, or the length at the origin. */
    public final double unit;
    /** κ. */
    public final double kinetic;
    /** Basis of each channel. */
    public final ElementBasis[] basis;
    /** λ_k ascending, length N. */
    public final double[] lambda;
    /** Mode k by rows in the mass-orthonormal combinations: {@code vector[k * N + c * n + j]}. */
    public final double[] vector;
    /** {@code alphaLeft[c * N + k]}. */
    public final double[] alphaLeft;
    /** ∫ of the left vertex function of channel c with mode k. */
    public final double[] betaLeft;
    /** As {@link #alphaLeft} at the right end. */
    public final double[] alphaRight;
    /** As {@link #betaLeft} at the right end. */
    public final double[] betaRight;
    /** C×C energy matrix of the left vertices. */
    public final double[] aLeftLeft;
    /** Left (row) with right (column). */
    public final double[] aLeftRight;
    /** Right with right. */
    public final double[] aRightRight;
    /** Mass matrices of the vertices; diagonal in the channels, {@code [c]}. */
    public final double[] mLeftLeft;
    /** Left with right. */
    public final double[] mLeftRight;
    /** Right with right. */
    public final double[] mRightRight;
    /**
     * Couplings of the first extra bubbles, for error estimates: {@code extraA[(x * C + c) * (N + 2C)]} for x &lt;
     * TESTED: N modes, C left, C right vertices; and the same of the mass.
     */
    public final double[] extraA;
    /** See {@link #extraA}. */
    public final double[] extraM;
    /** Energy of each extra bubble, {@code [x * C + c]}. */
    public final double[] ownA;
    /** Mass of each extra bubble. */
    public final double[] ownM;

    /** Scratch for building elements one after the other; one per thread. */
    public static final class Scratch {
        private double[] packed = new double[0];
        private double[] matrix = new double[0];
        private double[] work = new double[0];

        private void fit(int pairs, int modes) {
            if (packed.length < pairs) {
                packed = new double[pairs];
            }
            if (work.length < modes + modes * modes) {
                work = new double[modes + modes * modes];
            }
            if (matrix.length < modes * 4) {
                matrix = new double[modes * 4];
            }
        }
    }

    /**
     * Assembles and diagonalises.
     *
     * @param potential {@code potential[c * C + d][g]} at the assembly nodes, symmetric in c and d (the same array may
     *     stand in both places); at the origin without what the exponents hold. Null off the diagonal means zero
     */
    public Element(ElementBasis[] basis, double kinetic, double unit, double[][] potential, Scratch scratch) {
        this.basis = basis;
        this.kinetic = kinetic;
        this.unit = unit;
        channels = basis.length;
        int n = basis[0].bubbles;
        int big = channels * n;
        modes = big;
        int stride = big + 2 * channels;
        lambda = new double[big];
        vector = new double[big * big];
        alphaLeft = new double[channels * big];
        betaLeft = new double[channels * big];
        alphaRight = new double[channels * big];
        betaRight = new double[channels * big];
        aLeftLeft = new double[channels * channels];
        aLeftRight = new double[channels * channels];
        aRightRight = new double[channels * channels];
        mLeftLeft = new double[channels];
        mLeftRight = new double[channels];
        mRightRight = new double[channels];
        extraA = new double[TESTED * channels * stride];
        extraM = new double[TESTED * channels * stride];
        ownA = new double[ElementBasis.EXTRA * channels];
        ownM = new double[ElementBasis.EXTRA * channels];
        scratch.fit(basis[0].pairs(), big);
        double[] plainLeft = new double[channels * big];
        double[] plainRight = new double[channels * big];
        double[] massLeft = new double[channels * big];
        double[] massRight = new double[channels * big];
        double[] plainExtra = new double[TESTED * channels * big];
        double[] massExtra = new double[TESTED * channels * big];
        for (int c = 0; c < channels; c++) {
            for (int d = 0; d < channels; d++) {
                double[] w = potential[c * channels + d];
                if (w == null) {
                    continue;
                }
                if (c == d) {
                    addDiagonal(c, n, w, scratch.packed, plainLeft, plainRight, plainExtra, stride);
                } else {
                    addCoupling(c, d, n, w, plainLeft, plainRight, plainExtra, stride);
                }
            }
            addKinetic(c, n, massLeft, massRight, massExtra, stride);
        }
        SymmetricEigen.decompose(vector, big, lambda, scratch.work);
        transform(plainLeft, alphaLeft, channels, big, big);
        transform(plainRight, alphaRight, channels, big, big);
        transform(massLeft, betaLeft, channels, big, big);
        transform(massRight, betaRight, channels, big, big);
        transform(plainExtra, extraA, TESTED * channels, big, stride);
        transform(massExtra, extraM, TESTED * channels, big, stride);
    }

    private void transform(double[] from, double[] into, int rows, int big, int stride) {
        for (int r = 0; r < rows; r++) {
            for (int k = 0; k < big; k++) {
                double sum = 0;
                int z = k * big;
                int f = r * big;
                for (int j = 0; j < big; j++) {
                    sum += vector[z + j] * from[f + j];
                }
                into[r * stride + k] = sum;
            }
        }
    }

    private void addDiagonal(
            int c, int n, double[] w, double[] packed, double[] left, double[] right, double[] extra, int stride) {
        ElementBasis b = basis[c];
        int pairs = b.pairs();
        double[] first = b.weightedProduct[0];
        double w0 = w[0];
        for (int i = 0; i < pairs; i++) {
            packed[i] = w0 * first[i];
        }
        for (int g = 1; g < b.assembly.size; g++) {
            double[] row = b.weightedProduct[g];
            double wg = w[g];
            for (int i = 0; i < pairs; i++) {
                packed[i] += wg * row[i];
            }
        }
        int big = modes;
        double root = Math.sqrt(unit);
        int at = 0;
        // Functions are χ/√L, integrals carry L: the square matrix has no factor, vertex couplings √L, vertex pairs L.
        for (int i = 0; i < n; i++) {
            int row = (c * n + i) * big + c * n;
            for (int j = 0; j <= i; j++) {
                vector[row + j] = packed[at++];
            }
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                vector[(c * n + j) * big + c * n + i] = vector[(c * n + i) * big + c * n + j];
            }
        }
        for (int j = 0; j < n; j++) {
            left[c * big + c * n + j] = root * packed[at++];
        }
        for (int j = 0; j < n; j++) {
            right[c * big + c * n + j] = root * packed[at++];
        }
        int cc = c * channels + c;
        aLeftLeft[cc] = unit * packed[at++];
        aLeftRight[cc] = unit * packed[at++];
        aRightRight[cc] = unit * packed[at++];
        for (int x = 0; x < TESTED; x++) {
            int row = x * channels + c;
            for (int j = 0; j < n; j++) {
                extra[row * big + c * n + j] = root * packed[at++];
            }
            extraA[row * stride + big + c] = unit * packed[at++];
            extraA[row * stride + big + channels + c] = unit * packed[at++];
        }
        for (int x = 0; x < ElementBasis.EXTRA; x++) {
            ownA[x * channels + c] = unit * packed[at++];
        }
    }

    private void addCoupling(
            int c, int d, int n, double[] w, double[] left, double[] right, double[] extra, int stride) {
        ElementBasis b = basis[c];
        ElementBasis o = basis[d];
        int big = modes;
        double root = Math.sqrt(unit);
        int nodes = b.assembly.size;
        for (int g = 0; g < nodes; g++) {
            double wg = w[g] * b.assembly.weight[g];
            double leftC = wg * b.assembly.left[g];
            double rightC = wg * b.assembly.right[g];
            for (int i = 0; i < n; i++) {
                double wi = wg * b.orthonormal[i][g];
                int row = (c * n + i) * big + d * n;
                for (int j = 0; j < n; j++) {
                    vector[row + j] += wi * o.orthonormal[j][g];
                }
            }
            for (int j = 0; j < n; j++) {
                left[c * big + d * n + j] += root * leftC * o.orthonormal[j][g];
                right[c * big + d * n + j] += root * rightC * o.orthonormal[j][g];
            }
            aLeftLeft[c * channels + d] += unit * leftC * o.assembly.left[g];
            aLeftRight[c * channels + d] += unit * leftC * o.assembly.right[g];
            aRightRight[c * channels + d] += unit * rightC * o.assembly.right[g];
            for (int x = 0; x < TESTED; x++) {
                int row = x * channels + c;
                double wx = wg * b.assembly.bubble[n + x][g];
                for (int j = 0; j < n; j++) {
                    extra[row * big + d * n + j] += root * wx * o.orthonormal[j][g];
                }
                extraA[row * stride + big + d] += unit * wx * o.assembly.left[g];
                extraA[row * stride + big + channels + d] += unit * wx * o.assembly.right[g];
            }
        }
    }

    private void addKinetic(int c, int n, double[] massLeft, double[] massRight, double[] massExtra, int stride) {
        ElementBasis b = basis[c];
        int big = modes;
        double stiffness = kinetic / unit;
        double root = Math.sqrt(unit);
        for (int j = 0; j < n; j++) {
            int at = c * n + j;
            vector[at * big + at] += stiffness / (unit * b.massOfMode[j]);
            massLeft[c * big + at] = root * b.massLeft[j];
            massRight[c * big + at] = root * b.massRight[j];
        }
        int cc = c * channels + c;
        double vertex = stiffness * b.vertexStiffness;
        aRightRight[cc] += vertex;
        if (!b.atOrigin()) {
            aLeftLeft[cc] += vertex;
            aLeftRight[cc] -= vertex;
        }
        mLeftLeft[c] = unit * b.massLeftLeft;
        mLeftRight[c] = unit * b.massLeftRight;
        mRightRight[c] = unit * b.massRightRight;
        for (int x = 0; x < TESTED; x++) {
            int row = x * channels + c;
            for (int j = 0; j < n; j++) {
                massExtra[row * big + c * n + j] = root * b.extraMass[x][j];
            }
            extraM[row * stride + big + c] = unit * b.extraMass[x][n];
            extraM[row * stride + big + channels + c] = unit * b.extraMass[x][n + 1];
        }
        for (int x = 0; x < ElementBasis.EXTRA; x++) {
            ownM[x * channels + c] = unit * b.extraMass[x][n + 2];
            ownA[x * channels + c] += stiffness;
        }
    }

    /**
     * Coefficients of the bubbles of channel c for mode amplitudes a: Σ_k a_k z_k in the bubbles of the basis.
     *
     * @param amplitude {@code amplitude[from + k * step]}
     * @param scratch length ≥ N
     * @param into n coefficients at {@code at}
     */
    public void bubbleCoefficients(
            int c, double[] amplitude, int from, int step, double[] scratch, double[] into, int at) {
        int n = basis[c].bubbles;
        int big = modes;
        combine(amplitude, from, step, vector, c * n, big, big, scratch, n);
        double scale = 1 / Math.sqrt(unit);
        java.util.Arrays.fill(into, at, at + n, 0);
        for (int j = 0; j < n; j++) {
            double a = scratch[j] * scale;
            double[] row = basis[c].toBubbles[j];
            // On an ordinary element combinations have a parity, and half of each row is zero.
            int first = row[0] == 0 ? 1 : 0;
            int by = row[1 - first] == 0 ? 2 : 1;
            addMultiple(a, row, first, by, into, at, n);
        }
    }

    private static void combine(
            double[] amplitude,
            int from,
            int step,
            double[] rows,
            int column,
            int stride,
            int count,
            double[] into,
            int n) {
        java.util.Arrays.fill(into, 0, n, 0);
        for (int k = 0; k < count; k++) {
            double a = amplitude[from + k * step];
            int z = k * stride + column;
            for (int j = 0; j < n; j++) {
                into[j] += a * rows[z + j];
            }
        }
    }

    private static void addMultiple(double a, double[] row, int first, int by, double[] into, int at, int n) {
        for (int i = first; i < n; i += by) {
            into[at + i] += a * row[i];
        }
    }
}
