package org.modewright.exchange.internal.tables;

import java.util.List;

import org.modewright.model.structure.Node;

/** Whether the nodes of a floor lie in one plane: within 1e-6 of the floor's size. */
final class Coplanarity {

    private static final double TOLERANCE = 1e-6;

    private Coplanarity() {
    }

    /** Index of the node farthest from the plane of the widest triangle through the first node; -1 where all lie in it or span none. */
    static int firstOutside(List<Node> nodes) {
        double[] origin = point(nodes.get(0));
        double[][] arms = nodes.stream().map(node -> minus(point(node), origin)).toArray(double[][]::new);
        double[] longest = arms[farthest(arms, Coplanarity::norm)];
        double[][] normals = new double[arms.length][];
        for (int i = 0; i < arms.length; i++) {
            normals[i] = cross(longest, arms[i]);
        }
        double[] normal = normals[farthest(normals, Coplanarity::norm)];
        double size = norm(longest);
        double area = norm(normal);
        if (area <= TOLERANCE * size * size) {
            return -1;
        }
        int outside = farthest(arms, arm -> Math.abs(dot(arm, normal)));
        return Math.abs(dot(arms[outside], normal)) / area > TOLERANCE * size ? outside : -1;
    }

    private interface Measure {
        double of(double[] vector);
    }

    private static int farthest(double[][] vectors, Measure measure) {
        int best = 0;
        for (int i = 1; i < vectors.length; i++) {
            if (measure.of(vectors[i]) > measure.of(vectors[best])) {
                best = i;
            }
        }
        return best;
    }

    private static double[] point(Node node) {
        return new double[] {node.getX(), node.getY(), node.getZ()};
    }

    private static double[] minus(double[] a, double[] b) {
        return new double[] {a[0] - b[0], a[1] - b[1], a[2] - b[2]};
    }

    private static double[] cross(double[] a, double[] b) {
        return new double[] {a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]};
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    private static double norm(double[] a) {
        return Math.sqrt(dot(a, a));
    }
}
