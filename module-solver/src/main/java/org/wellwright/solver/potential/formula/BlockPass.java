package org.wellwright.solver.potential.formula;

import java.util.Arrays;

/**
 * Evaluates a program at many radii, one operation at a time over blocks of radii, with the bits of
 * {@link BoundFormula#value}. The registers of results that are no longer needed are used again.
 */
final class BlockPass {
    private static final int BLOCK = 128;
    private static final long EXPONENT = 0x7ffL << 52;

    private final Program program;
    private final int[] register;
    private final int registers;

    BlockPass(Program program) {
        this.program = program;
        Graph graph = program.graph();
        int[] lastUse = new int[program.size()];
        for (int k = 0; k < program.varyingCount(); k++) {
            int i = program.varying(k);
            Operation operation = graph.operation(i);
            if (operation.arity() >= 1) {
                lastUse[graph.left(i)] = i;
            }
            if (operation.arity() == 2) {
                lastUse[graph.right(i)] = i;
            }
        }
        lastUse[program.root()] = program.size();
        this.register = new int[program.size()];
        int[] free = new int[program.size()];
        int freeCount = 0;
        int count = 0;
        for (int k = 0; k < program.varyingCount(); k++) {
            int i = program.varying(k);
            Operation operation = graph.operation(i);
            int left = operation.arity() >= 1 ? graph.left(i) : -1;
            int right = operation.arity() == 2 ? graph.right(i) : -1;
            if (left >= 0 && program.varies(left) && lastUse[left] == i) {
                free[freeCount++] = register[left];
            }
            if (right >= 0 && right != left && program.varies(right) && lastUse[right] == i) {
                free[freeCount++] = register[right];
            }
            register[i] = freeCount > 0 ? free[--freeCount] : count++;
        }
        this.registers = count;
    }

    /**
     * V at {@code count} radii.
     *
     * @return whether every value is surely good; if not, values that are not finite or came through a division by
     *     infinity must be computed again
     */
    boolean run(double[] radii, double[] into, int count) {
        if (!program.varies(program.root())) {
            Arrays.fill(into, 0, count, program.constant(program.root()));
            return true;
        }
        int block = Math.min(BLOCK, count);
        double[][] frame = new double[registers + 1][block];
        boolean good = true;
        for (int start = 0; start < count; start += block) {
            int n = Math.min(block, count - start);
            good &= block(frame, radii, start, n);
            double[] result = frame[register[program.root()]];
            System.arraycopy(result, 0, into, start, n);
            good &= allFinite(result, n);
        }
        return good;
    }

    private boolean block(double[][] frame, double[] radii, int start, int n) {
        Graph graph = program.graph();
        boolean good = true;
        for (int k = 0; k < program.varyingCount(); k++) {
            int i = program.varying(k);
            Operation operation = graph.operation(i);
            double[] out = frame[register[i]];
            if (operation == Operation.RADIUS) {
                System.arraycopy(radii, start, out, 0, n);
                continue;
            }
            int left = graph.left(i);
            if (operation.arity() == 1) {
                unary(operation, frame[register[left]], out, n);
                continue;
            }
            int right = graph.right(i);
            if (operation == Operation.DIVIDE && program.varies(right) && graph.operation(right) != Operation.RADIUS) {
                good &= allFinite(frame[register[right]], n);
            }
            if (!program.varies(right)) {
                withConstant(operation, frame[register[left]], program.constant(right), out, n, frame[registers]);
            } else if (!program.varies(left)) {
                constantWith(operation, program.constant(left), frame[register[right]], out, n);
            } else {
                binary(operation, frame[register[left]], frame[register[right]], out, n);
            }
        }
        return good;
    }

    private static boolean allFinite(double[] x, int n) {
        long overflow = 0;
        for (int i = 0; i < n; i++) {
            // The exponent of an infinity or a NaN is all ones; one more carries into the sign.
            overflow |= (Double.doubleToRawLongBits(x[i]) & EXPONENT) + (1L << 52);
        }
        return overflow >= 0;
    }

    private static void unary(Operation operation, double[] a, double[] out, int n) {
        switch (operation) {
            case NEGATE -> {
                for (int i = 0; i < n; i++) {
                    out[i] = -a[i];
                }
            }
            case EXP -> {
                for (int i = 0; i < n; i++) {
                    out[i] = Math.exp(a[i]);
                }
            }
            case SQRT -> {
                for (int i = 0; i < n; i++) {
                    out[i] = Math.sqrt(a[i]);
                }
            }
            case LN -> {
                for (int i = 0; i < n; i++) {
                    out[i] = Math.log(a[i]);
                }
            }
            default -> {
                for (int i = 0; i < n; i++) {
                    out[i] = Real.apply(operation, a[i], 0);
                }
            }
        }
    }

    private static void binary(Operation operation, double[] a, double[] b, double[] out, int n) {
        switch (operation) {
            case ADD -> {
                for (int i = 0; i < n; i++) {
                    out[i] = a[i] + b[i];
                }
            }
            case SUBTRACT -> {
                for (int i = 0; i < n; i++) {
                    out[i] = a[i] - b[i];
                }
            }
            case MULTIPLY -> {
                for (int i = 0; i < n; i++) {
                    out[i] = a[i] * b[i];
                }
            }
            case DIVIDE -> {
                for (int i = 0; i < n; i++) {
                    out[i] = a[i] / b[i];
                }
            }
            default -> {
                for (int i = 0; i < n; i++) {
                    out[i] = Real.apply(operation, a[i], b[i]);
                }
            }
        }
    }

    private static void withConstant(Operation operation, double[] a, double c, double[] out, int n, double[] scratch) {
        switch (operation) {
            case ADD -> {
                for (int i = 0; i < n; i++) {
                    out[i] = a[i] + c;
                }
            }
            case SUBTRACT -> {
                for (int i = 0; i < n; i++) {
                    out[i] = a[i] - c;
                }
            }
            case MULTIPLY -> {
                for (int i = 0; i < n; i++) {
                    out[i] = a[i] * c;
                }
            }
            case DIVIDE -> {
                for (int i = 0; i < n; i++) {
                    out[i] = a[i] / c;
                }
            }
            case POWER -> {
                if (Real.isSmallInteger(c)) {
                    integerPower(a, (int) c, out, n, scratch);
                } else {
                    for (int i = 0; i < n; i++) {
                        out[i] = Math.pow(a[i], c);
                    }
                }
            }
            default -> {
                for (int i = 0; i < n; i++) {
                    out[i] = Real.apply(operation, a[i], c);
                }
            }
        }
    }

    /** {@link Real#integerPower} one squaring at a time for the whole block. */
    private static void integerPower(double[] a, int power, double[] out, int n, double[] square) {
        System.arraycopy(a, 0, square, 0, n);
        boolean started = false;
        for (int left = Math.abs(power); left != 0; left >>= 1) {
            if ((left & 1) != 0) {
                if (started) {
                    binary(Operation.MULTIPLY, out, square, out, n);
                } else {
                    System.arraycopy(square, 0, out, 0, n);
                    started = true;
                }
            }
            if (left != 1) {
                binary(Operation.MULTIPLY, square, square, square, n);
            }
        }
        if (!started) {
            Arrays.fill(out, 0, n, 1);
        }
        if (power < 0) {
            constantWith(Operation.DIVIDE, 1, out, out, n);
        }
    }

    private static void constantWith(Operation operation, double c, double[] b, double[] out, int n) {
        switch (operation) {
            case ADD -> {
                for (int i = 0; i < n; i++) {
                    out[i] = c + b[i];
                }
            }
            case SUBTRACT -> {
                for (int i = 0; i < n; i++) {
                    out[i] = c - b[i];
                }
            }
            case MULTIPLY -> {
                for (int i = 0; i < n; i++) {
                    out[i] = c * b[i];
                }
            }
            case DIVIDE -> {
                for (int i = 0; i < n; i++) {
                    out[i] = c / b[i];
                }
            }
            default -> {
                for (int i = 0; i < n; i++) {
                    out[i] = Real.apply(operation, c, b[i]);
                }
            }
        }
    }
}
