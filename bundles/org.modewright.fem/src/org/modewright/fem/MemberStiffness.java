package org.modewright.fem;

/**
 * Stiffness properties of a frame member, effective-stiffness factors included.
 *
 * @param axial E A, N
 * @param shearY G A<sub>s,y</sub> of the local x-y plane, N; positive infinity: no shear deformation in this plane
 * @param shearZ G A<sub>s,z</sub> of the local x-z plane, N; positive infinity: no shear deformation in this plane
 * @param torsion G J, N m<sup>2</sup>
 * @param bendingY E I<sub>y</sub>, bending in the local x-z plane, N m<sup>2</sup>
 * @param bendingZ E I<sub>z</sub>, bending in the local x-y plane, N m<sup>2</sup>
 */
public record MemberStiffness(double axial, double shearY, double shearZ, double torsion, double bendingY, double bendingZ) {
}
