package org.wellwright.editor.systems;

import java.awt.BorderLayout;
import java.awt.Component;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import javax.swing.BorderFactory;
import javax.swing.DefaultListCellRenderer;
import javax.swing.DefaultListModel;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import javax.swing.ListSelectionModel;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;
import org.wellwright.editor.edit.SystemEdits;
import org.wellwright.editor.parts.Entry;
import org.wellwright.editor.parts.EntryField;
import org.wellwright.editor.parts.Form;
import org.wellwright.editor.parts.Glyph;
import org.wellwright.editor.parts.ProblemLine;
import org.wellwright.editor.parts.Tones;
import org.wellwright.editor.parts.ToolStrip;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.window.session.SessionWindow;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.ExchangeSymmetry;
import org.wellwright.solver.pair.MassConvention;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;

/** The pair systems of the selected project: a list above, a form for the selected one below. */
@TopComponent.Description(preferredID = SystemsTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "wellwright-models", openAtStartup = true, position = 200)
@TopComponent.OpenActionRegistration(displayName = "#CTL_SystemsWindow", preferredID = SystemsTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.editor.systems.SystemsTopComponent")
@ActionReference(path = "Menu/Window", position = 105)
@Messages({
    "CTL_SystemsWindow=Pair systems",
    "HINT_SystemsWindow=The pairs of bodies: masses, charges, spins",
    "MSG_SystemsMissing=No project is open",
    "MSG_SystemsRemedy=Open or create a project from the File menu; its pairs of bodies are edited here.",
    "HINT_SystemsEmpty=No pair system yet: add one with the button above.",
    "LBL_SystemAdd=Add a pair system",
    "LBL_SystemDuplicate=Duplicate the selected system",
    "LBL_SystemRemove=Remove the selected system",
    "LBL_SystemUp=Move up",
    "LBL_SystemDown=Move down",
    "LBL_SystemId=Id",
    "LBL_SystemTitle=Title",
    "HEAD_FirstBody=First body",
    "HEAD_SecondBody=Second body",
    "HEAD_Pair=The pair",
    "LBL_Mass=Mass",
    "LBL_BodyName=Name",
    "LBL_Charge=Charge / e",
    "LBL_Spin=Spin",
    "LBL_Convention=Masses are",
    "LBL_Exchange=The bodies",
    "LBL_Permittivity=Rel. permittivity",
    "LBL_Abundance=Abundance",
    "HINT_SystemId=How data and parameters refer to it",
    "HINT_Mass=A particle of the table (e-, p, Na-23), a number with its unit (0.067 m_e), or the name of a parameter",
    "HINT_Spin=0, 1/2, 1, ...; empty where it plays no role",
    "HINT_Permittivity=Of the medium; 1 in vacuum",
    "HINT_Abundance=Natural fraction of this isotopologue, as 0.9893 or 98.93 %; empty where it plays no role"
})
public final class SystemsTopComponent extends SessionWindow {
    static final String ID = "SystemsTopComponent";
    private static final long serialVersionUID = 1L;
    private static final String[] CONVENTIONS = {
        "those of neutral atoms",
        "those of bare nuclei",
        "those of ions of the charge above",
        "effective masses",
        "parameters of the model"
    };
    private static final String[] EXCHANGES = {
        "differ", "are identical bosons", "are identical fermions", "are a particle and its antiparticle"
    };

    private final ProblemLine line = new ProblemLine("systems.message");
    private final DefaultListModel<SystemsViewModel.Row> items = new DefaultListModel<>();
    private final JList<SystemsViewModel.Row> list = new JList<>(items);
    private final Form form = new Form();
    private final JButton duplicate;
    private final JButton remove;
    private final JButton up;
    private final JButton down;
    private final EntryField id;
    private final EntryField title;
    private final JComboBox<String> convention = new JComboBox<>(CONVENTIONS);
    private final JComboBox<String> exchange = new JComboBox<>(EXCHANGES);
    private final EntryField permittivity;
    private final EntryField abundance;
    private final JLabel derived = new JLabel(" ");
    private final transient BodyFields first;
    private final transient BodyFields second;
    private transient SystemsController controller;
    private transient ModelDocument shown;
    private boolean filling;

    /** Made by the window system. */
    public SystemsTopComponent() {
        setName(Bundle.CTL_SystemsWindow());
        setDisplayName(Bundle.CTL_SystemsWindow());
        setToolTipText(Bundle.HINT_SystemsWindow());
        ToolStrip tools = new ToolStrip("systems");
        tools.icon("add", Glyph.ADD, Bundle.LBL_SystemAdd(), () -> go(controller.add()));
        duplicate = tools.icon(
                "duplicate", Glyph.DUPLICATE, Bundle.LBL_SystemDuplicate(), () -> go(controller.duplicate(index())));
        remove = tools.icon("remove", Glyph.REMOVE, Bundle.LBL_SystemRemove(), this::remove);
        up = tools.icon("up", Glyph.UP, Bundle.LBL_SystemUp(), () -> go(controller.move(index(), -1)));
        down = tools.icon("down", Glyph.DOWN, Bundle.LBL_SystemDown(), () -> go(controller.move(index(), 1)));
        list.setName("systems.list");
        list.getAccessibleContext().setAccessibleName(Bundle.CTL_SystemsWindow());
        list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        list.setCellRenderer(new Renderer());
        list.addListSelectionListener(event -> {
            if (!filling) {
                showForm();
            }
        });
        id = field(
                "systems.id", Bundle.LBL_SystemId(), Bundle.HINT_SystemId(), text -> controller.rename(index(), text));
        title = field("systems.title", Bundle.LBL_SystemTitle(), null, text -> controller.setTitle(index(), text));
        form.heading(Bundle.HEAD_FirstBody());
        first = new BodyFields(true);
        form.heading(Bundle.HEAD_SecondBody());
        second = new BodyFields(false);
        form.heading(Bundle.HEAD_Pair());
        choice(
                "systems.convention",
                Bundle.LBL_Convention(),
                convention,
                () -> controller.setConvention(index(), MassConvention.values()[convention.getSelectedIndex()]));
        choice(
                "systems.exchange",
                Bundle.LBL_Exchange(),
                exchange,
                () -> controller.setExchange(index(), ExchangeSymmetry.values()[exchange.getSelectedIndex()]));
        permittivity = field(
                "systems.permittivity",
                Bundle.LBL_Permittivity(),
                Bundle.HINT_Permittivity(),
                text -> controller.setPermittivity(index(), text));
        abundance = field(
                "systems.abundance",
                Bundle.LBL_Abundance(),
                Bundle.HINT_Abundance(),
                text -> controller.setAbundance(index(), text));
        derived.setName("systems.derived");
        form.wide(derived);
        form.end();
        JScrollPane listScroll = new JScrollPane(list);
        listScroll.setBorder(BorderFactory.createEmptyBorder());
        JScrollPane formScroll = new JScrollPane(form);
        formScroll.setBorder(BorderFactory.createEmptyBorder());
        JSplitPane split = new JSplitPane(JSplitPane.VERTICAL_SPLIT, listScroll, formScroll);
        split.setResizeWeight(0.2);
        split.setBorder(BorderFactory.createEmptyBorder());
        JPanel content = new JPanel(new BorderLayout());
        content.add(tools, BorderLayout.NORTH);
        content.add(split, BorderLayout.CENTER);
        line.setBorder(BorderFactory.createEmptyBorder(2, 8, 4, 8));
        content.add(line, BorderLayout.SOUTH);
        install(content, new EmptyState(Bundle.MSG_SystemsMissing(), Bundle.MSG_SystemsRemedy()));
    }

    /** The fields of one body. */
    private final class BodyFields {
        private final JComboBox<String> mass = new JComboBox<>();
        private final EntryField label;
        private final EntryField charge;
        private final EntryField spin;

        BodyFields(boolean one) {
            String prefix = one ? "systems.first." : "systems.second.";
            mass.setEditable(true);
            mass.setName(prefix + "mass");
            mass.setToolTipText(Bundle.HINT_Mass());
            ((JComponent) mass.getEditor().getEditorComponent()).setName(prefix + "mass.text");
            List<String> particles = ParticleCatalogue.STANDARD.particles().stream()
                    .map(particle -> particle.id())
                    .toList();
            particles.forEach(mass::addItem);
            mass.addActionListener(event -> {
                if (!filling && index() >= 0) {
                    Optional<Problem> problem = controller.setMass(
                            index(), one, String.valueOf(mass.getEditor().getItem()));
                    mass.putClientProperty("JComponent.outline", problem.isPresent() ? "error" : null);
                    line.say(problem);
                }
            });
            form.field(Bundle.LBL_Mass(), mass);
            label = field(
                    prefix + "label", Bundle.LBL_BodyName(), null, text -> controller.setLabel(index(), one, text));
            charge = field(
                    prefix + "charge", Bundle.LBL_Charge(), null, text -> controller.setCharge(index(), one, text));
            spin = field(
                    prefix + "spin",
                    Bundle.LBL_Spin(),
                    Bundle.HINT_Spin(),
                    text -> controller.setSpin(index(), one, text));
        }

        void show(Body body) {
            mass.setSelectedItem(SystemEdits.massText(body.mass()));
            String origin = SystemsViewModel.origin(body);
            mass.setToolTipText(origin.isEmpty() ? Bundle.HINT_Mass() : origin);
            label.show(body.label());
            charge.show(body.charge().text());
            int twice = body.twiceSpin();
            spin.show(twice < 0 ? "" : twice % 2 == 0 ? Integer.toString(twice / 2) : twice + "/2");
        }
    }

    private EntryField field(String name, String label, String hint, Entry entry) {
        EntryField field = new EntryField(name, 10).onEntry(entry, line);
        field.setToolTipText(hint);
        form.field(label, field);
        return field;
    }

    private void choice(String name, String label, JComboBox<String> box, Supplier<Optional<Problem>> set) {
        box.setName(name);
        box.addActionListener(event -> {
            if (!filling) {
                line.say(set.get());
            }
        });
        form.field(label, box);
    }

    private int index() {
        return list.getSelectedIndex();
    }

    @Override
    protected void selected(ProjectSession selected) {
        controller = selected == null ? null : new SystemsController(selected);
        shown = null;
        filling = true;
        items.clear();
        filling = false;
    }

    @Override
    protected void show(ProjectSession selected) {
        ModelDocument document = selected.project().document();
        if (document.equals(shown)) {
            return;
        }
        shown = document;
        List<SystemsViewModel.Row> rows = SystemsViewModel.of(document).systems();
        filling = true;
        int index = Math.max(0, index());
        for (int i = 0; i < rows.size(); i++) {
            if (i < items.size()) {
                items.set(i, rows.get(i));
            } else {
                items.addElement(rows.get(i));
            }
        }
        while (items.size() > rows.size()) {
            items.remove(items.size() - 1);
        }
        list.setSelectedIndex(Math.min(index, rows.size() - 1));
        filling = false;
        line.setHint(rows.isEmpty() ? Bundle.HINT_SystemsEmpty() : "");
        showForm();
    }

    private void showForm() {
        int index = index();
        boolean there = index >= 0 && index < items.size();
        duplicate.setEnabled(there);
        remove.setEnabled(there);
        up.setEnabled(index > 0);
        down.setEnabled(there && index < items.size() - 1);
        form.setVisible(there);
        if (!there) {
            return;
        }
        filling = true;
        SystemsViewModel.Row row = items.get(index);
        PairSystem system = row.system();
        id.show(system.id());
        title.show(system.title());
        first.show(system.first());
        second.show(system.second());
        convention.setSelectedIndex(system.massConvention().ordinal());
        exchange.setSelectedIndex(system.exchange().ordinal());
        permittivity.show(system.permittivity().text());
        abundance.show(system.abundance() == null ? "" : system.abundance().text());
        derived.setText("<html><div style='width:210px'>" + row.derived());
        derived.setForeground(row.derived().startsWith("no ") ? Tones.problem() : Tones.faint());
        if (!row.problem().isEmpty()) {
            line.say(Optional.of(new Problem(row.problem(), "", "")));
        }
        filling = false;
    }

    private void go(int index) {
        show(session());
        list.setSelectedIndex(index);
        list.ensureIndexIsVisible(index);
    }

    private void remove() {
        line.say(controller.remove(index()));
        show(session());
    }

    private static final class Renderer extends DefaultListCellRenderer {
        private static final long serialVersionUID = 1L;

        @Override
        public Component getListCellRendererComponent(
                JList<?> list, Object value, int index, boolean selected, boolean focused) {
            SystemsViewModel.Row row = (SystemsViewModel.Row) value;
            String text = row.system().id() + " — " + row.summary();
            super.getListCellRendererComponent(list, text, index, selected, focused);
            setBorder(BorderFactory.createEmptyBorder(3, 8, 3, 8));
            setToolTipText(row.problem().isEmpty() ? row.system().title() : row.problem());
            if (!row.problem().isEmpty() && !selected) {
                setForeground(Tones.problem());
            }
            return this;
        }
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
