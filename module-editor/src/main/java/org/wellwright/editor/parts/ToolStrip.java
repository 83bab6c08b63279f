package org.wellwright.editor.parts;

import java.awt.event.ActionEvent;
import javax.swing.AbstractAction;
import javax.swing.Action;
import javax.swing.BorderFactory;
import javax.swing.Icon;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JPopupMenu;
import javax.swing.JToolBar;

/** A row of buttons above a table or tree. */
public final class ToolStrip extends JToolBar {
    private static final long serialVersionUID = 1L;

    private final String prefix;

    /**
     * Makes an empty row.
     *
     * @param prefix start of the names of its buttons: "parameters" gives "parameters.add"
     */
    public ToolStrip(String prefix) {
        this.prefix = prefix;
        setFloatable(false);
        setBorder(BorderFactory.createEmptyBorder(2, 4, 2, 4));
        setName(prefix + ".tools");
        getAccessibleContext().setAccessibleName("Tools");
    }

    /** Adds a button with an icon; the text is its tooltip and its name to assistive technology. */
    public JButton icon(String name, Icon icon, String text, Runnable action) {
        JButton button = new JButton(icon);
        button.setToolTipText(text);
        return add(button, name, text, action);
    }

    /** Adds a button with a text. */
    public JButton text(String name, Icon icon, String text, String hint, Runnable action) {
        JButton button = new JButton(text, icon);
        button.setToolTipText(hint);
        return add(button, name, text, action);
    }

    /** Adds a button that opens a menu. */
    public JButton menu(String name, Icon icon, String text, String hint, JPopupMenu menu) {
        JButton button = new JButton(text + " ▾", icon);
        button.setToolTipText(hint);
        return add(button, name, text, () -> menu.show(button, 0, button.getHeight()));
    }

    private JButton add(JButton button, String name, String text, Runnable action) {
        button.setName(prefix + "." + name);
        button.getAccessibleContext().setAccessibleName(text);
        button.setFocusable(true);
        button.addActionListener(event -> action.run());
        add((JComponent) button);
        return button;
    }

    /** An action from a piece of code. */
    public static Action action(String text, Runnable code) {
        return new AbstractAction(text) {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                code.run();
            }
        };
    }
}
