package org.wellwright.solver.potential;

/**
 * The operator on angles and spins that multiplies a term's V(r). {@code model.Assembly} computes its matrix elements
 * between channels.
 */
public enum AngularFactor {
    /** 1: the same in every channel, couples none. */
    UNITY,
    /** L·S, with S the total spin, or the spin of the first body in a model of one spin. */
    SPIN_ORBIT,
    /** S₁·S₂. */
    SPIN_SPIN,
    /** S₁₂ = 3 (σ₁·r̂)(σ₂·r̂) − σ₁·σ₂ for two spins ½; couples l and l ± 2. */
    TENSOR
}
