package org.wellwright.solver.model;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.Term;

/**
 * A potential curve: the sum of its terms, from an energy origin.
 *
 * @param name name, unique in its model
 * @param terms the terms in order
 * @param energyOrigin what is added to every energy of the curve; {@link Argument#ZERO} as a rule
 * @param innerWall radius of a hard wall; {@link Argument#ZERO} for none
 * @param outerWall radius of a hard wall; {@link Argument#UNBOUNDED} for none
 * @param spinScheme which angular momenta label its channels
 * @param labels how its labels differ from the project's convention
 * @param occupied levels that are not available
 */
public record Curve(
        String name,
        List<Term> terms,
        Argument energyOrigin,
        Argument innerWall,
        Argument outerWall,
        SpinScheme spinScheme,
        LabelRule labels,
        List<OccupiedLevel> occupied) {

    /** Copies the lists and checks that nothing is missing. */
    public Curve {
        terms = List.copyOf(terms);
        occupied = List.copyOf(occupied);
        Objects.requireNonNull(energyOrigin, "energyOrigin");
        Objects.requireNonNull(innerWall, "innerWall");
        Objects.requireNonNull(outerWall, "outerWall");
        Objects.requireNonNull(spinScheme, "spinScheme");
        Objects.requireNonNull(labels, "labels");
        if (name.isBlank()) {
            throw new IllegalArgumentException("a curve needs a name");
        }
    }

    /** A spinless curve from origin zero without walls. */
    public static Curve of(String name, List<Term> terms) {
        return new Curve(
                name,
                terms,
                Argument.ZERO,
                Argument.ZERO,
                Argument.UNBOUNDED,
                SpinScheme.NONE,
                LabelRule.PLAIN,
                List.of());
    }

    /** The same with other terms. */
    public Curve withTerms(List<Term> newTerms) {
        return new Curve(name, newTerms, energyOrigin, innerWall, outerWall, spinScheme, labels, occupied);
    }

    /** The same with another name. */
    public Curve withName(String newName) {
        return new Curve(newName, terms, energyOrigin, innerWall, outerWall, spinScheme, labels, occupied);
    }

    /** The same with another energy origin. */
    public Curve withEnergyOrigin(Argument newEnergyOrigin) {
        return new Curve(name, terms, newEnergyOrigin, innerWall, outerWall, spinScheme, labels, occupied);
    }

    /** The same with another inner wall. */
    public Curve withInnerWall(Argument newInnerWall) {
        return new Curve(name, terms, energyOrigin, newInnerWall, outerWall, spinScheme, labels, occupied);
    }

    /** The same with another outer wall. */
    public Curve withOuterWall(Argument newOuterWall) {
        return new Curve(name, terms, energyOrigin, innerWall, newOuterWall, spinScheme, labels, occupied);
    }

    /** The same with another spin scheme. */
    public Curve withSpinScheme(SpinScheme newSpinScheme) {
        return new Curve(name, terms, energyOrigin, innerWall, outerWall, newSpinScheme, labels, occupied);
    }

    /** The same with another label rule. */
    public Curve withLabels(LabelRule newLabels) {
        return new Curve(name, terms, energyOrigin, innerWall, outerWall, spinScheme, newLabels, occupied);
    }

    /** The same with other occupied levels. */
    public Curve withOccupied(List<OccupiedLevel> newOccupied) {
        return new Curve(name, terms, energyOrigin, innerWall, outerWall, spinScheme, labels, newOccupied);
    }
}
