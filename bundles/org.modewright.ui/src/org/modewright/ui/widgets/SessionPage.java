package org.modewright.ui.widgets;

import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.modewright.ui.AuditSession;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.internal.Actions;

/**
 * The body of a view that shows a result: the view's own content while there is a result, else the sentence that says what to do, with
 * a link that does it. Follows the session by itself until it is disposed.
 */
public final class SessionPage extends Composite {

    private final AuditSession session;
    private final StackLayout stack = new StackLayout();
    private final Composite content;
    private final EmptyState empty;

    /**
     * @param parent the view's parent
     * @param session the session of the view's window
     */
    public SessionPage(Composite parent, AuditSession session) {
        super(parent, SWT.NONE);
        this.session = session;
        setLayout(stack);
        content = new Composite(this, SWT.NONE);
        empty = new EmptyState(this);
        AuditSession.Listener listener = this::changed;
        session.addListener(listener);
        addListener(SWT.Dispose, event -> session.removeListener(listener));
        refresh();
    }

    /** Where the view puts its widgets. */
    public Composite content() {
        return content;
    }

    /** Whether the content is shown. */
    public boolean hasContent() {
        return stack.topControl == content;
    }

    @Override
    public boolean setFocus() {
        return stack.topControl.setFocus();
    }

    private void changed(Change change) {
        if (change != Change.SELECTION && !isDisposed()) {
            refresh();
        }
    }

    private void refresh() {
        Control top = session.result() == null ? empty : content;
        if (top == empty) {
            explain();
        }
        if (stack.topControl != top) {
            stack.topControl = top;
            layout(true, true);
        }
    }

    private void explain() {
        if (session.isRunning()) {
            empty.show(Messages.SessionPage_running, Messages.SessionPage_cancel, session::cancelRun);
        } else if (session.problem() != null) {
            empty.show(session.problem(), session.model() == null ? null : Messages.SessionPage_run, session::run);
        } else if (session.modelFile() == null) {
            empty.show(Messages.SessionPage_noModel, Messages.SessionPage_openSample, Actions::openSample);
        } else if (session.model() == null) {
            empty.show(Messages.SessionPage_reading, null, null);
        } else {
            empty.show(Messages.SessionPage_noResult, Messages.SessionPage_run, session::run);
        }
    }
}
