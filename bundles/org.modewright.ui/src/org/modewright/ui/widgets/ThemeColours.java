package org.modewright.ui.widgets;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.widgets.Control;

/**
 * Colours that suit the theme a control stands in, taken from the control itself rather than from a fixed white. The colours need no
 * disposal.
 */
public final class ThemeColours {

    private static final double DARK_BELOW = 0.45;

    private ThemeColours() {
    }

    /** Whether the background of a control is dark. */
    public static boolean isDark(Control control) {
        return luminance(control.getBackground().getRGB()) < DARK_BELOW;
    }

    /** Text of less weight: notes, units, hints. */
    public static Color secondaryText(Control control) {
        return mix(control.getForeground(), control.getBackground(), 0.68);
    }

    /** Lines that separate and axes of plots. */
    public static Color rule(Control control) {
        return mix(control.getForeground(), control.getBackground(), 0.25);
    }

    /** A background that sets a surface off from its surroundings a little. */
    public static Color raised(Control control) {
        return mix(control.getForeground(), control.getBackground(), isDark(control) ? 0.08 : 0.035);
    }

    /** The outline of what is selected, the same in every view. */
    public static Color selection(Control control) {
        return isDark(control) ? new Color(0x3D, 0xB8, 0xFF) : new Color(0x00, 0x95, 0xE0);
    }

    /** Passed; always beside a sign and a word. */
    public static Color passed(Control control) {
        return isDark(control) ? new Color(0x5F, 0xD3, 0x8A) : new Color(0x1B, 0x7F, 0x3B);
    }

    /** Not passed; always beside a sign and a word. */
    public static Color failed(Control control) {
        return isDark(control) ? new Color(0xFF, 0x8A, 0x7A) : new Color(0xB3, 0x26, 0x1E);
    }

    /** Stale or to be looked at; always beside a sign and a word. */
    public static Color caution(Control control) {
        return isDark(control) ? new Color(0xF2, 0xC0, 0x5C) : new Color(0x8A, 0x5A, 0x00);
    }

    /** The colour of links that this product draws itself. */
    public static Color link(Control control) {
        Color platform = control.getDisplay().getSystemColor(SWT.COLOR_LINK_FOREGROUND);
        return isDark(control) ? new Color(0x7F, 0xB8, 0xF0) : platform;
    }

    /** Mixes two colours: {@code share} of the first, the rest of the second. */
    public static Color mix(Color first, Color second, double share) {
        return new Color(mix(first.getRed(), second.getRed(), share), mix(first.getGreen(), second.getGreen(), share),
                mix(first.getBlue(), second.getBlue(), share));
    }

    private static int mix(int first, int second, double share) {
        return (int) Math.round(first * share + second * (1 - share));
    }

    /** Relative luminance of ITU-R BT.709 without the gamma step, 0 to 1: enough to tell light from dark. */
    private static double luminance(RGB colour) {
        return (0.2126 * colour.red + 0.7152 * colour.green + 0.0722 * colour.blue) / 255;
    }
}
