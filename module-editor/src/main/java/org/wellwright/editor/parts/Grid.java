package org.wellwright.editor.parts;

import java.awt.Component;
import java.awt.FontMetrics;
import java.awt.Toolkit;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import javax.swing.Action;
import javax.swing.JComponent;
import javax.swing.JPopupMenu;
import javax.swing.JTable;
import javax.swing.KeyStroke;
import javax.swing.ListSelectionModel;
import javax.swing.TransferHandler;
import javax.swing.table.AbstractTableModel;
import javax.swing.table.JTableHeader;
import javax.swing.table.TableCellEditor;
import javax.swing.table.TableColumn;
import javax.swing.text.DefaultEditorKit;
import org.wellwright.solver.Problem;

/**
 * A table of rows whose cells check what is typed into them: what cannot be used stays in the cell, marked, with the
 * reason in the problem line. Whole rows are selected, copied to a spreadsheet and pasted from one.
 *
 * @param <R> a row as it is shown
 */
public final class Grid<R> extends JTable {
    private static final long serialVersionUID = 1L;

    private final transient List<GridColumn<R>> columns;
    private final transient ProblemLine line;
    private final transient JPopupMenu menu = new JPopupMenu();
    private transient List<R> rows = List.of();
    private transient Consumer<String> paste;

    /**
     * Makes a table without rows.
     *
     * @param name its name, as "data.table"
     * @param title its name to assistive technology
     */
    public Grid(String name, String title, List<GridColumn<R>> columns, ProblemLine line) {
        this.columns = List.copyOf(columns);
        this.line = line;
        setName(name);
        getAccessibleContext().setAccessibleName(title);
        setModel(new Model());
        setAutoResizeMode(AUTO_RESIZE_SUBSEQUENT_COLUMNS);
        setSelectionMode(ListSelectionModel.MULTIPLE_INTERVAL_SELECTION);
        setFillsViewportHeight(true);
        setSurrendersFocusOnKeystroke(true);
        getTableHeader().setReorderingAllowed(false);
        setShowGrid(true);
        getColumnModel().setColumnSelectionAllowed(false);
        for (int i = 0; i < this.columns.size(); i++) {
            TableColumn column = getColumnModel().getColumn(i);
            column.setCellRenderer(new GridRenderer<>(this.columns.get(i), this));
            column.setCellEditor(GridEditor.of(this.columns.get(i), this));
        }
        sizeColumns();
        setTransferHandler(new Rows());
        getActionMap().put(DefaultEditorKit.copyAction, ToolStrip.action("Copy", () -> copy(false)));
        getActionMap().put(DefaultEditorKit.pasteAction, ToolStrip.action("Paste", this::pasteFromClipboard));
        getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT)
                .put(KeyStroke.getKeyStroke("ctrl C"), DefaultEditorKit.copyAction);
        getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT)
                .put(KeyStroke.getKeyStroke("ctrl V"), DefaultEditorKit.pasteAction);
        menu.add(ToolStrip.action("Copy", () -> copy(false))).setName(name + ".copy");
        menu.add(ToolStrip.action("Copy with headings", () -> copy(true))).setName(name + ".copyWithHeadings");
        addMouseListener(new MouseAdapter() {
            @Override
            public void mousePressed(MouseEvent event) {
                popup(event);
            }

            @Override
            public void mouseReleased(MouseEvent event) {
                popup(event);
            }
        });
    }

    /** Offers to paste rows. */
    public void onPaste(Consumer<String> taker) {
        paste = taker;
        menu.add(ToolStrip.action("Paste", this::pasteFromClipboard)).setName(getName() + ".paste");
    }

    /** Adds an entry to the menu of the right mouse button, with a key if one is given. */
    public void onMenu(String text, String key, Runnable code) {
        Action action = ToolStrip.action(text, code);
        if (key != null) {
            action.putValue(Action.ACCELERATOR_KEY, KeyStroke.getKeyStroke(key));
            getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT).put(KeyStroke.getKeyStroke(key), text);
            getActionMap().put(text, action);
        }
        menu.add(action);
    }

    /** Shows rows; the selection stays at its places, and what is being typed is not disturbed. */
    public void setRows(List<R> newRows) {
        List<R> old = rows;
        rows = List.copyOf(newRows);
        Model model = (Model) getModel();
        int common = Math.min(old.size(), rows.size());
        for (int i = 0; i < common; i++) {
            if (!old.get(i).equals(rows.get(i))) {
                model.fireTableRowsUpdated(i, i);
            }
        }
        if (rows.size() > old.size()) {
            model.fireTableRowsInserted(old.size(), rows.size() - 1);
        } else if (rows.size() < old.size()) {
            if (isEditing() && getEditingRow() >= rows.size()) {
                removeEditor();
            }
            model.fireTableRowsDeleted(rows.size(), old.size() - 1);
        }
    }

    /** The rows shown. */
    public List<R> rows() {
        return rows;
    }

    /** The selected rows' indices, ascending. */
    public List<Integer> selection() {
        return IntStream.of(getSelectedRows())
                .filter(row -> row < rows.size())
                .boxed()
                .toList();
    }

    /** Selects one row and brings it into sight. */
    public void select(int row) {
        if (row >= 0 && row < rows.size()) {
            setRowSelectionInterval(row, row);
            scrollRectToVisible(getCellRect(row, 0, true));
        }
    }

    /** Starts to type in a cell. */
    public void startTyping(int row, int column) {
        select(row);
        if (editCellAt(row, column) && getEditorComponent() != null) {
            getEditorComponent().requestFocusInWindow();
        }
    }

    /** The selected rows, or all if none is, as text with tabs. */
    public String text(boolean headings) {
        List<Integer> wanted =
                selection().isEmpty() ? IntStream.range(0, rows.size()).boxed().toList() : selection();
        List<String> lines = new ArrayList<>();
        if (headings) {
            lines.add(columns.stream().map(GridColumn::title).collect(Collectors.joining("\t")));
        }
        for (int row : wanted) {
            lines.add(columns.stream()
                    .map(column -> column.text().apply(rows.get(row)).replaceAll("[\\t\\r\\n]+", " "))
                    .collect(Collectors.joining("\t")));
        }
        return String.join("\n", lines) + "\n";
    }

    /** Whether any of its columns can be typed into. */
    boolean editable() {
        return columns.stream().anyMatch(column -> column.take() != null);
    }

    /** The line in which problems are said. */
    ProblemLine line() {
        return line;
    }

    /** Takes up what was typed into a cell. */
    Optional<Problem> take(int row, int column, String text) {
        GridColumn<R> of = columns.get(column);
        if (row >= rows.size() || text.equals(of.text().apply(rows.get(row)))) {
            return Optional.empty();
        }
        return of.take().apply(rows.get(row), text);
    }

    private void copy(boolean headings) {
        Toolkit.getDefaultToolkit().getSystemClipboard().setContents(new StringSelection(text(headings)), null);
    }

    private void pasteFromClipboard() {
        if (paste == null) {
            return;
        }
        Transferable content = Toolkit.getDefaultToolkit().getSystemClipboard().getContents(this);
        pasteFrom(content);
    }

    private boolean pasteFrom(Transferable content) {
        try {
            if (paste != null && content != null && content.isDataFlavorSupported(DataFlavor.stringFlavor)) {
                paste.accept((String) content.getTransferData(DataFlavor.stringFlavor));
                return true;
            }
        } catch (UnsupportedFlavorException | IOException e) {
            line.say(Optional.of(new Problem("the clipboard cannot be read", "", "copy the cells again")));
        }
        return false;
    }

    private void popup(MouseEvent event) {
        if (event.isPopupTrigger()) {
            int row = rowAtPoint(event.getPoint());
            if (row >= 0 && !isRowSelected(row)) {
                setRowSelectionInterval(row, row);
            }
            menu.show(this, event.getX(), event.getY());
        }
    }

    private void sizeColumns() {
        if (columns == null) {
            return;
        }
        FontMetrics metrics = getFontMetrics(getFont());
        setRowHeight(metrics.getHeight() + 6);
        for (int i = 0; i < columns.size(); i++) {
            GridColumn<R> column = columns.get(i);
            int width = Math.max(metrics.stringWidth(column.sample()), metrics.stringWidth(column.title() + "  ")) + 14;
            TableColumn of = getColumnModel().getColumn(i);
            of.setPreferredWidth(width);
            of.setMinWidth(Math.min(width, metrics.stringWidth("00000")));
            if (column.kind() == GridColumn.Kind.CHECK) {
                of.setMaxWidth(width);
            }
        }
    }

    @Override
    public void updateUI() {
        super.updateUI();
        sizeColumns();
    }

    @Override
    protected JTableHeader createDefaultTableHeader() {
        return new JTableHeader(columnModel) {
            private static final long serialVersionUID = 1L;

            @Override
            public String getToolTipText(MouseEvent event) {
                int column = columnAtPoint(event.getPoint());
                return column < 0 ? null : columns.get(column).hint();
            }
        };
    }

    @Override
    public Component prepareEditor(TableCellEditor editor, int row, int column) {
        Component component = super.prepareEditor(editor, row, column);
        if (component instanceof JComponent typed) {
            typed.setName(getName() + ".editor");
            typed.getAccessibleContext().setAccessibleName(columns.get(column).title());
        }
        return component;
    }

    private final class Model extends AbstractTableModel {
        private static final long serialVersionUID = 1L;

        @Override
        public int getRowCount() {
            return rows == null ? 0 : rows.size();
        }

        @Override
        public int getColumnCount() {
            return columns.size();
        }

        @Override
        public String getColumnName(int column) {
            return columns.get(column).title();
        }

        @Override
        public Object getValueAt(int row, int column) {
            return columns.get(column).text().apply(rows.get(row));
        }

        @Override
        public boolean isCellEditable(int row, int column) {
            return columns.get(column).editable().test(rows.get(row));
        }

        @Override
        public void setValueAt(Object value, int row, int column) {
            // The editors hand their text to take(); nothing is left to do.
        }
    }

    private final class Rows extends TransferHandler {
        private static final long serialVersionUID = 1L;

        @Override
        public int getSourceActions(JComponent component) {
            return COPY;
        }

        @Override
        protected Transferable createTransferable(JComponent component) {
            return new StringSelection(text(false));
        }

        @Override
        public boolean canImport(TransferSupport support) {
            return paste != null && support.isDataFlavorSupported(DataFlavor.stringFlavor);
        }

        @Override
        public boolean importData(TransferSupport support) {
            return pasteFrom(support.getTransferable());
        }
    }
}
