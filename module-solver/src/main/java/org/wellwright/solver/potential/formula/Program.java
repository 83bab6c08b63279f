package org.wellwright.solver.potential.formula;

import java.util.Arrays;

/**
 * A {@link Graph} with its parameters bound to numbers: what does not depend on r is computed once, with a bound on its
 * rounding. Immutable.
 */
final class Program {
    private final Graph graph;
    private final double[] parameters;
    private final int orbital;
    private final double[] constants;
    private final double[] errors;
    private final boolean[] varies;
    private final int[] varying;

    Program(Graph graph, double[] parameters, int orbital) {
        this.graph = graph;
        this.parameters = parameters.clone();
        this.orbital = orbital;
        int n = graph.size();
        this.constants = new double[n];
        this.errors = new double[n];
        this.varies = new boolean[n];
        int count = 0;
        int[] found = new int[n];
        for (int i = 0; i < n; i++) {
            int arity = graph.operation(i).arity();
            varies[i] = graph.operation(i) == Operation.RADIUS
                    || arity >= 1 && varies[graph.left(i)]
                    || arity == 2 && varies[graph.right(i)];
            if (varies[i]) {
                found[count++] = i;
            } else {
                constants[i] = arity == 0
                        ? leaf(i)
                        : Real.apply(graph.operation(i), constant(graph.left(i)), constant(graph.right(i)));
                errors[i] = arity == 0
                        ? leafError(i)
                        : RoundingPass.error(
                                graph.operation(i),
                                constants[i],
                                constant(graph.left(i)),
                                errorOf(graph.left(i)),
                                constant(graph.right(i)),
                                errorOf(graph.right(i)));
            }
        }
        this.varying = Arrays.copyOf(found, count);
    }

    private double leaf(int node) {
        return switch (graph.operation(node)) {
            case LITERAL -> graph.literal(node);
            case PARAMETER -> parameters[graph.left(node)];
            case PI -> Math.PI;
            default -> orbital;
        };
    }

    /** A decimal number that is no double, and pi, are half a unit in the last place off. */
    private double leafError(int node) {
        boolean off = graph.operation(node) == Operation.PI
                || graph.operation(node) == Operation.LITERAL && graph.inexact(node);
        return off ? Math.ulp(constants[node]) / 2 : 0;
    }

    Graph graph() {
        return graph;
    }

    int size() {
        return constants.length;
    }

    int root() {
        return constants.length - 1;
    }

    double parameter(int index) {
        return parameters[index];
    }

    int parameterCount() {
        return parameters.length;
    }

    int orbital() {
        return orbital;
    }

    /** Whether a node depends on r. */
    boolean varies(int node) {
        return varies[node];
    }

    /** The nodes that depend on r, in order. */
    int varyingCount() {
        return varying.length;
    }

    int varying(int position) {
        return varying[position];
    }

    /** Value of a node that does not depend on r; 0 for −1. */
    double constant(int node) {
        return node < 0 ? 0 : constants[node];
    }

    /** Bound on the error of {@link #constant}. */
    double errorOf(int node) {
        return node < 0 ? 0 : errors[node];
    }

    /** A fresh array with the constants in place. */
    double[] frame() {
        return constants.clone();
    }

    /** A fresh array with the errors of the constants in place. */
    double[] errorFrame() {
        return errors.clone();
    }
}
