package org.modewright.ui.editor;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.modewright.audit.Finding;
import org.modewright.audit.Severity;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.SentenceBar;
import org.modewright.ui.widgets.SentenceBar.Sign;

/** The line above the pages: what the live checks say. A click goes to the first object concerned. */
final class CheckLine {

    private final SentenceBar bar;
    private final Composite below;
    private final Checks checks;

    CheckLine(Composite parent, EditorContext context, Checks checks) {
        this.checks = checks;
        parent.setLayout(new FillLayout());
        Composite body = new Composite(parent, SWT.NONE);
        GridLayout layout = new GridLayout();
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 0;
        body.setLayout(layout);
        bar = new SentenceBar(body);
        bar.setData(UiIds.WIDGET_ID, "editor.checks");
        bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        below = new Composite(body, SWT.NONE);
        below.setLayout(new FillLayout());
        below.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        bar.onClick(() -> goToFirst(context));
    }

    /** Where the pages stand. */
    Composite below() {
        return below;
    }

    void show(boolean visible) {
        bar.setVisible(visible);
        ((GridData) bar.getLayoutData()).exclude = !visible;
        refresh();
    }

    void refresh() {
        if (!bar.isDisposed()) {
            bar.show(sign(), checks.line());
        }
    }

    private Sign sign() {
        if (checks.all().isEmpty()) {
            return Sign.NONE;
        }
        return switch (checks.all().get(0).severity()) {
            case ERROR -> Sign.ERROR;
            case WARNING -> Sign.WARNING;
            case INFO -> Sign.INFORMATION;
        };
    }

    private void goToFirst(EditorContext context) {
        for (Finding finding : checks.all()) {
            if (!finding.objects().isEmpty() && finding.severity() != Severity.INFO) {
                context.session().revealProperties(finding.objects().get(0).id());
                return;
            }
        }
    }
}
