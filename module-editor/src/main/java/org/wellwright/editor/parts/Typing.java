package org.wellwright.editor.parts;

import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;

/** Calls a piece of code whenever the text of a field changes. */
public record Typing(Runnable code) implements DocumentListener {
    @Override
    public void insertUpdate(DocumentEvent event) {
        code.run();
    }

    @Override
    public void removeUpdate(DocumentEvent event) {
        code.run();
    }

    @Override
    public void changedUpdate(DocumentEvent event) {
        // Attributes only; the text is the same.
    }
}
