package org.wellwright.solver.potential.formula;

import java.util.List;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;

/** A formula with its parameters bound to numbers. */
final class BoundFormula implements TermEvaluator {
    private final Program program;
    private final BlockPass blocks;
    private final List<BreakPoint> breakPoints;
    private final OriginBehaviour origin;
    private final TailBehaviour tail;

    BoundFormula(Graph graph, double[] parameters, int orbital) {
        this.program = new Program(graph, parameters, orbital);
        this.blocks = new BlockPass(program);
        this.breakPoints = BreakPointSearch.run(program);
        this.origin = AsymptotePass.origin(program);
        this.tail = AsymptotePass.tail(program);
    }

    Program program() {
        return program;
    }

    /** The graph, node by node, and the values: names and blanks do not count. */
    @Override
    public String canonical() {
        Graph graph = program.graph();
        StringBuilder text = new StringBuilder("formula(");
        for (int i = 0; i < graph.size(); i++) {
            Operation operation = graph.operation(i);
            text.append(i == 0 ? "" : ";");
            switch (operation) {
                case LITERAL ->
                    text.append(Double.toHexString(graph.literal(i))).append(graph.inexact(i) ? "~" : "");
                case PARAMETER ->
                    text.append('p')
                            .append(graph.left(i))
                            .append('=')
                            .append(Double.toHexString(program.parameter(graph.left(i))));
                case ORBITAL -> text.append("l=").append(program.orbital());
                default -> {
                    text.append(operation);
                    if (operation.arity() >= 1) {
                        text.append(' ').append(graph.left(i));
                    }
                    if (operation.arity() == 2) {
                        text.append(' ').append(graph.right(i));
                    }
                }
            }
        }
        return text.append(')').toString();
    }

    @Override
    public int parameterCount() {
        return program.parameterCount();
    }

    @Override
    public double value(double r) {
        if (!program.varies(program.root())) {
            return program.constant(program.root());
        }
        Graph graph = program.graph();
        double[] v = program.frame();
        boolean good = true;
        for (int k = 0; k < program.varyingCount(); k++) {
            int i = program.varying(k);
            Operation operation = graph.operation(i);
            if (operation == Operation.RADIUS) {
                v[i] = r;
                continue;
            }
            double a = v[graph.left(i)];
            double b = operation.arity() == 2 ? v[graph.right(i)] : 0;
            v[i] = Real.apply(operation, a, b);
            good &= operation != Operation.DIVIDE || Math.abs(b) <= Double.MAX_VALUE;
        }
        double result = v[program.root()];
        if (good && Math.abs(result) <= Double.MAX_VALUE) {
            return result;
        }
        double scaled = ScaledPass.value(program, r);
        return Double.isNaN(scaled) ? result : scaled;
    }

    @Override
    public void values(double[] radii, double[] into, int count) {
        if (blocks.run(radii, into, count)) {
            return;
        }
        for (int i = 0; i < count; i++) {
            into[i] = value(radii[i]);
        }
    }

    @Override
    public double slope(double r) {
        return derivative(r, ScaledPass.RADIUS);
    }

    @Override
    public double parameterDerivative(int parameter, double r) {
        return derivative(r, parameter);
    }

    private double derivative(double r, int parameter) {
        TangentPass pass = new TangentPass(program, r, parameter, program.root());
        double result = pass.tangent(program.root());
        if (pass.isGood() && Math.abs(result) <= Double.MAX_VALUE) {
            return result;
        }
        double scaled = ScaledPass.derivative(program, r, parameter);
        return Double.isNaN(scaled) ? result : scaled;
    }

    @Override
    public List<BreakPoint> breakPoints() {
        return breakPoints;
    }

    @Override
    public Interval enclose(double from, double to) {
        return IntervalPass.enclose(this, from, to);
    }

    @Override
    public double roundingBound(double r) {
        double bound = RoundingPass.bound(program, r);
        return bound < Double.POSITIVE_INFINITY ? bound : ScaledPass.bound(program, r);
    }

    @Override
    public OriginBehaviour origin() {
        return origin;
    }

    @Override
    public TailBehaviour tail() {
        return tail;
    }
}
