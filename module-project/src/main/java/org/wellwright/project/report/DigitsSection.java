package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.Problem;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.units.UnitSystem;

/** Where the digits come from: numerical bounds, completeness, constants. */
@ServiceProvider(service = ReportSection.class)
public final class DigitsSection implements ReportSection {
    @Override
    public String id() {
        return "digits";
    }

    @Override
    public String title() {
        return "Where the digits come from";
    }

    @Override
    public int position() {
        return 800;
    }

    @Override
    public String html(ReportInput input) {
        UnitSystem units = UnitSystem.named(input.project().document().units());
        List<List<String>> rows = new ArrayList<>();
        StringBuilder problems = new StringBuilder();
        for (SolvedModel model : input.results().models()) {
            int levels = 0;
            int doubtful = 0;
            double widest = 0;
            boolean estimates = false;
            for (SolvedChannel channel : model.channels()) {
                doubtful += channel.spectrum().completeness() == Completeness.NO ? 1 : 0;
                for (Level level : channel.spectrum().levels()) {
                    levels++;
                    widest = Math.max(widest, Math.max(level.upper() - level.energy(), level.energy() - level.lower()));
                    estimates |= level.boundKind() == Level.BoundKind.ESTIMATE;
                }
            }
            rows.add(List.of(
                    model.model(),
                    Integer.toString(model.channels().size()),
                    Integer.toString(levels),
                    levels == 0 ? "–" : Digits.significant(widest, 2),
                    estimates ? "some are estimates" : "two-sided",
                    doubtful == 0 ? "none missed" : "in doubt in " + doubtful));
            for (Problem problem : model.problems()) {
                problems.append("<p class=\"warn\">")
                        .append(Html.text(model.model() + ": " + problem.sentence()))
                        .append(".</p>\n");
            }
        }
        return "<p>Every energy is the Rayleigh quotient of a computed state of the radial equation. Its numerical bounds enclose the exact level of the model;"
                + " two independent methods count the levels of every channel. The table gives the largest of these bounds: they are far below every"
                + " uncertainty printed above, and no digit above is limited by them.</p>\n"
                + Html.table(
                        List.of(
                                "model",
                                "channels",
                                "levels",
                                "largest bound (" + units.energy().printed() + ")",
                                "kind",
                                "count"),
                        rows)
                + problems
                + "<p>Uncertainties of the parameters come from the least-squares fit: inverse normal matrix with exact derivatives of every level, shared errors"
                + " of the data groups solved along. They hold if the model does. Constants of nature and masses are those of the editions below; their own"
                + " uncertainties are not part of the σ above.</p>\n"
                + "<p>Printed values are rounded to the second significant digit of their uncertainty; the CSV files hold all digits.</p>\n";
    }
}
