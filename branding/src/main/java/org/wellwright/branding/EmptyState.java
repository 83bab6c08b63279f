package org.wellwright.branding;

import java.awt.Component;
import java.awt.Font;
import java.awt.GridBagLayout;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.SwingConstants;
import javax.swing.UIManager;

/**
 * What a window shows while it has nothing to show: what is missing, and in one sentence what to do about it. Event
 * thread only.
 */
public final class EmptyState extends JPanel {
    private static final long serialVersionUID = 1L;
    private static final int LINE_WIDTH = 260;

    /**
     * Makes the panel.
     *
     * @param missing what is missing, a few words of plain text
     * @param remedy what to do, a sentence of plain text
     */
    public EmptyState(String missing, String remedy) {
        super(new GridBagLayout());
        JLabel head = new JLabel(missing, SwingConstants.CENTER);
        head.setFont(UIManager.getFont("Label.font")
                .deriveFont(Font.BOLD, UIManager.getFont("Label.font").getSize2D() * 1.2f));
        head.setAlignmentX(Component.CENTER_ALIGNMENT);
        JLabel hint = new JLabel(
                "<html><div style='text-align: center; width: %dpx'>%s</div>".formatted(LINE_WIDTH, escape(remedy)));
        hint.setAlignmentX(Component.CENTER_ALIGNMENT);
        JPanel column = new JPanel();
        column.setOpaque(false);
        column.setLayout(new BoxLayout(column, BoxLayout.Y_AXIS));
        column.add(head);
        column.add(Box.createVerticalStrut(8));
        column.add(hint);
        add(column);
        getAccessibleContext().setAccessibleName(missing + ". " + remedy);
    }

    private static String escape(String text) {
        return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
    }
}
