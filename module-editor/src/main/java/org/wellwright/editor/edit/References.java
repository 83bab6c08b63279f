package org.wellwright.editor.edit;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.CurveCoupling;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ModelError;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableKnot;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;

/** Who refers to what in a document: finds uses, and follows a new name wherever the old one stands. */
public final class References {
    private References() {}

    /** Where a parameter is used, in words; empty if nowhere. */
    public static List<String> usersOf(ModelDocument document, String parameter) {
        List<String> users = new ArrayList<>();
        for (Model model : document.models()) {
            for (Curve curve : model.curves()) {
                if (!renamedCurve(curve, parameter, "").withTerms(curve.terms()).equals(curve)) {
                    users.add("%s, %s".formatted(model.name(), curve.name()));
                }
                for (Term term : curve.terms()) {
                    if (!renamedTerm(term, parameter, parameter + "_").equals(term)) {
                        users.add("%s, %s".formatted(model.name(), term.frame().name()));
                    }
                }
            }
        }
        for (Parameter other : document.parameters()) {
            if (other.shape() instanceof ParameterShape.Tied tied && names(tied.formula(), parameter)) {
                users.add(other.name());
            }
        }
        for (PairSystem system : document.systems()) {
            if (usesMass(system.first(), parameter) || usesMass(system.second(), parameter)) {
                users.add(system.id());
            }
        }
        return users;
    }

    /** Gives a parameter another name, everywhere. */
    public static ModelDocument renameParameter(ModelDocument document, String old, String name) {
        List<Parameter> parameters = new ArrayList<>();
        for (Parameter parameter : document.parameters()) {
            Parameter next = parameter.name().equals(old) ? parameter.withName(name) : parameter;
            if (next.shape() instanceof ParameterShape.Tied tied) {
                next = next.withShape(new ParameterShape.Tied(renamedFormula(tied.formula(), old, name)));
            }
            parameters.add(next);
        }
        List<PairSystem> systems = document.systems().stream()
                .map(system -> system.withFirst(renamedMass(system.first(), old, name))
                        .withSecond(renamedMass(system.second(), old, name)))
                .toList();
        List<Model> models = new ArrayList<>();
        for (Model model : document.models()) {
            List<Curve> curves = model.curves().stream()
                    .map(curve -> renamedCurve(curve, old, name))
                    .toList();
            List<CurveCoupling> couplings = model.couplings().stream()
                    .map(coupling -> new CurveCoupling(
                            coupling.first(),
                            coupling.second(),
                            coupling.terms().stream()
                                    .map(term -> renamedTerm(term, old, name))
                                    .toList()))
                    .toList();
            models.add(model.withCurves(curves).withCouplings(couplings));
        }
        return document.withParameters(parameters).withSystems(systems).withModels(models);
    }

    /** Gives a pair system another id, everywhere. */
    public static ModelDocument renameSystem(ModelDocument document, String old, String id) {
        UnaryOperator<String> rename = name -> name.equals(old) ? id : name;
        List<PairSystem> systems = document.systems().stream()
                .map(system -> system.withId(rename.apply(system.id())))
                .toList();
        List<Model> models = document.models().stream()
                .map(model ->
                        model.withSystems(model.systems().stream().map(rename).toList()))
                .toList();
        List<Parameter> parameters = document.parameters().stream()
                .map(parameter -> parameter.withShape(renamedPlaces(parameter.shape(), rename)))
                .toList();
        return levels(
                document.withSystems(systems).withModels(models).withParameters(parameters),
                key -> new LevelKey(rename.apply(key.system()), key.curve(), key.channel(), key.index()));
    }

    /** Gives a curve another name; data follow unless another model has a curve of the old name. */
    public static ModelDocument renameCurve(ModelDocument document, TermPath path, String name) {
        Model model = document.models().get(path.model());
        String old = model.curves().get(path.curve()).name();
        UnaryOperator<String> rename = each -> each.equals(old) ? name : each;
        Model renamed = model.withCurves(Lists.with(model.curves(), path.curve(), curve -> curve.withName(name)))
                .withCouplings(model.couplings().stream()
                        .map(c -> new CurveCoupling(rename.apply(c.first()), rename.apply(c.second()), c.terms()))
                        .toList());
        ModelDocument next = document.withModels(Lists.with(document.models(), path.model(), m -> renamed));
        boolean elsewhere = next.models().stream().anyMatch(other -> other.curve(old) != null);
        return elsewhere
                ? next
                : levels(
                        next, key -> new LevelKey(key.system(), rename.apply(key.curve()), key.channel(), key.index()));
    }

    /** Gives a data group another id, everywhere. */
    public static ModelDocument renameGroup(ModelDocument document, String old, String id) {
        UnaryOperator<String> rename = name -> name.equals(old) ? id : name;
        List<Model> models = document.models().stream()
                .map(model -> model.withError(new ModelError(model.error().parts().stream()
                        .map(part -> new ModelError.Part(
                                rename.apply(part.group()), part.measure(), part.value(), part.unit(), part.fitted()))
                        .toList())))
                .toList();
        return document.withModels(models)
                .withData(document.data().stream()
                        .map(datum -> datum.withGroups(
                                datum.groups().stream().map(rename).toList()))
                        .toList())
                .withGroups(document.groups().stream()
                        .map(group -> new DataGroup(
                                rename.apply(group.id()), group.title(), group.kind(), group.sigma(), group.unit()))
                        .toList());
    }

    /** A term with every argument changed. */
    static Term mapped(Term term, UnaryOperator<Argument> change) {
        Term framed = term.withFrame(term.frame()
                .withScale(change.apply(term.frame().scale()))
                .withRange(
                        change.apply(term.frame().from()),
                        change.apply(term.frame().to())));
        if (framed instanceof FamilyTerm family) {
            return new FamilyTerm(family.frame(), family.family(), mapped(family.arguments(), change));
        }
        if (framed instanceof FormulaTerm formula) {
            return new FormulaTerm(formula.frame(), formula.text(), mapped(formula.arguments(), change));
        }
        TableTerm table = (TableTerm) framed;
        List<TableKnot> knots = table.knots().stream()
                .map(knot -> new TableKnot(knot.radius(), change.apply(knot.value())))
                .toList();
        OuterContinuation outer = table.outer();
        return new TableTerm(
                table.frame(),
                table.radiusUnit(),
                table.valueUnit(),
                knots,
                table.interpolation(),
                new InnerContinuation(
                        table.inner().kind(), change.apply(table.inner().steepness())),
                new OuterContinuation(
                        outer.kind(),
                        change.apply(outer.limit()),
                        change.apply(outer.coefficient()),
                        change.apply(outer.exponent())));
    }

    private static Map<String, Argument> mapped(Map<String, Argument> arguments, UnaryOperator<Argument> change) {
        Map<String, Argument> mapped = new LinkedHashMap<>();
        arguments.forEach((key, argument) -> mapped.put(key, change.apply(argument)));
        return mapped;
    }

    private static Argument renamed(Argument argument, String old, String name) {
        boolean same =
                argument instanceof Argument.Named named && named.parameter().equals(old);
        if (!same) {
            return argument;
        }
        return name.isEmpty() ? Argument.ZERO : Argument.named(name);
    }

    private static Curve renamedCurve(Curve curve, String old, String name) {
        UnaryOperator<Argument> change = argument -> renamed(argument, old, name);
        return curve.withEnergyOrigin(change.apply(curve.energyOrigin()))
                .withInnerWall(change.apply(curve.innerWall()))
                .withOuterWall(change.apply(curve.outerWall()))
                .withTerms(
                        name.isEmpty()
                                ? curve.terms()
                                : curve.terms().stream()
                                        .map(term -> renamedTerm(term, old, name))
                                        .toList());
    }

    private static Term renamedTerm(Term term, String old, String name) {
        Term mapped = mapped(term, argument -> renamed(argument, old, name));
        if (mapped instanceof FormulaTerm formula && !formula.arguments().containsKey(old)) {
            return new FormulaTerm(formula.frame(), renamedFormula(formula.text(), old, name), formula.arguments());
        }
        return mapped;
    }

    private static boolean names(String formula, String name) {
        return word(name).matcher(formula).find();
    }

    private static String renamedFormula(String formula, String old, String name) {
        return word(old).matcher(formula).replaceAll(Matcher.quoteReplacement(name));
    }

    private static Pattern word(String name) {
        return Pattern.compile("(?<![\\p{L}\\p{N}_.])" + Pattern.quote(name) + "(?![\\p{L}\\p{N}_(\\[])");
    }

    private static boolean usesMass(Body body, String parameter) {
        return body.mass() instanceof BodyMass.FromParameter named
                && named.parameter().equals(parameter);
    }

    private static Body renamedMass(Body body, String old, String name) {
        return usesMass(body, old) ? body.withMass(new BodyMass.FromParameter(name)) : body;
    }

    private static ParameterShape renamedPlaces(ParameterShape shape, UnaryOperator<String> rename) {
        if (shape instanceof ParameterShape.BySystem by) {
            return new ParameterShape.BySystem(
                    by.entries().stream()
                            .map(entry ->
                                    new ParameterShape.BySystem.Entry(rename.apply(entry.system()), entry.setting()))
                            .toList(),
                    by.others());
        }
        if (shape instanceof ParameterShape.MassScaled scaled) {
            return new ParameterShape.MassScaled(scaled.setting(), rename.apply(scaled.reference()), scaled.exponent());
        }
        return shape;
    }

    private static ModelDocument levels(ModelDocument document, UnaryOperator<LevelKey> change) {
        UnaryOperator<Datum.Contribution> each =
                contribution -> new Datum.Contribution(contribution.coefficient(), change.apply(contribution.level()));
        return document.withData(document.data().stream()
                .map(datum -> datum.withLevels(
                        datum.levels().stream().map(each).toList(),
                        datum.denominator().stream().map(each).toList()))
                .toList());
    }
}
