package org.wellwright.project.command;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.Project;
import org.wellwright.project.command.json.FitJson;
import org.wellwright.project.file.ProjectFileException;
import org.wellwright.project.report.Csv;
import org.wellwright.project.report.Digits;
import org.wellwright.project.report.Words;
import org.wellwright.solver.Problem;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.radial.SolveMonitor;

/** {@code compare}: all models of a project beside its data, best first. */
final class CompareCommand implements Command {
    @Override
    public Syntax syntax() {
        return new Syntax("compare", "All models beside the data at the values in the file, best first.", "PROJECT")
                .result("table|csv|json");
    }

    @Override
    public int run(Input input, Console console) {
        Input.Format format = input.format();
        Path file = ProjectArgument.path(input);
        Project project = ProjectArgument.read(file);
        ProjectArgument.model(input, project, file);
        if (project.document().data().isEmpty()) {
            throw new ProjectFileException(
                    new Problem("the project has no data to compare with", file.toString(), "add some under \"data\""));
        }
        Comparison comparison = Services.fit().compare(project.document(), SolveMonitor.NONE);
        for (ModelComparison model : comparison.models()) {
            for (Problem problem : model.problems()) {
                console.say("model '" + model.model() + "': " + problem.sentence());
            }
        }
        console.result(
                input,
                switch (format) {
                    case JSON -> FitJson.write(comparison, project.document());
                    case CSV -> csv(comparison, project);
                    case TABLE -> table(comparison, project);
                });
        return comparison.models().stream().allMatch(model -> model.problems().isEmpty()) ? 0 : 1;
    }

    private static String csv(Comparison comparison, Project project) {
        List<List<String>> rows = new ArrayList<>();
        for (ModelComparison model : comparison.models()) {
            for (ResidualRow row : model.rows()) {
                rows.add(List.of(
                        Integer.toString(model.rank()),
                        model.model(),
                        row.datum(),
                        Words.levels(project.document(), row.datum()),
                        Csv.number(row.measured()),
                        Csv.number(row.sigma()),
                        Csv.number(row.predicted()),
                        Csv.number(row.groupShift()),
                        Csv.number(row.residual()),
                        row.unit(),
                        row.used() ? "yes" : "no"));
            }
        }
        return Csv.of(
                List.of(
                        "rank",
                        "model",
                        "datum",
                        "levels",
                        "measured",
                        "sigma",
                        "calculated",
                        "groupShift",
                        "residual",
                        "unit",
                        "used"),
                rows);
    }

    private static String table(Comparison comparison, Project project) {
        StringBuilder text = new StringBuilder();
        text.append("uncertainties: ")
                .append(Words.weighting(comparison.mode()))
                .append("\n\n");
        TextTable ranking = new TextTable("rank", "model", "χ²", "ν", "χ²/ν", "χ² + 2k", "worst datum");
        for (ModelComparison model : comparison.models()) {
            ranking.row(List.of(
                    Integer.toString(model.rank()),
                    model.model(),
                    Digits.significant(model.quality().chiSquare(), 4),
                    Integer.toString(model.quality().degreesOfFreedom()),
                    Digits.significant(model.quality().reducedChiSquare(), 3),
                    Digits.significant(model.commonCriterion(), 4),
                    model.worstDatum()));
        }
        text.append(ranking).append('\n');
        List<String> header = new ArrayList<>(List.of("datum", "levels", "measured", "unit"));
        comparison.models().forEach(model -> header.add(model.model() + " (σ)"));
        TextTable residuals = new TextTable(header.toArray(new String[0]));
        for (int i = 0; i < project.document().data().size(); i++) {
            ResidualRow first = comparison.models().get(0).rows().get(i);
            List<String> cells = new ArrayList<>(List.of(
                    first.datum(),
                    Words.levels(project.document(), first.datum()),
                    Digits.of(first.measured(), first.sigma()),
                    first.unit()));
            for (ModelComparison model : comparison.models()) {
                cells.add(Digits.decimals(model.rows().get(i).residual(), 2));
            }
            residuals.row(cells);
        }
        return text.append(residuals).toString();
    }
}
