package org.modewright.exchange.internal.tables;

import java.util.List;
import java.util.function.ToDoubleFunction;

import org.modewright.model.Geometry;
import org.modewright.model.structure.Node;

/** Whether the nodes of a floor lie in one plane: within 1e-6 of the floor's size. */
final class Coplanarity {

    private static final double TOLERANCE = 1e-6;

    private Coplanarity() {
    }

    /** Index of the node farthest from the plane of the widest triangle through the first node; -1 where all lie in it or span none. */
    static int firstOutside(List<Node> nodes) {
        double[] origin = Geometry.position(nodes.get(0));
        double[][] arms = nodes.stream().map(node -> Geometry.minus(Geometry.position(node), origin)).toArray(double[][]::new);
        double[] longest = arms[farthest(arms, Geometry::norm)];
        double[][] normals = new double[arms.length][];
        for (int i = 0; i < arms.length; i++) {
            normals[i] = Geometry.cross(longest, arms[i]);
        }
        double[] normal = normals[farthest(normals, Geometry::norm)];
        double size = Geometry.norm(longest);
        double area = Geometry.norm(normal);
        if (area <= TOLERANCE * size * size) {
            return -1;
        }
        int outside = farthest(arms, arm -> Math.abs(Geometry.dot(arm, normal)));
        return Math.abs(Geometry.dot(arms[outside], normal)) / area > TOLERANCE * size ? outside : -1;
    }

    private static int farthest(double[][] vectors, ToDoubleFunction<double[]> measure) {
        int best = 0;
        for (int i = 1; i < vectors.length; i++) {
            if (measure.applyAsDouble(vectors[i]) > measure.applyAsDouble(vectors[best])) {
                best = i;
            }
        }
        return best;
    }
}
