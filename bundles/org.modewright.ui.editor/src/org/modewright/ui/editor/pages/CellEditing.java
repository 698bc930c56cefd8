package org.modewright.ui.editor.pages;

import java.util.List;
import java.util.function.IntConsumer;
import org.eclipse.jface.window.DefaultToolTip;
import org.eclipse.jface.window.ToolTip;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.TableEditor;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.swt.widgets.Text;
import org.modewright.model.structure.Identified;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
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

    CellEditing(Table table, EditorContext context) {
        this.table = table;
        this.context = context;
        place = new TableEditor(table);
        place.grabHorizontal = true;
        place.minimumWidth = 60;
    }

    /** Opens a cell; a flag changes at once. */
    void open(TableItem item, int column, Field field, Identified object, IntConsumer next, int columns) {
        close();
        switch (field.style()) {
            case FLAG -> context.execute(field.set(List.of(object), Boolean.toString(!Boolean.parseBoolean(field.text(object)))));
            case CHOICE -> place(item, column, combo(field, object));
            case TEXT -> place(item, column, text(column, field, object, next, columns));
        }
    }

    void close() {
        hideReason();
        if (control != null && !control.isDisposed()) {
            Control closing = control;
            control = null;
            closing.dispose();
            if (!table.isDisposed()) {
                table.setFocus();
            }
        }
    }

    private void place(TableItem item, int column, Control editor) {
        control = editor;
        control.setData(UiIds.WIDGET_ID, "tables.cell");
        place.setEditor(control, item, column);
        control.setFocus();
    }

    private Combo combo(Field field, Identified object) {
        Combo combo = new Combo(table, SWT.READ_ONLY);
        combo.setItems(field.choices().toArray(new String[0]));
        combo.setText(field.text(object));
        combo.addListener(SWT.Selection, event -> {
            if (commit(field, object, combo.getText())) {
                close();
            }
        });
        combo.addListener(SWT.FocusOut, event -> close());
        combo.addListener(SWT.Traverse, event -> {
            if (event.detail == SWT.TRAVERSE_ESCAPE) {
                event.doit = false;
                close();
            }
        });
        return combo;
    }

    private Text text(int column, Field field, Identified object, IntConsumer next, int columns) {
        Text text = new Text(table, field.isNumber() ? SWT.RIGHT : SWT.LEFT);
        text.setText(field.text(object));
        text.selectAll();
        text.addListener(SWT.Modify, event -> hideReason());
        text.addListener(SWT.FocusOut, event -> leave(field, object, text));
        text.addListener(SWT.Traverse, event -> traverse(event, column, field, object, text, next, columns));
        return text;
    }

    /** Leaving the cell sets a good text and gives up a bad one. */
    private void leave(Field field, Identified object, Text text) {
        if (control == text) {
            commit(field, object, text.getText());
            close();
        }
    }

    private void traverse(Event event, int column, Field field, Identified object, Text text, IntConsumer next, int columns) {
        if (event.detail == SWT.TRAVERSE_ESCAPE) {
            event.doit = false;
            text.setText(field.text(object));
            close();
            return;
        }
        boolean forward = event.detail == SWT.TRAVERSE_TAB_NEXT;
        boolean back = event.detail == SWT.TRAVERSE_TAB_PREVIOUS;
        if (!forward && !back && event.detail != SWT.TRAVERSE_RETURN) {
            return;
        }
        event.doit = false;
        if (!commit(field, object, text.getText())) {
            return;
        }
        close();
        int target = forward ? column + 1 : column - 1;
        if ((forward || back) && target >= 0 && target < columns) {
            next.accept(target);
        }
    }

    private boolean commit(Field field, Identified object, String value) {
        if (value.equals(field.text(object))) {
            return true;
        }
        try {
            context.execute(field.set(List.of(object), value));
            return true;
        } catch (IllegalArgumentException refused) {
            showReason(refused.getMessage());
            return false;
        }
    }

    private void showReason(String text) {
        hideReason();
        if (control == null || control.isDisposed()) {
            return;
        }
        reason = new DefaultToolTip(control, ToolTip.NO_RECREATE, true);
        reason.setText(text);
        reason.show(new Point(0, control.getSize().y));
    }

    private void hideReason() {
        if (reason != null) {
            reason.hide();
            reason = null;
        }
    }
}
