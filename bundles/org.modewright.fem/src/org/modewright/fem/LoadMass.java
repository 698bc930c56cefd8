package org.modewright.fem;

/**
 * Nodal mass made from the gravity loads of one pattern by the seismic mass rule.
 *
 * @param pattern name of the load pattern
 * @param nodes indices of the nodes, each once; not to be written to
 * @param mass mass in x, y and z at each of these nodes, kg; not to be written to
 * @param total mass of all loads of the pattern, summed load by load, kg
 */
public record LoadMass(String pattern, int[] nodes, double[] mass, double total) {
}
