package org.wellwright.editor.parts;

import java.awt.Component;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.MouseEvent;
import java.util.EventObject;
import java.util.Optional;
import javax.swing.AbstractCellEditor;
import javax.swing.BorderFactory;
import javax.swing.DefaultComboBoxModel;
import javax.swing.JCheckBox;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JTable;
import javax.swing.JTextField;
import javax.swing.SwingConstants;
import javax.swing.SwingUtilities;
import javax.swing.table.TableCellEditor;
import org.wellwright.solver.Problem;

/** Edits a cell of a {@link Grid}. A text that cannot be used keeps the cell open. */
abstract class GridEditor extends AbstractCellEditor implements TableCellEditor {
    private static final long serialVersionUID = 1L;

    private final Grid<?> grid;
    private int row;
    private int column;

    private GridEditor(Grid<?> grid) {
        this.grid = grid;
    }

    static GridEditor of(GridColumn<?> column, Grid<?> grid) {
        return switch (column.kind()) {
            case TEXT, NUMBER -> new TextCell(grid, column.kind() == GridColumn.Kind.NUMBER);
            case CHECK -> new CheckCell(grid, column.title());
            case CHOICE, OPEN_CHOICE -> new ChoiceCell<>(grid, column);
        };
    }

    abstract String text();

    abstract JComponent prepare(String text, int atRow);

    abstract void mark(boolean faulty);

    @Override
    public Object getCellEditorValue() {
        return text();
    }

    @Override
    public Component getTableCellEditorComponent(
            JTable table, Object value, boolean selected, int atRow, int atColumn) {
        row = atRow;
        column = atColumn;
        mark(false);
        JComponent component = prepare(String.valueOf(value), atRow);
        component.setFont(table.getFont());
        return component;
    }

    @Override
    public boolean stopCellEditing() {
        Optional<Problem> problem = grid.take(row, column, text());
        mark(problem.isPresent());
        grid.line().say(problem);
        return problem.isEmpty() && super.stopCellEditing();
    }

    @Override
    public void cancelCellEditing() {
        mark(false);
        grid.line().say(Optional.empty());
        super.cancelCellEditing();
    }

    @Override
    public boolean isCellEditable(EventObject event) {
        return !(event instanceof MouseEvent mouse) || mouse.getClickCount() >= clicks();
    }

    int clicks() {
        return 2;
    }

    final void stopWhenLeft(JComponent component) {
        component.addFocusListener(new FocusAdapter() {
            @Override
            public void focusLost(FocusEvent event) {
                boolean inside = event.getOppositeComponent() != null
                        && SwingUtilities.isDescendingFrom(
                                event.getOppositeComponent(),
                                component.getParent() == grid ? component : component.getParent());
                if (!event.isTemporary() && !inside && grid.getCellEditor() == GridEditor.this) {
                    stopCellEditing();
                }
            }
        });
    }

    private static final class TextCell extends GridEditor {
        private static final long serialVersionUID = 1L;

        private final JTextField field = new JTextField();

        TextCell(Grid<?> grid, boolean number) {
            super(grid);
            field.setHorizontalAlignment(number ? SwingConstants.TRAILING : SwingConstants.LEADING);
            field.addActionListener(event -> stopCellEditing());
            stopWhenLeft(field);
        }

        @Override
        String text() {
            return field.getText();
        }

        @Override
        JComponent prepare(String text, int atRow) {
            field.setText(text);
            field.selectAll();
            return field;
        }

        @Override
        void mark(boolean faulty) {
            field.setBorder(BorderFactory.createLineBorder(faulty ? Tones.problem() : Tones.number(), faulty ? 2 : 1));
        }
    }

    private static final class CheckCell extends GridEditor {
        private static final long serialVersionUID = 1L;

        private final JCheckBox box = new JCheckBox();

        CheckCell(Grid<?> grid, String title) {
            super(grid);
            box.setHorizontalAlignment(SwingConstants.CENTER);
            box.getAccessibleContext().setAccessibleName(title);
            box.addActionListener(event -> stopCellEditing());
        }

        @Override
        String text() {
            return box.isSelected() ? "yes" : "no";
        }

        @Override
        JComponent prepare(String text, int atRow) {
            box.setSelected("yes".equals(text));
            return box;
        }

        @Override
        void mark(boolean faulty) {
            box.setForeground(faulty ? Tones.problem() : null);
        }

        @Override
        int clicks() {
            return 1;
        }
    }

    private static final class ChoiceCell<R> extends GridEditor {
        private static final long serialVersionUID = 1L;

        private final JComboBox<String> box = new JComboBox<>();
        private final transient GridColumn<R> column;
        private final transient Grid<?> grid;
        private boolean filling;

        ChoiceCell(Grid<?> grid, GridColumn<R> column) {
            super(grid);
            this.grid = grid;
            this.column = column;
            box.putClientProperty("JComboBox.isTableCellEditor", Boolean.TRUE);
            box.setEditable(column.kind() == GridColumn.Kind.OPEN_CHOICE);
            box.addActionListener(event -> {
                if (!filling) {
                    stopCellEditing();
                }
            });
            if (box.isEditable()) {
                stopWhenLeft((JComponent) box.getEditor().getEditorComponent());
            }
        }

        @Override
        String text() {
            Object chosen = box.isEditable() ? box.getEditor().getItem() : box.getSelectedItem();
            return chosen == null ? "" : chosen.toString();
        }

        @Override
        @SuppressWarnings("unchecked")
        JComponent prepare(String text, int atRow) {
            filling = true;
            R row = (R) grid.rows().get(atRow);
            box.setModel(new DefaultComboBoxModel<>(column.choices().apply(row).toArray(new String[0])));
            box.setSelectedItem(text);
            filling = false;
            return box;
        }

        @Override
        void mark(boolean faulty) {
            box.putClientProperty("JComponent.outline", faulty ? "error" : null);
        }
    }
}
