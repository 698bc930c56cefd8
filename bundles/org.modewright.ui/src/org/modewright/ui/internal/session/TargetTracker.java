package org.modewright.ui.internal.session;

import java.util.function.Consumer;
import org.eclipse.core.resources.IFile;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.core.runtime.Adapters;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IPartListener2;
import org.eclipse.ui.ISelectionListener;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchPart;
import org.eclipse.ui.IWorkbenchPartReference;
import org.eclipse.ui.IWorkbenchWindow;
import org.modewright.ui.StructureEditorPart;
import org.modewright.ui.UiIds;
import org.modewright.workspace.ModelFiles;

/** Follows which model a window is about: that of the active structure editor, else the one selected in the explorer. */
final class TargetTracker implements IPartListener2, ISelectionListener {

    /**
     * What a window is about.
     *
     * @param file the model's file; null: none
     * @param editor its editor; null: it is not open
     */
    record Target(IFile file, StructureEditorPart editor) {
        static final Target NONE = new Target(null, null);
    }

    private final IWorkbenchWindow window;
    private final Consumer<Target> changed;
    private IFile selectedInExplorer;
    private Target target = Target.NONE;

    TargetTracker(IWorkbenchWindow window, Consumer<Target> changed) {
        this.window = window;
        this.changed = changed;
    }

    void start() {
        window.getPartService().addPartListener(this);
        window.getSelectionService().addSelectionListener(UiIds.EXPLORER, this);
        remember(window.getSelectionService().getSelection(UiIds.EXPLORER));
        update();
    }

    void stop() {
        window.getPartService().removePartListener(this);
        window.getSelectionService().removeSelectionListener(UiIds.EXPLORER, this);
    }

    @Override
    public void selectionChanged(IWorkbenchPart part, ISelection selection) {
        remember(selection);
        update();
    }

    @Override
    public void partActivated(IWorkbenchPartReference reference) {
        update();
    }

    @Override
    public void partBroughtToTop(IWorkbenchPartReference reference) {
        update();
    }

    @Override
    public void partOpened(IWorkbenchPartReference reference) {
        update();
    }

    @Override
    public void partInputChanged(IWorkbenchPartReference reference) {
        update();
    }

    @Override
    public void partClosed(IWorkbenchPartReference reference) {
        if (reference.getPart(false) == target.editor()) {
            target = Target.NONE;
            changed.accept(target);
        }
        update();
    }

    private void remember(ISelection selection) {
        if (selection instanceof IStructuredSelection structured) {
            IFile file = Adapters.adapt(structured.getFirstElement(), IFile.class);
            selectedInExplorer = file != null && ModelFiles.isModel(file) ? file : null;
        }
    }

    private void update() {
        Target current = current();
        if (!current.equals(target)) {
            target = current;
            changed.accept(current);
        }
    }

    private Target current() {
        IWorkbenchPage page = window.getActivePage();
        IEditorPart active = page == null ? null : page.getActiveEditor();
        if (active instanceof StructureEditorPart editor && editor.getModelFile() != null) {
            return new Target(editor.getModelFile(), editor);
        }
        boolean there = selectedInExplorer != null && selectedInExplorer.isAccessible();
        return there ? new Target(selectedInExplorer, null) : Target.NONE;
    }
}
