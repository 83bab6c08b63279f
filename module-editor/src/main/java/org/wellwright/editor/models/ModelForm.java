package org.wellwright.editor.models;

import java.awt.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.JCheckBox;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.edit.Lists;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.EntryField;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.Grid;
import org.wellwright.editor.parts.GridColumn;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.editor.parts.Typing;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Geometry;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ModelError;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** The form of a model: its name, what it stands for, which systems it serves, how far it may be wrong. */
@Messages({
    "LBL_ModelName=Name",
    "LBL_ModelNote=What it stands for",
    "LBL_ModelGeometry=Motion",
    "HEAD_ModelSystems=Systems it serves",
    "HEAD_ModelError=How far the model itself may be wrong",
    "HINT_ModelError=An error of the model's own, added in quadrature to the measured uncertainty; none counts as exact",
    "LBL_ModelErrorAdd=Add an error",
    "# {0} - number of couplings",
    "LBL_Couplings=Its curves are coupled ({0} couplings; they are edited in the project file)."
})
final class ModelForm {
    private record ErrorRow(int index, String group, String value, String unit, String measure, String fitted) {}

    private static final String RELATIVE = "relative";
    private static final String ABSOLUTE = "absolute";
    private static final String ALL_DATA = "(all other data)";

    private final Form form;
    private final ModelsController controller;
    private final TermPath path;
    private final ProblemLine line;
    private final EntryField name;
    private final JTextArea note = new JTextArea(3, 10);
    private final JComboBox<String> geometry = new JComboBox<>(new String[] {"in space", "in a plane"});
    private final List<JCheckBox> systems = new ArrayList<>();
    private final List<String> systemIds;
    private final Grid<ErrorRow> errors;
    private final JLabel couplings = new JLabel();
    private boolean filling;

    ModelForm(Form form, ModelsController controller, TermPath path, ProblemLine line) {
        this.form = form;
        this.controller = controller;
        this.path = path;
        this.line = line;
        name = new EntryField("model.name", 10).onEntry(text -> controller.rename(path, text), line);
        form.field(Bundle.LBL_ModelName(), name);
        geometry.setName("model.geometry");
        geometry.addActionListener(event -> {
            if (!filling) {
                line.say(controller.setGeometry(path, Geometry.values()[geometry.getSelectedIndex()]));
            }
        });
        form.field(Bundle.LBL_ModelGeometry(), geometry);
        note.setName("model.note");
        note.setLineWrap(true);
        note.setWrapStyleWord(true);
        note.getDocument().addDocumentListener(new Typing(() -> {
            if (!filling) {
                controller.setNote(path, note.getText());
            }
        }));
        note.addFocusListener(new java.awt.event.FocusAdapter() {
            @Override
            public void focusLost(java.awt.event.FocusEvent event) {
                controller.endTyping();
            }
        });
        JLabel label = form.wide(new JLabel(Bundle.LBL_ModelNote()));
        label.setLabelFor(note);
        note.getAccessibleContext().setAccessibleName(Bundle.LBL_ModelNote());
        form.wide(new JScrollPane(note));
        systemIds = controller.document().systems().stream()
                .map(system -> system.id())
                .toList();
        if (systemIds.size() > 1) {
            systems();
        }
        form.heading(Bundle.HEAD_ModelError()).setToolTipText(Bundle.HINT_ModelError());
        errors = new Grid<>("model.errors", Bundle.HEAD_ModelError(), columns(), line);
        errors.onMenu(Bundle.LBL_ModelErrorAdd(), "INSERT", this::addError);
        errors.onMenu("Remove the selected errors", "DELETE", this::removeErrors);
        JScrollPane scroll = new JScrollPane(errors);
        scroll.setPreferredSize(new Dimension(120, 80));
        form.wide(scroll);
        javax.swing.JButton add = form.wide(new javax.swing.JButton(Bundle.LBL_ModelErrorAdd()));
        add.setName("model.addError");
        add.setToolTipText(Bundle.HINT_ModelError());
        add.addActionListener(event -> addError());
        form.wide(couplings);
        form.end();
    }

    private void systems() {
        form.heading(Bundle.HEAD_ModelSystems());
        for (String id : systemIds) {
            JCheckBox box = form.wide(new JCheckBox(id));
            box.setName("model.system." + id);
            box.addActionListener(event -> line.say(controller.setSystems(path, chosenSystems())));
            systems.add(box);
        }
    }

    private List<String> chosenSystems() {
        List<String> chosen = new ArrayList<>();
        for (int i = 0; i < systems.size(); i++) {
            if (systems.get(i).isSelected()) {
                chosen.add(systemIds.get(i));
            }
        }
        return chosen;
    }

    private List<GridColumn<ErrorRow>> columns() {
        return List.of(
                GridColumn.typed(
                                "Data group",
                                "The group of data it belongs to",
                                GridColumn.Kind.CHOICE,
                                ALL_DATA,
                                ErrorRow::group,
                                this::setGroup)
                        .withChoices(row -> {
                            List<String> groups = new ArrayList<>(List.of(ALL_DATA));
                            controller.document().groups().stream()
                                    .map(DataGroup::id)
                                    .forEach(groups::add);
                            return groups;
                        }),
                GridColumn.typed(
                        "Size",
                        "A number with its unit, or a fraction of the value (0.01 or 1 %)",
                        GridColumn.Kind.NUMBER,
                        "0.0123 cm^-1",
                        row -> (row.value() + " " + row.unit()).strip(),
                        this::setSize),
                GridColumn.shown(
                        "Measure",
                        "Absolute or a fraction of the value",
                        GridColumn.Kind.TEXT,
                        ABSOLUTE,
                        ErrorRow::measure),
                GridColumn.typed(
                        "Fit it",
                        "Whether a fit finds it by maximum likelihood",
                        GridColumn.Kind.CHECK,
                        "Fit it",
                        ErrorRow::fitted,
                        this::setFitted));
    }

    boolean fits(ModelDocument document) {
        return systemIds.equals(
                document.systems().stream().map(system -> system.id()).toList());
    }

    void show(Model model) {
        filling = true;
        name.show(model.name());
        if (!note.getText().equals(model.note())) {
            note.setText(model.note());
            note.setCaretPosition(0);
        }
        geometry.setSelectedIndex(model.geometry().ordinal());
        for (int i = 0; i < systems.size(); i++) {
            systems.get(i).setSelected(model.serves(systemIds.get(i)));
        }
        List<ErrorRow> rows = new ArrayList<>();
        for (int i = 0; i < model.error().parts().size(); i++) {
            ModelError.Part part = model.error().parts().get(i);
            rows.add(new ErrorRow(
                    i,
                    part.group().isEmpty() ? ALL_DATA : part.group(),
                    part.value().text(),
                    part.unit(),
                    part.measure() == ModelError.Measure.RELATIVE ? RELATIVE : ABSOLUTE,
                    part.fitted() ? "yes" : "no"));
        }
        errors.setRows(rows);
        couplings.setVisible(!model.couplings().isEmpty());
        couplings.setText("<html>" + Bundle.LBL_Couplings(model.couplings().size()));
        filling = false;
    }

    private void addError() {
        line.say(controller.setError(path, model -> {
            List<String> taken =
                    model.error().parts().stream().map(ModelError.Part::group).toList();
            List<String> free = new ArrayList<>(List.of(""));
            controller.document().groups().stream().map(DataGroup::id).forEach(free::add);
            free.removeAll(taken);
            if (free.isEmpty()) {
                throw new InvalidModelException("every data group has an error already", "", "change one of them");
            }
            ModelError.Part part =
                    new ModelError.Part(free.get(0), ModelError.Measure.RELATIVE, new ExactNumber("0.01"), "", false);
            return model.withError(new ModelError(Lists.added(model.error().parts(), part)));
        }));
    }

    private void removeErrors() {
        List<Integer> selected = errors.selection();
        line.say(controller.setError(path, model -> {
            List<ModelError.Part> parts = new ArrayList<>(model.error().parts());
            for (int i = selected.size() - 1; i >= 0; i--) {
                parts.remove((int) selected.get(i));
            }
            return model.withError(new ModelError(parts));
        }));
    }

    private Optional<Problem> setGroup(ErrorRow row, String group) {
        return part(
                row,
                part -> new ModelError.Part(
                        group.equals(ALL_DATA) ? "" : group, part.measure(), part.value(), part.unit(), part.fitted()));
    }

    private Optional<Problem> setFitted(ErrorRow row, String yes) {
        return part(
                row,
                part -> new ModelError.Part(
                        part.group(), part.measure(), part.value(), part.unit(), yes.equals("yes")));
    }

    private Optional<Problem> setSize(ErrorRow row, String text) {
        return part(row, part -> {
            String plain = text.strip();
            if (plain.endsWith("%")) {
                double percent = QuantityText.parse(plain.substring(0, plain.length() - 1), "", UnitSystem.ATOMIC)
                        .value();
                return new ModelError.Part(
                        part.group(), ModelError.Measure.RELATIVE, ExactNumber.of(percent / 100), "", part.fitted());
            }
            int end = plain.replaceFirst("^[+-]?[\\d.]+(?:[eE][+-]?\\d+)?", "").length();
            String unit =
                    UnitExpression.parse(plain.substring(plain.length() - end)).text();
            ExactNumber number = QuantityText.parse(plain.substring(0, plain.length() - end), "", UnitSystem.ATOMIC);
            ModelError.Measure measure = unit.isEmpty() ? ModelError.Measure.RELATIVE : ModelError.Measure.ABSOLUTE;
            return new ModelError.Part(part.group(), measure, number, unit, part.fitted());
        });
    }

    private Optional<Problem> part(ErrorRow row, java.util.function.UnaryOperator<ModelError.Part> change) {
        return Entry.attempt(() -> controller
                .setError(
                        path,
                        model -> model.withError(
                                new ModelError(Lists.with(model.error().parts(), row.index(), change))))
                .ifPresent(problem -> {
                    throw new InvalidModelException(problem);
                }));
    }
}
