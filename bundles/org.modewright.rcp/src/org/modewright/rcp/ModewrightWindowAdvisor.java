package org.modewright.rcp;

import org.eclipse.core.commands.common.CommandException;
import org.eclipse.core.runtime.ILog;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.application.ActionBarAdvisor;
import org.eclipse.ui.application.IActionBarConfigurer;
import org.eclipse.ui.application.IWorkbenchWindowConfigurer;
import org.eclipse.ui.application.WorkbenchWindowAdvisor;
import org.eclipse.ui.handlers.IHandlerService;
import org.modewright.ui.UiIds;

/** Size, bars and first page of a window. */
final class ModewrightWindowAdvisor extends WorkbenchWindowAdvisor {

    private static final Point SIZE = new Point(1600, 1000);

    ModewrightWindowAdvisor(IWorkbenchWindowConfigurer configurer) {
        super(configurer);
    }

    @Override
    public ActionBarAdvisor createActionBarAdvisor(IActionBarConfigurer configurer) {
        return new ModewrightActionBarAdvisor(configurer);
    }

    @Override
    public void preWindowOpen() {
        IWorkbenchWindowConfigurer configurer = getWindowConfigurer();
        Rectangle screen = PlatformUI.getWorkbench().getDisplay().getPrimaryMonitor().getClientArea();
        configurer.setInitialSize(new Point(Math.min(SIZE.x, screen.width), Math.min(SIZE.y, screen.height)));
        configurer.setTitle(Messages.Application_title);
        configurer.setShowCoolBar(true);
        configurer.setShowStatusLine(true);
        configurer.setShowProgressIndicator(true);
        configurer.setShowPerspectiveBar(false);
    }

    @Override
    public void postWindowOpen() {
        IWorkbenchWindow window = getWindowConfigurer().getWindow();
        new WindowTitle(getWindowConfigurer()).follow();
        IWorkbenchPage page = window.getActivePage();
        if (page == null) {
            return;
        }
        if (page.getEditorReferences().length > 0) {
            activateEditor(page);
            return;
        }
        try {
            window.getService(IHandlerService.class).executeCommand(UiIds.START_PAGE_COMMAND, null);
        } catch (CommandException failure) {
            ILog.of(ModewrightWindowAdvisor.class).error("The start page could not be opened.", failure);
        }
    }

    /** An editor that is restored but not active leaves the outline empty. */
    private static void activateEditor(IWorkbenchPage page) {
        page.getWorkbenchWindow().getShell().getDisplay().asyncExec(() -> {
            if (page.getActiveEditor() != null) {
                page.activate(page.getActiveEditor());
            }
        });
    }
}
