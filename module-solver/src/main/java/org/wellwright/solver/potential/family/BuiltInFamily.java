package org.wellwright.solver.potential.family;

import java.util.List;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/** What the built-in families share: their description and the check of their values. */
abstract class BuiltInFamily implements PotentialFamily {
    /** 1/length. */
    static final Dimension INVERSE_LENGTH = Dimension.LENGTH.power(-1);

    /** energy · length. */
    static final Dimension ENERGY_LENGTH = Dimension.ENERGY.times(Dimension.LENGTH);

    private final Description description;
    private final List<FamilyParameter> parameters;

    /**
     * What a family says of itself.
     *
     * @param id see {@link PotentialFamily#id()}
     * @param displayName see {@link PotentialFamily#displayName()}
     * @param formula see {@link PotentialFamily#formula()}
     * @param validity see {@link PotentialFamily#validity()}
     * @param source see {@link PotentialFamily#source()}
     */
    record Description(String id, String displayName, String formula, String validity, String source) {}

    BuiltInFamily(Description description, FamilyParameter... parameters) {
        this.description = description;
        this.parameters = List.of(parameters);
    }

    @Override
    public final String id() {
        return description.id();
    }

    @Override
    public final String displayName() {
        return description.displayName();
    }

    @Override
    public final String formula() {
        return description.formula();
    }

    @Override
    public final String validity() {
        return description.validity();
    }

    @Override
    public final String source() {
        return description.source();
    }

    @Override
    public final List<FamilyParameter> parameters() {
        return parameters;
    }

    @Override
    public final TermEvaluator bind(double[] values, ChannelFacts channel) {
        if (values.length != parameters.size()) {
            throw new IllegalArgumentException(
                    "family %s takes %d values, got %d".formatted(id(), parameters.size(), values.length));
        }
        for (int i = 0; i < values.length; i++) {
            require(Double.isFinite(values[i]), i, "finite", values[i]);
        }
        return evaluator(values.clone(), channel);
    }

    /** The evaluator of finite values, which it may keep. */
    abstract TermEvaluator evaluator(double[] values, ChannelFacts channel);

    /** Refuses a value that breaks a rule. */
    final void require(boolean holds, int parameter, String rule, double value) {
        if (!holds) {
            throw new InvalidModelException(
                    "the parameter '%s' must be %s, got %s"
                            .formatted(parameters.get(parameter).name(), rule, value),
                    "family " + id(),
                    "change its value");
        }
    }

    /** Refuses a value that is not above 0. */
    final void requirePositive(int parameter, double value) {
        require(value > 0, parameter, "positive", value);
    }

    /** Refuses a value below 0. */
    final void requireNotNegative(int parameter, double value) {
        require(value >= 0, parameter, "zero or positive", value);
    }
}
