package org.wellwright.project.command;

import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.units.UnitSystem;

/**
 * The kinetic constant of {@code bound} and the units it is in.
 *
 * @param constant ħ²/2μ, energy·length²
 * @param energyUnit symbol; "1" where no unit system was named
 * @param lengthUnit symbol; "1" where no unit system was named
 */
record Kinetic(double constant, String energyUnit, String lengthUnit) {
    static Kinetic of(Input input) {
        int given = (input.has("kinetic") ? 1 : 0) + (input.has("reduced-mass") ? 1 : 0) + (input.has("pair") ? 1 : 0);
        if (given != 1) {
            throw new UsageException(
                    given == 0 ? "the masses are not given" : "the masses are given in more than one way",
                    "give one of --kinetic, --reduced-mass, --pair");
        }
        String name = input.value("units");
        UnitSystem units = name == null ? null : UnitSystem.named(name);
        if (input.has("kinetic")) {
            double constant = positive(input, "kinetic");
            return units == null
                    ? new Kinetic(constant, "1", "1")
                    : new Kinetic(
                            constant, units.energy().symbol(), units.length().symbol());
        }
        if (units == null) {
            throw new UsageException(
                    "a mass needs units",
                    "add --units, one of "
                            + String.join(
                                    ", ",
                                    UnitSystem.ALL.stream().map(UnitSystem::id).toList()));
        }
        double mass = input.has("pair")
                ? ParticleCatalogue.STANDARD.pair(input.value("pair")).reducedMass(units)
                : positive(input, "reduced-mass");
        return new Kinetic(
                units.kineticFactor() / mass,
                units.energy().symbol(),
                units.length().symbol());
    }

    private static double positive(Input input, String option) {
        double value = input.number(option, Double.NaN);
        if (!(value > 0)) {
            throw new UsageException(
                    "--" + option + " is " + input.value(option) + ", not positive", "write a positive number");
        }
        return value;
    }
}
