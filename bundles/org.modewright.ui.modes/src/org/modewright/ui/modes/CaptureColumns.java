package org.modewright.ui.modes;

import java.util.List;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Control;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalResult;
import org.modewright.ui.widgets.DirectionColours;
import org.modewright.ui.widgets.Numbers;
import org.modewright.ui.widgets.ThemeColours;

/** A column a direction beside the staircase: what the modes capture filled, what they miss hatched. */
final class CaptureColumns {

    private static final List<Direction> DIRECTIONS = List.of(Direction.X, Direction.Y, Direction.Z);
    private static final int WIDTH = 16;
    private static final int DISTANCE = 20;
    private static final int HATCH = 5;
    private static final int GAP = 4;

    private final Control plot;
    private final int indent;

    /**
     * @param plot gives the colours
     * @param indent points between the staircase and the columns
     */
    CaptureColumns(Control plot, int indent) {
        this.plot = plot;
        this.indent = indent;
    }

    /** Room that the columns take. */
    int width() {
        return DIRECTIONS.size() * (WIDTH + DISTANCE);
    }

    /** Paints the columns to the right of the staircase. */
    void paint(GC gc, Rectangle stairs, ModalResult modal) {
        int x = stairs.x + stairs.width + indent + DISTANCE / 2;
        for (Direction direction : DIRECTIONS) {
            paint(gc, new Rectangle(x, stairs.y, WIDTH, stairs.height), direction, modal);
            x += WIDTH + DISTANCE;
        }
    }

    private void paint(GC gc, Rectangle column, Direction direction, ModalResult modal) {
        boolean massive = modal.hasMass(direction);
        double captured = massive ? Math.max(0, Math.min(1, modal.capture(direction))) : 0;
        int filled = (int) Math.round(captured * column.height);
        gc.setBackground(DirectionColours.of(direction));
        gc.fillRectangle(column.x, column.y + column.height - filled, column.width, filled);
        gc.setForeground(DirectionColours.of(direction));
        if (massive) {
            hatch(gc, new Rectangle(column.x, column.y, column.width, column.height - filled));
            gc.drawRectangle(column);
        }
        int below = column.y + column.height + GAP;
        gc.setForeground(plot.getForeground());
        centred(gc, direction.name(), column, below);
        gc.setForeground(ThemeColours.secondaryText(plot));
        centred(gc, massive ? Numbers.percentNumber(captured) : "\u2013", column, below + gc.getFontMetrics().getHeight());
    }

    private static void centred(GC gc, String text, Rectangle column, int y) {
        gc.drawText(text, column.x + (column.width - gc.textExtent(text).x) / 2, y, true);
    }

    private static void hatch(GC gc, Rectangle box) {
        if (box.height <= 0) {
            return;
        }
        gc.setClipping(box);
        for (int offset = -box.height; offset < box.width; offset += HATCH) {
            gc.drawLine(box.x + offset, box.y + box.height, box.x + offset + box.height, box.y);
        }
        gc.setClipping((Rectangle) null);
    }
}
