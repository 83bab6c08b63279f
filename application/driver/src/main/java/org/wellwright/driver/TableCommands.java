package org.wellwright.driver;

import java.awt.Component;
import java.awt.Toolkit;
import java.awt.datatransfer.StringSelection;
import java.io.IOException;
import java.nio.file.Files;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import javax.swing.Action;
import javax.swing.JCheckBox;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JList;
import javax.swing.JSlider;
import javax.swing.JTable;
import javax.swing.JTree;
import javax.swing.SwingUtilities;
import javax.swing.text.DefaultEditorKit;
import javax.swing.text.JTextComponent;
import javax.swing.tree.TreePath;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.driver.WindowCommands.Command;

/** The commands for tables, trees, lists, choices and sliders. */
final class TableCommands {
    private TableCommands() {}

    /** Types a text into a cell, rows and columns from 0; fails if the cell does not take it. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Cell extends Command {
        public Cell() {
            super(
                    "cell",
                    "TABLE ROW COLUMN TEXT",
                    (script, words) -> Screen.onEventThread(() -> {
                        if (!type(table(words.get(0)), number(words.get(1)), number(words.get(2)), words.get(3))) {
                            throw new ScriptFailure("the cell does not take " + words.get(3));
                        }
                        return null;
                    }));
        }
    }

    /** Types a text that a cell must refuse, and leaves the cell as it was. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class RefusedCell extends Command {
        public RefusedCell() {
            super(
                    "refused-cell",
                    "TABLE ROW COLUMN TEXT",
                    (script, words) -> Screen.onEventThread(() -> {
                        JTable table = table(words.get(0));
                        if (type(table, number(words.get(1)), number(words.get(2)), words.get(3))) {
                            throw new ScriptFailure("the cell takes " + words.get(3));
                        }
                        table.getCellEditor().cancelCellEditing();
                        return null;
                    }));
        }
    }

    /** Waits until a cell shows a text that contains the given one. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class WaitCell extends Command {
        public WaitCell() {
            super(
                    "wait-cell",
                    "TABLE ROW COLUMN TEXT",
                    (script, words) -> Screen.await("the cell with " + words.get(3), () -> {
                        Component found = Screen.findOrNull(words.get(0));
                        int row = number(words.get(1));
                        return found instanceof JTable table
                                && row < table.getRowCount()
                                && String.valueOf(table.getValueAt(row, number(words.get(2))))
                                        .contains(words.get(3));
                    }));
        }
    }

    /** Waits until a table has a number of rows. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class WaitRows extends Command {
        public WaitRows() {
            super(
                    "wait-rows",
                    "TABLE COUNT",
                    (script, words) -> Screen.await(
                            words.get(1) + " rows",
                            () -> Screen.findOrNull(words.get(0)) instanceof JTable table
                                    && table.getRowCount() == number(words.get(1))));
        }
    }

    /** Selects a row of a table or a list. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class SelectRow extends Command {
        public SelectRow() {
            super(
                    "select-row",
                    "NAME ROW",
                    (script, words) -> Screen.onEventThread(() -> {
                        int row = number(words.get(1));
                        Component found = Screen.find(words.get(0));
                        if (found instanceof JTable table && row < table.getRowCount()) {
                            table.setRowSelectionInterval(row, row);
                        } else if (found instanceof JList<?> list
                                && row < list.getModel().getSize()) {
                            list.setSelectedIndex(row);
                        } else {
                            throw new ScriptFailure("%s has no row %d".formatted(words.get(0), row));
                        }
                        return null;
                    }));
        }
    }

    /** Selects the first line of a tree whose text starts with the given one. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class SelectNode extends Command {
        public SelectNode() {
            super(
                    "select-node",
                    "TREE TEXT",
                    (script, words) -> Screen.onEventThread(() -> {
                        JTree tree = (JTree) Screen.find(words.get(0));
                        for (int row = 0; row < tree.getRowCount(); row++) {
                            TreePath path = tree.getPathForRow(row);
                            String text = tree.convertValueToText(
                                    path.getLastPathComponent(), false, false, false, row, false);
                            if (text.startsWith(words.get(1))) {
                                tree.setSelectionRow(row);
                                return null;
                            }
                        }
                        throw new ScriptFailure(
                                "%s has no line that starts with %s".formatted(words.get(0), words.get(1)));
                    }));
        }
    }

    /** Puts the content of a file on the clipboard and pastes it into a table. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Paste extends Command {
        public Paste() {
            super("paste", "NAME FILE", (script, words) -> {
                try {
                    String text = Files.readString(script.resolve(words.get(1)));
                    Screen.onEventThread(() -> {
                        Toolkit.getDefaultToolkit().getSystemClipboard().setContents(new StringSelection(text), null);
                        JComponent target = (JComponent) Screen.find(words.get(0));
                        Action paste = target.getActionMap().get(DefaultEditorKit.pasteAction);
                        if (paste == null) {
                            throw new ScriptFailure(words.get(0) + " takes nothing from the clipboard");
                        }
                        // A dialog may open; the script goes on meanwhile.
                        SwingUtilities.invokeLater(() -> paste.actionPerformed(null));
                        return null;
                    });
                } catch (IOException failure) {
                    throw new ScriptFailure("cannot read " + words.get(1), failure);
                }
            });
        }
    }

    /** Chooses an entry of a combo box by its text. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Choose extends Command {
        public Choose() {
            super(
                    "choose",
                    "NAME TEXT",
                    (script, words) -> Screen.onEventThread(() -> {
                        JComboBox<?> box = (JComboBox<?>) Screen.find(words.get(0));
                        for (int i = 0; i < box.getItemCount(); i++) {
                            if (words.get(1).equals(String.valueOf(box.getItemAt(i)))) {
                                box.setSelectedIndex(i);
                                return null;
                            }
                        }
                        throw new ScriptFailure("%s has no entry %s".formatted(words.get(0), words.get(1)));
                    }));
        }
    }

    /** Drags a slider from where it is to a tick, in steps, as a mouse would, and lets go. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Slide extends Command {
        public Slide() {
            super("slide", "NAME TICK STEPS", (script, words) -> {
                int steps = number(words.get(2));
                int start = Screen.onEventThread(() -> slider(words.get(0)).getValue());
                int end = number(words.get(1));
                for (int i = 1; i <= steps; i++) {
                    int tick = start + (int) Math.round((end - start) * (double) i / steps);
                    boolean last = i == steps;
                    Screen.onEventThread(() -> {
                        slider(words.get(0)).setValueIsAdjusting(!last);
                        slider(words.get(0)).setValue(tick);
                        return null;
                    });
                    Screen.pause(15);
                }
                Screen.pause(1000);
            });
        }
    }

    /** Waits until a button or field can be used. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class WaitEnabled extends Command {
        public WaitEnabled() {
            super(
                    "wait-enabled",
                    "NAME",
                    (script, words) -> Screen.await(words.get(0) + " not to be grey", () -> {
                        Component found = Screen.findOrNull(words.get(0));
                        return found != null && found.isEnabled();
                    }));
        }
    }

    /**
     * Writes the cells of a table, or the lines of a tree or list: one row a line, cells separated by tabs, then which
     * rows are selected.
     */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Rows extends Command {
        public Rows() {
            super("rows", "NAME FILE", (script, words) -> {
                List<String> lines = Screen.onEventThread(() -> rows(Screen.find(words.get(0))));
                try {
                    Files.write(script.resolve(words.get(1)), lines);
                } catch (IOException failure) {
                    throw new ScriptFailure("cannot write " + words.get(1), failure);
                }
            });
        }
    }

    private static List<String> rows(Component found) {
        List<String> lines = new ArrayList<>();
        if (found instanceof JTable table) {
            for (int row = 0; row < table.getRowCount(); row++) {
                List<String> cells = new ArrayList<>();
                for (int column = 0; column < table.getColumnCount(); column++) {
                    cells.add(String.valueOf(table.getValueAt(row, column)));
                }
                lines.add(String.join("\t", cells));
            }
            lines.add("selected " + Arrays.toString(table.getSelectedRows()));
        } else if (found instanceof JTree tree) {
            for (int row = 0; row < tree.getRowCount(); row++) {
                Object last = tree.getPathForRow(row).getLastPathComponent();
                lines.add(tree.convertValueToText(last, false, false, false, row, false));
            }
            lines.add("selected " + Arrays.toString(tree.getSelectionRows()));
        } else if (found instanceof JList<?> list) {
            for (int row = 0; row < list.getModel().getSize(); row++) {
                lines.add(String.valueOf(list.getModel().getElementAt(row)));
            }
            lines.add("selected [" + list.getSelectedIndex() + "]");
        } else {
            throw new ScriptFailure(found.getName() + " has no rows");
        }
        return lines;
    }

    private static boolean type(JTable table, int row, int column, String text) {
        if (!table.editCellAt(row, column)) {
            throw new ScriptFailure("the cell %d, %d cannot be changed".formatted(row, column));
        }
        Component editor = table.getEditorComponent();
        if (editor instanceof JTextComponent field) {
            field.setText(text);
        } else if (editor instanceof JComboBox<?> box) {
            if (box.isEditable()) {
                ((JTextComponent) box.getEditor().getEditorComponent()).setText(text);
            } else {
                box.setSelectedItem(text);
            }
        } else if (editor instanceof JCheckBox tick) {
            tick.setSelected(text.equals("yes"));
        }
        // Choosing ends the edit by itself.
        return !table.isEditing() || table.getCellEditor().stopCellEditing();
    }

    private static JTable table(String name) {
        if (Screen.find(name) instanceof JTable table) {
            return table;
        }
        throw new ScriptFailure(name + " is not a table");
    }

    private static JSlider slider(String name) {
        if (Screen.find(name) instanceof JSlider slider) {
            return slider;
        }
        throw new ScriptFailure(name + " is not a slider");
    }

    private static int number(String word) {
        return Integer.parseInt(word);
    }
}
