package org.modewright.model;

import java.util.List;
import java.util.function.ToDoubleFunction;

import org.modewright.model.structure.Node;
import org.modewright.model.structure.Vector;

/** Points and arms of a structure as arrays of three, in the length unit of the model. */
public final class Geometry {

    private Geometry() {
    }

    /** Where a node is. */
    public static double[] position(Node node) {
        return new double[] {node.getX(), node.getY(), node.getZ()};
    }

    /** The end of a member at a node; the offset may be null. */
    public static double[] end(Node node, Vector offset) {
        double[] p = position(node);
        return offset == null ? p : new double[] {p[0] + offset.getX(), p[1] + offset.getY(), p[2] + offset.getZ()};
    }

    /** Largest coordinate by amount. */
    static double largest(double[] p) {
        return Math.max(Math.abs(p[0]), Math.max(Math.abs(p[1]), Math.abs(p[2])));
    }

    /** |a - b|. */
    public static double distance(double[] a, double[] b) {
        return norm(minus(a, b));
    }

    /** From b to a. */
    public static double[] minus(double[] a, double[] b) {
        return new double[] {a[0] - b[0], a[1] - b[1], a[2] - b[2]};
    }

    /** a &times; b. */
    public static double[] cross(double[] a, double[] b) {
        return new double[] {a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]};
    }

    /** a &middot; b. */
    public static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    /** |a|. */
    public static double norm(double[] a) {
        return Math.sqrt(dot(a, a));
    }

    /** Diagonal of the box around the points; 0 for none. */
    static double size(List<double[]> points) {
        if (points.isEmpty()) {
            return 0;
        }
        double[] low = points.get(0).clone();
        double[] high = points.get(0).clone();
        for (double[] p : points) {
            for (int i = 0; i < 3; i++) {
                low[i] = Math.min(low[i], p[i]);
                high[i] = Math.max(high[i], p[i]);
            }
        }
        return distance(low, high);
    }

    /** The point with the largest measure; the first of several. */
    static double[] farthest(List<double[]> points, ToDoubleFunction<double[]> measure) {
        double[] best = points.get(0);
        for (double[] p : points) {
            best = measure.applyAsDouble(p) > measure.applyAsDouble(best) ? p : best;
        }
        return best;
    }
}
