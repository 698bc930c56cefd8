package org.modewright.render;

/**
 * The colours of the directions, the same in plots, tables and axes: from the palette of Okabe and Ito (Color Universal Design, 2008),
 * which colour-blind readers can tell apart. Never use them as the only sign.
 */
public final class DirectionColours {

    public static final int X = 0xFF0072B2;
    public static final int Y = 0xFFE69F00;
    public static final int Z = 0xFF009E73;

    private DirectionColours() {
    }
}
