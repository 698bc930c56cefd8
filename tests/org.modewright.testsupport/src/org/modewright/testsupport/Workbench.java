package org.modewright.testsupport;

import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.eclipse.core.commands.common.CommandException;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.core.runtime.OperationCanceledException;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.commands.ICommandService;
import org.eclipse.ui.handlers.IHandlerService;
import org.eclipse.ui.ide.IDE;
import org.modewright.ui.AuditSession;
import org.modewright.ui.StructureEditorPart;
import org.modewright.ui.UiIds;
import org.modewright.workspace.AuditJob;

/**
 * The running workbench as a test sees it: the one type through which tests drive widgets, so that another driver can take its place.
 * To be used from the test's own thread. Made by {@link WorkbenchExtension}.
 */
public final class Workbench {

    private final UiThread ui;

    Workbench(UiThread ui) {
        this.ui = ui;
    }

    /** The user interface's thread, for what the page objects do not offer. */
    public UiThread ui() {
        return ui;
    }

    /** Executes a command and returns when it is done. */
    public void execute(String command) {
        ui.run(() -> executeHere(command));
    }

    /** Executes a command that opens a dialogue, and waits for the dialogue. */
    public DialogObject executeForDialog(String command, String title) {
        ui.later(() -> executeHere(command));
        return dialog(title);
    }

    /** Waits for a dialogue with a title. */
    public DialogObject dialog(String title) {
        return DialogObject.waitFor(ui, title);
    }

    /** Closes a dialogue with a title if there is one, as Escape does. */
    public void closeDialog(String title) {
        ui.run(() -> {
            Shell shell = DialogObject.shell(ui, title);
            if (shell != null) {
                shell.close();
            }
        });
    }

    /** Whether a command can be executed now. */
    public boolean isEnabled(String command) {
        return ui.get(() -> window().getService(ICommandService.class).getCommand(command).isEnabled());
    }

    /** Shows a view. */
    public ViewObject view(String id) {
        return ViewObject.show(ui, id);
    }

    /** The start page, which is opened if need be. */
    public ViewObject startPage() {
        execute(UiIds.START_PAGE_COMMAND);
        return new ViewObject(ui, ui.get(() -> page().getActiveEditor()));
    }

    /** The active editor of a model, once there is one. */
    public ViewObject editor() {
        IEditorPart part = ui.waitFor("an editor of a model",
                () -> page().getActiveEditor() instanceof StructureEditorPart editor && editor.getLiveModel() != null ? editor : null);
        return new ViewObject(ui, part);
    }

    /** The active editor of a model as the audit session sees it. */
    public StructureEditorPart structureEditor() {
        return (StructureEditorPart) editor().part();
    }

    /** Opens a file in its editor. */
    public ViewObject open(IFile file) {
        ui.get(() -> IDE.openEditor(page(), file, true));
        return editor();
    }

    /** The audit session of the window. */
    public AuditSession session() {
        return ui.get(() -> window().getService(AuditSession.class));
    }

    /** Something about the audit session, asked on the user interface's thread. */
    public <T> T ask(Callable<T> question) {
        return ui.get(question);
    }

    /** Opens the sample project with its demonstration model and waits for its editor. */
    public ViewObject openSample() {
        execute(UiIds.OPEN_SAMPLE_COMMAND);
        return editor();
    }

    /** Runs the audit of the current model and waits for its fresh result. */
    public void runAudit() {
        ui.waitUntil("the run command to be enabled",
                () -> window().getService(ICommandService.class).getCommand(UiIds.RUN_COMMAND).isEnabled());
        execute(UiIds.RUN_COMMAND);
        AuditSession session = session();
        ui.waitUntil("the result of the run", () -> !session.isRunning() && session.result() != null && !session.isStale());
    }

    /** Waits until the models have been checked and no run or build is under way. */
    public void waitForBuild() {
        try {
            Job.getJobManager().join(AuditJob.FAMILY, new NullProgressMonitor());
            Job.getJobManager().join(ResourcesPlugin.FAMILY_AUTO_BUILD, new NullProgressMonitor());
        } catch (OperationCanceledException | InterruptedException stopped) {
            throw new IllegalStateException(stopped);
        }
    }

    /** Saves a picture of the screen; returns its place. */
    public Path screenshot(String name) {
        return ui.get(() -> Screenshots.save(ui.display(), name));
    }

    /** Brings the window back to where every test begins: no dialogue, no editor, no project, the perspective as it was made. */
    void reset() throws IOException {
        ui.run(this::closeDialogs);
        ui.run(() -> page().closeAllEditors(false));
        waitForBuild();
        try {
            for (IProject project : ResourcesPlugin.getWorkspace().getRoot().getProjects()) {
                project.delete(true, true, new NullProgressMonitor());
            }
        } catch (CoreException failure) {
            throw new IOException(failure);
        }
        ui.run(() -> page().resetPerspective());
    }

    private void closeDialogs() {
        for (Shell shell : ui.display().getShells()) {
            if (!shell.isDisposed() && shell != window().getShell() && shell.isVisible() && !shell.getText().isEmpty()) {
                shell.close();
            }
        }
    }

    private static void executeHere(String command) {
        try {
            window().getService(IHandlerService.class).executeCommand(command, null);
        } catch (CommandException failure) {
            throw new IllegalStateException(failure);
        }
    }

    private static IWorkbenchPage page() {
        return window().getActivePage();
    }

    private static IWorkbenchWindow window() {
        IWorkbenchWindow active = PlatformUI.getWorkbench().getActiveWorkbenchWindow();
        return active == null ? PlatformUI.getWorkbench().getWorkbenchWindows()[0] : active;
    }
}
