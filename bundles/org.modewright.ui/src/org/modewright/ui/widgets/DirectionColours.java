package org.modewright.ui.widgets;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.modewright.modal.Direction;

/**
 * One colour a direction, in plots, tables and axes alike: blue, orange and green of the palette for colour-blind readers by M. Okabe
 * and K. Ito, "Color Universal Design" (2008). Rotations take the colour of their axis and a dashed line.
 */
public final class DirectionColours {

    private static final Color X = new Color(0x00, 0x72, 0xB2);
    private static final Color Y = new Color(0xE6, 0x9F, 0x00);
    private static final Color Z = new Color(0x00, 0x9E, 0x73);

    private DirectionColours() {
    }

    /** The colour of a direction; a colour of this kind needs no disposal. */
    public static Color of(Direction direction) {
        return switch (direction) {
            case X, RX -> X;
            case Y, RY -> Y;
            case Z, RZ -> Z;
        };
    }

    /** The line of a direction: solid for translations, dashed for rotations. */
    public static int lineStyle(Direction direction) {
        return direction.isTranslation() ? SWT.LINE_SOLID : SWT.LINE_DASH;
    }
}
