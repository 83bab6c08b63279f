package org.wellwright.solver.radial.steps;

/**
 * The functions ξ(Z), η_m(Z) of constant-reference perturbation (Ixaru 1984).
 *
 * <p>ξ = cosh √Z, η_0 = sinh √Z/√Z, η_m = (η_{m−2} − (2m−1) η_{m−1})/Z with η_{−1} = ξ (cos and sin for Z &lt; 0);
 * dη_m/dZ = ½ η_{m+1}. For |Z| below {@value #SERIES_LIMIT} the two highest come from η_m = Σ_q (Z/2)^q/(q!
 * (2m+2q+1)!!) and the rest from the recurrence downwards; beyond it the recurrence runs upwards, and for Z &gt; 0 the
 * factor e^{√Z} is left out of all of them.
 */
final class EtaFunctions {
    /** Highest index m that {@link #fill} can make. */
    static final int HIGHEST = 20;

    static final double SERIES_LIMIT = 25;
    /** 1/(2m+1)!! at m. */
    private static final double[] START = new double[HIGHEST + 1];

    static {
        double product = 1;
        for (int m = 0; m <= HIGHEST; m++) {
            product *= 2 * m + 1;
            START[m] = 1 / product;
        }
    }

    private EtaFunctions() {}

    /** η_m(0) = 1/(2m+1)!!. */
    static double atZero(int m) {
        return START[m];
    }

    /**
     * Fills {@code into[m + 1] = η_m(z)} for m = −1 … {@code top}, all without the common factor e^{√z} where z ≥
     * {@value #SERIES_LIMIT}.
     *
     * @param top highest index, 1 … {@link #HIGHEST}
     */
    static void fill(double z, int top, double[] into) {
        if (Math.abs(z) < SERIES_LIMIT) {
            fillDown(z, Math.max(top, 6), into);
        } else {
            fillUp(z, top, into);
        }
    }

    private static void fillDown(double z, int top, double[] into) {
        double half = 0.5 * z;
        double last = START[top];
        double before = START[top - 1];
        double termLast = last;
        double termBefore = before;
        for (int q = 1; q < 60; q++) {
            termLast *= half / (q * (2.0 * (top + q) + 1));
            termBefore *= half / (q * (2.0 * (top + q) - 1));
            last += termLast;
            before += termBefore;
            if (Math.abs(termBefore) < 1e-18 * Math.abs(before)) {
                break;
            }
        }
        into[top + 1] = last;
        into[top] = before;
        for (int m = top; m >= 1; m--) {
            into[m - 1] = z * into[m + 1] + (2 * m - 1) * into[m];
        }
    }

    private static void fillUp(double z, int top, double[] into) {
        double root = Math.sqrt(Math.abs(z));
        if (z > 0) {
            double back = Math.exp(-2 * root);
            into[0] = 0.5 * (1 + back);
            into[1] = 0.5 * (1 - back) / root;
        } else {
            into[0] = Math.cos(root);
            into[1] = Math.sin(root) / root;
        }
        double inverse = 1 / z;
        for (int m = 1; m <= top; m++) {
            into[m + 1] = (into[m - 1] - (2 * m - 1) * into[m]) * inverse;
        }
    }
}
