package org.modewright.audit.detect;

import org.modewright.fem.LoadMass;
import org.modewright.fem.PointMass;
import org.modewright.fem.Snapshot;

/** Mass given at nodes or made from gravity loads, by node, kg: the largest of the three directions. */
final class HeldMasses {

    private final double[] mass;

    HeldMasses(Snapshot snapshot) {
        mass = new double[snapshot.nodes().size()];
        for (PointMass point : snapshot.pointMasses()) {
            double[] given = point.translational();
            mass[point.node()] += Math.max(given[0], Math.max(given[1], given[2]));
        }
        for (LoadMass load : snapshot.loadMasses()) {
            for (int i = 0; i < load.nodes().length; i++) {
                mass[load.nodes()[i]] += load.mass()[i];
            }
        }
    }

    double at(int node) {
        return mass[node];
    }
}
