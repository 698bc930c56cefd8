package org.modewright.ui.internal.commands;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.core.commands.ExecutionException;
import org.eclipse.ui.handlers.HandlerUtil;
import org.modewright.ui.internal.wizards.ImportPackageWizard;
import org.modewright.ui.internal.wizards.Wizards;

/** Opens the wizard that imports a table package. */
public final class ImportHandler extends AbstractHandler {

    @Override
    public Object execute(ExecutionEvent event) throws ExecutionException {
        Wizards.open(HandlerUtil.getActiveWorkbenchWindowChecked(event), new ImportPackageWizard());
        return null;
    }
}
