package org.wellwright.editor.models;

import java.awt.Dimension;
import java.util.List;
import java.util.Optional;
import javax.swing.JLabel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.JTextField;
import org.openide.DialogDescriptor;
import org.openide.DialogDisplayer;
import org.openide.NotificationLineSupport;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.edit.Units;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.Typing;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableInterpolation;
import org.wellwright.solver.potential.TableKnot;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** Asks for the points of a new table. */
@Messages({
    "TTL_TableAsker=Add a table",
    "LBL_TablePoints=Paste two columns, r and V; at least four rows",
    "LBL_TableName=Name",
    "# {0} - number of points",
    "LBL_TableRead={0} points"
})
final class TableAsker {
    private TableAsker() {}

    /** Asks; empty if the user thinks better of it. */
    static Optional<TableTerm> ask(ModelDocument document) {
        UnitSystem units = Units.of(document);
        JTextField name = new JTextField("table", 14);
        name.setName("newTable.name");
        JTextField radius = new JTextField(units.length().symbol(), 8);
        radius.setName("newTable.radiusUnit");
        JTextField value = new JTextField(units.energy().symbol(), 8);
        value.setName("newTable.valueUnit");
        JTextArea text = new JTextArea(12, 34);
        text.setName("newTable.points");
        JLabel count = new JLabel(" ");
        Form form = new Form();
        form.field(Bundle.LBL_TableName(), name);
        form.field(Bundle.LBL_TableRadiusUnit(), radius);
        form.field(Bundle.LBL_TableValueUnit(), value);
        form.wide(new JLabel(Bundle.LBL_TablePoints())).setLabelFor(text);
        text.getAccessibleContext().setAccessibleName(Bundle.LBL_TablePoints());
        JScrollPane scroll = new JScrollPane(text);
        scroll.setPreferredSize(new Dimension(380, 220));
        form.tall(scroll);
        form.wide(count);
        DialogDescriptor dialog = new DialogDescriptor(form, Bundle.TTL_TableAsker());
        NotificationLineSupport line = dialog.createNotificationLineSupport();
        TableTerm[] made = new TableTerm[1];
        Runnable check = () -> {
            Optional<Problem> problem = Entry.attempt(() -> {
                List<TableKnot> knots = TableForm.points(text.getText());
                count.setText(Bundle.LBL_TableRead(knots.size()));
                requireUnit(radius.getText(), org.wellwright.solver.units.Dimension.LENGTH, units);
                requireUnit(value.getText(), org.wellwright.solver.units.Dimension.ENERGY, units);
                made[0] = new TableTerm(
                        TermFrame.named(name.getText().strip()),
                        radius.getText().strip(),
                        value.getText().strip(),
                        knots,
                        TableInterpolation.STANDARD,
                        InnerContinuation.WALL,
                        OuterContinuation.constant(Argument.ZERO));
            });
            dialog.setValid(problem.isEmpty());
            if (problem.isPresent() && !text.getText().isBlank()) {
                line.setErrorMessage(problem.get().sentence());
            } else {
                line.clearMessages();
            }
        };
        for (javax.swing.text.JTextComponent field : List.of(name, radius, value, text)) {
            field.getDocument().addDocumentListener(new Typing(check));
        }
        check.run();
        return DialogDisplayer.getDefault().notify(dialog) == DialogDescriptor.OK_OPTION
                ? Optional.ofNullable(made[0])
                : Optional.empty();
    }

    private static void requireUnit(String text, org.wellwright.solver.units.Dimension expected, UnitSystem units) {
        if (!text.isBlank() && !UnitExpression.parse(text).fits(units, expected)) {
            throw new InvalidModelException(
                    "the unit '%s' does not fit".formatted(text.strip()),
                    "",
                    "use one like '%s'".formatted(units.unitText(expected)));
        }
    }
}
