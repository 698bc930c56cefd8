package org.modewright.ui.internal.wizards;

import java.lang.reflect.InvocationTargetException;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.SubMonitor;
import org.eclipse.jface.dialogs.ErrorDialog;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.operation.IRunnableContext;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.actions.WorkspaceModifyOperation;
import org.eclipse.ui.ide.IDE;
import org.eclipse.ui.wizards.newresource.BasicNewResourceWizard;
import org.modewright.model.ModelFileException;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.internal.Messages;
import org.modewright.workspace.ModelProjects;

/** Puts a new model into a project and opens it: the last step of the wizards. */
final class ModelCreation {

    private final String project;
    private final String file;
    private final StructuralModel model;
    private IFile created;

    /**
     * @param project name of the project, which is made if it is not there
     * @param file wanted name of the file without extension
     * @param model what goes into it
     */
    ModelCreation(String project, String file, StructuralModel model) {
        this.project = project;
        this.file = file;
        this.model = model;
    }

    /** Does it; whether it succeeded. What went wrong is told to the user. */
    boolean perform(IRunnableContext context, Shell shell) {
        try {
            context.run(true, false, new WorkspaceModifyOperation() {
                @Override
                protected void execute(IProgressMonitor monitor) throws CoreException, InvocationTargetException {
                    create(monitor);
                }
            });
            reveal();
            return true;
        } catch (InvocationTargetException failure) {
            tell(shell, failure.getCause());
            return false;
        } catch (InterruptedException cancelled) {
            return false;
        }
    }

    private void create(IProgressMonitor monitor) throws CoreException, InvocationTargetException {
        SubMonitor progress = SubMonitor.convert(monitor, Messages.ModelCreation_task, 2);
        ModelProjects projects = new ModelProjects(ResourcesPlugin.getWorkspace());
        IProject container = projects.open(project, progress.split(1));
        IFile target = projects.freeFile(container, file);
        try {
            projects.add(model, target);
        } catch (ModelFileException failure) {
            throw new InvocationTargetException(failure);
        }
        created = target;
    }

    private void reveal() {
        IWorkbenchWindow window = PlatformUI.getWorkbench().getActiveWorkbenchWindow();
        IWorkbenchPage page = window == null ? null : window.getActivePage();
        if (page == null || created == null) {
            return;
        }
        BasicNewResourceWizard.selectAndReveal(created, window);
        try {
            IDE.openEditor(page, created, true);
        } catch (PartInitException failure) {
            ErrorDialog.openError(window.getShell(), Messages.Session_notOpened, null, failure.getStatus());
        }
    }

    private static void tell(Shell shell, Throwable cause) {
        MessageDialog.openError(shell, Messages.ModelCreation_failed, cause.getMessage());
    }
}
