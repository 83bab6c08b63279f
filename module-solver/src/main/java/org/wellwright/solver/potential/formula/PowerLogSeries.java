package org.wellwright.solver.potential.formula;

import java.util.ArrayList;
import java.util.List;

/**
 * The leading terms Σ c t^q (ln t)^k of a function at t → ∞ in falling order, and the order of what was left out.
 * Immutable.
 */
final class PowerLogSeries {
    /** How many terms are kept. */
    static final int LENGTH = 8;

    /** Order of nothing at all. */
    static final Order NONE = new Order(Double.NEGATIVE_INFINITY, 0);

    static final PowerLogSeries ZERO = new PowerLogSeries(List.of(), NONE, true);

    private final List<Term> terms;
    private final Order remainder;
    private final boolean exact;

    /** t^q (ln t)^k. */
    record Order(double power, int logs) implements Comparable<Order> {
        static final Order CONSTANT = new Order(0, 0);

        boolean isNone() {
            return power == Double.NEGATIVE_INFINITY;
        }

        Order times(Order other) {
            return isNone() || other.isNone() ? NONE : new Order(power + other.power, logs + other.logs);
        }

        Order power(int m) {
            return isNone() ? NONE : new Order(power * m, logs * m);
        }

        /** By growth; powers that differ by rounding only are equal. */
        @Override
        public int compareTo(Order other) {
            double apart = Math.abs(power - other.power);
            boolean same =
                    power == other.power || apart < Double.POSITIVE_INFINITY && apart <= 1e-12 * (1 + Math.abs(power));
            return same ? Integer.compare(logs, other.logs) : Double.compare(power, other.power);
        }
    }

    record Term(Order order, double coefficient) {}

    /** {@code exact} says that nothing exponentially small was left out. */
    private PowerLogSeries(List<Term> terms, Order remainder, boolean exact) {
        this.terms = List.copyOf(terms);
        this.remainder = remainder;
        this.exact = exact;
    }

    static PowerLogSeries term(double coefficient, double power, int logs) {
        return coefficient == 0
                ? ZERO
                : new PowerLogSeries(List.of(new Term(new Order(power, logs), coefficient)), NONE, true);
    }

    static PowerLogSeries constant(double value) {
        return term(value, 0, 0);
    }

    /** Nothing but an unknown remainder. */
    static PowerLogSeries atMost(Order remainder) {
        return new PowerLogSeries(List.of(), remainder, false);
    }

    List<Term> terms() {
        return terms;
    }

    Order remainder() {
        return remainder;
    }

    boolean isZero() {
        return terms.isEmpty() && remainder.isNone() && exact;
    }

    boolean hasLead() {
        return !terms.isEmpty();
    }

    Term lead() {
        return terms.get(0);
    }

    /** Order of the largest part, known or not. */
    Order order() {
        return terms.isEmpty() ? remainder : terms.get(0).order();
    }

    boolean vanishes() {
        return order().compareTo(Order.CONSTANT) < 0;
    }

    PowerLogSeries inexact() {
        return new PowerLogSeries(terms, remainder, false);
    }

    /** Without the terms that {@code drop} names, whose order is at most {@code least}. */
    PowerLogSeries below(Order least) {
        return new PowerLogSeries(
                terms.stream().filter(term -> term.order().compareTo(least) < 0).toList(), remainder, exact);
    }

    PowerLogSeries withRemainder(Order order) {
        return collect(terms, max(remainder, order), exact);
    }

    PowerLogSeries plus(PowerLogSeries other) {
        List<Term> all = new ArrayList<>(terms);
        all.addAll(other.terms);
        return collect(all, max(remainder, other.remainder), exact && other.exact);
    }

    PowerLogSeries times(double factor) {
        if (factor == 0) {
            return ZERO;
        }
        List<Term> scaled = terms.stream()
                .map(term -> new Term(term.order(), term.coefficient() * factor))
                .toList();
        return new PowerLogSeries(scaled, remainder, exact);
    }

    PowerLogSeries times(PowerLogSeries other) {
        if (isZero() || other.isZero()) {
            return ZERO;
        }
        List<Term> all = new ArrayList<>();
        for (Term a : terms) {
            for (Term b : other.terms) {
                all.add(new Term(a.order().times(b.order()), a.coefficient() * b.coefficient()));
            }
        }
        Order rest = max(remainder.times(other.order()), order().times(other.remainder));
        return collect(all, rest, exact && other.exact);
    }

    /** Σ a_m δ^m of this δ, which must vanish. */
    PowerLogSeries compose(double[] coefficients) {
        PowerLogSeries sum = ZERO;
        for (int m = coefficients.length - 1; m >= 0; m--) {
            sum = sum.times(this).plus(constant(coefficients[m]));
        }
        PowerLogSeries result = sum.withRemainder(order().power(coefficients.length));
        return exact ? result : result.inexact();
    }

    private static Order max(Order a, Order b) {
        return a.compareTo(b) >= 0 ? a : b;
    }

    /** Adds up equal orders, sorts, drops what the remainder hides or what cancels to within rounding. */
    private static PowerLogSeries collect(List<Term> all, Order remainder, boolean exact) {
        List<Term> sorted = new ArrayList<>(all);
        sorted.sort((a, b) -> b.order().compareTo(a.order()));
        List<Term> kept = new ArrayList<>();
        Order rest = remainder;
        int i = 0;
        while (i < sorted.size()) {
            Order order = sorted.get(i).order();
            double sum = 0;
            double size = 0;
            while (i < sorted.size() && sorted.get(i).order().compareTo(order) == 0) {
                sum += sorted.get(i).coefficient();
                size += Math.abs(sorted.get(i).coefficient());
                i++;
            }
            if (order.compareTo(rest) <= 0) {
                break;
            }
            if (sum != 0 && Math.abs(sum) <= 1e-15 * size || kept.size() == LENGTH || !(size <= Double.MAX_VALUE)) {
                rest = max(rest, order);
                break;
            }
            if (sum != 0) {
                kept.add(new Term(order, sum));
            }
        }
        return new PowerLogSeries(kept, rest, exact);
    }
}
