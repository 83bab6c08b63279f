package org.wellwright.bench;

import java.util.List;
import java.util.function.IntToDoubleFunction;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;

/**
 * One problem of the solver's table: −κ u″ + V u = E u for l = 0 on r > 0.
 *
 * @param name its name in the table
 * @param formula V(r)
 * @param kinetic κ
 * @param count how many levels, {@link LevelSearch#ALL} for every bound one
 * @param exact closed form of the levels, or null where there is none
 */
record BoundCase(String name, String formula, double kinetic, int count, IntToDoubleFunction exact) {
    /** The table: each sort of potential once. */
    static List<BoundCase> all() {
        return List.of(
                new BoundCase("coulomb-30", "-1/r", 0.5, 30, BoundCase::hydrogen),
                new BoundCase("coulomb-100", "-1/r", 0.5, 100, BoundCase::hydrogen),
                new BoundCase("oscillator", "0.5*r^2", 0.5, 31, n -> 2 * n + 1.5),
                new BoundCase("morse", "0.17*(exp(-2*(r-5))-2*exp(-(r-5)))", 1e-5, 28, BoundCase::morse),
                new BoundCase("lennard-jones", "4*(r^(-12)-r^(-6))", 1e-4, LevelSearch.ALL, null),
                new BoundCase("woods-saxon", "-50/(1+exp((r-7)/0.6))", 1, LevelSearch.ALL, null),
                new BoundCase("square-well", "-50*(1-step(r-7))", 1, LevelSearch.ALL, null),
                new BoundCase("coulomb-linear", "-0.52/r+r/5.4756", 0.5, 10, null),
                new BoundCase("logarithm", "log(r)", 1, 20, null),
                new BoundCase("yukawa", "-0.8405*exp(-r)/r", 0.5, LevelSearch.ALL, null));
    }

    private static double hydrogen(int n) {
        return -0.5 / ((n + 1.0) * (n + 1.0));
    }

    /** On the whole line; the wall at r = 0 lies 25 units of e^x up and is never felt. */
    private static double morse(int n) {
        double root = Math.sqrt(0.17) - Math.sqrt(1e-5) * (n + 0.5);
        return -root * root;
    }

    TermEvaluator potential() {
        return FormulaText.parse(formula).bind(new double[0], ChannelFacts.ofOrbital(0));
    }

    RadialProblem problem() {
        return RadialProblem.single(kinetic, 0, potential());
    }

    LevelSearch search() {
        return LevelSearch.first(count);
    }
}
