package org.wellwright.solver.model;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.Formula;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.Names;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/**
 * The parameters of a document as functions of their adjustable numbers, with exact derivatives. Immutable.
 *
 * <p>Besides the pool's own names, five are known in every place: {@code coulomb}, the strength −Z₁Z₂e²/4πε₀ε of the
 * force between the two bodies (positive if they attract), {@code reduced_mass}, {@code charge1}, {@code charge2} and
 * {@code permittivity}. A parameter of the same name hides them.
 */
public final class ParameterPool {
    /** Names that every place knows. */
    public static final List<String> SYSTEM_NAMES =
            List.of("coulomb", "reduced_mass", "charge1", "charge2", "permittivity");

    private final UnitSystem units;
    private final List<Parameter> parameters;
    private final Map<String, Integer> indexByName = new HashMap<>();
    private final Map<String, PairSystem> systems = new LinkedHashMap<>();
    private final List<PoolNumber> numbers = new ArrayList<>();
    private final int[] firstNumber;
    private final Map<Integer, Formula> formulas = new HashMap<>();
    private final List<UnitExpression> parameterUnits = new ArrayList<>();

    private ParameterPool(ModelDocument document) {
        this.units = UnitSystem.named(document.units());
        this.parameters = document.parameters();
        this.firstNumber = new int[parameters.size() + 1];
        for (PairSystem system : document.systems()) {
            systems.put(system.id(), system);
        }
        for (int i = 0; i < parameters.size(); i++) {
            Parameter parameter = parameters.get(i);
            indexByName.put(parameter.name(), i);
            firstNumber[i] = numbers.size();
            parameterUnits.add(UnitExpression.parse(parameter.unit()));
            enumerate(i, parameter);
            if (parameter.shape() instanceof ParameterShape.Tied tied) {
                formulas.put(i, FormulaText.parse(tied.formula()));
            }
        }
        firstNumber[parameters.size()] = numbers.size();
    }

    /**
     * The pool of a document.
     *
     * @throws InvalidModelException if a unit or a tie cannot be read
     */
    public static ParameterPool of(ModelDocument document) {
        return new ParameterPool(document);
    }

    /** The unit system that values are converted to. */
    public UnitSystem units() {
        return units;
    }

    /** All adjustable numbers in the order of the pool. */
    public List<PoolNumber> numbers() {
        return List.copyOf(numbers);
    }

    /** The values as typed, one per number, in the parameters' units. */
    public double[] typedValues() {
        double[] values = new double[numbers.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = numbers.get(i).setting().value().value();
        }
        return values;
    }

    /**
     * The pool's parameters with other values.
     *
     * @param values one per number; NaN leaves a number as typed, digit for digit
     */
    public List<Parameter> withValues(double[] values) {
        List<Parameter> moved = new ArrayList<>();
        for (int i = 0; i < parameters.size(); i++) {
            double[] own = Arrays.copyOfRange(values, firstNumber[i], firstNumber[i + 1]);
            Parameter parameter = parameters.get(i);
            moved.add(
                    own.length == 0
                            ? parameter
                            : parameter.withShape(parameter.shape().withValues(own)));
        }
        return List.copyOf(moved);
    }

    /** Whether a name is a parameter or one of {@link #SYSTEM_NAMES}. */
    public boolean knows(String name) {
        return indexByName.containsKey(name) || SYSTEM_NAMES.contains(name);
    }

    /** Whether the value of a name differs from channel to channel. */
    public boolean dependsOnChannel(String name) {
        return dependsOnChannel(name, 0);
    }

    private boolean dependsOnChannel(String name, int depth) {
        Integer index = indexByName.get(name);
        if (index == null || depth > parameters.size()) {
            return false;
        }
        ParameterShape shape = parameters.get(index).shape();
        if (shape instanceof ParameterShape.Tied) {
            Formula formula = formulas.get(index);
            return formula.dependsOnChannel()
                    || formula.names().stream().anyMatch(used -> dependsOnChannel(used, depth + 1));
        }
        return shape instanceof ParameterShape.ByOrbital || shape instanceof ParameterShape.ByTotal;
    }

    /** The unit of a parameter; null for a name that is not in the pool. */
    public UnitExpression unit(String name) {
        Integer index = indexByName.get(name);
        return index == null ? null : parameterUnits.get(index);
    }

    /**
     * The value of a name in a unit system's unit of a dimension.
     *
     * @param values one per number of the pool
     * @throws InvalidModelException if the name is not known, has no number for this place, or its unit does not fit
     */
    public PoolValue value(String name, Place place, double[] values, Dimension expected) {
        UnitExpression unit = unit(name);
        if (unit == null) {
            return systemValue(name, place, values);
        }
        double factor;
        try {
            factor = unit.factorTo(units, expected);
        } catch (InvalidModelException fault) {
            throw new InvalidModelException(
                    "the unit '%s' of '%s' does not fit where it is used".formatted(unit.text(), name),
                    "",
                    fault.problem().remedy());
        }
        PoolValue own = ownValue(name, place, values, 0);
        return factor == 1 ? own : own.times(factor);
    }

    /** The value of a name in the unit system's unit of the name's own dimension, as formulas use it. */
    public PoolValue formulaValue(String name, Place place, double[] values) {
        UnitExpression unit = unit(name);
        return unit == null ? systemValue(name, place, values) : value(name, place, values, unit.dimension());
    }

    /** The mass of a body of a system in the unit system's unit of mass. */
    public PoolValue mass(PairSystem system, Body body, double[] values) {
        if (body.mass() instanceof BodyMass.FromParameter named) {
            PoolValue mass = value(named.parameter(), new Place(system.id(), null), values, Dimension.MASS);
            if (!(mass.value() > 0)) {
                throw new InvalidModelException(
                        "the mass '%s' must be positive, got %s".formatted(named.parameter(), mass.value()),
                        "",
                        "change its value");
            }
            return mass;
        }
        return PoolValue.constant(system.mass(body, ParticleCatalogue.STANDARD, units, name -> Double.NaN));
    }

    /** κ = ħ²/2 · (1/m₁ + 1/m₂) of a system, energy·length². */
    public PoolValue kinetic(String systemId, double[] values) {
        PairSystem system = system(systemId);
        PoolValue one = mass(system, system.first(), values);
        PoolValue other = mass(system, system.second(), values);
        if (one.constant() && other.constant()) {
            double reduced = one.value() * (other.value() / (one.value() + other.value()));
            return PoolValue.constant(units.kineticFactor() / reduced);
        }
        return one.power(-1).plus(other.power(-1)).times(units.kineticFactor());
    }

    /** μ of a system in the unit system's unit of mass. */
    public PoolValue reducedMass(String systemId, double[] values) {
        PairSystem system = system(systemId);
        PoolValue one = mass(system, system.first(), values);
        PoolValue other = mass(system, system.second(), values);
        return one.times(other).times(one.plus(other).power(-1));
    }

    /** (m₁ + m₂)c² of a system in the unit system's unit of energy. */
    public PoolValue restEnergy(String systemId, double[] values) {
        PairSystem system = system(systemId);
        return mass(system, system.first(), values)
                .plus(mass(system, system.second(), values))
                .times(units.restEnergy());
    }

    /** The system of an id. */
    PairSystem system(String id) {
        PairSystem system = systems.get(id);
        if (system == null) {
            throw new InvalidModelException(
                    "the pair system '%s' is not known".formatted(Names.shortened(id)),
                    "",
                    Names.remedy(id, systems.keySet()));
        }
        return system;
    }

    private PoolValue ownValue(String name, Place place, double[] values, int depth) {
        Integer index = indexByName.get(name);
        if (index == null) {
            return systemValue(name, place, values);
        }
        if (depth > parameters.size()) {
            throw new InvalidModelException(
                    "the parameter '%s' is tied to itself".formatted(name), "", "break the circle of ties");
        }
        Parameter parameter = parameters.get(index);
        int first = firstNumber[index];
        ParameterShape shape = parameter.shape();
        if (shape instanceof ParameterShape.Scalar) {
            return PoolValue.of(values[first], first);
        }
        if (shape instanceof ParameterShape.MassScaled scaled) {
            PoolValue ratio = reducedMass(place.system(), values)
                    .times(reducedMass(scaled.reference(), values).power(-1));
            return PoolValue.of(values[first], first).times(ratio.power(scaled.exponent()));
        }
        if (shape instanceof ParameterShape.Tied) {
            return tied(formulas.get(index), place, values, depth);
        }
        int entry = entry(shape, place);
        if (entry < 0) {
            throw new InvalidModelException(
                    "the parameter '%s' has no number for %s".formatted(name, describe(place)),
                    "",
                    "add one, or a number for all others");
        }
        return PoolValue.of(values[first + entry], first + entry);
    }

    private PoolValue tied(Formula formula, Place place, double[] values, int depth) {
        List<String> names = formula.names();
        PoolValue[] arguments = new PoolValue[names.size()];
        double[] numbersOfFormula = new double[arguments.length];
        for (int j = 0; j < arguments.length; j++) {
            if (!knows(names.get(j))) {
                throw unknown(names.get(j));
            }
            arguments[j] = ownValue(names.get(j), place, values, depth + 1);
            numbersOfFormula[j] = arguments[j].value();
        }
        ChannelFacts facts = place.channel() == null || place.channel().coupled()
                ? ChannelFacts.ofOrbital(0)
                : place.channel().facts();
        // A tie does not use r, so any radius gives its value.
        TermEvaluator evaluator = formula.bind(numbersOfFormula, facts);
        double[] partials = new double[arguments.length];
        for (int j = 0; j < partials.length; j++) {
            partials[j] = evaluator.parameterDerivative(j, 1);
        }
        double value = evaluator.value(1);
        if (!Double.isFinite(value)) {
            throw new InvalidModelException(
                    "the tie '%s' gives %s".formatted(Names.shortened(formula.text()), value),
                    "",
                    "change its numbers");
        }
        return PoolValue.chained(value, arguments, partials);
    }

    private PoolValue systemValue(String name, Place place, double[] values) {
        PairSystem system = system(place.system());
        return switch (name) {
            case "coulomb" ->
                PoolValue.constant(-system.first().charge().value()
                        * system.second().charge().value()
                        / system.permittivity().value()
                        * units.coulombStrength());
            case "reduced_mass" -> reducedMass(place.system(), values);
            case "charge1" -> PoolValue.constant(system.first().charge().value());
            case "charge2" -> PoolValue.constant(system.second().charge().value());
            case "permittivity" -> PoolValue.constant(system.permittivity().value());
            default -> throw unknown(name);
        };
    }

    InvalidModelException unknown(String name) {
        List<String> names = new ArrayList<>(indexByName.keySet());
        names.sort(null);
        names.addAll(SYSTEM_NAMES);
        return new InvalidModelException(
                "the parameter '%s' is not in the pool".formatted(Names.shortened(name)),
                "",
                Names.remedy(name, names));
    }

    private static int entry(ParameterShape shape, Place place) {
        ChannelKey channel = place.channel();
        if (shape instanceof ParameterShape.ByOrbital byOrbital) {
            for (int i = 0; channel != null && i < byOrbital.entries().size(); i++) {
                if (byOrbital.entries().get(i).orbital() == channel.orbital()) {
                    return i;
                }
            }
            return byOrbital.others() == null ? -1 : byOrbital.entries().size();
        }
        if (shape instanceof ParameterShape.ByTotal byTotal) {
            for (int i = 0; channel != null && i < byTotal.entries().size(); i++) {
                ParameterShape.ByTotal.Entry entry = byTotal.entries().get(i);
                if (entry.orbital() == channel.orbital() && entry.twiceTotal() == channel.twiceTotal()) {
                    return i;
                }
            }
            return byTotal.others() == null ? -1 : byTotal.entries().size();
        }
        ParameterShape.BySystem bySystem = (ParameterShape.BySystem) shape;
        for (int i = 0; i < bySystem.entries().size(); i++) {
            if (bySystem.entries().get(i).system().equals(place.system())) {
                return i;
            }
        }
        return bySystem.others() == null ? -1 : bySystem.entries().size();
    }

    private static String describe(Place place) {
        ChannelKey channel = place.channel();
        String where = "the system '%s'".formatted(place.system());
        if (channel == null) {
            return where + " outside any channel";
        }
        return "%s, %s".formatted(where, channel.describe());
    }

    private void enumerate(int index, Parameter parameter) {
        ParameterShape shape = parameter.shape();
        String name = parameter.name();
        if (shape instanceof ParameterShape.Scalar scalar) {
            add(index, name, scalar.setting());
        } else if (shape instanceof ParameterShape.MassScaled scaled) {
            add(index, name, scaled.setting());
        } else if (shape instanceof ParameterShape.ByOrbital byOrbital) {
            byOrbital.entries().forEach(e -> add(index, "%s[l=%d]".formatted(name, e.orbital()), e.setting()));
            addOthers(index, name, byOrbital.others());
        } else if (shape instanceof ParameterShape.ByTotal byTotal) {
            byTotal.entries()
                    .forEach(e -> add(
                            index,
                            "%s[l=%d,j=%s]".formatted(name, e.orbital(), ChannelKey.half(e.twiceTotal())),
                            e.setting()));
            addOthers(index, name, byTotal.others());
        } else if (shape instanceof ParameterShape.BySystem bySystem) {
            bySystem.entries().forEach(e -> add(index, "%s[%s]".formatted(name, e.system()), e.setting()));
            addOthers(index, name, bySystem.others());
        }
    }

    private void addOthers(int index, String name, Setting others) {
        if (others != null) {
            add(index, name + "[others]", others);
        }
    }

    private void add(int index, String name, Setting setting) {
        numbers.add(new PoolNumber(
                name,
                index,
                numbers.size() - firstNumber[index],
                setting,
                parameters.get(index).unit()));
    }
}
