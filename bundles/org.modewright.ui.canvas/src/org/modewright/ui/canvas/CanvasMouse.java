package org.modewright.ui.canvas;

import java.util.Set;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Event;

/** What the mouse does on a canvas: orbits, moves, zooms, picks and opens. */
final class CanvasMouse {

    private static final int DRAG_THRESHOLD = 4;
    private static final double ZOOM_STEP = 1.15;
    private static final int LINES_PER_NOTCH = 3;

    private enum Drag { NONE, PRESSED, ORBIT, MOVE, RECTANGLE }

    private final StructureCanvas canvas;
    private final StructureCanvas.Handler handler;
    private Drag drag = Drag.NONE;
    private boolean adds;
    private Point pressed;
    private Point last;

    CanvasMouse(StructureCanvas canvas, StructureCanvas.Handler handler) {
        this.canvas = canvas;
        this.handler = handler;
    }

    void listen() {
        canvas.addListener(SWT.MouseDown, this::down);
        canvas.addListener(SWT.MouseMove, this::move);
        canvas.addListener(SWT.MouseUp, this::up);
        canvas.addListener(SWT.MouseDoubleClick, this::doubleClick);
        canvas.addListener(SWT.MouseExit, event -> canvas.hoverNothing());
        canvas.addListener(SWT.MouseVerticalWheel, this::wheel);
    }

    private void down(Event event) {
        canvas.setFocus();
        if (event.button == 1 || event.button == 2) {
            drag = event.button == 2 ? Drag.MOVE : Drag.PRESSED;
            adds = (event.stateMask & SWT.MOD1) != 0;
            pressed = new Point(event.x, event.y);
            last = pressed;
        }
    }

    private void move(Event event) {
        if (drag == Drag.NONE) {
            canvas.hover(event.x, event.y);
            return;
        }
        if (drag == Drag.PRESSED) {
            if (Math.abs(event.x - pressed.x) + Math.abs(event.y - pressed.y) < DRAG_THRESHOLD) {
                return;
            }
            drag = (event.stateMask & SWT.SHIFT) != 0 ? Drag.MOVE : adds ? Drag.RECTANGLE : Drag.ORBIT;
            canvas.hoverNothing();
        }
        if (canvas.isLooking()) {
            dragTo(event);
        }
        last = new Point(event.x, event.y);
    }

    private void dragTo(Event event) {
        switch (drag) {
            case ORBIT -> canvas.orbitBy(event.x - last.x, event.y - last.y);
            case MOVE -> canvas.moveBy(event.x - last.x, event.y - last.y);
            default -> canvas.rubberBand(band(event));
        }
    }

    private Rectangle band(Event event) {
        return new Rectangle(Math.min(pressed.x, event.x), Math.min(pressed.y, event.y), Math.abs(event.x - pressed.x),
                Math.abs(event.y - pressed.y));
    }

    private void up(Event event) {
        Drag ended = drag;
        drag = Drag.NONE;
        if (ended == Drag.PRESSED && event.button == 1) {
            String id = canvas.idAt(event.x, event.y);
            handler.picked(id == null ? Set.of() : Set.of(id), adds);
        } else if (ended == Drag.RECTANGLE && canvas.isLooking()) {
            canvas.rubberBand(null);
            handler.picked(canvas.idsIn(band(event), event.x < pressed.x), true);
        }
    }

    private void doubleClick(Event event) {
        String id = canvas.idAt(event.x, event.y);
        if (id != null && event.button == 1) {
            handler.opened(id);
        }
    }

    private void wheel(Event event) {
        if (canvas.isLooking()) {
            canvas.zoom(Math.pow(ZOOM_STEP, event.count / (double) LINES_PER_NOTCH), event.x, event.y);
            event.doit = false;
        }
    }
}
