package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.List;

import org.modewright.fem.LoadMass;
import org.modewright.fem.PointMass;
import org.modewright.fem.Snapshot;

/**
 * Mass that sits at nodes, as 6 x 6 matrices packed by their lower triangle. A mass at an offset moves with its node as a rigid body:
 * with B the motion of its centre, the matrix is B<sup>T</sup> diag(m<sub>x</sub>, m<sub>y</sub>, m<sub>z</sub>, I<sub>x</sub>,
 * I<sub>y</sub>, I<sub>z</sub>) B, which holds the static moments.
 */
public final class NodalMasses {

    private static final double[] GLOBAL = {1.0, 0.0, 0.0, 0.0, 1.0, 0.0, 0.0, 0.0, 1.0};

    private final double[][] sum;
    private final List<Contribution> contributions = new ArrayList<>();

    /** Mass at a node from one source; sources are the load patterns in order, then the masses given at nodes. */
    record Contribution(int source, int node, double[] packed) {
    }

    /** Collects the masses of a structure. */
    public NodalMasses(Snapshot snapshot) {
        sum = new double[snapshot.nodes().size()][];
        int source = 0;
        for (LoadMass load : snapshot.loadMasses()) {
            for (int i = 0; i < load.nodes().length; i++) {
                add(new Contribution(source, load.nodes()[i], translational(load.mass()[i])));
            }
            source++;
        }
        for (PointMass mass : snapshot.pointMasses()) {
            add(new Contribution(source, mass.node(), matrix(mass)));
        }
    }

    private static double[] translational(double mass) {
        double[] packed = new double[21];
        packed[0] = mass;
        packed[2] = mass;
        packed[5] = mass;
        return packed;
    }

    private static double[] matrix(PointMass mass) {
        double[] inner = new double[36];
        for (int i = 0; i < 3; i++) {
            inner[7 * i] = mass.translational()[i];
            inner[7 * (i + 3)] = mass.rotary()[i];
        }
        double[] motion = RigidArm.motion(GLOBAL, mass.offset());
        double[] matrix = new double[36];
        PackedMatrix.addProduct(matrix, 6, 0, 0, motion, inner, motion);
        return PackedMatrix.pack(6, matrix);
    }

    private void add(Contribution contribution) {
        contributions.add(contribution);
        double[] packed = contribution.packed();
        if (sum[contribution.node()] == null) {
            sum[contribution.node()] = new double[21];
        }
        for (int i = 0; i < packed.length; i++) {
            sum[contribution.node()][i] += packed[i];
        }
    }

    /** The sum at a node; null where there is no mass. */
    double[] at(int node) {
        return sum[node];
    }

    List<Contribution> contributions() {
        return contributions;
    }
}
