package org.wellwright.editor.parameters;

import javax.swing.JCheckBox;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextField;
import org.openide.DialogDescriptor;
import org.openide.DialogDisplayer;
import org.openide.NotificationLineSupport;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.Form;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;

/** Asks what a parameter depends on. */
@Messages({
    "# {0} - parameter",
    "TTL_Dependence=What {0} depends on",
    "LBL_DependsOn=Depends on",
    "LBL_OtherPlaces=One number for every other place"
})
final class DependencePanel {
    private final ModelDocument document;
    private final ParameterShape old;
    private final JComboBox<Dependence> kind = new JComboBox<>(Dependence.values());
    private final JTextField places = new JTextField(28);
    private final JCheckBox others = new JCheckBox(Bundle.LBL_OtherPlaces());
    private final JLabel question = new JLabel(" ");
    private ParameterShape shape;

    private DependencePanel(ModelDocument document, ParameterShape old) {
        this.document = document;
        this.old = old;
    }

    /** Asks; null if the user thinks better of it. */
    static ParameterShape ask(ModelDocument document, Parameter parameter) {
        return new DependencePanel(document, parameter.shape()).ask(parameter.name());
    }

    private ParameterShape ask(String name) {
        Form form = new Form();
        kind.setName("dependence.kind");
        places.setName("dependence.places");
        others.setName("dependence.others");
        kind.setSelectedItem(Dependence.of(old));
        places.setText(Dependence.places(old, document));
        others.setSelected(hasOthers(old));
        form.field(Bundle.LBL_DependsOn(), kind);
        form.wide(question);
        form.wide(places);
        places.getAccessibleContext().setAccessibleName("Places");
        form.wide(others);
        DialogDescriptor dialog = new DialogDescriptor(form(form), Bundle.TTL_Dependence(name));
        NotificationLineSupport line = dialog.createNotificationLineSupport();
        kind.addActionListener(event -> {
            places.setText(
                    chosen() == Dependence.of(old) ? Dependence.places(old, document) : chosen().suggestion(document));
            check(dialog, line);
        });
        others.addActionListener(event -> check(dialog, line));
        places.getDocument().addDocumentListener(new org.wellwright.editor.parts.Typing(() -> check(dialog, line)));
        check(dialog, line);
        boolean accepted = DialogDisplayer.getDefault().notify(dialog) == DialogDescriptor.OK_OPTION;
        return accepted ? shape : null;
    }

    private static JPanel form(Form form) {
        form.end();
        return form;
    }

    private Dependence chosen() {
        return (Dependence) kind.getSelectedItem();
    }

    private void check(DialogDescriptor dialog, NotificationLineSupport line) {
        boolean listed = !chosen().question().isEmpty();
        question.setText(listed ? chosen().question() : " ");
        places.setEnabled(listed);
        others.setEnabled(
                chosen() == Dependence.ORBITAL || chosen() == Dependence.TOTAL || chosen() == Dependence.SYSTEM);
        java.util.Optional<Problem> problem = Entry.attempt(() ->
                shape = chosen().shape(old, places.getText(), others.isSelected() && others.isEnabled(), document));
        dialog.setValid(problem.isEmpty());
        if (problem.isPresent()) {
            line.setErrorMessage(problem.get().sentence());
        } else {
            line.clearMessages();
        }
    }

    private static boolean hasOthers(ParameterShape shape) {
        return shape instanceof ParameterShape.ByOrbital by && by.others() != null
                || shape instanceof ParameterShape.ByTotal total && total.others() != null
                || shape instanceof ParameterShape.BySystem system && system.others() != null;
    }
}
