package org.wellwright.project.window;

import java.awt.GridBagConstraints;
import java.awt.GridBagLayout;
import java.awt.Insets;
import java.util.List;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextField;
import org.openide.DialogDescriptor;
import org.openide.DialogDisplayer;
import org.openide.NotificationLineSupport;
import org.openide.util.NbBundle.Messages;
import org.wellwright.project.Project;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.units.Constants;
import org.wellwright.solver.units.UnitSystem;

/** Asks for what a new project needs from the start: its title, its units, its two bodies, how its levels are named. */
@Messages({
    "TTL_NewProject=New project",
    "LBL_NewTitle=Title",
    "LBL_NewUnits=Units",
    "LBL_NewFirst=First body",
    "LBL_NewSecond=Second body",
    "LBL_NewLabels=Levels are named",
    "HINT_NewBodies=Particles of the table, as e-, p, mu-, Na-23; other masses can be typed later under Pair systems.",
    "TXT_NewTitle=Untitled"
})
final class NewProject {
    private static final String[] LABELS = {"2p  (n and the letter of l)", "1P  (n and the letter of L)", "v=0 J=1"};

    private NewProject() {}

    /** Asks; empty if the user thinks better of it. */
    static Optional<Project> ask() {
        JTextField title = new JTextField(24);
        JComboBox<String> units =
                new JComboBox<>(UnitSystem.ALL.stream().map(UnitSystem::title).toArray(String[]::new));
        List<String> particles = ParticleCatalogue.STANDARD.particles().stream()
                .map(particle -> particle.id())
                .toList();
        JComboBox<String> first = bodies(particles, "e-");
        JComboBox<String> second = bodies(particles, "p");
        JComboBox<String> labels = new JComboBox<>(LABELS);
        JPanel panel = new JPanel(new GridBagLayout());
        panel.setBorder(BorderFactory.createEmptyBorder(12, 12, 4, 12));
        row(panel, 0, Bundle.LBL_NewTitle(), title, "new.title");
        row(panel, 1, Bundle.LBL_NewUnits(), units, "new.units");
        row(panel, 2, Bundle.LBL_NewFirst(), first, "new.first");
        row(panel, 3, Bundle.LBL_NewSecond(), second, "new.second");
        row(panel, 4, Bundle.LBL_NewLabels(), labels, "new.labels");
        DialogDescriptor dialog = new DialogDescriptor(panel, Bundle.TTL_NewProject());
        NotificationLineSupport line = dialog.createNotificationLineSupport();
        line.setInformationMessage(Bundle.HINT_NewBodies());
        Project[] made = new Project[1];
        Runnable check = () -> {
            try {
                made[0] = project(
                        title.getText(),
                        UnitSystem.ALL.get(units.getSelectedIndex()),
                        String.valueOf(first.getEditor().getItem()),
                        String.valueOf(second.getEditor().getItem()),
                        LabelConvention.values()[labels.getSelectedIndex()]);
                line.setInformationMessage(Bundle.HINT_NewBodies());
                dialog.setValid(true);
            } catch (InvalidModelException e) {
                line.setErrorMessage(e.problem().sentence());
                dialog.setValid(false);
            }
        };
        for (JComboBox<String> box : List.of(units, first, second, labels)) {
            box.addActionListener(event -> check.run());
        }
        // What is being typed when OK is pressed has not been told by an event yet.
        check.run();
        if (DialogDisplayer.getDefault().notify(dialog) != DialogDescriptor.OK_OPTION) {
            return Optional.empty();
        }
        check.run();
        return Optional.ofNullable(made[0]);
    }

    /**
     * A project with one pair of bodies and nothing else.
     *
     * @throws InvalidModelException if a body is not in the table
     */
    static Project project(String title, UnitSystem units, String first, String second, LabelConvention labels) {
        ParticleCatalogue table = ParticleCatalogue.STANDARD;
        PairSystem pair = PairSystem.of("pair", table.body(first.strip()), table.body(second.strip()));
        ModelDocument document = new ModelDocument(
                Constants.EDITION,
                ParticleCatalogue.EDITION,
                units.id(),
                labels,
                Weighting.KNOWN,
                List.of(pair),
                List.of(),
                List.of(),
                List.of(),
                List.of());
        return Project.of(title.isBlank() ? Bundle.TXT_NewTitle() : title.strip(), document);
    }

    private static JComboBox<String> bodies(List<String> particles, String chosen) {
        JComboBox<String> box = new JComboBox<>(particles.toArray(new String[0]));
        box.setEditable(true);
        box.setSelectedItem(chosen);
        return box;
    }

    private static void row(JPanel panel, int row, String text, JComponent field, String name) {
        field.setName(name);
        if (field instanceof JComboBox<?> box && box.isEditable()) {
            ((JComponent) box.getEditor().getEditorComponent()).setName(name + ".text");
        }
        JLabel label = new JLabel(text);
        label.setLabelFor(field);
        field.getAccessibleContext().setAccessibleName(text);
        Insets insets = new Insets(3, 0, 3, 10);
        panel.add(
                label,
                new GridBagConstraints(
                        0, row, 1, 1, 0, 0, GridBagConstraints.LINE_START, GridBagConstraints.NONE, insets, 0, 0));
        panel.add(
                field,
                new GridBagConstraints(
                        1,
                        row,
                        1,
                        1,
                        1,
                        0,
                        GridBagConstraints.LINE_START,
                        GridBagConstraints.HORIZONTAL,
                        new Insets(3, 0, 3, 0),
                        0,
                        0));
    }
}
