package org.modewright.testsupport;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Widget;
import org.modewright.ui.UiIds;

/** Finds widgets by the name they carry for tests, and does to them what a user does. For the user interface's thread. */
final class Widgets {

    private Widgets() {
    }

    /** The control of a name below another; null if there is none that is not disposed. */
    static <T extends Control> T find(Control scope, Class<T> type, String id) {
        return find(scope, type, control -> id.equals(control.getData(UiIds.WIDGET_ID)));
    }

    /** The first control below another, or that itself, of a type and with a property; null if there is none. */
    static <T extends Control> T find(Control scope, Class<T> type, Predicate<T> property) {
        List<T> all = findAll(scope, type, property);
        return all.isEmpty() ? null : all.get(0);
    }

    static <T extends Control> List<T> findAll(Control scope, Class<T> type, Predicate<T> property) {
        List<T> found = new ArrayList<>();
        collect(scope, type, property, found);
        return found;
    }

    private static <T extends Control> void collect(Control scope, Class<T> type, Predicate<T> property, List<T> found) {
        if (scope == null || scope.isDisposed()) {
            return;
        }
        if (type.isInstance(scope) && property.test(type.cast(scope))) {
            found.add(type.cast(scope));
        }
        if (scope instanceof Composite composite) {
            for (Control child : composite.getChildren()) {
                collect(child, type, property, found);
            }
        }
    }

    /** Tells a widget's listeners that it was used. */
    static void notifySelection(Widget widget, Widget item, int type) {
        Event event = new Event();
        event.item = item;
        event.widget = widget;
        event.type = type;
        event.display = widget.getDisplay();
        widget.notifyListeners(type, event);
    }

    static void click(Widget widget) {
        notifySelection(widget, null, SWT.Selection);
    }
}
