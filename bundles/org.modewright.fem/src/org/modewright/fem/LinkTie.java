package org.modewright.fem;

/**
 * A node that follows another as a rigid body.
 *
 * @param id stable id in the model
 * @param name name for people
 * @param from index of the leading node
 * @param to index of the following node
 * @param tied which of the six components of the following node are tied; length 6, not to be written to
 */
public record LinkTie(String id, String name, int from, int to, boolean[] tied) {
}
