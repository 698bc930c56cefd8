package org.modewright.render;

/** How members with a section are drawn. */
public enum Thickness {
    /** Always as lines. */
    LINES,
    /** Always with their section's outer sizes. */
    SECTIONS,
    /** With their sections where these are wide enough on the screen to be seen, as lines elsewhere. */
    AUTOMATIC
}
