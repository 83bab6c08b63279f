package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FittedModel;
import org.wellwright.project.Project;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;

/** What is needed to make every number again. */
@ServiceProvider(service = ReportSection.class)
public final class ReproducibilitySection implements ReportSection {
    @Override
    public String id() {
        return "reproducibility";
    }

    @Override
    public String title() {
        return "To make it again";
    }

    @Override
    public int position() {
        return 900;
    }

    @Override
    public String html(ReportInput input) {
        Project project = input.project();
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("command", "wellwright-batch report " + quoted(input.file()) + " -o DIR"));
        rows.add(List.of("project", input.file()));
        rows.add(List.of("digest of the project", project.digest()));
        for (FittedModel model : input.fits()) {
            if (model.fit() != null) {
                rows.add(List.of(
                        "digest with the fit of " + model.model(),
                        project.withDocument(model.fit().document()).digest()));
            }
        }
        rows.add(List.of("constants", project.document().constantsEdition()));
        rows.add(List.of("mass table", project.document().massTable()));
        rows.add(List.of("program", "Wellwright " + input.origin().program()));
        rows.add(List.of("solver", input.origin().solver()));
        rows.add(List.of("platform", input.origin().platform()));
        rows.add(List.of("made", input.origin().time()));
        return Html.table(List.of("", ""), rows)
                + "<p>Digests are SHA-256 over everything that determines levels, comparison and fit; notes and the state of windows are not part of them.</p>\n";
    }

    private static String quoted(String file) {
        return file.indexOf(' ') < 0 ? file : "'" + file + "'";
    }
}
