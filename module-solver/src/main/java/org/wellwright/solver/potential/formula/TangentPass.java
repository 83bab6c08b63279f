package org.wellwright.solver.potential.formula;

/** Forward differentiation (Wengert 1964): value and one derivative of every node. */
final class TangentPass {
    private final double[] value;
    private final double[] tangent;
    private boolean good = true;

    /**
     * Runs over the nodes up to {@code last}.
     *
     * @param parameter index of the parameter to differentiate by, {@link ScaledPass#RADIUS} for r
     */
    TangentPass(Program program, double r, int parameter, int last) {
        Graph graph = program.graph();
        this.value = program.frame();
        this.tangent = new double[last + 1];
        for (int i = 0; i <= last; i++) {
            Operation operation = graph.operation(i);
            if (operation.arity() == 0) {
                boolean isRadius = operation == Operation.RADIUS;
                value[i] = isRadius ? r : value[i];
                boolean wanted = parameter == ScaledPass.RADIUS
                        ? isRadius
                        : operation == Operation.PARAMETER && graph.left(i) == parameter;
                tangent[i] = wanted ? 1 : 0;
                continue;
            }
            int left = graph.left(i);
            int right = operation.arity() == 2 ? graph.right(i) : left;
            double a = value[left];
            double b = value[right];
            if (program.varies(i)) {
                value[i] = Real.apply(operation, a, b);
                good &= operation != Operation.DIVIDE || Math.abs(b) <= Double.MAX_VALUE;
            }
            double sum = tangent[left] == 0 ? 0 : Real.leftPartial(operation, a, b, value[i]) * tangent[left];
            if (operation.arity() == 2 && tangent[right] != 0) {
                sum += Real.rightPartial(operation, a, b, value[i]) * tangent[right];
            }
            tangent[i] = sum;
        }
    }

    double value(int node) {
        return value[node];
    }

    double tangent(int node) {
        return tangent[node];
    }

    /** Whether no intermediate result was lost to overflow. */
    boolean isGood() {
        return good;
    }
}
