package org.wellwright.viewer.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.Box;
import javax.swing.DefaultComboBoxModel;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JSpinner;
import javax.swing.JToolBar;
import javax.swing.SpinnerNumberModel;
import org.openide.util.NbBundle.Messages;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.plot.LevelText;
import org.wellwright.viewer.plot.Picks;

/**
 * Choosers of the model and the level in front, and of m; they follow the selection and change it. Event thread only.
 */
@Messages({
    "LBL_ChooseModel=Model",
    "LBL_ChooseLevel=Level",
    "LBL_ChooseProjection=m",
    "HINT_ChooseModel=The model in front",
    "HINT_ChooseLevel=The level in front",
    "HINT_ChooseProjection=Projection m of the angular momentum on the axis"
})
final class StateChooser {
    private final JComboBox<String> models = new JComboBox<>();
    private final JComboBox<Named> levels = new JComboBox<>();
    private final JSpinner projection = new JSpinner(new SpinnerNumberModel(0, 0, 0, 1));
    private final boolean withProjection;
    private final Consumer<FigureSelection> select;
    private FigureSelection selection = FigureSelection.NONE;
    private boolean filling;

    /** A level and its name. */
    private record Named(LevelKey key, String name) {
        @Override
        public String toString() {
            return name;
        }
    }

    StateChooser(String prefix, boolean withProjection, Consumer<FigureSelection> select) {
        this.withProjection = withProjection;
        this.select = select;
        name(models, prefix + ".model", Bundle.HINT_ChooseModel());
        name(levels, prefix + ".level", Bundle.HINT_ChooseLevel());
        projection.setName(prefix + ".projection");
        projection.setToolTipText(Bundle.HINT_ChooseProjection());
        projection.getAccessibleContext().setAccessibleName(Bundle.HINT_ChooseProjection());
        models.addActionListener(event -> {
            if (!filling && models.getSelectedItem() instanceof String model) {
                select.accept(new FigureSelection(model, selection.levels(), selection.magnetic()));
            }
        });
        levels.addActionListener(event -> {
            if (!filling && levels.getSelectedItem() instanceof Named level) {
                int most = Math.max(0, level.key().channel().orbital());
                int magnetic = Math.max(-most, Math.min(most, selection.magnetic()));
                select.accept(new FigureSelection(selection.model(), List.of(level.key()), magnetic));
            }
        });
        projection.addChangeListener(event -> {
            if (!filling && levels.getSelectedItem() instanceof Named level) {
                int magnetic = (Integer) projection.getValue();
                List<LevelKey> keys = selection.levels().isEmpty() ? List.of(level.key()) : selection.levels();
                select.accept(new FigureSelection(selection.model(), keys, magnetic));
            }
        });
    }

    private static void name(JComboBox<?> box, String name, String hint) {
        box.setName(name);
        box.setToolTipText(hint);
        box.getAccessibleContext().setAccessibleName(hint);
    }

    void addTo(JToolBar tools) {
        models.setPrototypeDisplayValue("a model of usual name");
        add(tools, Bundle.LBL_ChooseModel(), models);
        levels.setPrototypeDisplayValue(new Named(null, "v=12 J=12"));
        add(tools, Bundle.LBL_ChooseLevel(), levels);
        if (withProjection) {
            add(tools, Bundle.LBL_ChooseProjection(), projection);
        }
    }

    private static void add(JToolBar tools, String text, JComponent chooser) {
        JLabel label = new JLabel(text + " ");
        label.setLabelFor(chooser);
        chooser.setMaximumSize(chooser.getPreferredSize());
        tools.add(label);
        tools.add(chooser);
        tools.add(Box.createHorizontalStrut(6));
    }

    /** Follows what is solved and selected. */
    void show(FigureInput input, FigureSelection now) {
        filling = true;
        try {
            selection = now;
            SolvedModel front = Picks.model(input, now);
            List<String> names = input.models().stream().map(SolvedModel::model).toList();
            fill(models, names, front == null ? now.model() : front.model());
            List<Named> known = new ArrayList<>();
            LevelText text = LevelText.of(input.document());
            if (front != null) {
                for (SolvedChannel channel : front.channels()) {
                    channel.keys().forEach(key -> known.add(new Named(key, text.full(key))));
                }
            }
            List<LevelKey> chosen = front == null ? List.of() : Picks.levels(front, now, 1);
            Named level = chosen.isEmpty() ? null : new Named(chosen.get(0), text.full(chosen.get(0)));
            fill(levels, known, level);
            int most = level == null ? 0 : Math.max(0, level.key().channel().orbital());
            int magnetic = Math.max(-most, Math.min(most, now.magnetic()));
            projection.setModel(new SpinnerNumberModel(magnetic, -most, most, 1));
            projection.setEnabled(most > 0);
        } finally {
            filling = false;
        }
    }

    private static <T> void fill(JComboBox<T> box, List<T> items, T chosen) {
        boolean same = box.getItemCount() == items.size();
        for (int i = 0; same && i < items.size(); i++) {
            same = box.getItemAt(i).equals(items.get(i));
        }
        if (!same) {
            DefaultComboBoxModel<T> model = new DefaultComboBoxModel<>();
            items.forEach(model::addElement);
            box.setModel(model);
        }
        box.setSelectedItem(chosen);
    }
}
