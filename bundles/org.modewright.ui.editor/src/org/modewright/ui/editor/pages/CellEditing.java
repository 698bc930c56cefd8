package org.modewright.ui.editor.pages;

import java.util.List;
import java.util.function.Function;
import java.util.function.IntConsumer;
import java.util.function.Supplier;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.window.DefaultToolTip;
import org.eclipse.jface.window.ToolTip;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.TableEditor;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.swt.widgets.Text;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.TextKeys;
import org.modewright.ui.editor.fields.Field;

/**
 * Edits one cell of a table: Enter sets, Tab sets and goes on to the next cell, Escape gives up. A text that is refused stays, with the
 * reason beside it.
 */
final class CellEditing {

    private final Table table;
    private final EditorContext context;
    private final TableEditor place;
    private DefaultToolTip reason;
    private Control control;
    private Field field;
    private EObject object;
    private String original;
    private Supplier<String> value;
    private IntConsumer next;

    CellEditing(Table table, EditorContext context) {
        this.table = table;
        this.context = context;
        place = new TableEditor(table);
        place.grabHorizontal = true;
        place.grabVertical = true;
        place.minimumWidth = 60;
    }

    /**
     * Opens a cell.
     *
     * @param goOn told to edit the next (1) or the previous (-1) cell
     */
    void open(TableItem item, int column, Field of, EObject edited, IntConsumer goOn) {
        close();
        field = of;
        object = edited;
        original = of.text(edited);
        next = goOn;
        control = switch (of.style()) {
            case FLAG -> check();
            case CHOICE -> combo();
            case TEXT -> text();
        };
        control.setData(UiIds.WIDGET_ID, "tables.cell");
        control.addListener(SWT.Traverse, this::traverse);
        place.setEditor(control, item, column);
        control.setFocus();
    }

    /** Keeps the open cell with its object after rows have moved; gives up if the object has gone. */
    void follow(Function<EObject, TableItem> rowOf) {
        if (!isOpen()) {
            return;
        }
        TableItem row = rowOf.apply(object);
        if (row == null) {
            close();
        } else if (row != place.getItem()) {
            place.setItem(row);
        }
    }

    void close() {
        hideReason();
        if (isOpen()) {
            Control closing = control;
            boolean focused = closing.isFocusControl();
            control = null;
            closing.dispose();
            if (focused && !table.isDisposed()) {
                table.setFocus();
            }
        }
    }

    private boolean isOpen() {
        return control != null && !control.isDisposed();
    }

    private Combo combo() {
        Combo combo = new Combo(table, SWT.READ_ONLY);
        combo.setItems(field.choices().toArray(new String[0]));
        combo.setText(field.text(object));
        value = combo::getText;
        combo.addListener(SWT.Selection, event -> commit());
        combo.addListener(SWT.FocusOut, event -> leave(combo));
        return combo;
    }

    private Button check() {
        Button check = new Button(table, SWT.CHECK);
        check.setBackground(table.getBackground());
        check.setSelection(Boolean.parseBoolean(field.text(object)));
        value = () -> Boolean.toString(check.getSelection());
        check.addListener(SWT.Selection, event -> commit());
        check.addListener(SWT.FocusOut, event -> leave(check));
        return check;
    }

    private Text text() {
        Text text = new Text(table, field.isNumber() ? SWT.RIGHT : SWT.LEFT);
        text.setText(field.text(object));
        text.selectAll();
        value = text::getText;
        text.addListener(SWT.Modify, event -> consider());
        text.addListener(SWT.FocusOut, event -> leave(text));
        TextKeys.onUndo(text, () -> takeBack(text));
        return text;
    }

    private boolean takeBack(Text text) {
        boolean typed = !text.getText().equals(original);
        if (typed) {
            text.setText(original);
            text.selectAll();
        }
        return typed;
    }

    /** Leaving the cell sets a good value and gives up a bad one. */
    private void leave(Control left) {
        if (control == left && !left.isDisposed()) {
            commit();
            close();
        }
    }

    private void traverse(Event event) {
        int direction = event.detail == SWT.TRAVERSE_TAB_NEXT ? 1 : event.detail == SWT.TRAVERSE_TAB_PREVIOUS ? -1 : 0;
        if (event.detail == SWT.TRAVERSE_ESCAPE) {
            event.doit = false;
            close();
        } else if (direction != 0 || event.detail == SWT.TRAVERSE_RETURN) {
            event.doit = false;
            IntConsumer goOn = next;
            if (commit()) {
                close();
                if (direction != 0) {
                    goOn.accept(direction);
                }
            }
        }
    }

    /** Sets the value; false, and the reason beside the cell, if it is refused. */
    private boolean commit() {
        String wanted = value.get();
        if (wanted.equals(original) || wanted.equals(field.text(object))) {
            return true;
        }
        try {
            context.execute(field.set(List.of(object), wanted));
            original = wanted;
            return true;
        } catch (IllegalArgumentException refused) {
            showReason(refused.getMessage());
            return false;
        }
    }

    private void consider() {
        String wanted = value.get();
        try {
            field.check(List.of(object), wanted);
            String warning = field.warning(object, wanted);
            if (warning == null) {
                hideReason();
            } else {
                showReason(warning);
            }
        } catch (IllegalArgumentException refused) {
            showReason(refused.getMessage());
        }
    }

    private void showReason(String text) {
        hideReason();
        if (isOpen()) {
            reason = new DefaultToolTip(control, ToolTip.NO_RECREATE, true);
            reason.setText(text);
            reason.show(new Point(0, control.getSize().y));
        }
    }

    private void hideReason() {
        if (reason != null) {
            reason.hide();
            reason = null;
        }
    }
}
