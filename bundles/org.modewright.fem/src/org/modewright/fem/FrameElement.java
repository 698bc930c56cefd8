package org.modewright.fem;

/**
 * A frame member or bar, in SI units. Its axis runs from the start node plus the start offset to the end node plus the end offset.
 *
 * @param id stable id in the model
 * @param name name for people
 * @param start index of the start node
 * @param end index of the end node
 * @param group name of its group; null without
 * @param section name of its section
 * @param material name of its material
 * @param length length between the offset ends, rigid zones included, m
 * @param axes the local axes x, y, z, one after the other, in global components; length 9, not to be written to
 * @param stiffness effective stiffnesses
 * @param inertia inertia per length
 * @param atStart how it meets the start node
 * @param atEnd how it meets the end node
 * @param axialOnly whether it is a bar
 * @param axialForce axial force for the geometric stiffness, tension positive, N
 * @param lumped whether its mass is lumped at its nodes
 */
public record FrameElement(String id, String name, int start, int end, String group, String section, String material, double length,
        double[] axes, MemberStiffness stiffness, MemberInertia inertia, MemberEnd atStart, MemberEnd atEnd, boolean axialOnly,
        double axialForce, boolean lumped) implements StructuralElement {

    @Override
    public Kind kind() {
        return Kind.MEMBER;
    }

    @Override
    public int[] nodes() {
        return new int[] {start, end};
    }

    /** Length between the rigid zones, m. */
    public double flexibleLength() {
        return length - atStart.rigidLength() - atEnd.rigidLength();
    }

    @Override
    public double ownMass() {
        return inertia.mass() * length;
    }
}
