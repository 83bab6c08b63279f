package org.wellwright.solver.numerics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ElementBasisTest {
    private static double value(ElementBasis basis, int k, double t) {
        double[] c = new double[basis.bubbles + ElementBasis.EXTRA];
        c[k] = 1;
        return basis.value(t, 0, 0, c, 0);
    }

    private static double slope(ElementBasis basis, int k, double t) {
        double[] c = new double[basis.bubbles + ElementBasis.EXTRA];
        c[k] = 1;
        return basis.slope(t, 0, 0, c, 0);
    }

    @Test
    void stiffnessOfOrdinaryBubblesIsTheIdentity() {
        ElementBasis basis = ElementBasis.ordinary(16);
        GaussRule rule = GaussRule.legendre(40);
        int n = basis.bubbles + ElementBasis.EXTRA;
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = 0;
                for (int g = 0; g < rule.size(); g++) {
                    // The element has length 2 L.
                    sum += 2 * rule.weight(g) * slope(basis, i, rule.node(g)) * slope(basis, j, rule.node(g));
                }
                assertThat(sum).isCloseTo(i == j ? 1 : 0, within(3e-14));
            }
        }
    }

    /** ∫ (u′² + s(s−1) u²/r²) dr = δ on the bubbles at the origin, by an independent rule in u itself. */
    @ParameterizedTest
    @ValueSource(doubles = {1, 1.7, 3, 12.25})
    void kineticFormAtTheOriginIsTheIdentity(double s) {
        ElementBasis basis = ElementBasis.origin(12, s, s);
        GaussRule rule = GaussRule.jacobi(40, 2 * s - 2);
        for (int i = 0; i < basis.bubbles; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = 0;
                for (int g = 0; g < rule.size(); g++) {
                    double t = rule.node(g);
                    double weight = rule.weight(g) / Math.pow(t, 2 * s - 2);
                    sum += weight
                            * (slope(basis, i, t) * slope(basis, j, t)
                                    + s * (s - 1) / (t * t) * value(basis, i, t) * value(basis, j, t));
                }
                assertThat(sum).isCloseTo(i == j ? 1 : 0, within(2e-12));
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.75, 1, 2, 3.4})
    void tablesHoldValuesAndTheOperator(double s) {
        for (ElementBasis basis : new ElementBasis[] {ElementBasis.ordinary(14), ElementBasis.origin(14, s, s)}) {
            ElementBasis.Table table = basis.check;
            for (int k = 0; k < basis.bubbles; k++) {
                for (int g = 0; g < table.size; g += 5) {
                    double t = table.position[g];
                    double shift = basis.atOrigin() ? Math.pow(t, s - 1) : 1;
                    double h = 1e-5 * t * (1 - t);
                    double length = basis.atOrigin() ? 1 : 2;
                    double bend = (slope(basis, k, t + h) - slope(basis, k, t - h)) / (2 * h * length);
                    double operator = basis.atOrigin() ? bend - s * (s - 1) / (t * t) * value(basis, k, t) : bend;
                    assertThat(table.bubble[k][g] * shift).isCloseTo(value(basis, k, t), within(1e-13));
                    double expected = table.second[k][g] * shift;
                    assertThat(operator)
                            .isCloseTo(expected, within(1e-4 * (1 + Math.abs(expected)) * (k + 1) * (k + 1)));
                }
            }
        }
    }

    @Test
    void slopesAtTheEndsAreThoseOfTheFunctions() {
        ElementBasis basis = ElementBasis.ordinary(10);
        for (int k = 0; k < basis.bubbles; k++) {
            assertThat(slope(basis, k, 0)).isCloseTo(basis.slopeLeft[k], within(1e-12));
            assertThat(slope(basis, k, 1)).isCloseTo(basis.slopeRight[k], within(1e-12));
            assertThat(value(basis, k, 0)).isZero();
            assertThat(value(basis, k, 1)).isZero();
        }
    }
}
