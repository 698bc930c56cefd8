package org.modewright.rcp;

import org.eclipse.jface.action.ContributionItem;
import org.eclipse.jface.action.StatusLineLayoutData;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.IWorkbenchWindow;
import org.modewright.ui.AuditSession;
import org.modewright.ui.widgets.CertificateLine;

/** The certificate of the last run in the status line. */
final class CertificateItem extends ContributionItem {

    private static final int WIDTH = 620;

    private final IWorkbenchWindow window;

    CertificateItem(IWorkbenchWindow window) {
        super("org.modewright.rcp.certificate");
        this.window = window;
    }

    @Override
    public void fill(Composite parent) {
        CertificateLine line = new CertificateLine(parent, window.getService(AuditSession.class));
        StatusLineLayoutData data = new StatusLineLayoutData();
        data.widthHint = WIDTH;
        data.heightHint = line.computeSize(SWT.DEFAULT, SWT.DEFAULT).y;
        line.setLayoutData(data);
    }
}
