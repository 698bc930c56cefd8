package org.modewright.ui.modes;

import java.util.function.IntPredicate;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;

/** Draws the words of a table's columns with an ellipsis where they have no room; the items keep them whole. */
final class TextFit {

    private static final String ELLIPSIS = "\u2026";
    private static final int MARGIN = 4;

    private TextFit() {
    }

    /** Lets a table draw the words of some columns by this class. */
    static void install(Table table, IntPredicate columns) {
        table.addListener(SWT.EraseItem, event -> {
            if (columns.test(event.index)) {
                event.detail &= ~SWT.FOREGROUND;
            }
        });
        table.addListener(SWT.PaintItem, event -> {
            if (columns.test(event.index)) {
                paint(table, event);
            }
        });
    }

    private static void paint(Table table, Event event) {
        TableItem item = (TableItem) event.item;
        Rectangle cell = item.getBounds(event.index);
        int room = cell.width - 2 * MARGIN;
        String text = shortened(event.gc, item.getText(event.index), room);
        Point size = event.gc.textExtent(text);
        boolean centred = table.getColumn(event.index).getAlignment() == SWT.CENTER;
        event.gc.drawText(text, cell.x + MARGIN + (centred ? (room - size.x) / 2 : 0), cell.y + (cell.height - size.y) / 2, true);
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
