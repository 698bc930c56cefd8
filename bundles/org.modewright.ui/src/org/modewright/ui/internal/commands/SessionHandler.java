package org.modewright.ui.internal.commands;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.core.commands.ExecutionException;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.handlers.HandlerUtil;
import org.modewright.ui.AuditSession;

/** A command on the audit session of the active window; when it is enabled is declared beside it. */
abstract class SessionHandler extends AbstractHandler {

    @Override
    public final Object execute(ExecutionEvent event) throws ExecutionException {
        IWorkbenchWindow window = HandlerUtil.getActiveWorkbenchWindowChecked(event);
        execute(window, window.getService(AuditSession.class));
        return null;
    }

    abstract void execute(IWorkbenchWindow window, AuditSession session);
}
