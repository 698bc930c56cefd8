package org.modewright.ui.internal.session;

import java.util.function.Supplier;
import org.eclipse.core.runtime.ICoreRunnable;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.swt.widgets.Display;
import org.modewright.model.Snapshots;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.internal.Messages;
import org.modewright.workspace.StoredRun;

/**
 * Knows whether a run still belongs to the model. An edit makes the run stale at once; a little later the hash of the model, computed
 * in the background, says whether the edit has really changed something, so that an undo makes the run fresh again.
 */
final class Freshness {

    private static final int PAUSE = 250;

    private final Display display;
    private final Runnable changed;
    private final Runnable due = this::hash;
    private Supplier<StructuralModel> followed;
    private String hash;
    private boolean edited;
    private int asked;

    Freshness(Display display, Runnable changed) {
        this.display = display;
        this.changed = changed;
    }

    boolean isStale(StoredRun run) {
        return edited || hash != null && !run.isOf(hash);
    }

    /** Nothing is known of the model any more. */
    void forget() {
        hash = null;
        edited = false;
        followed = null;
        asked++;
    }

    /** The model's hash is known from its file. */
    void known(String value) {
        hash = value;
        edited = false;
    }

    /** The live model has just been edited. */
    void edited() {
        edited = true;
    }

    /** Has the hash of a live model computed after a pause in the editing. */
    void follow(Supplier<StructuralModel> model) {
        followed = model;
        asked++;
        display.timerExec(PAUSE, due);
    }

    void dispose() {
        forget();
        if (!display.isDisposed()) {
            display.timerExec(-1, due);
        }
    }

    private void hash() {
        StructuralModel model = followed == null ? null : followed.get();
        if (model == null) {
            return;
        }
        int request = asked;
        StructuralModel copy = Snapshots.copy(model);
        Job job = Job.createSystem(Messages.Freshness_job, (ICoreRunnable) monitor -> compute(copy, request));
        job.setPriority(Job.DECORATE);
        job.schedule();
    }

    private void compute(StructuralModel copy, int request) {
        try {
            String value = Snapshots.sha256(copy);
            if (!display.isDisposed()) {
                display.asyncExec(() -> arrived(value, request));
            }
        } catch (Exception failure) {
            ILog.of(Freshness.class).error("The model could not be compared with its run.", failure);
        }
    }

    private void arrived(String value, int request) {
        if (request == asked) {
            hash = value;
            edited = false;
            changed.run();
        }
    }
}
