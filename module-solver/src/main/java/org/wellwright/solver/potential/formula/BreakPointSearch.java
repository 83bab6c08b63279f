package org.wellwright.solver.potential.formula;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.Interval;

/**
 * Finds the radii where an absolute value, a step, a minimum or a maximum in a formula switches: exactly where the
 * switching argument is linear in r, otherwise by bisection of [1e-9, 1e9] with enclosures of argument and slope, so
 * that no simple root is lost within the effort allowed.
 */
final class BreakPointSearch {
    private static final double NEAREST = 1e-9;
    private static final double FARTHEST = 1e9;
    private static final int MAX_BOXES = 2_000;
    private static final int MAX_POINTS = 200;

    private final Program program;
    private final Graph graph;

    /** A switch: node, where, and whether its argument rises there. */
    private record Crossing(int node, double radius, boolean rises, List<Double> gradient) {}

    private BreakPointSearch(Program program) {
        this.program = program;
        this.graph = program.graph();
    }

    static List<BreakPoint> run(Program program) {
        return new BreakPointSearch(program).find();
    }

    private List<BreakPoint> find() {
        List<Crossing> crossings = new ArrayList<>();
        double[][] lines = lines();
        for (int i = 0; i < program.size(); i++) {
            if (graph.operation(i).breaks() && program.varies(i)) {
                double[] line = difference(lines, i);
                List<Double> roots = line == null ? isolate(i) : rootOf(line);
                for (double radius : roots) {
                    if (crossings.size() < MAX_POINTS) {
                        crossings.add(crossing(i, radius));
                    }
                }
            }
        }
        crossings.sort(Comparator.comparingDouble(Crossing::radius).thenComparingInt(Crossing::node));
        List<BreakPoint> points = new ArrayList<>();
        int i = 0;
        while (i < crossings.size()) {
            // Switches that move together share one break point.
            List<Crossing> together = new ArrayList<>();
            Crossing first = crossings.get(i);
            while (i < crossings.size()
                    && crossings.get(i).radius() - first.radius() <= 8 * Math.ulp(first.radius())
                    && moveAlike(crossings.get(i).gradient(), first.gradient())) {
                together.add(crossings.get(i++));
            }
            points.add(point(together));
        }
        return List.copyOf(points);
    }

    private static boolean moveAlike(List<Double> a, List<Double> b) {
        for (int j = 0; j < a.size(); j++) {
            if (Math.abs(a.get(j) - b.get(j)) > 1e-9 * (Math.abs(a.get(j)) + Math.abs(b.get(j)))) {
                return false;
            }
        }
        return true;
    }

    private BreakPoint point(List<Crossing> together) {
        double radius = together.get(0).radius();
        double right = forced(together, radius, true);
        double left = forced(together, radius, false);
        double jump = right - left;
        double near = new TangentPass(program, radius * (1 + 1e-6), ScaledPass.RADIUS, program.root())
                .tangent(program.root());
        double size = Math.abs(right) + Math.abs(left) + Math.abs(radius * near);
        boolean jumps = Math.abs(jump) > 1e-13 * size;
        List<Double> gradient = together.get(0).gradient();
        boolean moves = gradient.stream().anyMatch(g -> g != 0);
        return new BreakPoint(
                radius,
                jumps ? BreakPoint.Kind.JUMP : BreakPoint.Kind.KINK,
                jumps ? jump : 0,
                moves ? gradient : List.of());
    }

    /** V at the radius with the steps among the crossings held at their value on one side. */
    private double forced(List<Crossing> together, double radius, boolean rightSide) {
        double[] v = program.frame();
        for (int k = 0; k < program.varyingCount(); k++) {
            int i = program.varying(k);
            Operation operation = graph.operation(i);
            if (operation == Operation.RADIUS) {
                v[i] = radius;
                continue;
            }
            int left = graph.left(i);
            v[i] = Real.apply(operation, v[left], operation.arity() == 2 ? v[graph.right(i)] : 0);
            if (operation == Operation.STEP) {
                for (Crossing crossing : together) {
                    if (crossing.node() == i) {
                        v[i] = crossing.rises() == rightSide ? 1 : 0;
                    }
                }
            }
        }
        return v[program.root()];
    }

    private Crossing crossing(int node, double radius) {
        double slope = argumentTangent(node, radius, ScaledPass.RADIUS);
        List<Double> gradient = new ArrayList<>();
        for (int j = 0; j < program.parameterCount(); j++) {
            double g = -argumentTangent(node, radius, j) / slope;
            gradient.add(Double.isFinite(g) ? g + 0.0 : 0.0);
        }
        return new Crossing(node, radius, slope > 0, gradient);
    }

    private double argumentTangent(int node, double radius, int parameter) {
        TangentPass pass = new TangentPass(program, radius, parameter, node);
        double left = pass.tangent(graph.left(node));
        return graph.operation(node).arity() == 2 ? left - pass.tangent(graph.right(node)) : left;
    }

    private double argument(int node, double radius) {
        TangentPass pass = new TangentPass(program, radius, ScaledPass.RADIUS, node);
        double left = pass.value(graph.left(node));
        return graph.operation(node).arity() == 2 ? left - pass.value(graph.right(node)) : left;
    }

    /** {α, β} of every node that is αr + β, null for the others. */
    private double[][] lines() {
        double[][] line = new double[program.size()][];
        for (int i = 0; i < line.length; i++) {
            if (!program.varies(i)) {
                line[i] = new double[] {0, program.constant(i)};
                continue;
            }
            Operation operation = graph.operation(i);
            if (operation == Operation.RADIUS) {
                line[i] = new double[] {1, 0};
                continue;
            }
            double[] a = line[graph.left(i)];
            double[] b = operation.arity() == 2 ? line[graph.right(i)] : a;
            if (a != null && b != null) {
                line[i] = combined(operation, a, b);
            }
        }
        return line;
    }

    private static double[] combined(Operation operation, double[] a, double[] b) {
        return switch (operation) {
            case ADD -> new double[] {a[0] + b[0], a[1] + b[1]};
            case SUBTRACT -> new double[] {a[0] - b[0], a[1] - b[1]};
            case NEGATE -> new double[] {-a[0], -a[1]};
            case MULTIPLY ->
                b[0] == 0
                        ? new double[] {a[0] * b[1], a[1] * b[1]}
                        : a[0] == 0 ? new double[] {a[1] * b[0], a[1] * b[1]} : null;
            case DIVIDE -> b[0] == 0 ? new double[] {a[0] / b[1], a[1] / b[1]} : null;
            default -> null;
        };
    }

    private double[] difference(double[][] lines, int node) {
        double[] a = lines[graph.left(node)];
        if (graph.operation(node).arity() == 1 || a == null) {
            return a;
        }
        double[] b = lines[graph.right(node)];
        return b == null ? null : combined(Operation.SUBTRACT, a, b);
    }

    private static List<Double> rootOf(double[] line) {
        double root = -line[1] / line[0];
        return root > 0 && root < Double.POSITIVE_INFINITY ? List.of(root) : List.of();
    }

    private List<Double> isolate(int node) {
        List<Double> roots = new ArrayList<>();
        Deque<Interval> boxes = new ArrayDeque<>();
        boxes.push(new Interval(NEAREST, FARTHEST));
        int left = graph.left(node);
        int right = graph.operation(node).arity() == 2 ? graph.right(node) : -1;
        for (int count = 0; count < MAX_BOXES && !boxes.isEmpty() && roots.size() < MAX_POINTS; count++) {
            Interval box = boxes.pop();
            IntervalPass pass = IntervalPass.upTo(program, box, Math.max(left, right));
            Interval value = right < 0 ? pass.value(left) : pass.value(left).minus(pass.value(right));
            if (!value.contains(0)) {
                continue;
            }
            Interval slope = right < 0 ? pass.slope(left) : pass.slope(left).minus(pass.slope(right));
            double a = argument(node, box.lower());
            double b = argument(node, box.upper());
            boolean narrow = box.upper() <= box.lower() * (1 + 1e-13);
            if (!slope.contains(0) || narrow) {
                if (a < 0 != b < 0) {
                    roots.add(bisect(node, box, a < 0));
                }
                continue;
            }
            double middle = Math.sqrt(box.lower() * box.upper());
            boxes.push(new Interval(middle, box.upper()));
            boxes.push(new Interval(box.lower(), middle));
        }
        return roots;
    }

    private double bisect(int node, Interval box, boolean rising) {
        double low = box.lower();
        double high = box.upper();
        while (true) {
            double middle = low + (high - low) / 2;
            if (middle <= low || middle >= high) {
                return high;
            }
            if (argument(node, middle) < 0 == rising) {
                low = middle;
            } else {
                high = middle;
            }
        }
    }
}
