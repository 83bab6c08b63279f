package org.wellwright.editor.models;

import java.awt.Color;
import java.awt.Component;
import java.awt.FlowLayout;
import java.awt.Font;
import java.awt.Rectangle;
import java.awt.event.KeyEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.BiConsumer;
import javax.swing.JCheckBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTree;
import javax.swing.KeyStroke;
import javax.swing.ToolTipManager;
import javax.swing.UIManager;
import javax.swing.tree.DefaultMutableTreeNode;
import javax.swing.tree.DefaultTreeModel;
import javax.swing.tree.TreeCellRenderer;
import javax.swing.tree.TreePath;
import javax.swing.tree.TreeSelectionModel;
import org.wellwright.editor.edit.TermPath;
import org.wellwright.editor.parts.Tones;
import org.wellwright.editor.parts.ToolStrip;

/** The tree of models, curves and terms; a box before each term switches it on and off. */
final class ModelTree extends JTree {
    private static final long serialVersionUID = 1L;
    private static final int LONGEST_DETAIL = 26;

    private final transient BiConsumer<TermPath, Boolean> toggle;
    private transient ModelsViewModel shown = new ModelsViewModel(List.of());
    private boolean filling;

    ModelTree(String name, String title, BiConsumer<TermPath, Boolean> toggle) {
        super(new DefaultTreeModel(new DefaultMutableTreeNode()));
        this.toggle = toggle;
        setName(name);
        getAccessibleContext().setAccessibleName(title);
        setRootVisible(false);
        setShowsRootHandles(true);
        setToggleClickCount(0);
        getSelectionModel().setSelectionMode(TreeSelectionModel.SINGLE_TREE_SELECTION);
        setCellRenderer(new Renderer());
        ToolTipManager.sharedInstance().registerComponent(this);
        getInputMap().put(KeyStroke.getKeyStroke(KeyEvent.VK_SPACE, 0), "toggle");
        getActionMap().put("toggle", ToolStrip.action("toggle", () -> switchOver(selectedNode())));
        addMouseListener(new MouseAdapter() {
            @Override
            public void mouseClicked(MouseEvent event) {
                TreePath at = getPathForLocation(event.getX(), event.getY());
                if (at != null && onBox(at, event.getX())) {
                    switchOver(node(at));
                }
            }
        });
    }

    /** Shows other models; what was open stays open, what was selected stays selected. */
    void show(ModelsViewModel model) {
        if (model.equals(shown)) {
            return;
        }
        Set<TermPath> closed = new HashSet<>();
        for (int i = 0; i < getRowCount(); i++) {
            if (isCollapsed(i)) {
                closed.add(node(getPathForRow(i)).path());
            }
        }
        TermPath selected = selected();
        shown = model;
        DefaultMutableTreeNode root = new DefaultMutableTreeNode();
        model.models().forEach(node -> root.add(tree(node)));
        filling = true;
        setModel(new DefaultTreeModel(root));
        for (int i = 0; i < getRowCount(); i++) {
            if (!closed.contains(node(getPathForRow(i)).path())) {
                expandRow(i);
            }
        }
        filling = false;
        select(selected);
    }

    /** Selects a place; nothing where there is none. */
    void select(TermPath path) {
        for (int i = 0; i < getRowCount(); i++) {
            if (node(getPathForRow(i)).path().equals(path)) {
                setSelectionRow(i);
                Rectangle bounds = getRowBounds(i);
                scrollRectToVisible(new Rectangle(0, bounds.y, 1, bounds.height));
                return;
            }
        }
        clearSelection();
    }

    /** The selected place. */
    TermPath selected() {
        ModelsViewModel.Node node = selectedNode();
        return node == null ? TermPath.NONE : node.path();
    }

    /** Whether the tree is being filled, so that its selection means nothing. */
    boolean filling() {
        return filling;
    }

    private ModelsViewModel.Node selectedNode() {
        return getSelectionPath() == null ? null : node(getSelectionPath());
    }

    private static ModelsViewModel.Node node(TreePath path) {
        return (ModelsViewModel.Node) ((DefaultMutableTreeNode) path.getLastPathComponent()).getUserObject();
    }

    private static DefaultMutableTreeNode tree(ModelsViewModel.Node node) {
        DefaultMutableTreeNode tree = new DefaultMutableTreeNode(node);
        node.children().forEach(child -> tree.add(tree(child)));
        return tree;
    }

    private void switchOver(ModelsViewModel.Node node) {
        if (node != null && node.path().kind() == TermPath.Kind.TERM) {
            toggle.accept(node.path(), !node.enabled());
        }
    }

    private boolean onBox(TreePath path, int x) {
        Rectangle bounds = getPathBounds(path);
        return node(path).path().kind() == TermPath.Kind.TERM && bounds != null && x < bounds.x + 22;
    }

    @Override
    public String getToolTipText(MouseEvent event) {
        TreePath path = getPathForLocation(event.getX(), event.getY());
        if (path == null) {
            return null;
        }
        ModelsViewModel.Node node = node(path);
        if (!node.problem().isEmpty()) {
            return node.problem();
        }
        return node.detail().isEmpty() ? null : node.detail();
    }

    @Override
    public String convertValueToText(
            Object value, boolean selected, boolean expanded, boolean leaf, int row, boolean focused) {
        return value instanceof DefaultMutableTreeNode tree && tree.getUserObject() instanceof ModelsViewModel.Node node
                ? node.title() + " " + node.detail()
                : "";
    }

    /** The box of a term, then its name, then in fainter colour what it is. */
    private static final class Renderer implements TreeCellRenderer {
        private final JPanel line = new JPanel(new FlowLayout(FlowLayout.LEADING, 4, 1));
        private final JCheckBox box = new JCheckBox();
        private final JLabel title = new JLabel();
        private final JLabel detail = new JLabel();

        Renderer() {
            line.setOpaque(false);
            box.setOpaque(false);
            box.setBorder(null);
            line.add(box);
            line.add(title);
            line.add(detail);
        }

        @Override
        public Component getTreeCellRendererComponent(
                JTree tree, Object value, boolean selected, boolean expanded, boolean leaf, int row, boolean focused) {
            if (!(((DefaultMutableTreeNode) value).getUserObject() instanceof ModelsViewModel.Node node)) {
                return line;
            }
            box.setVisible(node.path().kind() == TermPath.Kind.TERM);
            box.setSelected(node.enabled());
            title.setText(node.title());
            title.setFont(
                    tree.getFont().deriveFont(node.path().kind() == TermPath.Kind.MODEL ? Font.BOLD : Font.PLAIN));
            detail.setText(detail(node));
            Color text = UIManager.getColor(
                    !selected
                            ? "Tree.textForeground"
                            : tree.isFocusOwner() ? "Tree.selectionForeground" : "Tree.selectionInactiveForeground");
            boolean faulty = !node.problem().isEmpty();
            title.setForeground(
                    faulty && !selected ? Tones.problem() : node.enabled() || selected ? text : Tones.faint());
            detail.setForeground(selected ? text : Tones.faint());
            line.getAccessibleContext()
                    .setAccessibleName(
                            node.title() + (node.enabled() ? "" : ", off") + (faulty ? ", " + node.problem() : ""));
            return line;
        }

        /** A model's note is too long for a line of a tree; it is in the tooltip. */
        private static String detail(ModelsViewModel.Node node) {
            if (node.path().kind() == TermPath.Kind.MODEL || node.detail().equals(node.title())) {
                return "";
            }
            return node.detail().length() > LONGEST_DETAIL
                    ? node.detail().substring(0, LONGEST_DETAIL - 1) + "…"
                    : node.detail();
        }
    }
}
