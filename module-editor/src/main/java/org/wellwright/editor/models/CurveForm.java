package org.wellwright.editor.models;

import javax.swing.JComboBox;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.edit.ArgumentText;
import org.wellwright.editor.edit.LabelText;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.EntryField;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.SpinScheme;

/** The form of a curve: its name, origin, walls, spins and labels. */
@Messages({
    "LBL_CurveName=Name",
    "LBL_CurveOrigin=Energy origin",
    "LBL_CurveInner=Hard wall inside at r =",
    "LBL_CurveOuter=Hard wall outside at r =",
    "LBL_CurveSpins=Spins",
    "LBL_CurveLabels=Label rule",
    "LBL_CurveOccupied=Occupied levels",
    "HINT_CurveName=Data name their levels by the curve too; models whose curves bear one name share the data",
    "HINT_CurveOrigin=What is added to every energy: a number, or the name of a parameter",
    "HINT_CurveWall=A radius or the name of a parameter; empty for none",
    "HINT_CurveLabels=l=0: +2 adds 2 to n of s levels (inner shells that a nodeless core hides); v: +1 adds 1 to v",
    "HINT_CurveOccupied=Levels that are not available, as 1s, 2s, 2p"
})
final class CurveForm {
    private final EntryField name;
    private final EntryField origin;
    private final EntryField inner;
    private final EntryField outer;
    private final JComboBox<String> spins =
            new JComboBox<>(new String[] {"none: l alone", "one: l and j", "two: l, S and J"});
    private final EntryField labels;
    private final EntryField occupied;
    private boolean filling;

    CurveForm(Form form, ModelsController controller, TermPath path, ProblemLine line) {
        name = field(
                form,
                line,
                "curve.name",
                Bundle.LBL_CurveName(),
                Bundle.HINT_CurveName(),
                text -> controller.rename(path, text));
        origin = field(
                form,
                line,
                "curve.origin",
                Bundle.LBL_CurveOrigin(),
                Bundle.HINT_CurveOrigin(),
                text -> controller.setOrigin(path, text));
        inner = field(
                form,
                line,
                "curve.inner",
                Bundle.LBL_CurveInner(),
                Bundle.HINT_CurveWall(),
                text -> controller.setInnerWall(path, text));
        outer = field(
                form,
                line,
                "curve.outer",
                Bundle.LBL_CurveOuter(),
                Bundle.HINT_CurveWall(),
                text -> controller.setOuterWall(path, text));
        outer.putClientProperty("JTextField.placeholderText", "none");
        spins.setName("curve.spins");
        spins.addActionListener(event -> {
            if (!filling) {
                line.say(controller.setSpins(path, SpinScheme.values()[spins.getSelectedIndex()]));
            }
        });
        form.field(Bundle.LBL_CurveSpins(), spins);
        labels = field(
                form,
                line,
                "curve.labels",
                Bundle.LBL_CurveLabels(),
                Bundle.HINT_CurveLabels(),
                text -> controller.setLabels(path, text));
        labels.putClientProperty("JTextField.placeholderText", "plain");
        occupied = field(
                form,
                line,
                "curve.occupied",
                Bundle.LBL_CurveOccupied(),
                Bundle.HINT_CurveOccupied(),
                text -> controller.setOccupied(path, text));
        occupied.putClientProperty("JTextField.placeholderText", "none");
        form.end();
    }

    private static EntryField field(Form form, ProblemLine line, String id, String label, String hint, Entry entry) {
        EntryField field = new EntryField(id, 10).onEntry(entry, line);
        field.setToolTipText(hint);
        form.field(label, field);
        return field;
    }

    void show(Curve curve, ModelDocument document) {
        filling = true;
        name.show(curve.name());
        origin.show(ArgumentText.text(curve.energyOrigin()));
        inner.show(ArgumentText.text(curve.innerWall()));
        outer.show(ArgumentText.text(curve.outerWall()));
        spins.setSelectedIndex(curve.spinScheme().ordinal());
        labels.show(LabelText.text(curve.labels()));
        occupied.show(LabelText.occupied(curve, document));
        filling = false;
    }
}
