package org.wellwright.solver.radial.spectral;

import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.atomic.AtomicLong;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * Values of one potential on the nodes of elements, shared by all channels that contain it. The elements of all
 * problems come from one ladder, so neighbours in l meet the same elements; what is stored are the very values that the
 * evaluator gives, so a result does not depend on who filled the cache.
 */
final class SampleCache {
    private record Key(double first, double last, int count) {}

    private final String canonical;
    private final ConcurrentHashMap<Key, double[]> values;
    private final AtomicLong evaluations = new AtomicLong();

    private SampleCache(String canonical, boolean keep) {
        this.canonical = canonical;
        values = keep ? new ConcurrentHashMap<>() : null;
    }

    /** A cache for all problems whose common potential has this text. */
    static SampleCache shared(TermEvaluator common) {
        return new SampleCache(common.canonical(), true);
    }

    /** Stores nothing. */
    static SampleCache none() {
        return new SampleCache(null, false);
    }

    /** Whether it belongs to this potential. */
    boolean serves(TermEvaluator common) {
        return canonical != null && canonical.equals(common.canonical());
    }

    /** V at the radii, which are determined by the first, the last and their number; not to be changed. */
    double[] common(TermEvaluator evaluator, double[] radii, int count) {
        if (values == null) {
            return evaluate(evaluator, radii, count);
        }
        Key key = new Key(radii[0], radii[count - 1], count);
        double[] known = values.get(key);
        if (known == null) {
            known = evaluate(evaluator, radii, count);
            values.put(key, known);
        }
        return known;
    }

    private double[] evaluate(TermEvaluator evaluator, double[] radii, int count) {
        evaluations.addAndGet(count);
        double[] into = new double[count];
        evaluator.values(radii, into, count);
        return into;
    }

    long evaluations() {
        return evaluations.get();
    }
}
