package org.modewright.ui.canvas.drawing;

import org.modewright.model.structure.FrameSection;

/** Outer sizes of the rectangle that stands for a section: the one with its area and second moments, kept within three to one. */
final class SectionSize {

    private static final double MOST = 3;

    private SectionSize() {
    }

    /** Size along local y, from I<sub>z</sub>; 0 for a section without area. */
    static double width(FrameSection section) {
        return section == null ? 0 : side(section.getIz(), section.getArea());
    }

    /** Size along local z, from I<sub>y</sub>; 0 for a section without area. */
    static double depth(FrameSection section) {
        return section == null ? 0 : side(section.getIy(), section.getArea());
    }

    private static double side(double secondMoment, double area) {
        if (!(area > 0)) {
            return 0;
        }
        double square = Math.sqrt(area);
        double side = secondMoment > 0 ? Math.sqrt(12 * secondMoment / area) : square;
        return Math.max(square / MOST, Math.min(MOST * square, side));
    }
}
