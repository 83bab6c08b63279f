package org.wellwright.solver.potential.formula;

import java.util.List;
import java.util.Map;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.Formula;
import org.wellwright.solver.potential.TermEvaluator;

/** A text and its graph. */
final class ParsedFormula implements Formula {
    private final String text;
    private final Graph graph;
    private final boolean usesOrbital;

    ParsedFormula(String text, Graph graph) {
        this.text = text;
        this.graph = graph;
        this.usesOrbital = graph.usesOrbital();
    }

    @Override
    public String text() {
        return text;
    }

    @Override
    public List<String> names() {
        return graph.names();
    }

    @Override
    public boolean dependsOnChannel() {
        return usesOrbital;
    }

    @Override
    public TermEvaluator bind(double[] values, ChannelFacts channel) {
        if (values.length != names().size()) {
            throw new IllegalArgumentException(
                    "the formula takes %d values, got %d".formatted(names().size(), values.length));
        }
        for (int i = 0; i < values.length; i++) {
            if (!Double.isFinite(values[i])) {
                throw new InvalidModelException(
                        "the parameter '%s' must be finite, got %s".formatted(names().get(i), values[i]),
                        place(i),
                        "change its value");
            }
        }
        return new BoundFormula(graph, values, usesOrbital ? channel.orbital() : 0);
    }

    @Override
    public TermEvaluator bind(Map<String, Double> values, ChannelFacts channel) {
        double[] ordered = new double[names().size()];
        for (int i = 0; i < ordered.length; i++) {
            Double value = values.get(names().get(i));
            if (value == null) {
                String known = values.isEmpty()
                        ? "none has one"
                        : "those with a value are "
                                + String.join(
                                        ", ", values.keySet().stream().sorted().toList());
                throw new InvalidModelException(
                        "the parameter '%s' has no value".formatted(names().get(i)), place(i), "give it one; " + known);
            }
            ordered[i] = value;
        }
        return bind(ordered, channel);
    }

    private String place(int parameter) {
        return FaultyFormula.place(text, graph.nameStart(parameter));
    }
}
