package org.modewright.ui.editor.pages;

import java.nio.file.Path;
import java.util.Set;
import org.eclipse.osgi.util.NLS;
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
        body.show(text(failure), Messages.Error_reload, again);
    }

    private static String text(ModelFileException failure) {
        String name = Path.of(failure.file()).getFileName().toString();
        String place = failure.line() > 0 ? NLS.bind(Messages.Error_place, failure.line(), failure.column()) + " " : "";
        return NLS.bind(Messages.Error_file, name) + "\n\n" + place + failure.reason() + "\n\n" + failure.remedy();
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
