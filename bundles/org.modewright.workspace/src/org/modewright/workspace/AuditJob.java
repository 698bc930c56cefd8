package org.modewright.workspace;

import java.io.IOException;
import java.time.Instant;
import java.util.List;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.WorkspaceJob;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.OperationCanceledException;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.modewright.audit.AuditRequest;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditRun;
import org.modewright.audit.RulePackException;
import org.modewright.audit.RulePacks;
import org.modewright.fem.ModelDefectsException;
import org.modewright.fem.Snapshot;
import org.modewright.model.Snapshots;
import org.modewright.model.structure.StructuralModel;
import org.modewright.numerics.CancelledException;
import org.modewright.numerics.IndefiniteMassException;
import org.modewright.workspace.internal.MonitorProgress;

/**
 * Runs the audit of a model in the background. What is needed of the model is copied when the job is made, on the caller's thread; the
 * computation holds no lock on the workspace and obeys a cancel within a second. The end is published once, through the
 * {@link RunRegistry}; the result is kept by the {@link RunStore} and its findings become markers.
 */
public final class AuditJob extends Job {

    /** Job family of all audit jobs. */
    public static final Object FAMILY = new Object() {
        @Override
        public String toString() {
            return "org.modewright.workspace.audit";
        }
    };

    private final IFile file;
    private final RunRegistry registry;
    private final StructuralModel copy;
    private final Snapshot snapshot;
    private final AuditRequest request;

    private AuditJob(IFile file, StructuralModel model, RunRegistry registry) {
        super("Audit of " + file.getName());
        this.file = file;
        this.registry = registry;
        snapshot = Snapshot.of(model);
        copy = Snapshots.copy(model);
        request = AuditRequest.of(model).withThreads(WorkspacePreferences.threads());
        setUser(false);
        setPriority(LONG);
    }

    /**
     * Makes a job; to be called on the thread that owns the model.
     *
     * @param file the model's file
     * @param model the model as it stands
     * @param registry where the end is published
     * @throws ModelDefectsException if the model has defects that make it incomputable
     */
    public static AuditJob of(IFile file, StructuralModel model, RunRegistry registry) {
        return new AuditJob(file, model, registry);
    }

    /** The model's file. */
    public IFile file() {
        return file;
    }

    @Override
    public boolean belongsTo(Object family) {
        return family == FAMILY || file.equals(family);
    }

    @Override
    protected IStatus run(IProgressMonitor monitor) {
        if (!registry.begin(file)) {
            return Status.CANCEL_STATUS;
        }
        Outcome outcome = new Outcome(null, null, Status.CANCEL_STATUS);
        try {
            outcome = compute(monitor);
        } finally {
            registry.end(file, outcome.run, outcome.problem);
            monitor.done();
        }
        if (outcome.run != null) {
            keep(outcome.run);
        }
        return outcome.status;
    }

    private Outcome compute(IProgressMonitor monitor) {
        try {
            RulePacks packs = rulePacks();
            if (packs.all().stream().noneMatch(pack -> pack.id().equals(request.rulePack()))) {
                return failed("There is no rule pack \"" + request.rulePack() + "\". Choose another one in the model's settings, or name "
                        + "the folder that holds it in the preferences.", null);
            }
            MonitorProgress progress = new MonitorProgress(monitor, getName());
            String hash = Snapshots.sha256(copy);
            AuditResult result = new AuditRun(packs, List.of()).run(snapshot, request, progress);
            return new Outcome(new StoredRun(result, hash, Instant.now()), null, Status.OK_STATUS);
        } catch (CancelledException | OperationCanceledException cancelled) {
            return new Outcome(null, null, Status.CANCEL_STATUS);
        } catch (OutOfMemoryError exhausted) {
            return failed("The run needs more memory than it was given. Ask for fewer modes, or start with a larger memory limit.",
                    exhausted);
        } catch (RulePackException | IndefiniteMassException | IOException fault) {
            return failed(fault.getMessage(), null);
        } catch (RuntimeException fault) {
            ILog.of(AuditJob.class).error("The audit of " + file.getFullPath() + " failed.", fault);
            return failed("The run failed because of a fault in the program (" + fault + "); the log has more.", fault);
        }
    }

    private static RulePacks rulePacks() throws RulePackException {
        RulePacks packs = RulePacks.builtIn();
        return WorkspacePreferences.rulePackFolder().isPresent() ? packs.with(WorkspacePreferences.rulePackFolder().get()) : packs;
    }

    private static Outcome failed(String problem, Throwable cause) {
        return new Outcome(null, problem, new Status(IStatus.INFO, "org.modewright.workspace", problem, cause));
    }

    private void keep(StoredRun run) {
        WorkspaceJob keeping = new WorkspaceJob("Keeping the result of " + file.getName()) {
            @Override
            public IStatus runInWorkspace(IProgressMonitor monitor) throws CoreException {
                return keep(run, monitor);
            }

            @Override
            public boolean belongsTo(Object family) {
                return family == FAMILY;
            }
        };
        keeping.setRule(file.getProject());
        keeping.setSystem(true);
        keeping.schedule();
    }

    private IStatus keep(StoredRun run, IProgressMonitor monitor) throws CoreException {
        if (!file.isAccessible()) {
            return Status.OK_STATUS;
        }
        FindingMarkers.replaceRunFindings(file, run.result().findings());
        try {
            registry.store().save(file, run);
            return Status.OK_STATUS;
        } catch (RunStoreException failure) {
            return new Status(IStatus.WARNING, "org.modewright.workspace", failure.getMessage(), failure);
        }
    }

    private record Outcome(StoredRun run, String problem, IStatus status) {
    }
}
