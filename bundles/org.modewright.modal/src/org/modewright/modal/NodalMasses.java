package org.modewright.modal;

import java.util.List;
import org.modewright.fem.Assembly;
import org.modewright.fem.Carrier;

/** Translational mass by node, kg: every carrier's mass in equal parts at its nodes. Weights for mean motions, nothing else. */
final class NodalMasses {

    private final double[][] mass = new double[3][];

    NodalMasses(Assembly assembly) {
        int nodes = assembly.snapshot().nodes().size();
        for (int component = 0; component < 3; component++) {
            double[] uniform = new double[6 * nodes];
            for (int node = 0; node < nodes; node++) {
                uniform[6 * node + component] = 1;
            }
            mass[component] = spread(assembly.carriers(), assembly.kineticEnergies(uniform), nodes);
        }
    }

    private static double[] spread(List<Carrier> carriers, double[] carried, int nodes) {
        double[] spread = new double[nodes];
        for (int i = 0; i < carried.length; i++) {
            int[] ends = carriers.get(i).nodes();
            for (int node : ends) {
                spread[node] += carried[i] / ends.length;
            }
        }
        return spread;
    }

    double along(int component, int node) {
        return mass[component][node];
    }
}
