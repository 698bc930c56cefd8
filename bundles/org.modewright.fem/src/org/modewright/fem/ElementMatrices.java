package org.modewright.fem;

/**
 * Matrices of an element over the six components of each of its nodes, in the order of its nodes, global axes, SI units. Each is the
 * lower triangle by rows: entry (i, j), j &le; i, at i(i+1)/2 + j, for order 6 times the number of nodes.
 *
 * @param stiffness elastic and geometric stiffness; not to be written to
 * @param mass mass; empty if the element has none; not to be written to
 */
public record ElementMatrices(double[] stiffness, double[] mass) {

    /** Length of the lower triangle of a matrix. */
    public static int packedLength(int order) {
        return order * (order + 1) / 2;
    }

    /** Whether the element has mass. */
    public boolean hasMass() {
        return mass.length > 0;
    }
}
