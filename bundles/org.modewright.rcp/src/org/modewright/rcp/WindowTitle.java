package org.modewright.rcp;

import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IPartListener2;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchPartReference;
import org.eclipse.ui.application.IWorkbenchWindowConfigurer;
import org.modewright.ui.StructureEditorPart;

/** Names the model of the active editor in the title of the window, so that windows can be told apart. */
final class WindowTitle implements IPartListener2 {

    private final IWorkbenchWindowConfigurer configurer;

    WindowTitle(IWorkbenchWindowConfigurer configurer) {
        this.configurer = configurer;
    }

    /** Sets the title now and follows the editors from now on. */
    void follow() {
        configurer.getWindow().getPartService().addPartListener(this);
        update();
    }

    @Override
    public void partActivated(IWorkbenchPartReference reference) {
        update();
    }

    @Override
    public void partBroughtToTop(IWorkbenchPartReference reference) {
        update();
    }

    @Override
    public void partClosed(IWorkbenchPartReference reference) {
        update();
    }

    private void update() {
        IWorkbenchPage page = configurer.getWindow().getActivePage();
        IEditorPart editor = page == null ? null : page.getActiveEditor();
        String title = editor instanceof StructureEditorPart ? editor.getEditorInput().getToolTipText() + " – " : "";
        configurer.setTitle(title + Messages.Application_title);
    }
}
