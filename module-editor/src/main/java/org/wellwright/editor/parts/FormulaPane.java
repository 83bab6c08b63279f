package org.wellwright.editor.parts;

import java.awt.Color;
import java.awt.Font;
import java.awt.Point;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javax.swing.JMenuItem;
import javax.swing.JPopupMenu;
import javax.swing.JTextPane;
import javax.swing.KeyStroke;
import javax.swing.SwingUtilities;
import javax.swing.UIManager;
import javax.swing.text.BadLocationException;
import javax.swing.text.SimpleAttributeSet;
import javax.swing.text.StyleConstants;
import javax.swing.text.StyledDocument;
import org.wellwright.solver.potential.FormulaFault;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.FormulaToken;
import org.wellwright.solver.potential.FormulaWord;

/**
 * A field for a formula: coloured as it is typed, the first fault underlined and told with its column, names offered
 * with Ctrl+Space.
 */
public final class FormulaPane extends JTextPane {
    private static final long serialVersionUID = 1L;

    private final ProblemLine line;
    private final transient Supplier<List<String>> parameters;
    private final transient Consumer<String> typed;
    private boolean filling;
    private boolean due;

    /**
     * Makes an empty field.
     *
     * @param line where faults are told
     * @param parameters the names that a formula may use
     * @param typed called with the text after every change by the user
     * @param left called when the field is left
     */
    public FormulaPane(
            String name, ProblemLine line, Supplier<List<String>> parameters, Consumer<String> typed, Runnable left) {
        this.line = line;
        this.parameters = parameters;
        this.typed = typed;
        setName(name);
        getAccessibleContext().setAccessibleName("Formula V(r)");
        setFont(mono());
        getDocument().addDocumentListener(new Typing(this::changed));
        getInputMap().put(KeyStroke.getKeyStroke("ctrl SPACE"), "complete");
        getActionMap().put("complete", ToolStrip.action("complete", this::complete));
        getInputMap().put(KeyStroke.getKeyStroke("TAB"), "leave");
        getActionMap().put("leave", ToolStrip.action("leave", this::transferFocus));
        addFocusListener(new FocusAdapter() {
            @Override
            public void focusLost(FocusEvent event) {
                left.run();
            }
        });
    }

    /** Shows a formula; the caret stays where the text is the same. */
    public void show(String text) {
        if (!getText().replace("\r\n", "\n").equals(text)) {
            filling = true;
            int caret = Math.min(getCaretPosition(), text.length());
            setText(text);
            setCaretPosition(caret);
            filling = false;
        }
        paintLater();
    }

    private static Font mono() {
        Font base = UIManager.getFont("TextField.font");
        return new Font(Font.MONOSPACED, Font.PLAIN, base == null ? 13 : base.getSize());
    }

    private void changed() {
        if (!filling) {
            // The text may not be changed from within its own listener, but it can be told to others.
            String text = text();
            SwingUtilities.invokeLater(() -> typed.accept(text));
        }
        paintLater();
    }

    private void paintLater() {
        if (!due) {
            due = true;
            SwingUtilities.invokeLater(this::colour);
        }
    }

    private String text() {
        try {
            return getDocument().getText(0, getDocument().getLength());
        } catch (BadLocationException e) {
            throw new IllegalStateException("the whole text is always there", e);
        }
    }

    private void colour() {
        due = false;
        String text = text();
        StyledDocument document = getStyledDocument();
        filling = true;
        document.setCharacterAttributes(
                0, text.length() + 1, style(UIManager.getColor("TextPane.foreground"), false), true);
        for (FormulaToken token : FormulaText.tokens(text)) {
            document.setCharacterAttributes(
                    token.start(), token.end() - token.start(), style(colour(token.kind()), false), true);
        }
        Optional<FormulaFault> fault = FormulaText.fault(text);
        fault.ifPresent(found -> {
            int start = Math.min(found.start(), Math.max(0, text.length() - 1));
            document.setCharacterAttributes(
                    start, Math.max(1, found.end() - start), style(Tones.problem(), true), true);
        });
        filling = false;
        line.say(fault.map(FormulaFault::problem));
    }

    private static Color colour(FormulaToken.Kind kind) {
        return switch (kind) {
            case NUMBER -> Tones.number();
            case PARAMETER, LOCAL -> Tones.name();
            case RADIUS, FUNCTION, CONSTANT -> Tones.word();
            case FAULTY -> Tones.problem();
            case OPERATOR, PUNCTUATION -> UIManager.getColor("TextPane.foreground");
        };
    }

    private static SimpleAttributeSet style(Color colour, boolean underlined) {
        SimpleAttributeSet style = new SimpleAttributeSet();
        if (colour != null) {
            StyleConstants.setForeground(style, colour);
        }
        StyleConstants.setUnderline(style, underlined);
        return style;
    }

    private void complete() {
        List<FormulaWord> words = FormulaText.completions(text(), getCaretPosition(), parameters.get());
        if (words.isEmpty()) {
            return;
        }
        if (words.size() == 1) {
            insert(words.get(0));
            return;
        }
        JPopupMenu menu = new JPopupMenu();
        for (FormulaWord word : words.subList(0, Math.min(16, words.size()))) {
            JMenuItem item = new JMenuItem(word.text() + "   " + word.meaning());
            item.addActionListener(event -> insert(word));
            menu.add(item);
        }
        try {
            Rectangle2D caret = modelToView2D(getCaretPosition());
            Point below = new Point((int) caret.getX(), (int) caret.getMaxY());
            menu.show(this, below.x, below.y);
        } catch (BadLocationException e) {
            menu.show(this, 0, getHeight());
        }
    }

    private void insert(FormulaWord word) {
        int caret = getCaretPosition();
        String text = text();
        int start = caret;
        while (start > 0 && (Character.isLetterOrDigit(text.charAt(start - 1)) || text.charAt(start - 1) == '_')) {
            start--;
        }
        select(start, caret);
        replaceSelection(word.text());
    }

    @Override
    public void updateUI() {
        super.updateUI();
        if (line != null) {
            setFont(mono());
            paintLater();
        }
    }
}
