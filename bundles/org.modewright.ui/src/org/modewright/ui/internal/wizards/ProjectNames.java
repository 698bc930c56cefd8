package org.modewright.ui.internal.wizards;

import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IWorkspace;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.osgi.util.NLS;
import org.modewright.ui.internal.Messages;

/** Checks names of projects. */
final class ProjectNames {

    private ProjectNames() {
    }

    /**
     * What is wrong with the name of a project, in one sentence; null if nothing.
     *
     * @param existing whether a project that is there already will do
     */
    static String problem(IWorkspace workspace, String name, boolean existing) {
        if (name.isEmpty()) {
            return Messages.ProjectNames_missing;
        }
        IStatus status = workspace.validateName(name, IResource.PROJECT);
        if (!status.isOK()) {
            return status.getMessage();
        }
        IProject project = workspace.getRoot().getProject(name);
        if (!existing && project.exists()) {
            return NLS.bind(Messages.ProjectNames_taken, name);
        }
        return null;
    }
}
