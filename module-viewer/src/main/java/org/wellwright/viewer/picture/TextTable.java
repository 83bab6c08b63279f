package org.wellwright.viewer.picture;

import java.awt.Component;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.function.IntConsumer;
import javax.swing.JTable;
import javax.swing.ListSelectionModel;
import javax.swing.SwingConstants;
import javax.swing.table.AbstractTableModel;
import javax.swing.table.DefaultTableCellRenderer;
import javax.swing.table.TableColumn;
import org.wellwright.viewer.plot.TableText;

/** A table of text that follows its rows without losing the reader's place. Event thread only. */
public final class TextTable extends JTable {
    private static final long serialVersionUID = 1L;
    private static final int PADDING = 16;

    private final Cells cells = new Cells();
    private boolean filling;

    /**
     * An empty table.
     *
     * @param name name of the component
     * @param title its name to assistive technology
     * @param picked called with the row that the user selects
     */
    public TextTable(String name, String title, IntConsumer picked) {
        setModel(cells);
        setName(name);
        getAccessibleContext().setAccessibleName(title);
        setAutoResizeMode(AUTO_RESIZE_OFF);
        setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        getTableHeader().setReorderingAllowed(false);
        setFillsViewportHeight(true);
        getSelectionModel().addListSelectionListener(event -> {
            if (!filling && !event.getValueIsAdjusting() && getSelectedRow() >= 0) {
                picked.accept(getSelectedRow());
            }
        });
    }

    /**
     * Shows a text.
     *
     * @param selected row to select, or −1
     */
    public void show(TableText text, int selected) {
        filling = true;
        try {
            boolean sameColumns = text.columns().equals(cells.text.columns());
            boolean sameRows = text.rows().size() == cells.text.rows().size();
            cells.text = text;
            if (!sameColumns) {
                cells.fireTableStructureChanged();
            } else if (!sameRows) {
                cells.fireTableDataChanged();
            } else {
                cells.fireTableRowsUpdated(0, Math.max(0, text.rows().size() - 1));
            }
            if (!sameColumns || !sameRows) {
                fit();
            }
            if (selected >= 0 && selected < text.rows().size()) {
                setRowSelectionInterval(selected, selected);
            } else {
                clearSelection();
            }
        } finally {
            filling = false;
        }
    }

    private void fit() {
        for (int column = 0; column < getColumnCount(); column++) {
            TableColumn part = getColumnModel().getColumn(column);
            boolean number = cells.text.columns().get(column).number();
            DefaultTableCellRenderer renderer = new DefaultTableCellRenderer();
            renderer.setHorizontalAlignment(number ? SwingConstants.RIGHT : SwingConstants.LEFT);
            part.setCellRenderer(renderer);
            Component header = getTableHeader()
                    .getDefaultRenderer()
                    .getTableCellRendererComponent(this, part.getHeaderValue(), false, false, -1, column);
            int width = header.getPreferredSize().width;
            for (int row = 0; row < getRowCount(); row++) {
                width = Math.max(width, prepareRenderer(renderer, row, column).getPreferredSize().width);
            }
            part.setPreferredWidth(width + PADDING);
        }
    }

    @Override
    public String getToolTipText(MouseEvent event) {
        int row = rowAtPoint(event.getPoint());
        int column = columnAtPoint(event.getPoint());
        if (row < 0 || column < 0) {
            return null;
        }
        String hint = cells.text.rows().get(row).get(column).hint();
        return hint.isEmpty() ? null : hint;
    }

    private static final class Cells extends AbstractTableModel {
        private static final long serialVersionUID = 1L;
        private transient TableText text = new TableText(List.of(), List.of());

        @Override
        public int getRowCount() {
            return text.rows().size();
        }

        @Override
        public int getColumnCount() {
            return text.columns().size();
        }

        @Override
        public String getColumnName(int column) {
            return text.columns().get(column).title();
        }

        @Override
        public Object getValueAt(int row, int column) {
            return text.rows().get(row).get(column).text();
        }
    }
}
