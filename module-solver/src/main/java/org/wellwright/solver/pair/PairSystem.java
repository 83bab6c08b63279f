package org.wellwright.solver.pair;

import java.util.Objects;
import java.util.function.ToDoubleFunction;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/**
 * A pair of bodies bound by a central force. Isotopologues are systems of one project.
 *
 * @param id identifier, unique in the project
 * @param title name on screen; may be empty
 * @param first one body
 * @param second the other body
 * @param massConvention which masses enter the kinetic energy
 * @param exchange what exchanging the bodies does
 * @param permittivity relative permittivity of the medium, > 0 (1 in vacuum); divides charge–charge terms that ask for
 *     it
 * @param abundance natural fraction of this isotopologue in [0, 1], or null if it plays no role
 */
public record PairSystem(
        String id,
        String title,
        Body first,
        Body second,
        MassConvention massConvention,
        ExchangeSymmetry exchange,
        ExactNumber permittivity,
        ExactNumber abundance) {

    /** Checks identifiers and ranges. */
    public PairSystem {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(first, "first");
        Objects.requireNonNull(second, "second");
        Objects.requireNonNull(massConvention, "massConvention");
        Objects.requireNonNull(exchange, "exchange");
        if (id.isBlank()) {
            throw new IllegalArgumentException("a pair system needs an id");
        }
        if (permittivity.sign() <= 0) {
            throw new IllegalArgumentException("the relative permittivity must be positive, got " + permittivity);
        }
        if (abundance != null && !(abundance.value() >= 0 && abundance.value() <= 1)) {
            throw new IllegalArgumentException("an abundance lies between 0 and 1, got " + abundance);
        }
    }

    /** A system in vacuum of two distinguishable bodies of the catalogue, with the masses as tabulated. */
    public static PairSystem of(String id, Body first, Body second) {
        return new PairSystem(
                id, "", first, second, MassConvention.ATOMIC, ExchangeSymmetry.DISTINGUISHABLE, ExactNumber.ONE, null);
    }

    /**
     * The mass of one body in the mass unit of a unit system, by this system's convention.
     *
     * @param body one of the two bodies
     * @param parameters value of a parameter of the pool in the mass unit of {@code units}
     * @throws org.wellwright.solver.InvalidModelException if the particle or the unit is not known
     */
    public double mass(Body body, ParticleCatalogue catalogue, UnitSystem units, ToDoubleFunction<String> parameters) {
        if (body.mass() instanceof BodyMass.Catalogued catalogued) {
            Particle particle = catalogue.find(catalogued.particle());
            double factor = UnitExpression.parse(particle.unit()).factorTo(units, Dimension.MASS);
            return particle.mass(massConvention, body.charge().value()).value() * factor;
        }
        if (body.mass() instanceof BodyMass.Typed typed) {
            return typed.value().value() * UnitExpression.parse(typed.unit()).factorTo(units, Dimension.MASS);
        }
        return parameters.applyAsDouble(((BodyMass.FromParameter) body.mass()).parameter());
    }

    /**
     * The reduced mass m₁m₂/(m₁ + m₂) in the mass unit of a unit system.
     *
     * @param parameters value of a parameter of the pool in the mass unit of {@code units}
     * @throws org.wellwright.solver.InvalidModelException if a particle or unit is not known
     */
    public double reducedMass(ParticleCatalogue catalogue, UnitSystem units, ToDoubleFunction<String> parameters) {
        double one = mass(first, catalogue, units, parameters);
        double other = mass(second, catalogue, units, parameters);
        return one * (other / (one + other));
    }

    /** The reduced mass of a system whose masses are not parameters, with the standard mass table. */
    public double reducedMass(UnitSystem units) {
        return reducedMass(ParticleCatalogue.STANDARD, units, name -> {
            throw new IllegalArgumentException("the mass '%s' is a parameter of the pool".formatted(name));
        });
    }

    /** The same with another id. */
    public PairSystem withId(String newId) {
        return new PairSystem(newId, title, first, second, massConvention, exchange, permittivity, abundance);
    }

    /** The same with another title. */
    public PairSystem withTitle(String newTitle) {
        return new PairSystem(id, newTitle, first, second, massConvention, exchange, permittivity, abundance);
    }

    /** The same with another first body. */
    public PairSystem withFirst(Body newFirst) {
        return new PairSystem(id, title, newFirst, second, massConvention, exchange, permittivity, abundance);
    }

    /** The same with another second body. */
    public PairSystem withSecond(Body newSecond) {
        return new PairSystem(id, title, first, newSecond, massConvention, exchange, permittivity, abundance);
    }

    /** The same with another mass convention. */
    public PairSystem withMassConvention(MassConvention newMassConvention) {
        return new PairSystem(id, title, first, second, newMassConvention, exchange, permittivity, abundance);
    }

    /** The same with another exchange symmetry. */
    public PairSystem withExchange(ExchangeSymmetry newExchange) {
        return new PairSystem(id, title, first, second, massConvention, newExchange, permittivity, abundance);
    }

    /** The same with another permittivity. */
    public PairSystem withPermittivity(ExactNumber newPermittivity) {
        return new PairSystem(id, title, first, second, massConvention, exchange, newPermittivity, abundance);
    }

    /** The same with another abundance, null for none. */
    public PairSystem withAbundance(ExactNumber newAbundance) {
        return new PairSystem(id, title, first, second, massConvention, exchange, permittivity, newAbundance);
    }
}
