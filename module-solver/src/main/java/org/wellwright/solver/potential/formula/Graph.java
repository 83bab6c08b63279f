package org.wellwright.solver.potential.formula;

import java.util.List;

/**
 * A formula as a directed graph without cycles: the operands of every node come before it. Immutable.
 *
 * <p>Node i applies {@code operation(i)} to the nodes {@code left(i)} and {@code right(i)}; a LITERAL has
 * {@code literal(i)}, a PARAMETER the index {@code left(i)} into {@link #names}. The last node is the value.
 */
final class Graph {
    private final Operation[] operations;
    private final int[] left;
    private final int[] right;
    private final double[] literals;
    private final boolean[] inexact;
    private final List<String> names;
    private final List<Integer> nameColumns;

    Graph(
            Operation[] operations,
            int[] left,
            int[] right,
            double[] literals,
            boolean[] inexact,
            List<String> names,
            List<Integer> nameColumns) {
        this.operations = operations.clone();
        this.left = left.clone();
        this.right = right.clone();
        this.literals = literals.clone();
        this.inexact = inexact.clone();
        this.names = List.copyOf(names);
        this.nameColumns = List.copyOf(nameColumns);
    }

    int size() {
        return operations.length;
    }

    Operation operation(int node) {
        return operations[node];
    }

    int left(int node) {
        return left[node];
    }

    int right(int node) {
        return right[node];
    }

    double literal(int node) {
        return literals[node];
    }

    /** Whether the decimal number typed is not exactly the double. */
    boolean inexact(int node) {
        return inexact[node];
    }

    /** The parameters in the order of their first appearance. */
    List<String> names() {
        return names;
    }

    /** Where parameter {@code index} first appears: index of the character from 0. */
    int nameStart(int index) {
        return nameColumns.get(index);
    }

    boolean usesOrbital() {
        for (Operation operation : operations) {
            if (operation == Operation.ORBITAL) {
                return true;
            }
        }
        return false;
    }
}
