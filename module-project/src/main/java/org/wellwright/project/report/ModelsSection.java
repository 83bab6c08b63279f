package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermFrame;

/** The candidate models with their terms. */
@ServiceProvider(service = ReportSection.class)
public final class ModelsSection implements ReportSection {
    @Override
    public String id() {
        return "models";
    }

    @Override
    public String title() {
        return "Models";
    }

    @Override
    public int position() {
        return 200;
    }

    @Override
    public String html(ReportInput input) {
        StringBuilder out = new StringBuilder();
        for (Model model : input.project().document().models()) {
            out.append("<h3>").append(Html.text(model.name())).append("</h3>\n").append(Html.paragraphs(model.note()));
            for (Curve curve : model.curves()) {
                List<List<String>> rows = new ArrayList<>();
                for (Term term : curve.terms()) {
                    rows.add(List.of(term.frame().name(), shape(term), frame(term.frame())));
                }
                String caption = model.curves().size() == 1 ? "" : "curve " + curve.name();
                out.append(Html.table(caption, List.of("term", "V(r)", ""), rows));
                if (!curve.energyOrigin().equals(Argument.ZERO)) {
                    out.append("<p>Energy origin ")
                            .append(Html.text(argument(curve.energyOrigin())))
                            .append(".</p>\n");
                }
            }
        }
        return out.toString();
    }

    private static String shape(Term term) {
        if (term instanceof FormulaTerm formula) {
            return formula.text() + arguments(formula.arguments());
        }
        if (term instanceof FamilyTerm family) {
            return family.family() + arguments(family.arguments());
        }
        TableTerm table = (TableTerm) term;
        return "table of " + table.knots().size() + " points";
    }

    private static String arguments(Map<String, Argument> arguments) {
        List<String> texts = new ArrayList<>();
        arguments.forEach((name, value) -> texts.add(name + " = " + argument(value)));
        return texts.isEmpty() ? "" : " with " + String.join(", ", texts);
    }

    private static String frame(TermFrame frame) {
        List<String> texts = new ArrayList<>();
        if (!frame.enabled()) {
            texts.add("off");
        }
        if (!frame.scale().equals(Argument.ONE)) {
            texts.add("times " + argument(frame.scale()));
        }
        if (!frame.from().equals(Argument.ZERO) || !frame.to().equals(Argument.UNBOUNDED)) {
            texts.add("from " + argument(frame.from()) + " to " + argument(frame.to()));
        }
        int from = frame.channels().orbitalFrom();
        int to = frame.channels().orbitalTo();
        if (from > 0 || to < Integer.MAX_VALUE) {
            texts.add(
                    from == to ? "l = " + from : to == Integer.MAX_VALUE ? "l ≥ " + from : "l = " + from + " to " + to);
        }
        return String.join(", ", texts);
    }

    private static String argument(Argument argument) {
        if (argument instanceof Argument.Named named) {
            return named.parameter();
        }
        Argument.Literal literal = (Argument.Literal) argument;
        return (Digits.plain(literal.value()) + " " + literal.unit()).strip();
    }
}
