package org.wellwright.solver.potential;

import java.util.List;
import java.util.Objects;

/**
 * A table of V(r) with its interpolation and its continuation at both ends. Numbers are kept as typed, in the table's
 * own units.
 *
 * @param frame what surrounds it
 * @param radiusUnit symbol of the unit of the radii; empty for the project's
 * @param valueUnit symbol of the unit of the values; empty for the project's
 * @param knots the points in ascending radius, at least four
 * @param interpolation between the knots
 * @param inner below the first knot
 * @param outer above the last knot
 */
public record TableTerm(
        TermFrame frame,
        String radiusUnit,
        String valueUnit,
        List<TableKnot> knots,
        TableInterpolation interpolation,
        InnerContinuation inner,
        OuterContinuation outer)
        implements Term {

    /** Copies the knots and checks their order. */
    public TableTerm {
        Objects.requireNonNull(frame, "frame");
        Objects.requireNonNull(radiusUnit, "radiusUnit");
        Objects.requireNonNull(valueUnit, "valueUnit");
        Objects.requireNonNull(interpolation, "interpolation");
        Objects.requireNonNull(inner, "inner");
        Objects.requireNonNull(outer, "outer");
        knots = List.copyOf(knots);
        if (knots.size() < 4) {
            throw new IllegalArgumentException("a table needs at least 4 points, got " + knots.size());
        }
        for (int i = 1; i < knots.size(); i++) {
            if (!(knots.get(i).radius() > knots.get(i - 1).radius())) {
                throw new IllegalArgumentException("the radii of a table must ascend: point %d has %s after %s"
                        .formatted(
                                i + 1, knots.get(i).radius(), knots.get(i - 1).radius()));
            }
        }
    }

    @Override
    public TableTerm withFrame(TermFrame newFrame) {
        return new TableTerm(newFrame, radiusUnit, valueUnit, knots, interpolation, inner, outer);
    }
}
