package org.wellwright.viewer.predictions;

import java.util.List;
import javax.swing.JScrollPane;
import javax.swing.SwingUtilities;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.Lookup;
import org.openide.util.LookupEvent;
import org.openide.util.LookupListener;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.ProjectSolution;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.viewer.picture.TextTable;

/** What the models of the selected project say of levels that were not measured. */
@TopComponent.Description(preferredID = PredictionsTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "editor", openAtStartup = true, position = 160)
@TopComponent.OpenActionRegistration(displayName = "#CTL_PredictionsWindow", preferredID = PredictionsTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.viewer.predictions.PredictionsTopComponent")
@ActionReference(path = "Menu/Window", position = 270)
@Messages({
    "CTL_PredictionsWindow=Predictions",
    "HINT_PredictionsWindow=Levels that were not measured, as every model has them",
    "MSG_PredictionsNone=No project is open",
    "MSG_PredictionsRemedy=Open or create a project from the File menu; levels that no datum names are listed here."
})
public final class PredictionsTopComponent extends SessionWindow {
    static final String ID = "PredictionsTopComponent";
    private static final long serialVersionUID = 1L;

    private final TextTable table;
    private final transient LookupListener listener = (LookupEvent event) -> SwingUtilities.invokeLater(this::refresh);
    private transient Lookup.Result<ProjectSolution> solutions;
    private boolean inSight;
    private transient PredictionsViewModel shown;

    /** Made by the window system. */
    public PredictionsTopComponent() {
        setName(Bundle.CTL_PredictionsWindow());
        setDisplayName(Bundle.CTL_PredictionsWindow());
        setToolTipText(Bundle.HINT_PredictionsWindow());
        table = new TextTable("predictions.table", Bundle.CTL_PredictionsWindow(), this::pick);
        install(new JScrollPane(table), new EmptyState(Bundle.MSG_PredictionsNone(), Bundle.MSG_PredictionsRemedy()));
    }

    @Override
    protected void selected(ProjectSession selected) {
        if (solutions != null) {
            solutions.removeLookupListener(listener);
            solutions = null;
        }
        if (selected != null) {
            solutions = selected.getLookup().lookupResult(ProjectSolution.class);
            solutions.addLookupListener(listener);
        }
    }

    @Override
    protected void componentShowing() {
        inSight = true;
        super.componentShowing();
    }

    @Override
    protected void componentHidden() {
        super.componentHidden();
        inSight = false;
    }

    @Override
    protected void show(ProjectSession selected) {
        refresh();
    }

    @Override
    protected void picked(FigureSelection selection) {
        refresh();
    }

    private void refresh() {
        if (solutions == null || !inSight) {
            return;
        }
        for (ProjectSolution solution : solutions.allInstances()) {
            shown = PredictionsViewModel.of(solution.results());
            List<?> selected = selection().levels();
            table.show(shown.table(), selected.isEmpty() ? -1 : shown.levels().indexOf(selected.get(0)));
        }
    }

    private void pick(int row) {
        OpenProjects projects = Lookup.getDefault().lookup(OpenProjects.class);
        if (projects != null
                && session() != null
                && shown != null
                && row < shown.levels().size()) {
            projects.select(new FigureSelection(
                    selection().model(), List.of(shown.levels().get(row)), 0));
        }
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
