package org.modewright.ui.internal.session;

import java.util.Optional;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.ISourceProvider;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.part.FileEditorInput;
import org.eclipse.ui.services.ISourceProviderService;
import org.modewright.audit.AuditResult;
import org.modewright.fem.ModelDefectsException;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.AuditSelection;
import org.modewright.ui.AuditSession;
import org.modewright.ui.StructureEditorPart;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.internal.RecentModels;
import org.modewright.ui.internal.Services;
import org.modewright.ui.internal.session.ModelReader.Content;
import org.modewright.ui.internal.session.TargetTracker.Target;
import org.modewright.workspace.AuditJob;
import org.modewright.workspace.RunRegistry;
import org.modewright.workspace.StoredRun;
import org.modewright.workspace.WorkspacePreferences;

/** The audit session of one workbench window. */
final class WindowAuditSession implements AuditSession {

    private final IWorkbenchWindow window;
    private final Display display;
    private final ChangeQueue changes;
    private final RunRegistry registry = Services.get(RunRegistry.class);
    private final RunRegistry.Listener runs = new Runs();
    private final TargetTracker tracker;
    private final ModelReader reader;
    private final Freshness freshness;
    private final Runnable edited = this::modelEdited;

    private Target target = Target.NONE;
    private StructuralModel loaded;
    private boolean readFromFile;
    private StoredRun run;
    private String problem;
    private AuditSelection selection = AuditSelection.NONE;
    private Object selectionSource;

    WindowAuditSession(IWorkbenchWindow window) {
        this.window = window;
        display = window.getShell().getDisplay();
        changes = new ChangeQueue(display);
        reader = new ModelReader(display, registry, this::contentRead, this::modelSaved);
        freshness = new Freshness(display, () -> changes.fire(Change.RESULT));
        tracker = new TargetTracker(window, this::retarget);
        registry.addListener(runs);
        changes.add(change -> updateCommands());
        tracker.start();
    }

    void dispose() {
        tracker.stop();
        registry.removeListener(runs);
        detach();
        reader.dispose();
        freshness.dispose();
        changes.clear();
    }

    @Override
    public IFile modelFile() {
        return target.file();
    }

    @Override
    public StructuralModel model() {
        return target.editor() == null ? loaded : target.editor().getLiveModel();
    }

    @Override
    public AuditResult result() {
        return run == null ? null : run.result();
    }

    @Override
    public boolean isStale() {
        return run != null && freshness.isStale(run);
    }

    @Override
    public boolean isRunning() {
        return target.file() != null && registry.isRunning(target.file());
    }

    @Override
    public String problem() {
        return problem;
    }

    @Override
    public AuditSelection selection() {
        return selection;
    }

    @Override
    public Object selectionSource() {
        return selectionSource;
    }

    @Override
    public void select(AuditSelection wanted, Object source) {
        if (!selection.equals(wanted)) {
            selection = wanted;
            selectionSource = source;
            changes.fire(Change.SELECTION);
        }
    }

    @Override
    public void run() {
        StructuralModel model = model();
        if (model == null || isRunning()) {
            return;
        }
        try {
            AuditJob.of(target.file(), model, registry).schedule();
        } catch (ModelDefectsException defects) {
            MessageDialog.openError(window.getShell(), Messages.Session_notComputable, defects.getMessage());
        } catch (RuntimeException failure) {
            ILog.of(WindowAuditSession.class).error("The run could not be prepared.", failure);
            MessageDialog.openError(window.getShell(), Messages.Session_notComputable,
                    NLS.bind(Messages.Session_programFault, failure.getMessage()));
        }
    }

    @Override
    public void cancelRun() {
        if (target.file() != null) {
            Job.getJobManager().cancel(target.file());
        }
    }

    @Override
    public void revealProperties(String elementId) {
        IFile file = target.file();
        if (file == null || window.getActivePage() == null) {
            return;
        }
        try {
            IEditorPart part = window.getActivePage().openEditor(new FileEditorInput(file), UiIds.STRUCTURE_EDITOR);
            if (part instanceof StructureEditorPart editor) {
                editor.reveal(elementId);
            }
        } catch (PartInitException failure) {
            MessageDialog.openError(window.getShell(), Messages.Session_notOpened, failure.getMessage());
        }
    }

    @Override
    public void addListener(Listener listener) {
        changes.add(listener);
    }

    @Override
    public void removeListener(Listener listener) {
        changes.remove(listener);
    }

    private void retarget(Target next) {
        boolean otherFile = next.file() == null || !next.file().equals(target.file());
        detach();
        target = next;
        loaded = null;
        if (otherFile) {
            run = next.file() == null ? null : registry.held(next.file()).orElse(null);
            problem = null;
            selection = AuditSelection.NONE;
            selectionSource = this;
        }
        attach();
        changes.fire(Change.MODEL);
        changes.fire(Change.RESULT);
        changes.fire(Change.RUNNING);
        if (otherFile) {
            changes.fire(Change.SELECTION);
        }
    }

    private void attach() {
        freshness.forget();
        if (target.file() == null) {
            reader.forget();
            return;
        }
        if (target.editor() != null) {
            target.editor().addModelListener(edited);
            new RecentModels().opened(target.file());
        }
        readFile();
        follow();
    }

    private void readFile() {
        readFromFile = isHeldByNoEditor();
        reader.read(target.file(), readFromFile);
    }

    /** An editor that cannot read its file holds no model either; then the reader finds out why. */
    private boolean isHeldByNoEditor() {
        return target.editor() == null || target.editor().getLiveModel() == null;
    }

    /** A saved model that has been run before is run again, if the user wants that; defects are for the markers to tell. */
    private void modelSaved() {
        StructuralModel model = model();
        if (model == null || run == null || !isStale() || isRunning() || !WorkspacePreferences.runsOnSave()) {
            return;
        }
        try {
            AuditJob.of(target.file(), model, registry).schedule();
        } catch (ModelDefectsException defects) {
            changes.fire(Change.RESULT);
        }
    }

    private void detach() {
        if (target.editor() != null) {
            target.editor().removeModelListener(edited);
        }
    }

    private void modelEdited() {
        changes.fire(Change.MODEL);
        if (readFromFile || isHeldByNoEditor()) {
            readFile();
        }
        if (run != null) {
            freshness.edited();
            changes.fire(Change.RESULT);
        }
        follow();
    }

    /** Has the live model compared with the run, when there is one. */
    private void follow() {
        if (run != null && target.editor() != null && target.editor().getLiveModel() != null) {
            freshness.follow(target.editor()::getLiveModel);
        }
    }

    private void contentRead(Content content) {
        if (!content.file().equals(target.file())) {
            return;
        }
        if (target.editor() == null) {
            loaded = content.model();
            freshness.known(content.hash());
            changes.fire(Change.MODEL);
        }
        if (run == null || content.run() != null) {
            run = registry.held(target.file()).orElse(content.run());
        }
        problem = content.problem();
        changes.fire(Change.RESULT);
        follow();
    }

    private void runEnded(IFile file, StoredRun ended, String trouble) {
        if (!file.equals(target.file())) {
            return;
        }
        run = Optional.ofNullable(ended).orElse(run);
        problem = trouble;
        if (ended != null && selection.mode() >= ended.result().modal().modes().size()) {
            selection = selection.withMode(-1);
            changes.fire(Change.SELECTION);
        }
        changes.fire(Change.RESULT);
        changes.fire(Change.RUNNING);
        follow();
        if (trouble != null) {
            MessageDialog.openError(window.getShell(), Messages.Session_runFailed, trouble);
        }
    }

    /** Tells the commands what this window allows, if it is the active one. */
    void updateCommands() {
        boolean active = window.getWorkbench().getActiveWorkbenchWindow() == window;
        ISourceProvider source = window.getService(ISourceProviderService.class).getSourceProvider("org.modewright.ui.canRun");
        if (active && source instanceof SessionSource session) {
            session.update(this);
        }
    }

    private void runStarted(IFile file) {
        if (file.equals(target.file())) {
            changes.fire(Change.RUNNING);
        }
    }

    private final class Runs implements RunRegistry.Listener {

        @Override
        public void runStarted(IFile model) {
            onDisplay(() -> WindowAuditSession.this.runStarted(model));
        }

        @Override
        public void runEnded(IFile model, StoredRun ended, String trouble) {
            onDisplay(() -> WindowAuditSession.this.runEnded(model, ended, trouble));
        }

        private void onDisplay(Runnable action) {
            if (!display.isDisposed()) {
                display.asyncExec(action);
            }
        }
    }
}
