package org.wellwright.solver.pair;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Objects;
import org.wellwright.solver.units.Constants;
import org.wellwright.solver.units.ExactNumber;

/**
 * One entry of the mass table.
 *
 * @param id identifier ("e-", "p", "Na-23")
 * @param aliases other identifiers that are understood
 * @param title name on screen
 * @param kind what it is
 * @param mass its mass as published
 * @param sigma standard uncertainty of the mass, ≥ 0
 * @param unit unit of both
 * @param charge charge in elementary charges
 * @param twiceSpin twice its spin; −1 for an atom, whose spin is not tabulated
 * @param protons number Z of protons of an atom or nucleus; 0 otherwise
 * @param source where the mass was published
 */
public record Particle(
        String id,
        List<String> aliases,
        String title,
        Kind kind,
        ExactNumber mass,
        ExactNumber sigma,
        String unit,
        int charge,
        int twiceSpin,
        int protons,
        String source) {

    /** What a particle is. */
    public enum Kind {
        /** A lepton, meson or nucleon. */
        PARTICLE,
        /** A bare nucleus. */
        NUCLEUS,
        /** A neutral atom in its ground state. */
        ATOM
    }

    /** Checks the mass. */
    public Particle {
        aliases = List.copyOf(aliases);
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(unit, "unit");
        Objects.requireNonNull(source, "source");
        if (mass.sign() <= 0 || sigma.sign() < 0) {
            throw new IllegalArgumentException("the particle '%s' needs a mass > 0 and sigma >= 0".formatted(id));
        }
    }

    /**
     * The mass that a convention asks for, in this entry's unit.
     *
     * @param bodyCharge charge of the body that it stands for; counts for {@link MassConvention#ION} alone
     */
    public ExactNumber mass(MassConvention convention, double bodyCharge) {
        if (kind != Kind.ATOM) {
            return mass;
        }
        double electrons = switch (convention) {
            case NUCLEAR -> protons;
            case ION -> bodyCharge;
            case ATOMIC, EFFECTIVE, MODEL_PARAMETER -> 0;
        };
        if (electrons == 0) {
            return mass;
        }
        // Atoms are tabulated in u, where the electron's mass is its relative atomic mass.
        BigDecimal removed = BigDecimal.valueOf(electrons)
                .multiply(Constants.ELECTRON_RELATIVE_MASS.value().decimal());
        return new ExactNumber(
                mass.decimal().subtract(removed, MathContext.DECIMAL64).toString());
    }
}
