/**
 * From a structural model to its stiffness and mass matrices over the free motions, and back from a vector of free motions to nodes
 * and elements. Everything is in SI units (m, N, kg, s, rad); conversion happens once, in {@link org.modewright.fem.Snapshot}.
 * The six components of a node are numbered 0 to 5: translations along x, y, z, then rotations about x, y, z.
 */
package org.modewright.fem;
