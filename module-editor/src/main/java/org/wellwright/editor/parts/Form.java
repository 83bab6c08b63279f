package org.wellwright.editor.parts;

import java.awt.Component;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.GridBagConstraints;
import java.awt.GridBagLayout;
import java.awt.Insets;
import java.awt.Rectangle;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.Scrollable;

/** Labelled fields below each other; as wide as what it is scrolled in. */
public final class Form extends JPanel implements Scrollable {
    private static final long serialVersionUID = 1L;

    private int row;

    /** Makes an empty form. */
    public Form() {
        super(new GridBagLayout());
        setBorder(BorderFactory.createEmptyBorder(6, 8, 8, 8));
    }

    /** Adds a heading. */
    public JLabel heading(String text) {
        JLabel label = new JLabel(text);
        label.putClientProperty("FlatLaf.styleClass", "h4");
        label.setFont(label.getFont().deriveFont(Font.BOLD));
        add(label, at(0, 2, row == 0 ? 0 : 10, 2));
        row++;
        return label;
    }

    /** Adds a field with a label that names it to assistive technology too. */
    public JLabel field(String text, JComponent field) {
        JLabel label = new JLabel(text);
        label.setLabelFor(field);
        field.getAccessibleContext().setAccessibleName(text);
        GridBagConstraints left = at(0, 1, 2, 2);
        left.weightx = 0;
        left.fill = GridBagConstraints.NONE;
        left.anchor = GridBagConstraints.BASELINE_LEADING;
        left.insets.right = 8;
        add(label, left);
        GridBagConstraints right = at(1, 1, 2, 2);
        right.anchor = GridBagConstraints.BASELINE_LEADING;
        add(field, right);
        row++;
        return label;
    }

    /** Adds something over the whole width. */
    public <T extends Component> T wide(T component) {
        add(component, at(0, 2, 2, 2));
        row++;
        return component;
    }

    /** Adds something over the whole width that takes the height that is left. */
    public <T extends Component> T tall(T component) {
        GridBagConstraints all = at(0, 2, 2, 2);
        all.weighty = 1;
        all.fill = GridBagConstraints.BOTH;
        add(component, all);
        row++;
        return component;
    }

    /** Takes the height that is left. */
    public void end() {
        JPanel filler = new JPanel();
        filler.setOpaque(false);
        tall(filler);
    }

    /** Starts anew. */
    public void clear() {
        removeAll();
        row = 0;
    }

    private GridBagConstraints at(int column, int width, int above, int below) {
        return new GridBagConstraints(
                column,
                row,
                width,
                1,
                1,
                0,
                GridBagConstraints.LINE_START,
                GridBagConstraints.HORIZONTAL,
                new Insets(above, 0, below, 0),
                0,
                0);
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
        return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
        return 16;
    }

    @Override
    public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
        return Math.max(16, visible.height - 32);
    }

    @Override
    public boolean getScrollableTracksViewportWidth() {
        return true;
    }

    @Override
    public boolean getScrollableTracksViewportHeight() {
        return getParent() != null && getParent().getHeight() > getPreferredSize().height;
    }
}
