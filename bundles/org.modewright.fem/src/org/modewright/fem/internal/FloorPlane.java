package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.List;

import org.modewright.fem.NodePoint;

/**
 * Finds the planes of rigid floors. Floors whose normals agree to the precision to which a floor is flat get one and the same
 * normal, and one that is so close to a global axis is taken along it; else two floors that overlap would tie more than they say.
 */
final class FloorPlane {

    /** Nodes that leave a line by less than this share of their spread do not span a plane. */
    private static final double COLLINEAR = 1e-6;
    /** A floor is flat to 1e-6 of its size; normals of floors that share a part may differ by a few times that. */
    private static final double SAME_NORMAL = 1e-5;

    private final List<double[]> normals = new ArrayList<>();

    FloorPlane() {
        normals.add(new double[] {0.0, 0.0, 1.0});
        normals.add(new double[] {1.0, 0.0, 0.0});
        normals.add(new double[] {0.0, 1.0, 0.0});
    }

    /** The unit normal of the plane through these nodes; vertical where they do not span a plane. */
    double[] normal(List<NodePoint> nodes, int[] floor) {
        double[] first = nodes.get(floor[0]).position();
        double[] far = farthest(nodes, floor, first);
        double spread = Math.sqrt(dot(far, far));
        double[] best = new double[3];
        for (int node : floor) {
            double[] across = cross(far, minus(nodes.get(node).position(), first));
            if (dot(across, across) > dot(best, best)) {
                best = across;
            }
        }
        double size = Math.sqrt(dot(best, best));
        if (size <= COLLINEAR * spread * spread) {
            return normals.get(0);
        }
        return known(new double[] {best[0] / size, best[1] / size, best[2] / size});
    }

    /** Two unit vectors in the plane, at right angles, along global axes where the normal is along one. */
    static double[][] inPlane(double[] normal) {
        int least = 0;
        for (int i = 1; i < 3; i++) {
            if (Math.abs(normal[i]) < Math.abs(normal[least])) {
                least = i;
            }
        }
        double[] axis = new double[3];
        axis[least] = 1.0;
        double along = dot(axis, normal);
        double[] first = new double[3];
        double size = Math.sqrt(1.0 - along * along);
        for (int i = 0; i < 3; i++) {
            first[i] = (axis[i] - along * normal[i]) / size;
        }
        return new double[][] {first, cross(normal, first)};
    }

    private double[] known(double[] normal) {
        for (double[] candidate : normals) {
            double[] across = cross(candidate, normal);
            if (dot(across, across) <= SAME_NORMAL * SAME_NORMAL) {
                return candidate;
            }
        }
        normals.add(normal);
        return normal;
    }

    private static double[] farthest(List<NodePoint> nodes, int[] floor, double[] from) {
        double[] farthest = new double[3];
        for (int node : floor) {
            double[] arm = minus(nodes.get(node).position(), from);
            if (dot(arm, arm) > dot(farthest, farthest)) {
                farthest = arm;
            }
        }
        return farthest;
    }

    static double[] minus(double[] a, double[] b) {
        return new double[] {a[0] - b[0], a[1] - b[1], a[2] - b[2]};
    }

    static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    static double[] cross(double[] a, double[] b) {
        return new double[] {a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]};
    }
}
