package org.wellwright.project.command;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.Project;
import org.wellwright.project.command.json.FitJson;
import org.wellwright.project.command.json.FitRecord;
import org.wellwright.project.file.ProjectLock;
import org.wellwright.project.report.Csv;
import org.wellwright.project.report.Digits;
import org.wellwright.project.report.Words;
import org.wellwright.project.run.RunHistory;
import org.wellwright.solver.Problem;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.fit.FitRequest;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.FittedParameter;
import org.wellwright.solver.fit.GroupError;
import org.wellwright.solver.fit.ModelErrorEstimate;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.radial.SolveMonitor;

/** {@code fit}: the free parameters of a model from the data. */
final class FitCommand implements Command {
    @Override
    public Syntax syntax() {
        return new Syntax("fit", "Fits the free parameters of a model to the data.", "PROJECT")
                .option("model", "NAME", "which model (without it the first)")
                .flag("write", "put the fitted values into the project and the run into its history")
                .result("table|csv|json");
    }

    @Override
    public int run(Input input, Console console) {
        Input.Format format = input.format();
        Path file = ProjectArgument.path(input);
        if (!input.has("write")) {
            Project project = ProjectArgument.read(file);
            print(input, format, fit(input, file, project, console), project, console);
            return 0;
        }
        try (ProjectLock lock = ProjectLock.take(file)) {
            Project project = ProjectArgument.read(file);
            FitResult fit = fit(input, file, project, console);
            lock.save(project.withDocument(fit.document()));
            RunHistory.of(file)
                    .add(FitRecord.of(
                            file, project.digest(), fit, Services.solver().version()));
            print(input, format, fit, project, console);
        }
        return 0;
    }

    private static FitResult fit(Input input, Path file, Project project, Console console) {
        String model = ProjectArgument.model(input, project, file).name();
        FitResult fit = Services.fit().fit(FitRequest.of(project.document(), model), SolveMonitor.NONE);
        fit.remarks().forEach(remark -> console.say(remark.sentence()));
        if (!fit.converged()) {
            throw new SolverException(
                    "the fit of '" + model + "' did not converge in " + fit.iterations() + " steps",
                    file.toString(),
                    "start from better values, or fix a parameter that the data do not determine");
        }
        return fit;
    }

    private static void print(Input input, Input.Format format, FitResult fit, Project project, Console console) {
        console.result(
                input,
                switch (format) {
                    case JSON -> FitJson.write(fit);
                    case CSV -> csv(fit);
                    case TABLE -> table(fit, project);
                });
    }

    private static String csv(FitResult fit) {
        List<List<String>> rows = new ArrayList<>();
        for (FittedParameter parameter : fit.parameters()) {
            rows.add(List.of(
                    parameter.name(),
                    Csv.number(parameter.value()),
                    Csv.number(parameter.sigma()),
                    parameter.unit(),
                    parameter.free() ? "yes" : "no"));
        }
        for (GroupError error : fit.groupErrors()) {
            rows.add(List.of(
                    "group " + error.group(),
                    Csv.number(error.value()),
                    Csv.number(error.sigma()),
                    error.unit(),
                    "yes"));
        }
        return Csv.of(List.of("name", "value", "sigma", "unit", "free"), rows);
    }

    private static String table(FitResult fit, Project project) {
        StringBuilder text = new StringBuilder("model ").append(fit.model()).append("\n\n");
        TextTable parameters = new TextTable("parameter", "value ± σ", "unit", "");
        for (FittedParameter parameter : fit.parameters()) {
            parameters.row(List.of(
                    parameter.name(),
                    parameter.free()
                            ? Digits.plusMinus(parameter.value(), parameter.sigma())
                            : Digits.plain(parameter.value()),
                    parameter.unit(),
                    Words.state(parameter)));
        }
        for (GroupError error : fit.groupErrors()) {
            parameters.row(List.of(
                    "shift of " + error.group(),
                    Digits.plusMinus(error.value(), error.sigma()),
                    error.unit(),
                    "group"));
        }
        for (ModelErrorEstimate error : fit.modelErrors()) {
            String of = error.group().isEmpty() ? "" : " of " + error.group();
            parameters.row(List.of(
                    "σ_mod" + of,
                    Digits.significant(error.value(), 2),
                    error.unit(),
                    error.fitted() ? "fitted" : "fixed"));
        }
        text.append(parameters).append('\n').append(Words.quality(fit)).append("\n\n");
        TextTable residuals = new TextTable("datum", "levels", "measured", "calculated", "residual (σ)", "unit", "");
        for (ResidualRow row : fit.rows()) {
            Problem problem = row.problem();
            residuals.row(List.of(
                    row.datum(),
                    Words.levels(project.document(), row.datum()),
                    Digits.of(row.measured(), row.sigma()),
                    Digits.of(row.predicted() + row.groupShift(), row.sigma()),
                    Digits.decimals(row.residual(), 2),
                    row.unit(),
                    problem != null ? problem.what() : row.used() ? "" : "not used"));
        }
        return text.append(residuals).toString();
    }
}
