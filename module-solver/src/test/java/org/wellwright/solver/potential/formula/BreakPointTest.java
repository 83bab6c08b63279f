package org.wellwright.solver.potential.formula;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.BreakPoint.Kind;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FormulaText;

class BreakPointTest {
    private static List<BreakPoint> of(String text) {
        return FormulaText.parse(text)
                .bind(Map.of("R", 3.0, "a", 2.0, "V", 5.0), ChannelFacts.ofOrbital(0))
                .breakPoints();
    }

    @Test
    void aStepJumpsAndMovesWithItsParameter() {
        assertThat(of("-V*step(R-r)")).singleElement().isEqualTo(new BreakPoint(3, Kind.JUMP, 5, List.of(0.0, 1.0)));
        assertThat(of("-V*step(R/a-r)").get(0).radius()).isEqualTo(1.5);
        assertThat(of("-V*step(R/a-r)").get(0).radiusGradient()).containsExactly(0.0, 0.5, -0.75);
    }

    @Test
    void aRampIsAKink() {
        assertThat(of("(r-R)*step(r-R)")).singleElement().satisfies(point -> {
            assertThat(point.kind()).isEqualTo(Kind.KINK);
            assertThat(point.jump()).isZero();
            assertThat(point.radiusGradient()).containsExactly(1.0);
        });
        assertThat(of("abs(r-1)")).containsExactly(new BreakPoint(1, Kind.KINK, 0, List.of()));
    }

    @Test
    void stepsThatMoveTogetherShareOneBreakPoint() {
        assertThat(of("V*step(r-R)+2*V*step(R-r)"))
                .containsExactly(new BreakPoint(3, Kind.JUMP, -5, List.of(0.0, 1.0)));
        assertThat(of("V*step(r-R)+2*V*step(3-r)"))
                .as("only one of the two moves")
                .hasSize(2);
    }

    @Test
    void crossingsOfCurvedArgumentsAreFound() {
        assertThat(of("abs(r^2-2)").get(0).radius()).isCloseTo(Math.sqrt(2), within(1e-15));
        assertThat(of("min(exp(-r),0.1)").get(0).radius()).isCloseTo(Math.log(10), within(1e-14));
        assertThat(of("step(sin(r))").size())
                .as("endless crossings are bounded")
                .isBetween(10, 200);
        List<BreakPoint> two = of("max(0,a-(r-3)^2)");
        assertThat(two).hasSize(2);
        assertThat(two.get(0).radius()).isCloseTo(3 - Math.sqrt(2), within(1e-14));
        assertThat(two.get(1).radius()).isCloseTo(3 + Math.sqrt(2), within(1e-14));
        assertThat(two.get(1).radiusGradient().get(0)).isCloseTo(1 / (2 * Math.sqrt(2)), within(1e-12));
    }

    @Test
    void smoothFormulasHaveNone() {
        assertThat(of("-1/r+exp(-r)")).isEmpty();
        assertThat(of("step(r+1)+abs(-r)")).isEmpty();
        assertThat(of("step(a)*r")).isEmpty();
    }
}
