package org.modewright.render;

/**
 * The views of a drawing set. Azimuth 0 and elevation 0 look along +Y with X to the right and Z up; a positive azimuth walks
 * the viewer counter-clockwise (seen from above), a positive elevation lifts the viewer. Angles in radians.
 */
public enum StandardView {
    /** From above, X right, Y up. */
    PLAN(0, 90),
    /** Elevation seen along +Y: X right, Z up. */
    ALONG_PLUS_Y(0, 0),
    /** Elevation seen along -Y: X left, Z up. */
    ALONG_MINUS_Y(180, 0),
    /** Elevation seen along +X: Y left, Z up. */
    ALONG_PLUS_X(-90, 0),
    /** Elevation seen along -X: Y right, Z up. */
    ALONG_MINUS_X(90, 0),
    /** From above and aside, all three axes visible. */
    AXONOMETRIC(32, 24);

    private final double azimuth;
    private final double elevation;

    StandardView(double azimuthDegrees, double elevationDegrees) {
        azimuth = Math.toRadians(azimuthDegrees);
        elevation = Math.toRadians(elevationDegrees);
    }

    public double azimuth() {
        return azimuth;
    }

    public double elevation() {
        return elevation;
    }
}
