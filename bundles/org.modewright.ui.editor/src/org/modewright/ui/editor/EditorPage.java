package org.modewright.ui.editor;

import java.util.List;
import java.util.Set;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.widgets.Control;

/** A page of the structure editor. Only the page on top is told of changes; another one is told when it comes to the top. */
public interface EditorPage {

    Control control();

    /** Shows the model anew after an edit. */
    void modelChanged();

    /** Shows what is selected, without telling. */
    void select(Set<String> ids);

    /** Whether the page can show the object itself, not just its properties. */
    boolean reveals(String id);

    void setFocus();

    /** Shows what the live checks say now. */
    default void findingsChanged() {
        // A page without objects shows no findings.
    }

    /** Brings the properties of what is selected forward and sets the focus into them. */
    default void showProperties() {
        setFocus();
    }

    /** Begins to rename what is selected. */
    default void rename() {
        showProperties();
    }

    /** Goes to where the user says what is looked for. */
    default void find() {
        // A page without a filter finds nothing.
    }

    /** What Delete deletes here; null: the objects selected in the session. */
    default List<? extends EObject> toDelete() {
        return null;
    }

    /** Copies what is selected here as text. */
    default void copy() {
        // A page without text to copy leaves the clipboard alone.
    }

    /** Takes over rows from the clipboard. */
    default void paste() {
        // A page without a table takes nothing.
    }

    /** Selects everything that the page shows. */
    default void selectAll() {
        // A page without a list has nothing to select.
    }
}
