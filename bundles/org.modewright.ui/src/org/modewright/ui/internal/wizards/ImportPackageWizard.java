package org.modewright.ui.internal.wizards;

import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.Wizard;
import org.eclipse.ui.IImportWizard;
import org.eclipse.ui.IWorkbench;
import org.modewright.ui.internal.Messages;

/** Imports a table package as a model of a project, after showing what is in it or everything that is wrong with it. */
public final class ImportPackageWizard extends Wizard implements IImportWizard {

    private final ImportPackagePage page = new ImportPackagePage();

    public ImportPackageWizard() {
        setWindowTitle(Messages.Import_title);
        setNeedsProgressMonitor(true);
    }

    @Override
    public void init(IWorkbench workbench, IStructuredSelection selection) {
        page.propose(selection);
    }

    @Override
    public void addPages() {
        addPage(page);
    }

    @Override
    public boolean performFinish() {
        return new ModelCreation(page.projectName(), page.modelName(), page.model()).perform(getContainer(), getShell());
    }
}
