package org.modewright.ui.modes;

import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.widgets.Control;

/** Shortens text that has no room. */
final class TextFit {

    private static final String ELLIPSIS = "\u2026";

    private TextFit() {
    }

    /** The text of a cell in the font of its table, or as much of its beginning as fits with an ellipsis. */
    static String shortened(Control table, String text, int width) {
        GC gc = new GC(table);
        try {
            return shortened(gc, text, width);
        } finally {
            gc.dispose();
        }
    }

    /** The text, or as much of its beginning as fits with an ellipsis. */
    private static String shortened(GC gc, String text, int width) {
        if (gc.textExtent(text).x <= width) {
            return text;
        }
        int fits = 0;
        int tooLong = text.length();
        while (tooLong - fits > 1) {
            int middle = (fits + tooLong) / 2;
            if (gc.textExtent(text.substring(0, middle).stripTrailing() + ELLIPSIS).x <= width) {
                fits = middle;
            } else {
                tooLong = middle;
            }
        }
        return text.substring(0, fits).stripTrailing() + ELLIPSIS;
    }
}
