package org.wellwright.solver.radial;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.OptionalInt;

/**
 * The levels of one problem in the order of energy, with their states and the evidence that none was missed. Immutable.
 */
public final class Spectrum {
    private final RadialProblem problem;
    private final LevelSearch search;
    private final List<LevelOutcome> outcomes;
    private final List<RadialState> states;
    private final Completeness completeness;
    private final double searchedBelow;
    private final String message;
    private final Effort effort;

    /**
     * What a solve cost.
     *
     * @param elements mesh elements (or steps)
     * @param evaluations evaluations of V
     * @param counts counts of levels below an energy
     */
    public record Effort(int elements, long evaluations, int counts) {}

    /**
     * A spectrum.
     *
     * @param outcomes one per wanted level, by index
     * @param states the state of each outcome that is a {@link Level}, in the same order; empty if the method makes
     *     none
     * @param searchedBelow every level below this energy is among the outcomes
     * @param message why the spectrum is not complete, or what the user should know; empty as a rule
     */
    public Spectrum(
            RadialProblem problem,
            LevelSearch search,
            List<LevelOutcome> outcomes,
            List<RadialState> states,
            Completeness completeness,
            double searchedBelow,
            String message,
            Effort effort) {
        this.problem = Objects.requireNonNull(problem, "problem");
        this.search = Objects.requireNonNull(search, "search");
        this.outcomes = List.copyOf(outcomes);
        this.states = List.copyOf(states);
        this.completeness = Objects.requireNonNull(completeness, "completeness");
        this.searchedBelow = searchedBelow;
        this.message = Objects.requireNonNull(message, "message");
        this.effort = Objects.requireNonNull(effort, "effort");
    }

    /** What was solved. */
    public RadialProblem problem() {
        return problem;
    }

    /** What was asked. */
    public LevelSearch search() {
        return search;
    }

    /** One outcome per wanted level, in the order of energy. */
    public List<LevelOutcome> outcomes() {
        return outcomes;
    }

    /** The levels that were found, in the order of energy. */
    public List<Level> levels() {
        List<Level> found = new ArrayList<>(outcomes.size());
        for (LevelOutcome outcome : outcomes) {
            if (outcome instanceof Level level) {
                found.add(level);
            }
        }
        return List.copyOf(found);
    }

    /**
     * The state of a found level.
     *
     * @param index the level's index
     * @throws IllegalArgumentException if there is no such level or the method makes no states
     */
    public RadialState state(int index) {
        int position = 0;
        for (LevelOutcome outcome : outcomes) {
            if (outcome instanceof Level) {
                if (outcome.index() == index && position < states.size()) {
                    return states.get(position);
                }
                position++;
            }
        }
        throw new IllegalArgumentException("no state of index " + index);
    }

    /** Position of the level with this index among {@link #levels()}, if it was found. */
    public OptionalInt position(int index) {
        List<Level> levels = levels();
        for (int i = 0; i < levels.size(); i++) {
            if (levels.get(i).index() == index) {
                return OptionalInt.of(i);
            }
        }
        return OptionalInt.empty();
    }

    /** How sure it is that none was missed. */
    public Completeness completeness() {
        return completeness;
    }

    /** Every level below this energy is among the outcomes. */
    public double searchedBelow() {
        return searchedBelow;
    }

    /** Why the spectrum is not complete, or what the user should know; empty as a rule. */
    public String message() {
        return message;
    }

    /** What it cost. */
    public Effort effort() {
        return effort;
    }
}
