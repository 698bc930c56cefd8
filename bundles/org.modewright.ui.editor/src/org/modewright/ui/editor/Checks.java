package org.modewright.ui.editor;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.widgets.Display;
import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.model.Snapshots;
import org.modewright.model.structure.StructuralModel;
import org.modewright.workspace.ModelChecks;

/** Checks the model while it is edited: a moment after the last change, on a copy, in the background. */
public final class Checks {

    /** Job family, for those who wait. */
    public static final Object FAMILY = Checks.class;

    private static final int DELAY_MILLISECONDS = 400;

    private final Display display;
    private final Runnable whenDone;
    private List<Finding> findings = List.of();
    private Map<String, List<Finding>> byId = Map.of();
    private boolean done;
    private boolean disposed;
    private StructuralModel waiting;
    private Job job;

    /** @param whenDone called on the user interface's thread when new findings are there */
    Checks(Display display, Runnable whenDone) {
        this.display = display;
        this.whenDone = whenDone;
    }

    /** Asks for a check of the model as it will be in a moment. */
    void request(StructuralModel model) {
        boolean scheduled = waiting != null;
        waiting = model;
        if (!scheduled) {
            display.timerExec(DELAY_MILLISECONDS, this::start);
        }
    }

    private void start() {
        StructuralModel model = waiting;
        waiting = null;
        if (disposed || model == null) {
            return;
        }
        StructuralModel copy = Snapshots.copy(model);
        if (job != null) {
            job.cancel();
        }
        job = new CheckJob(copy);
        job.schedule();
    }

    void dispose() {
        disposed = true;
        if (job != null) {
            job.cancel();
        }
    }

    private void publish(List<Finding> found) {
        if (disposed) {
            return;
        }
        findings = found.stream().sorted(Comparator.comparing(Finding::severity)).toList();
        done = true;
        byId = new HashMap<>();
        for (Finding finding : findings) {
            for (ObjectRef object : finding.objects()) {
                byId.computeIfAbsent(object.id(), id -> new ArrayList<>()).add(finding);
            }
        }
        whenDone.run();
    }

    List<Finding> of(String id) {
        return byId.getOrDefault(id, List.of());
    }

    /** The findings, the gravest first. */
    public List<Finding> all() {
        return findings;
    }

    /** Whether a check has ended since the editor was opened. */
    boolean isDone() {
        return done;
    }

    /** All in one line: how many, and the first of them. */
    String line() {
        if (findings.isEmpty()) {
            return done ? Messages.Checks_none : Messages.Checks_working;
        }
        Finding first = findings.get(0);
        return NLS.bind(Messages.Checks_first, counts(), first.text());
    }

    private String counts() {
        List<String> parts = new ArrayList<>();
        count(parts, Severity.ERROR, "error");
        count(parts, Severity.WARNING, "warning");
        count(parts, Severity.INFO, "note");
        return String.join(", ", parts);
    }

    private void count(List<String> parts, Severity severity, String word) {
        long count = findings.stream().filter(finding -> finding.severity() == severity).count();
        if (count > 0) {
            parts.add(count + " " + word + (count == 1 ? "" : "s"));
        }
    }

    private final class CheckJob extends Job {

        private final StructuralModel copy;

        CheckJob(StructuralModel copy) {
            super("Check the model");
            this.copy = copy;
            setSystem(true);
        }

        @Override
        protected IStatus run(IProgressMonitor monitor) {
            List<Finding> found = ModelChecks.check(copy);
            if (!monitor.isCanceled() && !display.isDisposed()) {
                display.asyncExec(() -> {
                    if (job == this) {
                        publish(found);
                    }
                });
            }
            return monitor.isCanceled() ? Status.CANCEL_STATUS : Status.OK_STATUS;
        }

        @Override
        public boolean belongsTo(Object family) {
            return family == FAMILY;
        }
    }
}
