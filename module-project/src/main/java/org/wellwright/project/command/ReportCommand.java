package org.wellwright.project.command;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.wellwright.project.FittedModel;
import org.wellwright.project.Project;
import org.wellwright.project.ReportInput;
import org.wellwright.project.file.ProjectFileException;
import org.wellwright.project.file.SafeFile;
import org.wellwright.project.report.Digits;
import org.wellwright.project.report.Report;
import org.wellwright.project.report.ReportBuilder;
import org.wellwright.project.report.Words;
import org.wellwright.solver.Problem;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.FittedParameter;
import org.wellwright.solver.fit.GroupError;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.radial.SolveMonitor;

/** {@code report}: fits every model, ranks them, and writes the page with its tables. */
final class ReportCommand implements Command {
    @Override
    public Syntax syntax() {
        return new Syntax(
                        "report",
                        "Fits every model, ranks them, and writes report.html with its figures and CSV files.",
                        "PROJECT")
                .option("output", "DIR", "folder for the files, made if it is not there (also -o DIR)");
    }

    @Override
    public int run(Input input, Console console) {
        Path folder = ProjectArgument.path(input.required("output", "DIR"));
        Path file = ProjectArgument.path(input);
        Project project = ProjectArgument.read(file);
        ProjectArgument.model(input, project, file);
        ReportInput report = new ReportBuilder(Services.solver(), Services.fit())
                .build(project, file.getFileName().toString(), SolveMonitor.NONE);
        Map<String, String> files = Report.files(report);
        make(folder);
        files.forEach(
                (name, text) -> SafeFile.replace(folder.resolve(name), text.getBytes(StandardCharsets.UTF_8), false));
        boolean whole = true;
        for (FittedModel model : report.fits()) {
            if (model.problem() != null && !project.document().data().isEmpty()) {
                whole = false;
                console.say("model '" + model.model() + "' was not fitted: "
                        + model.problem().sentence());
            }
        }
        console.print(summary(project, report, folder, files));
        return whole ? 0 : 1;
    }

    private static void make(Path folder) {
        try {
            Files.createDirectories(folder);
        } catch (IOException e) {
            throw new ProjectFileException(
                    new Problem(
                            "the folder cannot be made: " + SafeFile.reason(e),
                            folder.toString(),
                            "name another folder"),
                    e);
        }
    }

    /** The ranking and each model's parameters. */
    private static String summary(Project project, ReportInput report, Path folder, Map<String, String> files) {
        StringBuilder text = new StringBuilder();
        if (!project.title().isEmpty()) {
            text.append(project.title()).append("\n\n");
        }
        Comparison comparison = report.results().comparison();
        if (comparison != null) {
            TextTable ranking = new TextTable("rank", "model", "χ²", "ν", "χ²/ν", "χ² + 2k", "worst datum");
            for (ModelComparison model : comparison.models()) {
                ranking.row(List.of(
                        Integer.toString(model.rank()),
                        model.model(),
                        Digits.significant(model.quality().chiSquare(), 4),
                        Integer.toString(model.quality().degreesOfFreedom()),
                        Digits.significant(model.quality().reducedChiSquare(), 3),
                        Digits.significant(model.quality().criterion(), 4),
                        model.worstDatum()));
            }
            text.append(ranking).append('\n');
            TextTable parameters = new TextTable("model", "parameter", "value ± σ", "unit", "");
            report.fits().stream()
                    .filter(model -> model.fit() != null)
                    .forEach(model -> parameters(parameters, model.fit()));
            text.append(parameters).append('\n');
        }
        text.append("written to ")
                .append(folder)
                .append(": ")
                .append(String.join(", ", files.keySet()))
                .append('\n');
        return text.toString();
    }

    private static void parameters(TextTable table, FitResult fit) {
        for (FittedParameter parameter : fit.parameters()) {
            if (parameter.free()) {
                boolean held = parameter.bound() != FittedParameter.Bound.NONE;
                table.row(List.of(
                        fit.model(),
                        parameter.name(),
                        Digits.plusMinus(parameter.value(), parameter.sigma()),
                        parameter.unit(),
                        held ? Words.state(parameter) : ""));
            }
        }
        for (GroupError error : fit.groupErrors()) {
            table.row(List.of(
                    fit.model(),
                    "shift of " + error.group(),
                    Digits.plusMinus(error.value(), error.sigma()),
                    error.unit(),
                    ""));
        }
    }
}
