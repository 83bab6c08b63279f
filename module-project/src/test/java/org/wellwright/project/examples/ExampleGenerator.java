package org.wellwright.project.examples;

import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.openide.util.Lookup;
import org.wellwright.project.Project;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.solver.fit.FitRequest;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.service.FitService;
import org.wellwright.solver.units.ExactNumber;

/**
 * Makes the example projects: the values of a truth that is not among the candidates, with noise.
 *
 * <p>NAME.truth.wellwright holds the truth, NAME.template.wellwright the project with its data still without values.
 * Run it with the folder of the examples as its argument.
 */
public final class ExampleGenerator {
    /** Examples by name, with their seeds. */
    static final Map<String, Long> SEEDS = Map.of("alkali-ion", 41L, "diatomic", 77L, "heavy-quark-pair", 5L);

    private final FitService fits = Lookup.getDefault().lookup(FitService.class);

    /** Writes all examples into a folder. */
    public static void main(String[] arguments) throws IOException {
        for (Map.Entry<String, Long> example : SEEDS.entrySet()) {
            Project project = new ExampleGenerator().make(example.getKey(), example.getValue());
            Files.writeString(Path.of(arguments[0], example.getKey() + ProjectFile.ENDING), ProjectFile.text(project));
        }
    }

    /** A finished example. */
    Project make(String name, long seed) throws IOException {
        Project template = read(name + ".template.wellwright");
        ModelDocument measured = template.document().withData(data(name, seed));
        return template.withDocument(measured.withParameters(starts(measured, name.equals("diatomic") ? 5 : 3)));
    }

    /** The data with their values. */
    List<Datum> data(String name, long seed) throws IOException {
        ModelDocument template = read(name + ".template.wellwright").document();
        ModelDocument truth = read(name + ".truth.wellwright").document();
        ModelDocument complete = new ModelDocument(
                truth.constantsEdition(),
                truth.massTable(),
                truth.units(),
                truth.labels(),
                truth.weighting(),
                template.systems(),
                truth.parameters(),
                truth.models(),
                template.data(),
                template.groups());
        List<ResidualRow> rows =
                fits.compare(complete, SolveMonitor.NONE).models().get(0).rows();
        Random random = new Random(seed);
        Map<String, Double> shifts = new HashMap<>();
        for (DataGroup group : template.groups()) {
            shifts.put(group.id(), random.nextGaussian() * group.sigma().value());
        }
        List<Datum> data = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            Datum datum = template.data().get(i);
            double sigma = datum.sigmaPlus().value();
            double value = rows.get(i).predicted() + sigma * random.nextGaussian();
            for (String group : datum.groups()) {
                value += shifts.get(group);
            }
            data.add(datum.withValue(
                    rounded(value, sigma), datum.sigmaMinus(), datum.sigmaPlus(), datum.limit(), datum.unit()));
        }
        return data;
    }

    /** The best values of each model to a few digits, for a fit to start from. */
    private List<Parameter> starts(ModelDocument document, int digits) {
        Map<String, Parameter> fitted = new HashMap<>();
        for (Model model : document.models()) {
            FitResult fit = fits.fit(FitRequest.of(document, model.name()), SolveMonitor.NONE);
            for (Parameter parameter : fit.document().parameters()) {
                if (fit.parameters().stream().anyMatch(p -> p.parameter().equals(parameter.name()))) {
                    fitted.put(parameter.name(), parameter);
                }
            }
        }
        List<Parameter> starts = new ArrayList<>();
        for (Parameter parameter : document.parameters()) {
            starts.add(started(fitted.getOrDefault(parameter.name(), parameter), digits));
        }
        return starts;
    }

    private static Parameter started(Parameter parameter, int digits) {
        ParameterShape shape = parameter.shape();
        if (shape instanceof ParameterShape.Scalar scalar) {
            return parameter.withShape(new ParameterShape.Scalar(started(scalar.setting(), digits)));
        }
        if (shape instanceof ParameterShape.MassScaled scaled) {
            return parameter.withShape(new ParameterShape.MassScaled(
                    started(scaled.setting(), digits), scaled.reference(), scaled.exponent()));
        }
        if (shape instanceof ParameterShape.ByOrbital by) {
            return parameter.withShape(new ParameterShape.ByOrbital(
                    by.entries().stream()
                            .map(entry -> new ParameterShape.ByOrbital.Entry(
                                    entry.orbital(), started(entry.setting(), digits)))
                            .toList(),
                    by.others()));
        }
        return parameter;
    }

    private static Setting started(Setting setting, int digits) {
        if (!setting.free()) {
            return setting;
        }
        BigDecimal few = setting.value().decimal().round(new MathContext(digits, RoundingMode.HALF_EVEN));
        double value = few.doubleValue();
        boolean inside = (setting.lower() == null || value >= setting.lower().value())
                && (setting.upper() == null || value <= setting.upper().value());
        return inside ? setting.withValue(new ExactNumber(few.toPlainString())) : setting;
    }

    /** To the second digit of the uncertainty. */
    private static ExactNumber rounded(double value, double sigma) {
        BigDecimal two = new BigDecimal(sigma).round(new MathContext(2));
        int decimals = two.scale();
        return new ExactNumber(
                new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN).toPlainString());
    }

    private static Project read(String resource) throws IOException {
        try (InputStream in = ExampleGenerator.class.getResourceAsStream(resource)) {
            return ProjectFile.parse(in.readAllBytes(), resource).project();
        }
    }
}
