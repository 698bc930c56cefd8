package org.modewright.ui.internal.commands;

import org.eclipse.ui.IWorkbenchWindow;
import org.modewright.ui.AuditSession;
import org.modewright.ui.internal.wizards.ExportPackageWizard;
import org.modewright.ui.internal.wizards.Wizards;

/** Exports the current model as a table package. */
public final class ExportHandler extends SessionHandler {

    @Override
    void execute(IWorkbenchWindow window, AuditSession session) {
        Wizards.open(window, new ExportPackageWizard(session.model(), session.modelFile()));
    }
}
