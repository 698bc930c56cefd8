package org.modewright.workspace.internal;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IResourceChangeEvent;
import org.eclipse.core.resources.IResourceChangeListener;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.WorkspaceJob;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.modewright.workspace.AuditJob;
import org.modewright.workspace.ModelFiles;
import org.modewright.workspace.RunRegistry;
import org.modewright.workspace.RunStore;

/** Moves the kept run of a model along when the model is moved or renamed, and deletes it with the model. */
final class KeptRunFollower implements IResourceChangeListener {

    private final RunStore store;
    private final RunRegistry registry;

    KeptRunFollower(RunStore store, RunRegistry registry) {
        this.store = store;
        this.registry = registry;
    }

    @Override
    public void resourceChanged(IResourceChangeEvent event) {
        try {
            event.getDelta().accept(this::visit);
        } catch (CoreException failure) {
            ILog.of(KeptRunFollower.class).error("Kept results could not follow their models.", failure);
        }
    }

    private boolean visit(IResourceDelta delta) {
        if (delta.getKind() == IResourceDelta.REMOVED && ModelFiles.isModel(delta.getResource())) {
            removed((IFile) delta.getResource(), delta);
        }
        return true;
    }

    private void removed(IFile model, IResourceDelta delta) {
        registry.forget(model);
        IFile kept = store.fileOf(model);
        if (!kept.exists()) {
            return;
        }
        boolean moved = (delta.getFlags() & IResourceDelta.MOVED_TO) != 0;
        IFile target = moved ? store.fileOf(model.getWorkspace().getRoot().getFile(delta.getMovedToPath())) : null;
        WorkspaceJob follow = new WorkspaceJob("Keeping results beside their models") {
            @Override
            public IStatus runInWorkspace(IProgressMonitor monitor) throws CoreException {
                follow(kept, target, monitor);
                return Status.OK_STATUS;
            }

            @Override
            public boolean belongsTo(Object family) {
                return family == AuditJob.FAMILY;
            }
        };
        follow.setSystem(true);
        follow.setRule(model.getWorkspace().getRoot());
        follow.schedule();
    }

    private static void follow(IFile kept, IFile target, IProgressMonitor monitor) throws CoreException {
        if (!kept.exists()) {
            return;
        }
        if (target == null || target.exists() || !target.getParent().isAccessible()) {
            kept.delete(true, monitor);
        } else {
            kept.move(target.getFullPath(), IResource.FORCE | IResource.DERIVED, monitor);
        }
    }
}
