package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.modewright.fem.LoadMass;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.fem.NodePoint;
import org.modewright.fem.PointMass;
import org.modewright.fem.Snapshot;
import org.modewright.fem.StructuralElement;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Keeps the books of the mass. Movable mass is &iota;<sup>T</sup>M&iota;. The centre of the movable mass is
 * z<sub>c</sub> = (&iota;<sub>x</sub><sup>T</sup>M&iota;<sub>ry</sub> - &iota;<sub>y</sub><sup>T</sup>M&iota;<sub>rx</sub>) /
 * (m<sub>x</sub> + m<sub>y</sub>) with rotations about the origin, x<sub>c</sub> and y<sub>c</sub> cyclically. The sums are made
 * about a point inside the structure and then carried over to the origin, so that nothing is lost far from it.
 */
public final class LedgerBuilder {

    private static final String SELF = "self";
    private static final String NODAL = "nodal masses";

    private final Snapshot snapshot;
    private final CarrierStore store;
    private final NodalMasses nodalMasses;
    private final Transformation transformation;
    private final SymmetricMatrix mass;
    private final RigidMotions rigid;
    private final double[] inside;
    private final List<String> names = new ArrayList<>();

    LedgerBuilder(Snapshot snapshot, CarrierStore store, NodalMasses nodalMasses, Transformation transformation, SymmetricMatrix mass,
            RigidMotions rigid) {
        this.snapshot = snapshot;
        this.store = store;
        this.nodalMasses = nodalMasses;
        this.transformation = transformation;
        this.mass = mass;
        this.rigid = rigid;
        this.inside = middle(snapshot.nodes());
        names.add(SELF);
        snapshot.loadMasses().forEach(load -> names.add(load.pattern()));
        names.add(NODAL);
    }

    private static double[] middle(List<NodePoint> nodes) {
        double[] middle = new double[3];
        for (NodePoint node : nodes) {
            double[] position = node.position();
            for (int i = 0; i < 3; i++) {
                middle[i] += position[i] / nodes.size();
            }
        }
        return middle;
    }

    MassLedger build() {
        double[][] iota = new double[6][];
        double[][] product = new double[6][];
        for (int direction = 0; direction < 6; direction++) {
            iota[direction] = rigid.ofUnknowns(direction, inside);
            product[direction] = mass.multiply(iota[direction]);
        }
        double[] movable = new double[3];
        for (int i = 0; i < 3; i++) {
            movable[i] = RigidMotions.dot(iota[i], product[i]);
        }
        double[] centre = centre(iota, product, movable);
        double[] rotary = new double[3];
        for (int i = 0; i < 3; i++) {
            double[] rotation = rigid.ofUnknowns(i + 3, centre);
            double inertia = mass.quadratic(rotation);
            rotary[i] = inertia <= roundOff(i + 3, movable) ? 0.0 : inertia;
        }
        return books(iota, movable, centre, rotary);
    }

    /** Rotary inertia that the rounding of coordinates leaves to masses in the axis of a rotation. */
    private double roundOff(int direction, double[] movable) {
        double arm = Arrays.stream(rigid.ofNodes(direction, new double[3])).map(Math::abs).max().orElse(0.0) * 16.0 * Math.ulp(1.0);
        return (movable[0] + movable[1] + movable[2]) * arm * arm;
    }

    private double[] centre(double[][] iota, double[][] product, double[] movable) {
        double[] centre = new double[3];
        for (int k = 0; k < 3; k++) {
            int a = (k + 1) % 3;
            int b = (k + 2) % 3;
            double both = movable[a] + movable[b];
            if (both <= 0.0) {
                centre[k] = inside[k];
                continue;
            }
            double moment = RigidMotions.dot(product[a], iota[3 + b]) - RigidMotions.dot(product[b], iota[3 + a]);
            double atOrigin = inside[a] * RigidMotions.dot(product[a], iota[k]) + inside[b] * RigidMotions.dot(product[b], iota[k]);
            centre[k] = inside[k] + (moment - atOrigin) / both;
        }
        return centre;
    }

    private MassLedger books(double[][] iota, double[] movable, double[] centre, double[] rotary) {
        double[][] moving = new double[names.size()][3];
        double[][] total = new double[names.size()][3];
        double[] onSupports = new double[3];
        double balance = 0.0;
        for (int direction = 0; direction < 3; direction++) {
            addBySource(transformation.expand(iota[direction]), direction, moving);
            addBySource(rigid.ofNodes(direction, inside), direction, total);
            double inMatrices = 0.0;
            for (double[] source : total) {
                inMatrices += source[direction];
            }
            onSupports[direction] = clean(inMatrices - movable[direction], inMatrices);
            balance = Math.max(balance, mismatch(inMatrices, massPutIn(direction)));
        }
        return new MassLedger(movable, onSupports, centre, rotary, sources(moving, total), balance);
    }

    private void addBySource(double[] u, int direction, double[][] sums) {
        double[] energies = store.kineticEnergies(u);
        for (int element = 0; element < store.elements(); element++) {
            sums[0][direction] += energies[element];
        }
        for (NodalMasses.Contribution contribution : nodalMasses.contributions()) {
            int[] places = new int[6];
            for (int i = 0; i < 6; i++) {
                places[i] = 6 * contribution.node() + i;
            }
            sums[1 + contribution.source()][direction] += PackedMatrix.bilinear(contribution.packed(), places, u, u);
        }
    }

    private List<MassSource> sources(double[][] moving, double[][] total) {
        List<MassSource> sources = new ArrayList<>();
        for (int source = 0; source < names.size(); source++) {
            double[] held = new double[3];
            double any = 0.0;
            for (int i = 0; i < 3; i++) {
                held[i] = clean(total[source][i] - moving[source][i], total[source][i]);
                any = Math.max(any, Math.abs(total[source][i]));
            }
            if (any > 0.0) {
                sources.add(new MassSource(names.get(source), moving[source], held));
            }
        }
        return sources;
    }

    /** Zero where the difference of two masses is round-off of their sums. */
    private static double clean(double difference, double total) {
        return Math.abs(difference) <= 1e-12 * Math.abs(total) ? 0.0 : difference;
    }

    private static double mismatch(double found, double given) {
        double scale = Math.max(Math.abs(found), Math.abs(given));
        return scale == 0.0 ? 0.0 : Math.abs(found - given) / scale;
    }

    /** The mass that the model describes, without any matrix. */
    private double massPutIn(int direction) {
        double sum = 0.0;
        for (StructuralElement element : snapshot.elements()) {
            sum += element.ownMass();
        }
        for (LoadMass load : snapshot.loadMasses()) {
            sum += load.total();
        }
        for (PointMass point : snapshot.pointMasses()) {
            sum += point.translational()[direction];
        }
        return sum;
    }
}
