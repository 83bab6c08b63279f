package org.wellwright.solver.model;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.units.Names;

/**
 * The names of levels in one document, by its convention and the label rules of its curves: "3p", "3p3/2", "1^3P_1",
 * "v=0 J=1". Where there are several systems or curves, they stand in front: "HD: v=0 J=1", "HD/upper: v=0 J=1".
 * Immutable.
 *
 * <p>Every name that {@link #name} gives is understood by {@link #parse}, which also takes "l=1 n_r=0 j=3/2" under any
 * convention, and superscripts and subscripts as papers print them.
 */
public final class LevelNames {
    private static final String TOTAL = "(?:_?(?<total>\\d+(?:/2)?))?";
    private static final Pattern LETTERED = Pattern.compile("(?<number>\\d+)\\s*(?<letter>[A-Za-z])" + TOTAL);
    private static final Pattern LETTERED_WITH_SPIN =
            Pattern.compile("(?<number>\\d+)(?:\\s+|\\s*\\^)(?<multiplicity>\\d+)\\s*(?<letter>[A-Za-z])" + TOTAL);
    private static final Pattern VIBRATIONAL =
            Pattern.compile("\\(?\\s*(?:v\\s*=\\s*)?(\\d+)[\\s,]+(?:[JN]\\s*=\\s*)?(\\d+)\\s*\\)?");
    private static final Pattern COUPLED =
            Pattern.compile("\\[\\s*J\\s*=\\s*(\\d+(?:/2)?)\\s*,?\\s*([+-])\\s*\\]\\s*(\\d+)");
    private static final Pattern EXPLICIT =
            Pattern.compile("l\\s*=\\s*(\\d+)[\\s,]+(?:n_?r|index)\\s*=\\s*(\\d+)(?:[\\s,]+S\\s*=\\s*(\\d+(?:/2)?))?"
                    + "(?:[\\s,]+[jJ]\\s*=\\s*(\\d+(?:/2)?))?");
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final String LOWERED = "₀₁₂₃₄₅₆₇₈₉";

    private final ModelDocument document;
    private final List<String> systems;
    private final List<Curve> curves;

    private LevelNames(ModelDocument document) {
        this.document = document;
        this.systems = document.systems().stream().map(PairSystem::id).toList();
        List<Curve> distinct = new ArrayList<>();
        Set<String> seen = new LinkedHashSet<>();
        for (Model model : document.models()) {
            for (Curve curve : model.curves()) {
                if (seen.add(curve.name())) {
                    distinct.add(curve);
                }
            }
        }
        this.curves = List.copyOf(distinct);
    }

    /** The names of a document's levels. */
    public static LevelNames of(ModelDocument document) {
        return new LevelNames(Objects.requireNonNull(document, "document"));
    }

    /** The name with system and curve in front where there are several, or where they are not the document's. */
    public String name(LevelKey key) {
        boolean showCurve =
                curves.size() > 1 || curves.size() == 1 && !curves.get(0).name().equals(key.curve());
        boolean showSystem = systems.size() != 1 || !systems.get(0).equals(key.system());
        if (showCurve) {
            return key.system() + "/" + key.curve() + ": " + shortName(key);
        }
        return showSystem ? key.system() + ": " + shortName(key) : shortName(key);
    }

    /** The name without system and curve. */
    public String shortName(LevelKey key) {
        ChannelKey channel = key.channel();
        if (channel.coupled()) {
            return "[J=%s,%s] %d".formatted(half(channel.twiceTotal()), channel.parity() < 0 ? "-" : "+", key.index());
        }
        LabelRule rule = rule(key.curve());
        int orbital = channel.orbital();
        if (document.labels() == LabelConvention.VIBRATIONAL) {
            StringBuilder text =
                    new StringBuilder("v=%d J=%d".formatted(key.index() + rule.vibrationalOffset(), orbital));
            if (channel.twiceSpin() > 1) {
                text.append(" S=").append(half(channel.twiceSpin()));
            }
            if (channel.twiceTotal() >= 0) {
                text.append(" j=").append(half(channel.twiceTotal()));
            }
            return text.toString();
        }
        boolean atomic = document.labels() == LabelConvention.ATOMIC;
        int number = key.index() + 1 + rule.principalOffset(orbital) + (atomic ? orbital : 0);
        String letter = ChannelLetters.letter(orbital);
        String total = channel.twiceTotal() < 0 ? "" : half(channel.twiceTotal());
        boolean twoSpins = channel.twiceTotal() >= 0 && scheme(key.curve(), channel) == SpinScheme.TWO_SPINS;
        if (twoSpins) {
            return "%d^%d%s_%s".formatted(number, channel.twiceSpin() + 1, letter.toUpperCase(Locale.ROOT), total);
        }
        return number + (atomic ? letter : letter.toUpperCase(Locale.ROOT)) + total;
    }

    /**
     * The level of a name.
     *
     * @throws InvalidModelException if it cannot be read, or names a system or curve that is not there
     */
    public LevelKey parse(String text) {
        String plain = plain(text);
        int colon = plain.lastIndexOf(':');
        String place = colon < 0 ? "" : plain.substring(0, colon).strip();
        String label = plain.substring(colon + 1).strip();
        int slash = place.indexOf('/');
        String system = slash < 0 ? place : place.substring(0, slash).strip();
        String curve = slash < 0 ? "" : place.substring(slash + 1).strip();
        if (slash < 0 && !place.isEmpty() && !systems.contains(place) && curve(place) != null) {
            system = "";
            curve = place;
        }
        String whole = text.strip();
        return labelled(label, whole, system(system, whole), curveName(curve, whole));
    }

    private String system(String named, String whole) {
        if (!named.isEmpty()) {
            if (!systems.contains(named)) {
                throw fault(
                        "the system '%s' is not in this project".formatted(Names.shortened(named)),
                        whole,
                        Names.remedy(named, systems));
            }
            return named;
        }
        if (systems.isEmpty()) {
            throw fault("there is no pair system yet", whole, "add one first");
        }
        if (systems.size() > 1) {
            throw fault(
                    "there are several systems",
                    whole,
                    "write which one is meant, as '%s: %s'".formatted(systems.get(0), whole));
        }
        return systems.get(0);
    }

    private String curveName(String named, String whole) {
        if (named.isEmpty()) {
            return curves.isEmpty() ? "V" : curves.get(0).name();
        }
        if (curve(named) == null) {
            throw fault(
                    "no model has a curve '%s'".formatted(Names.shortened(named)),
                    whole,
                    Names.remedy(named, curves.stream().map(Curve::name).toList()));
        }
        return named;
    }

    private LevelKey labelled(String label, String whole, String system, String curve) {
        try {
            Matcher matcher = COUPLED.matcher(label);
            if (matcher.matches()) {
                ChannelKey channel =
                        new ChannelKey(-1, twice(matcher.group(1)), -1, "-".equals(matcher.group(2)) ? -1 : 1);
                return new LevelKey(system, curve, channel, Integer.parseInt(matcher.group(3)));
            }
            matcher = EXPLICIT.matcher(label);
            if (matcher.matches()) {
                int spin = matcher.group(3) == null ? -1 : twice(matcher.group(3));
                int total = matcher.group(4) == null ? -1 : twice(matcher.group(4));
                ChannelKey channel = channel(Integer.parseInt(matcher.group(1)), spin, total, curve, whole);
                return new LevelKey(system, curve, channel, Integer.parseInt(matcher.group(2)));
            }
            if (document.labels() == LabelConvention.VIBRATIONAL) {
                return vibrational(label, whole, system, curve);
            }
            return lettered(label, whole, system, curve);
        } catch (NumberFormatException e) {
            throw fault("a number is too large", whole, "");
        }
    }

    private LevelKey vibrational(String label, String whole, String system, String curve) {
        String base = label;
        int spin = -1;
        int total = -1;
        Matcher spins = Pattern.compile("(.*?)(?:\\s+S=(\\d+(?:/2)?))?(?:\\s+j=(\\d+(?:/2)?))")
                .matcher(label);
        if (spins.matches()) {
            base = spins.group(1);
            spin = spins.group(2) == null ? -1 : twice(spins.group(2));
            total = twice(spins.group(3));
        }
        Matcher matcher = VIBRATIONAL.matcher(base);
        if (!matcher.matches()) {
            throw fault("'%s' names no level".formatted(Names.shortened(label)), whole, "write v and J, as 'v=0 J=1'");
        }
        int index = Integer.parseInt(matcher.group(1)) - rule(curve).vibrationalOffset();
        if (index < 0) {
            throw fault(
                    "the lowest level of '%s' is v = %d"
                            .formatted(curve, rule(curve).vibrationalOffset()),
                    whole,
                    "");
        }
        return new LevelKey(
                system, curve, channel(Integer.parseInt(matcher.group(2)), spin, total, curve, whole), index);
    }

    private LevelKey lettered(String label, String whole, String system, String curve) {
        Matcher matcher = LETTERED_WITH_SPIN.matcher(label);
        boolean withSpin = matcher.matches();
        if (!withSpin) {
            matcher = LETTERED.matcher(label);
            if (!matcher.matches()) {
                throw fault(
                        "'%s' names no level".formatted(Names.shortened(label)),
                        whole,
                        document.labels() == LabelConvention.ATOMIC
                                ? "write n and the letter of l, as '3p' or '3p3/2'"
                                : "write n and the letter of L, as '1P'");
            }
        }
        int orbital = ChannelLetters.orbital(matcher.group("letter").charAt(0));
        if (orbital < 0) {
            throw fault(
                    "'%s' is not the letter of an l".formatted(matcher.group("letter")),
                    whole,
                    "they are s, p, d, f, g, h, i, k, ...");
        }
        int multiplicity = withSpin ? Integer.parseInt(matcher.group("multiplicity")) : 0;
        int total = matcher.group("total") == null ? -1 : twice(matcher.group("total"));
        int lowest =
                1 + rule(curve).principalOffset(orbital) + (document.labels() == LabelConvention.ATOMIC ? orbital : 0);
        int index = Integer.parseInt(matcher.group("number")) - lowest;
        if (index < 0) {
            throw fault(
                    "the lowest level with l = %d is %d%s".formatted(orbital, lowest, matcher.group("letter")),
                    whole,
                    document.labels() == LabelConvention.ATOMIC ? "n starts at l + 1" : "n starts at 1");
        }
        return new LevelKey(system, curve, channel(orbital, multiplicity - 1, total, curve, whole), index);
    }

    private ChannelKey channel(int orbital, int twiceSpin, int twiceTotal, String curve, String whole) {
        Curve known = curve(curve);
        SpinScheme scheme = known == null
                ? (twiceSpin >= 0 && twiceTotal >= 0
                        ? SpinScheme.TWO_SPINS
                        : twiceTotal >= 0 ? SpinScheme.ONE_SPIN : SpinScheme.NONE)
                : known.spinScheme();
        return switch (scheme) {
            case NONE -> {
                if (twiceSpin > 0 || twiceTotal >= 0) {
                    throw fault(
                            "the curve '%s' has no spin".formatted(curve),
                            whole,
                            "leave j out, or give the curve its spins");
                }
                yield ChannelKey.ofOrbital(orbital);
            }
            case ONE_SPIN -> {
                int total = twiceTotal < 0 && orbital == 0 ? 1 : twiceTotal;
                if (total < 0) {
                    throw fault("j is missing", whole, "add it, as '%s%s'".formatted(whole, half(2 * orbital + 1)));
                }
                if (total % 2 == 0 || total > 2 * orbital + 1 || total < 2 * orbital - 1) {
                    throw fault(
                            "j = %s does not go with l = %d".formatted(half(total), orbital),
                            whole,
                            "j is l + 1/2 or l - 1/2");
                }
                yield ChannelKey.ofTotal(orbital, total);
            }
            case TWO_SPINS -> {
                if (twiceSpin < 0 || twiceTotal < 0) {
                    throw fault("S and J are missing", whole, "write them, as '1^3P_1'");
                }
                if (twiceTotal > 2 * orbital + twiceSpin
                        || twiceTotal < Math.abs(2 * orbital - twiceSpin)
                        || (twiceTotal - twiceSpin) % 2 != 0) {
                    throw fault(
                            "J = %s does not go with l = %d, S = %s"
                                    .formatted(half(twiceTotal), orbital, half(twiceSpin)),
                            whole,
                            "");
                }
                yield ChannelKey.ofSpins(orbital, twiceSpin, twiceTotal);
            }
        };
    }

    private SpinScheme scheme(String curveName, ChannelKey channel) {
        Curve known = curve(curveName);
        if (known != null && known.spinScheme() != SpinScheme.NONE) {
            return known.spinScheme();
        }
        return channel.twiceSpin() == 1 && channel.twiceTotal() % 2 != 0 ? SpinScheme.ONE_SPIN : SpinScheme.TWO_SPINS;
    }

    private LabelRule rule(String curveName) {
        Curve known = curve(curveName);
        return known == null ? LabelRule.PLAIN : known.labels();
    }

    private Curve curve(String name) {
        for (Curve curve : curves) {
            if (curve.name().equals(name)) {
                return curve;
            }
        }
        return null;
    }

    /** j of 2j: "3/2", "2". */
    private static String half(int twice) {
        return twice % 2 == 0 ? Integer.toString(twice / 2) : twice + "/2";
    }

    private static int twice(String text) {
        return text.endsWith("/2")
                ? Integer.parseInt(text.substring(0, text.length() - 2))
                : 2 * Integer.parseInt(text);
    }

    private static String plain(String text) {
        StringBuilder plain = new StringBuilder();
        boolean raised = false;
        for (char c : text.strip().toCharArray()) {
            int up = RAISED.indexOf(c);
            int down = LOWERED.indexOf(c);
            if (up >= 0) {
                plain.append(raised ? "" : "^").append(up);
            } else if (down >= 0) {
                plain.append(down);
            } else {
                plain.append(c == '\u2212' ? '-' : c == '\u2032' ? '\'' : c);
            }
            raised = up >= 0;
        }
        return plain.toString();
    }

    private static InvalidModelException fault(String what, String where, String remedy) {
        return new InvalidModelException(what, "'" + Names.shortened(where) + "'", remedy);
    }
}
