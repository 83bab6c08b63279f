package org.wellwright.editor.parts;

import java.util.Optional;
import javax.swing.JLabel;
import org.wellwright.solver.Problem;

/** One line that says what is wrong, or gives a hint while nothing is. */
public final class ProblemLine extends JLabel {
    private static final long serialVersionUID = 1L;

    private String hint = "";

    /** Makes an empty line. */
    public ProblemLine(String name) {
        setName(name);
        getAccessibleContext().setAccessibleName("Message");
        say(Optional.empty());
    }

    /** What stands there while nothing is wrong. */
    public void setHint(String text) {
        boolean shown = getText().equals(hint) || getText().equals(" ");
        hint = text;
        if (shown) {
            say(Optional.empty());
        }
    }

    /** Says what is wrong, or the hint. */
    public void say(Optional<Problem> problem) {
        String text = problem.map(Problem::sentence).orElse(hint);
        setText(text.isEmpty() ? " " : text);
        setToolTipText(problem.isPresent() ? text : null);
        setForeground(problem.isPresent() ? Tones.problem() : Tones.faint());
    }

    @Override
    public void updateUI() {
        super.updateUI();
        setForeground(
                hint != null && !getText().equals(hint) && getToolTipText() != null ? Tones.problem() : Tones.faint());
    }
}
