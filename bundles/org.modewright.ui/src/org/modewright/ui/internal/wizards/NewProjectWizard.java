package org.modewright.ui.internal.wizards;

import java.io.IOException;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.Wizard;
import org.eclipse.ui.INewWizard;
import org.eclipse.ui.IWorkbench;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.internal.Messages;

/** Makes a project with a first model: empty, or a copy of a sample. */
public final class NewProjectWizard extends Wizard implements INewWizard {

    private final NewProjectPage page = new NewProjectPage();

    public NewProjectWizard() {
        setWindowTitle(Messages.NewProject_title);
        setNeedsProgressMonitor(true);
    }

    @Override
    public void init(IWorkbench workbench, IStructuredSelection selection) {
        // A new project depends on no selection.
    }

    @Override
    public void addPages() {
        addPage(page);
    }

    @Override
    public boolean performFinish() {
        try {
            StructuralModel model = page.model();
            return new ModelCreation(page.projectName(), page.modelName(), model).perform(getContainer(), getShell());
        } catch (IOException failure) {
            MessageDialog.openError(getShell(), Messages.ModelCreation_failed, failure.getMessage());
            return false;
        }
    }
}
