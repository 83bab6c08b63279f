package org.wellwright.viewer.comparison;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.ProjectSolution;
import org.wellwright.viewer.picture.FigureWindow;
import org.wellwright.viewer.picture.TextTable;

/** All models beside the data: residuals as a picture, the ranking and every number as tables. */
@TopComponent.Description(preferredID = ComparisonTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "editor", openAtStartup = true, position = 140)
@TopComponent.OpenActionRegistration(displayName = "#CTL_ComparisonWindow", preferredID = ComparisonTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.viewer.comparison.ComparisonTopComponent")
@ActionReference(path = "Menu/Window", position = 250)
@Messages({
    "CTL_ComparisonWindow=Comparison",
    "HINT_ComparisonWindow=All models beside the data: residuals, ranking, numbers",
    "LBL_Ranking=Models by rank",
    "LBL_Comparisons=Data and what the models say"
})
public final class ComparisonTopComponent extends FigureWindow {
    static final String ID = "ComparisonTopComponent";
    private static final long serialVersionUID = 1L;
    private static final int ROWS_OF_RANKING = 4;

    private TextTable ranking;
    private TextTable data;
    private transient ComparisonViewModel shown;

    /** Made by the window system. */
    public ComparisonTopComponent() {
        super("comparison", new ComparisonFigure(), ComparisonFigure::picture, Parts.PICTURE);
        setName(Bundle.CTL_ComparisonWindow());
        setDisplayName(Bundle.CTL_ComparisonWindow());
        setToolTipText(Bundle.HINT_ComparisonWindow());
    }

    @Override
    protected JComponent content(JComponent picture) {
        ranking = new TextTable("comparison.ranking", Bundle.LBL_Ranking(), this::pickModel);
        data = new TextTable("comparison.data", Bundle.LBL_Comparisons(), this::pickDatum);
        JPanel tables = new JPanel(new BorderLayout(0, 4));
        JScrollPane head = new JScrollPane(ranking);
        int height = ranking.getRowHeight() * ROWS_OF_RANKING
                + ranking.getTableHeader().getPreferredSize().height;
        head.setPreferredSize(new Dimension(100, height));
        tables.add(head, BorderLayout.NORTH);
        tables.add(new JScrollPane(data), BorderLayout.CENTER);
        JSplitPane split = new JSplitPane(JSplitPane.HORIZONTAL_SPLIT, picture, tables);
        split.setResizeWeight(0.5);
        split.setContinuousLayout(true);
        return split;
    }

    @Override
    protected void refreshed(ProjectSolution solution, FigureSelection selection) {
        shown = ComparisonViewModel.of(solution.results());
        ranking.show(shown.ranking(), shown.ranked().indexOf(selection.model()));
        int row = -1;
        for (int i = 0; i < shown.levels().size() && row < 0; i++) {
            row = shown.levels().get(i).equals(selection.levels()) ? i : -1;
        }
        data.show(shown.data(), row);
    }

    private void pickModel(int row) {
        if (shown != null && row < shown.ranked().size()) {
            FigureSelection now = selection();
            select(new FigureSelection(shown.ranked().get(row), now.levels(), now.magnetic()));
        }
    }

    private void pickDatum(int row) {
        if (shown != null && row < shown.levels().size()) {
            select(new FigureSelection(
                    selection().model(), List.copyOf(shown.levels().get(row)), 0));
        }
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
