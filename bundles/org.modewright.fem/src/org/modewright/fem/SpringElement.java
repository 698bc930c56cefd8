package org.modewright.fem;

/**
 * A spring to ground or between two nodes; an elastic support is a spring to ground.
 *
 * @param id stable id in the model (of the support, for an elastic support)
 * @param name name for people
 * @param node index of the node
 * @param to index of the other node; -1 to ground
 * @param group name of its group; null without
 * @param stiffness symmetric 6 x 6 matrix by rows, global axes, N/m, N and N m/rad; length 36, not to be written to
 */
public record SpringElement(String id, String name, int node, int to, String group, double[] stiffness) implements StructuralElement {

    /** Index that stands for the ground. */
    public static final int GROUND = -1;

    /** Whether it holds its node to the ground. */
    public boolean isToGround() {
        return to == GROUND;
    }

    @Override
    public Kind kind() {
        return Kind.SPRING;
    }

    @Override
    public int[] nodes() {
        return isToGround() ? new int[] {node} : new int[] {node, to};
    }

    @Override
    public String section() {
        return null;
    }

    @Override
    public String material() {
        return null;
    }

    @Override
    public double ownMass() {
        return 0.0;
    }
}
