package org.wellwright.solver.potential.formula;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Builds a {@link Graph}: shares equal subexpressions and writes those that would cancel in their stable form, such as
 * 1 − e^x as −expm1(x), ln(1 + x) as log1p(x), 1 − cos x as 2 sin²(x/2), √(1 + x) − 1 as x/(√(1 + x) + 1).
 */
final class GraphBuilder {
    /** Upper limit of the number of operations. */
    static final int MAX_NODES = 20_000;

    private final List<Node> nodes = new ArrayList<>();
    private final Map<Node, Integer> known = new HashMap<>();
    private final List<String> names = new ArrayList<>();
    private final List<Integer> nameStarts = new ArrayList<>();

    /** A node; for a parameter {@code left} is its index, for a literal {@code value} its number. */
    private record Node(Operation operation, int left, int right, double value, boolean inexact) {}

    boolean isFull() {
        return nodes.size() >= MAX_NODES;
    }

    private int put(Operation operation, int left, int right, double value, boolean inexact) {
        Node node = new Node(operation, left, right, value, inexact);
        Integer place = known.get(node);
        if (place == null) {
            place = nodes.size();
            nodes.add(node);
            known.put(node, place);
        }
        return place;
    }

    int literal(double value, boolean inexact) {
        return put(Operation.LITERAL, -1, -1, value, inexact);
    }

    int constant(double value) {
        return literal(value, false);
    }

    int leaf(Operation operation) {
        return put(operation, -1, -1, 0, false);
    }

    int parameter(String name, int start) {
        return put(Operation.PARAMETER, name(name, start), -1, 0, false);
    }

    /** Index of a parameter, which is made if it is new. */
    int name(String name, int start) {
        int index = names.indexOf(name);
        if (index < 0) {
            index = names.size();
            names.add(name);
            nameStarts.add(start);
        }
        return index;
    }

    private Operation operation(int node) {
        return nodes.get(node).operation();
    }

    private int left(int node) {
        return nodes.get(node).left();
    }

    private boolean isLiteral(int node, double value) {
        Node given = nodes.get(node);
        return given.operation() == Operation.LITERAL && given.value() == value && !given.inexact();
    }

    /** Whether the node is an integer that the text states exactly. */
    boolean isInteger(int node) {
        Node given = nodes.get(node);
        return given.operation() == Operation.LITERAL
                && !given.inexact()
                && given.value() == Math.rint(given.value())
                && Math.abs(given.value()) < 0x1p50;
    }

    double number(int node) {
        return nodes.get(node).value();
    }

    int unary(Operation operation, int x) {
        switch (operation) {
            case NEGATE -> {
                if (operation(x) == Operation.LITERAL) {
                    return literal(0 - number(x), nodes.get(x).inexact());
                }
                if (operation(x) == Operation.NEGATE) {
                    return left(x);
                }
            }
            case LN -> {
                int rest = rest(x);
                if (rest >= 0) {
                    return unary(Operation.LOG1P, rest);
                }
                if (operation(x) == Operation.SUBTRACT && isLiteral(left(x), 1)) {
                    return unary(
                            Operation.LOG1P,
                            unary(Operation.NEGATE, nodes.get(x).right()));
                }
            }
            default -> {
                // nothing to rewrite
            }
        }
        return put(operation, x, -1, 0, false);
    }

    /** u of a node 1 + u or u + 1; −1 if the node is something else. */
    private int rest(int node) {
        if (operation(node) != Operation.ADD) {
            return -1;
        }
        int a = left(node);
        int b = nodes.get(node).right();
        return isLiteral(a, 1) ? b : isLiteral(b, 1) ? a : -1;
    }

    int binary(Operation operation, int x, int y) {
        if (isInteger(x) && isInteger(y)) {
            double folded = folded(operation, number(x), number(y));
            if (!Double.isNaN(folded) && Math.abs(folded) < 0x1p50) {
                return constant(folded);
            }
        }
        return switch (operation) {
            case ADD -> sum(x, y);
            case SUBTRACT -> difference(x, y);
            case POWER -> power(x, y);
            default -> put(operation, x, y, 0, false);
        };
    }

    /** The result for integers where it is an integer again, NaN otherwise. */
    private static double folded(Operation operation, double x, double y) {
        return switch (operation) {
            case ADD -> x + y;
            case SUBTRACT -> x - y;
            case MULTIPLY -> x * y;
            default -> Double.NaN;
        };
    }

    private int sum(int x, int y) {
        if (operation(y) == Operation.NEGATE) {
            return difference(x, left(y));
        }
        if (operation(x) == Operation.NEGATE) {
            return difference(y, left(x));
        }
        if (isLiteral(y, -1)) {
            return difference(x, constant(1));
        }
        if (isLiteral(x, -1)) {
            return difference(y, constant(1));
        }
        return put(Operation.ADD, x, y, 0, false);
    }

    private int difference(int x, int y) {
        if (operation(y) == Operation.NEGATE) {
            return sum(x, left(y));
        }
        if (isLiteral(x, 1)) {
            switch (operation(y)) {
                case EXP -> {
                    return unary(Operation.NEGATE, unary(Operation.EXPM1, left(y)));
                }
                case ERF -> {
                    return unary(Operation.ERFC, left(y));
                }
                case COS -> {
                    int half = binary(Operation.DIVIDE, left(y), constant(2));
                    int sine = unary(Operation.SIN, half);
                    return binary(Operation.MULTIPLY, constant(2), power(sine, constant(2)));
                }
                default -> {
                    // no cancellation that has a stable form
                }
            }
        }
        if (isLiteral(y, 1)) {
            if (operation(x) == Operation.EXP) {
                return unary(Operation.EXPM1, left(x));
            }
            if (operation(x) == Operation.SQRT && rest(left(x)) >= 0) {
                return binary(Operation.DIVIDE, rest(left(x)), binary(Operation.ADD, x, y));
            }
        }
        return put(Operation.SUBTRACT, x, y, 0, false);
    }

    private int power(int x, int y) {
        if (isLiteral(y, 1)) {
            return x;
        }
        return isLiteral(y, 0.5) ? unary(Operation.SQRT, x) : put(Operation.POWER, x, y, 0, false);
    }

    /** The graph of everything that {@code root} needs. */
    Graph build(int root) {
        int[] place = new int[root + 1];
        place[root] = 1;
        for (int i = root; i >= 0; i--) {
            if (place[i] != 0) {
                Node node = nodes.get(i);
                if (node.operation().arity() >= 1) {
                    place[node.left()] = 1;
                }
                if (node.operation().arity() == 2) {
                    place[node.right()] = 1;
                }
            }
        }
        int size = 0;
        for (int i = 0; i <= root; i++) {
            size += place[i];
        }
        Operation[] operations = new Operation[size];
        int[] left = new int[size];
        int[] right = new int[size];
        double[] literals = new double[size];
        boolean[] inexact = new boolean[size];
        int next = 0;
        for (int i = 0; i <= root; i++) {
            if (place[i] == 0) {
                continue;
            }
            Node node = nodes.get(i);
            operations[next] = node.operation();
            left[next] = node.operation().arity() >= 1 ? place[node.left()] : node.left();
            right[next] = node.operation().arity() == 2 ? place[node.right()] : -1;
            literals[next] = node.value();
            inexact[next] = node.inexact();
            place[i] = next++;
        }
        return new Graph(operations, left, right, literals, inexact, names, nameStarts);
    }
}
