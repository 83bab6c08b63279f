package org.wellwright.branding;

import java.awt.FlowLayout;
import java.beans.PropertyChangeListener;
import java.beans.PropertyChangeSupport;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.ButtonGroup;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JRadioButton;
import org.netbeans.spi.options.OptionsPanelController;
import org.openide.awt.Mnemonics;
import org.openide.util.HelpCtx;
import org.openide.util.Lookup;
import org.openide.util.NbBundle.Messages;

/** The page of the options window on which the user chooses the light or the dark look. Event thread only. */
@OptionsPanelController.TopLevelRegistration(
        id = "Look",
        categoryName = "#CTL_Look",
        iconBase = "org/wellwright/branding/look.png",
        keywords = "#KW_Look",
        keywordsCategory = "Look",
        position = 900)
@Messages({
    "CTL_Look=Look",
    "KW_Look=light, dark, look, theme, colours",
    "CTL_LookLight=&Light",
    "CTL_LookDark=&Dark",
    "CTL_LookQuestion=Windows and charts are",
    "CTL_LookWhen=A change takes effect at the next start."
})
public final class LookOptions extends OptionsPanelController {
    private final PropertyChangeSupport changes = new PropertyChangeSupport(this);
    private final JRadioButton light = choice("look.light", Bundle.CTL_LookLight());
    private final JRadioButton dark = choice("look.dark", Bundle.CTL_LookDark());
    private final JPanel page = page();

    @Override
    public void update() {
        light.setSelected(WindowLook.chosen() == WindowLook.LIGHT);
        dark.setSelected(WindowLook.chosen() == WindowLook.DARK);
    }

    @Override
    public void applyChanges() {
        selected().choose();
    }

    @Override
    public void cancel() {
        // Nothing was written.
    }

    @Override
    public boolean isValid() {
        return true;
    }

    @Override
    public boolean isChanged() {
        return selected() != WindowLook.chosen();
    }

    @Override
    public JComponent getComponent(Lookup masterLookup) {
        return page;
    }

    @Override
    public HelpCtx getHelpCtx() {
        return null;
    }

    @Override
    public void addPropertyChangeListener(PropertyChangeListener listener) {
        changes.addPropertyChangeListener(listener);
    }

    @Override
    public void removePropertyChangeListener(PropertyChangeListener listener) {
        changes.removePropertyChangeListener(listener);
    }

    private WindowLook selected() {
        return dark.isSelected() ? WindowLook.DARK : WindowLook.LIGHT;
    }

    private JRadioButton choice(String name, String text) {
        JRadioButton button = new JRadioButton();
        Mnemonics.setLocalizedText(button, text);
        button.setName(name);
        button.addActionListener(event -> changes.firePropertyChange(PROP_CHANGED, null, null));
        return button;
    }

    private JPanel page() {
        ButtonGroup group = new ButtonGroup();
        group.add(light);
        group.add(dark);
        JPanel row = new JPanel(new FlowLayout(FlowLayout.LEADING));
        row.add(new JLabel(Bundle.CTL_LookQuestion()));
        row.add(light);
        row.add(dark);
        JPanel note = new JPanel(new FlowLayout(FlowLayout.LEADING));
        note.add(new JLabel(Bundle.CTL_LookWhen()));
        JPanel column = new JPanel();
        column.setLayout(new BoxLayout(column, BoxLayout.Y_AXIS));
        column.add(row);
        column.add(note);
        column.add(Box.createVerticalGlue());
        JPanel whole = new JPanel(new FlowLayout(FlowLayout.LEADING));
        whole.add(column);
        return whole;
    }
}
