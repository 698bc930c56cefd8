package org.modewright.ui.widgets;

import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Messages;

/** The first line of a view: its answer in one sentence, with a sign, and the mark of a stale result. */
public final class SentenceBar extends Composite {

    /** The sign before the sentence. */
    public enum Sign {
        NONE(null), PASSED(Images.PASSED), FAILED(Images.FAILED), NOT_JUDGED(Images.NOT_JUDGED), INFORMATION(Images.INFORMATION),
        WARNING(Images.WARNING), ERROR(Images.ERROR);

        private final String image;

        Sign(String image) {
            this.image = image;
        }
    }

    private final LocalResourceManager images = new LocalResourceManager(JFaceResources.getResources(), this);
    private final Label icon;
    private final Label sentence;
    private final Link stale;
    private Runnable runAgain;

    public SentenceBar(Composite parent) {
        super(parent, SWT.NONE);
        GridLayout layout = new GridLayout(3, false);
        layout.marginWidth = 8;
        layout.marginHeight = 4;
        layout.horizontalSpacing = 8;
        setLayout(layout);
        icon = new Label(this, SWT.NONE);
        icon.setLayoutData(new GridData(SWT.LEFT, SWT.TOP, false, false));
        sentence = new Label(this, SWT.WRAP);
        sentence.setLayoutData(wrapping());
        sentence.setData(UiIds.WIDGET_ID, "sentence");
        stale = new Link(this, SWT.NONE);
        stale.setLayoutData(new GridData(SWT.RIGHT, SWT.TOP, false, false));
        stale.setData(UiIds.WIDGET_ID, "stale");
        stale.setToolTipText(Messages.SentenceBar_staleTip);
        stale.addListener(SWT.Selection, event -> runAgain());
        show(Sign.NONE, "");
        setStale(false, null);
    }

    /** Shows a sentence with a sign. */
    public void show(Sign sign, String text) {
        Image image = sign.image == null ? null : images.get(Images.descriptor(sign.image));
        boolean same = text.equals(sentence.getText()) && image == icon.getImage();
        if (same) {
            return;
        }
        icon.setImage(image);
        include(icon, image != null);
        sentence.setText(text.replace("&", "&&"));
        sentence.setToolTipText(text);
        relayout();
    }

    /**
     * Marks the result as stale.
     *
     * @param isStale whether the model has changed since the run
     * @param again what the link "run again" does; may be null when not stale
     */
    public void setStale(boolean isStale, Runnable again) {
        runAgain = again;
        stale.setForeground(ThemeColours.caution(this));
        stale.setText(isStale ? Messages.SentenceBar_stale : "");
        include(stale, isStale);
        relayout();
    }

    /** What a click on the sentence does. */
    public void onClick(Runnable action) {
        sentence.setCursor(getDisplay().getSystemCursor(SWT.CURSOR_HAND));
        sentence.addListener(SWT.MouseUp, event -> action.run());
    }

    /** The sentence shown. */
    public String sentence() {
        return sentence.getText().replace("&&", "&");
    }

    /** Whether the mark of a stale result is shown. */
    public boolean isStale() {
        return ((GridData) stale.getLayoutData()).exclude == false;
    }

    private void runAgain() {
        if (runAgain != null) {
            runAgain.run();
        }
    }

    private void include(Control control, boolean included) {
        control.setVisible(included);
        ((GridData) control.getLayoutData()).exclude = !included;
    }

    /** The labels themselves are named, so that their sizes are measured anew. */
    private void relayout() {
        getShell().layout(new Control[] {icon, sentence, stale}, SWT.DEFER);
    }

    private static GridData wrapping() {
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false);
        data.widthHint = 60;
        return data;
    }
}
