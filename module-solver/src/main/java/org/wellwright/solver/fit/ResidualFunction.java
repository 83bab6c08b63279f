package org.wellwright.solver.fit;

import org.wellwright.solver.Problem;

/** Residuals r_i(x) with their exact Jacobian, whose Σ r_i² a search makes least. */
interface ResidualFunction {
    /** Number of residuals. */
    int rows();

    /** Residuals and Jacobian at a point, or why there are none; the arrays are the caller's own. */
    Evaluation evaluate(double[] x);

    /** What a point gives. */
    final class Evaluation {
        private final double[] residuals;
        private final double[][] jacobian;
        private final Problem problem;

        private Evaluation(double[] residuals, double[][] jacobian, Problem problem) {
            this.residuals = residuals;
            this.jacobian = jacobian;
            this.problem = problem;
        }

        /** r_i and dr_i/dx_j, shapes [m] and [m][n]. */
        static Evaluation of(double[] residuals, double[][] jacobian) {
            return new Evaluation(residuals, jacobian, null);
        }

        /** A point where the residuals do not exist. */
        static Evaluation impossible(Problem problem) {
            return new Evaluation(new double[0], new double[0][], problem);
        }

        boolean possible() {
            return problem == null;
        }

        Problem problem() {
            return problem;
        }

        double residual(int row) {
            return residuals[row];
        }

        double slope(int row, int variable) {
            return jacobian[row][variable];
        }

        double[] residuals() {
            return residuals;
        }

        double[][] jacobian() {
            return jacobian;
        }

        double sumOfSquares() {
            double sum = 0;
            for (double residual : residuals) {
                sum += residual * residual;
            }
            return sum;
        }
    }
}
