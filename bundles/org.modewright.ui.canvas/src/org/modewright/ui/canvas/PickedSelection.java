package org.modewright.ui.canvas;

import java.util.HashSet;
import java.util.Set;
import org.modewright.ui.AuditSelection;
import org.modewright.ui.AuditSession;

/** How a pick in space changes the session's selection. */
final class PickedSelection {

    private PickedSelection() {
    }

    /** Replaces the selected elements, or adds to them; a single element that is selected already is taken away when adding. */
    static void apply(AuditSession session, Set<String> ids, boolean add, Object source) {
        AuditSelection old = session.selection();
        if (!add) {
            session.select(old.withElements(ids), source);
            return;
        }
        Set<String> all = new HashSet<>(old.elementIds());
        boolean takenAway = ids.size() == 1 && all.removeAll(ids);
        if (!takenAway) {
            all.addAll(ids);
        }
        session.select(old.withElements(all), source);
    }
}
