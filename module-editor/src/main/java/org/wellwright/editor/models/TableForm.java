package org.wellwright.editor.models;

import java.awt.Dimension;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javax.swing.JComboBox;
import javax.swing.JScrollPane;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.edit.ArgumentText;
import org.wellwright.editor.edit.Lists;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.EntryField;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.Grid;
import org.wellwright.editor.parts.GridColumn;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.project.entry.DelimitedText;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableInterpolation;
import org.wellwright.solver.potential.TableKnot;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** The part of a term's form that is about a table: its points, and how it goes on between and beyond them. */
@Messages({
    "HEAD_TablePoints=Points",
    "LBL_TableRadiusUnit=Unit of r",
    "LBL_TableValueUnit=Unit of V",
    "LBL_TableQuantity=Interpolate",
    "LBL_TableAbscissa=against",
    "LBL_TableSpline=with a spline that is",
    "LBL_TableInner=Below the first point",
    "LBL_TableSteepness=n or c",
    "LBL_TableOuter=Above the last point",
    "LBL_TableLimit=Limit",
    "LBL_TableCoefficient=Coefficient of 1/r^n",
    "LBL_TableExponent=n",
    "HINT_TableUnit=Empty for the project's own",
    "HINT_TablePoints=Paste two columns, r and V, from a spreadsheet to replace the table"
})
final class TableForm {
    private record Point(int index, String radius, String value) {}

    private final ModelsController controller;
    private final TermPath path;
    private final ProblemLine line;
    private final Grid<Point> points;
    private final EntryField radiusUnit;
    private final EntryField valueUnit;
    private final JComboBox<String> quantity = new JComboBox<>(new String[] {"V", "r²V"});
    private final JComboBox<String> abscissa = new JComboBox<>(new String[] {"r", "1/r"});
    private final JComboBox<String> spline = new JComboBox<>(new String[] {"natural", "clamped", "monotone"});
    private final JComboBox<String> inner = new JComboBox<>(
            new String[] {"a hard wall", "a + b/rⁿ, joined smoothly", "a + b·exp(−cr), joined smoothly"});
    private final EntryField steepness;
    private final JComboBox<String> outer =
            new JComboBox<>(new String[] {"the limit", "limit + coefficient/rⁿ", "the same, limit from continuity"});
    private final EntryField limit;
    private final EntryField coefficient;
    private final EntryField exponent;
    private boolean filling;

    TableForm(Form form, ModelsController controller, TermPath path, ProblemLine line) {
        this.controller = controller;
        this.path = path;
        this.line = line;
        form.heading(Bundle.HEAD_TablePoints());
        points = new Grid<>(
                "table.points",
                Bundle.HEAD_TablePoints(),
                List.of(
                        GridColumn.typed(
                                "r",
                                Bundle.HINT_TablePoints(),
                                GridColumn.Kind.NUMBER,
                                "0.12345678",
                                Point::radius,
                                this::setRadius),
                        GridColumn.typed(
                                "V",
                                Bundle.HINT_TablePoints(),
                                GridColumn.Kind.NUMBER,
                                "0.12345678901",
                                Point::value,
                                this::setValue)),
                line);
        points.onPaste(this::paste);
        points.onMenu("Insert a point", "INSERT", this::insert);
        points.onMenu("Remove the selected points", "DELETE", this::remove);
        JScrollPane scroll = new JScrollPane(points);
        scroll.setPreferredSize(new Dimension(120, 150));
        form.wide(scroll);
        radiusUnit = unit(form, "table.radiusUnit", Bundle.LBL_TableRadiusUnit(), true);
        valueUnit = unit(form, "table.valueUnit", Bundle.LBL_TableValueUnit(), false);
        choice(form, "table.quantity", Bundle.LBL_TableQuantity(), quantity);
        choice(form, "table.abscissa", Bundle.LBL_TableAbscissa(), abscissa);
        choice(form, "table.spline", Bundle.LBL_TableSpline(), spline);
        choice(form, "table.inner", Bundle.LBL_TableInner(), inner);
        steepness = argument(
                form,
                "table.steepness",
                Bundle.LBL_TableSteepness(),
                (table, argument) -> with(
                        table,
                        table.interpolation(),
                        new InnerContinuation(table.inner().kind(), argument),
                        table.outer()));
        choice(form, "table.outer", Bundle.LBL_TableOuter(), outer);
        limit = argument(
                form,
                "table.limit",
                Bundle.LBL_TableLimit(),
                (table, argument) -> outer(
                        table,
                        table.outer().kind(),
                        argument,
                        table.outer().coefficient(),
                        table.outer().exponent()));
        coefficient = argument(
                form,
                "table.coefficient",
                Bundle.LBL_TableCoefficient(),
                (table, argument) -> outer(
                        table,
                        table.outer().kind(),
                        table.outer().limit(),
                        argument,
                        table.outer().exponent()));
        exponent = argument(
                form,
                "table.exponent",
                Bundle.LBL_TableExponent(),
                (table, argument) -> outer(
                        table,
                        table.outer().kind(),
                        table.outer().limit(),
                        table.outer().coefficient(),
                        argument));
    }

    void show(TableTerm table, ModelDocument document) {
        filling = true;
        List<Point> rows = new ArrayList<>();
        for (int i = 0; i < table.knots().size(); i++) {
            TableKnot knot = table.knots().get(i);
            rows.add(new Point(i, ExactNumber.of(knot.radius()).text(), ArgumentText.text(knot.value())));
        }
        points.setRows(rows);
        radiusUnit.show(table.radiusUnit());
        valueUnit.show(table.valueUnit());
        UnitSystem units = org.wellwright.editor.edit.Units.of(document);
        radiusUnit.putClientProperty(
                "JTextField.placeholderText", units.length().symbol());
        valueUnit.putClientProperty("JTextField.placeholderText", units.energy().symbol());
        quantity.setSelectedIndex(table.interpolation().quantity().ordinal());
        abscissa.setSelectedIndex(table.interpolation().abscissa().ordinal());
        spline.setSelectedIndex(table.interpolation().spline().ordinal());
        inner.setSelectedIndex(table.inner().kind().ordinal());
        steepness.show(ArgumentText.text(table.inner().steepness()));
        steepness.setEnabled(table.inner().kind() != InnerContinuation.Kind.WALL);
        outer.setSelectedIndex(table.outer().kind().ordinal());
        limit.show(ArgumentText.text(table.outer().limit()));
        limit.setEnabled(table.outer().kind() != OuterContinuation.Kind.JOINED_POWER);
        coefficient.show(ArgumentText.text(table.outer().coefficient()));
        exponent.show(ArgumentText.text(table.outer().exponent()));
        coefficient.setEnabled(table.outer().kind() != OuterContinuation.Kind.CONSTANT);
        exponent.setEnabled(table.outer().kind() != OuterContinuation.Kind.CONSTANT);
        filling = false;
    }

    /** Reads two columns of numbers as points, in ascending radius. */
    static List<TableKnot> points(String text) {
        List<TableKnot> knots = new ArrayList<>();
        for (DelimitedText.Row row : DelimitedText.parse(text).rows()) {
            boolean heading = knots.isEmpty() && !row.cell(0).matches("[-+.\\d].*");
            if (heading) {
                continue;
            }
            try {
                double radius =
                        QuantityText.parse(row.cell(0), "", UnitSystem.ATOMIC).value();
                double value =
                        QuantityText.parse(row.cell(1), "", UnitSystem.ATOMIC).value();
                knots.add(new TableKnot(radius, Argument.of(value)));
            } catch (InvalidModelException e) {
                throw new InvalidModelException(
                        e.problem().what(), "line " + row.line(), "write r and V, two plain numbers");
            } catch (IllegalArgumentException e) {
                throw new InvalidModelException(e.getMessage(), "line " + row.line(), "");
            }
        }
        knots.sort(Comparator.comparingDouble(TableKnot::radius));
        return knots;
    }

    private EntryField unit(Form form, String name, String label, boolean radius) {
        EntryField field = new EntryField(name, 8)
                .onEntry(
                        text -> set(table -> {
                            String unit = text.isBlank()
                                    ? ""
                                    : UnitExpression.parse(text).text();
                            return new TableTerm(
                                    table.frame(),
                                    radius ? unit : table.radiusUnit(),
                                    radius ? table.valueUnit() : unit,
                                    table.knots(),
                                    table.interpolation(),
                                    table.inner(),
                                    table.outer());
                        }),
                        line);
        field.setToolTipText(Bundle.HINT_TableUnit());
        form.field(label, field);
        return field;
    }

    private EntryField argument(
            Form form,
            String name,
            String label,
            java.util.function.BiFunction<TableTerm, Argument, TableTerm> change) {
        EntryField field =
                new EntryField(name, 8).onEntry(text -> set(table -> change.apply(table, plain(text))), line);
        form.field(label, field);
        return field;
    }

    /** A number in the table's own units, or the name of a parameter. */
    private static Argument plain(String text) {
        String typed = text.strip();
        return typed.matches("\\p{L}[\\p{L}\\p{N}_]*")
                ? Argument.named(typed)
                : Argument.of(QuantityText.parse(typed, "", UnitSystem.ATOMIC).value());
    }

    private void choice(Form form, String name, String label, JComboBox<String> box) {
        box.setName(name);
        box.addActionListener(event -> {
            if (!filling) {
                line.say(set(this::chosen));
            }
        });
        form.field(label, box);
    }

    private TableTerm chosen(TableTerm table) {
        TableInterpolation interpolation = new TableInterpolation(
                TableInterpolation.Quantity.values()[quantity.getSelectedIndex()],
                TableInterpolation.Abscissa.values()[abscissa.getSelectedIndex()],
                TableInterpolation.Spline.values()[spline.getSelectedIndex()]);
        InnerContinuation.Kind innerKind = InnerContinuation.Kind.values()[inner.getSelectedIndex()];
        boolean unset = table.inner().steepness().equals(Argument.ZERO) && innerKind != InnerContinuation.Kind.WALL;
        InnerContinuation below = new InnerContinuation(
                innerKind, unset ? Argument.of(2) : table.inner().steepness());
        TableTerm next = with(table, interpolation, below, table.outer());
        OuterContinuation.Kind outerKind = OuterContinuation.Kind.values()[outer.getSelectedIndex()];
        return outer(
                next,
                outerKind,
                table.outer().limit(),
                table.outer().coefficient(),
                table.outer().exponent());
    }

    private static TableTerm with(
            TableTerm table, TableInterpolation interpolation, InnerContinuation below, OuterContinuation above) {
        return new TableTerm(
                table.frame(), table.radiusUnit(), table.valueUnit(), table.knots(), interpolation, below, above);
    }

    private static TableTerm outer(
            TableTerm table, OuterContinuation.Kind kind, Argument limit, Argument coefficient, Argument exponent) {
        return with(
                table, table.interpolation(), table.inner(), new OuterContinuation(kind, limit, coefficient, exponent));
    }

    private static TableTerm withKnots(TableTerm table, List<TableKnot> knots) {
        return new TableTerm(
                table.frame(),
                table.radiusUnit(),
                table.valueUnit(),
                knots,
                table.interpolation(),
                table.inner(),
                table.outer());
    }

    private Optional<Problem> setRadius(Point point, String text) {
        return set(table -> {
            double radius = QuantityText.parse(text, table.radiusUnit(), UnitSystem.ATOMIC)
                    .value();
            return withKnots(
                    table, Lists.with(table.knots(), point.index(), knot -> new TableKnot(radius, knot.value())));
        });
    }

    private Optional<Problem> setValue(Point point, String text) {
        return set(table -> withKnots(
                table, Lists.with(table.knots(), point.index(), knot -> new TableKnot(knot.radius(), plain(text)))));
    }

    private void paste(String text) {
        line.say(set(table -> withKnots(table, points(text))));
    }

    private void insert() {
        int at = points.selection().isEmpty()
                ? points.rows().size() - 1
                : points.selection().get(0);
        line.say(set(table -> {
            List<TableKnot> knots = table.knots();
            TableKnot here = knots.get(at);
            double next = at + 1 < knots.size()
                    ? knots.get(at + 1).radius()
                    : 2 * here.radius() - knots.get(at - 1).radius();
            return withKnots(
                    table, Lists.inserted(knots, at + 1, new TableKnot((here.radius() + next) / 2, here.value())));
        }));
    }

    private void remove() {
        List<Integer> selected = points.selection();
        line.say(set(table -> {
            List<TableKnot> knots = new ArrayList<>(table.knots());
            for (int i = selected.size() - 1; i >= 0; i--) {
                knots.remove((int) selected.get(i));
            }
            return withKnots(table, knots);
        }));
    }

    private Optional<Problem> set(UnaryOperator<TableTerm> change) {
        return Entry.attempt(() -> controller.setTable(path, change).ifPresent(problem -> {
            throw new InvalidModelException(problem);
        }));
    }
}
