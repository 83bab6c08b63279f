package org.wellwright.project.window;

import java.awt.event.ActionEvent;
import java.nio.file.Path;
import java.util.List;
import javax.swing.AbstractAction;
import javax.swing.JMenu;
import javax.swing.JMenuItem;
import javax.swing.event.MenuEvent;
import javax.swing.event.MenuListener;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.ActionRegistration;
import org.openide.awt.Mnemonics;
import org.openide.util.NbBundle.Messages;
import org.openide.util.actions.Presenter;

/** The menu of files that were open lately. */
@ActionID(category = "File", id = "org.wellwright.project.window.RecentProjectsAction")
@ActionRegistration(displayName = "#CTL_RecentProjects", lazy = false)
@ActionReference(path = "Menu/File", position = 120)
@Messages({"CTL_RecentProjects=Open &Recent", "CTL_NoRecent=No recent projects", "CTL_ForgetRecent=Clear this list"})
public final class RecentProjectsAction extends AbstractAction implements Presenter.Menu {
    private static final long serialVersionUID = 1L;

    @Override
    public void actionPerformed(ActionEvent event) {
        // Only its menu does something.
    }

    @Override
    public JMenuItem getMenuPresenter() {
        JMenu menu = new JMenu();
        Mnemonics.setLocalizedText(menu, Bundle.CTL_RecentProjects());
        menu.addMenuListener(new MenuListener() {
            @Override
            public void menuSelected(MenuEvent event) {
                fill(menu);
            }

            @Override
            public void menuDeselected(MenuEvent event) {
                // It is filled anew the next time.
            }

            @Override
            public void menuCanceled(MenuEvent event) {
                // It is filled anew the next time.
            }
        });
        fill(menu);
        return menu;
    }

    private static void fill(JMenu menu) {
        menu.removeAll();
        Remembered remembered = ProjectDesk.get().remembered();
        List<Path> files = remembered.recent();
        for (Path file : files) {
            JMenuItem item = new JMenuItem(file.getFileName() + "   " + file.getParent());
            item.setName("recent." + file.getFileName());
            item.addActionListener(event -> ProjectDesk.get().open(file, session -> {}));
            menu.add(item);
        }
        if (files.isEmpty()) {
            JMenuItem none = new JMenuItem(Bundle.CTL_NoRecent());
            none.setEnabled(false);
            menu.add(none);
        } else {
            menu.addSeparator();
            JMenuItem clear = new JMenuItem(Bundle.CTL_ForgetRecent());
            clear.addActionListener(event -> remembered.forgetRecent());
            menu.add(clear);
        }
    }
}
