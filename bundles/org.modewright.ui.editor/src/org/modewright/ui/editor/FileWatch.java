package org.modewright.ui.editor;

import java.util.function.Consumer;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IResourceChangeEvent;
import org.eclipse.core.resources.IResourceChangeListener;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.swt.widgets.Display;

/** Notices when the edited file changes, moves or goes, other than by the editor's own save. */
final class FileWatch implements IResourceChangeListener {

    private static final int CONTENT = IResourceDelta.CONTENT | IResourceDelta.REPLACED;

    private final Runnable whenChanged;
    private final Consumer<IFile> whenMoved;
    private Display display;
    private IFile file;
    private long known;

    /**
     * @param whenChanged the content has changed
     * @param whenMoved where the file is now; null when it is gone
     */
    FileWatch(Runnable whenChanged, Consumer<IFile> whenMoved) {
        this.whenChanged = whenChanged;
        this.whenMoved = whenMoved;
    }

    void start(IFile watched) {
        display = Display.getCurrent();
        file = watched;
        contentKnown();
        ResourcesPlugin.getWorkspace().addResourceChangeListener(this, IResourceChangeEvent.POST_CHANGE);
    }

    void stop() {
        ResourcesPlugin.getWorkspace().removeResourceChangeListener(this);
    }

    /** Says that the editor has just read or written what the file holds now. */
    void contentKnown() {
        known = file.getModificationStamp();
    }

    /** Whether the file on disk is not the one that the editor has read or written. */
    boolean isOutOfStep() {
        return file.exists() && (!file.isSynchronized(IResource.DEPTH_ZERO) || file.getModificationStamp() != known);
    }

    /** Looks in the background whether another program has changed the file; the workspace tells if so. */
    void look() {
        if (file == null || file.isSynchronized(IResource.DEPTH_ZERO)) {
            return;
        }
        IFile looked = file;
        Job job = new Job("Look for changes of " + looked.getName()) {
            @Override
            protected IStatus run(IProgressMonitor monitor) {
                try {
                    looked.refreshLocal(IResource.DEPTH_ZERO, monitor);
                    return Status.OK_STATUS;
                } catch (CoreException failure) {
                    return failure.getStatus();
                }
            }
        };
        job.setSystem(true);
        job.setRule(looked.getWorkspace().getRuleFactory().refreshRule(looked));
        job.schedule();
    }

    @Override
    public void resourceChanged(IResourceChangeEvent event) {
        IResourceDelta delta = event.getDelta() == null ? null : event.getDelta().findMember(file.getFullPath());
        if (delta == null || display.isDisposed()) {
            return;
        }
        if (delta.getKind() == IResourceDelta.REMOVED) {
            removed(delta);
        } else if (delta.getKind() == IResourceDelta.ADDED || (delta.getFlags() & CONTENT) != 0) {
            display.asyncExec(this::changed);
        }
    }

    private void removed(IResourceDelta delta) {
        boolean moved = (delta.getFlags() & IResourceDelta.MOVED_TO) != 0;
        IFile target = moved ? ResourcesPlugin.getWorkspace().getRoot().getFile(delta.getMovedToPath()) : null;
        display.asyncExec(() -> whenMoved.accept(target));
    }

    private void changed() {
        if (file.exists() && file.getModificationStamp() != known) {
            contentKnown();
            whenChanged.run();
        }
    }
}
