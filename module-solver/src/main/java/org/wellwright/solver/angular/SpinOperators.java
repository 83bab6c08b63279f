package org.wellwright.solver.angular;

/** Matrix elements of spin operators in the states |(LS)J⟩, in units of ħ². */
public final class SpinOperators {
    private SpinOperators() {}

    /** ⟨L·S⟩ = [J(J+1) − L(L+1) − S(S+1)]/2. */
    public static double spinOrbit(int orbital, int twiceSpin, int twiceTotal) {
        return (casimir(twiceTotal) - casimir(2 * orbital) - casimir(twiceSpin)) / 2;
    }

    /** ⟨s₁·s₂⟩ = [S(S+1) − s₁(s₁+1) − s₂(s₂+1)]/2 of two spins coupled to S. */
    public static double spinSpin(int twiceSpin1, int twiceSpin2, int twiceSpin) {
        return (casimir(twiceSpin) - casimir(twiceSpin1) - casimir(twiceSpin2)) / 2;
    }

    /**
     * ⟨(L'S)J|S₁₂|(LS)J⟩ of the tensor operator S₁₂ = 2[3(S·n)² − S²], which for two spins ½ is 3(σ₁·n)(σ₂·n) − σ₁·σ₂;
     * 0 for S < 1 or where L' − L is odd.
     *
     * <p>S₁₂ = 2√6 [S⊗S]⁽²⁾·C⁽²⁾, evaluated by Edmonds (1957), eqs. 5.4.1, 5.4.5, 7.1.1 and 7.1.6. Not defined by this
     * for states whose S differs.
     */
    public static double tensor(int orbitalPrime, int orbital, int twiceSpin, int twiceTotal) {
        int l1 = 2 * orbitalPrime;
        int l2 = 2 * orbital;
        double spin = casimir(twiceSpin) * (twiceSpin + 1);
        double spinTensor = Coupling.sign(2 * twiceSpin)
                * Math.sqrt(5)
                * Coupling.sixJ(2, 2, 4, twiceSpin, twiceSpin, twiceSpin)
                * spin;
        double harmonic = Coupling.sign(l1) * Math.sqrt((l1 + 1.0) * (l2 + 1.0)) * Coupling.threeJ(l1, 4, l2, 0, 0, 0);
        double recoupling =
                Coupling.sign(l2 + twiceSpin + twiceTotal) * Coupling.sixJ(twiceTotal, twiceSpin, l1, 4, l2, twiceSpin);
        return 2 * Math.sqrt(6) * recoupling * harmonic * spinTensor;
    }

    private static double casimir(int twice) {
        return twice * (twice + 2) / 4.0;
    }
}
