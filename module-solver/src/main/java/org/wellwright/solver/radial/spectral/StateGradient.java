package org.wellwright.solver.radial.spectral;

import java.util.List;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.EnergyGradient;
import org.wellwright.solver.radial.RadialProblem;

/** Kinetic energy and the theorem of Hellmann and Feynman on a state's own quadrature nodes, moving edges included. */
final class StateGradient {
    private final RadialProblem problem;
    private final Trial trial;
    private final int channels;

    private StateGradient(RadialProblem problem, Trial trial) {
        this.problem = problem;
        this.trial = trial;
        channels = trial.channels();
    }

    /** ⟨T⟩ with the centrifugal energy. */
    static double kineticEnergy(RadialProblem problem, Trial trial) {
        return new StateGradient(problem, trial).kinetic();
    }

    static EnergyGradient of(RadialProblem problem, Trial trial) {
        return new StateGradient(problem, trial).gradient();
    }

    /** Weighted product u_c u_d at the check nodes of an element. */
    private double[] product(int e, int c, int d) {
        ElementBasis.Table table = trial.elements()[e].basis[c].check;
        double[] result = new double[table.size];
        for (int g = 0; g < table.size; g++) {
            result[g] = trial.elements()[e].unit * table.weight[g] * trial.valueAt(e, c, g) * trial.valueAt(e, d, g);
        }
        return result;
    }

    private double[] radii(int e) {
        return Leaf.nodes(trial.elements()[e].basis[0].check, trial.edges()[e], trial.edges()[e + 1]);
    }

    private double kinetic() {
        double kappa = problem.kinetic();
        double sum = 0;
        Element[] elements = trial.elements();
        for (int e = 0; e < elements.length; e++) {
            double[] r = radii(e);
            for (int c = 0; c < channels; c++) {
                double squares = trial.squaresOn(e, c) * kappa / elements[e].unit;
                double lambda = problem.channels().get(c).centrifugal();
                ElementBasis basis = elements[e].basis[c];
                // At the origin the squares hold κ s(s − 1)/r²; what of it is not centrifugal belongs to V.
                double rest = basis.atOrigin() ? lambda - basis.exponent * (basis.exponent - 1) : lambda;
                if (basis.atOrigin() && Math.abs(rest) < 1e-13 * Math.max(1, Math.abs(lambda))) {
                    rest = 0;
                }
                if (rest != 0) {
                    double[] p = product(e, c, c);
                    for (int g = 0; g < r.length; g++) {
                        squares += kappa * rest * p[g] / (r[g] * r[g]);
                    }
                }
                sum += squares;
            }
        }
        return sum;
    }

    private EnergyGradient gradient() {
        TermEvaluator common = problem.common();
        double[] ofCommon = new double[common.parameterCount()];
        List<ChannelTerm> terms = problem.rest();
        double[][] ofRest = new double[terms.size()][];
        for (int i = 0; i < ofRest.length; i++) {
            ofRest[i] = new double[terms.get(i).potential().parameterCount()];
        }
        double[] thresholds = new double[channels];
        for (int e = 0; e < trial.elements().length; e++) {
            double[] r = radii(e);
            double[] all = new double[r.length];
            for (int c = 0; c < channels; c++) {
                double[] p = product(e, c, c);
                for (int g = 0; g < r.length; g++) {
                    all[g] += p[g];
                    thresholds[c] += p[g];
                }
            }
            addExpectations(common, all, r, 1, ofCommon);
            for (int i = 0; i < ofRest.length; i++) {
                ChannelTerm term = terms.get(i);
                double factor = term.row() == term.column() ? 1 : 2;
                addExpectations(term.potential(), product(e, term.row(), term.column()), r, factor, ofRest[i]);
            }
        }
        addMovingEdges(common, -1, -1, 1, ofCommon);
        for (int i = 0; i < ofRest.length; i++) {
            ChannelTerm term = terms.get(i);
            double factor = term.row() == term.column() ? 1 : 2;
            addMovingEdges(term.potential(), term.row(), term.column(), factor, ofRest[i]);
        }
        return new EnergyGradient(kinetic() / problem.kinetic(), ofCommon, ofRest, thresholds, wall(true), wall(false));
    }

    private static void addExpectations(TermEvaluator term, double[] p, double[] r, double factor, double[] into) {
        for (int j = 0; j < into.length; j++) {
            double sum = 0;
            for (int g = 0; g < r.length; g++) {
                if (p[g] != 0) {
                    sum += p[g] * term.parameterDerivative(j, r[g]);
                }
            }
            into[j] += factor * sum;
        }
    }

    private void addMovingEdges(TermEvaluator term, int row, int column, double factor, double[] into) {
        for (BreakPoint point : term.breakPoints()) {
            if (point.jump() == 0 || point.radiusGradient().isEmpty()) {
                continue;
            }
            double density = 0;
            if (row < 0) {
                for (int c = 0; c < channels; c++) {
                    double u = trial.value(c, point.radius());
                    density += u * u;
                }
            } else {
                density = trial.value(row, point.radius()) * trial.value(column, point.radius());
            }
            for (int j = 0; j < into.length; j++) {
                into[j] -=
                        factor * point.jump() * density * point.radiusGradient().get(j);
            }
        }
    }

    private double wall(boolean inner) {
        double radius = inner ? problem.innerWall() : problem.outerWall();
        double end = inner ? trial.edges()[0] : trial.edges()[trial.edges().length - 1];
        if (radius != end || radius == 0) {
            return 0;
        }
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            double slope = trial.slope(c, radius);
            sum += slope * slope;
        }
        return (inner ? 1 : -1) * problem.kinetic() * sum;
    }
}
