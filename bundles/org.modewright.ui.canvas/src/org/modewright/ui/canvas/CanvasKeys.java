package org.modewright.ui.canvas;

import java.util.Set;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Event;
import org.modewright.render.StandardView;

/** What keys do on a canvas: arrows orbit, with Shift they move, + and &minus; zoom, Home fits, 0 to 3 give views, Escape picks nothing. */
final class CanvasKeys {

    private static final double ORBIT_STEP = Math.toRadians(5);
    private static final int MOVE_STEP = 24;
    private static final double ZOOM_STEP = 1.15;

    private final StructureCanvas canvas;
    private final StructureCanvas.Handler handler;

    CanvasKeys(StructureCanvas canvas, StructureCanvas.Handler handler) {
        this.canvas = canvas;
        this.handler = handler;
    }

    void press(Event event) {
        if (canvas.isLooking() && (navigate(event) || act(event.keyCode) || act(event.character))) {
            event.doit = false;
        }
    }

    private boolean navigate(Event event) {
        int x = event.keyCode == SWT.ARROW_LEFT ? -1 : event.keyCode == SWT.ARROW_RIGHT ? 1 : 0;
        int y = event.keyCode == SWT.ARROW_UP ? -1 : event.keyCode == SWT.ARROW_DOWN ? 1 : 0;
        if (x == 0 && y == 0) {
            return false;
        }
        if ((event.stateMask & SWT.SHIFT) != 0) {
            canvas.moveBy(x * MOVE_STEP, y * MOVE_STEP);
        } else {
            canvas.orbit(-x * ORBIT_STEP, y * ORBIT_STEP);
        }
        return true;
    }

    private boolean act(int keyCode) {
        switch (keyCode) {
            case SWT.HOME -> canvas.fit();
            case SWT.ESC -> handler.picked(Set.of(), false);
            case SWT.KEYPAD_ADD -> canvas.zoom(ZOOM_STEP);
            case SWT.KEYPAD_SUBTRACT -> canvas.zoom(1 / ZOOM_STEP);
            default -> {
                return false;
            }
        }
        return true;
    }

    private boolean act(char character) {
        switch (character) {
            case '+', '=' -> canvas.zoom(ZOOM_STEP);
            case '-' -> canvas.zoom(1 / ZOOM_STEP);
            case '0' -> canvas.view(StandardView.AXONOMETRIC);
            case '1' -> canvas.view(StandardView.ALONG_PLUS_Y);
            case '2' -> canvas.view(StandardView.ALONG_MINUS_X);
            case '3' -> canvas.view(StandardView.PLAN);
            default -> {
                return false;
            }
        }
        return true;
    }
}
