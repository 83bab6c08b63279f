package org.wellwright.solver.units;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.solver.InvalidModelException;

/**
 * A product of powers of units: "eV nm", "1/angstrom", "cm^-1 angstrom^2", "GeV^2". Factors are separated by a space,
 * "*" or "·"; "/" divides by the next factor only. Immutable.
 *
 * <p>A unit that is itself a power may stand in parentheses: "(cm^-1)^2". "cm^-1" is read as an energy or as an inverse
 * length, whichever fits its place. Electronvolts count as masses where a mass is asked for, and powers of
 * electronvolts alone also as lengths (ħ = c = 1).
 */
public final class UnitExpression {
    private static final Map<String, Unit> UNITS = units();
    private static final Pattern FACTOR = Pattern.compile("\\s*([*·/]?)\\s*(?:\\(([^()]+)\\)|([^\\s*·/^⁻⁰¹²³⁴-⁹()]+))"
            + "\\s*(?:\\^\\s*([+-]?\\d{1,2})|([⁻⁰¹²³⁴-⁹]+))?");
    private static final int MOST_FACTORS = 12;

    /** Factors as typed: unit and exponent. */
    private record Factor(Unit unit, int exponent) {}

    private final String text;
    private final List<Factor> factors;

    private UnitExpression(String text, List<Factor> factors) {
        this.text = text;
        this.factors = factors;
    }

    /**
     * Reads an expression; the empty text is a pure number.
     *
     * @throws InvalidModelException if a symbol is not known (names the nearest) or the text is malformed
     */
    public static UnitExpression parse(String text) {
        String trimmed = text.strip();
        Unit whole = UNITS.get(trimmed);
        if (whole != null) {
            return new UnitExpression(trimmed, List.of(new Factor(whole, 1)));
        }
        List<Factor> factors = new ArrayList<>();
        Matcher matcher = FACTOR.matcher(trimmed);
        int position = 0;
        while (position < trimmed.length()) {
            matcher.region(position, trimmed.length());
            if (!matcher.lookingAt() || factors.size() == MOST_FACTORS) {
                throw malformed(trimmed, position);
            }
            boolean divides = "/".equals(matcher.group(1));
            if (factors.isEmpty() && position == 0 && !matcher.group(1).isEmpty()) {
                throw malformed(trimmed, 0);
            }
            String symbol = matcher.group(2) != null ? matcher.group(2).strip() : matcher.group(3);
            int end = matcher.end();
            // Units whose own symbol holds a solidus: MeV/c^2, kJ/mol.
            for (String compound : List.of("/c^2", "/c2", "/c²", "/mol")) {
                if (matcher.group(4) == null
                        && matcher.group(5) == null
                        && trimmed.startsWith(compound, end)
                        && UNITS.containsKey(symbol + compound.replace("²", "^2"))) {
                    symbol += compound.replace("²", "^2");
                    end += compound.length();
                    break;
                }
            }
            int exponent = exponent(matcher);
            if (!"1".equals(symbol)) {
                Unit unit = UNITS.get(symbol);
                if (unit == null) {
                    throw new InvalidModelException(
                            "the unit '%s' is not known".formatted(Names.shortened(symbol)),
                            "",
                            Names.remedy(symbol, UNITS.keySet()));
                }
                factors.add(new Factor(unit, divides ? -exponent : exponent));
            }
            position = end;
        }
        return new UnitExpression(trimmed, List.copyOf(factors));
    }

    /** The text as typed, without blanks around it. */
    public String text() {
        return text;
    }

    /** Whether it is a pure number. */
    public boolean pure() {
        return factors.isEmpty();
    }

    /** Whether it is one frequency unit. */
    public boolean frequency() {
        return factors.size() == 1
                && factors.get(0).exponent() == 1
                && factors.get(0).unit() instanceof EnergyUnit unit
                && unit.frequency();
    }

    /**
     * Its dimension, with "cm^-1" read as an energy unless another factor is one: "cm^-1/angstrom^2", but "eV cm^-1".
     */
    public Dimension dimension() {
        return dimension(merged(factors, factors.stream().noneMatch(factor -> factor.unit() instanceof EnergyUnit)));
    }

    /**
     * What a number in this unit is multiplied by to get it in a unit system; one rounding.
     *
     * @param expected the dimension that its place asks for
     * @throws InvalidModelException if the dimensions do not agree; says which unit the place takes
     */
    public double factorTo(UnitSystem system, Dimension expected) {
        for (List<Factor> reading : readings()) {
            BigDecimal size = sizeAs(reading, expected, system.natural());
            if (size != null) {
                return size.divide(system.size(expected), Constants.PRECISION).doubleValue();
            }
        }
        String wanted = system.unitText(expected);
        throw new InvalidModelException(
                "the unit '%s' does not fit here".formatted(Names.shortened(text)),
                "",
                wanted.isEmpty() ? "leave it empty: the number is pure" : "use a unit like '%s'".formatted(wanted));
    }

    /** Whether a number in this unit can stand where this dimension is asked for. */
    public boolean fits(UnitSystem system, Dimension expected) {
        for (List<Factor> reading : readings()) {
            if (sizeAs(reading, expected, system.natural()) != null) {
                return true;
            }
        }
        return false;
    }

    /** All symbols that are understood. */
    public static List<String> symbols() {
        return List.copyOf(UNITS.keySet());
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof UnitExpression expression && text.equals(expression.text);
    }

    @Override
    public int hashCode() {
        return text.hashCode();
    }

    @Override
    public String toString() {
        return text;
    }

    /** Size in eV, m, eV of a reading, if it has the dimension or may stand for it; otherwise null. */
    private static BigDecimal sizeAs(List<Factor> reading, Dimension expected, boolean natural) {
        Dimension own = dimension(reading);
        boolean electronvolts = !reading.isEmpty();
        BigDecimal size = BigDecimal.ONE;
        for (Factor factor : reading) {
            size = size.multiply(UnitSystem.power(factor.unit().size(), factor.exponent()), Constants.PRECISION);
            electronvolts &= factor.unit() instanceof EnergyUnit unit && unit.electronvolt()
                    || factor.unit() == LengthUnit.PER_GEV;
        }
        if (own.equals(expected)) {
            return size;
        }
        // m c² = E: both are kept in eV.
        if (own.length() == expected.length() && own.energy() + own.mass() == expected.energy() + expected.mass()) {
            return size;
        }
        int power = own.energy() + own.mass() - own.length();
        if ((natural || electronvolts) && power == expected.energy() + expected.mass() - expected.length()) {
            return size.multiply(
                    UnitSystem.power(Constants.REDUCED_PLANCK_LIGHT, expected.length() - own.length()),
                    Constants.PRECISION);
        }
        return null;
    }

    /** The expression with every cm⁻¹ as an energy, then with one after the other as an inverse length. */
    private List<List<Factor>> readings() {
        List<List<Factor>> readings = new ArrayList<>();
        readings.add(merged(factors, true));
        readings.add(factors);
        List<Factor> changed = new ArrayList<>(factors);
        for (int i = 0; i < factors.size(); i++) {
            Factor factor = factors.get(i);
            if (factor.unit() == EnergyUnit.PER_CM) {
                changed.set(i, new Factor(LengthUnit.CENTIMETRE, -factor.exponent()));
                readings.add(List.copyOf(changed));
            }
        }
        return readings;
    }

    /** cm to the power −1 becomes the wavenumber unit. */
    private static List<Factor> merged(List<Factor> factors, boolean wavenumbers) {
        List<Factor> merged = new ArrayList<>();
        for (Factor factor : factors) {
            boolean wavenumber = wavenumbers && factor.unit() == LengthUnit.CENTIMETRE && factor.exponent() == -1;
            merged.add(wavenumber ? new Factor(EnergyUnit.PER_CM, 1) : factor);
        }
        return merged;
    }

    private static Dimension dimension(List<Factor> factors) {
        Dimension product = Dimension.NONE;
        for (Factor factor : factors) {
            product = product.times(factor.unit().dimension().power(factor.exponent()));
        }
        return product;
    }

    private static int exponent(Matcher matcher) {
        if (matcher.group(4) != null) {
            return Integer.parseInt(matcher.group(4));
        }
        if (matcher.group(5) == null) {
            return 1;
        }
        StringBuilder digits = new StringBuilder();
        for (char c : matcher.group(5).toCharArray()) {
            int digit = "⁰¹²³⁴⁵⁶⁷⁸⁹".indexOf(c);
            digits.append(c == '⁻' ? "-" : String.valueOf(digit));
        }
        return digits.toString().matches("-?\\d{1,2}") ? Integer.parseInt(digits.toString()) : 1;
    }

    private static InvalidModelException malformed(String text, int position) {
        return new InvalidModelException(
                "the unit '%s' cannot be read at column %d".formatted(Names.shortened(text), position + 1),
                "",
                "write it like 'eV nm' or '1/angstrom^2'");
    }

    private static Map<String, Unit> units() {
        Map<String, Unit> units = new LinkedHashMap<>();
        List<Unit> all = new ArrayList<>(List.of(EnergyUnit.values()));
        all.addAll(List.of(LengthUnit.values()));
        all.addAll(List.of(MassUnit.values()));
        for (Unit unit : all) {
            units.put(unit.symbol(), unit);
            units.put(unit.printed(), unit);
            for (String alias : unit.aliases()) {
                units.put(alias, unit);
            }
        }
        return units;
    }
}
