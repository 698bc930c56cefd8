package org.modewright.ui.internal.session;

import java.util.Map;
import org.eclipse.ui.AbstractSourceProvider;
import org.eclipse.ui.ISources;
import org.modewright.ui.AuditSession;

/** What commands need to know of the audit session of the active window, as variables of enablement expressions. */
public final class SessionSource extends AbstractSourceProvider {

    private static final String CAN_RUN = "org.modewright.ui.canRun";
    private static final String RUNNING = "org.modewright.ui.running";
    private static final String HAS_MODEL = "org.modewright.ui.hasModel";

    private Map<String, Boolean> state = Map.of(CAN_RUN, false, RUNNING, false, HAS_MODEL, false);

    @Override
    public String[] getProvidedSourceNames() {
        return new String[] {CAN_RUN, RUNNING, HAS_MODEL};
    }

    @Override
    public Map<String, Boolean> getCurrentState() {
        return state;
    }

    /** Takes over the state of the active window's session. */
    void update(AuditSession session) {
        boolean model = session.model() != null;
        Map<String, Boolean> next = Map.of(CAN_RUN, model && !session.isRunning(), RUNNING, session.isRunning(), HAS_MODEL, model);
        if (!next.equals(state)) {
            state = next;
            fireSourceChanged(ISources.WORKBENCH, next);
        }
    }

    @Override
    public void dispose() {
        state = Map.of();
    }
}
