package org.modewright.ui.editor.fields;

import java.util.Collection;
import java.util.List;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;

/**
 * One thing about an object that the user reads and edits as text, in a form or in a cell of a table: it knows its label with the unit,
 * how it reads, and which command sets it.
 */
public interface Field {

    /** How a field is best edited. */
    enum Style { TEXT, CHOICE, FLAG }

    /** What the field is, with the unit, such as "Area m²". */
    String label();

    /** What it means, for the tooltip. */
    String help();

    Style style();

    /** What can be chosen, or proposed where a name is typed; empty for others. */
    List<String> choices();

    /** The value as text, every digit; for a flag "true" or "false". */
    String text(EObject object);

    /** The value as a table shows it: numbers with as many digits as mean something. */
    default String shown(EObject object) {
        return text(object);
    }

    /** What a table sorts by where numbers are not to sort as words; else the text. */
    default Comparable<?> sortKey(EObject object) {
        return text(object);
    }

    /** Whether the value is a number, set at the right of its column. */
    default boolean isNumber() {
        return false;
    }

    /** Whether all objects have the same value. */
    default boolean agree(Collection<? extends EObject> objects) {
        String first = text(objects.iterator().next());
        return objects.stream().allMatch(object -> text(object).equals(first));
    }

    /** Whether the value can be changed. */
    default boolean isEditable() {
        return true;
    }

    /**
     * Refuses a text that is no value, without making a command.
     *
     * @param objects objects that have this field
     * @param text the value as text
     * @throws IllegalArgumentException as {@link #set} does
     */
    void check(Collection<? extends EObject> objects, String text);

    /**
     * What the checks of the model say against a value that can be set, such as a negative area: a sentence and its remedy.
     *
     * @param object the object that would have the value
     * @param text the value as text
     * @return null if nothing is to be said, or the text is no value
     */
    default String warning(EObject object, String text) {
        return null;
    }

    /**
     * The command that sets the value of all objects.
     *
     * @param objects objects that have this field
     * @param text the value as text
     * @throws IllegalArgumentException if the text is no value; its message is a sentence for the user
     */
    Command set(Collection<? extends EObject> objects, String text);
}
