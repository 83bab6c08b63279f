package org.wellwright.editor.models;

import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JPanel;
import javax.swing.JPopupMenu;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import javax.swing.KeyStroke;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;
import org.wellwright.editor.edit.ModelEdits;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.Glyph;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.editor.parts.ToolStrip;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.potential.Term;

/** The models of the selected project: a tree above, a form for what is selected in it below. */
@TopComponent.Description(preferredID = ModelsTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "wellwright-models", openAtStartup = true, position = 100)
@TopComponent.OpenActionRegistration(displayName = "#CTL_ModelsWindow", preferredID = ModelsTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.editor.models.ModelsTopComponent")
@ActionReference(path = "Menu/Window", position = 110)
@Messages({
    "CTL_ModelsWindow=Models",
    "HINT_ModelsWindow=The models of the selected project, their curves and terms",
    "MSG_ModelsMissing=No project is open",
    "MSG_ModelsRemedy=Open or create a project from the File menu; its models and terms are edited here.",
    "MSG_NoModels=No models yet",
    "MSG_NoModelsRemedy=Add one with the button above: a term of a family, a formula, or a table.",
    "MSG_NothingSelected=Nothing selected",
    "MSG_NothingSelectedRemedy=Select a model, a curve or a term above to edit it.",
    "LBL_Add=Add",
    "HINT_Add=Add a model, a curve, or a term to the selected curve",
    "LBL_AddModel=Model",
    "LBL_AddCurve=Curve",
    "LBL_AddFamily=Term of a family…",
    "LBL_AddFormula=Term from a formula",
    "LBL_AddTable=Term from a table…",
    "LBL_DuplicateNode=Duplicate",
    "LBL_RemoveNode=Remove",
    "LBL_UpNode=Move up",
    "LBL_DownNode=Move down"
})
public final class ModelsTopComponent extends SessionWindow {
    static final String ID = "ModelsTopComponent";
    private static final long serialVersionUID = 1L;
    private static final String FORM = "form";
    private static final String NO_MODELS = "none";
    private static final String NO_SELECTION = "unselected";

    private final ProblemLine line = new ProblemLine("models.message");
    private final ModelTree tree;
    private final Form form = new Form();
    private final CardLayout cards = new CardLayout();
    private final JPanel deck = new JPanel(cards);
    private final JButton duplicate;
    private final JButton remove;
    private final JButton up;
    private final JButton down;
    private transient ModelsController controller;
    private transient ModelDocument shown;
    private transient TermPath formPath = TermPath.NONE;
    private transient ModelForm modelForm;
    private transient CurveForm curveForm;
    private transient TermForm termForm;

    /** Made by the window system. */
    public ModelsTopComponent() {
        setName(Bundle.CTL_ModelsWindow());
        setDisplayName(Bundle.CTL_ModelsWindow());
        setToolTipText(Bundle.HINT_ModelsWindow());
        tree = new ModelTree(
                "models.tree", Bundle.CTL_ModelsWindow(), (path, on) -> line.say(controller.setEnabled(path, on)));
        ToolStrip tools = new ToolStrip("models");
        tools.menu("add", Glyph.ADD, Bundle.LBL_Add(), Bundle.HINT_Add(), addMenu());
        duplicate = tools.icon(
                "duplicate",
                Glyph.DUPLICATE,
                Bundle.LBL_DuplicateNode(),
                () -> go(controller.duplicate(tree.selected())));
        remove = tools.icon("remove", Glyph.REMOVE, Bundle.LBL_RemoveNode(), this::remove);
        up = tools.icon("up", Glyph.UP, Bundle.LBL_UpNode(), () -> go(controller.move(tree.selected(), -1)));
        down = tools.icon("down", Glyph.DOWN, Bundle.LBL_DownNode(), () -> go(controller.move(tree.selected(), 1)));
        tree.getInputMap().put(KeyStroke.getKeyStroke("DELETE"), "remove");
        tree.getActionMap().put("remove", ToolStrip.action("remove", this::remove));
        tree.addTreeSelectionListener(event -> {
            if (!tree.filling()) {
                followSelection();
            }
        });
        JScrollPane treeScroll = new JScrollPane(tree);
        treeScroll.setBorder(BorderFactory.createEmptyBorder());
        JScrollPane formScroll = new JScrollPane(form);
        formScroll.setBorder(BorderFactory.createEmptyBorder());
        deck.add(new EmptyState(Bundle.MSG_NoModels(), Bundle.MSG_NoModelsRemedy()), NO_MODELS);
        deck.add(new EmptyState(Bundle.MSG_NothingSelected(), Bundle.MSG_NothingSelectedRemedy()), NO_SELECTION);
        deck.add(formScroll, FORM);
        JSplitPane split = new JSplitPane(JSplitPane.VERTICAL_SPLIT, treeScroll, deck);
        split.setResizeWeight(0.4);
        split.setBorder(BorderFactory.createEmptyBorder());
        JPanel content = new JPanel(new BorderLayout());
        content.add(tools, BorderLayout.NORTH);
        content.add(split, BorderLayout.CENTER);
        line.setBorder(BorderFactory.createEmptyBorder(2, 8, 4, 8));
        content.add(line, BorderLayout.SOUTH);
        install(content, new EmptyState(Bundle.MSG_ModelsMissing(), Bundle.MSG_ModelsRemedy()));
    }

    private JPopupMenu addMenu() {
        JPopupMenu menu = new JPopupMenu();
        menu.add(ToolStrip.action(Bundle.LBL_AddFamily(), this::addFamily)).setName("models.addFamily");
        menu.add(ToolStrip.action(Bundle.LBL_AddFormula(), this::addFormula)).setName("models.addFormula");
        menu.add(ToolStrip.action(Bundle.LBL_AddTable(), this::addTable)).setName("models.addTable");
        menu.addSeparator();
        menu.add(ToolStrip.action(Bundle.LBL_AddCurve(), this::addCurve)).setName("models.addCurve");
        menu.add(ToolStrip.action(Bundle.LBL_AddModel(), () -> go(controller.addModel())))
                .setName("models.addModel");
        return menu;
    }

    @Override
    protected void selected(ProjectSession selected) {
        controller = selected == null ? null : new ModelsController(selected);
        shown = null;
        formPath = TermPath.NONE;
        tree.clearSelection();
    }

    @Override
    protected void show(ProjectSession selected) {
        ModelDocument document = selected.project().document();
        if (document.equals(shown)) {
            return;
        }
        boolean first = shown == null;
        shown = document;
        tree.show(ModelsViewModel.of(document));
        if (first && tree.selected().kind() == TermPath.Kind.NONE) {
            followFigures();
        }
        showForm();
    }

    private void followSelection() {
        TermPath path = tree.selected();
        if (path.model() >= 0 && shown != null && path.model() < shown.models().size()) {
            pickModel(shown.models().get(path.model()).name());
        }
        showForm();
    }

    /** The model that is in front elsewhere is selected here too. */
    private void followFigures() {
        if (shown == null || shown.models().isEmpty()) {
            return;
        }
        String wanted = selection().model();
        int index =
                Math.max(0, shown.models().stream().map(m -> m.name()).toList().indexOf(wanted));
        if (tree.selected().model() != index) {
            tree.select(TermPath.model(index));
        }
    }

    @Override
    protected void picked(FigureSelection selection) {
        followFigures();
    }

    private void showForm() {
        if (shown == null) {
            return;
        }
        TermPath path = tree.selected();
        boolean there = ModelEdits.exists(shown, path);
        duplicate.setEnabled(there);
        remove.setEnabled(there);
        up.setEnabled(there && path.index() > 0);
        down.setEnabled(there && path.index() < ModelEdits.siblings(shown, path) - 1);
        if (!there) {
            formPath = TermPath.NONE;
            cards.show(deck, shown.models().isEmpty() ? NO_MODELS : NO_SELECTION);
            return;
        }
        build(path);
        switch (path.kind()) {
            case MODEL -> modelForm.show(shown.models().get(path.model()));
            case CURVE -> curveForm.show(ModelEdits.curveAt(shown, path), shown);
            case TERM -> termForm.show(ModelEdits.term(shown, path), shown);
            default -> throw new IllegalStateException("no form for " + path);
        }
        cards.show(deck, FORM);
    }

    /** Builds the form anew only if it is about something else, so that typing is not disturbed. */
    private void build(TermPath path) {
        boolean same = path.equals(formPath)
                && switch (path.kind()) {
                    case MODEL -> modelForm.fits(shown);
                    case TERM -> termForm.fits(ModelEdits.term(shown, path));
                    default -> true;
                };
        if (same) {
            return;
        }
        formPath = path;
        form.clear();
        line.say(Optional.empty());
        switch (path.kind()) {
            case MODEL -> modelForm = new ModelForm(form, controller, path, line);
            case CURVE -> curveForm = new CurveForm(form, controller, path, line);
            case TERM -> {
                Term term = ModelEdits.term(shown, path);
                termForm = new TermForm(form, controller, path, term, line);
            }
            default -> throw new IllegalStateException("no form for " + path);
        }
        form.revalidate();
        form.repaint();
    }

    private void go(TermPath path) {
        show(session());
        tree.select(path);
    }

    private void remove() {
        TermPath path = tree.selected();
        if (path.kind() == TermPath.Kind.NONE) {
            return;
        }
        line.say(controller.remove(path));
        show(session());
        tree.select(path.index() > 0 ? path.at(path.index() - 1) : path);
    }

    private void addFamily() {
        FamilyChooser.ask(controller).ifPresent(choice -> {
            TermPath at = controller.insertedAt(tree.selected());
            line.say(controller.addFamily(tree.selected(), choice.family(), choice.texts()));
            go(at);
        });
    }

    private void addFormula() {
        TermPath at = controller.insertedAt(tree.selected());
        line.say(controller.addFormula(tree.selected()));
        go(at);
    }

    private void addTable() {
        TableAsker.ask(controller.document()).ifPresent(table -> {
            TermPath at = controller.insertedAt(tree.selected());
            line.say(controller.addTable(tree.selected(), table));
            go(at);
        });
    }

    private void addCurve() {
        if (shown.models().isEmpty()) {
            go(controller.addModel());
        } else {
            go(controller.addCurve(tree.selected()));
        }
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
