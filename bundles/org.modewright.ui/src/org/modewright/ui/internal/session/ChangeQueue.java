package org.modewright.ui.internal.session;

import java.util.EnumSet;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import org.eclipse.core.runtime.ILog;
import org.eclipse.swt.widgets.Display;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.AuditSession.Listener;

/** Gathers changes and tells the listeners once a turn of the event loop. For the user interface's thread. */
final class ChangeQueue {

    private final Display display;
    private final List<Listener> listeners = new CopyOnWriteArrayList<>();
    private final EnumSet<Change> pending = EnumSet.noneOf(Change.class);

    ChangeQueue(Display display) {
        this.display = display;
    }

    void add(Listener listener) {
        if (!listeners.contains(listener)) {
            listeners.add(listener);
        }
    }

    void remove(Listener listener) {
        listeners.remove(listener);
    }

    void clear() {
        listeners.clear();
        pending.clear();
    }

    void fire(Change change) {
        if (pending.isEmpty()) {
            display.asyncExec(this::deliver);
        }
        pending.add(change);
    }

    private void deliver() {
        EnumSet<Change> due = EnumSet.copyOf(pending.isEmpty() ? EnumSet.noneOf(Change.class) : pending);
        pending.clear();
        for (Change change : due) {
            for (Listener listener : listeners) {
                tell(listener, change);
            }
        }
    }

    private static void tell(Listener listener, Change change) {
        try {
            listener.sessionChanged(change);
        } catch (RuntimeException failure) {
            ILog.of(ChangeQueue.class).error("A part failed to follow the audit session.", failure);
        }
    }
}
