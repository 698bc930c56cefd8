package org.modewright.ui.internal;

import java.io.IOException;
import java.io.InputStream;
import java.lang.reflect.InvocationTargetException;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.SubMonitor;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.actions.WorkspaceModifyOperation;
import org.eclipse.ui.ide.IDE;
import org.eclipse.ui.wizards.newresource.BasicNewResourceWizard;
import org.modewright.samples.Sample;
import org.modewright.samples.Samples;
import org.modewright.workspace.ModelProjects;

/** The project of the samples: the demonstration model and the teaching cases. */
public final class SampleProject {

    private final IWorkbenchWindow window;
    private IFile demonstration;

    public SampleProject(IWorkbenchWindow window) {
        this.window = window;
    }

    /** Makes the project if it is not there, adds samples that are missing, and opens the demonstration model. */
    public void open() {
        try {
            window.run(false, false, new WorkspaceModifyOperation() {
                @Override
                protected void execute(IProgressMonitor monitor) throws CoreException, InvocationTargetException {
                    fill(monitor);
                }
            });
            if (demonstration != null) {
                BasicNewResourceWizard.selectAndReveal(demonstration, window);
                IDE.openEditor(window.getActivePage(), demonstration, true);
            }
        } catch (InvocationTargetException failure) {
            MessageDialog.openError(window.getShell(), Messages.SampleProject_failed, failure.getCause().getMessage());
        } catch (PartInitException failure) {
            MessageDialog.openError(window.getShell(), Messages.Session_notOpened, failure.getMessage());
        } catch (InterruptedException cancelled) {
            Thread.currentThread().interrupt();
        }
    }

    private void fill(IProgressMonitor monitor) throws CoreException, InvocationTargetException {
        SubMonitor progress = SubMonitor.convert(monitor, Messages.SampleProject_name, Samples.all().size() + 1);
        ModelProjects projects = new ModelProjects(ResourcesPlugin.getWorkspace());
        IProject project = projects.open(Messages.SampleProject_name, progress.split(1));
        for (Sample sample : Samples.all()) {
            IFile file = project.getFile(sample.fileName());
            try (InputStream bytes = sample.open()) {
                projects.add(bytes, file, progress.split(1));
            } catch (IOException failure) {
                throw new InvocationTargetException(failure);
            }
            demonstration = demonstration == null ? file : demonstration;
        }
    }
}
