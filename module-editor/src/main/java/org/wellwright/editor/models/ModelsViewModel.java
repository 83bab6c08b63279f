package org.wellwright.editor.models;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.editor.edit.Faults;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;

/**
 * The tree of models.
 *
 * @param models the models in order
 */
record ModelsViewModel(List<Node> models) {
    /**
     * One line of the tree.
     *
     * @param path where it is
     * @param title its name
     * @param detail what it is, in a few words
     * @param enabled whether it counts
     * @param problem what is wrong with it or below it; empty if nothing
     * @param children its curves or terms
     */
    record Node(TermPath path, String title, String detail, boolean enabled, String problem, List<Node> children) {
        Node {
            children = List.copyOf(children);
        }
    }

    ModelsViewModel {
        models = List.copyOf(models);
    }

    static ModelsViewModel of(ModelDocument document) {
        Faults faults = Faults.of(document);
        List<Node> models = new ArrayList<>();
        for (int m = 0; m < document.models().size(); m++) {
            Model model = document.models().get(m);
            List<Node> curves = new ArrayList<>();
            for (int c = 0; c < model.curves().size(); c++) {
                curves.add(curve(model.curves().get(c), TermPath.curve(m, c), faults));
            }
            TermPath path = TermPath.model(m);
            models.add(new Node(path, model.name(), model.note(), true, faults.at(path.pointer()), curves));
        }
        return new ModelsViewModel(models);
    }

    private static Node curve(Curve curve, TermPath path, Faults faults) {
        List<Node> terms = new ArrayList<>();
        for (int t = 0; t < curve.terms().size(); t++) {
            Term term = curve.terms().get(t);
            TermPath at = new TermPath(path.model(), path.curve(), t);
            terms.add(new Node(
                    at, term.frame().name(), detail(term), term.frame().enabled(), faults.at(at.pointer()), List.of()));
        }
        String detail = terms.isEmpty() ? "no terms yet" : terms.size() == 1 ? "1 term" : terms.size() + " terms";
        return new Node(path, curve.name(), detail, true, faults.at(path.pointer()), terms);
    }

    /** A term in a few words: the family's name, the formula, or the size of the table. */
    static String detail(Term term) {
        if (term instanceof FamilyTerm family) {
            return FamilyCatalogue.find(family.family())
                    .map(PotentialFamily::displayName)
                    .orElse(family.family());
        }
        if (term instanceof FormulaTerm formula) {
            return formula.text().strip().replaceAll("\\s*\\R\\s*", "; ");
        }
        return "table of %d points".formatted(((TableTerm) term).knots().size());
    }

    /** The node of a path, or null. */
    Node node(TermPath path) {
        if (path.model() < 0 || path.model() >= models.size()) {
            return null;
        }
        Node node = models.get(path.model());
        for (int index : new int[] {path.curve(), path.term()}) {
            if (index >= node.children().size()) {
                return null;
            }
            if (index >= 0) {
                node = node.children().get(index);
            }
        }
        return node;
    }
}
