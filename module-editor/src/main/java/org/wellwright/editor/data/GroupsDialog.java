package org.wellwright.editor.data;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javax.swing.BorderFactory;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import org.openide.DialogDescriptor;
import org.openide.DialogDisplayer;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.edit.Lists;
import org.wellwright.editor.edit.Units;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.Glyph;
import org.wellwright.editor.parts.Grid;
import org.wellwright.editor.parts.GridColumn;
import org.wellwright.editor.parts.GridColumn.Kind;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.editor.parts.ToolStrip;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** Edits the data groups: data that share an unknown error, or just a name. */
@Messages({
    "TTL_Groups=Data groups",
    "LBL_GroupAdd=Add a group",
    "LBL_GroupRemove=Remove the selected groups",
    "HINT_Groups=Data of one group share an error: a calibration offset, a scale. Its size is found together with the parameters."
})
final class GroupsDialog {
    static final List<String> KINDS = List.of("offset with sigma", "scale with sigma", "unknown offset", "name only");

    private record Row(int index, DataGroup group) {
        String kind() {
            return KINDS.get(group.kind().ordinal());
        }

        String sigma() {
            return group.sigma() == null ? "" : group.sigma().text();
        }
    }

    private final ModelDocument document;
    private final ProblemLine line = new ProblemLine("groups.message");
    private List<DataGroup> groups;
    private List<String> originals;
    private Grid<Row> grid;

    private GroupsDialog(ModelDocument document) {
        this.document = document;
        this.groups = new ArrayList<>(document.groups());
        this.originals =
                new ArrayList<>(document.groups().stream().map(DataGroup::id).toList());
    }

    /**
     * What the user made of the groups.
     *
     * @param groups the groups
     * @param originals the id each had before; null for a new one
     */
    record Result(List<DataGroup> groups, List<String> originals) {}

    /** Asks; empty if the user thinks better of it. */
    static Optional<Result> ask(ModelDocument document) {
        return new GroupsDialog(document).ask();
    }

    private Optional<Result> ask() {
        grid = new Grid<>("groups.table", Bundle.TTL_Groups(), columns(), line);
        ToolStrip tools = new ToolStrip("groups");
        tools.icon("add", Glyph.ADD, Bundle.LBL_GroupAdd(), this::add);
        tools.icon("remove", Glyph.REMOVE, Bundle.LBL_GroupRemove(), this::remove);
        grid.onMenu(Bundle.LBL_GroupAdd(), "INSERT", this::add);
        grid.onMenu(Bundle.LBL_GroupRemove(), "DELETE", this::remove);
        line.setHint(Bundle.HINT_Groups());
        JPanel panel = new JPanel(new BorderLayout(0, 4));
        panel.setBorder(BorderFactory.createEmptyBorder(4, 8, 0, 8));
        JScrollPane scroll = new JScrollPane(grid);
        scroll.setPreferredSize(new Dimension(620, 220));
        panel.add(tools, BorderLayout.NORTH);
        panel.add(scroll, BorderLayout.CENTER);
        panel.add(line, BorderLayout.SOUTH);
        fill();
        DialogDescriptor dialog = new DialogDescriptor(panel, Bundle.TTL_Groups());
        if (DialogDisplayer.getDefault().notify(dialog) != DialogDescriptor.OK_OPTION) {
            return Optional.empty();
        }
        if (grid.isEditing()) {
            grid.getCellEditor().stopCellEditing();
        }
        return Optional.of(new Result(List.copyOf(groups), new ArrayList<>(originals)));
    }

    private List<GridColumn<Row>> columns() {
        return List.of(
                GridColumn.typed(
                        "Id",
                        "How data refer to it",
                        Kind.TEXT,
                        "calibration",
                        row -> row.group().id(),
                        this::setId),
                GridColumn.typed(
                        "Title",
                        "Its name in reports",
                        Kind.TEXT,
                        "neon lamp, second order",
                        row -> row.group().title(),
                        (row, text) ->
                                set(row, g -> new DataGroup(g.id(), text.strip(), g.kind(), g.sigma(), g.unit()))),
                GridColumn.<Row>typed(
                                "Shared error",
                                "How the error acts",
                                Kind.CHOICE,
                                "offset with sigma ▾",
                                Row::kind,
                                this::setKind)
                        .withChoices(row -> KINDS),
                GridColumn.<Row>typed(
                                "Sigma",
                                "Its standard uncertainty; a pure number for a scale",
                                Kind.NUMBER,
                                "0.123456",
                                Row::sigma,
                                this::setSigma)
                        .where(row -> row.group().sigma() != null),
                GridColumn.<Row>typed(
                                "Unit",
                                "Unit of an offset",
                                Kind.TEXT,
                                "cm^-1 00",
                                row -> row.group().unit(),
                                this::setUnit)
                        .where(row -> row.group().kind() == DataGroup.Kind.ADDITIVE
                                || row.group().kind() == DataGroup.Kind.UNKNOWN_OFFSET));
    }

    private void fill() {
        List<Row> rows = new ArrayList<>();
        for (int i = 0; i < groups.size(); i++) {
            rows.add(new Row(i, groups.get(i)));
        }
        grid.setRows(rows);
    }

    private void add() {
        String id = Lists.free(
                "group" + (groups.size() + 1),
                "-",
                groups.stream().map(DataGroup::id).toList());
        groups.add(new DataGroup(
                id,
                "",
                DataGroup.Kind.UNKNOWN_OFFSET,
                null,
                Units.of(document).energy().symbol()));
        originals.add(null);
        fill();
        grid.startTyping(groups.size() - 1, 0);
    }

    private void remove() {
        List<Integer> selected = grid.selection();
        for (int i = selected.size() - 1; i >= 0; i--) {
            groups.remove((int) selected.get(i));
            originals.remove((int) selected.get(i));
        }
        fill();
    }

    private Optional<Problem> setId(Row row, String text) {
        return set(row, group -> {
            String id = text.strip();
            if (!id.matches("[\\p{L}\\p{N}_.\\-][\\p{L}\\p{N}_.\\- ]*")) {
                throw new InvalidModelException(
                        "'%s' is not an id".formatted(id),
                        "",
                        "use letters, digits, blanks, dots, dashes and underscores");
            }
            if (!id.equals(group.id())
                    && groups.stream().anyMatch(other -> other.id().equals(id))) {
                throw new InvalidModelException("there is a group '%s' already".formatted(id), "", "choose another id");
            }
            return new DataGroup(id, group.title(), group.kind(), group.sigma(), group.unit());
        });
    }

    private Optional<Problem> setKind(Row row, String text) {
        DataGroup.Kind kind = DataGroup.Kind.values()[KINDS.indexOf(text)];
        return set(row, group -> {
            boolean sigma = kind == DataGroup.Kind.ADDITIVE || kind == DataGroup.Kind.MULTIPLICATIVE;
            boolean unit = kind == DataGroup.Kind.ADDITIVE || kind == DataGroup.Kind.UNKNOWN_OFFSET;
            ExactNumber size = group.sigma() == null ? new ExactNumber("0.001") : group.sigma();
            String usual = group.unit().isEmpty() ? Units.of(document).energy().symbol() : group.unit();
            return new DataGroup(group.id(), group.title(), kind, sigma ? size : null, unit ? usual : "");
        });
    }

    private Optional<Problem> setSigma(Row row, String text) {
        return set(row, group -> {
            boolean scale = group.kind() == DataGroup.Kind.MULTIPLICATIVE;
            ExactNumber sigma =
                    QuantityText.parse(text, scale ? "" : group.unit(), scale ? UnitSystem.ATOMIC : Units.of(document));
            return new DataGroup(group.id(), group.title(), group.kind(), sigma, group.unit());
        });
    }

    private Optional<Problem> setUnit(Row row, String text) {
        return set(
                row,
                g -> new DataGroup(
                        g.id(),
                        g.title(),
                        g.kind(),
                        g.sigma(),
                        UnitExpression.parse(text).text()));
    }

    private Optional<Problem> set(Row row, UnaryOperator<DataGroup> change) {
        Optional<Problem> problem = Entry.attempt(() -> groups.set(row.index(), change.apply(groups.get(row.index()))));
        javax.swing.SwingUtilities.invokeLater(this::fill);
        return problem;
    }
}
