package org.wellwright.editor.data;

import java.awt.BorderLayout;
import java.io.File;
import java.io.IOException;
import java.nio.charset.MalformedInputException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.SwingUtilities;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.filesystems.FileChooserBuilder;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;
import org.wellwright.editor.data.DataViewModel.Row;
import org.wellwright.editor.parts.Glyph;
import org.wellwright.editor.parts.Grid;
import org.wellwright.editor.parts.GridColumn;
import org.wellwright.editor.parts.GridColumn.Kind;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.editor.parts.ToolStrip;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.entry.DatumTable;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Weighting;

/** The measured data of the selected project in a table; the last row waits to be filled. */
@TopComponent.Description(preferredID = DataTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "wellwright-tables", openAtStartup = true, position = 200)
@TopComponent.OpenActionRegistration(displayName = "#CTL_DataWindow", preferredID = DataTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.editor.data.DataTopComponent")
@ActionReference(path = "Menu/Window", position = 130)
@Messages({
    "CTL_DataWindow=Measured data",
    "HINT_DataWindow=What was measured, with its uncertainties; paste from a spreadsheet or import a file",
    "MSG_DataMissing=No project is open",
    "MSG_DataRemedy=Open or create a project from the File menu; its measured values are listed here.",
    "HINT_DataEmpty=No values yet: type into the row above, paste rows from a spreadsheet (Ctrl+V), or import a file.",
    "LBL_DatumAdd=Add a value",
    "LBL_DatumDuplicate=Duplicate the selected values",
    "LBL_DatumRemove=Remove the selected values",
    "LBL_DatumUp=Move up",
    "LBL_DatumDown=Move down",
    "LBL_DataImport=Import…",
    "HINT_DataImport=Read values from a text file, with a preview",
    "LBL_DataGroups=Groups…",
    "HINT_DataGroups=Data that share an error, as a calibration offset",
    "LBL_DataUse=Use the selected values",
    "LBL_DataLeave=Leave the selected values out",
    "LBL_Weighting=Uncertainties:",
    "HINT_Weighting=What the stated uncertainties mean in fits and comparisons",
    "LBL_WeightingKnown=as stated",
    "LBL_WeightingScale=up to one common factor",
    "LBL_WeightingMissing=not known",
    "# {0} - file name",
    "MSG_ImportUnreadable=the file {0} cannot be read as text",
    "# {0} - number",
    "LBL_Pasted=Paste {0} values",
    "# {0} - number",
    "LBL_Imported=Import {0} values",
    "LBL_Clipboard=the clipboard",
    "TTL_ImportFile=Import measured data",
    "BTN_ImportFile=Show"
})
public final class DataTopComponent extends SessionWindow {
    static final String ID = "DataTopComponent";
    private static final long serialVersionUID = 1L;
    private static final long LARGEST_IMPORT = 16L << 20;

    private final ProblemLine line = new ProblemLine("data.message");
    private final JButton duplicate;
    private final JButton remove;
    private final JButton up;
    private final JButton down;
    private final JComboBox<String> weighting = new JComboBox<>(
            new String[] {Bundle.LBL_WeightingKnown(), Bundle.LBL_WeightingScale(), Bundle.LBL_WeightingMissing()});
    private final transient Grid<Row> grid;
    private transient DataController controller;
    private transient ModelDocument shown;
    private transient Row shownDraft;
    private boolean filling;

    /** Made by the window system. */
    public DataTopComponent() {
        setName(Bundle.CTL_DataWindow());
        setDisplayName(Bundle.CTL_DataWindow());
        setToolTipText(Bundle.HINT_DataWindow());
        grid = new Grid<>("data.table", Bundle.CTL_DataWindow(), columns(), line);
        ToolStrip tools = new ToolStrip("data");
        tools.icon(
                "add",
                Glyph.ADD,
                Bundle.LBL_DatumAdd(),
                () -> grid.startTyping(grid.rows().size() - 1, 1));
        duplicate = tools.icon("duplicate", Glyph.DUPLICATE, Bundle.LBL_DatumDuplicate(), this::duplicate);
        remove = tools.icon("remove", Glyph.REMOVE, Bundle.LBL_DatumRemove(), this::remove);
        up = tools.icon("up", Glyph.UP, Bundle.LBL_DatumUp(), () -> move(-1));
        down = tools.icon("down", Glyph.DOWN, Bundle.LBL_DatumDown(), () -> move(1));
        tools.addSeparator();
        tools.text("import", Glyph.IMPORT, Bundle.LBL_DataImport(), Bundle.HINT_DataImport(), this::importFile);
        tools.text("groups", null, Bundle.LBL_DataGroups(), Bundle.HINT_DataGroups(), this::groups);
        tools.addSeparator();
        weighting.setName("data.weighting");
        weighting.setToolTipText(Bundle.HINT_Weighting());
        weighting.setMaximumSize(weighting.getPreferredSize());
        weighting.addActionListener(event -> {
            if (!filling) {
                controller.setWeighting(Weighting.values()[weighting.getSelectedIndex()]);
            }
        });
        JLabel label = new JLabel(Bundle.LBL_Weighting() + " ");
        label.setLabelFor(weighting);
        tools.add(label);
        tools.add(weighting);
        grid.onPaste(this::paste);
        grid.onMenu(Bundle.LBL_DataUse(), null, () -> controller.setUsed(selectedRows(), true));
        grid.onMenu(Bundle.LBL_DataLeave(), null, () -> controller.setUsed(selectedRows(), false));
        grid.onMenu(
                Bundle.LBL_DatumAdd(),
                "INSERT",
                () -> grid.startTyping(grid.rows().size() - 1, 1));
        grid.onMenu(Bundle.LBL_DatumRemove(), "DELETE", this::remove);
        grid.getSelectionModel().addListSelectionListener(event -> followSelection());
        JPanel content = new JPanel(new BorderLayout());
        content.add(tools, BorderLayout.NORTH);
        content.add(new JScrollPane(grid), BorderLayout.CENTER);
        line.setBorder(BorderFactory.createEmptyBorder(2, 8, 4, 8));
        content.add(line, BorderLayout.SOUTH);
        install(content, new EmptyState(Bundle.MSG_DataMissing(), Bundle.MSG_DataRemedy()));
        followSelection();
    }

    private List<GridColumn<Row>> columns() {
        return List.of(
                typed(
                                "Use",
                                "Whether it counts",
                                Kind.CHECK,
                                "Use",
                                Row::used,
                                (row, text) -> controller.setUsed(row, text))
                        .where(row -> !row.draft()),
                typed(
                                "Levels",
                                "A level, or a combination: 3p - 3s, 3p → 3s, 1/3 * 2p1/2 + 2/3 * 2p3/2 - 1s",
                                Kind.TEXT,
                                "v=1 J=12 - v=0 J=11 00",
                                Row::levels,
                                (row, text) -> controller.setLevels(row, text))
                        .withProblem(Row::levelProblem),
                typed(
                                "Quantity",
                                "What was measured",
                                Kind.OPEN_CHOICE,
                                "vacuum wavelength",
                                Row::quantity,
                                (row, text) -> controller.setQuantity(row, text))
                        .withChoices(row -> DataViewModel.quantities()),
                typed(
                                "Value",
                                "With its uncertainty: 1.23456(12), 1.23456 ± 0.00012, 1.2 +0.3 -0.2, or < 1.2 for a limit",
                                Kind.NUMBER,
                                "16956.17025(123)",
                                Row::value,
                                (row, text) -> controller.setValue(row, text))
                        .withProblem(Row::valueProblem),
                typed(
                                "Unit",
                                "The unit of the value",
                                Kind.TEXT,
                                "GeV/c^2",
                                Row::unit,
                                (row, text) -> controller.setUnit(row, text))
                        .withProblem(Row::unitProblem),
                typed(
                                "Groups",
                                "Groups that share an error",
                                Kind.OPEN_CHOICE,
                                "calibration",
                                Row::groups,
                                (row, text) -> controller.setGroups(row, text))
                        .withProblem(Row::groupProblem)
                        .withChoices(row -> {
                            List<String> ids = new ArrayList<>(List.of(""));
                            controller.document().groups().stream()
                                    .map(DataGroup::id)
                                    .forEach(ids::add);
                            return ids;
                        }),
                typed(
                        "Source",
                        "Where it comes from",
                        Kind.TEXT,
                        "laboratory book 12",
                        Row::source,
                        (row, text) -> controller.setSource(row, text)),
                typed(
                                "Remark",
                                "A remark, or why it does not count",
                                Kind.TEXT,
                                "a remark of some length",
                                Row::remark,
                                (row, text) -> controller.setRemark(row, text))
                        .where(row -> !row.draft()),
                typed(
                                "Id",
                                "How results refer to it",
                                Kind.TEXT,
                                "d123",
                                Row::id,
                                (row, text) -> controller.setId(row, text))
                        .where(row -> !row.draft()));
    }

    private GridColumn<Row> typed(
            String title,
            String hint,
            Kind kind,
            String sample,
            Function<Row, String> text,
            BiFunction<Row, String, Optional<Problem>> take) {
        return GridColumn.typed(title, hint, kind, sample, text, (row, typed) -> {
            Optional<Problem> problem = take.apply(row, typed);
            if (row.draft()) {
                // The row that is being filled is no part of the project, so nothing else tells of its change.
                SwingUtilities.invokeLater(() -> show(session()));
            }
            return problem;
        });
    }

    @Override
    protected void selected(ProjectSession selected) {
        controller = selected == null ? null : new DataController(selected);
        shown = null;
        grid.clearSelection();
    }

    @Override
    protected void show(ProjectSession selected) {
        ModelDocument document = selected.project().document();
        if (document.equals(shown) && controller.draft().equals(shownDraft)) {
            return;
        }
        shown = document;
        shownDraft = controller.draft();
        DataViewModel model = DataViewModel.of(document, shownDraft);
        grid.setRows(model.rows());
        line.setHint(document.data().isEmpty() ? Bundle.HINT_DataEmpty() : model.summary());
        filling = true;
        weighting.setSelectedIndex(document.weighting().ordinal());
        filling = false;
        followSelection();
    }

    private void followSelection() {
        List<Integer> rows = values();
        duplicate.setEnabled(!rows.isEmpty());
        remove.setEnabled(!rows.isEmpty());
        up.setEnabled(rows.size() == 1 && rows.get(0) > 0);
        down.setEnabled(rows.size() == 1 && rows.get(0) < grid.rows().size() - 2);
    }

    /** The selected rows that hold values. */
    private List<Integer> values() {
        return grid.selection().stream()
                .filter(row -> !grid.rows().get(row).draft())
                .toList();
    }

    private List<Row> selectedRows() {
        return values().stream().map(row -> grid.rows().get(row)).toList();
    }

    private void duplicate() {
        controller.duplicate(values());
        show(session());
    }

    private void remove() {
        if (!values().isEmpty()) {
            controller.remove(values());
            show(session());
        }
    }

    private void move(int by) {
        int row = controller.move(values().get(0), by);
        show(session());
        grid.select(row);
    }

    private void paste(String text) {
        List<DatumTable.Outcome> outcomes = controller.read(text);
        boolean sound = !outcomes.isEmpty() && outcomes.stream().allMatch(outcome -> outcome.datum() != null);
        List<Datum> data = sound
                ? outcomes.stream().map(DatumTable.Outcome::datum).toList()
                : ImportDialog.ask(text, Bundle.LBL_Clipboard(), controller.defaults(), controller.document());
        add(data, Bundle.LBL_Pasted(data.size()));
    }

    private void add(List<Datum> data, String label) {
        if (data.isEmpty()) {
            return;
        }
        List<Integer> rows = values();
        int after = rows.isEmpty() ? -1 : rows.get(rows.size() - 1);
        int first = after < 0 ? shown.data().size() : after + 1;
        controller.add(data, after, label);
        show(session());
        grid.setRowSelectionInterval(first, first + data.size() - 1);
        grid.scrollRectToVisible(grid.getCellRect(first + data.size() - 1, 0, true));
    }

    private void importFile() {
        File file = new FileChooserBuilder(DataTopComponent.class)
                .setTitle(Bundle.TTL_ImportFile())
                .setApproveText(Bundle.BTN_ImportFile())
                .setFilesOnly(true)
                .showOpenDialog();
        if (file != null) {
            importFrom(file);
        }
    }

    private void importFrom(File file) {
        try {
            if (file.length() > LARGEST_IMPORT) {
                throw new MalformedInputException(0);
            }
            String text = Files.readString(file.toPath(), StandardCharsets.UTF_8);
            List<Datum> data = ImportDialog.ask(text, file.getName(), controller.defaults(), controller.document());
            add(data, Bundle.LBL_Imported(data.size()));
        } catch (IOException e) {
            line.say(Optional.of(new Problem(
                    Bundle.MSG_ImportUnreadable(file.getName()),
                    "",
                    "save it from the spreadsheet as text with commas or tabs, in UTF-8")));
        }
    }

    private void groups() {
        GroupsDialog.ask(controller.document())
                .ifPresent(result -> line.say(controller.setGroups(result.groups(), result.originals())));
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
