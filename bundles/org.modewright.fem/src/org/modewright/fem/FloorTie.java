package org.modewright.fem;

/**
 * Nodes that move as a rigid body in their plane.
 *
 * @param id stable id in the model
 * @param name name for people
 * @param nodes indices of the nodes, two or more; not to be written to
 */
public record FloorTie(String id, String name, int[] nodes) {
}
