package org.modewright.ui.canvas.drawing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.modewright.model.structure.Node;
import org.modewright.ui.canvas.drawing.PlaneGeometry.Point;

/**
 * The outline of a rigid floor: a walk along the outermost members between its nodes, so that recesses stay open, or the convex hull of
 * the nodes where members do not close a ring. It is drawn a little inside, so that it is seen beside the beams along the edge; the inset
 * points are weighted means of the corners and move as such.
 */
final class FloorOutline {

    private static final double INSET = 0.05;

    private final List<Node> corners;

    private FloorOutline(List<Node> corners) {
        this.corners = corners;
    }

    /**
     * The outline of some nodes.
     *
     * @param nodes nodes in one plane
     * @param joined the nodes that members join to a node
     */
    static FloorOutline of(List<Node> nodes, Map<Node, Set<Node>> joined) {
        Map<Node, Point> flat = PlaneGeometry.flatten(nodes);
        if (flat.isEmpty()) {
            return new FloorOutline(List.of());
        }
        List<Point> ring = walk(flat, joined);
        List<Point> outline = ring.isEmpty() ? PlaneGeometry.hull(flat) : ring;
        return new FloorOutline(outline.stream().map(Point::node).toList());
    }

    /**
     * Goes round counter-clockwise from the leftmost point, at each point along the member that turns most to the right. Empty where the
     * walk gets stuck or leaves corners of the floor outside.
     */
    private static List<Point> walk(Map<Node, Point> flat, Map<Node, Set<Node>> joined) {
        Point start = flat.values().stream().min(Comparator.comparingDouble(Point::u).thenComparingDouble(Point::v)).orElseThrow();
        Point from = new Point(null, start.u() - 1, start.v());
        List<Point> ring = new ArrayList<>();
        Point at = start;
        do {
            ring.add(at);
            Point next = next(from, at, flat, joined);
            if (next == null || ring.size() > 2 * flat.size()) {
                return List.of();
            }
            from = at;
            at = next;
        } while (at != start);
        return ring.containsAll(PlaneGeometry.hull(flat)) ? ring : List.of();
    }

    private static Point next(Point from, Point at, Map<Node, Point> flat, Map<Node, Set<Node>> joined) {
        return joined.getOrDefault(at.node(), Set.of()).stream().map(flat::get).filter(point -> point != null && point != at)
                .min(Comparator.comparingDouble(point -> PlaneGeometry.angle(from, at, point))).orElse(null);
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
            System.arraycopy(PlaneGeometry.position(corners.get(i)), 0, at, 3 * i, 3);
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
}
