package org.wellwright.editor.edit;

import java.util.List;
import java.util.function.UnaryOperator;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.potential.Term;

/** Edits of models, curves and terms. */
public final class ModelEdits {
    private ModelEdits() {}

    /** A new model with one empty curve, last; its curve is named like the others' so that data belong to it too. */
    public static ModelDocument addModel(ModelDocument document) {
        String curve = document.models().isEmpty()
                ? "V"
                : document.models().get(0).curves().get(0).name();
        Model model = Model.of(
                Lists.free("model " + (document.models().size() + 1), " ", modelNames(document)),
                List.of(Curve.of(curve, List.of())));
        return document.withModels(Lists.added(document.models(), model));
    }

    /** A new empty curve of a model, last. */
    public static ModelDocument addCurve(ModelDocument document, int model) {
        return model(
                document,
                model,
                old -> old.withCurves(Lists.added(
                        old.curves(),
                        Curve.of(
                                Lists.free(
                                        "V",
                                        "",
                                        old.curves().stream().map(Curve::name).toList()),
                                List.of()))));
    }

    /** A new term in a curve, before an index. Its name is made unique. */
    public static ModelDocument addTerm(ModelDocument document, TermPath curve, int index, Term term) {
        return curve(document, curve, old -> {
            String name = Lists.free(term.frame().name(), " ", termNames(old));
            return old.withTerms(Lists.inserted(
                    old.terms(), index, term.withFrame(term.frame().withName(name))));
        });
    }

    /** A copy behind the original, under a name of its own. */
    public static ModelDocument duplicate(ModelDocument document, TermPath path) {
        return switch (path.kind()) {
            case NONE -> document;
            case MODEL -> {
                Model model = document.models().get(path.model());
                Model copy = model.withName(Lists.free(model.name() + " copy", " ", modelNames(document)));
                yield document.withModels(Lists.inserted(document.models(), path.model() + 1, copy));
            }
            case CURVE ->
                model(document, path.model(), model -> {
                    Curve curve = model.curves().get(path.curve());
                    List<String> names =
                            model.curves().stream().map(Curve::name).toList();
                    return model.withCurves(Lists.inserted(
                            model.curves(),
                            path.curve() + 1,
                            curve.withName(Lists.free(curve.name() + "2", "_", names))));
                });
            case TERM -> addTerm(document, path, path.term() + 1, term(document, path));
        };
    }

    /**
     * Without a model, curve or term.
     *
     * @throws InvalidModelException if it is the only curve of its model
     */
    public static ModelDocument remove(ModelDocument document, TermPath path) {
        return switch (path.kind()) {
            case NONE -> document;
            case MODEL -> document.withModels(Lists.without(document.models(), path.model()));
            case CURVE ->
                model(document, path.model(), model -> {
                    if (model.curves().size() == 1) {
                        throw new InvalidModelException(
                                "'%s' is the only curve of its model"
                                        .formatted(model.curves().get(0).name()),
                                "",
                                "remove the model instead");
                    }
                    String name = model.curves().get(path.curve()).name();
                    return model.withCouplings(model.couplings().stream()
                                    .filter(c -> !c.first().equals(name)
                                            && !c.second().equals(name))
                                    .toList())
                            .withCurves(Lists.without(model.curves(), path.curve()));
                });
            case TERM -> curve(document, path, curve -> curve.withTerms(Lists.without(curve.terms(), path.term())));
        };
    }

    /** Moved among its siblings. */
    public static ModelDocument move(ModelDocument document, TermPath path, int to) {
        return switch (path.kind()) {
            case NONE -> document;
            case MODEL -> document.withModels(Lists.moved(document.models(), path.model(), to));
            case CURVE -> model(document, path.model(), m -> m.withCurves(Lists.moved(m.curves(), path.curve(), to)));
            case TERM -> curve(document, path, c -> c.withTerms(Lists.moved(c.terms(), path.term(), to)));
        };
    }

    /**
     * Another name.
     *
     * @throws InvalidModelException if it is blank or taken
     */
    public static ModelDocument rename(ModelDocument document, TermPath path, String name) {
        String wanted = name.strip();
        if (wanted.isEmpty()) {
            throw new InvalidModelException("a name is missing here", "", "type one");
        }
        return switch (path.kind()) {
            case NONE -> document;
            case MODEL -> {
                requireFree(wanted, Lists.without(modelNames(document), path.model()), "model");
                yield model(document, path.model(), model -> model.withName(wanted));
            }
            case CURVE -> {
                List<String> others = Lists.without(
                        document.models().get(path.model()).curves().stream()
                                .map(Curve::name)
                                .toList(),
                        path.curve());
                requireFree(wanted, others, "curve of this model");
                yield References.renameCurve(document, path, wanted);
            }
            case TERM -> {
                Curve curve = curveAt(document, path);
                requireFree(wanted, Lists.without(termNames(curve), path.term()), "term of this curve");
                yield term(document, path, term -> term.withFrame(term.frame().withName(wanted)));
            }
        };
    }

    /** With one model changed. */
    public static ModelDocument model(ModelDocument document, int model, UnaryOperator<Model> change) {
        return document.withModels(Lists.with(document.models(), model, change));
    }

    /** With one curve changed. */
    public static ModelDocument curve(ModelDocument document, TermPath path, UnaryOperator<Curve> change) {
        return model(document, path.model(), m -> m.withCurves(Lists.with(m.curves(), path.curve(), change)));
    }

    /** With one term changed. */
    public static ModelDocument term(ModelDocument document, TermPath path, UnaryOperator<Term> change) {
        return curve(document, path, c -> c.withTerms(Lists.with(c.terms(), path.term(), change)));
    }

    /** Whether a path leads to something. */
    public static boolean exists(ModelDocument document, TermPath path) {
        if (path.model() < 0 || path.model() >= document.models().size()) {
            return false;
        }
        List<Curve> curves = document.models().get(path.model()).curves();
        return path.curve() < curves.size()
                && (path.curve() < 0
                        || path.term() < curves.get(path.curve()).terms().size());
    }

    /** The curve of a path. */
    public static Curve curveAt(ModelDocument document, TermPath path) {
        return document.models().get(path.model()).curves().get(path.curve());
    }

    /** The term of a path. */
    public static Term term(ModelDocument document, TermPath path) {
        return curveAt(document, path).terms().get(path.term());
    }

    /** How many siblings something has, itself included. */
    public static int siblings(ModelDocument document, TermPath path) {
        return switch (path.kind()) {
            case NONE -> 0;
            case MODEL -> document.models().size();
            case CURVE -> document.models().get(path.model()).curves().size();
            case TERM -> curveAt(document, path).terms().size();
        };
    }

    private static void requireFree(String name, List<String> taken, String kind) {
        if (taken.contains(name)) {
            throw new InvalidModelException(
                    "there is a %s '%s' already".formatted(kind, name), "", "choose another name");
        }
    }

    private static List<String> modelNames(ModelDocument document) {
        return document.models().stream().map(Model::name).toList();
    }

    private static List<String> termNames(Curve curve) {
        return curve.terms().stream().map(term -> term.frame().name()).toList();
    }
}
