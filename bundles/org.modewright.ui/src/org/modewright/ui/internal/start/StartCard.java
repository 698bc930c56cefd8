package org.modewright.ui.internal.start;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.ThemeColours;

/** One way to begin: an icon, a link and a line of explanation; a click anywhere on it does what the link does. */
final class StartCard extends Composite {

    private static final int WIDTH = 220;

    private final Runnable action;
    private boolean hovered;

    StartCard(Composite parent, Image icon, String title, String text, Runnable action) {
        super(parent, SWT.NONE);
        this.action = action;
        GridLayoutFactory.swtDefaults().numColumns(2).margins(12, 8).spacing(12, 4).applyTo(this);
        Label picture = new Label(this, SWT.NONE);
        picture.setImage(icon);
        GridDataFactory.swtDefaults().align(SWT.CENTER, SWT.CENTER).applyTo(picture);
        Link link = new Link(this, SWT.NONE);
        link.setText("<a>" + title + "</a>");
        link.setData(UiIds.WIDGET_ID, "start.link");
        link.addListener(SWT.Selection, event -> action.run());
        new Label(this, SWT.NONE);
        Label explanation = new Label(this, SWT.WRAP);
        explanation.setText(text);
        explanation.setForeground(ThemeColours.secondaryText(this));
        GridDataFactory.fillDefaults().grab(true, false).hint(WIDTH, SWT.DEFAULT).applyTo(explanation);
        setCursor(getDisplay().getSystemCursor(SWT.CURSOR_HAND));
        addListener(SWT.Paint, event -> outline(event.gc));
        listen(this);
        listen(picture);
        listen(explanation);
    }

    private void listen(Control control) {
        control.addListener(SWT.MouseUp, event -> action.run());
        control.addListener(SWT.MouseEnter, event -> hover(true));
        control.addListener(SWT.MouseExit, event -> hover(false));
    }

    private void hover(boolean over) {
        if (hovered != over) {
            hovered = over;
            redraw();
        }
    }

    private void outline(GC gc) {
        Point size = getSize();
        gc.setAntialias(SWT.ON);
        gc.setForeground(hovered ? ThemeColours.link(this) : ThemeColours.rule(this));
        gc.drawRoundRectangle(0, 0, size.x - 1, size.y - 1, 8, 8);
    }
}
