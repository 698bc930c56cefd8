package org.modewright.fem;

/**
 * A motion that has neither stiffness nor mass and is left out of the matrices.
 *
 * @param node index of the node whose component stands for it
 * @param component that component, 0 to 5
 * @param nodes indices of all nodes that move in it, ascending; not to be written to
 */
public record DroppedMotion(int node, int component, int[] nodes) {
}
