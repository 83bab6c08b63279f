package org.wellwright.editor.parameters;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.Box;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JSlider;
import javax.swing.Timer;
import org.openide.util.NbBundle.Messages;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.EntryField;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitSystem;

/** A slider on one number of the pool, between two ends that can be typed. A drag is one step of undo. */
@Messages({
    "LBL_SliderNone=Select a parameter to move it with a slider",
    "HINT_SliderLow=Value at the left end of the slider",
    "HINT_SliderHigh=Value at the right end of the slider",
    "# {0} - parameter",
    "ACSN_Slider=Value of {0}"
})
final class ValueSlider extends JPanel {
    private static final long serialVersionUID = 1L;
    /** Presses of an arrow key that follow each other faster than this are one step. */
    private static final int PAUSE_MILLIS = 700;

    private final JLabel title = new JLabel(Bundle.LBL_SliderNone());
    private final JSlider slider = new JSlider(0, SliderScale.STEPS);
    private final EntryField low = new EntryField("parameters.slider.low", 7);
    private final EntryField high = new EntryField("parameters.slider.high", 7);
    private final transient Map<String, SliderScale> scales = new HashMap<>();
    private final Timer pause;
    private transient ParametersController controller;
    private transient ParametersViewModel.Row row;
    private transient Setting setting;
    private transient UnitSystem units = UnitSystem.ATOMIC;
    private boolean filling;

    ValueSlider(ProblemLine line) {
        super(new BorderLayout(6, 0));
        setBorder(BorderFactory.createEmptyBorder(3, 8, 3, 8));
        slider.setName("parameters.slider");
        low.setToolTipText(Bundle.HINT_SliderLow());
        high.setToolTipText(Bundle.HINT_SliderHigh());
        low.getAccessibleContext().setAccessibleName(Bundle.HINT_SliderLow());
        high.getAccessibleContext().setAccessibleName(Bundle.HINT_SliderHigh());
        low.onEntry(text -> end(text, true), line);
        high.onEntry(text -> end(text, false), line);
        title.setPreferredSize(new Dimension(150, title.getPreferredSize().height));
        low.setMaximumSize(low.getPreferredSize());
        high.setMaximumSize(high.getPreferredSize());
        Box ends = Box.createHorizontalBox();
        ends.add(low);
        ends.add(slider);
        ends.add(high);
        add(title, BorderLayout.LINE_START);
        add(ends, BorderLayout.CENTER);
        pause = new Timer(PAUSE_MILLIS, event -> {
            if (controller != null) {
                controller.endSlide();
            }
        });
        pause.setRepeats(false);
        slider.addChangeListener(event -> moved());
        show(null, null, null, UnitSystem.ATOMIC);
    }

    /** Follows another number, or the same one after a change; nothing if the row has none to move. */
    void show(ParametersController shownBy, ParametersViewModel.Row shown, Setting now, UnitSystem system) {
        controller = shownBy;
        row = shown;
        setting = now;
        units = system;
        boolean there = row != null && setting != null;
        slider.setEnabled(there);
        low.setEnabled(there);
        high.setEnabled(there);
        if (!there) {
            title.setText(Bundle.LBL_SliderNone());
            title.setPreferredSize(null);
            low.setVisible(false);
            high.setVisible(false);
            slider.setVisible(false);
            return;
        }
        low.setVisible(true);
        high.setVisible(true);
        slider.setVisible(true);
        String name = row.place().isEmpty() ? row.name() : row.name() + " (" + row.place() + ")";
        title.setText(name + " = " + setting.value() + (row.unit().isEmpty() ? "" : " " + row.unit()));
        title.setPreferredSize(
                new Dimension(Math.max(170, title.getMinimumSize().width), title.getMinimumSize().height));
        slider.getAccessibleContext().setAccessibleName(Bundle.ACSN_Slider(name));
        double value = setting.value().value();
        SliderScale scale = scale();
        if (!scale.holds(value) && !slider.getValueIsAdjusting()) {
            scale = SliderScale.around(setting);
            scales.put(key(), scale);
        }
        low.show(ExactNumber.of(scale.low()).text());
        high.show(ExactNumber.of(scale.high()).text());
        if (!slider.getValueIsAdjusting()) {
            filling = true;
            slider.setValue(scale.tick(value));
            filling = false;
        }
    }

    private String key() {
        return row.name() + "/" + row.place();
    }

    private SliderScale scale() {
        return scales.computeIfAbsent(key(), k -> SliderScale.around(setting));
    }

    private void moved() {
        if (filling || row == null || setting == null) {
            return;
        }
        SliderScale scale = scale();
        controller.slide(row.parameter(), row.entry(), row.name(), scale.value(slider.getValue()), scale.step());
        if (slider.getValueIsAdjusting()) {
            pause.stop();
        } else {
            // A mouse has let go, or a key was pressed once.
            pause.restart();
        }
    }

    private Optional<Problem> end(String text, boolean left) {
        return Entry.attempt(() -> {
            double typed = QuantityText.parse(text, row.unit(), units).value();
            SliderScale old = scale();
            scales.put(key(), left ? new SliderScale(typed, old.high()) : new SliderScale(old.low(), typed));
            show(controller, row, setting, units);
        });
    }
}
