package org.modewright.ui.editor;

import java.util.function.Consumer;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResourceChangeEvent;
import org.eclipse.core.resources.IResourceChangeListener;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.swt.widgets.Display;

/** Notices when the edited file changes, moves or goes, other than by the editor's own save. */
final class FileWatch implements IResourceChangeListener {

    private final Runnable whenChanged;
    private final Consumer<IFile> whenMoved;
    private Display display;
    private IFile file;
    private boolean saving;

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
        ResourcesPlugin.getWorkspace().addResourceChangeListener(this, IResourceChangeEvent.POST_CHANGE);
    }

    void stop() {
        ResourcesPlugin.getWorkspace().removeResourceChangeListener(this);
    }

    /** Says that the next change is the editor's own. */
    void saving() {
        saving = true;
    }

    @Override
    public void resourceChanged(IResourceChangeEvent event) {
        IResourceDelta delta = event.getDelta() == null ? null : event.getDelta().findMember(file.getFullPath());
        if (delta == null || display.isDisposed()) {
            return;
        }
        if (delta.getKind() == IResourceDelta.REMOVED) {
            removed(delta);
        } else if ((delta.getFlags() & (IResourceDelta.CONTENT | IResourceDelta.REPLACED)) != 0) {
            changed();
        }
    }

    private void removed(IResourceDelta delta) {
        boolean moved = (delta.getFlags() & IResourceDelta.MOVED_TO) != 0;
        IFile target = moved ? ResourcesPlugin.getWorkspace().getRoot().getFile(delta.getMovedToPath()) : null;
        display.asyncExec(() -> whenMoved.accept(target));
    }

    private void changed() {
        if (saving) {
            saving = false;
            return;
        }
        display.asyncExec(whenChanged);
    }
}
