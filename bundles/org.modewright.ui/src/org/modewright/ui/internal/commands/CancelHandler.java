package org.modewright.ui.internal.commands;

import org.eclipse.ui.IWorkbenchWindow;
import org.modewright.ui.AuditSession;

/** Stops the run of the current model. */
public final class CancelHandler extends SessionHandler {

    @Override
    void execute(IWorkbenchWindow window, AuditSession session) {
        session.cancelRun();
    }
}
