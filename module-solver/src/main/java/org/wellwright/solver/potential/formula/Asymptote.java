package org.wellwright.solver.potential.formula;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.potential.formula.PowerLogSeries.Order;
import org.wellwright.solver.potential.formula.PowerLogSeries.Term;

/**
 * Leading behaviour S(t)·e^φ(t) of a function at t → ∞: S a {@link PowerLogSeries}, φ a sum of positive powers of t.
 * Whatever is exponentially smaller is left out and S marked inexact. Immutable; {@code null} in place of one means
 * that nothing is known.
 *
 * @param phase the terms of φ in falling order, powers above 0
 * @param series S
 */
record Asymptote(List<Term> phase, PowerLogSeries series) {
    static final Asymptote ZERO = of(PowerLogSeries.ZERO);

    /** Zero but for something exponentially small. */
    static final Asymptote NEGLIGIBLE = of(PowerLogSeries.ZERO.inexact());

    /** Bounded, no more. */
    static final Asymptote BOUNDED = of(PowerLogSeries.atMost(Order.CONSTANT));

    Asymptote {
        phase = List.copyOf(phase);
    }

    static Asymptote of(PowerLogSeries series) {
        return new Asymptote(List.of(), series);
    }

    static Asymptote constant(double value) {
        return Double.isFinite(value) ? of(PowerLogSeries.constant(value)) : null;
    }

    boolean isPlain() {
        return phase.isEmpty();
    }

    /** Sign of φ at large t: −1 for decay, 1 for growth, 0 for neither. */
    int trend() {
        return phase.isEmpty() ? 0 : phase.get(0).coefficient() > 0 ? 1 : -1;
    }

    /** As a plain series, exponential decay neglected; null if it grows exponentially. */
    PowerLogSeries plain() {
        return trend() == 0 ? series : trend() < 0 ? NEGLIGIBLE.series : null;
    }

    /** −1, 0, 1; null if it cannot be told. */
    Integer sign() {
        if (series.hasLead()) {
            return series.lead().coefficient() > 0 ? 1 : -1;
        }
        return series.isZero() ? Integer.valueOf(0) : null;
    }

    Asymptote negate() {
        return new Asymptote(phase, series.times(-1));
    }

    Asymptote plus(Asymptote other) {
        if (series.isZero()) {
            return other;
        }
        if (other.series.isZero()) {
            return this;
        }
        int larger = new Asymptote(difference(phase, other.phase), PowerLogSeries.ZERO).trend();
        if (larger == 0) {
            return new Asymptote(phase, series.plus(other.series));
        }
        Asymptote winner = larger > 0 ? this : other;
        return new Asymptote(winner.phase, winner.series.inexact());
    }

    Asymptote times(Asymptote other) {
        PowerLogSeries product = series.times(other.series);
        return product.isZero() ? ZERO : new Asymptote(sum(phase, other.phase), product);
    }

    /** This to a constant power; null if the leading term is unknown or has no such power. */
    Asymptote power(double p) {
        if (p == 0) {
            return constant(1);
        }
        if (!series.hasLead()) {
            return series.isZero() && p > 0 ? ZERO : null;
        }
        Term lead = series.lead();
        double c = lead.coefficient();
        double logs = lead.order().logs() * p;
        if (c < 0 && p != Math.rint(p) || logs != Math.rint(logs)) {
            return null;
        }
        double[] binomial = new double[PowerLogSeries.LENGTH];
        binomial[0] = 1;
        for (int m = 1; m < binomial.length; m++) {
            binomial[m] = binomial[m - 1] * (p - m + 1) / m;
        }
        double factor = Real.power(c, p);
        if (!Double.isFinite(factor) || factor == 0) {
            return null;
        }
        PowerLogSeries front = PowerLogSeries.term(factor, lead.order().power() * p, (int) logs);
        return new Asymptote(scaled(phase, p), front.times(relativeRest().compose(binomial)));
    }

    /** δ in S = lead · (1 + δ). */
    private PowerLogSeries relativeRest() {
        Term lead = series.lead();
        PowerLogSeries inverse = PowerLogSeries.term(
                1 / lead.coefficient(), -lead.order().power(), -lead.order().logs());
        return series.below(lead.order()).times(inverse);
    }

    /** e^x; null if it cannot be told. */
    Asymptote exp() {
        if (trend() > 0) {
            Integer sign = sign();
            return sign != null && sign < 0 ? NEGLIGIBLE : null;
        }
        PowerLogSeries x = plain();
        List<Term> growing = new ArrayList<>();
        double constant = 0;
        double power = 0;
        for (Term term : x.terms()) {
            Order order = term.order();
            if (order.compareTo(Order.CONSTANT) < 0) {
                break;
            }
            if (order.power() > 1e-12) {
                if (order.logs() != 0) {
                    return growing.isEmpty() && term.coefficient() < 0 ? NEGLIGIBLE : null;
                }
                growing.add(term);
            } else if (order.logs() == 0) {
                constant += term.coefficient();
            } else if (order.logs() == 1) {
                power += term.coefficient();
            } else {
                return null;
            }
        }
        boolean decays = !growing.isEmpty() && growing.get(0).coefficient() < 0;
        PowerLogSeries rest = x.below(Order.CONSTANT);
        double factor = Math.exp(constant);
        if (!rest.vanishes() || !Double.isFinite(factor) || factor == 0) {
            return decays ? NEGLIGIBLE : null;
        }
        PowerLogSeries front = PowerLogSeries.term(factor, power, 0);
        return new Asymptote(growing, front.times(rest.compose(Taylor.exp(0))));
    }

    /** ln x; null if x is not surely positive. */
    Asymptote ln() {
        if (!series.hasLead()
                || series.lead().coefficient() <= 0
                || series.lead().order().logs() != 0) {
            return null;
        }
        Term lead = series.lead();
        PowerLogSeries result = relativeRest().compose(Taylor.log1p());
        result = result.plus(PowerLogSeries.constant(Math.log(lead.coefficient())));
        result = result.plus(PowerLogSeries.term(lead.order().power(), 0, 1));
        for (Term term : phase) {
            result = result.plus(
                    PowerLogSeries.term(term.coefficient(), term.order().power(), 0));
        }
        return of(result);
    }

    /** The finite limit of x, NaN if it has none or it is not known. */
    double limit() {
        PowerLogSeries x = plain();
        if (x == null || x.order().compareTo(Order.CONSTANT) > 0) {
            return Double.NaN;
        }
        if (x.vanishes()) {
            return 0;
        }
        return x.hasLead() ? x.lead().coefficient() : Double.NaN;
    }

    /** f(x) for an x with a finite limit, from the Taylor coefficients of f there. */
    Asymptote compose(double[] coefficients) {
        return of(plain().below(Order.CONSTANT).compose(coefficients));
    }

    private static List<Term> scaled(List<Term> terms, double factor) {
        return terms.stream()
                .map(term -> new Term(term.order(), term.coefficient() * factor))
                .toList();
    }

    private static List<Term> difference(List<Term> a, List<Term> b) {
        return sum(a, scaled(b, -1));
    }

    private static List<Term> sum(List<Term> a, List<Term> b) {
        PowerLogSeries sum = PowerLogSeries.ZERO;
        for (Term term : a) {
            sum = sum.plus(PowerLogSeries.term(term.coefficient(), term.order().power(), 0));
        }
        for (Term term : b) {
            sum = sum.plus(PowerLogSeries.term(term.coefficient(), term.order().power(), 0));
        }
        return sum.terms();
    }
}
