package org.wellwright.solver.potential.formula;

/** Taylor coefficients f⁽ᵐ⁾(c)/m! of elementary functions, {@link PowerLogSeries#LENGTH} of them. */
final class Taylor {
    private static final int N = PowerLogSeries.LENGTH;

    private Taylor() {}

    static double[] exp(double c) {
        double[] a = new double[N];
        a[0] = Math.exp(c);
        for (int m = 1; m < N; m++) {
            a[m] = a[m - 1] / m;
        }
        return a;
    }

    /** ln(1 + δ) about δ = 0. */
    static double[] log1p() {
        double[] a = new double[N];
        for (int m = 1; m < N; m++) {
            a[m] = (m % 2 == 1 ? 1.0 : -1.0) / m;
        }
        return a;
    }

    /** sin(c + shift·π/2 + δ); a shift of 1 makes it the cosine. */
    static double[] sine(double c, int shift) {
        double[] cycle = {Math.sin(c), Math.cos(c), -Math.sin(c), -Math.cos(c)};
        double[] a = new double[N];
        double factorial = 1;
        for (int m = 0; m < N; m++) {
            factorial *= Math.max(1, m);
            a[m] = cycle[(m + shift) % 4] / factorial;
        }
        return a;
    }

    /** atan(c + δ), from the derivative 1/(1 + x²). */
    static double[] atan(double c) {
        return integrated(Math.atan(c), power(new double[] {1 + c * c, 2 * c, 1}, -1));
    }

    /** asin(c + δ), from (1 − x²)^(−1/2). */
    static double[] asin(double c) {
        return integrated(Math.asin(c), power(new double[] {(1 - c) * (1 + c), -2 * c, -1}, -0.5));
    }

    /** erf(c + δ), from 2/√π·e^(−x²). */
    static double[] erf(double c) {
        double[] g = new double[N];
        g[0] = 2 / Math.sqrt(Math.PI) * Math.exp(-c * c);
        for (int m = 1; m < N; m++) {
            g[m] = -2 * (c * g[m - 1] + (m > 1 ? g[m - 2] : 0)) / m; // g′ = −2x g
        }
        return integrated(Real.apply(Operation.ERF, c, 0), g);
    }

    /** Coefficients of damp(n, x)/x^(n+1) = Σ (−x)^k/(n! k! (n + 1 + k)). */
    static double[] damp(int n) {
        double[] a = new double[N];
        double factorial = 1;
        for (int k = 2; k <= n; k++) {
            factorial *= k;
        }
        for (int k = 0; k < N; k++) {
            factorial *= k == 0 ? 1 : -k;
            a[k] = 1 / (factorial * (n + 1 + k));
        }
        return a;
    }

    /** Coefficients of j_n(x)/xⁿ = Σ (−x²/2)^k/(k! (2n + 2k + 1)!!) (Abramowitz and Stegun 1964, 10.1.2). */
    static double[] sphericalBessel(int n) {
        double[] a = new double[N];
        double term = 1;
        for (int k = 1; k <= n; k++) {
            term /= 2 * k + 1;
        }
        for (int k = 0; 2 * k < N; k++) {
            term *= k == 0 ? 1 : -0.5 / (k * (2.0 * n + 2 * k + 1));
            a[2 * k] = term;
        }
        return a;
    }

    private static double[] integrated(double start, double[] derivative) {
        double[] a = new double[N];
        a[0] = start;
        for (int m = 1; m < N; m++) {
            a[m] = derivative[m - 1] / m;
        }
        return a;
    }

    /** Coefficients of (b₀ + b₁δ + b₂δ²)^p by Euler's recurrence. */
    private static double[] power(double[] b, double p) {
        double[] a = new double[N];
        a[0] = Math.pow(b[0], p);
        for (int m = 1; m < N; m++) {
            double sum = 0;
            for (int j = 1; j <= Math.min(2, m); j++) {
                sum += (p * j - (m - j)) * b[j] * a[m - j];
            }
            a[m] = sum / (m * b[0]);
        }
        return a;
    }
}
