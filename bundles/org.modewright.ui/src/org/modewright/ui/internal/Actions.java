package org.modewright.ui.internal;

import org.eclipse.core.commands.common.CommandException;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.handlers.IHandlerService;
import org.eclipse.core.runtime.ILog;
import org.modewright.ui.UiIds;

/** Commands of this product, for links and buttons that do what a menu item does. */
public final class Actions {

    private Actions() {
    }

    /** Opens the sample project. */
    public static void openSample() {
        execute(UiIds.OPEN_SAMPLE_COMMAND);
    }

    /** Executes a command in the active window. */
    public static void execute(String command) {
        try {
            PlatformUI.getWorkbench().getService(IHandlerService.class).executeCommand(command, null);
        } catch (CommandException failure) {
            ILog.of(Actions.class).error("The command " + command + " could not be executed.", failure);
        }
    }
}
