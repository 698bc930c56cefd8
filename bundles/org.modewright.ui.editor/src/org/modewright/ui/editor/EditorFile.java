package org.modewright.ui.editor;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IPath;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.Status;
import org.eclipse.jface.dialogs.ErrorDialog;
import org.eclipse.jface.dialogs.IDialogConstants;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.ui.dialogs.SaveAsDialog;
import org.modewright.model.ModelFile;
import org.modewright.model.ModelFileException;

/**
 * Saves the editor's model, and settles with the user what is to happen when the file changes or goes from outside: without unsaved
 * changes the editor simply follows.
 */
final class EditorFile {

    private final StructureEditor editor;
    private final FileWatch watch = new FileWatch(this::fileChanged, this::fileMoved);
    private boolean changedOutside;
    private boolean gone;
    private boolean asking;

    EditorFile(StructureEditor editor) {
        this.editor = editor;
    }

    /** Watches the editor's file, which the editor is about to read. */
    void watch() {
        watch.start(file());
        watch.contentKnown();
        changedOutside = false;
        gone = false;
    }

    void stop() {
        watch.stop();
    }

    private IFile file() {
        return editor.getModelFile();
    }

    /** Saves the model into a file, the editor's own or another; false if that failed or was given up. */
    boolean save(IFile file, IProgressMonitor monitor) {
        boolean own = file.equals(file());
        if (own && watch.isOutOfStep() && !mayOverwrite()) {
            cancel(monitor);
            return false;
        }
        try {
            ModelFile.save(editor.model(), file.getLocation().toFile().toPath());
            file.refreshLocal(IResource.DEPTH_ZERO, monitor);
            if (own) {
                watch.contentKnown();
            }
            changedOutside = false;
            gone = false;
            return true;
        } catch (ModelFileException | CoreException fault) {
            ILog.get().error(fault.getMessage(), fault);
            ErrorDialog.openError(editor.shell(), Messages.Save_failed, null, Status.error(fault.getMessage(), fault));
            cancel(monitor);
            return false;
        }
    }

    private static void cancel(IProgressMonitor monitor) {
        if (monitor != null) {
            monitor.setCanceled(true);
        }
    }

    /** Asks for another file; null if the user gives up. */
    IFile askForFile() {
        SaveAsDialog dialog = new SaveAsDialog(editor.shell());
        dialog.setOriginalFile(file());
        dialog.open();
        IPath chosen = dialog.getResult();
        if (chosen == null) {
            return null;
        }
        boolean named = ModelFile.EXTENSION.equals(chosen.getFileExtension());
        return file().getWorkspace().getRoot().getFile(named ? chosen : chosen.addFileExtension(ModelFile.EXTENSION));
    }

    private boolean mayOverwrite() {
        int answer = ask(Messages.Changed_title, Messages.Changed_overwriteQuestion, Messages.Changed_overwrite, Messages.Changed_reload,
                IDialogConstants.CANCEL_LABEL);
        if (answer == 1) {
            watch.look();
            editor.reload();
        }
        return answer == 0;
    }

    private void fileMoved(IFile target) {
        if (editor.isClosed()) {
            return;
        }
        if (target != null) {
            editor.moveTo(target);
        } else if (editor.isDirty()) {
            gone = true;
            askAboutChange();
        } else {
            editor.close();
        }
    }

    private void fileChanged() {
        if (editor.isClosed()) {
            return;
        }
        if (editor.isDirty()) {
            changedOutside = true;
            askAboutChange();
        } else {
            editor.reload();
        }
    }

    /** Looks for changes by other programs, now that the user is here, and asks what is to be done about those known. */
    void userIsHere() {
        watch.look();
        editor.shell().getDisplay().asyncExec(this::askAboutChange);
    }

    private void askAboutChange() {
        if (editor.isClosed() || asking || editor.getSite().getPage().getActivePart() != editor) {
            return;
        }
        asking = true;
        try {
            if (gone) {
                askAboutGone();
            } else if (changedOutside) {
                askAboutConflict();
            }
        } finally {
            asking = false;
        }
    }

    private void askAboutGone() {
        gone = false;
        if (ask(Messages.Gone_title, Messages.Gone_question, Messages.Gone_keep, Messages.Gone_close) == 1) {
            editor.close();
        }
    }

    private void askAboutConflict() {
        changedOutside = false;
        if (ask(Messages.Changed_title, Messages.Changed_question, Messages.Changed_reload, Messages.Changed_keep) == 0) {
            editor.reload();
        }
    }

    private int ask(String title, String question, String... answers) {
        return MessageDialog.open(MessageDialog.QUESTION, editor.shell(), title, NLS.bind(question, file().getName()), SWT.NONE, answers);
    }
}
