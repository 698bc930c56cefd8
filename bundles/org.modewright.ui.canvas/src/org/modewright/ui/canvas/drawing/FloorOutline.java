package org.modewright.ui.canvas.drawing;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import org.modewright.model.structure.Node;

/**
 * The outline of a rigid floor: the convex hull of its nodes in their plane, drawn a little inside, so that it is seen beside the beams
 * along the edge. The inset points are weighted means of the nodes and move as such.
 */
final class FloorOutline {

    private static final double INSET = 0.05;
    private static final double FLAT = 1e-9;

    private final List<Node> corners;

    private FloorOutline(List<Node> corners) {
        this.corners = corners;
    }

    /** The outline of some nodes; one of fewer than three corners where the nodes span no plane. */
    static FloorOutline of(List<Node> nodes) {
        return new FloorOutline(hull(nodes));
    }

    /** The nodes at the corners, in order round the floor. */
    List<Node> corners() {
        return corners;
    }

    boolean isDrawn() {
        return corners.size() > 2;
    }

    /** The closed line: x, y, z of each inset corner, the first once more at the end. */
    double[] line() {
        double[] at = new double[3 * corners.size()];
        for (int i = 0; i < corners.size(); i++) {
            System.arraycopy(position(corners.get(i)), 0, at, 3 * i, 3);
        }
        return inset(at);
    }

    /** Closed line of the inset corners for values x, y, z at the corners, be they places or displacements. */
    static double[] inset(double[] atCorners) {
        int count = atCorners.length / 3;
        double[] mean = new double[3];
        for (int i = 0; i < atCorners.length; i++) {
            mean[i % 3] += atCorners[i] / count;
        }
        double[] line = new double[atCorners.length + 3];
        for (int i = 0; i < line.length; i++) {
            line[i] = (1 - INSET) * atCorners[i % atCorners.length] + INSET * mean[i % 3];
        }
        return line;
    }

    private record Flat(Node node, double u, double v) {
    }

    /** Andrew's monotone chain in the plane of the nodes (A. M. Andrew, Information Processing Letters 9 (1979) 216-219). */
    private static List<Node> hull(List<Node> nodes) {
        List<Flat> flat = flatten(nodes);
        if (flat.size() < 3) {
            return List.of();
        }
        flat.sort(Comparator.comparingDouble(Flat::u).thenComparingDouble(Flat::v));
        List<Flat> hull = new ArrayList<>(chain(flat));
        List<Flat> reversed = new ArrayList<>(flat);
        Collections.reverse(reversed);
        hull.addAll(chain(reversed));
        return hull.stream().map(Flat::node).toList();
    }

    /** One half of the hull without its last point. */
    private static List<Flat> chain(List<Flat> sorted) {
        List<Flat> chain = new ArrayList<>();
        for (Flat point : sorted) {
            while (chain.size() > 1 && turn(chain.get(chain.size() - 2), chain.get(chain.size() - 1), point) <= 0) {
                chain.remove(chain.size() - 1);
            }
            chain.add(point);
        }
        return chain.subList(0, chain.size() - 1);
    }

    private static double turn(Flat a, Flat b, Flat c) {
        return (b.u - a.u) * (c.v - a.v) - (b.v - a.v) * (c.u - a.u);
    }

    /** Places in the plane of the nodes; none where they span no plane. */
    private static List<Flat> flatten(List<Node> nodes) {
        if (nodes.size() < 3) {
            return List.of();
        }
        double[] origin = position(nodes.get(0));
        double[] along = farthest(nodes, origin, null);
        double reach = norm(along);
        if (!(reach > 0)) {
            return List.of();
        }
        scale(along, 1 / reach);
        double[] across = farthest(nodes, origin, along);
        double width = norm(across);
        if (!(width > FLAT * reach)) {
            return List.of();
        }
        scale(across, 1 / width);
        List<Flat> flat = new ArrayList<>();
        for (Node node : nodes) {
            double[] from = minus(position(node), origin);
            flat.add(new Flat(node, dot(from, along), dot(from, across)));
        }
        return flat;
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

    private static double[] position(Node node) {
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
