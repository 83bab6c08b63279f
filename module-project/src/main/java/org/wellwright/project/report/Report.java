package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.openide.util.Lookup;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.project.ReportTable;

/** The report: one HTML page that needs no other file and no network, and CSV files with all digits. */
public final class Report {
    /** The page's file name. */
    public static final String PAGE = "report.html";

    private static final String CAUTION =
            "These are results of models. Before they are used where a mistake could hurt somebody, such as in planning work with lasers, ultraviolet or"
                    + " ionising radiation, shielding or dose, have them confirmed by a qualified person; local rules and licensed practice come first.";

    private Report() {}

    /** The files of a report by name: the page first, then the tables. */
    public static Map<String, String> files(ReportInput input) {
        List<ReportSection> sections = new ArrayList<>(Lookup.getDefault().lookupAll(ReportSection.class));
        sections.sort(Comparator.comparingInt(ReportSection::position).thenComparing(ReportSection::id));
        Map<String, String> files = new LinkedHashMap<>();
        files.put(PAGE, "");
        for (ReportSection section : sections) {
            for (ReportTable table : section.tables(input)) {
                files.put(table.file(), Csv.of(table.header(), table.rows()));
            }
        }
        files.put(PAGE, page(input, sections, List.copyOf(files.keySet())));
        return files;
    }

    private static String page(ReportInput input, List<ReportSection> sections, List<String> files) {
        String title = input.project().title().isEmpty()
                ? input.file()
                : input.project().title();
        StringBuilder body = new StringBuilder();
        StringBuilder contents = new StringBuilder();
        for (ReportSection section : sections) {
            String html = section.html(input);
            if (!html.isEmpty()) {
                contents.append("<li><a href=\"#")
                        .append(section.id())
                        .append("\">")
                        .append(Html.text(section.title()))
                        .append("</a></li>\n");
                body.append("<section id=\"")
                        .append(section.id())
                        .append("\">\n<h2>")
                        .append(Html.text(section.title()))
                        .append("</h2>\n");
                body.append(html).append("</section>\n");
            }
        }
        StringBuilder page =
                new StringBuilder("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n");
        page.append("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n");
        page.append("<title>")
                .append(Html.text(title))
                .append("</title>\n<style>\n")
                .append(STYLE)
                .append("</style>\n</head>\n<body>\n");
        page.append("<header>\n<h1>").append(Html.text(title)).append("</h1>\n");
        page.append(Html.paragraphs(input.project().notes()))
                .append("</header>\n<nav><ul>\n")
                .append(contents)
                .append("</ul></nav>\n");
        page.append("<main>\n")
                .append(body)
                .append("</main>\n<footer>\n<p>")
                .append(Html.text(CAUTION))
                .append("</p>\n<p>All digits: ");
        List<String> links = new ArrayList<>();
        for (String file : files.subList(1, files.size())) {
            links.add("<a href=\"" + Html.text(file) + "\">" + Html.text(file) + "</a>");
        }
        return page.append(String.join(", ", links))
                .append(".</p>\n</footer>\n</body>\n</html>\n")
                .toString();
    }

    private static final String STYLE = """
            :root { color-scheme: light; }
            body { margin: 0 auto; padding: 1.5rem; max-width: 62rem; font: 15px/1.5 system-ui, "Segoe UI", "DejaVu Sans", sans-serif; color: #1c2430; background: #fff; }
            h1 { font-size: 1.7rem; line-height: 1.25; margin: 0 0 .6rem; }
            h2 { font-size: 1.25rem; margin: 2rem 0 .6rem; padding-bottom: .2rem; border-bottom: 1px solid #c9d1da; }
            h3 { font-size: 1.05rem; margin: 1.4rem 0 .4rem; }
            header p { max-width: 48rem; color: #3b4654; }
            nav ul { display: flex; flex-wrap: wrap; gap: .2rem 1.2rem; list-style: none; padding: 0; margin: 1rem 0; }
            a { color: #14508c; }
            table { border-collapse: collapse; margin: .6rem 0 1rem; font-variant-numeric: tabular-nums; }
            caption { text-align: left; font-weight: 600; padding: .3rem 0; }
            th, td { padding: .22rem .7rem .22rem 0; text-align: left; vertical-align: top; border-bottom: 1px solid #e3e8ee; overflow-wrap: anywhere; }
            th { border-bottom: 1px solid #8b97a6; font-weight: 600; overflow-wrap: normal; }
            .n { text-align: right; white-space: nowrap; padding-left: .7rem; }
            .warn { border-left: 4px solid #b25e00; padding: .1rem .8rem; background: #fdf4e9; }
            figure { margin: 1rem 0 1.6rem; }
            figure svg { width: 100%; height: auto; max-width: 760px; display: block; }
            figcaption { color: #3b4654; font-size: .93rem; }
            footer { margin-top: 2.5rem; padding-top: .6rem; border-top: 1px solid #c9d1da; color: #3b4654; font-size: .93rem; }
            @page { margin: 16mm; }
            @media print {
              body { max-width: none; padding: 0; font-size: 10pt; }
              nav { display: none; }
              h2, h3, caption { break-after: avoid; }
              tr, figure, .warn { break-inside: avoid; }
              thead { display: table-header-group; }
              a { color: inherit; text-decoration: none; }
            }
            """;
}
