package org.wellwright.solver.numerics;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/**
 * The functions of one element on its reference interval, tabulated at the nodes of two Gauss rules.
 *
 * <p>An ordinary element [a, a + 2L] has two linear vertex functions and the integrated Legendre polynomials φ_k = (P_k
 * − P_{k−2})/√(2(2k−1)), k = 2 … p, whose stiffness ∫ φ_i′ φ_k′ dx is the identity (Babuška and Szabó 1991, section
 * 3.1.4); they are evaluated as −(1 − x)(1 + x) P′_{k−1} √((2k−1)/2)/(k(k−1)), which is accurate at the ends.
 *
 * <p>The element at the origin [0, L] has u = (r/L)^s g(r/L): vertex function g = 1 and bubbles with g_k′ = √(2k+2s+1)
 * P_k^{(0,2s)}(2t − 1), g_k(1) = 0, that is g_k = −√(2k+2s+1) (1 − t) P_k^{(1,2s−1)}(2t − 1)/(k + 1) (Szegő 1939, eq.
 * 4.22.2). With s(s − 1) = λ the form ∫ (u′² + λ u²/r²) dr = (∫ t^{2s} (dg/dt)² dt + s g(1)²)/L is the identity on them
 * too. Its rules carry the weight t^{2b−2}, b ≤ s being the least exponent of all channels.
 *
 * <p>In both, an integral over the element is L Σ w_g f_g, the stiffness of a bubble is κ/L, and −κ u″ (plus the
 * centrifugal term at the origin) is −(κ/L²) times {@link Table#second}.
 */
public final class ElementBasis {
    /** Bubbles beyond the trial space that measure and mend the truncation. */
    public static final int EXTRA = 8;

    private static final Map<Integer, ElementBasis> ORDINARY = new ConcurrentHashMap<>();
    private static final Map<OriginKey, ElementBasis> ORIGIN = new ConcurrentHashMap<>();

    private record OriginKey(int degree, double exponent, double base) {}

    /**
     * Values at the nodes of one rule.
     *
     * <p>{@code bubble[k][g]} and {@code second[k][g]} for k &lt; bubbles + EXTRA; {@code left}, {@code right} the
     * vertex functions.
     */
    public static final class Table {
        /** Number of nodes. */
        public final int size;
        /** Positions in (0, 1). */
        public final double[] position;
        /** Weights; an integral is L Σ w f. */
        public final double[] weight;
        /** Bubble values. */
        public final double[][] bubble;
        /** Left vertex function; zero at the origin. */
        public final double[] left;
        /** Right vertex function. */
        public final double[] right;
        /**
         * Values by parity at the nodes below ½, for ordinary tables of an even number of nodes: bubbles 0, 2, 4, … at
         * {@code even[h * halfStride + i]}, bubbles 1, 3, … in {@code odd}; the same of {@link #second}.
         */
        public double[] even;
        /** See {@link #even}. */
        public double[] odd;
        /** See {@link #even}. */
        public double[] evenSecond;
        /** See {@link #even}. */
        public double[] oddSecond;
        /** Length of a row of {@link #even}, a multiple of 4. */
        public int halfStride;
        /** −L²/κ times kinetic (and at the origin centrifugal) energy density operator on each bubble. */
        public final double[][] second;

        Table(GaussRule rule, int functions, double weightScale) {
            size = rule.size();
            position = new double[size];
            weight = new double[size];
            for (int g = 0; g < size; g++) {
                position[g] = rule.node(g);
                weight[g] = rule.weight(g) * weightScale;
            }
            bubble = new double[functions][size];
            second = new double[functions][size];
            left = new double[size];
            right = new double[size];
        }

        /** Fills the tables by parity. */
        void split() {
            int functions = bubble.length;
            int half = size / 2;
            halfStride = ((functions + 1) / 2 + 3) / 4 * 4;
            even = new double[half * halfStride];
            odd = new double[half * halfStride];
            evenSecond = new double[half * halfStride];
            oddSecond = new double[half * halfStride];
            for (int h = 0; h < half; h++) {
                for (int k = 0; k < functions; k++) {
                    int at = h * halfStride + k / 2;
                    (k % 2 == 0 ? even : odd)[at] = bubble[k][h];
                    (k % 2 == 0 ? evenSecond : oddSecond)[at] = second[k][h];
                }
            }
        }
    }

    /** Number of bubbles in the trial space. */
    public final int bubbles;
    /** Exponent s at the origin; NaN for an ordinary element. */
    public final double exponent;
    /** Values for assembly. */
    public final Table assembly;
    /** Values for final energies. */
    public final Table check;
    /** Eigenvalues of the bubbles' mass matrix, ascending kinetic energy: mass μ_j for stiffness 1. */
    public final double[] massOfMode;
    /** {@code toBubbles[j][k]}: coefficient of bubble k in the j-th mass-orthonormal combination. */
    public final double[][] toBubbles;
    /** The mass-orthonormal combinations at the assembly nodes, {@code [j][g]}. */
    public final double[][] orthonormal;
    /** Products of pairs at the assembly nodes, {@code [g][pair]}, times the weight; see {@link #pairs}. */
    public final double[][] weightedProduct;
    /** ∫ left χ_j, ∫ right χ_j. */
    public final double[] massLeft;
    /** ∫ right χ_j. */
    public final double[] massRight;
    /** ∫ of products of the vertex functions. */
    public final double massLeftLeft;
    /** ∫ left right. */
    public final double massLeftRight;
    /** ∫ right right. */
    public final double massRightRight;
    /** Stiffness of the right vertex function times L/κ: ½, or s at the origin. */
    public final double vertexStiffness;
    /** {@code extraMass[x][j]} = ∫ extra_x χ_j; then with the left and right vertex; then with itself. */
    public final double[][] extraMass;
    /** d bubble/d(reference) × (length unit L) at the left end. */
    public final double[] slopeLeft;
    /** The same at the right end. */
    public final double[] slopeRight;

    private ElementBasis(
            int bubbles, double exponent, Table assembly, Table check, double[] slopeLeft, double[] slopeRight) {
        this.bubbles = bubbles;
        this.exponent = exponent;
        this.assembly = assembly;
        this.check = check;
        this.slopeLeft = slopeLeft;
        this.slopeRight = slopeRight;
        int n = bubbles;
        double[] mass = new double[n * n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double m = integral(check, check.bubble[i], check.bubble[j]);
                mass[i * n + j] = m;
                mass[j * n + i] = m;
            }
        }
        massOfMode = new double[n];
        toBubbles = new double[n][n];
        orthonormal = new double[n][assembly.size];
        orthonormalise(mass);
        massLeft = new double[n];
        massRight = new double[n];
        for (int j = 0; j < n; j++) {
            massLeft[j] = integral(assembly, orthonormal[j], assembly.left);
            massRight[j] = integral(assembly, orthonormal[j], assembly.right);
        }
        massLeftLeft = integral(assembly, assembly.left, assembly.left);
        massLeftRight = integral(assembly, assembly.left, assembly.right);
        massRightRight = integral(assembly, assembly.right, assembly.right);
        vertexStiffness = Double.isNaN(exponent) ? 0.5 : exponent;
        extraMass = new double[EXTRA][n + 3];
        for (int x = 0; x < EXTRA; x++) {
            double[] extra = assembly.bubble[n + x];
            for (int j = 0; j < n; j++) {
                extraMass[x][j] = integral(assembly, extra, orthonormal[j]);
            }
            extraMass[x][n] = integral(assembly, extra, assembly.left);
            extraMass[x][n + 1] = integral(assembly, extra, assembly.right);
            extraMass[x][n + 2] = integral(assembly, extra, extra);
        }
        weightedProduct = products();
    }

    /**
     * Combinations of the bubbles with unit mass and diagonal stiffness, least kinetic energy first, so that the
     * matrices of the elements are graded from small to large. On an ordinary element they are even or odd exactly.
     */
    private void orthonormalise(double[] mass) {
        int n = bubbles;
        int classes = atOrigin() ? 1 : 2;
        double[][] vectors = new double[n][];
        double[] values = new double[n];
        int count = 0;
        for (int parity = 0; parity < classes; parity++) {
            int size = (n - parity + classes - 1) / classes;
            double[] part = new double[size * size];
            for (int i = 0; i < size; i++) {
                for (int j = 0; j < size; j++) {
                    part[i * size + j] = mass[(parity + i * classes) * n + parity + j * classes];
                }
            }
            double[] mu = new double[size];
            SymmetricEigen.decompose(part, size, mu, new double[size + size * size]);
            for (int i = 0; i < size; i++) {
                double scale = 1 / Math.sqrt(mu[i]);
                vectors[count] = new double[n];
                for (int j = 0; j < size; j++) {
                    vectors[count][parity + j * classes] = part[i * size + j] * scale;
                }
                values[count++] = mu[i];
            }
        }
        for (int j = 0; j < n; j++) {
            int largest = -1;
            for (int i = 0; i < n; i++) {
                if (vectors[i] != null && (largest < 0 || values[i] > values[largest])) {
                    largest = i;
                }
            }
            massOfMode[j] = values[largest];
            toBubbles[j] = vectors[largest];
            vectors[largest] = null;
            for (int k = 0; k < n; k++) {
                for (int g = 0; g < assembly.size; g++) {
                    orthonormal[j][g] += toBubbles[j][k] * assembly.bubble[k][g];
                }
            }
        }
    }

    /**
     * Order of the packed pairs: χ_i χ_j for j ≤ i; then left χ_j; right χ_j; left², left·right, right²; then for each
     * tested extra bubble x: x χ_j, x left, x right; then x² for all extra bubbles.
     */
    public int pairs() {
        return bubbles * (bubbles + 1) / 2 + 2 * bubbles + 3 + Element.TESTED * (bubbles + 2) + EXTRA;
    }

    private double[][] products() {
        int n = bubbles;
        double[][] table = new double[assembly.size][pairs()];
        for (int g = 0; g < assembly.size; g++) {
            double[] row = table[g];
            double w = assembly.weight[g];
            int at = 0;
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    row[at++] = w * orthonormal[i][g] * orthonormal[j][g];
                }
            }
            double left = assembly.left[g];
            double right = assembly.right[g];
            for (int j = 0; j < n; j++) {
                row[at++] = w * left * orthonormal[j][g];
            }
            for (int j = 0; j < n; j++) {
                row[at++] = w * right * orthonormal[j][g];
            }
            row[at++] = w * left * left;
            row[at++] = w * left * right;
            row[at++] = w * right * right;
            for (int x = 0; x < Element.TESTED; x++) {
                double extra = assembly.bubble[n + x][g];
                for (int j = 0; j < n; j++) {
                    row[at++] = w * extra * orthonormal[j][g];
                }
                row[at++] = w * extra * left;
                row[at++] = w * extra * right;
            }
            for (int x = 0; x < EXTRA; x++) {
                row[at++] = w * assembly.bubble[n + x][g] * assembly.bubble[n + x][g];
            }
        }
        return table;
    }

    private static double integral(Table table, double[] f, double[] h) {
        double sum = 0;
        for (int g = 0; g < table.size; g++) {
            sum += table.weight[g] * f[g] * h[g];
        }
        return sum;
    }

    /** Whether this is the element at the origin. */
    public boolean atOrigin() {
        return !Double.isNaN(exponent);
    }

    /** The basis of an ordinary element of polynomial degree {@code degree}. */
    public static ElementBasis ordinary(int degree) {
        return ORDINARY.computeIfAbsent(degree, ElementBasis::computeOrdinary);
    }

    private static int assemblyNodes(int degree) {
        return degree + 8;
    }

    private static int checkNodes(int degree) {
        return degree + 12;
    }

    private static ElementBasis computeOrdinary(int degree) {
        int n = degree - 1;
        Table assembly = ordinaryTable(assemblyNodes(degree), n + EXTRA);
        Table check = ordinaryTable(checkNodes(degree), n + EXTRA);
        double[] slopeLeft = new double[n + EXTRA];
        double[] slopeRight = new double[n + EXTRA];
        for (int k = 0; k < n + EXTRA; k++) {
            double norm = Math.sqrt((2 * k + 3) / 2.0);
            slopeRight[k] = norm;
            slopeLeft[k] = k % 2 == 0 ? -norm : norm;
        }
        return new ElementBasis(n, Double.NaN, assembly, check, slopeLeft, slopeRight);
    }

    private static Table ordinaryTable(int nodes, int functions) {
        // ∫ over [0, 1] has length 1, the element has length 2 L.
        Table table = new Table(GaussRule.legendre(nodes), functions, 2);
        for (int g = 0; g < nodes; g++) {
            double t = table.position[g];
            Doubled x = Doubled.of(t).times(Doubled.of(2)).minus(Doubled.of(1));
            Doubled ends = Doubled.of(t).times(Doubled.of(1 - t)).times(Doubled.of(4));
            // P_m and P′_m by recurrence: P′_{m+1} = x P′_m + (m + 1) P_m.
            Doubled before = Doubled.of(1);
            Doubled p = x;
            Doubled slope = Doubled.of(1);
            for (int k = 0; k < functions; k++) {
                int degree = k + 2;
                double norm = Math.sqrt((2 * degree - 1) / 2.0);
                table.bubble[k][g] = -ends.times(slope).value() * norm / (degree * (degree - 1.0));
                table.second[k][g] = slope.value() * norm;
                Doubled nextSlope = x.times(slope).plus(p.times(Doubled.of(degree)));
                Doubled next = x.times(p)
                        .times(Doubled.of(2 * degree - 1))
                        .minus(before.times(Doubled.of(degree - 1)))
                        .over(Doubled.of(degree));
                before = p;
                p = next;
                slope = nextSlope;
            }
            table.left[g] = 1 - t;
            table.right[g] = t;
        }
        table.split();
        return table;
    }

    /**
     * The basis of the element at the origin.
     *
     * @param exponent s ≥ ½ of this channel
     * @param base the least exponent of all channels
     */
    public static ElementBasis origin(int degree, double exponent, double base) {
        return ORIGIN.computeIfAbsent(new OriginKey(degree, exponent, base), ElementBasis::computeOrigin);
    }

    private static ElementBasis computeOrigin(OriginKey key) {
        int n = key.degree - 1;
        Table assembly = originTable(assemblyNodes(key.degree), n + EXTRA, key);
        Table check = originTable(checkNodes(key.degree), n + EXTRA, key);
        double[] slopeRight = new double[n + EXTRA];
        for (int k = 0; k < n + EXTRA; k++) {
            slopeRight[k] = Math.sqrt(2 * k + 2 * key.exponent + 1);
        }
        return new ElementBasis(n, key.exponent, assembly, check, new double[n + EXTRA], slopeRight);
    }

    private static Table originTable(int nodes, int functions, OriginKey key) {
        double s = key.exponent;
        // Below b = 0.51 the weight t^{2b−2} is too near to the limit −1: a rule with t^{2b−1} then, exact for
        // energies.
        double shift = key.base >= 0.51 ? 1 : 0.5;
        Table table = new Table(GaussRule.jacobi(nodes, 2 * (key.base - shift)), functions, 1);
        double[] g1 = new double[functions];
        double[] slope = new double[functions];
        double[] bend = new double[functions];
        for (int g = 0; g < nodes; g++) {
            double t = table.position[g];
            double x = 2 * t - 1;
            JacobiPolynomials.values(functions, 1, 2 * s - 1, x, g1);
            JacobiPolynomials.values(functions, 0, 2 * s, x, slope);
            JacobiPolynomials.values(functions, 1, 2 * s + 1, x, bend);
            // The rule's weight holds t^{2b−2}; what is left of u² is t^{2(s−b+1)}, shared by the two factors.
            double lead = key.base == s ? 1 : Math.pow(t, s - key.base);
            lead *= shift == 1 ? 1 : 1 / Math.sqrt(t);
            for (int k = 0; k < functions; k++) {
                double norm = Math.sqrt(2 * k + 2 * s + 1);
                table.bubble[k][g] = -lead * t * norm * (1 - t) * g1[k] / (k + 1);
                double second = k == 0 ? 0 : norm * (k + 2 * s + 1) * bend[k - 1];
                table.second[k][g] = lead * (t * second + 2 * s * norm * slope[k]);
            }
            table.right[g] = lead * t;
        }
        return table;
    }

    /**
     * A combination of the functions at a point.
     *
     * @param t position in [0, 1]
     * @param left value at the left end
     * @param right value at the right end
     * @param coefficient bubble k has coefficient {@code coefficient[at + k]}, extra bubbles included
     */
    public double value(double t, double left, double right, double[] coefficient, int at) {
        int functions = bubbles + EXTRA;
        if (atOrigin()) {
            if (t == 0) {
                return 0;
            }
            double[] p = new double[functions];
            JacobiPolynomials.values(functions, 1, 2 * exponent - 1, 2 * t - 1, p);
            double sum = 0;
            for (int k = functions - 1; k >= 0; k--) {
                sum += coefficient[at + k] * Math.sqrt(2 * k + 2 * exponent + 1) * p[k] / (k + 1);
            }
            return Math.pow(t, exponent) * (right - (1 - t) * sum);
        }
        double x = 2 * t - 1;
        double before = 1;
        double p = x;
        double slope = 1;
        double sum = 0;
        for (int k = 0; k < functions; k++) {
            int degree = k + 2;
            sum += coefficient[at + k] * slope * Math.sqrt((2 * degree - 1) / 2.0) / (degree * (degree - 1.0));
            slope = x * slope + degree * p;
            double next = ((2 * degree - 1) * x * p - (degree - 1) * before) / degree;
            before = p;
            p = next;
        }
        return (1 - t) * left + t * right - 4 * t * (1 - t) * sum;
    }

    /** Derivative of {@link #value} by r, times the length unit L. */
    public double slope(double t, double left, double right, double[] coefficient, int at) {
        int functions = bubbles + EXTRA;
        if (atOrigin()) {
            double[] p = new double[functions];
            double[] d = new double[functions];
            JacobiPolynomials.values(functions, 1, 2 * exponent - 1, 2 * t - 1, p);
            JacobiPolynomials.values(functions, 0, 2 * exponent, 2 * t - 1, d);
            double g = right;
            double slope = 0;
            for (int k = functions - 1; k >= 0; k--) {
                double a = coefficient[at + k] * Math.sqrt(2 * k + 2 * exponent + 1);
                g -= (1 - t) * a * p[k] / (k + 1);
                slope += a * d[k];
            }
            double power = exponent == 1 ? 1 : Math.pow(t, exponent - 1);
            return power * (exponent * g + t * slope);
        }
        double x = 2 * t - 1;
        double before = 1;
        double p = x;
        double sum = 0.5 * (right - left);
        for (int k = 0; k < functions; k++) {
            int degree = k + 2;
            sum += coefficient[at + k] * Math.sqrt((2 * degree - 1) / 2.0) * p;
            double next = ((2 * degree - 1) * x * p - (degree - 1) * before) / degree;
            before = p;
            p = next;
        }
        return sum;
    }
}
