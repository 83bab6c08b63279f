package org.wellwright.project.window;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Cursor;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.Insets;
import java.nio.file.Path;
import java.util.List;
import javax.swing.BorderFactory;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.SwingConstants;
import javax.swing.SwingUtilities;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.UndoRedo;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.openide.windows.WindowManager;
import org.wellwright.project.window.session.SessionUndo;
import org.wellwright.solver.WellwrightException;

/** The start page: a new project, one from disk, an example, or a recent one. */
@TopComponent.Description(preferredID = StartTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ONLY_OPENED)
@TopComponent.Registration(mode = "editor", openAtStartup = false, position = 10)
@TopComponent.OpenActionRegistration(displayName = "#CTL_StartWindow", preferredID = StartTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.project.window.StartTopComponent")
@ActionReference(path = "Menu/Help", position = 50)
@Messages({
    "CTL_StartWindow=Start Page",
    "HINT_StartWindow=Examples, recent projects, and how to begin",
    "HEAD_Start=Which potential holds?",
    "TXT_Start=Two bodies, a central force, and levels that were measured: put candidates for the potential beside the data, fit them, and see which one stands.",
    "BTN_StartNew=New project…",
    "BTN_StartOpen=Open a project…",
    "HEAD_StartExamples=Examples",
    "TXT_StartExamples=Each opens as a copy of your own. Their data are invented, and say so.",
    "TXT_NoExamples=No examples are installed beside this application.",
    "HEAD_StartRecent=Recent projects",
    "TXT_NoRecentProjects=None yet."
})
public final class StartTopComponent extends TopComponent {
    static final String ID = "StartTopComponent";
    private static final long serialVersionUID = 1L;
    private static final int TEXT_WIDTH = 460;

    private final JPanel column = new JPanel();
    private final transient Runnable changed = () -> SwingUtilities.invokeLater(this::makeRoom);
    private boolean empty = true;

    /** Made by the window system. */
    public StartTopComponent() {
        setName(Bundle.CTL_StartWindow());
        setDisplayName(Bundle.CTL_StartWindow());
        setToolTipText(Bundle.HINT_StartWindow());
        setLayout(new BorderLayout());
        column.setLayout(new BoxLayout(column, BoxLayout.Y_AXIS));
        column.setBorder(BorderFactory.createEmptyBorder(24, 32, 24, 32));
        JPanel left = new JPanel(new BorderLayout());
        left.add(column, BorderLayout.NORTH);
        JScrollPane scroll = new JScrollPane(left);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        scroll.getVerticalScrollBar().setUnitIncrement(16);
        add(scroll, BorderLayout.CENTER);
        fill();
    }

    private void fill() {
        column.removeAll();
        column.add(heading(Bundle.HEAD_Start(), 1.7f));
        column.add(text(Bundle.TXT_Start()));
        column.add(Box.createVerticalStrut(14));
        Box buttons = Box.createHorizontalBox();
        buttons.setAlignmentX(Component.LEFT_ALIGNMENT);
        buttons.add(button(
                "start.new", Bundle.BTN_StartNew(), () -> NewProject.ask().ifPresent(ProjectDesk.get()::create)));
        buttons.add(Box.createHorizontalStrut(8));
        buttons.add(button("start.open", Bundle.BTN_StartOpen(), ProjectDesk.get()::askAndOpen));
        column.add(buttons);
        column.add(Box.createVerticalStrut(22));
        column.add(heading(Bundle.HEAD_StartExamples(), 1.25f));
        List<Examples.Example> examples = Examples.all(Examples.folder());
        column.add(text(examples.isEmpty() ? Bundle.TXT_NoExamples() : Bundle.TXT_StartExamples()));
        for (int i = 0; i < examples.size(); i++) {
            Examples.Example example = examples.get(i);
            column.add(link("start.example." + (i + 1), example.title(), example.note(), () -> open(example)));
        }
        column.add(Box.createVerticalStrut(18));
        column.add(heading(Bundle.HEAD_StartRecent(), 1.25f));
        List<Path> recent = ProjectDesk.get().remembered().recent();
        if (recent.isEmpty()) {
            column.add(text(Bundle.TXT_NoRecentProjects()));
        }
        for (int i = 0; i < recent.size(); i++) {
            Path file = recent.get(i);
            column.add(link(
                    "start.recent." + (i + 1),
                    file.getFileName().toString(),
                    file.getParent().toString(),
                    () -> ProjectDesk.get().open(file, session -> {})));
        }
        column.revalidate();
    }

    private void open(Examples.Example example) {
        try {
            ProjectDesk.get().create(Examples.copy(example));
            makeRoom();
        } catch (WellwrightException e) {
            Ask.tell(e);
        }
    }

    /** Once the first project is open, the windows that show it come to the front. */
    private void makeRoom() {
        boolean none = ProjectDesk.get().projects().sessions().isEmpty();
        boolean first = empty && !none;
        empty = none;
        if (!first) {
            return;
        }
        close();
        TopComponent levels = WindowManager.getDefault().findTopComponent("LevelsTopComponent");
        if (levels != null && levels.isOpened()) {
            levels.requestActive();
        }
    }

    @Override
    protected void componentOpened() {
        empty = ProjectDesk.get().projects().sessions().isEmpty();
        ProjectDesk.get().projects().addListener(changed);
    }

    @Override
    protected void componentClosed() {
        ProjectDesk.get().projects().removeListener(changed);
    }

    private static JLabel heading(String text, float scale) {
        JLabel label = new JLabel(text);
        label.setFont(label.getFont().deriveFont(Font.BOLD, label.getFont().getSize2D() * scale));
        label.setAlignmentX(Component.LEFT_ALIGNMENT);
        label.setBorder(BorderFactory.createEmptyBorder(0, 0, 4, 0));
        return label;
    }

    private static JLabel text(String text) {
        JLabel label = new JLabel("<html><div style='width:%dpx'>%s</div>".formatted(TEXT_WIDTH, Ask.html(text)));
        label.setAlignmentX(Component.LEFT_ALIGNMENT);
        return label;
    }

    private static JButton button(String name, String text, Runnable code) {
        JButton button = new JButton(text);
        button.setName(name);
        button.addActionListener(event -> code.run());
        return button;
    }

    private static JComponent link(String name, String title, String note, Runnable code) {
        JButton button = new JButton("<html><div style='width:%dpx'><b>%s</b><br>%s</div>"
                .formatted(TEXT_WIDTH, Ask.html(title), Ask.html(note)));
        button.setName(name);
        button.getAccessibleContext().setAccessibleName(title);
        button.setHorizontalAlignment(SwingConstants.LEADING);
        button.setCursor(Cursor.getPredefinedCursor(Cursor.HAND_CURSOR));
        button.putClientProperty("JButton.buttonType", "toolBarButton");
        button.setMargin(new Insets(6, 8, 6, 8));
        button.setAlignmentX(Component.LEFT_ALIGNMENT);
        button.addActionListener(event -> code.run());
        Dimension size = button.getPreferredSize();
        button.setMaximumSize(new Dimension(Math.max(size.width, TEXT_WIDTH + 180), size.height));
        return button;
    }

    @Override
    public UndoRedo getUndoRedo() {
        return SessionUndo.ofSelected();
    }

    @Override
    protected void componentShowing() {
        fill();
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
