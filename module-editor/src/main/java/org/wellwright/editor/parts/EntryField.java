package org.wellwright.editor.parts;

import java.awt.event.ActionEvent;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.util.Optional;
import javax.swing.AbstractAction;
import javax.swing.JTextField;
import javax.swing.KeyStroke;
import org.wellwright.solver.Problem;

/**
 * A text field that takes up its text when Enter is pressed or it is left. A text that cannot be used stays, marked,
 * with the reason in its line; Escape brings the last good one back, and so does Ctrl+Z while the text is not taken up
 * yet.
 */
public final class EntryField extends JTextField {
    private static final long serialVersionUID = 1L;

    private transient Entry entry = text -> Optional.empty();
    private ProblemLine line;
    private String shown = "";
    private boolean faulty;

    /** Makes an empty field. */
    public EntryField(String name, int columns) {
        super(columns);
        setName(name);
        addActionListener(event -> commit());
        addFocusListener(new FocusAdapter() {
            @Override
            public void focusLost(FocusEvent event) {
                if (!event.isTemporary()) {
                    commit();
                }
            }
        });
        getInputMap().put(KeyStroke.getKeyStroke("ESCAPE"), "revert");
        getActionMap().put("revert", new Revert());
        getInputMap().put(KeyStroke.getKeyStroke("ctrl Z"), "revert-typing");
        getActionMap().put("revert-typing", new Revert());
    }

    /** What takes up the text, and where its problem is shown. */
    public EntryField onEntry(Entry taker, ProblemLine problemLine) {
        this.entry = taker;
        this.line = problemLine;
        return this;
    }

    /** Shows a text. What the user is typing, or has typed in vain, stays while what it stands for is the same. */
    public void show(String text) {
        boolean unchanged = text.equals(shown);
        if (unchanged && pending() || isFocusOwner() && pending() && !faulty) {
            return;
        }
        if (faulty) {
            mark(Optional.empty());
        }
        shown = text;
        if (!getText().equals(text)) {
            setText(text);
            setCaretPosition(0);
        }
    }

    private boolean pending() {
        return !getText().equals(shown);
    }

    private void commit() {
        if (!pending()) {
            mark(Optional.empty());
            return;
        }
        String typed = getText();
        Optional<Problem> problem = entry.take(typed);
        mark(problem);
        if (problem.isEmpty()) {
            shown = typed;
        }
    }

    private void mark(Optional<Problem> problem) {
        boolean was = faulty;
        faulty = problem.isPresent();
        putClientProperty("JComponent.outline", faulty ? "error" : null);
        if (line != null && (faulty || was)) {
            line.say(problem);
        }
    }

    /** Brings the last good text back; while there is none to bring back, the key goes on to the window. */
    private final class Revert extends AbstractAction {
        private static final long serialVersionUID = 1L;

        @Override
        public boolean isEnabled() {
            return pending();
        }

        @Override
        public void actionPerformed(ActionEvent event) {
            setText(shown);
            mark(Optional.empty());
        }
    }
}
