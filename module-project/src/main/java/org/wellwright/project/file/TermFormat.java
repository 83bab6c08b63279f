package org.wellwright.project.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.potential.AngularFactor;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.ChannelFilter;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableInterpolation;
import org.wellwright.solver.potential.TableKnot;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.ExactNumber;

/** Terms of a curve in project files: "formula", "family" or "table", each with the same frame. */
final class TermFormat {
    private TermFormat() {}

    /** The name of a term that has none, by its position from 0. */
    static String unnamed(int position) {
        return "term " + (position + 1);
    }

    static List<Term> readAll(ObjectIn in, String key) {
        return in.items(key, "name", TermFormat::unnamed, TermFormat::read);
    }

    static void writeAll(ObjectOut out, String key, List<Term> terms) {
        int[] position = {0};
        out.items(key, terms, term -> term.frame().name(), (item, term) -> write(item, term, unnamed(position[0]++)));
    }

    private static Term read(ObjectIn in) {
        in.knowing(
                "name",
                "formula",
                "family",
                "table",
                "arguments",
                "enabled",
                "scale",
                "from",
                "to",
                "channels",
                "angular");
        TermFrame frame = frame(in);
        int kinds = (in.has("formula") ? 1 : 0) + (in.has("family") ? 1 : 0) + (in.has("table") ? 1 : 0);
        if (kinds != 1) {
            throw in.fault(
                    "a term needs one of 'formula', 'family', 'table'",
                    kinds == 0 ? "add one" : "split it into several terms");
        }
        if (in.has("table")) {
            return table(in.required("table"), frame);
        }
        Map<String, Argument> arguments = new LinkedHashMap<>();
        in.members("arguments")
                .forEach((name, value) ->
                        arguments.put(name, Arguments.read(in, "arguments", "/arguments/" + name, value)));
        return in.has("formula")
                ? in.make(() -> new FormulaTerm(frame, in.text("formula"), arguments))
                : in.make(() -> new FamilyTerm(frame, in.text("family"), arguments));
    }

    private static TermFrame frame(ObjectIn in) {
        ObjectIn filter = in.object("channels");
        ChannelFilter channels = filter == null ? ChannelFilter.ALL : channels(filter.knowing("l", "j", "S"));
        return new TermFrame(
                in.name(),
                in.flag("enabled", true),
                Arguments.read(in, "scale", Argument.ONE),
                Arguments.read(in, "from", Argument.ZERO),
                Arguments.read(in, "to", Argument.UNBOUNDED),
                channels,
                in.choice("angular", AngularFactor.class, AngularFactor.UNITY));
    }

    private static ChannelFilter channels(ObjectIn in) {
        int from = 0;
        int to = Integer.MAX_VALUE;
        if (in.value("l") instanceof JsonText range) {
            int dots = range.value().indexOf("..");
            try {
                from = Integer.parseInt(dots < 0 ? range.value() : range.value().substring(0, dots));
                String end = dots < 0 ? range.value() : range.value().substring(dots + 2);
                to = end.isEmpty() ? Integer.MAX_VALUE : Integer.parseInt(end);
            } catch (NumberFormatException e) {
                throw in.fault("l", "'l' is '" + range.value() + "'", "write 2, \"0..2\" or \"3..\"");
            }
        } else if (in.has("l")) {
            from = in.integer("l");
            to = from;
        }
        int lowest = from;
        int highest = to;
        List<Integer> totals = Spins.twices(in, "j");
        List<Integer> spins = Spins.twices(in, "S");
        return in.make(() -> new ChannelFilter(lowest, highest, totals, spins));
    }

    private static TableTerm table(ObjectIn in, TermFrame frame) {
        in.knowing("radiusUnit", "valueUnit", "knots", "interpolation", "inner", "outer");
        List<TableKnot> knots = new ArrayList<>();
        for (JsonValue point : in.list("knots")) {
            int position = knots.size();
            if (!(point instanceof JsonArray pair
                    && pair.items().size() == 2
                    && pair.items().get(0) instanceof JsonNumber radius)) {
                throw in.fault(
                        "knots",
                        "knot " + (position + 1) + " of the table is not [radius, value]",
                        "write [number, number]");
            }
            ExactNumber exact = in.make(() -> new ExactNumber(radius.text()));
            in.spelled("/knots/" + position + "/r", exact);
            Argument value = Arguments.read(
                    in, "knots", "/knots/" + position + "/v", pair.items().get(1));
            knots.add(in.make(() -> new TableKnot(exact.value(), value)));
        }
        TableInterpolation interpolation = interpolation(in.object("interpolation"));
        InnerContinuation inner = inner(in.required("inner"));
        OuterContinuation outer = outer(in.required("outer"));
        return in.make(() -> new TableTerm(
                frame, in.text("radiusUnit", ""), in.text("valueUnit", ""), knots, interpolation, inner, outer));
    }

    private static TableInterpolation interpolation(ObjectIn in) {
        TableInterpolation usual = TableInterpolation.STANDARD;
        if (in == null) {
            return usual;
        }
        in.knowing("quantity", "abscissa", "spline");
        return new TableInterpolation(
                in.choice("quantity", TableInterpolation.Quantity.class, usual.quantity()),
                in.choice("abscissa", TableInterpolation.Abscissa.class, usual.abscissa()),
                in.choice("spline", TableInterpolation.Spline.class, usual.spline()));
    }

    private static InnerContinuation inner(ObjectIn in) {
        in.knowing("kind", "steepness");
        in.text("kind");
        return new InnerContinuation(
                in.choice("kind", InnerContinuation.Kind.class, null), Arguments.read(in, "steepness", Argument.ZERO));
    }

    private static OuterContinuation outer(ObjectIn in) {
        in.knowing("kind", "limit", "coefficient", "exponent");
        in.text("kind");
        return new OuterContinuation(
                in.choice("kind", OuterContinuation.Kind.class, null),
                Arguments.read(in, "limit", Argument.ZERO),
                Arguments.read(in, "coefficient", Argument.ZERO),
                Arguments.read(in, "exponent", Argument.ONE));
    }

    private static void write(ObjectOut out, Term term, String unnamed) {
        TermFrame frame = term.frame();
        out.text("name", frame.name(), unnamed);
        if (term instanceof FormulaTerm formula) {
            out.text("formula", formula.text());
            arguments(out, formula.arguments());
        } else if (term instanceof FamilyTerm family) {
            out.text("family", family.family());
            arguments(out, family.arguments());
        } else if (term instanceof TableTerm table) {
            out.object("table", table, TermFormat::table);
        }
        out.flag("enabled", frame.enabled(), true);
        Arguments.write(out, "scale", frame.scale(), Argument.ONE);
        Arguments.write(out, "from", frame.from(), Argument.ZERO);
        Arguments.write(out, "to", frame.to(), Argument.UNBOUNDED);
        out.object("channels", frame.channels(), TermFormat::channels);
        out.choice("angular", frame.angular(), AngularFactor.UNITY);
    }

    private static void arguments(ObjectOut out, Map<String, Argument> arguments) {
        Map<String, JsonValue> members = new LinkedHashMap<>();
        arguments.forEach((name, value) -> members.put(name, Arguments.json(out, "/arguments/" + name, value)));
        out.put("arguments", members.isEmpty() ? null : new JsonObject(members));
    }

    private static void channels(ObjectOut out, ChannelFilter filter) {
        int from = filter.orbitalFrom();
        int to = filter.orbitalTo();
        JsonValue range = null;
        if (from == to) {
            range = JsonNumber.of(from);
        } else if (from > 0 || to < Integer.MAX_VALUE) {
            range = new JsonText(from + ".." + (to == Integer.MAX_VALUE ? "" : Integer.toString(to)));
        }
        out.put("l", range).put("j", Spins.json(filter.twiceTotals())).put("S", Spins.json(filter.twiceSpins()));
    }

    private static void table(ObjectOut out, TableTerm table) {
        List<JsonValue> points = new ArrayList<>();
        for (TableKnot knot : table.knots()) {
            int position = points.size();
            points.add(new JsonArray(List.of(
                    out.real("/knots/" + position + "/r", knot.radius()),
                    Arguments.json(out, "/knots/" + position + "/v", knot.value()))));
        }
        TableInterpolation usual = TableInterpolation.STANDARD;
        out.text("radiusUnit", table.radiusUnit(), "")
                .text("valueUnit", table.valueUnit(), "")
                .put("knots", new JsonArray(points))
                .object(
                        "interpolation",
                        table.interpolation(),
                        (item, i) -> item.choice("quantity", i.quantity(), usual.quantity())
                                .choice("abscissa", i.abscissa(), usual.abscissa())
                                .choice("spline", i.spline(), usual.spline()))
                .object("inner", table.inner(), TermFormat::inner)
                .object("outer", table.outer(), TermFormat::outer);
    }

    private static void inner(ObjectOut out, InnerContinuation inner) {
        out.choice("kind", inner.kind(), null);
        Arguments.write(out, "steepness", inner.steepness(), Argument.ZERO);
    }

    private static void outer(ObjectOut out, OuterContinuation outer) {
        out.choice("kind", outer.kind(), null);
        Arguments.write(out, "limit", outer.limit(), Argument.ZERO);
        Arguments.write(out, "coefficient", outer.coefficient(), Argument.ZERO);
        Arguments.write(out, "exponent", outer.exponent(), Argument.ONE);
    }
}
