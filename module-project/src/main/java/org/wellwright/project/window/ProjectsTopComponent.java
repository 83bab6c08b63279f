package org.wellwright.project.window;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.List;
import javax.swing.BorderFactory;
import javax.swing.DefaultListCellRenderer;
import javax.swing.DefaultListModel;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JMenuItem;
import javax.swing.JPopupMenu;
import javax.swing.JScrollPane;
import javax.swing.ListSelectionModel;
import javax.swing.SwingUtilities;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.UndoRedo;
import org.openide.util.NbBundle.Messages;
import org.openide.util.lookup.Lookups;
import org.openide.util.lookup.ProxyLookup;
import org.openide.windows.TopComponent;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.window.session.SessionUndo;
import org.wellwright.solver.model.ModelDocument;

/** The projects that are open; the selected one is the one that every other window shows. */
@TopComponent.Description(preferredID = ProjectsTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "wellwright-projects", openAtStartup = true, position = 100)
@TopComponent.OpenActionRegistration(displayName = "#CTL_ProjectsWindow", preferredID = ProjectsTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.project.window.ProjectsTopComponent")
@ActionReference(path = "Menu/Window", position = 100)
@Messages({
    "CTL_ProjectsWindow=Projects",
    "HINT_ProjectsWindow=The projects that are open; the other windows show the selected one",
    "MSG_NoProjects=<html><div style=''text-align:center; width:190px''><b>No project is open</b><br><br>Create one with File > New Project, open one with File > Open Project, or drop a file here.</div>",
    "CTL_ProjectSave=Save",
    "CTL_ProjectSaveAs=Save As…",
    "CTL_ProjectClose=Close",
    "TXT_NotSaved=not saved in a file yet",
    "TXT_InUse=open elsewhere",
    "# {0} - models",
    "# {1} - values",
    "TXT_ProjectCounts={0}, {1}"
})
public final class ProjectsTopComponent extends TopComponent {
    static final String ID = "ProjectsTopComponent";
    private static final long serialVersionUID = 1L;

    private final transient OpenProjects open = ProjectDesk.get().projects();
    private final transient Runnable changed = () -> SwingUtilities.invokeLater(this::fill);
    private final DefaultListModel<ProjectSession> items = new DefaultListModel<>();
    private final JList<ProjectSession> list = new JList<>(items);
    private final JLabel none = new JLabel(Bundle.MSG_NoProjects(), JLabel.CENTER);
    private boolean filling;

    /** Made by the window system. */
    public ProjectsTopComponent() {
        setName(Bundle.CTL_ProjectsWindow());
        setDisplayName(Bundle.CTL_ProjectsWindow());
        setToolTipText(Bundle.HINT_ProjectsWindow());
        setLayout(new BorderLayout());
        associateLookup(new ProxyLookup(Lookups.singleton(getActionMap()), open.getLookup()));
        list.setName("projects.list");
        list.getAccessibleContext().setAccessibleName(Bundle.CTL_ProjectsWindow());
        list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        list.setCellRenderer(new Renderer());
        list.addListSelectionListener(event -> {
            if (!filling && !event.getValueIsAdjusting() && list.getSelectedValue() != null) {
                open.select(list.getSelectedValue());
            }
        });
        list.addMouseListener(new MouseAdapter() {
            @Override
            public void mousePressed(MouseEvent event) {
                popup(event);
            }

            @Override
            public void mouseReleased(MouseEvent event) {
                popup(event);
            }
        });
        none.setBorder(BorderFactory.createEmptyBorder(12, 12, 12, 12));
        none.setName("projects.none");
        fill();
    }

    private void popup(MouseEvent event) {
        int index = list.locationToIndex(event.getPoint());
        if (!event.isPopupTrigger() || index < 0) {
            return;
        }
        ProjectSession session = items.get(index);
        list.setSelectedIndex(index);
        JPopupMenu menu = new JPopupMenu();
        menu.add(item(Bundle.CTL_ProjectSave(), () -> ProjectDesk.get().save(session, saved -> {})));
        menu.add(item(Bundle.CTL_ProjectSaveAs(), () -> ProjectDesk.get().askAndSave(session, saved -> {})));
        menu.addSeparator();
        menu.add(item(Bundle.CTL_ProjectClose(), () -> ProjectDesk.get().close(session)));
        menu.show(list, event.getX(), event.getY());
    }

    private static JMenuItem item(String text, Runnable code) {
        JMenuItem item = new JMenuItem(text);
        item.addActionListener(event -> code.run());
        return item;
    }

    @Override
    protected void componentOpened() {
        open.addListener(changed);
        fill();
    }

    @Override
    protected void componentClosed() {
        open.removeListener(changed);
        for (int i = 0; i < items.size(); i++) {
            items.get(i).removeListener(changed);
        }
        items.clear();
    }

    @Override
    public UndoRedo getUndoRedo() {
        return SessionUndo.ofSelected();
    }

    private void fill() {
        filling = true;
        List<ProjectSession> sessions = open.sessions();
        for (int i = 0; i < items.size(); i++) {
            items.get(i).removeListener(changed);
        }
        items.clear();
        for (ProjectSession session : sessions) {
            items.addElement(session);
            session.addListener(changed);
        }
        open.selected().ifPresent(selected -> list.setSelectedValue(selected, true));
        filling = false;
        removeAll();
        JScrollPane scroll = new JScrollPane(list);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        add(sessions.isEmpty() ? none : scroll, BorderLayout.CENTER);
        revalidate();
        repaint();
    }

    private static final class Renderer extends DefaultListCellRenderer {
        private static final long serialVersionUID = 1L;

        @Override
        public Component getListCellRendererComponent(
                JList<?> list, Object value, int index, boolean selected, boolean focused) {
            ProjectSession session = (ProjectSession) value;
            ModelDocument document = session.project().document();
            String mark = session.modified() ? " *" : "";
            String place =
                    session.file().map(file -> file.getFileName().toString()).orElse(Bundle.TXT_NotSaved());
            if (ProjectDesk.get().inUseElsewhere(session)) {
                place += " — " + Bundle.TXT_InUse();
            }
            String counts = Bundle.TXT_ProjectCounts(
                    counted(document.models().size(), "model"),
                    counted(document.data().size(), "value"));
            String text = "<html><b>%s%s</b><br><span style='font-size:90%%'>%s<br>%s</span>"
                    .formatted(Ask.html(session.displayName()), mark, Ask.html(place), counts);
            super.getListCellRendererComponent(list, text, index, selected, focused);
            setBorder(BorderFactory.createEmptyBorder(5, 10, 5, 8));
            setToolTipText(session.file().map(Object::toString).orElse(null));
            getAccessibleContext().setAccessibleName(session.displayName() + mark);
            return this;
        }

        private static String counted(int number, String what) {
            return number == 1 ? "1 " + what : number + " " + what + "s";
        }
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
