package org.wellwright.project.window.runs;

import java.awt.BorderLayout;
import java.time.ZoneId;
import java.util.List;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.ListSelectionModel;
import javax.swing.SwingConstants;
import javax.swing.SwingUtilities;
import javax.swing.table.AbstractTableModel;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.Lookup;
import org.openide.util.LookupListener;
import org.openide.util.NbBundle.Messages;
import org.openide.util.RequestProcessor;
import org.openide.windows.TopComponent;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.run.RunHistory;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.solver.WellwrightException;

/** The run history of the selected project: what was calculated when, from which values, and how to do it again. */
@TopComponent.Description(preferredID = RunsTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "wellwright-tables", openAtStartup = true, position = 400)
@TopComponent.OpenActionRegistration(displayName = "#CTL_RunsWindow", preferredID = RunsTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.project.window.runs.RunsTopComponent")
@ActionReference(path = "Menu/Window", position = 150)
@Messages({
    "CTL_RunsWindow=Runs",
    "HINT_RunsWindow=Accepted fits of the selected project, and how to make them again",
    "MSG_RunsMissing=<html><div style=''text-align:center; width:300px''><b>No project is open</b><br><br>Open or create a project from the File menu; its run history is listed here.</div>",
    "MSG_NoRuns=No runs yet: an accepted fit of a saved project is written here.",
    "MSG_RunsUnsaved=The history stands beside the project''s file: save the project first.",
    "# {0} - number",
    "MSG_RunsCounted={0} runs, latest first"
})
public final class RunsTopComponent extends SessionWindow {
    static final String ID = "RunsTopComponent";
    private static final long serialVersionUID = 1L;
    private static final RequestProcessor READER = new RequestProcessor("runs", 1);
    private static final String[] COLUMNS = {"When", "Kind", "Model", "χ²/ν", "Program, solver", "Input"};

    private final JTable table = new JTable();
    private final JTextArea detail = new JTextArea();
    private final JLabel message = new JLabel(" ");
    private final transient LookupListener grown = event -> SwingUtilities.invokeLater(this::read);
    private transient Lookup.Result<AcceptedFits.Added> history;
    private transient List<RunsViewModel.Row> rows = List.of();
    private transient String shownFor = "";

    /** Made by the window system. */
    public RunsTopComponent() {
        setName(Bundle.CTL_RunsWindow());
        setDisplayName(Bundle.CTL_RunsWindow());
        setToolTipText(Bundle.HINT_RunsWindow());
        table.setName("runs.table");
        table.getAccessibleContext().setAccessibleName(Bundle.CTL_RunsWindow());
        table.setModel(new Model());
        table.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        table.setFillsViewportHeight(true);
        table.setRowHeight(table.getFontMetrics(table.getFont()).getHeight() + 6);
        table.getTableHeader().setReorderingAllowed(false);
        table.getSelectionModel().addListSelectionListener(event -> showDetail());
        detail.setName("runs.detail");
        detail.getAccessibleContext().setAccessibleName("Result");
        detail.setEditable(false);
        detail.setLineWrap(true);
        JSplitPane split = new JSplitPane(JSplitPane.HORIZONTAL_SPLIT, new JScrollPane(table), new JScrollPane(detail));
        split.setResizeWeight(0.65);
        split.setBorder(BorderFactory.createEmptyBorder());
        message.setName("runs.message");
        message.setBorder(BorderFactory.createEmptyBorder(2, 8, 4, 8));
        JPanel content = new JPanel(new BorderLayout());
        content.add(split, BorderLayout.CENTER);
        content.add(message, BorderLayout.SOUTH);
        install(content, new JLabel(Bundle.MSG_RunsMissing(), SwingConstants.CENTER));
    }

    @Override
    protected void selected(ProjectSession selected) {
        if (history != null) {
            history.removeLookupListener(grown);
        }
        history = selected == null ? null : selected.getLookup().lookupResult(AcceptedFits.Added.class);
        if (history != null) {
            history.addLookupListener(grown);
            history.allInstances();
        }
        shownFor = "";
    }

    @Override
    protected void show(ProjectSession selected) {
        String now = selected.project().digest() + selected.file();
        if (!now.equals(shownFor)) {
            shownFor = now;
            read();
        }
    }

    private void read() {
        ProjectSession session = session();
        if (session == null) {
            return;
        }
        if (session.file().isEmpty()) {
            fill(new RunsViewModel(List.of(), ""), Bundle.MSG_RunsUnsaved());
            return;
        }
        String digest = session.project().digest();
        READER.post(() -> {
            RunsViewModel model;
            try {
                model = RunsViewModel.of(
                        RunHistory.of(session.file().orElseThrow()).read(), digest, ZoneId.systemDefault());
            } catch (WellwrightException e) {
                model = new RunsViewModel(List.of(), e.problem().sentence());
            }
            RunsViewModel read = model;
            SwingUtilities.invokeLater(() -> {
                if (session == session()) {
                    fill(
                            read,
                            read.rows().isEmpty()
                                    ? Bundle.MSG_NoRuns()
                                    : Bundle.MSG_RunsCounted(read.rows().size()));
                }
            });
        });
    }

    private void fill(RunsViewModel model, String hint) {
        int selected = table.getSelectedRow();
        rows = model.rows();
        ((AbstractTableModel) table.getModel()).fireTableDataChanged();
        if (!rows.isEmpty()) {
            int row = Math.max(0, Math.min(selected, rows.size() - 1));
            table.setRowSelectionInterval(row, row);
        }
        message.setText(model.message().isEmpty() ? hint : model.message());
        showDetail();
    }

    private void showDetail() {
        int row = table.getSelectedRow();
        detail.setText(
                row < 0 || row >= rows.size()
                        ? ""
                        : rows.get(row).command() + "\n\n" + rows.get(row).result());
        detail.setCaretPosition(0);
    }

    private final class Model extends AbstractTableModel {
        private static final long serialVersionUID = 1L;

        @Override
        public int getRowCount() {
            return rows == null ? 0 : rows.size();
        }

        @Override
        public int getColumnCount() {
            return COLUMNS.length;
        }

        @Override
        public String getColumnName(int column) {
            return COLUMNS[column];
        }

        @Override
        public Object getValueAt(int row, int column) {
            RunsViewModel.Row run = rows.get(row);
            return switch (column) {
                case 0 -> run.time();
                case 1 -> run.kind();
                case 2 -> run.model();
                case 3 -> run.quality();
                case 4 -> run.program();
                default -> run.input();
            };
        }
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
