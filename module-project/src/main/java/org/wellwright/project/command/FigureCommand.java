package org.wellwright.project.command;

import java.awt.Font;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.openide.util.Lookup;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.FigureWriter;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectResults;
import org.wellwright.project.SolveScope;
import org.wellwright.project.file.ProjectFileException;
import org.wellwright.project.file.SafeFile;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.units.Names;

/** {@code figure}: one figure of a project as a file. */
final class FigureCommand implements Command {
    @Override
    public Syntax syntax() {
        return new Syntax("figure", "One figure of a project as PNG, SVG or PDF.", "PROJECT", "KIND")
                .option("model", "NAME", "model in front (without it the first)")
                .option("state", "N_R,L,M", "state in front: radial nodes, l, m")
                .option("variant", "NAME", "one of the figure's ways to draw")
                .option("size", "WxH", "width and height in 1/96 inch (without it 900x600)")
                .option("dpi", "N", "dots per inch of a PNG (without it 96)")
                .option("output", "FILE", "where to write: FILE.png, FILE.svg or FILE.pdf (also -o FILE)");
    }

    @Override
    public int run(Input input, Console console) {
        Path target = ProjectArgument.path(input.required("output", "FILE.svg"));
        FigureWriter.Sheet sheet = sheet(input, target);
        FigureProvider figure = figure(input.positionals().get(1));
        String variant = variant(input, figure);
        Path file = ProjectArgument.path(input);
        Project project = ProjectArgument.read(file);
        Model model = ProjectArgument.model(input, project, file);
        FigureSelection selection = selection(input, project.document(), model);
        SolveScope scope = selection.levels().isEmpty()
                ? SolveScope.USUAL
                : scope(selection.levels().get(0));
        FigureInput results = ProjectResults.of(project, scope, Services.solver(), Services.fit(), SolveMonitor.NONE);
        FigureRequest request = new FigureRequest(
                results, selection, variant, FigureRequest.Ground.LIGHT, new Font(Font.SANS_SERIF, Font.PLAIN, 12));
        FigureWriter writer = Lookup.getDefault().lookup(FigureWriter.class);
        try {
            writer.write(figure, request, sheet, target);
        } catch (IOException e) {
            throw new ProjectFileException(
                    new Problem(
                            "the figure cannot be written: " + SafeFile.reason(e),
                            target.toString(),
                            "check the folder"),
                    e);
        }
        return 0;
    }

    private static FigureProvider figure(String id) {
        List<FigureProvider> figures = new ArrayList<>(Lookup.getDefault().lookupAll(FigureProvider.class));
        figures.sort(Comparator.comparingInt(FigureProvider::position));
        if (figures.isEmpty()) {
            throw new InvalidModelException("no figure is installed", "", "put the viewer's module back");
        }
        for (FigureProvider figure : figures) {
            if (figure.id().equals(id)) {
                return figure;
            }
        }
        List<String> ids = figures.stream().map(FigureProvider::id).toList();
        throw new UsageException(
                "there is no figure '" + Names.shortened(id) + "'", "use one of " + String.join(", ", ids));
    }

    private static String variant(Input input, FigureProvider figure) {
        String wanted = input.value("variant");
        if (wanted == null) {
            return "";
        }
        List<String> ids =
                figure.variants().stream().map(FigureProvider.Variant::id).toList();
        if (!ids.contains(wanted)) {
            throw new UsageException(
                    "the figure has no variant '" + Names.shortened(wanted) + "'",
                    "use one of " + String.join(", ", ids));
        }
        return wanted;
    }

    private static FigureWriter.Sheet sheet(Input input, Path target) {
        String name = target.getFileName().toString().toLowerCase(Locale.ROOT);
        int dot = name.lastIndexOf('.');
        FigureWriter.Format format = switch (name.substring(dot + 1)) {
            case "png" -> FigureWriter.Format.PNG;
            case "svg" -> FigureWriter.Format.SVG;
            case "pdf" -> FigureWriter.Format.PDF;
            default ->
                throw new UsageException(
                        "'" + target + "' does not say what kind of file it is", "end it in .png, .svg or .pdf");
        };
        String size = input.value("size");
        int width = 900;
        int height = 600;
        if (size != null) {
            int times = size.indexOf('x');
            if (times < 0) {
                throw new UsageException(
                        "--size is '" + Names.shortened(size) + "'", "write width and height, such as 900x600");
            }
            width = Input.whole("--size", size.substring(0, times), 320, 20_000);
            height = Input.whole("--size", size.substring(times + 1), 200, 20_000);
        }
        String dpi = input.value("dpi");
        return new FigureWriter.Sheet(format, width, height, dpi == null ? 96 : Input.whole("--dpi", dpi, 24, 1200));
    }

    private static FigureSelection selection(Input input, ModelDocument document, Model model) {
        String state = input.value("state");
        if (state == null) {
            return new FigureSelection(model.name(), List.of(), 0);
        }
        String[] parts = state.split(",", -1);
        if (parts.length != 3) {
            throw new UsageException(
                    "--state is '" + Names.shortened(state) + "'", "write radial nodes, l and m, such as 1,2,0");
        }
        int nodes = Input.whole("--state", parts[0], 0, 10_000);
        int orbital = Input.whole("--state", parts[1], 0, 10_000);
        int magnetic = Input.whole("--state", parts[2], -orbital, orbital);
        String system = document.systems().stream()
                .map(pair -> pair.id())
                .filter(model::serves)
                .findFirst()
                .orElseThrow(() -> new InvalidModelException(
                        "the model serves no system", "model '" + model.name() + "'", "add one"));
        LevelKey key = new LevelKey(system, model.curves().get(0).name(), ChannelKey.ofOrbital(orbital), nodes);
        return new FigureSelection(model.name(), List.of(key), magnetic);
    }

    /** The channel of the state, deep enough to hold it. */
    private static SolveScope scope(LevelKey key) {
        return new SolveScope(List.of(key.channel().orbital()), key.index() + 1);
    }
}
