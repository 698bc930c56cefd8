package org.modewright.ui.internal.commands;

import org.eclipse.ui.IWorkbenchWindow;
import org.modewright.ui.AuditSession;

/** Runs the audit of the current model. */
public final class RunHandler extends SessionHandler {

    @Override
    void execute(IWorkbenchWindow window, AuditSession session) {
        session.run();
    }
}
