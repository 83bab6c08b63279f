package org.wellwright.editor.fit;

import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.Dimension;
import java.awt.GridLayout;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.DefaultComboBoxModel;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import javax.swing.JScrollPane;
import javax.swing.JTabbedPane;
import javax.swing.SwingUtilities;
import javax.swing.UIManager;
import org.netbeans.api.progress.ProgressHandle;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.Lookup;
import org.openide.util.NbBundle.Messages;
import org.openide.util.RequestProcessor;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.Glyph;
import org.wellwright.editor.parts.Grid;
import org.wellwright.editor.parts.GridColumn;
import org.wellwright.editor.parts.GridColumn.Kind;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.FitRecorder;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.service.FitService;

/** Fits a model of the selected project: choose and run on the left, inspect on the right, then accept or discard. */
@TopComponent.Description(preferredID = FitTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "wellwright-tables", openAtStartup = true, position = 300)
@TopComponent.OpenActionRegistration(displayName = "#CTL_FitWindow", preferredID = FitTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.editor.fit.FitTopComponent")
@ActionReference(path = "Menu/Window", position = 140)
@Messages({
    "CTL_FitWindow=Fit",
    "HINT_FitWindow=Fit a model to the measured data, look at the result, accept or discard it",
    "MSG_FitMissing=No project is open",
    "MSG_FitRemedy=Open or create a project from the File menu; its models are fitted to its data here.",
    "MSG_FitNoModel=No model yet",
    "MSG_FitNoModelRemedy=Add a model in the Models window, and measured data; then fit it here.",
    "MSG_FitIdle=No fit yet",
    "MSG_FitIdleRemedy=Choose a model and press Run. Nothing changes in the project until you accept the result.",
    "MSG_FitRunning=The fit is running",
    "MSG_FitRunningRemedy=The result will appear here. You can go on working; a fit of values that changed meanwhile cannot be accepted.",
    "MSG_FitFailed=No result",
    "LBL_FitModel=Model",
    "LBL_FitRun=Run",
    "HINT_FitRun=Fit the free parameters of this model to the data in use",
    "LBL_FitCancel=Cancel",
    "HINT_FitCancel=Stop the fit; nothing is changed",
    "LBL_FitAccept=Accept",
    "HINT_FitAccept=Put the fitted values into the project; one undo takes them back",
    "LBL_FitDiscard=Discard",
    "HINT_FitDiscard=Forget this result",
    "TAB_FitParameters=Parameters",
    "TAB_FitResiduals=Residuals",
    "TAB_FitCorrelations=Correlations",
    "TAB_FitRemarks=Remarks",
    "# {0} - number of remarks",
    "TAB_FitRemarksCounted=Remarks ({0})",
    "MSG_FitOutdated=The project has changed since this fit was started: run it again to accept it.",
    "# {0} - model",
    "PRG_Fit=Fitting {0}"
})
public final class FitTopComponent extends SessionWindow {
    static final String ID = "FitTopComponent";
    private static final long serialVersionUID = 1L;
    private static final RequestProcessor WORKER = new RequestProcessor("fits", 2, true);

    private final JComboBox<String> models = new JComboBox<>();
    private final JButton run = new JButton(Bundle.LBL_FitRun(), Glyph.RUN);
    private final JButton cancel = new JButton(Bundle.LBL_FitCancel(), Glyph.STOP);
    private final JButton accept = new JButton(Bundle.LBL_FitAccept());
    private final JButton discard = new JButton(Bundle.LBL_FitDiscard());
    private final JProgressBar progress = new JProgressBar(0, 1000);
    private final JLabel doing = new JLabel(" ");
    private final JLabel quality = new JLabel(" ");
    private final ProblemLine line = new ProblemLine("fit.message");
    private final CardLayout cards = new CardLayout();
    private final JPanel deck = new JPanel(cards);
    private final JTabbedPane tabs = new JTabbedPane();
    private final JList<String> remarks = new JList<>();
    private final transient Grid<FitViewModel.ParameterRow> parameters;
    private final transient Grid<FitViewModel.DatumRow> residuals;
    private final transient Grid<FitViewModel.CorrelationRow> correlations;
    private final transient Map<ProjectSession, FitController> controllers = new HashMap<>();
    private transient FitController controller;
    private EmptyState failure = new EmptyState("", "");
    private boolean filling;

    /** Made by the window system. */
    public FitTopComponent() {
        setName(Bundle.CTL_FitWindow());
        setDisplayName(Bundle.CTL_FitWindow());
        setToolTipText(Bundle.HINT_FitWindow());
        parameters = new Grid<>("fit.parameters", Bundle.TAB_FitParameters(), parameterColumns(), line);
        residuals = new Grid<>("fit.residuals", Bundle.TAB_FitResiduals(), residualColumns(), line);
        correlations = new Grid<>("fit.correlations", Bundle.TAB_FitCorrelations(), correlationColumns(), line);
        button(run, "fit.run", Bundle.HINT_FitRun(), () -> controller.run((String) models.getSelectedItem()));
        button(cancel, "fit.cancel", Bundle.HINT_FitCancel(), () -> controller.cancel());
        button(accept, "fit.accept", Bundle.HINT_FitAccept(), () -> line.say(controller.accept()));
        button(discard, "fit.discard", Bundle.HINT_FitDiscard(), () -> controller.discard());
        models.setName("fit.model");
        models.addActionListener(event -> {
            if (!filling) {
                selectModel();
            }
        });
        progress.setName("fit.progress");
        progress.getAccessibleContext().setAccessibleName(Bundle.CTL_FitWindow());
        doing.setName("fit.doing");
        quality.setName("fit.quality");
        JPanel content = new JPanel(new BorderLayout());
        content.add(side(), BorderLayout.LINE_START);
        content.add(results(), BorderLayout.CENTER);
        line.setBorder(BorderFactory.createEmptyBorder(2, 8, 4, 8));
        content.add(line, BorderLayout.SOUTH);
        install(content, new EmptyState(Bundle.MSG_FitMissing(), Bundle.MSG_FitRemedy()));
    }

    private JComponent side() {
        Form form = new Form();
        form.field(Bundle.LBL_FitModel(), models);
        form.wide(pair(run, cancel));
        form.wide(progress);
        form.wide(doing);
        form.wide(quality);
        form.wide(pair(accept, discard));
        form.end();
        JScrollPane scroll = new JScrollPane(form);
        scroll.setBorder(BorderFactory.createMatteBorder(0, 0, 0, 1, UIManager.getColor("Separator.foreground")));
        scroll.setHorizontalScrollBarPolicy(JScrollPane.HORIZONTAL_SCROLLBAR_NEVER);
        scroll.setPreferredSize(new Dimension(250, 200));
        return scroll;
    }

    private static JPanel pair(JButton one, JButton other) {
        JPanel pair = new JPanel(new GridLayout(1, 2, 6, 0));
        pair.add(one);
        pair.add(other);
        return pair;
    }

    private JComponent results() {
        remarks.setName("fit.remarks");
        remarks.getAccessibleContext().setAccessibleName(Bundle.TAB_FitRemarks());
        tabs.setName("fit.tabs");
        tabs.addTab(Bundle.TAB_FitParameters(), new JScrollPane(parameters));
        tabs.addTab(Bundle.TAB_FitResiduals(), new JScrollPane(residuals));
        tabs.addTab(Bundle.TAB_FitCorrelations(), new JScrollPane(correlations));
        tabs.addTab(Bundle.TAB_FitRemarks(), new JScrollPane(remarks));
        deck.add(new EmptyState(Bundle.MSG_FitNoModel(), Bundle.MSG_FitNoModelRemedy()), "none");
        deck.add(new EmptyState(Bundle.MSG_FitIdle(), Bundle.MSG_FitIdleRemedy()), FitViewModel.State.IDLE.name());
        deck.add(
                new EmptyState(Bundle.MSG_FitRunning(), Bundle.MSG_FitRunningRemedy()),
                FitViewModel.State.RUNNING.name());
        deck.add(failure, FitViewModel.State.FAILED.name());
        deck.add(tabs, FitViewModel.State.DONE.name());
        return deck;
    }

    private static void button(JButton button, String name, String hint, Runnable code) {
        button.setName(name);
        button.setToolTipText(hint);
        button.addActionListener(event -> code.run());
    }

    private static List<GridColumn<FitViewModel.ParameterRow>> parameterColumns() {
        return List.of(
                GridColumn.shown("Parameter", "", Kind.TEXT, "error of calibration", FitViewModel.ParameterRow::name),
                GridColumn.shown(
                        "Before",
                        "Its value in the project",
                        Kind.NUMBER,
                        "0.1234567890",
                        FitViewModel.ParameterRow::before),
                GridColumn.shown(
                        "Fitted",
                        "Its value with the standard uncertainty of its last digits",
                        Kind.NUMBER,
                        "0.1234567890(12)",
                        FitViewModel.ParameterRow::after),
                GridColumn.shown("Unit", "", Kind.TEXT, "cm^-1 angstrom", FitViewModel.ParameterRow::unit),
                GridColumn.shown(
                        "Moved by",
                        "The change, in standard uncertainties where there are any",
                        Kind.NUMBER,
                        "+12.3 σ 00",
                        FitViewModel.ParameterRow::change),
                GridColumn.shown("Note", "", Kind.TEXT, "not determined by the data", FitViewModel.ParameterRow::note));
    }

    private static List<GridColumn<FitViewModel.DatumRow>> residualColumns() {
        return List.of(
                GridColumn.shown("Levels", "", Kind.TEXT, "v=1 J=12 - v=0 J=11", FitViewModel.DatumRow::levels),
                GridColumn.shown("Quantity", "", Kind.TEXT, "vacuum wavelength", FitViewModel.DatumRow::quantity),
                GridColumn.shown("Measured", "", Kind.NUMBER, "16956.17025", FitViewModel.DatumRow::measured),
                GridColumn.shown(
                        "Fitted",
                        "What the fitted model says, shared errors included",
                        Kind.NUMBER,
                        "16956.17025(12)",
                        FitViewModel.DatumRow::predicted),
                GridColumn.shown("Unit", "", Kind.TEXT, "GeV/c^2", FitViewModel.DatumRow::unit),
                GridColumn.shown(
                                "Residual / σ",
                                "(measured − fitted)/σ",
                                Kind.NUMBER,
                                "+12.34 00",
                                FitViewModel.DatumRow::residual)
                        .withProblem(row -> row.far() ? "more than 3 σ away" : ""),
                GridColumn.shown("Remark", "", Kind.TEXT, "not used, or the like", FitViewModel.DatumRow::problem));
    }

    private static List<GridColumn<FitViewModel.CorrelationRow>> correlationColumns() {
        return List.of(
                GridColumn.shown(
                        "Parameter", "", Kind.TEXT, "error of calibration", FitViewModel.CorrelationRow::first),
                GridColumn.shown("with", "", Kind.TEXT, "error of calibration", FitViewModel.CorrelationRow::second),
                GridColumn.shown("Correlation", "−1 to 1", Kind.NUMBER, "+0.123", FitViewModel.CorrelationRow::value));
    }

    @Override
    protected void selected(ProjectSession selected) {
        controllers
                .keySet()
                .retainAll(Lookup.getDefault().lookup(OpenProjects.class).sessions());
        controller = selected == null ? null : controllers.computeIfAbsent(selected, this::controllerOf);
        line.say(Optional.empty());
    }

    private FitController controllerOf(ProjectSession of) {
        return new FitController(
                of,
                Lookup.getDefault().lookup(FitService.class),
                WORKER,
                SwingUtilities::invokeLater,
                model -> showFit(of, model),
                new StatusLine());
    }

    @Override
    protected void show(ProjectSession selected) {
        ModelDocument document = selected.project().document();
        List<String> names = document.models().stream().map(Model::name).toList();
        filling = true;
        DefaultComboBoxModel<String> old = (DefaultComboBoxModel<String>) models.getModel();
        boolean same = old.getSize() == names.size();
        for (int i = 0; same && i < names.size(); i++) {
            same = names.get(i).equals(old.getElementAt(i));
        }
        if (!same) {
            Object chosen = models.getSelectedItem();
            models.setModel(new DefaultComboBoxModel<>(names.toArray(new String[0])));
            if (names.contains(chosen)) {
                models.setSelectedItem(chosen);
            }
        }
        if (names.contains(selection().model())) {
            models.setSelectedItem(selection().model());
        }
        filling = false;
        showFit(selected, controller.shown());
    }

    private void selectModel() {
        if (models.getSelectedItem() != null) {
            pickModel((String) models.getSelectedItem());
        }
    }

    @Override
    protected void picked(FigureSelection selection) {
        if (!selection.model().equals(models.getSelectedItem())) {
            filling = true;
            models.setSelectedItem(selection.model());
            filling = false;
        }
    }

    private void showFit(ProjectSession of, FitViewModel fit) {
        if (of != session()) {
            return;
        }
        boolean running = fit.state() == FitViewModel.State.RUNNING;
        boolean done = fit.state() == FitViewModel.State.DONE;
        boolean any = models.getItemCount() > 0;
        run.setEnabled(any && !running);
        cancel.setEnabled(running);
        models.setEnabled(any && !running);
        boolean outdated = done && controller.outdated();
        accept.setEnabled(done && !outdated);
        discard.setEnabled(done);
        progress.setVisible(running);
        progress.setValue((int) (1000 * fit.fraction()));
        doing.setText(fit.doing().isEmpty() ? " " : fit.doing());
        quality.setText("<html>" + String.join("<br>", fit.quality()));
        if (fit.state() == FitViewModel.State.FAILED) {
            deck.remove(failure);
            failure = new EmptyState(Bundle.MSG_FitFailed(), fit.problem().sentence());
            failure.setName("fit.failure");
            deck.add(failure, FitViewModel.State.FAILED.name());
        }
        parameters.setRows(fit.parameters());
        residuals.setRows(fit.residuals());
        correlations.setRows(fit.correlations());
        remarks.setListData(fit.remarks().toArray(new String[0]));
        tabs.setTitleAt(
                3,
                fit.remarks().isEmpty()
                        ? Bundle.TAB_FitRemarks()
                        : Bundle.TAB_FitRemarksCounted(fit.remarks().size()));
        line.setHint(outdated ? Bundle.MSG_FitOutdated() : "");
        cards.show(deck, !any ? "none" : fit.state().name());
    }

    /** Shows a running fit in the platform's status line, with a button that cancels it. */
    private static final class StatusLine implements FitController.FitWatcher {
        private ProgressHandle handle;
        private int done;

        @Override
        public void started(String model, Runnable stop) {
            done = 0;
            handle = ProgressHandle.createHandle(Bundle.PRG_Fit(model), () -> {
                stop.run();
                return true;
            });
            handle.start(1000);
        }

        @Override
        public void progress(double fraction, String what) {
            // The platform's bar cannot go back.
            done = Math.max(done, Math.min(1000, (int) (1000 * fraction)));
            handle.progress(what, done);
        }

        @Override
        public void ended() {
            handle.finish();
        }

        @Override
        public void accepted(ProjectSession session, String digest, FitResult result) {
            FitRecorder recorder = Lookup.getDefault().lookup(FitRecorder.class);
            if (recorder != null) {
                recorder.accepted(session, digest, result);
            }
        }
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
