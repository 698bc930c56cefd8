package org.modewright.fem.internal;

import org.modewright.fem.ElementFormulation;
import org.modewright.fem.ElementMatrices;
import org.modewright.fem.NodePoint;
import org.modewright.fem.Snapshot;
import org.modewright.fem.SpringElement;
import org.modewright.fem.StructuralElement;

/**
 * Springs. A spring to ground acts on the motion of its node. A spring between two nodes acts on their relative motion at the
 * mid-point of the line between them, each node's motion carried there rigidly, so that a rigid-body motion of both costs nothing.
 */
public final class SpringFormulation implements ElementFormulation {

    private static final double[] GLOBAL = {1.0, 0.0, 0.0, 0.0, 1.0, 0.0, 0.0, 0.0, 1.0};

    @Override
    public boolean accepts(StructuralElement element) {
        return element instanceof SpringElement;
    }

    @Override
    public ElementMatrices matrices(StructuralElement element, Snapshot snapshot) {
        SpringElement spring = (SpringElement) element;
        if (spring.isToGround()) {
            return new ElementMatrices(PackedMatrix.pack(6, spring.stiffness()), new double[0]);
        }
        NodePoint first = snapshot.nodes().get(spring.node());
        NodePoint second = snapshot.nodes().get(spring.to());
        double[] arm = {0.5 * (second.x() - first.x()), 0.5 * (second.y() - first.y()), 0.5 * (second.z() - first.z())};
        double[] start = RigidArm.motion(GLOBAL, arm);
        double[] end = RigidArm.motion(GLOBAL, new double[] {-arm[0], -arm[1], -arm[2]});
        double[] opposite = new double[36];
        for (int i = 0; i < 36; i++) {
            opposite[i] = -end[i];
        }
        double[] matrix = new double[144];
        PackedMatrix.addProduct(matrix, 12, 0, 0, start, spring.stiffness(), start);
        PackedMatrix.addProduct(matrix, 12, 0, 6, start, spring.stiffness(), opposite);
        PackedMatrix.addProduct(matrix, 12, 6, 0, opposite, spring.stiffness(), start);
        PackedMatrix.addProduct(matrix, 12, 6, 6, opposite, spring.stiffness(), opposite);
        return new ElementMatrices(PackedMatrix.pack(12, matrix), new double[0]);
    }
}
