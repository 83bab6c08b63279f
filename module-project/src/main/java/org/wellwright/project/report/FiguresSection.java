package org.wellwright.project.report;

import java.awt.Font;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import org.openide.util.Lookup;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.FigureWriter;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.solver.Problem;

/** The figures that are installed, as pictures that need no other file, and the names of those that are missing. */
@ServiceProvider(service = ReportSection.class)
public final class FiguresSection implements ReportSection {
    private static final int WIDTH = 760;
    private static final int HEIGHT = 470;

    /** What an installation usually draws. */
    private static final Map<String, String> USUAL = usual();

    private static final Pattern IDENTIFIER = Pattern.compile("(\\bid=\"|url\\(#|href=\"#)([A-Za-z])");

    @Override
    public String id() {
        return "figures";
    }

    @Override
    public String title() {
        return "Figures";
    }

    @Override
    public int position() {
        return 700;
    }

    private static Map<String, String> usual() {
        Map<String, String> usual = new LinkedHashMap<>();
        usual.put("levels", "level diagram");
        usual.put("comparison", "residuals");
        usual.put("potential", "potentials");
        usual.put("radial", "radial functions");
        usual.put("density", "density");
        usual.put("spectrum", "line spectrum");
        return usual;
    }

    @Override
    public String html(ReportInput input) {
        List<FigureProvider> figures = new ArrayList<>(Lookup.getDefault().lookupAll(FigureProvider.class));
        figures.sort(Comparator.comparingInt(FigureProvider::position).thenComparing(FigureProvider::id));
        FigureWriter writer = Lookup.getDefault().lookup(FigureWriter.class);
        StringBuilder out = new StringBuilder();
        List<String> missing = new ArrayList<>();
        Map<String, String> absent = new LinkedHashMap<>(USUAL);
        String best = input.fits().isEmpty() ? "" : input.fits().get(0).model();
        for (FigureProvider figure : figures) {
            absent.remove(figure.id());
            FigureRequest request = new FigureRequest(
                    input.results(),
                    new FigureSelection(best, List.of(), 0),
                    "",
                    FigureRequest.Ground.LIGHT,
                    new Font(Font.SANS_SERIF, Font.PLAIN, 12));
            Optional<Problem> problem = figure.missing(request);
            if (problem.isPresent()) {
                missing.add(figure.title() + ": " + problem.get().sentence());
            } else if (writer != null) {
                out.append("<figure>\n")
                        .append(picture(figure, request, writer))
                        .append("<figcaption>")
                        .append(Html.text(figure.title()))
                        .append("</figcaption>\n</figure>\n");
            }
        }
        absent.values().forEach(title -> missing.add(title + ": the module that draws it is not installed"));
        for (String line : missing) {
            out.append("<p class=\"warn\">Missing figure, ")
                    .append(Html.text(line))
                    .append(".</p>\n");
        }
        return out.toString();
    }

    /** The picture as an SVG element; its identifiers are made its own, since several pictures share the page. */
    private static String picture(FigureProvider figure, FigureRequest request, FigureWriter writer) {
        try {
            byte[] bytes =
                    writer.bytes(figure, request, new FigureWriter.Sheet(FigureWriter.Format.SVG, WIDTH, HEIGHT, 96));
            String svg = new String(bytes, StandardCharsets.UTF_8);
            svg = svg.substring(svg.indexOf("<svg"));
            return IDENTIFIER.matcher(svg).replaceAll("$1" + figure.id() + "-$2") + "\n";
        } catch (IOException e) {
            throw new UncheckedIOException("a picture in memory cannot fail", e);
        }
    }
}
