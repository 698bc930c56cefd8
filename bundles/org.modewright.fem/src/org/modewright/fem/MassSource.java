package org.modewright.fem;

/**
 * The part of the mass that comes from one source.
 *
 * @param name "self" for the elements' own mass, "nodal masses", or the name of a gravity load pattern
 * @param movable mass that moves in x, y, z, kg; length 3
 * @param onSupports mass that the supports hold in x, y, z, kg; length 3
 */
public record MassSource(String name, double[] movable, double[] onSupports) {
}
