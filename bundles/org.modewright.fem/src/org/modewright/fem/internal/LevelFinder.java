package org.modewright.fem.internal;

import java.util.List;

import org.modewright.fem.LevelMark;
import org.modewright.fem.NodePoint;
import org.modewright.fem.Snapshot;

/** Finds the level of an element: the lowest level at or above its highest node, the highest level if it stands above all. */
final class LevelFinder {

    private static final double TOLERANCE = 1e-6;

    private final List<LevelMark> levels;
    private final List<NodePoint> nodes;
    private final double tolerance;

    LevelFinder(Snapshot snapshot) {
        levels = snapshot.levels();
        nodes = snapshot.nodes();
        double low = nodes.stream().mapToDouble(NodePoint::z).min().orElse(0.0);
        double high = nodes.stream().mapToDouble(NodePoint::z).max().orElse(0.0);
        tolerance = TOLERANCE * (high - low);
    }

    /** Name of the level; null without levels. */
    String of(int[] elementNodes) {
        if (levels.isEmpty()) {
            return null;
        }
        double top = Double.NEGATIVE_INFINITY;
        for (int node : elementNodes) {
            top = Math.max(top, nodes.get(node).z());
        }
        int low = 0;
        int high = levels.size() - 1;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (levels.get(middle).elevation() >= top - tolerance) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return levels.get(low).name();
    }
}
