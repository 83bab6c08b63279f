package org.wellwright.editor.data;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import org.openide.DialogDescriptor;
import org.openide.DialogDisplayer;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.Grid;
import org.wellwright.editor.parts.GridColumn;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.editor.parts.Typing;
import org.wellwright.project.entry.DatumColumn;
import org.wellwright.project.entry.DatumTable;
import org.wellwright.project.entry.DelimitedText;
import org.wellwright.project.entry.TransformText;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.units.UnitExpression;

/**
 * Shows how rows of a file or of the clipboard will be read, lets faults be mended in place, and takes up the rows that
 * are sound.
 */
@Messages({
    "# {0} - file or clipboard",
    "TTL_Import=Import measured data from {0}",
    "LBL_ImportSeparator=Cells end at",
    "LBL_ImportQuantity=Quantity",
    "LBL_ImportUnit=Unit",
    "LBL_ImportSource=Source",
    "HEAD_ImportColumns=What the columns hold",
    "HEAD_ImportDefaults=For cells that are not there",
    "# {0} - column number",
    "# {1} - first cell",
    "LBL_ImportColumn={0}: {1}",
    "# {0} - sound rows",
    "# {1} - all rows",
    "MSG_ImportSome={0} of {1} rows can be taken up. Double-click a marked cell to mend it.",
    "# {0} - rows",
    "MSG_ImportAll=All {0} rows can be taken up.",
    "MSG_ImportNone=No row can be taken up yet.",
    "# {0} - rows",
    "BTN_Import=Take up {0} rows",
    "BTN_ImportNone=Take up",
    "BTN_ImportCancel=Cancel"
})
final class ImportDialog {
    private static final String[] SEPARATORS = {"tabs", "semicolons", "commas", "blanks"};

    private record Line(int index, List<String> cells, int faulty, String problem) {}

    private final ModelDocument document;
    private final ProblemLine line = new ProblemLine("import.message");
    private final JComboBox<String> separator = new JComboBox<>(SEPARATORS);
    private final JComboBox<String> quantity =
            new JComboBox<>(DataViewModel.quantities().toArray(new String[0]));
    private final JTextField unit = new JTextField(10);
    private final JTextField source = new JTextField(10);
    private final Form columnsForm = new Form();
    private final JPanel preview = new JPanel(new BorderLayout());
    private final JButton accept = new JButton(Bundle.BTN_ImportNone());
    private final String text;
    private DelimitedText table;
    private List<DatumColumn> columns;
    private List<List<String>> cells = new ArrayList<>();
    private List<DatumTable.Outcome> outcomes = List.of();
    private Grid<Line> grid;
    private boolean filling;

    private ImportDialog(String text, DatumTable.Defaults defaults, ModelDocument document) {
        this.text = text;
        this.document = document;
        this.table = DelimitedText.parse(text);
        quantity.setSelectedItem(TransformText.title(defaults.transform()));
        unit.setText(defaults.unit());
        source.setText(defaults.source());
    }

    /** Asks; the data to add, empty if the user thinks better of it. */
    static List<Datum> ask(String text, String origin, DatumTable.Defaults defaults, ModelDocument document) {
        return new ImportDialog(text, defaults, document).ask(origin);
    }

    private List<Datum> ask(String origin) {
        Form left = new Form();
        separator.setName("import.separator");
        quantity.setName("import.quantity");
        unit.setName("import.unit");
        source.setName("import.source");
        left.field(Bundle.LBL_ImportSeparator(), separator);
        left.heading(Bundle.HEAD_ImportDefaults());
        left.field(Bundle.LBL_ImportQuantity(), quantity);
        left.field(Bundle.LBL_ImportUnit(), unit);
        left.field(Bundle.LBL_ImportSource(), source);
        left.heading(Bundle.HEAD_ImportColumns());
        columnsForm.setBorder(BorderFactory.createEmptyBorder());
        left.wide(columnsForm);
        left.end();
        JScrollPane leftScroll = new JScrollPane(left);
        leftScroll.setPreferredSize(new Dimension(330, 400));
        leftScroll.setBorder(BorderFactory.createEmptyBorder());
        preview.setPreferredSize(new Dimension(560, 400));
        JPanel panel = new JPanel(new BorderLayout(8, 4));
        panel.setBorder(BorderFactory.createEmptyBorder(8, 8, 0, 8));
        panel.add(leftScroll, BorderLayout.LINE_START);
        panel.add(preview, BorderLayout.CENTER);
        panel.add(line, BorderLayout.SOUTH);
        separator.addActionListener(event -> {
            if (!filling) {
                split(DelimitedText.parse(text, DelimitedText.SEPARATORS.get(separator.getSelectedIndex())));
            }
        });
        quantity.addActionListener(event -> {
            String usual = TransformText.usualUnit(TransformText.parse((String) quantity.getSelectedItem()));
            if (!usual.isEmpty()) {
                unit.setText(usual);
            }
            read();
        });
        unit.getDocument().addDocumentListener(new Typing(this::read));
        source.getDocument().addDocumentListener(new Typing(this::read));
        split(table);
        accept.setName("import.accept");
        JButton cancel = new JButton(Bundle.BTN_ImportCancel());
        cancel.setName("import.cancel");
        DialogDescriptor dialog = new DialogDescriptor(
                panel,
                Bundle.TTL_Import(origin),
                true,
                new Object[] {accept, cancel},
                accept,
                DialogDescriptor.DEFAULT_ALIGN,
                null,
                null);
        if (DialogDisplayer.getDefault().notify(dialog) != accept) {
            return List.of();
        }
        if (grid != null && grid.isEditing()) {
            grid.getCellEditor().stopCellEditing();
        }
        return outcomes.stream()
                .map(DatumTable.Outcome::datum)
                .filter(datum -> datum != null)
                .toList();
    }

    private void split(DelimitedText split) {
        filling = true;
        table = split;
        separator.setSelectedIndex(DelimitedText.SEPARATORS.indexOf(split.separator()));
        columns = new ArrayList<>(DatumTable.guess(split));
        while (columns.size() < split.columns()) {
            columns.add(DatumColumn.NONE);
        }
        cells = new ArrayList<>();
        for (DelimitedText.Row row : split.rows()) {
            List<String> own = new ArrayList<>(row.cells());
            while (own.size() < split.columns()) {
                own.add("");
            }
            cells.add(own);
        }
        columnsForm.clear();
        for (int i = 0; i < columns.size(); i++) {
            int column = i;
            JComboBox<DatumColumn> box = new JComboBox<>(DatumColumn.values());
            box.setRenderer(new javax.swing.DefaultListCellRenderer() {
                private static final long serialVersionUID = 1L;

                @Override
                public java.awt.Component getListCellRendererComponent(
                        javax.swing.JList<?> list, Object value, int index, boolean selected, boolean focused) {
                    String title = value == DatumColumn.NONE ? "(not used)" : ((DatumColumn) value).title();
                    return super.getListCellRendererComponent(list, title, index, selected, focused);
                }
            });
            box.setSelectedItem(columns.get(i));
            box.setName("import.column." + (i + 1));
            box.addActionListener(event -> {
                columns.set(column, (DatumColumn) box.getSelectedItem());
                makeGrid();
                read();
            });
            String first = cells.isEmpty() ? "" : cells.get(0).get(i);
            columnsForm.field(
                    Bundle.LBL_ImportColumn(i + 1, first.length() > 16 ? first.substring(0, 15) + "…" : first), box);
        }
        columnsForm.revalidate();
        filling = false;
        makeGrid();
        read();
    }

    private void makeGrid() {
        List<GridColumn<Line>> shown = new ArrayList<>();
        for (int i = 0; i < columns.size(); i++) {
            int column = i;
            String title = columns.get(i) == DatumColumn.NONE
                    ? "(not used)"
                    : columns.get(i).title();
            shown.add(GridColumn.<Line>typed(
                            title,
                            "Double-click to change a cell",
                            GridColumn.Kind.TEXT,
                            "00000000000000",
                            row -> row.cells().get(column),
                            (row, typed) -> mend(row, column, typed))
                    .withProblem(row -> row.faulty() == column
                                    || row.faulty() < 0 && !row.problem().isEmpty() && column == 0
                            ? row.problem()
                            : ""));
        }
        grid = new Grid<>("import.table", "Preview", shown, line);
        preview.removeAll();
        preview.add(new JScrollPane(grid), BorderLayout.CENTER);
        preview.revalidate();
    }

    private Optional<Problem> mend(Line row, int column, String typed) {
        cells.get(row.index()).set(column, typed.strip());
        javax.swing.SwingUtilities.invokeLater(this::read);
        return Optional.empty();
    }

    private void read() {
        if (filling) {
            return;
        }
        Optional<Problem> fault = Entry.attempt(() -> UnitExpression.parse(unit.getText()));
        unit.putClientProperty("JComponent.outline", fault.isPresent() ? "error" : null);
        List<DelimitedText.Row> rows = new ArrayList<>();
        for (int i = 0; i < cells.size(); i++) {
            rows.add(new DelimitedText.Row(table.rows().get(i).line(), cells.get(i)));
        }
        Transform transform = TransformText.parse((String) quantity.getSelectedItem());
        DatumTable reader = new DatumTable(
                columns,
                new DatumTable.Defaults(
                        transform,
                        fault.isPresent() ? "" : unit.getText(),
                        List.of(),
                        source.getText().strip()));
        outcomes = reader.read(new DelimitedText(table.separator(), rows), document);
        List<Line> lines = new ArrayList<>();
        int first = cells.size() - outcomes.size();
        for (int i = 0; i < outcomes.size(); i++) {
            DatumTable.Outcome outcome = outcomes.get(i);
            String problem = outcome.problem() == null ? "" : outcome.problem().sentence();
            lines.add(new Line(first + i, List.copyOf(cells.get(first + i)), outcome.column(), problem));
        }
        grid.setRows(lines);
        long sound =
                outcomes.stream().filter(outcome -> outcome.datum() != null).count();
        String message = sound == 0
                ? Bundle.MSG_ImportNone()
                : sound == outcomes.size()
                        ? Bundle.MSG_ImportAll(sound)
                        : Bundle.MSG_ImportSome(sound, outcomes.size());
        Optional<String> why = outcomes.stream()
                .filter(outcome -> outcome.problem() != null)
                .map(outcome -> outcome.problem().sentence())
                .findFirst();
        line.setHint(message);
        if (fault.isPresent()) {
            line.say(fault);
        } else {
            line.say(why.map(sentence -> new Problem(message + " First fault: " + sentence, "", "")));
        }
        accept.setEnabled(sound > 0);
        accept.setText(sound > 0 ? Bundle.BTN_Import(sound) : Bundle.BTN_ImportNone());
    }
}
