package org.modewright.ui.editor;

import org.eclipse.emf.common.command.CommandStack;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IAction;
import org.eclipse.osgi.util.NLS;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.actions.ActionFactory;

/** The workbench's own actions while the structure editor is active: undo, redo, delete, copy, select all. */
final class EditorActions {

    private final StructureEditor editor;
    private final IAction undo = action(Messages.Undo_plain, () -> stack().undo());
    private final IAction redo = action(Messages.Redo_plain, () -> stack().redo());
    private final IAction delete = action(Messages.Delete, () -> editor().delete(editor().selected()));

    EditorActions(StructureEditor editor) {
        this.editor = editor;
        IActionBars bars = editor.getEditorSite().getActionBars();
        bars.setGlobalActionHandler(ActionFactory.UNDO.getId(), undo);
        bars.setGlobalActionHandler(ActionFactory.REDO.getId(), redo);
        bars.setGlobalActionHandler(ActionFactory.DELETE.getId(), delete);
        bars.setGlobalActionHandler(ActionFactory.COPY.getId(), action(Messages.Copy, () -> editor().activePage().copy()));
        bars.setGlobalActionHandler(ActionFactory.SELECT_ALL.getId(), action(Messages.SelectAll, () -> editor().activePage().selectAll()));
        update();
    }

    private StructureEditor editor() {
        return editor;
    }

    private CommandStack stack() {
        return editor.getEditingDomain().getCommandStack();
    }

    private static IAction action(String label, Runnable body) {
        return new Action(label) {
            @Override
            public void run() {
                body.run();
            }
        };
    }

    /** Brings labels and enablement up to date. */
    void update() {
        boolean open = editor.getEditingDomain() != null;
        boolean canUndo = open && stack().canUndo();
        boolean canRedo = open && stack().canRedo();
        undo.setEnabled(canUndo);
        redo.setEnabled(canRedo);
        undo.setText(canUndo ? NLS.bind(Messages.Undo, stack().getUndoCommand().getLabel()) : Messages.Undo_plain);
        redo.setText(canRedo ? NLS.bind(Messages.Redo, stack().getRedoCommand().getLabel()) : Messages.Redo_plain);
        delete.setEnabled(open && !editor.selected().isEmpty());
        editor.getEditorSite().getActionBars().updateActionBars();
    }
}
