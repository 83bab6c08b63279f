package org.wellwright.editor.parts;

import java.awt.Color;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import javax.swing.JCheckBox;
import javax.swing.JTable;
import javax.swing.SwingConstants;
import javax.swing.table.DefaultTableCellRenderer;

/** Shows a cell of a {@link Grid}: numbers to the right, boxes, a wavy line under what is wrong. */
final class GridRenderer<R> extends DefaultTableCellRenderer {
    private static final long serialVersionUID = 1L;

    private final transient GridColumn<R> column;
    private final transient Grid<R> grid;
    private final JCheckBox box = new JCheckBox();
    private boolean faulty;

    GridRenderer(GridColumn<R> column, Grid<R> grid) {
        this.column = column;
        this.grid = grid;
        setHorizontalAlignment(
                column.kind() == GridColumn.Kind.NUMBER ? SwingConstants.TRAILING : SwingConstants.LEADING);
        box.setHorizontalAlignment(SwingConstants.CENTER);
        box.setOpaque(true);
    }

    @Override
    public Component getTableCellRendererComponent(
            JTable table, Object value, boolean selected, boolean focused, int row, int index) {
        super.getTableCellRendererComponent(table, value, selected, focused, row, index);
        String problem = column.problem().apply(grid.rows().get(row));
        faulty = !problem.isEmpty();
        String text = String.valueOf(value);
        boolean editable = table.isCellEditable(row, index);
        if (column.kind() == GridColumn.Kind.CHECK) {
            box.setSelected("yes".equals(text));
            box.setEnabled(editable);
            box.setBackground(getBackground());
            box.setForeground(getForeground());
            box.setToolTipText(faulty ? problem : null);
            box.getAccessibleContext().setAccessibleName(column.title());
            return box;
        }
        boolean cut = getPreferredSize().width > table.getCellRect(row, index, false).width;
        setToolTipText(faulty ? problem : cut ? text : null);
        if (faulty && !selected) {
            setForeground(Tones.problem());
        } else if (!selected) {
            setForeground(editable || !grid.editable() ? table.getForeground() : Tones.faint());
        }
        return this;
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        super.paintComponent(graphics);
        if (faulty) {
            Graphics2D g = (Graphics2D) graphics;
            Color wave = Tones.problem();
            g.setColor(wave);
            int y = getHeight() - 3;
            for (int x = 2; x < getWidth() - 4; x += 4) {
                g.drawLine(x, y, x + 2, y - 2);
                g.drawLine(x + 2, y - 2, x + 4, y);
            }
        }
    }
}
