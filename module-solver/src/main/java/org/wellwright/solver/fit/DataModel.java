package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ParameterPool;
import org.wellwright.solver.model.PoolValue;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.observable.RadialMoment;
import org.wellwright.solver.observable.StandardAir;
import org.wellwright.solver.radial.EnergyGradient;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.LengthUnit;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** Computes what a model says of a datum: Σ c_k E_k under the datum's transform, in the datum's unit. Thread-safe. */
final class DataModel {
    private final ParameterPool pool;
    private final UnitSystem units;
    private final double planckLight;
    private final double nanometre;
    private final Map<Conversion, Double> factors = new ConcurrentHashMap<>();

    DataModel(Assembly assembly) {
        this.pool = assembly.pool();
        this.units = pool.units();
        this.planckLight = units.planckLight();
        this.nanometre = UnitExpression.parse(LengthUnit.NANOMETRE.symbol()).factorTo(units, Dimension.LENGTH);
    }

    /** How many of the datum's unit one unit of the system is; NaN for a rate. */
    double fromSystem(Datum datum) {
        Dimension dimension = switch (datum.transform()) {
            case ABSOLUTE_MASS -> Dimension.MASS;
            case VACUUM_WAVELENGTH, AIR_WAVELENGTH, RADIUS -> Dimension.LENGTH;
            case RATIO -> Dimension.NONE;
            case RATE -> null;
            default -> Dimension.ENERGY;
        };
        if (dimension == null) {
            return Double.NaN;
        }
        return factors.computeIfAbsent(
                new Conversion(datum.unit(), dimension),
                key -> 1 / UnitExpression.parse(key.unit()).factorTo(units, key.dimension()));
    }

    private record Conversion(String unit, Dimension dimension) {}

    /** The uncertainty of the datum, in its unit, that one unit of energy would give; NaN if it has none. */
    double energyWeight(Datum datum) {
        double measured = datum.value().value();
        return switch (datum.transform()) {
            case NONE, FREQUENCY, PHOTON_EMISSION, PHOTON_ABSORPTION -> fromSystem(datum);
            case ABSOLUTE_MASS -> fromSystem(datum) / units.restEnergy();
            case VACUUM_WAVELENGTH, AIR_WAVELENGTH -> measured * measured / planckLight / fromSystem(datum);
            case RATIO, RADIUS, WIDTH, RATE -> Double.NaN;
        };
    }

    /** The model's value of a datum. */
    Quantity quantity(Datum datum, LevelTable table, double[] values) {
        Quantity energy = sum(datum.levels(), table, values.length);
        if (!energy.found()) {
            return energy;
        }
        double unit = fromSystem(datum);
        return switch (datum.transform()) {
            case NONE, FREQUENCY -> energy.mapped(energy.value() * unit, unit);
            case VACUUM_WAVELENGTH, AIR_WAVELENGTH -> wavelength(datum, energy, unit);
            case PHOTON_EMISSION, PHOTON_ABSORPTION -> photon(datum, energy, table, values, unit);
            case ABSOLUTE_MASS -> absoluteMass(datum, energy, values, unit / units.restEnergy());
            case RATIO -> ratio(datum, energy, table, values.length);
            case RADIUS -> radius(datum, table, values.length, unit);
            case WIDTH, RATE ->
                Quantity.missing(new Problem(
                        "the datum '%s' is a %s, which cannot be compared yet"
                                .formatted(datum.id(), datum.transform().name().toLowerCase(Locale.ROOT)),
                        "",
                        "do not use it"));
        };
    }

    private static Quantity sum(List<Datum.Contribution> contributions, LevelTable table, int numbers) {
        double[] gradient = new double[numbers];
        double value = 0;
        for (Datum.Contribution contribution : contributions) {
            LevelTable.Entry entry = table.entry(contribution.level());
            if (!entry.found()) {
                return Quantity.missing(entry.problem());
            }
            double coefficient = contribution.coefficient().value();
            value += coefficient * entry.energy();
            entry.gradient().addTo(gradient, coefficient);
        }
        return Quantity.of(value, gradient);
    }

    private Quantity wavelength(Datum datum, Quantity energy, double unit) {
        if (!(energy.value() > 0)) {
            return notPositive(datum, energy.value());
        }
        double vacuum = planckLight / energy.value();
        double slope = -vacuum / energy.value();
        if (datum.transform() == Transform.VACUUM_WAVELENGTH) {
            return energy.mapped(vacuum * unit, slope * unit);
        }
        double nanometres = vacuum / nanometre;
        if (!StandardAir.covers(nanometres)) {
            return Quantity.missing(new Problem(
                    "the wavelength of the datum '%s' is %.1f nm in vacuum, outside %.0f to %.0f nm where standard air is used"
                            .formatted(datum.id(), nanometres, StandardAir.SHORTEST, StandardAir.LONGEST),
                    "",
                    "give its vacuum wavelength"));
        }
        double index = StandardAir.index(nanometres);
        // d(λ/n)/dλ = (1 − λ n′/n)/n
        double airSlope = (1 - nanometres * StandardAir.indexSlope(nanometres) / index) / index;
        return energy.mapped(vacuum / index * unit, slope * airSlope * unit);
    }

    /**
     * Recoil of the free pair: emission E(1 − E/2Mc²) with M of the upper, absorption E(1 + E/2Mc²) with M of the lower
     * level.
     */
    private Quantity photon(Datum datum, Quantity energy, LevelTable table, double[] values, double unit) {
        if (!(energy.value() > 0)) {
            return notPositive(datum, energy.value());
        }
        boolean emission = datum.transform() == Transform.PHOTON_EMISSION;
        Datum.Contribution start = datum.levels().get(0);
        if ((start.coefficient().sign() > 0) != emission) {
            start = datum.levels().get(1);
        }
        LevelTable.Entry level = table.entry(start.level());
        PoolValue rest = pool.restEnergy(start.level().system(), values);
        double total = rest.value() + level.energy();
        double[] totalGradient = new double[values.length];
        rest.addTo(totalGradient, 1);
        level.gradient().addTo(totalGradient, 1);
        double sign = emission ? -1 : 1;
        double e = energy.value();
        double value = e * (1 + sign * e / (2 * total));
        double byEnergy = 1 + sign * e / total;
        double byTotal = -sign * e * e / (2 * total * total);
        return energy.combined(value * unit, byEnergy * unit, Quantity.of(total, totalGradient), byTotal * unit);
    }

    private Quantity absoluteMass(Datum datum, Quantity energy, double[] values, double unit) {
        double[] gradient = new double[values.length];
        double value = 0;
        for (Datum.Contribution contribution : datum.levels()) {
            PoolValue rest = pool.restEnergy(contribution.level().system(), values);
            double coefficient = contribution.coefficient().value();
            value += coefficient * rest.value();
            rest.addTo(gradient, coefficient);
        }
        Quantity rest = Quantity.of(value, gradient);
        return energy.combined((value + energy.value()) * unit, unit, rest, unit);
    }

    private static Quantity ratio(Datum datum, Quantity energy, LevelTable table, int numbers) {
        Quantity below = sum(datum.denominator(), table, numbers);
        if (!below.found()) {
            return below;
        }
        if (below.value() == 0) {
            return Quantity.missing(new Problem(
                    "the denominator of the datum '%s' is 0".formatted(datum.id()), "", "change its levels"));
        }
        double ratio = energy.value() / below.value();
        return energy.combined(ratio, 1 / below.value(), below, -ratio / below.value());
    }

    /** ⟨r^k⟩^(1/k) with its derivative (1/k) ⟨r^k⟩^(1/k − 1) d⟨r^k⟩. */
    private static Quantity radius(Datum datum, LevelTable table, int numbers, double unit) {
        LevelTable.Entry level = table.entry(datum.levels().get(0).level());
        int power = datum.detail().radiusPower();
        if (level.state().problem().channels().size() > 1) {
            return Quantity.missing(new Problem(
                    "the radius '%s' belongs to coupled channels, which cannot be compared yet".formatted(datum.id()),
                    "",
                    "do not use it"));
        }
        double moment = RadialMoment.value(level.state(), power);
        double radius = Math.pow(moment, 1.0 / power);
        double[] gradient = new double[numbers];
        EnergyGradient slopes = RadialMoment.gradient(level.state(), power);
        level.assembled().addProblemGradient(slopes, radius / (power * moment) * unit, gradient);
        return Quantity.of(radius * unit, gradient);
    }

    private static Quantity notPositive(Datum datum, double energy) {
        return Quantity.missing(new Problem(
                "the energy of the line '%s' is %s in the model, not positive".formatted(datum.id(), energy),
                "",
                "swap its levels or change the start values"));
    }

    /** The data of a list that are used. */
    static List<Datum> used(List<Datum> data) {
        List<Datum> used = new ArrayList<>();
        for (Datum datum : data) {
            if (datum.used()) {
                used.add(datum);
            }
        }
        return used;
    }
}
