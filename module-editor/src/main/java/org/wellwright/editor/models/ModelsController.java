package org.wellwright.editor.models;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import org.wellwright.editor.edit.ArgumentText;
import org.wellwright.editor.edit.ChannelText;
import org.wellwright.editor.edit.LabelText;
import org.wellwright.editor.edit.Lists;
import org.wellwright.editor.edit.ModelEdits;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.editor.edit.Units;
import org.wellwright.editor.parts.Entry;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.Geometry;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterPool;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.model.SpinScheme;
import org.wellwright.solver.potential.AngularFactor;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** Turns what is chosen and typed in the window of models into edits of its project. */
final class ModelsController {
    private final ProjectSession session;

    ModelsController(ProjectSession session) {
        this.session = session;
    }

    ModelDocument document() {
        return session.project().document();
    }

    /** A new model; tells where it is. */
    TermPath addModel() {
        edit("Add a model", null, ModelEdits::addModel);
        return TermPath.model(document().models().size() - 1);
    }

    TermPath addCurve(TermPath selected) {
        int model = Math.max(0, selected.model());
        edit("Add a curve", null, document -> ModelEdits.addCurve(document, model));
        return TermPath.curve(model, document().models().get(model).curves().size() - 1);
    }

    /**
     * A term of a family, each of whose parameters is given as text; a name that is not in the pool yet becomes a
     * parameter of it.
     */
    Optional<Problem> addFamily(TermPath selected, PotentialFamily family, Map<String, String> texts) {
        return edit("Add " + family.displayName(), null, document -> {
            ModelDocument next = withNewParameters(document, family, texts);
            Map<String, Argument> arguments = new LinkedHashMap<>();
            for (FamilyParameter parameter : family.parameters()) {
                arguments.put(
                        parameter.name(),
                        ArgumentText.parse(texts.get(parameter.name()), parameter.dimension(), null, next));
            }
            FamilyTerm term = new FamilyTerm(TermFrame.named(family.displayName()), family.id(), arguments);
            return insert(next, selected, term);
        });
    }

    Optional<Problem> addFormula(TermPath selected) {
        return edit(
                "Add a formula",
                null,
                document -> insert(document, selected, new FormulaTerm(TermFrame.named("formula"), "0", Map.of())));
    }

    Optional<Problem> addTable(TermPath selected, TableTerm table) {
        return edit("Add a table", null, document -> insert(document, selected, table));
    }

    /** Where a term added at a selected place goes: behind a selected term, else at the end of the curve. */
    TermPath insertedAt(TermPath selected) {
        TermPath curve = TermPath.curve(Math.max(0, selected.model()), Math.max(0, selected.curve()));
        int size = ModelEdits.exists(document(), curve)
                ? ModelEdits.curveAt(document(), curve).terms().size()
                : 0;
        return new TermPath(curve.model(), curve.curve(), selected.term() >= 0 ? selected.term() + 1 : size);
    }

    private ModelDocument insert(ModelDocument document, TermPath selected, Term term) {
        ModelDocument next = document.models().isEmpty() ? ModelEdits.addModel(document) : document;
        TermPath at = insertedAt(selected);
        return ModelEdits.addTerm(next, at, at.term(), term);
    }

    /**
     * The names that a family's parameters get when it is added: their own, with the term's where they are taken by
     * something else.
     */
    Map<String, String> suggestedNames(PotentialFamily family) {
        Map<String, String> names = new LinkedHashMap<>();
        List<String> taken = new ArrayList<>(
                document().parameters().stream().map(Parameter::name).toList());
        taken.addAll(List.of("r", "l", "pi"));
        for (FamilyParameter parameter : family.parameters()) {
            String suggested = parameter.name().replaceAll("[^\\p{L}\\p{N}_]", "_");
            String name = betweenCharges(family) ? "coulomb" : Lists.free(suggested, "_", taken);
            taken.add(name);
            names.put(parameter.name(), name);
        }
        return names;
    }

    /** The strength of the force between two charges follows from the system. */
    private boolean betweenCharges(PotentialFamily family) {
        return family.id().equals("coulomb")
                && document().systems().stream()
                        .allMatch(system -> system.first().charge().sign() != 0
                                && system.second().charge().sign() != 0);
    }

    private static ModelDocument withNewParameters(
            ModelDocument document, PotentialFamily family, Map<String, String> texts) {
        List<Parameter> parameters = new ArrayList<>(document.parameters());
        for (FamilyParameter parameter : family.parameters()) {
            String text = texts.getOrDefault(parameter.name(), "").strip();
            boolean name = text.matches("\\p{L}[\\p{L}\\p{N}_]*");
            boolean known = ParameterPool.SYSTEM_NAMES.contains(text)
                    || parameters.stream().anyMatch(other -> other.name().equals(text));
            if (name && !known) {
                parameters.add(newParameter(text, parameter.dimension(), parameter.suggested(), document));
            }
        }
        return document.withParameters(parameters);
    }

    /** A free parameter with a value given in atomic units. */
    private static Parameter newParameter(String name, Dimension dimension, double atomic, ModelDocument document) {
        String unit = Units.of(document).unitText(dimension);
        double factor =
                UnitExpression.parse(UnitSystem.ATOMIC.unitText(dimension)).factorTo(Units.of(document), dimension);
        double value = new BigDecimal(atomic * factor).round(new MathContext(4)).doubleValue();
        return Parameter.scalar(name, unit, Setting.free(ExactNumber.of(value)));
    }

    /** Adds the parameters that a formula names and the pool does not have. */
    Optional<Problem> addMissing(TermPath path) {
        return edit("Add parameters", null, document -> {
            List<Parameter> parameters = new ArrayList<>(document.parameters());
            for (String name : missing(document, path)) {
                parameters.add(Parameter.scalar(name, "", Setting.free(ExactNumber.ONE)));
            }
            return document.withParameters(parameters);
        });
    }

    /** The names of a formula that nothing stands for. */
    static List<String> missing(ModelDocument document, TermPath path) {
        if (!ModelEdits.exists(document, path)
                || path.kind() != TermPath.Kind.TERM
                || !(ModelEdits.term(document, path) instanceof FormulaTerm formula)
                || FormulaText.fault(formula.text()).isPresent()) {
            return List.of();
        }
        List<String> missing = new ArrayList<>();
        for (String name : FormulaText.parse(formula.text()).names()) {
            boolean known = ParameterPool.SYSTEM_NAMES.contains(name)
                    || formula.arguments().containsKey(name)
                    || document.parameters().stream()
                            .anyMatch(parameter -> parameter.name().equals(name));
            if (!known && name.matches("\\p{L}[\\p{L}\\p{N}_]*")) {
                missing.add(name);
            }
        }
        return missing;
    }

    TermPath duplicate(TermPath path) {
        edit("Duplicate " + name(path), null, document -> ModelEdits.duplicate(document, path));
        return path.at(path.index() + 1);
    }

    Optional<Problem> remove(TermPath path) {
        return edit("Remove " + name(path), null, document -> ModelEdits.remove(document, path));
    }

    TermPath move(TermPath path, int by) {
        int to = path.index() + by;
        if (to < 0 || to >= ModelEdits.siblings(document(), path)) {
            return path;
        }
        edit("Move " + name(path), null, document -> ModelEdits.move(document, path, to));
        return path.at(to);
    }

    Optional<Problem> rename(TermPath path, String text) {
        return edit("Rename " + name(path), null, document -> ModelEdits.rename(document, path, text));
    }

    Optional<Problem> setEnabled(TermPath path, boolean on) {
        return term(
                (on ? "Switch on " : "Switch off ") + name(path),
                path,
                term -> term.withFrame(term.frame().withEnabled(on)));
    }

    Optional<Problem> setNote(TermPath path, String text) {
        return edit(
                "Change the note of " + name(path),
                List.of("note", path),
                document -> ModelEdits.model(document, path.model(), model -> model.withNote(text)));
    }

    Optional<Problem> setGeometry(TermPath path, Geometry geometry) {
        return model("Change the geometry", path, model -> model.withGeometry(geometry));
    }

    /** The systems that a model serves; all listed counts as "all, also those to come". */
    Optional<Problem> setSystems(TermPath path, List<String> systems) {
        boolean all = systems.size() == document().systems().size();
        return model(
                "Change the systems of " + name(path), path, model -> model.withSystems(all ? List.of() : systems));
    }

    Optional<Problem> setError(TermPath path, UnaryOperator<Model> change) {
        return model("Change the model error of " + name(path), path, change);
    }

    Optional<Problem> setOrigin(TermPath path, String text) {
        return argument(path, text, Dimension.ENERGY, Argument.ZERO, "the energy origin", Curve::withEnergyOrigin);
    }

    Optional<Problem> setInnerWall(TermPath path, String text) {
        return argument(path, text, Dimension.LENGTH, Argument.ZERO, "the inner wall", Curve::withInnerWall);
    }

    Optional<Problem> setOuterWall(TermPath path, String text) {
        return argument(path, text, Dimension.LENGTH, Argument.UNBOUNDED, "the outer wall", Curve::withOuterWall);
    }

    Optional<Problem> setSpins(TermPath path, SpinScheme scheme) {
        return curve("Change the spins of " + name(path), path, curve -> curve.withSpinScheme(scheme));
    }

    Optional<Problem> setLabels(TermPath path, String text) {
        return curve("Change the labels of " + name(path), path, curve -> curve.withLabels(LabelText.parse(text)));
    }

    Optional<Problem> setOccupied(TermPath path, String text) {
        return edit(
                "Change the occupied levels of " + name(path),
                null,
                document -> ModelEdits.curve(
                        document, path, curve -> curve.withOccupied(LabelText.parseOccupied(text, curve, document))));
    }

    Optional<Problem> setScale(TermPath path, String text) {
        return frame(path, text, Dimension.NONE, Argument.ONE, TermFrame::withScale);
    }

    Optional<Problem> setFrom(TermPath path, String text) {
        return frame(path, text, Dimension.LENGTH, Argument.ZERO, (frame, from) -> frame.withRange(from, frame.to()));
    }

    Optional<Problem> setTo(TermPath path, String text) {
        return frame(
                path, text, Dimension.LENGTH, Argument.UNBOUNDED, (frame, to) -> frame.withRange(frame.from(), to));
    }

    Optional<Problem> setChannels(TermPath path, String text) {
        return term(
                "Change the channels of " + name(path),
                path,
                term -> term.withFrame(term.frame().withChannels(ChannelText.parse(text))));
    }

    Optional<Problem> setAngular(TermPath path, AngularFactor factor) {
        return term(
                "Change the operator of " + name(path),
                path,
                term -> term.withFrame(term.frame().withAngular(factor)));
    }

    /** A burst of typing into one formula is one step. A faulty formula is kept; it counts as a fault of its model. */
    Optional<Problem> setFormula(TermPath path, String text) {
        return edit(
                "Change the formula of " + name(path),
                List.of("formula", path),
                document -> ModelEdits.term(document, path, term -> {
                    FormulaTerm formula = (FormulaTerm) term;
                    return new FormulaTerm(formula.frame(), text, formula.arguments());
                }));
    }

    void endTyping() {
        session.endGesture();
    }

    Optional<Problem> setTable(TermPath path, UnaryOperator<TableTerm> change) {
        return term("Change the table " + name(path), path, term -> change.apply((TableTerm) term));
    }

    Optional<Problem> setArgument(TermPath path, FamilyParameter parameter, String text) {
        return edit(
                "Change %s of %s".formatted(parameter.name(), name(path)),
                null,
                document -> ModelEdits.term(
                        document,
                        path,
                        term -> ((FamilyTerm) term)
                                .withArgument(
                                        parameter.name(),
                                        ArgumentText.parse(text, parameter.dimension(), null, document))));
    }

    /**
     * Another family: what its parameters have in common by name with the old one's is kept, the rest becomes new
     * parameters.
     */
    Optional<Problem> setFamily(TermPath path, String id) {
        PotentialFamily family = FamilyCatalogue.require(id);
        return edit("Change the family of " + name(path), null, document -> {
            FamilyTerm old = (FamilyTerm) ModelEdits.term(document, path);
            if (old.family().equals(id)) {
                return document;
            }
            Map<String, String> names = suggestedNames(family);
            ModelDocument next = document;
            Map<String, Argument> arguments = new LinkedHashMap<>();
            for (FamilyParameter parameter : family.parameters()) {
                Argument kept = old.arguments().get(parameter.name());
                if (kept == null) {
                    Map<String, String> one = Map.of(parameter.name(), names.get(parameter.name()));
                    next = withNewParameters(next, family, one);
                    kept = ArgumentText.parse(names.get(parameter.name()), parameter.dimension(), null, next);
                }
                arguments.put(parameter.name(), kept);
            }
            boolean named = FamilyCatalogue.find(old.family())
                    .map(PotentialFamily::displayName)
                    .filter(old.frame().name()::equals)
                    .isPresent();
            TermFrame frame = named ? old.frame().withName(family.displayName()) : old.frame();
            return ModelEdits.term(next, path, term -> new FamilyTerm(frame, id, arguments));
        });
    }

    private Optional<Problem> argument(
            TermPath path,
            String text,
            Dimension dimension,
            Argument empty,
            String what,
            BiFunction<Curve, Argument, Curve> change) {
        return edit("Change %s of %s".formatted(what, name(path)), null, document -> {
            Argument argument = ArgumentText.parse(text, dimension, empty, document);
            return ModelEdits.curve(document, path, curve -> change.apply(curve, argument));
        });
    }

    private Optional<Problem> frame(
            TermPath path,
            String text,
            Dimension dimension,
            Argument empty,
            BiFunction<TermFrame, Argument, TermFrame> change) {
        return edit("Change " + name(path), null, document -> {
            Argument argument = ArgumentText.parse(text, dimension, empty, document);
            return ModelEdits.term(document, path, term -> term.withFrame(change.apply(term.frame(), argument)));
        });
    }

    private Optional<Problem> model(String label, TermPath path, UnaryOperator<Model> change) {
        return edit(label, null, document -> ModelEdits.model(document, path.model(), change));
    }

    private Optional<Problem> curve(String label, TermPath path, UnaryOperator<Curve> change) {
        return edit(label, null, document -> ModelEdits.curve(document, path, change));
    }

    private Optional<Problem> term(String label, TermPath path, UnaryOperator<Term> change) {
        return edit(label, null, document -> ModelEdits.term(document, path, change));
    }

    private String name(TermPath path) {
        ModelDocument document = document();
        if (!ModelEdits.exists(document, path)) {
            return "";
        }
        return switch (path.kind()) {
            case NONE -> "";
            case MODEL -> document.models().get(path.model()).name();
            case CURVE -> ModelEdits.curveAt(document, path).name();
            case TERM -> ModelEdits.term(document, path).frame().name();
        };
    }

    private Optional<Problem> edit(String label, Object gesture, Function<ModelDocument, ModelDocument> change) {
        return Entry.attempt(() -> session.edit(label, gesture, project -> {
            try {
                return project.withDocument(change.apply(project.document()));
            } catch (IndexOutOfBoundsException e) {
                throw new InvalidModelException("it is not there any more", "", "");
            }
        }));
    }
}
