package org.modewright.audit.detect;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.modewright.audit.Finding;
import org.modewright.audit.Lengths;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.fem.LinearTie;
import org.modewright.fem.LinkTie;
import org.modewright.fem.NodePoint;
import org.modewright.fem.NodeSets;
import org.modewright.fem.Snapshot;
import org.modewright.fem.StructuralElement;
import org.modewright.modal.Figures;

/**
 * Nodes so near to each other that they were probably meant to be one, and that nothing joins. Joined are nodes that hang together through
 * rigid links, ties, or elements no longer than twice the limit; a common rigid floor joins nodes in its plane only and does not count.
 * Nodes are sorted into cubes as wide as the limit, so that only neighbouring cubes are searched.
 */
public final class NearlyCoincidentNodes {

    /** Id of the finding. */
    public static final String ID = "nodes-not-joined";

    private static final double SHARE_OF_SIZE = 1e-3;

    private final Snapshot snapshot;
    private final List<NodePoint> nodes;
    private final double limit;
    private final double[] origin;

    /**
     * In a model.
     *
     * @param coincidence the limit, m; 0: a thousandth of the diagonal of the model's bounding box
     */
    public NearlyCoincidentNodes(Snapshot snapshot, double coincidence) {
        this.snapshot = snapshot;
        nodes = snapshot.nodes();
        double[] low = {Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};
        double[] high = {Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY};
        for (NodePoint node : nodes) {
            double[] position = node.position();
            for (int i = 0; i < 3; i++) {
                low[i] = Math.min(low[i], position[i]);
                high[i] = Math.max(high[i], position[i]);
            }
        }
        origin = low;
        double diagonal = nodes.isEmpty() ? 0 : Math.sqrt(square(high[0] - low[0]) + square(high[1] - low[1]) + square(high[2] - low[2]));
        limit = coincidence > 0 ? coincidence : SHARE_OF_SIZE * diagonal;
    }

    /** One finding for each set of neighbouring nodes that nothing joins. */
    public List<Finding> find() {
        if (!(limit > 0)) {
            return List.of();
        }
        NodeSets joined = joined();
        NodeSets near = new NodeSets(nodes.size());
        for (int[] pair : neighbours()) {
            if (joined.find(pair[0]) != joined.find(pair[1])) {
                near.join(pair[0], pair[1]);
            }
        }
        Map<Integer, List<Integer>> clusters = new LinkedHashMap<>();
        for (int node = 0; node < nodes.size(); node++) {
            clusters.computeIfAbsent(near.find(node), key -> new ArrayList<>()).add(node);
        }
        return clusters.values().stream().filter(cluster -> cluster.size() > 1).map(this::finding).toList();
    }

    private NodeSets joined() {
        NodeSets joined = new NodeSets(nodes.size());
        for (StructuralElement element : snapshot.elements()) {
            int[] ends = element.nodes();
            for (int i = 1; i < ends.length; i++) {
                if (distance(ends[0], ends[i]) <= 2 * limit) {
                    joined.join(ends[0], ends[i]);
                }
            }
        }
        for (LinkTie link : snapshot.links()) {
            joined.join(link.from(), link.to());
        }
        for (LinearTie tie : snapshot.ties()) {
            IntStream.of(tie.nodes()).forEach(node -> joined.join(tie.nodes()[0], node));
        }
        return joined;
    }

    private List<int[]> neighbours() {
        Map<Cube, List<Integer>> cubes = new HashMap<>();
        List<int[]> pairs = new ArrayList<>();
        for (int node = 0; node < nodes.size(); node++) {
            Cube cube = cube(node);
            for (Cube neighbour : cube.around()) {
                for (int other : cubes.getOrDefault(neighbour, List.of())) {
                    if (distance(node, other) < limit) {
                        pairs.add(new int[] {other, node});
                    }
                }
            }
            cubes.computeIfAbsent(cube, key -> new ArrayList<>(2)).add(node);
        }
        return pairs;
    }

    private Cube cube(int node) {
        double[] position = nodes.get(node).position();
        return new Cube((long) ((position[0] - origin[0]) / limit), (long) ((position[1] - origin[1]) / limit),
                (long) ((position[2] - origin[2]) / limit));
    }

    private record Cube(long x, long y, long z) {

        List<Cube> around() {
            List<Cube> around = new ArrayList<>(27);
            for (long i = x - 1; i <= x + 1; i++) {
                for (long j = y - 1; j <= y + 1; j++) {
                    for (long k = z - 1; k <= z + 1; k++) {
                        around.add(new Cube(i, j, k));
                    }
                }
            }
            return around;
        }
    }

    private Finding finding(List<Integer> cluster) {
        List<ObjectRef> objects = cluster.stream().map(node -> Refs.node(nodes.get(node))).toList();
        double largest = 0;
        for (int a : cluster) {
            for (int b : cluster) {
                largest = Math.max(largest, distance(a, b));
            }
        }
        String names = Figures.list(cluster.stream().map(node -> nodes.get(node).name()).toList());
        String place = largest == 0 ? "lie at the same place" : "are only " + new Lengths(snapshot).of(largest) + " apart";
        return new Finding(ID, Severity.WARNING, objects, "Nodes " + names + " " + place
                + " and nothing joins them, so the structure has a gap there.",
                "Join the nodes if they were meant to be one; otherwise draw the element or the link between them.");
    }

    private double distance(int a, int b) {
        NodePoint p = nodes.get(a);
        NodePoint q = nodes.get(b);
        return Math.sqrt(square(p.x() - q.x()) + square(p.y() - q.y()) + square(p.z() - q.z()));
    }

    private static double square(double value) {
        return value * value;
    }
}
