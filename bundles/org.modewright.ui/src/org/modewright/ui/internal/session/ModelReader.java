package org.modewright.ui.internal.session;

import java.util.function.Consumer;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResourceChangeEvent;
import org.eclipse.core.resources.IResourceChangeListener;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.widgets.Display;
import org.modewright.model.ModelFileException;
import org.modewright.model.Snapshots;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.internal.Messages;
import org.modewright.workspace.ModelFiles;
import org.modewright.workspace.RunRegistry;
import org.modewright.workspace.RunStoreException;
import org.modewright.workspace.StoredRun;

/** Reads a model file and its kept run in the background, and again when the file changes on disk. */
final class ModelReader implements IResourceChangeListener {

    /**
     * What was read.
     *
     * @param file the model's file
     * @param model the model; null if it was not asked for or cannot be read
     * @param hash the model's hash; null without a model
     * @param run the kept run; null if there is none
     * @param problem why something could not be read; null if all is well
     */
    record Content(IFile file, StructuralModel model, String hash, StoredRun run, String problem) {
    }

    private final Display display;
    private final RunRegistry registry;
    private final Consumer<Content> arrived;
    private final Runnable saved;
    private IFile file;
    private boolean withModel;
    private Job reading;

    /**
     * @param display where to report
     * @param registry where kept runs come from
     * @param arrived told of what was read
     * @param saved told when the file of a model that an editor holds has been written
     */
    ModelReader(Display display, RunRegistry registry, Consumer<Content> arrived, Runnable saved) {
        this.display = display;
        this.registry = registry;
        this.arrived = arrived;
        this.saved = saved;
    }

    /** Reads the kept run of a model, and the model too where no editor holds it. */
    void read(IFile wanted, boolean modelToo) {
        if (file == null) {
            wanted.getWorkspace().addResourceChangeListener(this, IResourceChangeEvent.POST_CHANGE);
        }
        file = wanted;
        withModel = modelToo;
        schedule();
    }

    void forget() {
        if (file != null) {
            file.getWorkspace().removeResourceChangeListener(this);
        }
        file = null;
        cancel();
    }

    void dispose() {
        forget();
    }

    @Override
    public void resourceChanged(IResourceChangeEvent event) {
        IFile watched = file;
        IResourceDelta delta = watched == null || event.getDelta() == null ? null : event.getDelta().findMember(watched.getFullPath());
        boolean content = delta != null && (delta.getFlags() & (IResourceDelta.CONTENT | IResourceDelta.REPLACED)) != 0;
        if (content && !display.isDisposed()) {
            display.asyncExec(() -> reread(watched));
        }
    }

    private void reread(IFile watched) {
        if (!watched.equals(file)) {
            return;
        }
        if (withModel) {
            schedule();
        } else {
            saved.run();
        }
    }

    private void schedule() {
        cancel();
        IFile wanted = file;
        boolean modelToo = withModel;
        reading = new Job(NLS.bind(Messages.ModelReader_job, wanted.getName())) {
            @Override
            protected IStatus run(IProgressMonitor monitor) {
                Content content = content(wanted, modelToo);
                if (!monitor.isCanceled() && !display.isDisposed()) {
                    display.asyncExec(() -> deliver(content));
                }
                return Status.OK_STATUS;
            }

            @Override
            public boolean belongsTo(Object family) {
                return family == ModelReader.class;
            }
        };
        reading.setSystem(true);
        reading.setPriority(Job.SHORT);
        reading.schedule();
    }

    private void cancel() {
        if (reading != null) {
            reading.cancel();
        }
    }

    private void deliver(Content content) {
        if (content.file().equals(file)) {
            arrived.accept(content);
        }
    }

    private Content content(IFile wanted, boolean modelToo) {
        String problem = null;
        StructuralModel model = null;
        String hash = null;
        StoredRun run = null;
        try {
            run = registry.lastRun(wanted).orElse(null);
        } catch (RunStoreException damaged) {
            problem = damaged.getMessage();
        }
        if (modelToo) {
            try {
                model = ModelFiles.load(wanted);
                hash = Snapshots.sha256(model);
            } catch (ModelFileException broken) {
                problem = broken.getMessage();
            }
        }
        return new Content(wanted, model, hash, run, problem);
    }
}
