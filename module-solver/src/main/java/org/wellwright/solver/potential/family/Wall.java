package org.wellwright.solver.potential.family;

import org.wellwright.solver.potential.HardWalls;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;

/** Zero everywhere but for its walls. */
final class Wall extends ClosedForm {
    private final HardWalls walls;

    Wall(String family, double[] values, HardWalls walls) {
        super(family, values);
        this.walls = walls;
    }

    @Override
    public double value(double r) {
        return 0;
    }

    @Override
    public double slope(double r) {
        return 0;
    }

    @Override
    public double parameterDerivative(int parameter, double r) {
        return 0;
    }

    @Override
    public double roundingBound(double r) {
        return 0;
    }

    @Override
    public HardWalls walls() {
        return walls;
    }

    @Override
    public OriginBehaviour origin() {
        return OriginBehaviour.FINITE;
    }

    @Override
    public TailBehaviour tail() {
        return TailBehaviour.ZERO;
    }
}
