package org.modewright.render;

/**
 * The colours of a drawing, 0xAARRGGBB.
 *
 * @param member  members drawn as lines
 * @param section members drawn with their sections
 * @param ghost   the structure at rest behind a moving one
 * @param panel   triangles
 */
public record Theme(int backgroundTop, int backgroundBottom, int member, int section, int ghost, int panel, int node, int support,
    int text, int selection, int hover) {

    /** For light workbenches and for paper. */
    public static Theme light() {
        return new Theme(0xFFFCFDFD, 0xFFE6EBEF, 0xFF3A4856, 0xFFA9B8C5, 0xFFC3CCD4, 0xFFB9C7D1, 0xFF27323D, 0xFF5D6B78,
            0xFF3A4856, 0xFF1AA3E8, 0xFF8FD0F4);
    }

    /** For dark workbenches. */
    public static Theme dark() {
        return new Theme(0xFF262C33, 0xFF14181C, 0xFFC4CFD9, 0xFF8C9CAA, 0xFF47525D, 0xFF56646F, 0xFFE3EAF0, 0xFF93A1AE,
            0xFFD3DCE4, 0xFF1AA3E8, 0xFF1D6A93);
    }

    /** The same theme on one plain background colour. */
    public Theme withBackground(int argb) {
        return new Theme(argb, argb, member, section, ghost, panel, node, support, text, selection, hover);
    }

    /** The same theme with another colour of what is selected. */
    public Theme withSelection(int argb) {
        return new Theme(backgroundTop, backgroundBottom, member, section, ghost, panel, node, support, text, argb, hover);
    }

    /** The background's colour in the middle of the picture. */
    public int backgroundMiddle() {
        return Argb.mix(backgroundTop, backgroundBottom, 0.5);
    }
}
