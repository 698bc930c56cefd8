package org.modewright.ui.editor.pages;

import java.util.Set;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.modewright.model.ModelFileException;
import org.modewright.ui.editor.EditorPage;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.widgets.EmptyState;

/** Why a file cannot be opened: where in it, what is wrong and how to mend it. */
public final class ErrorPage implements EditorPage {

    private final EmptyState body;

    public ErrorPage(Composite parent, ModelFileException failure, Runnable again) {
        body = new EmptyState(parent);
        body.show(failure.getMessage(), Messages.Error_reload, again);
    }

    @Override
    public Control control() {
        return body;
    }

    @Override
    public void modelChanged() {
        // There is no model.
    }

    @Override
    public void select(Set<String> ids) {
        // There is nothing to select.
    }

    @Override
    public boolean reveals(String id) {
        return false;
    }

    @Override
    public void setFocus() {
        body.setFocus();
    }
}
