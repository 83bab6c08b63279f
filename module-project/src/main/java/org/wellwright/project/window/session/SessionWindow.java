package org.wellwright.project.window.session;

import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.util.concurrent.atomic.AtomicBoolean;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.SwingUtilities;
import org.openide.awt.UndoRedo;
import org.openide.util.Lookup;
import org.openide.util.LookupEvent;
import org.openide.util.lookup.AbstractLookup;
import org.openide.util.lookup.InstanceContent;
import org.openide.util.lookup.Lookups;
import org.openide.util.lookup.ProxyLookup;
import org.openide.windows.TopComponent;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;

/**
 * A window that follows the selected project: it is told of every change while it is in sight, shows something else
 * while no project is open, undoes in the project, and its lookup holds its own content beside that of
 * {@link OpenProjects}. Event thread only.
 */
public abstract class SessionWindow extends TopComponent {
    private static final long serialVersionUID = 1L;
    private static final String CONTENT = "content";
    private static final String NONE = "none";

    private final transient InstanceContent own = new InstanceContent();
    private final transient OpenProjects open = Lookup.getDefault().lookup(OpenProjects.class);
    private final transient Lookup.Result<ProjectSession> result =
            open.getLookup().lookupResult(ProjectSession.class);
    private final transient Lookup.Result<FigureSelection> picks =
            open.getLookup().lookupResult(FigureSelection.class);
    private final transient AtomicBoolean due = new AtomicBoolean();
    private final transient Runnable changed = this::later;
    private final CardLayout cards = new CardLayout();
    private final JPanel deck = new JPanel(cards);
    private transient ProjectSession session;
    private boolean showing;

    /** Makes an empty window; {@link #install} fills it. */
    protected SessionWindow() {
        setLayout(new BorderLayout());
        add(deck, BorderLayout.CENTER);
        associateLookup(new ProxyLookup(Lookups.singleton(getActionMap()), new AbstractLookup(own), open.getLookup()));
        result.addLookupListener((LookupEvent event) -> SwingUtilities.invokeLater(this::follow));
        picks.addLookupListener((LookupEvent event) -> SwingUtilities.invokeLater(() -> {
            if (isOpened() && session != null) {
                picked(selection());
            }
        }));
    }

    /**
     * Fills the window; called once from the constructor.
     *
     * @param content what shows a project
     * @param none what is shown while none is open
     */
    protected final void install(JComponent content, JComponent none) {
        deck.add(none, NONE);
        deck.add(content, CONTENT);
        cards.show(deck, NONE);
    }

    /** Shows a project as it is now: called when the window comes into sight, and after every change while it is. */
    protected abstract void show(ProjectSession selected);

    /** Called when another project is selected, before {@link #show}; null if none is open any more. */
    protected void selected(ProjectSession selected) {}

    /** Called when another model or level is selected in the selected project, here or elsewhere. */
    protected void picked(FigureSelection selection) {}

    /** The selected model and levels. */
    protected final FigureSelection selection() {
        for (FigureSelection selection : picks.allInstances()) {
            return selection;
        }
        return FigureSelection.NONE;
    }

    /** Selects a model for every window; its levels stay selected. */
    protected final void pickModel(String model) {
        FigureSelection now = selection();
        if (!model.equals(now.model())) {
            open.select(new FigureSelection(model, now.levels(), now.magnetic()));
        }
    }

    /** The selected project, or null. */
    protected final ProjectSession session() {
        return session;
    }

    /** What the window itself puts into its lookup. */
    protected final InstanceContent ownContent() {
        return own;
    }

    @Override
    public UndoRedo getUndoRedo() {
        return SessionUndo.ofSelected();
    }

    @Override
    protected void componentOpened() {
        follow();
    }

    @Override
    protected void componentClosed() {
        showing = false;
        if (session != null) {
            session.removeListener(changed);
            session = null;
        }
    }

    @Override
    protected void componentShowing() {
        showing = true;
        follow();
        refresh();
    }

    @Override
    protected void componentHidden() {
        showing = false;
    }

    private void follow() {
        if (!isOpened()) {
            return;
        }
        ProjectSession selected = open.selected().orElse(null);
        if (selected != session) {
            if (session != null) {
                session.removeListener(changed);
            }
            session = selected;
            if (session != null) {
                session.addListener(changed);
            }
            cards.show(deck, session == null ? NONE : CONTENT);
            selected(session);
            refresh();
        }
    }

    /** Many changes between two turns of the event thread are shown once. */
    private void later() {
        if (due.compareAndSet(false, true)) {
            SwingUtilities.invokeLater(this::refresh);
        }
    }

    private void refresh() {
        due.set(false);
        if (showing && session != null) {
            show(session);
        }
    }
}
