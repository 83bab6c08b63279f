package org.wellwright.editor.models;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.ListSelectionModel;
import org.openide.DialogDescriptor;
import org.openide.DialogDisplayer;
import org.openide.NotificationLineSupport;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.edit.ArgumentText;
import org.wellwright.editor.edit.Units;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.Typing;
import org.wellwright.solver.Problem;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;

/**
 * Lets the user choose a family of potentials, with its formula and validity, and say what stands for its parameters.
 */
@Messages({
    "TTL_FamilyChooser=Add a term of a family",
    "LBL_Families=Families",
    "HEAD_FamilyParameters=What stands for its parameters",
    "HINT_FamilyParameters=A new name makes a new parameter; a known one is shared; a number, with or without its unit, is fixed in the term."
})
final class FamilyChooser {
    private final ModelsController controller;
    private final List<PotentialFamily> families = FamilyCatalogue.families();
    private final JList<String> list =
            new JList<>(families.stream().map(PotentialFamily::displayName).toArray(String[]::new));
    private final Form form = new Form();
    private final Map<String, JTextField> fields = new LinkedHashMap<>();
    private DialogDescriptor dialog;
    private NotificationLineSupport line;

    private FamilyChooser(ModelsController controller) {
        this.controller = controller;
    }

    /**
     * The choice.
     *
     * @param family the family
     * @param texts what stands for its parameters, by their names
     */
    record Choice(PotentialFamily family, Map<String, String> texts) {}

    /** Asks; empty if the user thinks better of it. */
    static Optional<Choice> ask(ModelsController controller) {
        return new FamilyChooser(controller).ask();
    }

    private Optional<Choice> ask() {
        list.setName("family.list");
        list.getAccessibleContext().setAccessibleName(Bundle.LBL_Families());
        list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        list.setSelectedIndex(0);
        JPanel panel = new JPanel(new BorderLayout(8, 0));
        panel.setBorder(BorderFactory.createEmptyBorder(8, 8, 0, 8));
        JScrollPane names = new JScrollPane(list);
        names.setPreferredSize(new Dimension(170, 300));
        panel.add(names, BorderLayout.LINE_START);
        JScrollPane right = new JScrollPane(form);
        right.setPreferredSize(new Dimension(430, 300));
        right.setBorder(null);
        panel.add(right, BorderLayout.CENTER);
        dialog = new DialogDescriptor(panel, Bundle.TTL_FamilyChooser());
        line = dialog.createNotificationLineSupport();
        list.addListSelectionListener(event -> show());
        show();
        return DialogDisplayer.getDefault().notify(dialog) == DialogDescriptor.OK_OPTION
                ? Optional.of(new Choice(family(), texts()))
                : Optional.empty();
    }

    private PotentialFamily family() {
        return families.get(Math.max(0, list.getSelectedIndex()));
    }

    private Map<String, String> texts() {
        Map<String, String> texts = new LinkedHashMap<>();
        fields.forEach((name, field) -> texts.put(name, field.getText()));
        return texts;
    }

    private void show() {
        form.clear();
        fields.clear();
        PotentialFamily family = family();
        form.heading(family.displayName());
        JLabel text = form.wide(new JLabel(FamilyText.html(family, 300)));
        text.setName("family.text");
        form.heading(Bundle.HEAD_FamilyParameters());
        Map<String, String> names = controller.suggestedNames(family);
        for (FamilyParameter parameter : family.parameters()) {
            JTextField field = new JTextField(names.get(parameter.name()), 12);
            field.setName("family.argument." + parameter.name());
            String unit = Units.of(controller.document()).unitText(parameter.dimension());
            field.setToolTipText(parameter.meaning() + (unit.isEmpty() ? "; a pure number" : "; in " + unit));
            field.getDocument().addDocumentListener(new Typing(this::check));
            fields.put(parameter.name(), field);
            form.field(FamilyText.title(parameter), field);
            form.field(
                    "",
                    new JLabel("<html><div style='width:190px'>" + parameter.meaning()
                            + (unit.isEmpty() ? "" : ", " + unit)));
        }
        form.wide(new JLabel("<html><div style='width:300px'>" + Bundle.HINT_FamilyParameters()));
        form.end();
        form.revalidate();
        form.repaint();
        check();
    }

    private void check() {
        Optional<Problem> problem = Optional.empty();
        for (FamilyParameter parameter : family().parameters()) {
            String text = fields.get(parameter.name()) == null
                    ? ""
                    : fields.get(parameter.name()).getText();
            boolean fresh = text.strip().matches("\\p{L}[\\p{L}\\p{N}_]*")
                    && controller.document().parameters().stream()
                            .noneMatch(p -> p.name().equals(text.strip()));
            if (problem.isEmpty() && !fresh) {
                problem = Entry.attempt(
                        () -> ArgumentText.parse(text, parameter.dimension(), null, controller.document()));
            }
        }
        dialog.setValid(problem.isEmpty());
        if (problem.isPresent()) {
            line.setErrorMessage(problem.get().sentence());
        } else {
            line.clearMessages();
        }
    }
}
