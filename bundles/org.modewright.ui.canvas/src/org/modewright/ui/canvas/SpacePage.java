package org.modewright.ui.canvas;

import java.util.Set;
import java.util.function.Supplier;
import org.eclipse.jface.action.ToolBarManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.AuditSession;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.canvas.drawing.StructureDrawing;
import org.modewright.ui.widgets.EmptyState;

/**
 * The structure in space, for the editor: shows the live model, follows and makes the session's selection. The editor says when the model
 * has changed; several changes in one turn of the event loop are drawn once.
 */
public final class SpacePage extends Composite {

    private final AuditSession session;
    private final Supplier<StructuralModel> model;
    private final StackLayout stack = new StackLayout();
    private final EmptyState empty;
    private final Composite body;
    private final StructureCanvas canvas;
    private boolean pending;

    /**
     * @param parent where the page stands
     * @param session the window's session
     * @param model gives the live model; null while there is none
     */
    public SpacePage(Composite parent, AuditSession session, Supplier<StructuralModel> model) {
        super(parent, SWT.NONE);
        this.session = session;
        this.model = model;
        setLayout(stack);
        empty = new EmptyState(this);
        empty.show(Messages.Space_empty, null, null);
        body = new Composite(this, SWT.NONE);
        GridLayout layout = new GridLayout();
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 0;
        body.setLayout(layout);
        ToolBarManager tools = new ToolBarManager(SWT.FLAT | SWT.HORIZONTAL);
        tools.createControl(body).setLayoutData(new GridData(SWT.RIGHT, SWT.TOP, true, false));
        canvas = new StructureCanvas(body, new Bridge());
        canvas.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        canvas.describeWith(ObjectFacts::of);
        ViewActions.views(canvas).forEach(tools::add);
        ViewActions.options(canvas).forEach(tools::add);
        tools.update(true);
        AuditSession.Listener listener = this::changed;
        session.addListener(listener);
        addListener(SWT.Dispose, event -> {
            session.removeListener(listener);
            tools.dispose();
        });
        rebuild();
    }

    /** Says that the model has changed. */
    public void modelChanged() {
        if (!pending && !isDisposed()) {
            pending = true;
            getDisplay().asyncExec(this::rebuildIfPending);
        }
    }

    /** The canvas. */
    public StructureCanvas canvas() {
        return canvas;
    }

    @Override
    public boolean setFocus() {
        return canvas.setFocus();
    }

    private void rebuildIfPending() {
        if (pending && !isDisposed()) {
            rebuild();
        }
    }

    private void rebuild() {
        pending = false;
        StructuralModel live = model.get();
        StructureDrawing drawing = live == null ? null : StructureDrawing.of(live);
        canvas.show(drawing, true);
        canvas.select(session.selection().elementIds());
        Control top = drawing == null || drawing.isEmpty() ? empty : body;
        if (stack.topControl != top) {
            stack.topControl = top;
            layout(true, true);
        }
    }

    private void changed(Change change) {
        if (change == Change.SELECTION && !isDisposed()) {
            canvas.select(session.selection().elementIds());
        }
    }

    /** What is picked here is selected everywhere. */
    private final class Bridge implements StructureCanvas.Handler {

        @Override
        public void picked(Set<String> ids, boolean add) {
            PickedSelection.apply(session, ids, add, SpacePage.this);
        }

        @Override
        public void opened(String id) {
            session.revealProperties(id);
        }
    }
}
