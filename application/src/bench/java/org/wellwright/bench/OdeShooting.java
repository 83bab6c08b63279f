package org.wellwright.bench;

import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.exception.NumberIsTooSmallException;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.AdaptiveStepsizeIntegrator;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.apache.commons.math3.ode.nonstiff.GraggBulirschStoerIntegrator;

/**
 * Reference: shooting from both ends with an adaptive integrator of Commons Math and the secant rule on the matching
 * defect, started a thousandth of the level spacing away. Integrator and tolerance that reach the least error on the
 * lowest level are taken; the lowest, a middle and the highest level are solved, and the mean time stands for each.
 */
final class OdeShooting {
    private OdeShooting() {}

    static ReferenceResult best(ReferenceTask task) {
        double least = Double.POSITIVE_INFINITY;
        boolean extrapolation = false;
        double tolerance = 0;
        for (boolean gragg : new boolean[] {false, true}) {
            for (double trial : new double[] {1e-11, 1e-13}) {
                double error = error(task, 0, gragg, trial);
                if (error < 0.5 * least) {
                    least = error;
                    extrapolation = gragg;
                    tolerance = trial;
                }
            }
        }
        int last = task.energies.length - 1;
        int[] chosen = {0, last / 2, last};
        double millis = 0;
        double worst = 0;
        for (int index : chosen) {
            long start = System.nanoTime();
            worst = Math.max(worst, error(task, index, extrapolation, tolerance));
            millis += (System.nanoTime() - start) / 1e6;
        }
        String name = extrapolation ? "Gragg-Bulirsch-Stoer" : "Dormand-Prince 8(5,3)";
        return new ReferenceResult(
                millis / chosen.length * task.energies.length, worst, "%s, tolerance %.0e".formatted(name, tolerance));
    }

    private static double error(ReferenceTask task, int index, boolean gragg, double tolerance) {
        double exact = task.energies[index];
        double spacing = index > 0
                ? exact - task.energies[index - 1]
                : task.energies.length > 1 ? task.energies[1] - exact : 0.1 * Math.abs(exact);
        try {
            double a = exact - 1e-3 * spacing;
            double b = exact + 0.7e-3 * spacing;
            double fa = defect(task, a, gragg, tolerance);
            double fb = defect(task, b, gragg, tolerance);
            for (int i = 0; i < 12 && fb != fa && Math.abs(b - a) > 1e-16 * task.scales[index]; i++) {
                double next = b - fb * (b - a) / (fb - fa);
                a = b;
                fa = fb;
                b = next;
                fb = defect(task, b, gragg, tolerance);
            }
            return Math.abs(b - exact) / task.scales[index];
        } catch (MathIllegalStateException | NumberIsTooSmallException stuck) {
            return Double.POSITIVE_INFINITY;
        }
    }

    /** Sine of the angle between both solutions at a radius inside the well. */
    private static double defect(ReferenceTask task, double energy, boolean gragg, double tolerance) {
        double outerTurn = task.lastAllowed(energy);
        double outer = task.outerRadius(energy);
        double match = 0.97 * outerTurn;
        double start = task.inner > 0 ? task.inner : 1e-7 * outerTurn;
        double[] left = task.inner > 0
                ? new double[] {1, wall(task, start, energy)}
                : new double[] {start, 1 + start * start * task.value(start) / task.kinetic / 2};
        double[] right = {1, -wall(task, outer, energy)};
        FirstOrderDifferentialEquations equation = new FirstOrderDifferentialEquations() {
            @Override
            public int getDimension() {
                return 2;
            }

            @Override
            public void computeDerivatives(double r, double[] y, double[] slope) {
                slope[0] = y[1];
                slope[1] = (task.value(r) - energy) / task.kinetic * y[0];
            }
        };
        integrate(task, integrator(gragg, tolerance, outer), equation, left, start, match);
        integrate(task, integrator(gragg, tolerance, outer), equation, right, outer, match);
        double length = match / 10;
        double a = Math.hypot(left[0], length * left[1]);
        double b = Math.hypot(right[0], length * right[1]);
        return length * (left[0] * right[1] - left[1] * right[0]) / (a * b);
    }

    /** From one radius to another, stopping just before and starting just after every jump of V. */
    private static void integrate(
            ReferenceTask task,
            AdaptiveStepsizeIntegrator integrator,
            FirstOrderDifferentialEquations equation,
            double[] y,
            double from,
            double to) {
        double here = from;
        double direction = Math.signum(to - from);
        for (double edge : task.edges(from, to)) {
            integrator.integrate(equation, here, y, edge * (1 - direction * 1e-14), y);
            here = edge * (1 + direction * 1e-14);
        }
        integrator.integrate(equation, here, y, to, y);
    }

    private static double wall(ReferenceTask task, double r, double energy) {
        return Math.sqrt(Math.max(0, (task.value(r) - energy) / task.kinetic));
    }

    private static AdaptiveStepsizeIntegrator integrator(boolean gragg, double tolerance, double length) {
        return gragg
                ? new GraggBulirschStoerIntegrator(1e-14 * length, length, 1e-30, tolerance)
                : new DormandPrince853Integrator(1e-14 * length, length, 1e-30, tolerance);
    }
}
