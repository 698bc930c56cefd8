package org.modewright.fem.internal;

import java.util.List;

import org.modewright.fem.NodePoint;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Rigid-body vectors of the six directions. On the nodes: u = e for a translation, u = e &times; (x - c), &theta; = e for a rotation
 * about c, and zero where the constraints hold a component. On the free unknowns the rigid-body vector &iota; has the values of the
 * components that the unknowns are. Where constraints together with supports keep the free motions from following the rigid body
 * (a rigid bar on a hinge), &iota; is the free motion closest to it in the sense of the mass: M &iota; = T<sup>T</sup> M u.
 */
public final class RigidMotions {

    /** Deviation, relative to the rigid motion, above which the free motions do not follow it; coordinates are given to some 1e-10. */
    private static final double FOLLOWS = 1e-9;
    private static final double CONVERGED = 1e-15;
    private static final int ITERATIONS = 2000;

    private final List<NodePoint> nodes;
    private final Transformation transformation;
    private final CarrierStore store;
    private final SymmetricMatrix mass;

    RigidMotions(List<NodePoint> nodes, Transformation transformation, CarrierStore store, SymmetricMatrix mass) {
        this.nodes = nodes;
        this.transformation = transformation;
        this.store = store;
        this.mass = mass;
    }

    /** The rigid-body motion of all nodes, those on supports included. */
    double[] ofNodes(int direction, double[] centre) {
        double[] u = new double[6 * nodes.size()];
        for (int node = 0; node < nodes.size(); node++) {
            if (direction < 3) {
                u[6 * node + direction] = 1.0;
                continue;
            }
            double[] arm = FloorPlane.minus(nodes.get(node).position(), centre);
            int axis = direction - 3;
            int next = (axis + 1) % 3;
            int last = (axis + 2) % 3;
            u[6 * node + next] = -arm[last];
            u[6 * node + last] = arm[next];
            u[6 * node + direction] = 1.0;
        }
        return u;
    }

    /** The same with zero where the constraints hold a component. */
    private double[] ofFreeNodes(int direction, double[] centre) {
        double[] u = ofNodes(direction, centre);
        for (int i = 0; i < u.length; i++) {
            if (transformation.isHeld(i)) {
                u[i] = 0.0;
            }
        }
        return u;
    }

    /** M &iota; over the unknowns. */
    public double[] massTimes(int direction, double[] centre) {
        return transformation.reduce(store.massTimes(ofFreeNodes(direction, centre)));
    }

    /** &iota; over the unknowns. */
    public double[] ofUnknowns(int direction, double[] centre) {
        double[] u = ofFreeNodes(direction, centre);
        double[] iota = new double[transformation.unknowns()];
        for (int i = 0; i < iota.length; i++) {
            iota[i] = u[transformation.componentOf(i)];
        }
        double[] followed = transformation.expand(iota);
        double[] rest = new double[u.length];
        boolean follows = true;
        for (int i = 0; i < u.length; i++) {
            rest[i] = u[i] - followed[i];
            follows &= Math.abs(rest[i]) <= FOLLOWS * Math.max(1.0, Math.abs(u[i]));
        }
        if (!follows) {
            add(iota, solveMass(transformation.reduce(store.massTimes(rest))), 1.0);
        }
        return iota;
    }

    /** &iota;<sub>a</sub><sup>T</sup>M&iota;<sub>b</sub> of two translations. */
    public double coupling(int first, int second) {
        double[] origin = new double[3];
        return dot(ofUnknowns(first, origin), mass.multiply(ofUnknowns(second, origin)));
    }

    /**
     * Solves M x = b for b in the range of M by conjugate gradients with the diagonal as preconditioner.
     *
     * <p>Source: Y. Saad, Iterative Methods for Sparse Linear Systems (2nd edition, 2003), section 9.2.
     */
    private double[] solveMass(double[] b) {
        double[] diagonal = mass.diagonal();
        double[] x = new double[b.length];
        double[] residual = b.clone();
        double[] direction = preconditioned(residual, diagonal);
        double rho = dot(residual, direction);
        double goal = CONVERGED * CONVERGED * rho;
        for (int i = 0; i < ITERATIONS && rho > goal; i++) {
            double[] product = mass.multiply(direction);
            double curvature = dot(direction, product);
            if (curvature <= 0.0) {
                break;
            }
            double step = rho / curvature;
            add(x, direction, step);
            add(residual, product, -step);
            double[] next = preconditioned(residual, diagonal);
            double nextRho = dot(residual, next);
            add(next, direction, nextRho / rho);
            direction = next;
            rho = nextRho;
        }
        return x;
    }

    private static double[] preconditioned(double[] residual, double[] diagonal) {
        double[] result = new double[residual.length];
        for (int i = 0; i < result.length; i++) {
            result[i] = diagonal[i] > 0.0 ? residual[i] / diagonal[i] : 0.0;
        }
        return result;
    }

    static double dot(double[] a, double[] b) {
        double sum = 0.0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }

    private static void add(double[] to, double[] vector, double factor) {
        for (int i = 0; i < to.length; i++) {
            to[i] += factor * vector[i];
        }
    }
}
