package org.modewright.ui.editor.pages;

import java.util.function.Consumer;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.swt.widgets.Display;
import org.modewright.fem.Assembly;
import org.modewright.fem.MassLedger;
import org.modewright.fem.ModelDefectsException;
import org.modewright.fem.Snapshot;
import org.modewright.model.structure.StructuralModel;
import org.modewright.numerics.CancelledException;
import org.modewright.numerics.Progress;

/** Sums the seismic mass of the live model in the background, a moment after the last change. */
final class MassSum {

    private static final int DELAY_MILLISECONDS = 600;

    private final Display display;
    private final Consumer<MassLedger> whenSummed;
    private boolean scheduled;
    private boolean stopped;
    private SumJob job;

    /** @param whenSummed gets the masses on the user interface's thread; null where the model cannot be computed */
    MassSum(Display display, Consumer<MassLedger> whenSummed) {
        this.display = display;
        this.whenSummed = whenSummed;
    }

    void request(StructuralModel model) {
        if (!scheduled) {
            scheduled = true;
            display.timerExec(DELAY_MILLISECONDS, () -> start(model));
        }
    }

    private void start(StructuralModel model) {
        scheduled = false;
        if (stopped) {
            return;
        }
        cancel();
        try {
            job = new SumJob(Snapshot.of(model));
            job.schedule();
        } catch (ModelDefectsException defects) {
            whenSummed.accept(null);
        }
    }

    /** Sums no more. */
    void stop() {
        stopped = true;
        cancel();
    }

    private void cancel() {
        if (job != null) {
            job.cancel();
            job = null;
        }
    }

    private final class SumJob extends Job {

        private final Snapshot snapshot;

        SumJob(Snapshot snapshot) {
            super("Sum the seismic mass");
            this.snapshot = snapshot;
            setSystem(true);
        }

        @Override
        protected IStatus run(IProgressMonitor monitor) {
            try {
                publish(Assembly.of(snapshot, new Cancel(monitor)).ledger());
            } catch (CancelledException cancelled) {
                return Status.CANCEL_STATUS;
            } catch (RuntimeException unexpected) {
                ILog.get().error(unexpected.getMessage(), unexpected);
                publish(null);
            }
            return Status.OK_STATUS;
        }

        private void publish(MassLedger ledger) {
            if (!display.isDisposed()) {
                display.asyncExec(() -> {
                    if (job == this) {
                        whenSummed.accept(ledger);
                    }
                });
            }
        }
    }

    private record Cancel(IProgressMonitor monitor) implements Progress {

        @Override
        public void report(String stage, double fraction) {
            // Too short to be worth a progress bar.
        }

        @Override
        public boolean isCancelled() {
            return monitor.isCanceled();
        }
    }
}
