package org.wellwright.project.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.util.List;
import java.util.Locale;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.SwingUtilities;
import org.openide.DialogDescriptor;
import org.openide.DialogDisplayer;
import org.openide.NotifyDescriptor;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;

/** Asks the user, with buttons that say what they do; tells of faults in three parts. Event thread only. */
final class Ask {
    private static final int WIDTH = 380;

    private Ask() {}

    /**
     * One of the answers.
     *
     * @param name name of its button, for whoever drives the window
     * @param text what the button says
     */
    record Answer(String name, String text) {}

    /** Asks; null if the dialog was closed. The first answer is that of the Enter key. */
    static Answer one(String title, String question, List<String> items, Answer... answers) {
        JPanel panel = new JPanel(new BorderLayout(0, 8));
        panel.setBorder(BorderFactory.createEmptyBorder(12, 12, 4, 12));
        JLabel text = new JLabel("<html><div style='width:%dpx'>%s</div>".formatted(WIDTH, html(question)));
        text.setName("ask.question");
        panel.add(text, BorderLayout.NORTH);
        if (!items.isEmpty()) {
            JList<String> list = new JList<>(items.toArray(new String[0]));
            list.setName("ask.items");
            list.setVisibleRowCount(Math.min(6, items.size()));
            list.getAccessibleContext().setAccessibleName(title);
            JScrollPane scroll = new JScrollPane(list);
            scroll.setPreferredSize(new Dimension(WIDTH + 60, scroll.getPreferredSize().height));
            panel.add(scroll, BorderLayout.CENTER);
        }
        JButton[] buttons = new JButton[answers.length];
        for (int i = 0; i < answers.length; i++) {
            buttons[i] = new JButton(answers[i].text());
            buttons[i].setName("ask." + answers[i].name());
        }
        DialogDescriptor dialog = new DialogDescriptor(
                panel, title, true, buttons, buttons[0], DialogDescriptor.DEFAULT_ALIGN, null, null);
        Object chosen = DialogDisplayer.getDefault().notify(dialog);
        for (int i = 0; i < buttons.length; i++) {
            if (chosen == buttons[i]) {
                return answers[i];
            }
        }
        return null;
    }

    /** Tells of a fault; may be called from any thread, returns at once. */
    static void tell(WellwrightException fault) {
        tell(fault.problem());
    }

    /** Tells of a fault; may be called from any thread, returns at once. */
    static void tell(Problem problem) {
        SwingUtilities.invokeLater(() -> {
            StringBuilder text = new StringBuilder("<html><div style='width:%dpx'>".formatted(WIDTH));
            text.append("<b>").append(html(capital(problem.what()))).append("</b>");
            if (!problem.where().isEmpty()) {
                text.append("<br>").append(html(problem.where()));
            }
            if (!problem.remedy().isEmpty()) {
                text.append("<br><br>").append(html(capital(problem.remedy()))).append('.');
            }
            JLabel label = new JLabel(text + "</div>");
            label.setName("fault.text");
            DialogDisplayer.getDefault().notify(new NotifyDescriptor.Message(label, NotifyDescriptor.ERROR_MESSAGE));
        });
    }

    private static String capital(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }

    static String html(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\n", "<br>");
    }
}
