package org.wellwright.editor.notes;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import javax.swing.BorderFactory;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;
import org.wellwright.editor.edit.Units;
import org.wellwright.editor.parts.EntryField;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.editor.parts.Tones;
import org.wellwright.editor.parts.Typing;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.units.UnitSystem;

/** Title, units, names of levels and notes of the selected project. */
@TopComponent.Description(preferredID = NotesTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "wellwright-models", openAtStartup = true, position = 300)
@TopComponent.OpenActionRegistration(displayName = "#CTL_NotesWindow", preferredID = NotesTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.editor.notes.NotesTopComponent")
@ActionReference(path = "Menu/Window", position = 102)
@Messages({
    "CTL_NotesWindow=Notes",
    "HINT_NotesWindow=Title, units and notes of the selected project",
    "MSG_NotesMissing=No project is open",
    "MSG_NotesRemedy=Open or create a project from the File menu; its title, units and notes are edited here.",
    "LBL_NotesTitle=Title",
    "LBL_NotesUnits=Units",
    "HINT_NotesUnits=The units of plain numbers in formulas, and of results; parameters and data keep their own",
    "LBL_NotesLabels=Levels are named",
    "LBL_Notes=Notes",
    "HINT_Notes=Free text; it stands in reports and changes no result",
    "# {0} - edition of the constants",
    "# {1} - mass table",
    "LBL_NotesEditions=Constants: {0}. Masses: {1}."
})
public final class NotesTopComponent extends SessionWindow {
    static final String ID = "NotesTopComponent";
    private static final long serialVersionUID = 1L;
    private static final String[] LABELS = {"2p (n, letter of l)", "1P (n, letter of L)", "v=0 J=1"};

    private final ProblemLine line = new ProblemLine("notes.message");
    private final EntryField title;
    private final JComboBox<String> units =
            new JComboBox<>(UnitSystem.ALL.stream().map(UnitSystem::title).toArray(String[]::new));
    private final JComboBox<String> labels = new JComboBox<>(LABELS);
    private final JTextArea notes = new JTextArea(6, 10);
    private final JLabel editions = new JLabel();
    private transient NotesController controller;
    private boolean filling;

    /** Made by the window system. */
    public NotesTopComponent() {
        setName(Bundle.CTL_NotesWindow());
        setDisplayName(Bundle.CTL_NotesWindow());
        setToolTipText(Bundle.HINT_NotesWindow());
        Form form = new Form();
        title = new EntryField("notes.title", 10).onEntry(text -> controller.setTitle(text), line);
        form.field(Bundle.LBL_NotesTitle(), title);
        units.setName("notes.units");
        units.setToolTipText(Bundle.HINT_NotesUnits());
        units.addActionListener(event -> {
            if (!filling) {
                controller.setUnits(UnitSystem.ALL.get(units.getSelectedIndex()));
            }
        });
        form.field(Bundle.LBL_NotesUnits(), units);
        labels.setName("notes.labels");
        labels.addActionListener(event -> {
            if (!filling) {
                controller.setLabels(LabelConvention.values()[labels.getSelectedIndex()]);
            }
        });
        form.field(Bundle.LBL_NotesLabels(), labels);
        notes.setName("notes.text");
        notes.setLineWrap(true);
        notes.setWrapStyleWord(true);
        notes.setToolTipText(Bundle.HINT_Notes());
        notes.getAccessibleContext().setAccessibleName(Bundle.LBL_Notes());
        notes.getDocument().addDocumentListener(new Typing(() -> {
            if (!filling) {
                controller.setNotes(notes.getText());
            }
        }));
        notes.addFocusListener(new FocusAdapter() {
            @Override
            public void focusLost(FocusEvent event) {
                if (controller != null) {
                    controller.endTyping();
                }
            }
        });
        form.wide(new JLabel(Bundle.LBL_Notes())).setLabelFor(notes);
        JScrollPane scroll = new JScrollPane(notes);
        scroll.setPreferredSize(new Dimension(100, 120));
        form.tall(scroll);
        editions.setForeground(Tones.faint());
        form.wide(editions);
        JPanel content = new JPanel(new BorderLayout());
        JScrollPane formScroll = new JScrollPane(form);
        formScroll.setBorder(BorderFactory.createEmptyBorder());
        content.add(formScroll, BorderLayout.CENTER);
        line.setBorder(BorderFactory.createEmptyBorder(2, 8, 4, 8));
        content.add(line, BorderLayout.SOUTH);
        install(content, new EmptyState(Bundle.MSG_NotesMissing(), Bundle.MSG_NotesRemedy()));
    }

    @Override
    protected void selected(ProjectSession selected) {
        controller = selected == null ? null : new NotesController(selected);
    }

    @Override
    protected void show(ProjectSession selected) {
        Project project = selected.project();
        ModelDocument document = project.document();
        filling = true;
        title.show(project.title());
        units.setSelectedIndex(UnitSystem.ALL.indexOf(Units.of(document)));
        labels.setSelectedIndex(document.labels().ordinal());
        if (!notes.getText().equals(project.notes())) {
            notes.setText(project.notes());
            notes.setCaretPosition(0);
        }
        editions.setText("<html><div style='width:220px'>"
                + Bundle.LBL_NotesEditions(document.constantsEdition(), document.massTable()));
        filling = false;
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
