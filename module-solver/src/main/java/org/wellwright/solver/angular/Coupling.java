package org.wellwright.solver.angular;

/**
 * Coupling coefficients as doubles, to a few units of the last place whatever their size: the alternating sums are done
 * in integers.
 *
 * <p>All arguments are twice the quantum number. A coefficient that a selection rule forbids is 0. Definitions: Edmonds
 * (1957), eqs. 3.6.10 (⟨..|..⟩), 3.7.3 (3j), 6.2.2 (6j), 6.4.3 (9j). Every triad must have j₁ + j₂ + j₃ below 999.
 */
public final class Coupling {
    private Coupling() {}

    /**
     * The Clebsch–Gordan coefficient ⟨j₁m₁j₂m₂|JM⟩ = (−1)^{j₁−j₂+M} √(2J+1) (j₁ j₂ J; m₁ m₂ −M).
     *
     * @throws IllegalArgumentException if a j is negative or too large
     */
    public static double clebschGordan(
            int twiceJ1, int twiceM1, int twiceJ2, int twiceM2, int twiceTotal, int twiceTotalM) {
        double symbol = threeJ(twiceJ1, twiceJ2, twiceTotal, twiceM1, twiceM2, -twiceTotalM);
        return symbol == 0 ? 0 : sign(twiceJ1 - twiceJ2 + twiceTotalM) * Math.sqrt(twiceTotal + 1.0) * symbol;
    }

    /**
     * The 3j symbol (j₁ j₂ j₃; m₁ m₂ m₃).
     *
     * @throws IllegalArgumentException if a j is negative or too large
     */
    public static double threeJ(int twiceJ1, int twiceJ2, int twiceJ3, int twiceM1, int twiceM2, int twiceM3) {
        check(twiceJ1, twiceJ2, twiceJ3);
        RacahSum sum = RacahSum.threeJ(twiceJ1, twiceJ2, twiceJ3, twiceM1, twiceM2, twiceM3);
        return sum == null ? 0 : sum.value();
    }

    /**
     * The 6j symbol {j₁ j₂ j₃; j₄ j₅ j₆}.
     *
     * @throws IllegalArgumentException if a j is negative or too large
     */
    public static double sixJ(int twiceJ1, int twiceJ2, int twiceJ3, int twiceJ4, int twiceJ5, int twiceJ6) {
        check(twiceJ1, twiceJ2, twiceJ3, twiceJ4, twiceJ5, twiceJ6);
        RacahSum sum = RacahSum.sixJ(twiceJ1, twiceJ2, twiceJ3, twiceJ4, twiceJ5, twiceJ6);
        return sum == null ? 0 : sum.value();
    }

    /**
     * The 9j symbol with rows (j₁ j₂ j₃), (j₄ j₅ j₆), (j₇ j₈ j₉), as a sum of products of three 6j symbols; absolute
     * error about 1e-16.
     *
     * @throws IllegalArgumentException if a j is negative or too large
     */
    public static double nineJ(
            int twiceJ1,
            int twiceJ2,
            int twiceJ3,
            int twiceJ4,
            int twiceJ5,
            int twiceJ6,
            int twiceJ7,
            int twiceJ8,
            int twiceJ9) {
        check(twiceJ1, twiceJ2, twiceJ3, twiceJ4, twiceJ5, twiceJ6, twiceJ7, twiceJ8, twiceJ9);
        if (!ExactCoupling.nineTriangles(
                twiceJ1, twiceJ2, twiceJ3, twiceJ4, twiceJ5, twiceJ6, twiceJ7, twiceJ8, twiceJ9)) {
            return 0;
        }
        int from = Math.max(
                Math.abs(twiceJ1 - twiceJ9), Math.max(Math.abs(twiceJ4 - twiceJ8), Math.abs(twiceJ2 - twiceJ6)));
        int to = Math.min(twiceJ1 + twiceJ9, Math.min(twiceJ4 + twiceJ8, twiceJ2 + twiceJ6));
        double sum = 0;
        for (int x = from; x <= to; x += 2) {
            sum += (x + 1)
                    * sixJ(twiceJ1, twiceJ4, twiceJ7, twiceJ8, twiceJ9, x)
                    * sixJ(twiceJ2, twiceJ5, twiceJ8, twiceJ4, x, twiceJ6)
                    * sixJ(twiceJ3, twiceJ6, twiceJ9, x, twiceJ1, twiceJ2);
        }
        return from % 2 == 0 ? sum : -sum;
    }

    /**
     * The integral of three spherical harmonics over the sphere (Gaunt 1929), ∫ Y_{l₁m₁} Y_{l₂m₂} Y_{l₃m₃} dΩ.
     *
     * @throws IllegalArgumentException if an l is negative or too large
     */
    public static double gaunt(int l1, int m1, int l2, int m2, int l3, int m3) {
        double sizes = Math.sqrt((2 * l1 + 1.0) * (2 * l2 + 1.0) * (2 * l3 + 1.0) / (4 * Math.PI));
        return sizes * threeJ(2 * l1, 2 * l2, 2 * l3, 0, 0, 0) * threeJ(2 * l1, 2 * l2, 2 * l3, 2 * m1, 2 * m2, 2 * m3);
    }

    /** (−1)^{n} for n given as 2n. */
    static int sign(int twice) {
        return twice / 2 % 2 == 0 ? 1 : -1;
    }

    static void check(int... twice) {
        for (int j : twice) {
            if (j < 0 || 3 * j / 2 >= RacahSum.LARGEST) {
                throw new IllegalArgumentException(
                        "twice an angular momentum must be 0 to %d, got %d".formatted(2 * RacahSum.LARGEST / 3, j));
            }
        }
    }
}
