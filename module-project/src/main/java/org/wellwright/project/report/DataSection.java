package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.project.ReportTable;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelDocument;

/** What was measured. */
@ServiceProvider(service = ReportSection.class)
public final class DataSection implements ReportSection {
    @Override
    public String id() {
        return "data";
    }

    @Override
    public String title() {
        return "Measured data";
    }

    @Override
    public int position() {
        return 300;
    }

    @Override
    public String html(ReportInput input) {
        ModelDocument document = input.project().document();
        if (document.data().isEmpty()) {
            return "<p>There are no data.</p>\n";
        }
        List<List<String>> rows = new ArrayList<>();
        for (Datum datum : document.data()) {
            rows.add(List.of(
                    datum.id(),
                    Words.levels(document, datum.id()),
                    Words.transform(datum.transform()),
                    limit(datum) + datum.value().text(),
                    sigma(datum),
                    datum.unit(),
                    String.join(", ", datum.groups()),
                    datum.source(),
                    datum.used() ? datum.reason() : ("not used: " + datum.reason())));
        }
        StringBuilder out = new StringBuilder(Html.table(
                List.of("datum", "levels", "quantity", "value", "σ", "unit", "groups", "source", "remark"), rows));
        out.append("<p>Uncertainties: ")
                .append(Html.text(Words.weighting(document.weighting())))
                .append(".</p>\n");
        List<List<String>> groups = new ArrayList<>();
        for (DataGroup group : document.groups()) {
            String sigma = group.sigma() == null ? "" : group.sigma().text();
            groups.add(List.of(group.id(), group.title(), Words.hyphenated(group.kind()), sigma, group.unit()));
        }
        if (!groups.isEmpty()) {
            out.append(Html.table(List.of("group", "", "shared error", "σ", "unit"), groups));
        }
        return out.toString();
    }

    @Override
    public List<ReportTable> tables(ReportInput input) {
        ModelDocument document = input.project().document();
        List<List<String>> rows = new ArrayList<>();
        for (Datum datum : document.data()) {
            rows.add(List.of(
                    datum.id(),
                    Words.levels(document, datum.id()),
                    Words.hyphenated(datum.transform()),
                    datum.value().text(),
                    datum.sigmaMinus() == null ? "" : datum.sigmaMinus().text(),
                    datum.sigmaPlus() == null ? "" : datum.sigmaPlus().text(),
                    datum.unit(),
                    Words.hyphenated(datum.limit()),
                    String.join(";", datum.groups()),
                    datum.used() ? "yes" : "no",
                    datum.source()));
        }
        return List.of(new ReportTable(
                "data.csv",
                List.of(
                        "datum",
                        "levels",
                        "quantity",
                        "value",
                        "sigma-",
                        "sigma+",
                        "unit",
                        "limit",
                        "groups",
                        "used",
                        "source"),
                rows));
    }

    private static String limit(Datum datum) {
        return switch (datum.limit()) {
            case NONE -> "";
            case UPPER -> "≤ ";
            case LOWER -> "≥ ";
        };
    }

    private static String sigma(Datum datum) {
        if (datum.sigmaPlus() == null) {
            return "";
        }
        return datum.sigmaPlus().equals(datum.sigmaMinus())
                ? datum.sigmaPlus().text()
                : "+" + datum.sigmaPlus().text() + " −" + datum.sigmaMinus().text();
    }
}
