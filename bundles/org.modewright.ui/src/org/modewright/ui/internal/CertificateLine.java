package org.modewright.ui.internal;

import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.menus.WorkbenchWindowControlContribution;
import org.modewright.audit.AuditResult;
import org.modewright.ui.AuditSession;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.Images;

/** The certificate of the last run in the window's status line: the one line that a reviewer reads. */
public final class CertificateLine extends WorkbenchWindowControlContribution {

    private static final int WIDTH = 560;

    private final AuditSession.Listener listener = this::changed;
    private AuditSession session;
    private LocalResourceManager images;
    private Composite line;
    private Label sign;
    private Label text;

    @Override
    protected Control createControl(Composite parent) {
        line = new Composite(parent, SWT.NONE);
        images = new LocalResourceManager(JFaceResources.getResources(), line);
        GridLayout layout = new GridLayout(2, false);
        layout.marginHeight = 0;
        layout.marginWidth = 8;
        line.setLayout(layout);
        sign = new Label(line, SWT.NONE);
        GridData signData = new GridData(SWT.LEFT, SWT.CENTER, false, true);
        signData.widthHint = 16;
        sign.setLayoutData(signData);
        text = new Label(line, SWT.NONE);
        GridData data = new GridData(SWT.LEFT, SWT.CENTER, true, true);
        data.widthHint = WIDTH;
        text.setLayoutData(data);
        text.setData(UiIds.WIDGET_ID, "certificate");
        session = getWorkbenchWindow().getService(AuditSession.class);
        session.addListener(listener);
        line.addListener(SWT.Dispose, event -> session.removeListener(listener));
        refresh();
        return line;
    }

    private void changed(Change change) {
        if (change != Change.SELECTION && line != null && !line.isDisposed()) {
            refresh();
        }
    }

    private void refresh() {
        AuditResult result = session.result();
        String words = words(result);
        text.setText(words);
        text.setToolTipText(words);
        String icon = icon(result);
        sign.setImage(icon == null ? null : images.get(Images.descriptor(icon)));
    }

    private String words(AuditResult result) {
        if (session.isRunning()) {
            return Messages.CertificateLine_running;
        }
        if (result == null) {
            return session.modelFile() == null ? "" : Messages.CertificateLine_none;
        }
        String line = result.modal().certificate().line();
        return session.isStale() ? line + Messages.CertificateLine_stale : line;
    }

    private String icon(AuditResult result) {
        if (result == null || session.isRunning()) {
            return null;
        }
        if (session.isStale()) {
            return Images.WARNING;
        }
        return result.modal().certificate().complete() ? Images.PASSED : Images.FAILED;
    }
}
