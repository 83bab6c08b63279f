package org.wellwright.viewer.picture;

import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.Component;
import java.awt.Font;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import javax.swing.BorderFactory;
import javax.swing.DefaultListCellRenderer;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JToolBar;
import javax.swing.SwingConstants;
import javax.swing.SwingUtilities;
import org.openide.util.Lookup;
import org.openide.util.LookupEvent;
import org.openide.util.LookupListener;
import org.openide.util.NbBundle.Messages;
import org.openide.util.RequestProcessor;
import org.wellwright.branding.ChartTheme;
import org.wellwright.branding.EmptyState;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.ProjectSolution;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.Viewport;

/**
 * The window of one figure of the selected project. It shows what the session's solution gives and the selection asks
 * for, and changes nothing but the selection. Event thread only.
 */
@Messages({
    "MSG_FigureSolving=Solving the project…",
    "MSG_FigureNone=No project is open",
    "MSG_FigureNoneRemedy=Open or create a project from the File menu; what is calculated from it is shown here.",
    "LBL_FigureVariant=Show",
    "LBL_FigureZoomIn=Zoom in",
    "LBL_FigureZoomOut=Zoom out",
    "LBL_FigureAll=Show all",
    "LBL_FigureSave=Save picture…"
})
public abstract class FigureWindow extends SessionWindow {
    private static final long serialVersionUID = 1L;
    private static final RequestProcessor WORK = new RequestProcessor("pictures", 2);
    private static final String PICTURE = "picture";
    private static final String PROBLEM = "problem";

    private final transient FigureProvider figure;
    private final String prefix;
    private final FigureCanvas canvas;
    private final transient FigureController controller;
    private final CardLayout cards = new CardLayout();
    private final JPanel deck = new JPanel(cards);
    private final JLabel problem = new JLabel("", SwingConstants.CENTER);
    private final JComboBox<FigureProvider.Variant> variants;
    private final transient StateChooser states;
    private final transient LookupListener listener = (LookupEvent event) -> SwingUtilities.invokeLater(this::refresh);
    private transient Lookup.Result<ProjectSolution> solutions;
    private boolean inSight;
    private transient FigureViewModel shown;

    /** What a window shows beside its picture. */
    protected enum Parts {
        /** The picture alone. */
        PICTURE,
        /** Choosers of model and level. */
        STATE,
        /** Choosers of model, level and m. */
        STATE_AND_PROJECTION
    }

    /**
     * A window.
     *
     * @param prefix start of the names of its components: "levels" gives "levels.canvas"
     * @param figure the figure
     * @param pictures makes the picture of a request that the figure does not find missing
     */
    protected FigureWindow(
            String prefix, FigureProvider figure, Function<FigureRequest, Picture> pictures, Parts parts) {
        this.figure = figure;
        this.prefix = prefix;
        this.canvas = new FigureCanvas(WORK, SwingUtilities::invokeLater);
        this.controller = new FigureController(figure, pictures, WORK, SwingUtilities::invokeLater, this::shown);
        this.variants = new JComboBox<>(figure.variants().toArray(new FigureProvider.Variant[0]));
        this.states = parts == Parts.PICTURE
                ? null
                : new StateChooser(prefix, parts == Parts.STATE_AND_PROJECTION, this::select);
        canvas.setName(prefix + ".canvas");
        canvas.getAccessibleContext().setAccessibleName(figure.title());
        canvas.onPick((spot, more) -> select(FigureController.picked(selection(), spot, more)));
        problem.setName(prefix + ".problem");
        problem.setBorder(BorderFactory.createEmptyBorder(12, 24, 12, 24));
        deck.add(problem, PROBLEM);
        deck.add(canvas, PICTURE);
        JPanel content = new JPanel(new BorderLayout());
        content.add(tools(), BorderLayout.NORTH);
        content.add(content(deck), BorderLayout.CENTER);
        install(content, new EmptyState(Bundle.MSG_FigureNone(), Bundle.MSG_FigureNoneRemedy()));
    }

    /**
     * Puts the picture and whatever else there is together; the picture alone if not overridden. Called once, while the
     * window is made.
     */
    protected JComponent content(JComponent picture) {
        return picture;
    }

    /** Called after every change of the solution and the selection. */
    protected void refreshed(ProjectSolution solution, FigureSelection selection) {}

    private JToolBar tools() {
        JToolBar tools = new JToolBar();
        tools.setFloatable(false);
        tools.setName(prefix + ".tools");
        tools.setBorder(BorderFactory.createEmptyBorder(2, 4, 2, 4));
        if (figure.variants().size() > 1) {
            variants.setName(prefix + ".variant");
            variants.getAccessibleContext().setAccessibleName(Bundle.LBL_FigureVariant());
            variants.setToolTipText(Bundle.LBL_FigureVariant());
            variants.setRenderer(new DefaultListCellRenderer() {
                private static final long serialVersionUID = 1L;

                @Override
                public Component getListCellRendererComponent(
                        JList<?> list, Object value, int index, boolean isSelected, boolean cellHasFocus) {
                    Object text = value instanceof FigureProvider.Variant variant ? variant.title() : value;
                    return super.getListCellRendererComponent(list, text, index, isSelected, cellHasFocus);
                }
            });
            variants.setMaximumSize(variants.getPreferredSize());
            variants.addActionListener(event -> {
                canvas.showAll();
                refresh();
            });
            tools.add(variants);
            tools.addSeparator();
        }
        if (states != null) {
            states.addTo(tools);
            tools.addSeparator();
        }
        tools.add(button("zoomIn", "+", Bundle.LBL_FigureZoomIn(), () -> canvas.zoom(1.25)));
        tools.add(button("zoomOut", "−", Bundle.LBL_FigureZoomOut(), () -> canvas.zoom(0.8)));
        tools.add(button("all", Bundle.LBL_FigureAll(), Bundle.LBL_FigureAll(), canvas::showAll));
        tools.addSeparator();
        tools.add(button("save", Bundle.LBL_FigureSave(), Bundle.LBL_FigureSave(), this::save));
        return tools;
    }

    private JButton button(String name, String text, String hint, Runnable action) {
        JButton button = new JButton(text);
        button.setName(prefix + "." + name);
        button.setToolTipText(hint);
        button.getAccessibleContext().setAccessibleName(hint);
        button.addActionListener(event -> action.run());
        return button;
    }

    /** Selects for all windows. */
    protected final void select(FigureSelection selection) {
        OpenProjects projects = Lookup.getDefault().lookup(OpenProjects.class);
        if (projects != null && session() != null && !selection.equals(selection())) {
            projects.select(selection);
        }
    }

    @Override
    protected void selected(ProjectSession selected) {
        if (solutions != null) {
            solutions.removeLookupListener(listener);
            solutions = null;
        }
        shown = null;
        canvas.show(null);
        canvas.showAll();
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
        if (session() == null || solutions == null || !inSight) {
            return;
        }
        ProjectSolution solution = newest(solutions.allInstances());
        if (solution == null) {
            showProblem(Bundle.MSG_FigureSolving());
            return;
        }
        if (solution.problem() != null && solution.results().models().isEmpty()) {
            showProblem(solution.problem().sentence());
            return;
        }
        FigureSelection selection = selection();
        if (states != null) {
            states.show(solution.results(), selection);
        }
        controller.show(new FigureRequest(
                solution.results(),
                selection,
                variant(),
                ChartTheme.current().onDark() ? FigureRequest.Ground.DARK : FigureRequest.Ground.LIGHT,
                ChartTheme.font(Font.PLAIN, 1)));
        refreshed(solution, selection);
    }

    private static ProjectSolution newest(Collection<? extends ProjectSolution> all) {
        ProjectSolution newest = null;
        for (ProjectSolution solution : all) {
            newest = newest == null || solution.run() > newest.run() ? solution : newest;
        }
        return newest;
    }

    private String variant() {
        return variants.getSelectedItem() instanceof FigureProvider.Variant variant ? variant.id() : "";
    }

    private void shown(FigureViewModel model) {
        if (session() == null) {
            return;
        }
        shown = model;
        if (model.problem() != null) {
            canvas.show(null);
            showProblem(model.problem().sentence());
        } else {
            canvas.show(model.picture());
            cards.show(deck, PICTURE);
        }
    }

    private void showProblem(String text) {
        problem.setText("<html><div style='text-align: center'>%s</div>"
                .formatted(text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;")));
        cards.show(deck, PROBLEM);
    }

    private void save() {
        if (shown != null && shown.picture() != null) {
            SaveFigure.ask(this, figure, shown, canvas.view(), canvas.getSize());
        }
    }

    /** The state of the window that is kept with a project. */
    Map<String, String> state() {
        Map<String, String> state = new LinkedHashMap<>();
        state.put("variant", variant());
        Viewport view = canvas.view();
        if (!view.all()) {
            state.put("left", Double.toString(view.left()));
            state.put("right", Double.toString(view.right()));
            state.put("bottom", Double.toString(view.bottom()));
            state.put("top", Double.toString(view.top()));
        }
        return state;
    }

    /** Takes up a state that was kept; what cannot be read is left as it is. */
    void restore(Map<String, String> state) {
        for (FigureProvider.Variant variant : figure.variants()) {
            if (Objects.equals(variant.id(), state.get("variant"))) {
                variants.setSelectedItem(variant);
            }
        }
        try {
            canvas.setView(new Viewport(
                    number(state, "left"), number(state, "right"), number(state, "bottom"), number(state, "top")));
        } catch (NumberFormatException e) {
            canvas.showAll();
        }
    }

    private static double number(Map<String, String> state, String key) {
        return Double.parseDouble(state.getOrDefault(key, "NaN"));
    }

    /** Identity of the window's state in project files. */
    String stateId() {
        return figure.id();
    }
}
