package org.wellwright.editor.models;

import java.awt.Dimension;
import java.util.List;
import java.util.Optional;
import javax.swing.JButton;
import javax.swing.JCheckBox;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JScrollPane;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.edit.ArgumentText;
import org.wellwright.editor.edit.ChannelText;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.editor.parts.EntryField;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.FormulaPane;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterPool;
import org.wellwright.solver.potential.AngularFactor;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;

/** The form of a term: its shape first, then where and how strongly it acts. */
@Messages({
    "LBL_TermName=Name",
    "LBL_TermOn=Counts in the curve",
    "LBL_TermFamily=Family",
    "LBL_TermFormula=V(r) =",
    "LBL_TermScale=Times",
    "LBL_TermFrom=From r =",
    "LBL_TermTo=To r =",
    "LBL_TermChannels=Channels",
    "LBL_TermOperator=Operator",
    "HEAD_TermWhere=Where it acts",
    "HINT_TermScale=A pure number or the name of a parameter that multiplies the term",
    "HINT_TermRange=A radius, with or without a unit, or the name of a parameter; empty where it is not restricted",
    "HINT_TermChannels=all, l = 0, l = 1..3, l >= 2, or l = 1, j = 3/2",
    "HINT_TermArgument=The name of a parameter, a number in the project's units, or a number with its unit",
    "# {0} - names",
    "LBL_AddMissing=Add {0} to the parameters"
})
final class TermForm {
    private final Form form;
    private final ModelsController controller;
    private final TermPath path;
    private final ProblemLine line;
    private final Term made;

    private EntryField name;
    private JCheckBox on;
    private EntryField scale;
    private EntryField from;
    private EntryField to;
    private EntryField channels;
    private JComboBox<String> operator;
    private FormulaPane formula;
    private JButton missing;
    private TableForm table;
    private final java.util.Map<String, EntryField> arguments = new java.util.LinkedHashMap<>();

    TermForm(Form form, ModelsController controller, TermPath path, Term term, ProblemLine line) {
        this.form = form;
        this.controller = controller;
        this.path = path;
        this.made = term;
        this.line = line;
        build(term);
    }

    /** Whether this form fits a term, so that it need not be built anew. */
    boolean fits(Term term) {
        return term.getClass() == made.getClass()
                && (!(term instanceof FamilyTerm family) || family.family().equals(((FamilyTerm) made).family()));
    }

    private void build(Term term) {
        name = field("term.name", Bundle.LBL_TermName(), null, text -> controller.rename(path, text));
        on = new JCheckBox(Bundle.LBL_TermOn());
        on.setName("term.on");
        on.addActionListener(event -> line.say(controller.setEnabled(path, on.isSelected())));
        form.wide(on);
        if (term instanceof FamilyTerm family) {
            family(family);
        } else if (term instanceof FormulaTerm) {
            formula();
        } else {
            table = new TableForm(form, controller, path, line);
        }
        form.heading(Bundle.HEAD_TermWhere());
        scale = field(
                "term.scale", Bundle.LBL_TermScale(), Bundle.HINT_TermScale(), text -> controller.setScale(path, text));
        from = field(
                "term.from", Bundle.LBL_TermFrom(), Bundle.HINT_TermRange(), text -> controller.setFrom(path, text));
        to = field("term.to", Bundle.LBL_TermTo(), Bundle.HINT_TermRange(), text -> controller.setTo(path, text));
        to.putClientProperty("JTextField.placeholderText", "unbounded");
        channels = field(
                "term.channels",
                Bundle.LBL_TermChannels(),
                Bundle.HINT_TermChannels(),
                text -> controller.setChannels(path, text));
        operator = new JComboBox<>(new String[] {"1", "L·S", "S₁·S₂", "S₁₂ (tensor)"});
        operator.setName("term.operator");
        operator.addActionListener(event -> {
            if (operator.isFocusOwner() || operator.isPopupVisible()) {
                line.say(controller.setAngular(path, AngularFactor.values()[operator.getSelectedIndex()]));
            }
        });
        form.field(Bundle.LBL_TermOperator(), operator);
        form.end();
    }

    private void family(FamilyTerm term) {
        List<PotentialFamily> families = FamilyCatalogue.families();
        JComboBox<String> choice = new JComboBox<>(
                families.stream().map(PotentialFamily::displayName).toArray(String[]::new));
        choice.setName("term.family");
        PotentialFamily family = FamilyCatalogue.find(term.family()).orElse(null);
        choice.setSelectedItem(family == null ? null : family.displayName());
        choice.addActionListener(event -> {
            String id = families.get(Math.max(0, choice.getSelectedIndex())).id();
            if (choice.getSelectedIndex() >= 0 && !id.equals(term.family())) {
                line.say(controller.setFamily(path, id));
            }
        });
        form.field(Bundle.LBL_TermFamily(), choice);
        if (family == null) {
            JLabel unknown = form.wide(new JLabel(
                    "<html>The family '%s' is not installed; choose another, or install the module that brings it."
                            .formatted(term.family())));
            unknown.setName("term.unknown");
            return;
        }
        form.wide(FamilyText.label(family));
        for (FamilyParameter parameter : family.parameters()) {
            EntryField field = field(
                    "term.argument." + parameter.name(),
                    FamilyText.title(parameter),
                    parameter.meaning() + ". " + Bundle.HINT_TermArgument(),
                    text -> controller.setArgument(path, parameter, text));
            arguments.put(parameter.name(), field);
        }
    }

    private void formula() {
        formula = new FormulaPane(
                "term.formula",
                line,
                () -> {
                    List<String> names = new java.util.ArrayList<>(controller.document().parameters().stream()
                            .map(Parameter::name)
                            .toList());
                    names.addAll(ParameterPool.SYSTEM_NAMES);
                    return names;
                },
                text -> controller.setFormula(path, text),
                controller::endTyping);
        JScrollPane scroll = new JScrollPane(formula);
        scroll.setPreferredSize(
                new Dimension(120, 4 * formula.getFontMetrics(formula.getFont()).getHeight() + 8));
        form.wide(new JLabel(Bundle.LBL_TermFormula())).setLabelFor(formula);
        form.wide(scroll);
        missing = form.wide(new JButton());
        missing.setName("term.addMissing");
        missing.addActionListener(event -> line.say(controller.addMissing(path)));
    }

    private EntryField field(String id, String label, String hint, org.wellwright.editor.parts.Entry entry) {
        EntryField field = new EntryField(id, 10).onEntry(entry, line);
        field.setToolTipText(hint);
        form.field(label, field);
        return field;
    }

    void show(Term term, ModelDocument document) {
        name.show(term.frame().name());
        on.setSelected(term.frame().enabled());
        scale.show(ArgumentText.text(term.frame().scale()));
        from.show(ArgumentText.text(term.frame().from()));
        to.show(ArgumentText.text(term.frame().to()));
        channels.show(ChannelText.text(term.frame().channels()));
        operator.setSelectedIndex(term.frame().angular().ordinal());
        if (term instanceof FamilyTerm family) {
            arguments.forEach((parameter, field) ->
                    field.show(Optional.ofNullable(family.arguments().get(parameter))
                            .map(ArgumentText::text)
                            .orElse("")));
        } else if (term instanceof FormulaTerm written) {
            formula.show(written.text());
            List<String> names = ModelsController.missing(document, path);
            missing.setVisible(!names.isEmpty());
            missing.setText(Bundle.LBL_AddMissing(String.join(", ", names)));
        } else {
            table.show((TableTerm) term, document);
        }
    }
}
