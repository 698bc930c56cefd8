package org.modewright.ui.internal.session;

import java.util.HashMap;
import java.util.Map;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.IWindowListener;
import org.eclipse.ui.services.AbstractServiceFactory;
import org.eclipse.ui.services.IServiceLocator;
import org.modewright.ui.AuditSession;

/** Makes one audit session a workbench window and ends it with the window. */
public final class SessionServiceFactory extends AbstractServiceFactory {

    private final Map<IWorkbenchWindow, WindowAuditSession> sessions = new HashMap<>();

    @Override
    public Object create(@SuppressWarnings("rawtypes") Class serviceInterface, IServiceLocator parent, IServiceLocator locator) {
        IWorkbenchWindow window = locator.getService(IWorkbenchWindow.class);
        return window == null || serviceInterface != AuditSession.class ? null : session(window);
    }

    private WindowAuditSession session(IWorkbenchWindow window) {
        if (sessions.isEmpty()) {
            PlatformUI.getWorkbench().addWindowListener(new Windows());
        }
        return sessions.computeIfAbsent(window, WindowAuditSession::new);
    }

    private final class Windows implements IWindowListener {

        @Override
        public void windowClosed(IWorkbenchWindow window) {
            WindowAuditSession session = sessions.remove(window);
            if (session != null) {
                session.dispose();
            }
            if (sessions.isEmpty()) {
                PlatformUI.getWorkbench().removeWindowListener(this);
            }
        }

        @Override
        public void windowActivated(IWorkbenchWindow window) {
            WindowAuditSession session = sessions.get(window);
            if (session != null) {
                session.updateCommands();
            }
        }

        @Override
        public void windowDeactivated(IWorkbenchWindow window) {
            // Only activating and closing matter.
        }

        @Override
        public void windowOpened(IWorkbenchWindow window) {
            // Only activating and closing matter.
        }
    }
}
