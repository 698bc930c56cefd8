package org.modewright.fem.internal;

import java.util.Arrays;
import java.util.List;

import org.modewright.fem.NodePoint;
import org.modewright.fem.NodeSets;

/**
 * Makes the factors of translations and rotations in constraints comparable: within each set of nodes that constraints join, a
 * rotation is measured by what it moves at a distance of the size of the set.
 */
final class ConstraintScale {

    private final List<NodePoint> nodes;
    private final NodeSets sets;

    ConstraintScale(List<NodePoint> nodes, List<int[]> unknowns, List<double[]> factors) {
        this.nodes = nodes;
        this.sets = new NodeSets(nodes.size());
        for (int row = 0; row < unknowns.size(); row++) {
            join(unknowns.get(row), factors.get(row));
        }
    }

    private void join(int[] terms, double[] values) {
        int first = -1;
        for (int i = 0; i < terms.length; i++) {
            if (values[i] != 0.0) {
                first = first < 0 ? terms[i] / 6 : first;
                sets.join(first, terms[i] / 6);
            }
        }
    }

    /** For each unknown the factor that turns it into a scaled one: 1 for translations, a length in m for rotations. */
    double[] ofUnknowns() {
        double[] size = sizes();
        double[] scale = new double[6 * nodes.size()];
        Arrays.fill(scale, 1.0);
        for (int node = 0; node < nodes.size(); node++) {
            double length = size[sets.find(node)];
            Arrays.fill(scale, 6 * node + 3, 6 * node + 6, length > 0.0 ? length : 1.0);
        }
        return scale;
    }

    private double[] sizes() {
        double[][] low = new double[nodes.size()][];
        double[][] high = new double[nodes.size()][];
        for (int node = 0; node < nodes.size(); node++) {
            int set = sets.find(node);
            double[] position = nodes.get(node).position();
            if (low[set] == null) {
                low[set] = position.clone();
                high[set] = position.clone();
            }
            for (int i = 0; i < 3; i++) {
                low[set][i] = Math.min(low[set][i], position[i]);
                high[set][i] = Math.max(high[set][i], position[i]);
            }
        }
        double[] size = new double[nodes.size()];
        for (int set = 0; set < size.length; set++) {
            if (low[set] != null) {
                double[] diagonal = FloorPlane.minus(high[set], low[set]);
                size[set] = Math.sqrt(FloorPlane.dot(diagonal, diagonal));
            }
        }
        return size;
    }
}
