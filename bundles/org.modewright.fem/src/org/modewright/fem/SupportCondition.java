package org.modewright.fem;

/**
 * Components of a node that are held.
 *
 * @param id stable id in the model
 * @param name name for people
 * @param node index of the node
 * @param held which of the six components are held; length 6, not to be written to
 */
public record SupportCondition(String id, String name, int node, boolean[] held) {
}
