package org.modewright.ui.widgets;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.modewright.ui.UiIds;

/** What an empty view shows: one sentence that says what to do and a link that does it, in the middle of the view. */
public final class EmptyState extends Composite {

    private static final int WIDTH = 320;

    private final Label sentence;
    private final Link link;
    private Runnable action;

    public EmptyState(Composite parent) {
        super(parent, SWT.NONE);
        setLayout(new GridLayout());
        setData(UiIds.WIDGET_ID, "emptyState");
        Composite middle = new Composite(this, SWT.NONE);
        GridLayout layout = new GridLayout();
        layout.verticalSpacing = 8;
        middle.setLayout(layout);
        middle.setLayoutData(new GridData(SWT.CENTER, SWT.CENTER, true, true));
        sentence = new Label(middle, SWT.WRAP | SWT.CENTER);
        sentence.setLayoutData(centred());
        link = new Link(middle, SWT.NONE);
        link.setLayoutData(new GridData(SWT.CENTER, SWT.CENTER, true, false));
        link.setData(UiIds.WIDGET_ID, "emptyState.link");
        link.addListener(SWT.Selection, event -> act());
        addListener(SWT.Resize, event -> fit());
    }

    /**
     * Shows a message.
     *
     * @param text one sentence that says what is missing and what to do
     * @param linkText what the link does, as a verb; null: no link
     * @param whenClicked what the link does; null: no link
     */
    public void show(String text, String linkText, Runnable whenClicked) {
        boolean linked = linkText != null && whenClicked != null;
        String linkMarkup = linked ? "<a>" + linkText + "</a>" : "";
        action = linked ? whenClicked : null;
        if (text.equals(sentence.getText()) && linkMarkup.equals(link.getText())) {
            return;
        }
        sentence.setText(text);
        link.setText(linkMarkup);
        link.setVisible(linked);
        layout(true, true);
    }

    /** The sentence shown. */
    public String sentence() {
        return sentence.getText();
    }

    @Override
    public boolean setFocus() {
        return link.isVisible() ? link.setFocus() : super.setFocus();
    }

    private void act() {
        if (action != null) {
            action.run();
        }
    }

    private void fit() {
        int room = getClientArea().width - 24;
        GridData data = (GridData) sentence.getLayoutData();
        int width = Math.max(80, Math.min(WIDTH, room));
        if (data.widthHint != width) {
            data.widthHint = width;
            layout(true, true);
        }
    }

    private static GridData centred() {
        GridData data = new GridData(SWT.CENTER, SWT.CENTER, true, false);
        data.widthHint = WIDTH;
        return data;
    }
}
