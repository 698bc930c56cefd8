package org.modewright.fem;

/**
 * A homogeneous linear constraint: the sum of factor times component is zero, translations in m and rotations in rad.
 *
 * @param id stable id in the model
 * @param name name for people
 * @param nodes index of the node of each term; not to be written to
 * @param components component 0 to 5 of each term; not to be written to
 * @param factors factor of each term; not to be written to
 */
public record LinearTie(String id, String name, int[] nodes, int[] components, double[] factors) {
}
