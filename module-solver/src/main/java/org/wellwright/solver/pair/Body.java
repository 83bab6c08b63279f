package org.wellwright.solver.pair;

import java.util.Objects;
import org.wellwright.solver.units.ExactNumber;

/**
 * One of the two bodies.
 *
 * @param label name on screen ("electron", "K+ core")
 * @param mass where its mass comes from
 * @param charge electric charge in elementary charges
 * @param twiceSpin twice its spin, ≥ 0; −1 if the spin plays no role
 */
public record Body(String label, BodyMass mass, ExactNumber charge, int twiceSpin) {
    /** Checks that the parts are there. */
    public Body {
        Objects.requireNonNull(label, "label");
        Objects.requireNonNull(mass, "mass");
        Objects.requireNonNull(charge, "charge");
        if (twiceSpin < -1) {
            throw new IllegalArgumentException("twice the spin must be >= 0, or -1 for none, got " + twiceSpin);
        }
    }

    /** The same with another label. */
    public Body withLabel(String newLabel) {
        return new Body(newLabel, mass, charge, twiceSpin);
    }

    /** The same with another mass. */
    public Body withMass(BodyMass newMass) {
        return new Body(label, newMass, charge, twiceSpin);
    }

    /** The same with another charge. */
    public Body withCharge(ExactNumber newCharge) {
        return new Body(label, mass, newCharge, twiceSpin);
    }

    /** The same with another spin. */
    public Body withTwiceSpin(int newTwiceSpin) {
        return new Body(label, mass, charge, newTwiceSpin);
    }
}
