package org.modewright.fem;

/**
 * A mass given at a node.
 *
 * @param id stable id in the model
 * @param name name for people
 * @param node index of the node
 * @param translational mass in x, y, z, kg; length 3, not to be written to
 * @param rotary rotary inertia about x, y, z through the centre of the mass, kg m<sup>2</sup>; length 3, not to be written to
 * @param offset from the node to the centre of the mass, global axes, m; length 3, not to be written to
 */
public record PointMass(String id, String name, int node, double[] translational, double[] rotary, double[] offset) {
}
