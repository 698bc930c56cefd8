package org.modewright.ui.tests.editor;

import java.io.ByteArrayInputStream;
import java.util.List;
import java.util.Set;
import java.util.concurrent.Callable;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;
import org.eclipse.swt.widgets.ToolBar;
import org.eclipse.swt.widgets.ToolItem;
import org.modewright.model.Ids;
import org.modewright.model.ModelFile;
import org.modewright.model.ModelFileException;
import org.modewright.model.structure.StructuralModel;
import org.modewright.testsupport.Workbench;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.StructureEditor;
import org.modewright.ui.editor.pages.AnalysisPage;
import org.modewright.ui.editor.pages.LoadsPage;
import org.modewright.ui.editor.pages.TablesPage;

/** What tests of the structure editor do to it beyond the page objects that all tests share. */
final class EditorDriver {

    static final String UNDO = "org.eclipse.ui.edit.undo";
    static final String REDO = "org.eclipse.ui.edit.redo";
    static final String DELETE = "org.eclipse.ui.edit.delete";
    static final String COPY = "org.eclipse.ui.edit.copy";
    static final String PASTE = "org.eclipse.ui.edit.paste";
    static final String SELECT_ALL = "org.eclipse.ui.edit.selectAll";
    static final String RENAME = "org.eclipse.ui.edit.rename";
    static final String TABLE = "tables.table";
    static final String CELL = "tables.cell";

    private final Workbench workbench;

    EditorDriver(Workbench workbench) {
        this.workbench = workbench;
    }

    /** Puts a model into a file of a project of its own. */
    IFile file(String name, StructuralModel model) throws CoreException, ModelFileException {
        Ids.assignMissing(model);
        return file(name, ModelFile.bytes(model));
    }

    IFile file(String name, byte[] content) throws CoreException {
        IProject project = ResourcesPlugin.getWorkspace().getRoot().getProject("Editing");
        if (!project.exists()) {
            project.create(new NullProgressMonitor());
            project.open(new NullProgressMonitor());
        }
        IFile file = project.getFile(name);
        file.create(new ByteArrayInputStream(content), true, new NullProgressMonitor());
        return file;
    }

    StructureEditor open(IFile file) {
        workbench.open(file);
        return editor();
    }

    StructureEditor editor() {
        return (StructureEditor) workbench.structureEditor();
    }

    <T> T ask(Callable<T> question) {
        return workbench.ask(question);
    }

    void run(Runnable action) {
        workbench.ui().run(action);
    }

    void until(String what, Callable<Boolean> condition) {
        workbench.ui().waitUntil(what, condition);
    }

    byte[] bytes() {
        return ask(() -> ModelFile.bytes(editor().getLiveModel()));
    }

    void showTables() {
        run(() -> editor().showPage(TablesPage.class));
    }

    void showLoads() {
        run(() -> editor().showPage(LoadsPage.class));
    }

    void showAnalysis() {
        run(() -> editor().showPage(AnalysisPage.class));
    }

    /** The visible control of a name in any window of the program; null if there is none. */
    <T extends Control> T find(Class<T> type, String id) {
        return ask(() -> {
            for (Shell shell : workbench.ui().display().getShells()) {
                T found = find(shell, type, id);
                if (found != null) {
                    return found;
                }
            }
            return null;
        });
    }

    private static <T extends Control> T find(Control scope, Class<T> type, String id) {
        if (scope.isDisposed()) {
            return null;
        }
        if (type.isInstance(scope) && id.equals(scope.getData(UiIds.WIDGET_ID)) && scope.isVisible()) {
            return type.cast(scope);
        }
        if (scope instanceof Composite composite) {
            for (Control child : composite.getChildren()) {
                T found = find(child, type, id);
                if (found != null) {
                    return found;
                }
            }
        }
        return null;
    }

    /** The item of a name in a tool bar that is shown. */
    ToolItem tool(String id) {
        return ask(() -> {
            ToolItem[] found = new ToolItem[1];
            for (Shell shell : workbench.ui().display().getShells()) {
                collectTool(shell, id, found);
            }
            return found[0];
        });
    }

    private static void collectTool(Composite scope, String id, ToolItem[] found) {
        if (scope.isDisposed() || !scope.isVisible()) {
            return;
        }
        if (scope instanceof ToolBar bar) {
            for (ToolItem item : bar.getItems()) {
                found[0] = id.equals(item.getData(UiIds.WIDGET_ID)) ? item : found[0];
            }
        }
        for (Control child : scope.getChildren()) {
            if (child instanceof Composite composite) {
                collectTool(composite, id, found);
            }
        }
    }

    /** Double-clicks a cell. */
    void openCell(String table, int row, int column) {
        Table widget = find(Table.class, table);
        run(() -> {
            widget.setFocus();
            widget.setSelection(row);
            widget.showColumn(widget.getColumn(column));
            Rectangle cell = widget.getItem(row).getBounds(column);
            Event event = new Event();
            event.button = 1;
            event.x = cell.x + cell.width / 2;
            event.y = cell.y + cell.height / 2;
            widget.notifyListeners(SWT.MouseDoubleClick, event);
        });
    }

    /** Replaces the text of the open cell. */
    void typeIntoCell(String text) {
        Text cell = find(Text.class, CELL);
        run(() -> cell.setText(text));
    }

    /** Presses a key of traversal, such as {@link SWT#TRAVERSE_RETURN}, in a control. */
    void traverse(Control control, int detail) {
        run(() -> {
            Event event = new Event();
            event.detail = detail;
            control.notifyListeners(SWT.Traverse, event);
        });
    }

    void key(Control control, int code) {
        run(() -> {
            Event event = new Event();
            event.keyCode = code;
            control.notifyListeners(SWT.KeyDown, event);
        });
    }

    /** Selects rows of a table as the user does. */
    void selectRows(String table, int... rows) {
        Table widget = find(Table.class, table);
        run(() -> {
            widget.setFocus();
            widget.setSelection(rows);
            widget.notifyListeners(SWT.Selection, new Event());
        });
    }

    void clipboard(String text) {
        run(() -> {
            Clipboard clipboard = new Clipboard(workbench.ui().display());
            clipboard.setContents(new Object[] {text}, new Transfer[] {TextTransfer.getInstance()});
            clipboard.dispose();
        });
    }

    String clipboard() {
        return ask(() -> {
            Clipboard clipboard = new Clipboard(workbench.ui().display());
            try {
                return (String) clipboard.getContents(TextTransfer.getInstance());
            } finally {
                clipboard.dispose();
            }
        });
    }

    void select(List<String> ids) {
        run(() -> workbench.session().select(workbench.session().selection().withElements(Set.copyOf(ids)), this));
    }
}
