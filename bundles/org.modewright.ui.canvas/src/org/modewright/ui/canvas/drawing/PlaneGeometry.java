package org.modewright.ui.canvas.drawing;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.modewright.model.structure.Node;

/** Nodes of a floor seen in their plane. */
final class PlaneGeometry {

    private static final double FLAT = 1e-9;

    /** A node with its coordinates in the plane. */
    record Point(Node node, double u, double v) {
    }

    private PlaneGeometry() {
    }

    /** The nodes in their plane; empty where they span none. */
    static Map<Node, Point> flatten(List<Node> nodes) {
        if (nodes.size() < 3) {
            return Map.of();
        }
        double[] origin = position(nodes.get(0));
        double[] along = farthest(nodes, origin, null);
        double reach = norm(along);
        if (!(reach > 0)) {
            return Map.of();
        }
        scale(along, 1 / reach);
        double[] across = farthest(nodes, origin, along);
        double width = norm(across);
        if (!(width > FLAT * reach)) {
            return Map.of();
        }
        scale(across, 1 / width);
        Map<Node, Point> flat = new HashMap<>();
        for (Node node : nodes) {
            double[] from = minus(position(node), origin);
            flat.put(node, new Point(node, dot(from, along), dot(from, across)));
        }
        return flat;
    }

    /** The convex hull, counter-clockwise: A. M. Andrew's monotone chain, Information Processing Letters 9 (1979) 216-219. */
    static List<Point> hull(Map<Node, Point> flat) {
        List<Point> sorted = new ArrayList<>(flat.values());
        sorted.sort(Comparator.comparingDouble(Point::u).thenComparingDouble(Point::v));
        List<Point> hull = new ArrayList<>(chain(sorted));
        Collections.reverse(sorted);
        hull.addAll(chain(sorted));
        return hull;
    }

    /** One half of the hull without its last point. */
    private static List<Point> chain(List<Point> sorted) {
        List<Point> chain = new ArrayList<>();
        for (Point point : sorted) {
            while (chain.size() > 1 && turn(chain.get(chain.size() - 2), chain.get(chain.size() - 1), point) <= 0) {
                chain.remove(chain.size() - 1);
            }
            chain.add(point);
        }
        return chain.subList(0, chain.size() - 1);
    }

    private static double turn(Point a, Point b, Point c) {
        return (b.u - a.u) * (c.v - a.v) - (b.v - a.v) * (c.u - a.u);
    }

    /** Angle from the way back to the way on, counter-clockwise, above 0 and at most a full turn. */
    static double angle(Point from, Point at, Point to) {
        double back = Math.atan2(from.v - at.v, from.u - at.u);
        double on = Math.atan2(to.v - at.v, to.u - at.u);
        double angle = on - back;
        return angle > FLAT ? angle : angle + 2 * Math.PI;
    }

    /** The longest vector from the origin to a node, or the longest part of one that is square to an axis. */
    private static double[] farthest(List<Node> nodes, double[] origin, double[] axis) {
        double[] best = new double[3];
        for (Node node : nodes) {
            double[] from = minus(position(node), origin);
            if (axis != null) {
                double part = dot(from, axis);
                from = new double[] {from[0] - part * axis[0], from[1] - part * axis[1], from[2] - part * axis[2]};
            }
            if (norm(from) > norm(best)) {
                best = from;
            }
        }
        return best;
    }

    static double[] position(Node node) {
        return new double[] {node.getX(), node.getY(), node.getZ()};
    }

    private static double[] minus(double[] a, double[] b) {
        return new double[] {a[0] - b[0], a[1] - b[1], a[2] - b[2]};
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    private static double norm(double[] a) {
        return Math.sqrt(dot(a, a));
    }

    private static void scale(double[] a, double by) {
        for (int i = 0; i < a.length; i++) {
            a[i] *= by;
        }
    }
}
