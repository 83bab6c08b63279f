package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FittedModel;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.Problem;
import org.wellwright.solver.fit.Prediction;
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

    /** How the numerical bounds compare with the uncertainties that the fits leave. */
    private static String numericalShare(ReportInput input) {
        double largest = 0;
        for (FittedModel model : input.fits()) {
            if (model.fit() == null) {
                continue;
            }
            for (Prediction prediction : model.fit().predictions()) {
                double share = prediction.numericalHalfWidth() / prediction.parameterSigma();
                // A level that no free parameter moves has no uncertainty of that kind.
                if (prediction.parameterSigma() > 0 && share > largest) {
                    largest = share;
                }
            }
        }
        if (largest == 0) {
            return "";
        }
        String share = Digits.significant(largest, 2);
        return largest < 0.1
                ? "<p>The numerical bounds are at most " + share
                        + " of the uncertainty that the parameters leave in a predicted level.</p>\n"
                : "<p class=\"warn\">The numerical bounds reach " + share
                        + " of the uncertainty that the parameters leave in a predicted level: numerics limit some digits above.</p>\n";
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
        return "<p>Every energy is the Rayleigh quotient of a computed state of the radial equation. Its numerical bounds enclose the exact level of the model."
                + " The table gives the largest of these bounds, and whether two independent methods count the same levels in every channel.</p>\n"
                + Html.table(
                        List.of(
                                "model",
                                "channels",
                                "levels",
                                "largest bound (" + units.energy().printed() + ")",
                                "kind",
                                "count"),
                        rows)
                + numericalShare(input)
                + problems
                + "<p>Uncertainties of the parameters come from the least-squares fit: inverse normal matrix with exact derivatives of every level, shared errors"
                + " of the data groups solved along. They hold if the model does. Constants of nature and masses are those of the editions below; their own"
                + " uncertainties are not part of the σ above.</p>\n"
                + "<p>Printed values are rounded to the second significant digit of their uncertainty; the CSV files hold all digits.</p>\n";
    }
}
