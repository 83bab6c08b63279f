package org.wellwright.solver.model;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.BiConsumer;
import java.util.function.Supplier;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaFault;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.FormulaToken;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TableKnot;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.units.Constants;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.Names;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/**
 * Finds what is wrong between the records of a document: names that lead nowhere, units that do not fit, circular ties,
 * data that name what does not exist. Places are JSON pointers into the document ("/models/0/curves/0/terms/1").
 */
public final class ModelCheck {
    private final ModelDocument document;
    private final List<Problem> problems = new ArrayList<>();

    private ModelCheck(ModelDocument document) {
        this.document = document;
    }

    /** All faults in the order of the document; empty if there are none. */
    public static List<Problem> problems(ModelDocument document) {
        ModelCheck check = new ModelCheck(document);
        check.run();
        return List.copyOf(check.problems);
    }

    /**
     * Does nothing if the document has no fault.
     *
     * @throws InvalidModelException with the first fault
     */
    public static void require(ModelDocument document) {
        List<Problem> problems = problems(document);
        if (!problems.isEmpty()) {
            throw new InvalidModelException(problems.get(0));
        }
    }

    private void run() {
        if (!document.constantsEdition().equals(Constants.EDITION)) {
            add(
                    "/constantsEdition",
                    "the edition '%s' of the constants is not known".formatted(document.constantsEdition()),
                    "use '%s'".formatted(Constants.EDITION));
        }
        if (!document.massTable().equals(ParticleCatalogue.EDITION)) {
            add(
                    "/massTable",
                    "the mass table '%s' is not known".formatted(document.massTable()),
                    "use '%s'".formatted(ParticleCatalogue.EDITION));
        }
        attempt("/units", () -> UnitSystem.named(document.units()));
        unique(
                "/systems",
                "pair system",
                document.systems().stream().map(PairSystem::id).toList());
        unique(
                "/parameters",
                "parameter",
                document.parameters().stream().map(Parameter::name).toList());
        unique("/models", "model", document.models().stream().map(Model::name).toList());
        unique("/data", "datum", document.data().stream().map(Datum::id).toList());
        unique(
                "/groups",
                "data group",
                document.groups().stream().map(DataGroup::id).toList());
        each(document.parameters(), "/parameters", (at, parameter) -> parameter(at, parameter));
        if (!problems.isEmpty()) {
            // Everything below needs the pool, which needs the names and units above.
            return;
        }
        ParameterPool pool = ParameterPool.of(document);
        each(document.parameters(), "/parameters", (at, parameter) -> tie(at, parameter, pool));
        each(document.systems(), "/systems", (at, system) -> system(at, system, pool));
        if (!problems.isEmpty()) {
            return;
        }
        each(document.models(), "/models", (at, model) -> model(at, model, pool));
        problems.addAll(new DataCheck(document, pool.units()).problems());
    }

    private void parameter(String at, Parameter parameter) {
        attempt(at + "/unit", () -> UnitExpression.parse(parameter.unit()));
        if (parameter.shape() instanceof ParameterShape.BySystem bySystem) {
            for (ParameterShape.BySystem.Entry entry : bySystem.entries()) {
                requireSystem(at, entry.system());
            }
        }
        if (parameter.shape() instanceof ParameterShape.MassScaled scaled) {
            requireSystem(at, scaled.reference());
        }
        if (parameter.shape() instanceof ParameterShape.Tied tied) {
            Optional<FormulaFault> fault = FormulaText.fault(tied.formula());
            fault.ifPresent(found -> problems.add(under(at, found.problem())));
        }
    }

    private void tie(String at, Parameter parameter, ParameterPool pool) {
        if (!(parameter.shape() instanceof ParameterShape.Tied tied)) {
            return;
        }
        for (String name : FormulaText.parse(tied.formula()).names()) {
            requireName(at, name, pool);
        }
        if (FormulaText.tokens(tied.formula()).stream().anyMatch(token -> token.kind() == FormulaToken.Kind.RADIUS)) {
            add(at, "the tie of '%s' uses r".formatted(parameter.name()), "use names of parameters only");
        }
        if (circular(parameter.name(), parameter.name(), new HashSet<>())) {
            add(at, "the parameter '%s' is tied to itself".formatted(parameter.name()), "break the circle of ties");
        }
    }

    private boolean circular(String start, String name, Set<String> seen) {
        for (Parameter parameter : document.parameters()) {
            if (parameter.name().equals(name) && parameter.shape() instanceof ParameterShape.Tied tied) {
                for (String next : FormulaText.parse(tied.formula()).names()) {
                    if (next.equals(start) || seen.add(next) && circular(start, next, seen)) {
                        return true;
                    }
                }
            }
        }
        return false;
    }

    private void system(String at, PairSystem system, ParameterPool pool) {
        body(at + "/first", system.first(), pool);
        body(at + "/second", system.second(), pool);
    }

    private void body(String at, Body body, ParameterPool pool) {
        if (body.mass() instanceof BodyMass.Catalogued catalogued) {
            attempt(at + "/mass", () -> ParticleCatalogue.STANDARD.find(catalogued.particle()));
        } else if (body.mass() instanceof BodyMass.Typed typed) {
            attempt(at + "/mass", () -> UnitExpression.parse(typed.unit()).factorTo(pool.units(), Dimension.MASS));
        } else if (body.mass() instanceof BodyMass.FromParameter named) {
            argument(at + "/mass", Argument.named(named.parameter()), Dimension.MASS, pool);
            if (pool.knows(named.parameter()) && pool.dependsOnChannel(named.parameter())) {
                add(
                        at + "/mass",
                        "the mass '%s' depends on l".formatted(named.parameter()),
                        "use a parameter that does not");
            }
        }
    }

    private void model(String at, Model model, ParameterPool pool) {
        for (String system : model.systems()) {
            requireSystem(at + "/systems", system);
        }
        for (CurveCoupling coupling : model.couplings()) {
            for (String curve : List.of(coupling.first(), coupling.second())) {
                if (model.curve(curve) == null) {
                    add(
                            at + "/couplings",
                            "the coupling names the curve '%s', which the model does not have".formatted(curve),
                            Names.remedy(
                                    curve,
                                    model.curves().stream().map(Curve::name).toList()));
                }
            }
        }
        for (ModelError.Part part : model.error().parts()) {
            if (!part.group().isEmpty()
                    && document.groups().stream().noneMatch(group -> group.id().equals(part.group()))) {
                add(
                        at + "/error",
                        "the model error names the data group '%s', which does not exist".formatted(part.group()),
                        "add the group or change the name");
            }
            attempt(at + "/error", () -> UnitExpression.parse(part.unit()));
        }
        each(model.curves(), at + "/curves", (place, curve) -> curve(place, curve, pool));
    }

    private void curve(String at, Curve curve, ParameterPool pool) {
        argument(at + "/energyOrigin", curve.energyOrigin(), Dimension.ENERGY, pool);
        argument(at + "/innerWall", curve.innerWall(), Dimension.LENGTH, pool);
        argument(at + "/outerWall", curve.outerWall(), Dimension.LENGTH, pool);
        Set<String> names = new HashSet<>();
        each(curve.terms(), at + "/terms", (place, term) -> {
            if (!names.add(term.frame().name())) {
                add(
                        place,
                        "the curve has two terms '%s'".formatted(term.frame().name()),
                        "give each term a name of its own");
            }
            term(place, term, pool);
        });
    }

    private void term(String at, Term term, ParameterPool pool) {
        argument(at + "/scale", term.frame().scale(), Dimension.NONE, pool);
        argument(at + "/from", term.frame().from(), Dimension.LENGTH, pool);
        argument(at + "/to", term.frame().to(), Dimension.LENGTH, pool);
        if (term instanceof FamilyTerm family) {
            family(at, family, pool);
        } else if (term instanceof FormulaTerm formula) {
            formula(at, formula, pool);
        } else if (term instanceof TableTerm table) {
            table(at, table, pool);
        }
    }

    private void family(String at, FamilyTerm term, ParameterPool pool) {
        Optional<PotentialFamily> family = FamilyCatalogue.find(term.family());
        if (family.isEmpty()) {
            add(
                    at + "/family",
                    "the family of potentials '%s' is not known".formatted(Names.shortened(term.family())),
                    Names.remedy(
                            term.family(),
                            FamilyCatalogue.families().stream()
                                    .map(PotentialFamily::id)
                                    .toList()));
            return;
        }
        List<String> wanted = new ArrayList<>();
        for (FamilyParameter parameter : family.get().parameters()) {
            wanted.add(parameter.name());
            Argument argument = term.arguments().get(parameter.name());
            if (argument == null) {
                add(
                        at + "/arguments",
                        "the family '%s' needs a value for '%s'".formatted(term.family(), parameter.name()),
                        "give it a number or a parameter");
            } else {
                argument(at + "/arguments/" + parameter.name(), argument, parameter.dimension(), pool);
            }
        }
        for (String given : term.arguments().keySet()) {
            if (!wanted.contains(given)) {
                add(
                        at + "/arguments/" + given,
                        "the family '%s' has no parameter '%s'".formatted(term.family(), Names.shortened(given)),
                        Names.remedy(given, wanted));
            }
        }
    }

    private void formula(String at, FormulaTerm term, ParameterPool pool) {
        Optional<FormulaFault> fault = FormulaText.fault(term.text());
        if (fault.isPresent()) {
            problems.add(under(at + "/formula", fault.get().problem()));
            return;
        }
        for (String name : FormulaText.parse(term.text()).names()) {
            Argument argument = term.argument(name);
            if (argument instanceof Argument.Named named) {
                requireName(at + "/formula", named.parameter(), pool);
            } else if (argument instanceof Argument.Literal literal) {
                attempt(at + "/arguments/" + name, () -> UnitExpression.parse(literal.unit()));
            }
        }
    }

    private void table(String at, TableTerm term, ParameterPool pool) {
        attempt(at + "/radiusUnit", () -> unitOf(term.radiusUnit(), Dimension.LENGTH, pool.units()));
        attempt(at + "/valueUnit", () -> unitOf(term.valueUnit(), Dimension.ENERGY, pool.units()));
        List<TableKnot> knots = term.knots();
        for (int i = 0; i < knots.size(); i++) {
            argument(at + "/knots/" + i, knots.get(i).value(), Dimension.ENERGY, pool);
        }
        boolean exponential = term.inner().kind() == InnerContinuation.Kind.EXPONENTIAL;
        Dimension steepness = exponential ? Dimension.LENGTH.power(-1) : Dimension.NONE;
        argument(at + "/inner/steepness", term.inner().steepness(), steepness, pool);
        argument(at + "/outer/limit", term.outer().limit(), Dimension.ENERGY, pool);
        argument(at + "/outer/exponent", term.outer().exponent(), Dimension.NONE, pool);
        if (term.outer().coefficient() instanceof Argument.Named named) {
            requireName(at + "/outer/coefficient", named.parameter(), pool);
        }
    }

    private static Object unitOf(String text, Dimension expected, UnitSystem units) {
        return text.isEmpty() ? text : UnitExpression.parse(text).factorTo(units, expected);
    }

    private void argument(String at, Argument argument, Dimension expected, ParameterPool pool) {
        if (argument instanceof Argument.Literal literal) {
            attempt(at, () -> unitOf(literal.unit(), expected, pool.units()));
            return;
        }
        String name = ((Argument.Named) argument).parameter();
        UnitExpression unit = pool.unit(name);
        if (requireName(at, name, pool) && unit != null && !unit.fits(pool.units(), expected)) {
            String wanted = pool.units().unitText(expected);
            add(
                    at,
                    "the unit '%s' of the parameter '%s' does not fit here".formatted(unit.text(), name),
                    wanted.isEmpty() ? "use a pure number" : "use a unit like '%s'".formatted(wanted));
        }
    }

    private boolean requireName(String at, String name, ParameterPool pool) {
        if (pool.knows(name)) {
            return true;
        }
        problems.add(under(at, pool.unknown(name).problem()));
        return false;
    }

    private void requireSystem(String at, String id) {
        List<String> ids = document.systems().stream().map(PairSystem::id).toList();
        if (!ids.contains(id)) {
            add(at, "the pair system '%s' does not exist".formatted(Names.shortened(id)), Names.remedy(id, ids));
        }
    }

    private void unique(String list, String kind, Collection<String> names) {
        Set<String> seen = new HashSet<>();
        int i = 0;
        for (String name : names) {
            if (!seen.add(name)) {
                add(list + "/" + i, "there are two of the %s '%s'".formatted(kind, name), "rename one of them");
            }
            i++;
        }
    }

    private void attempt(String at, Supplier<?> action) {
        try {
            Object unused = action.get();
        } catch (InvalidModelException fault) {
            problems.add(under(at, fault.problem()));
        }
    }

    private void add(String at, String what, String remedy) {
        problems.add(new Problem(what, at, remedy));
    }

    static Problem under(String at, Problem problem) {
        String where = problem.where().isEmpty() ? at : at + ", " + problem.where();
        return new Problem(problem.what(), where, problem.remedy());
    }

    private static <T> void each(List<T> list, String at, BiConsumer<String, T> action) {
        for (int i = 0; i < list.size(); i++) {
            action.accept(at + "/" + i, list.get(i));
        }
    }

    /** Names of systems that a model serves: all where it lists none. */
    static Map<String, PairSystem> systemsById(ModelDocument document) {
        Map<String, PairSystem> byId = new LinkedHashMap<>();
        document.systems().forEach(system -> byId.put(system.id(), system));
        return byId;
    }
}
