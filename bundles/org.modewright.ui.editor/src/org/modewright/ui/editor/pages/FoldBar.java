package org.modewright.ui.editor.pages;

import java.util.function.IntConsumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.widgets.ThemeColours;

/** The narrow bar between a page and its properties: a click, Enter or Space folds them away or brings them back, a drag widens them. */
final class FoldBar extends Canvas {

    /** Its width in pixels. */
    static final int WIDTH = 14;

    private static final int DRAG_THRESHOLD = 4;

    private final Runnable toggle;
    private final IntConsumer drag;
    private boolean open;
    private boolean hovered;
    private int pressedAt = -1;
    private boolean dragging;

    /**
     * @param toggle folds or brings back
     * @param drag gets where the bar's left edge is dragged to, in pixels of the parent
     */
    FoldBar(Composite parent, Runnable toggle, IntConsumer drag) {
        super(parent, SWT.DOUBLE_BUFFERED);
        this.toggle = toggle;
        this.drag = drag;
        setData(UiIds.WIDGET_ID, "editor.fold");
        addListener(SWT.Paint, event -> paint(event.gc));
        addListener(SWT.MouseEnter, event -> hover(true));
        addListener(SWT.MouseExit, event -> hover(false));
        addListener(SWT.MouseDown, this::pressed);
        addListener(SWT.MouseMove, this::moved);
        addListener(SWT.MouseUp, this::released);
        addListener(SWT.KeyDown, this::key);
        addListener(SWT.FocusIn, event -> redraw());
        addListener(SWT.FocusOut, event -> redraw());
        addListener(SWT.Traverse, event -> event.doit = event.detail != SWT.TRAVERSE_RETURN);
        getAccessible().addAccessibleListener(new AccessibleAdapter() {
            @Override
            public void getName(AccessibleEvent event) {
                event.result = getToolTipText();
            }
        });
    }

    /** Shows which way it folds. */
    void show(boolean isOpen) {
        open = isOpen;
        setToolTipText(open ? Messages.Fold_close : Messages.Fold_open);
        setCursor(getDisplay().getSystemCursor(open ? SWT.CURSOR_SIZEWE : SWT.CURSOR_HAND));
        redraw();
    }

    private void hover(boolean over) {
        hovered = over;
        redraw();
    }

    private void pressed(Event event) {
        if (event.button == 1) {
            pressedAt = event.x;
            dragging = false;
        }
    }

    private void moved(Event event) {
        if (pressedAt < 0 || !open) {
            return;
        }
        dragging |= Math.abs(event.x - pressedAt) >= DRAG_THRESHOLD;
        if (dragging) {
            drag.accept(getLocation().x + event.x - pressedAt);
        }
    }

    private void released(Event event) {
        boolean click = pressedAt >= 0 && !dragging;
        pressedAt = -1;
        if (click) {
            toggle.run();
        }
    }

    private void key(Event event) {
        if (event.keyCode == SWT.CR || event.character == ' ') {
            toggle.run();
        }
    }

    private void paint(GC gc) {
        Rectangle area = getClientArea();
        gc.setBackground(hovered || isFocusControl() ? ThemeColours.raised(this) : getBackground());
        gc.fillRectangle(area);
        gc.setForeground(ThemeColours.rule(this));
        gc.drawLine(0, 0, 0, area.height);
        gc.setAntialias(SWT.ON);
        gc.setLineWidth(2);
        gc.setForeground(isFocusControl() ? ThemeColours.link(this) : ThemeColours.secondaryText(this));
        Point middle = new Point(WIDTH / 2, area.height / 2);
        int towards = open ? 2 : -2;
        gc.drawPolyline(new int[] {middle.x - towards, middle.y - 4, middle.x + towards, middle.y, middle.x - towards, middle.y + 4});
    }
}
