package org.modewright.ui.editor;

import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.CLabel;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.modewright.audit.Finding;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.Images;

/** One line above the pages: what the live checks say, in full in the tooltip. A click goes to the first object concerned. */
final class CheckLine {

    private static final String CUT = "…";

    private static final int ICON = 18;

    private final Composite bar;
    private final Label icon;
    private final EndCut line;
    private final Composite below;
    private final Checks checks;
    private final LocalResourceManager images;

    CheckLine(Composite parent, EditorContext context, Checks checks) {
        this.checks = checks;
        parent.setLayout(new FillLayout());
        Composite body = new Composite(parent, SWT.NONE);
        GridLayout layout = new GridLayout();
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 0;
        body.setLayout(layout);
        bar = new Composite(body, SWT.NONE);
        bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        GridLayout columns = new GridLayout(2, false);
        columns.marginHeight = 0;
        columns.horizontalSpacing = 0;
        bar.setLayout(columns);
        icon = new Label(bar, SWT.NONE);
        GridData place = new GridData(SWT.LEFT, SWT.CENTER, false, false);
        place.widthHint = ICON;
        icon.setLayoutData(place);
        line = new EndCut(bar);
        line.setData(UiIds.WIDGET_ID, "editor.checks");
        line.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        line.addListener(SWT.MouseUp, event -> goToFirst(context));
        images = new LocalResourceManager(JFaceResources.getResources(), bar);
        below = new Composite(body, SWT.NONE);
        below.setLayout(new FillLayout());
        below.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
    }

    /** Where the pages stand. */
    Composite below() {
        return below;
    }

    void show(boolean visible) {
        bar.setVisible(visible);
        ((GridData) bar.getLayoutData()).exclude = !visible;
        refresh();
        bar.requestLayout();
    }

    void refresh() {
        if (line.isDisposed()) {
            return;
        }
        String text = checks.line();
        if (!text.equals(line.full)) {
            line.full = text;
            line.setText(text.replace("&", "&&"));
            line.setToolTipText(checks.all().isEmpty() ? null : checks.all().get(0).text() + " " + checks.all().get(0).remedy());
        }
        String sign = sign();
        icon.setImage(sign == null ? null : images.get(Images.descriptor(sign)));
        line.setCursor(checks.all().isEmpty() ? null : line.getDisplay().getSystemCursor(SWT.CURSOR_HAND));
    }

    private String sign() {
        if (!checks.isDone()) {
            return null;
        }
        if (checks.all().isEmpty()) {
            return Images.PASSED;
        }
        return switch (checks.all().get(0).severity()) {
            case ERROR -> Images.ERROR;
            case WARNING -> Images.WARNING;
            case INFO -> Images.INFORMATION;
        };
    }

    private void goToFirst(EditorContext context) {
        for (Finding finding : checks.all()) {
            if (!finding.objects().isEmpty()) {
                context.goTo(finding);
                return;
            }
        }
    }

    /** Cuts its text at the end, as the sentence begins with what matters. */
    private static final class EndCut extends CLabel {

        private String full = "";

        EndCut(Composite parent) {
            super(parent, SWT.NONE);
        }

        @Override
        protected String shortenText(GC gc, String text, int width) {
            int room = width - gc.textExtent(CUT, SWT.DRAW_MNEMONIC).x;
            int low = 0;
            int high = text.length();
            while (low < high) {
                int middle = (low + high + 1) / 2;
                if (gc.textExtent(text.substring(0, middle), SWT.DRAW_MNEMONIC).x <= room) {
                    low = middle;
                } else {
                    high = middle - 1;
                }
            }
            return text.substring(0, low) + CUT;
        }
    }
}
