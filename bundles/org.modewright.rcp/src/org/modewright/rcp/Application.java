package org.modewright.rcp;

import java.io.IOException;
import java.net.URL;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.Platform;
import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.osgi.service.datalocation.Location;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IWorkbench;
import org.eclipse.ui.PlatformUI;

/** Takes the workspace and starts the workbench on it. */
public final class Application implements IApplication {

    @Override
    public Object start(IApplicationContext context) {
        Display display = PlatformUI.createDisplay();
        try {
            if (!takeWorkspace(context)) {
                return EXIT_OK;
            }
            Splash splash = Splash.show(display);
            context.applicationRunning();
            int code = PlatformUI.createAndRunWorkbench(display, new ModewrightWorkbenchAdvisor(splash::close));
            return code == PlatformUI.RETURN_RESTART ? EXIT_RESTART : EXIT_OK;
        } finally {
            Platform.getInstanceLocation().release();
            display.dispose();
        }
    }

    @Override
    public void stop() {
        if (!PlatformUI.isWorkbenchRunning()) {
            return;
        }
        IWorkbench workbench = PlatformUI.getWorkbench();
        Display display = workbench.getDisplay();
        display.syncExec(() -> {
            if (!display.isDisposed()) {
                workbench.close();
            }
        });
    }

    private static boolean takeWorkspace(IApplicationContext context) {
        Location location = Platform.getInstanceLocation();
        try {
            URL place = location.isSet() ? location.getURL() : location.getDefault();
            boolean taken = location.isSet() ? location.lock() : location.set(place, true);
            if (!taken) {
                context.applicationRunning();
                MessageDialog.openError(null, Messages.Application_title, NLS.bind(Messages.Application_inUse, place.getPath()));
            }
            return taken;
        } catch (IOException failure) {
            context.applicationRunning();
            ILog.of(Application.class).error("The workspace cannot be used.", failure);
            MessageDialog.openError(null, Messages.Application_title, NLS.bind(Messages.Application_unusable, failure.getMessage()));
            return false;
        }
    }
}
