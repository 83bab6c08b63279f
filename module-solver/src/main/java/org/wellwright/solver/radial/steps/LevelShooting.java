package org.wellwright.solver.radial.steps;

/** Counts levels below an energy and steps to the level nearby. One thread uses it at a time. */
interface LevelShooting {
    /** Number of levels below an energy. */
    int count(double energy);

    /** The same, and Newton's step with it. */
    int countAndStep(double energy);

    /** Newton's step in energy found by the last {@link #countAndStep}; NaN if motion is allowed nowhere. */
    double step();

    /** How many counts were made. */
    int counts();

    /** Goes over the state at a level once more for {@link #weightedResidue} and {@link #meanPotential}. */
    void weigh(double energy);

    /** What the steps' polynomials leave out of V, weighted by the probability there; energy. */
    double weightedResidue();

    /** ⟨|V + κλ/r²|⟩ roughly; energy. */
    double meanPotential();
}
