package org.modewright.ui.internal.wizards;

import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.WizardDialog;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.IWorkbenchWizard;

/** Opens wizards from commands and links. */
public final class Wizards {

    private static final int WIDTH = 660;
    private static final int HEIGHT = 380;

    private Wizards() {
    }

    /** Opens a wizard on the window's selection and returns when it is closed. */
    public static void open(IWorkbenchWindow window, IWorkbenchWizard wizard) {
        boolean structured = window.getSelectionService().getSelection() instanceof IStructuredSelection;
        IStructuredSelection selection = structured ? (IStructuredSelection) window.getSelectionService().getSelection()
                : StructuredSelection.EMPTY;
        wizard.init(window.getWorkbench(), selection);
        WizardDialog dialog = new WizardDialog(window.getShell(), wizard);
        dialog.setPageSize(WIDTH, HEIGHT);
        dialog.open();
    }
}
