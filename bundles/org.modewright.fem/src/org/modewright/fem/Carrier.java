package org.modewright.fem;

/**
 * Something that carries strain or kinetic energy.
 *
 * @param kind what it is
 * @param id id in the model: of the element, of the support for an elastic support, of the node for mass at a node
 * @param name name for people
 * @param nodes indices of its nodes; not to be written to
 * @param group name of its group; null without
 * @param section name of its section; null without
 * @param material name of its material; null without
 * @param level name of its level: the lowest level at or above its highest node, the highest level if it stands above all;
 *            null without levels
 */
public record Carrier(Kind kind, String id, String name, int[] nodes, String group, String section, String material, String level) {
}
