package org.modewright.fem;

import java.util.List;

/**
 * Where the mass of a structure is. With &iota; the rigid-body vector of a direction on the free motions and M their mass matrix,
 * the movable mass is &iota;<sup>T</sup>M&iota;; the rest of the mass sits on supports.
 *
 * @param movable movable mass in x, y, z, kg; length 3
 * @param onSupports mass on supports in x, y, z, kg; length 3
 * @param centre centre of the movable mass, m; length 3
 * @param rotary rotary inertia of the movable mass about the axes through its centre, kg m<sup>2</sup>; length 3
 * @param sources the movable mass and the mass on supports by source
 * @param balance relative mismatch, over the three directions, between the mass that was put in and the mass in the matrices
 */
public record MassLedger(double[] movable, double[] onSupports, double[] centre, double[] rotary, List<MassSource> sources,
        double balance) {
}
