package org.modewright.fem;

/**
 * A node.
 *
 * @param id stable id in the model
 * @param name name for people
 * @param x coordinate, m
 * @param y coordinate, m
 * @param z height, m
 */
public record NodePoint(String id, String name, double x, double y, double z) {

    /** The coordinates x, y, z in m, a new array. */
    public double[] position() {
        return new double[] {x, y, z};
    }
}
