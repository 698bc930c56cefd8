package org.modewright.ui.editor;

import java.util.function.BooleanSupplier;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Text;

/**
 * Editing keys that belong to a text field while one has the focus: without this, Delete in a field would delete the selected objects of
 * the model, as the workbench hands the key to the editor first.
 */
public final class TextKeys {

    private static final String UNDO = "org.modewright.ui.editor.undoTyping";

    private TextKeys() {
    }

    /**
     * Says what undo does first while a field has the focus.
     *
     * @param takeBack takes back what is typed; false if there is nothing to take back
     */
    public static void onUndo(Text text, BooleanSupplier takeBack) {
        text.setData(UNDO, takeBack);
    }

    private static Text text(Display display) {
        return display.getFocusControl() instanceof Text text ? text : null;
    }

    /** Whether a text field has the focus. */
    static boolean apply(Display display) {
        return text(display) != null;
    }

    static boolean undo(Display display) {
        Text text = text(display);
        return text != null && text.getData(UNDO) instanceof BooleanSupplier takeBack && takeBack.getAsBoolean();
    }

    static void copy(Display display) {
        text(display).copy();
    }

    static void cut(Display display) {
        text(display).cut();
    }

    static void paste(Display display) {
        text(display).paste();
    }

    static void selectAll(Display display) {
        text(display).selectAll();
    }

    /** Deletes what is selected in the field, else the character after the caret. */
    static void delete(Display display) {
        Text text = text(display);
        if (!text.getEditable()) {
            return;
        }
        Point chosen = text.getSelection();
        if (chosen.x == chosen.y) {
            text.setSelection(chosen.x, Math.min(text.getCharCount(), chosen.x + 1));
        }
        text.insert("");
    }
}
