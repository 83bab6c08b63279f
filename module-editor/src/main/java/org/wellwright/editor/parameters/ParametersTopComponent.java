package org.wellwright.editor.parameters;

import java.awt.BorderLayout;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import javax.swing.JButton;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;
import org.wellwright.editor.edit.ParameterEdits;
import org.wellwright.editor.edit.Units;
import org.wellwright.editor.parts.Glyph;
import org.wellwright.editor.parts.Grid;
import org.wellwright.editor.parts.GridColumn;
import org.wellwright.editor.parts.GridColumn.Kind;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.editor.parts.ToolStrip;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.units.UnitSystem;

/** All numbers of the pool in a table, with a slider on the selected one. */
@TopComponent.Description(preferredID = ParametersTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "wellwright-tables", openAtStartup = true, position = 100)
@TopComponent.OpenActionRegistration(displayName = "#CTL_ParametersWindow", preferredID = ParametersTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.editor.parameters.ParametersTopComponent")
@ActionReference(path = "Menu/Window", position = 120)
@Messages({
    "CTL_ParametersWindow=Parameters",
    "HINT_ParametersWindow=The numbers that models are made of: values, bounds, what a fit may change",
    "MSG_ParametersMissing=No project is open",
    "MSG_ParametersRemedy=Open or create a project from the File menu; the numbers of its models are listed here.",
    "HINT_ParametersEmpty=No parameters yet: add one here, or add a term to a model, which brings its own.",
    "LBL_ParameterAdd=Add a parameter",
    "LBL_ParameterDuplicate=Duplicate the selected parameter",
    "LBL_ParameterRemove=Remove the selected parameters",
    "LBL_ParameterUp=Move up",
    "LBL_ParameterDown=Move down",
    "LBL_ParameterDependence=Depends on…",
    "HINT_ParameterDependence=One number everywhere, or one per l, per l and j, per system, or scaled with the mass"
})
public final class ParametersTopComponent extends SessionWindow {
    static final String ID = "ParametersTopComponent";
    private static final long serialVersionUID = 1L;

    private final ProblemLine line = new ProblemLine("parameters.message");
    private final ToolStrip tools = new ToolStrip("parameters");
    private final JButton duplicate;
    private final JButton remove;
    private final JButton up;
    private final JButton down;
    private final JButton dependence;
    private final transient Grid<ParametersViewModel.Row> grid;
    private final ValueSlider slider = new ValueSlider(line);
    private transient ParametersController controller;
    private transient ModelDocument shown;

    /** Made by the window system. */
    public ParametersTopComponent() {
        setName(Bundle.CTL_ParametersWindow());
        setDisplayName(Bundle.CTL_ParametersWindow());
        setToolTipText(Bundle.HINT_ParametersWindow());
        grid = new Grid<>("parameters.table", Bundle.CTL_ParametersWindow(), columns(), line);
        tools.icon("add", Glyph.ADD, Bundle.LBL_ParameterAdd(), this::add);
        duplicate = tools.icon("duplicate", Glyph.DUPLICATE, Bundle.LBL_ParameterDuplicate(), this::duplicate);
        remove = tools.icon("remove", Glyph.REMOVE, Bundle.LBL_ParameterRemove(), this::remove);
        up = tools.icon("up", Glyph.UP, Bundle.LBL_ParameterUp(), () -> move(-1));
        down = tools.icon("down", Glyph.DOWN, Bundle.LBL_ParameterDown(), () -> move(1));
        tools.addSeparator();
        dependence = tools.text(
                "dependence",
                null,
                Bundle.LBL_ParameterDependence(),
                Bundle.HINT_ParameterDependence(),
                this::dependence);
        grid.onMenu(Bundle.LBL_ParameterAdd(), "INSERT", this::add);
        grid.onMenu(Bundle.LBL_ParameterRemove(), "DELETE", this::remove);
        grid.getSelectionModel().addListSelectionListener(event -> followSelection());
        JPanel content = new JPanel(new BorderLayout());
        JPanel foot = new JPanel(new BorderLayout());
        foot.add(slider, BorderLayout.NORTH);
        line.setBorder(javax.swing.BorderFactory.createEmptyBorder(0, 8, 4, 8));
        foot.add(line, BorderLayout.SOUTH);
        content.add(tools, BorderLayout.NORTH);
        content.add(new JScrollPane(grid), BorderLayout.CENTER);
        content.add(foot, BorderLayout.SOUTH);
        install(content, new EmptyState(Bundle.MSG_ParametersMissing(), Bundle.MSG_ParametersRemedy()));
        followSelection();
    }

    private List<GridColumn<ParametersViewModel.Row>> columns() {
        return List.of(
                GridColumn.<ParametersViewModel.Row>typed(
                                "Name",
                                "Its name in terms and formulas",
                                Kind.TEXT,
                                "potential_depth",
                                ParametersViewModel.Row::name,
                                (row, text) -> controller.rename(row, text))
                        .withProblem(ParametersViewModel.Row::problem),
                GridColumn.shown(
                        "For",
                        "The place that the number belongs to",
                        Kind.TEXT,
                        "l = 1, j = 3/2",
                        ParametersViewModel.Row::place),
                typed(
                        "Value",
                        "A number, a number with a unit, or '= formula' to tie it to others",
                        Kind.NUMBER,
                        "0.08746335115566405",
                        ParametersViewModel.Row::value,
                        (row, text) -> controller.setValue(row, text)),
                typed(
                        "Unit",
                        "The unit of all its numbers; another one converts them",
                        Kind.TEXT,
                        "cm^-1 angst",
                        ParametersViewModel.Row::unit,
                        (row, text) -> controller.setUnit(row, text)),
                typed(
                                "Fit",
                                "Whether a fit may change it",
                                Kind.CHOICE,
                                "fixed ▾",
                                ParametersViewModel.Row::status,
                                (row, text) -> controller.setStatus(row, text))
                        .withChoices(row -> row.tied()
                                ? List.of(ParametersViewModel.TIED, ParametersViewModel.FREE, ParametersViewModel.FIXED)
                                : List.of(ParametersViewModel.FREE, ParametersViewModel.FIXED)),
                typed(
                                "Lower",
                                "Lower bound; empty for none",
                                Kind.NUMBER,
                                "0.1234567",
                                ParametersViewModel.Row::lower,
                                (row, text) -> controller.setLower(row, text))
                        .where(row -> !row.tied()),
                typed(
                                "Upper",
                                "Upper bound; empty for none",
                                Kind.NUMBER,
                                "0.1234567",
                                ParametersViewModel.Row::upper,
                                (row, text) -> controller.setUpper(row, text))
                        .where(row -> !row.tied()),
                typed(
                                "Known",
                                "What is known of it from elsewhere, as 0.52(2); counts as one datum of a fit",
                                Kind.NUMBER,
                                "0.1234567(89)",
                                ParametersViewModel.Row::prior,
                                (row, text) -> controller.setPrior(row, text))
                        .where(row -> !row.tied()),
                typed(
                        "Meaning",
                        "What exactly the number is where there is a choice",
                        Kind.TEXT,
                        "a, not 4 alpha_s/3 or the like",
                        ParametersViewModel.Row::convention,
                        (row, text) -> controller.setConvention(row, text)));
    }

    private static GridColumn<ParametersViewModel.Row> typed(
            String title,
            String hint,
            Kind kind,
            String sample,
            java.util.function.Function<ParametersViewModel.Row, String> text,
            BiFunction<ParametersViewModel.Row, String, Optional<Problem>> take) {
        return GridColumn.typed(title, hint, kind, sample, text, take);
    }

    @Override
    protected void selected(ProjectSession selected) {
        controller = selected == null ? null : new ParametersController(selected);
        shown = null;
        grid.clearSelection();
    }

    @Override
    protected void show(ProjectSession selected) {
        ModelDocument document = selected.project().document();
        if (document.equals(shown)) {
            return;
        }
        shown = document;
        ParametersViewModel model = ParametersViewModel.of(document);
        grid.setRows(model.rows());
        line.setHint(model.rows().isEmpty() ? Bundle.HINT_ParametersEmpty() : model.summary());
        followSelection();
    }

    private void followSelection() {
        List<Integer> rows = grid.selection();
        boolean one = rows.size() == 1;
        duplicate.setEnabled(one);
        remove.setEnabled(!rows.isEmpty());
        up.setEnabled(one);
        down.setEnabled(one);
        dependence.setEnabled(one && !grid.rows().get(rows.get(0)).tied());
        ParametersViewModel.Row row = one ? grid.rows().get(rows.get(0)) : null;
        if (row == null || shown == null) {
            slider.show(controller, null, null, UnitSystem.ATOMIC);
            return;
        }
        Setting setting = ParameterEdits.setting(shown.parameters().get(row.parameter()), row.entry());
        slider.show(controller, row, setting, Units.of(shown));
    }

    private void add() {
        List<Integer> rows = grid.selection();
        int row = controller.add(rows.isEmpty() ? -1 : rows.get(rows.size() - 1));
        show(session());
        grid.startTyping(row, 0);
    }

    private void duplicate() {
        int row = controller.duplicate(grid.selection().get(0));
        show(session());
        grid.select(row);
    }

    private void remove() {
        if (!grid.selection().isEmpty()) {
            line.say(controller.remove(grid.selection()));
            show(session());
        }
    }

    private void move(int by) {
        int row = controller.move(grid.selection().get(0), by);
        show(session());
        grid.select(row);
    }

    private void dependence() {
        ParametersViewModel.Row row = grid.rows().get(grid.selection().get(0));
        Parameter parameter = shown.parameters().get(row.parameter());
        ParameterShape shape = DependencePanel.ask(shown, parameter);
        if (shape != null) {
            line.say(controller.setShape(row.parameter(), shape));
        }
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
