package org.wellwright.solver.model;

import java.util.List;
import org.wellwright.solver.radial.EnergyGradient;
import org.wellwright.solver.radial.RadialProblem;

/**
 * A radial problem with the way back from its own derivatives to those of the pool. Immutable.
 *
 * <p>dE/d(number) = Σ_j ∂E/∂p_j · dp_j/d(number) over everything in the problem (parameters of terms, range ends,
 * walls, κ), plus the energy origin's own derivative.
 */
public final class AssembledProblem {
    private final String system;
    private final String curve;
    private final ChannelKey channel;
    private final RadialProblem problem;
    private final PoolValue energyOrigin;
    private final PoolValue kinetic;
    private final List<PoolValue> common;
    private final List<List<PoolValue>> rest;
    private final PoolValue innerWall;
    private final PoolValue outerWall;

    AssembledProblem(
            LevelKey first,
            RadialProblem problem,
            PoolValue energyOrigin,
            PoolValue kinetic,
            List<PoolValue> common,
            List<List<PoolValue>> rest,
            PoolValue innerWall,
            PoolValue outerWall) {
        this.system = first.system();
        this.curve = first.curve();
        this.channel = first.channel();
        this.problem = problem;
        this.energyOrigin = energyOrigin;
        this.kinetic = kinetic;
        this.common = List.copyOf(common);
        this.rest = List.copyOf(rest);
        this.innerWall = innerWall;
        this.outerWall = outerWall;
    }

    /** What to solve, in the document's unit system. */
    public RadialProblem problem() {
        return problem;
    }

    /** What is added to every energy of the problem, in the unit system's unit of energy. */
    public PoolValue energyOrigin() {
        return energyOrigin;
    }

    /** The key of a level of this problem. */
    public LevelKey key(int index) {
        return new LevelKey(system, curve, channel, index);
    }

    /**
     * Adds {@code weight} times the derivatives of a level's energy, origin included, to a gradient over the pool's
     * numbers.
     */
    public void addGradient(EnergyGradient level, double weight, double[] gradient) {
        energyOrigin.addTo(gradient, weight);
        addProblemGradient(level, weight, gradient);
    }

    /**
     * Adds {@code weight} times the derivatives of a quantity that does not know the energy origin.
     *
     * @param level its derivatives by everything in the problem
     */
    public void addProblemGradient(EnergyGradient level, double weight, double[] gradient) {
        kinetic.addTo(gradient, weight * level.kinetic());
        for (int j = 0; j < common.size(); j++) {
            if (!common.get(j).constant()) {
                common.get(j).addTo(gradient, weight * level.common(j));
            }
        }
        for (int i = 0; i < rest.size(); i++) {
            List<PoolValue> term = rest.get(i);
            for (int j = 0; j < term.size(); j++) {
                if (!term.get(j).constant()) {
                    term.get(j).addTo(gradient, weight * level.rest(i, j));
                }
            }
        }
        if (!innerWall.constant()) {
            innerWall.addTo(gradient, weight * level.innerWall());
        }
        if (!outerWall.constant()) {
            outerWall.addTo(gradient, weight * level.outerWall());
        }
    }

    /** Marks the numbers of the pool that the problem depends on. */
    public void markUsed(boolean[] used) {
        energyOrigin.markIn(used);
        kinetic.markIn(used);
        innerWall.markIn(used);
        outerWall.markIn(used);
        common.forEach(value -> value.markIn(used));
        rest.forEach(term -> term.forEach(value -> value.markIn(used)));
    }
}
