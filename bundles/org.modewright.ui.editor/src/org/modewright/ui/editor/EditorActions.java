package org.modewright.ui.editor;

import org.eclipse.emf.common.command.CommandStack;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IAction;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.actions.ActionFactory;
import org.modewright.ui.editor.pages.TablesPage;

/**
 * The workbench's own actions while the structure editor is active. While a text field has the focus they edit the text, otherwise the
 * model.
 */
final class EditorActions {

    private final StructureEditor editor;
    private final IAction undo = action(Messages.Undo_plain, this::undo);
    private final IAction redo = action(Messages.Redo_plain, this::redo);
    private final IAction delete = action(Messages.Delete, this::delete);
    private final IAction rename = action(Messages.Rename, this::rename);

    EditorActions(StructureEditor editor) {
        this.editor = editor;
        contribute(editor.getEditorSite().getActionBars());
        IActionBars bars = editor.getEditorSite().getActionBars();
        bars.setGlobalActionHandler(ActionFactory.DELETE.getId(), delete);
        bars.setGlobalActionHandler(ActionFactory.RENAME.getId(), rename);
        bars.setGlobalActionHandler(ActionFactory.COPY.getId(), action(Messages.Copy, this::copy));
        bars.setGlobalActionHandler(ActionFactory.CUT.getId(), action(Messages.Cut, this::cut));
        bars.setGlobalActionHandler(ActionFactory.PASTE.getId(), action(Messages.Paste, this::paste));
        bars.setGlobalActionHandler(ActionFactory.SELECT_ALL.getId(), action(Messages.SelectAll, this::selectAll));
        bars.setGlobalActionHandler(ActionFactory.FIND.getId(), action(Messages.Find, this::find));
        update();
    }

    /** Gives other action bars, such as the outline's, undo and redo. */
    void contribute(IActionBars bars) {
        bars.setGlobalActionHandler(ActionFactory.UNDO.getId(), undo);
        bars.setGlobalActionHandler(ActionFactory.REDO.getId(), redo);
    }

    private static IAction action(String label, Runnable body) {
        return new Action(label) {
            @Override
            public void run() {
                body.run();
            }
        };
    }

    private CommandStack stack() {
        return editor.getEditingDomain().getCommandStack();
    }

    private Display display() {
        return editor.shell().getDisplay();
    }

    private void undo() {
        if (!TextKeys.undo(display()) && editor.getEditingDomain() != null && stack().canUndo()) {
            stack().undo();
        }
    }

    private void redo() {
        if (editor.getEditingDomain() != null && stack().canRedo()) {
            stack().redo();
        }
    }

    private void delete() {
        if (TextKeys.apply(display())) {
            TextKeys.delete(display());
        } else if (editor.getEditingDomain() != null) {
            var here = editor.activePage().toDelete();
            editor.delete(here == null ? editor.selected() : here);
        }
    }

    private void rename() {
        if (!TextKeys.apply(display()) && editor.getEditingDomain() != null) {
            editor.activePage().rename();
        }
    }

    private void find() {
        if (editor.getEditingDomain() != null) {
            editor.showPage(TablesPage.class);
            editor.activePage().find();
        }
    }

    private void copy() {
        if (TextKeys.apply(display())) {
            TextKeys.copy(display());
        } else {
            editor.activePage().copy();
        }
    }

    private void cut() {
        if (TextKeys.apply(display())) {
            TextKeys.cut(display());
        }
    }

    private void paste() {
        if (TextKeys.apply(display())) {
            TextKeys.paste(display());
        } else {
            editor.activePage().paste();
        }
    }

    private void selectAll() {
        if (TextKeys.apply(display())) {
            TextKeys.selectAll(display());
        } else {
            editor.activePage().selectAll();
        }
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
        delete.setEnabled(open);
        rename.setEnabled(open);
        editor.getEditorSite().getActionBars().updateActionBars();
    }
}
