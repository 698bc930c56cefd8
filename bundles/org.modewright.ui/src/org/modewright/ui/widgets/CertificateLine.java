package org.modewright.ui.widgets;

import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.modewright.audit.AuditResult;
import org.modewright.ui.AuditSession;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Messages;

/** The certificate of the last run: the one line that a reviewer reads. Follows the session until it is disposed. */
public final class CertificateLine extends Composite {

    private final LocalResourceManager images = new LocalResourceManager(JFaceResources.getResources(), this);
    private final AuditSession session;
    private final Label sign;
    private final Label text;

    public CertificateLine(Composite parent, AuditSession session) {
        super(parent, SWT.NONE);
        this.session = session;
        GridLayout layout = new GridLayout(2, false);
        layout.marginHeight = 0;
        layout.marginWidth = 8;
        setLayout(layout);
        sign = new Label(this, SWT.NONE);
        GridData signData = new GridData(SWT.LEFT, SWT.CENTER, false, true);
        signData.widthHint = 16;
        sign.setLayoutData(signData);
        text = new Label(this, SWT.NONE);
        text.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, true));
        text.setData(UiIds.WIDGET_ID, "certificate");
        AuditSession.Listener listener = this::changed;
        session.addListener(listener);
        addListener(SWT.Dispose, event -> session.removeListener(listener));
        refresh();
    }

    private void changed(Change change) {
        if (change != Change.SELECTION && !isDisposed()) {
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
