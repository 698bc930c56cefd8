package org.modewright.ui.editor;

import java.util.Set;
import org.eclipse.swt.widgets.Control;

/** A page of the structure editor. */
public interface EditorPage {

    /** What the tab says. */
    String title();

    Control control();

    /** Shows the model anew after an edit. */
    void modelChanged();

    /** Shows what is selected, without telling. */
    void select(Set<String> ids);

    /** Whether the page can show the object itself, not just its properties. */
    boolean reveals(String id);

    void setFocus();

    /** Copies what is selected here as text. */
    default void copy() {
        // A page without text to copy leaves the clipboard alone.
    }

    /** Selects everything that the page shows. */
    default void selectAll() {
        // A page without a list has nothing to select.
    }
}
