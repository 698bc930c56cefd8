package org.modewright.fem;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.modewright.fem.internal.AssemblyParts;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Stiffness and mass of a structure over its free degrees of freedom, with what is needed to go back to nodes and elements. Motions
 * that have neither stiffness nor mass are dropped already. Immutable; several threads may use it.
 */
public final class Assembly {

    private final Snapshot snapshot;
    private final AssemblyParts parts;

    private Assembly(Snapshot snapshot, AssemblyParts parts) {
        this.snapshot = snapshot;
        this.parts = parts;
    }

    /**
     * Assembles with the standard element formulations.
     *
     * @throws org.modewright.numerics.CancelledException if progress is cancelled
     */
    public static Assembly of(Snapshot snapshot, Progress progress) {
        return of(snapshot, ElementFormulations.standard(), progress);
    }

    /**
     * Assembles.
     *
     * @param formulations where the matrices of elements come from
     * @throws org.modewright.numerics.CancelledException if progress is cancelled
     */
    public static Assembly of(Snapshot snapshot, ElementFormulations formulations, Progress progress) {
        return new Assembly(snapshot, AssemblyParts.of(snapshot, formulations, progress));
    }

    /** The structure. */
    public Snapshot snapshot() {
        return snapshot;
    }

    /** Stiffness, elastic and geometric; order freeDofs(). */
    public SymmetricMatrix stiffness() {
        return parts.matrices().stiffness();
    }

    /** Mass; order freeDofs(). */
    public SymmetricMatrix mass() {
        return parts.matrices().mass();
    }

    /** Number of free degrees of freedom: what constraints and dropped motions leave. */
    public int freeDofs() {
        return parts.kept().length;
    }

    /**
     * The six components of every node, through all constraints.
     *
     * @param free values of the free degrees of freedom
     * @return length 6 times the number of nodes: component c of node i at 6 i + c, m and rad
     */
    public double[] expand(double[] free) {
        double[] all = new double[parts.transformation().unknowns()];
        for (int i = 0; i < free.length; i++) {
            all[parts.kept()[i]] = free[i];
        }
        return parts.transformation().expand(all);
    }

    /** M times a vector over the free degrees of freedom. */
    public double[] massTimes(double[] free) {
        return mass().multiply(free);
    }

    /**
     * M &iota; over the free degrees of freedom, &iota; the rigid-body vector of a direction. M is the mass of the free degrees of
     * freedom alone; the coupling to supports is left out. Dropped motions do not change it.
     *
     * @param component 0 to 2 translation along, 3 to 5 rotation about x, y, z
     * @param centre point that rotations are about, m; length 3
     */
    public double[] massTimesRigid(int component, double[] centre) {
        double[] all = parts.rigid().massTimes(component, centre);
        return Arrays.stream(parts.kept()).mapToDouble(unknown -> all[unknown]).toArray();
    }

    /** Where the mass is. */
    public MassLedger ledger() {
        return parts.ledger();
    }

    /** All energy carriers in a fixed order: members, springs, elastic supports, nodes with mass of their own. */
    public List<Carrier> carriers() {
        return Collections.unmodifiableList(parts.store().carriers());
    }

    /**
     * &phi;<sup>T</sup>k<sub>e</sub>&phi; of every carrier, geometric stiffness included; twice the strain energy, J.
     *
     * @param nodal components of all nodes, as from {@link #expand}
     */
    public double[] strainEnergies(double[] nodal) {
        return parts.store().strainEnergies(nodal);
    }

    /**
     * &phi;<sup>T</sup>m<sub>e</sub>&phi; of every carrier; twice the kinetic energy at one radian per second, J s<sup>2</sup>.
     *
     * @param nodal components of all nodes, as from {@link #expand}
     */
    public double[] kineticEnergies(double[] nodal) {
        return parts.store().kineticEnergies(nodal);
    }

    /**
     * &phi;<sub>j</sub> (M&phi;)<sub>j</sub> of every component j of every node, with M before constraints; their sum is
     * &phi;<sup>T</sup>M&phi;.
     *
     * @param free values of the free degrees of freedom
     * @return length 6 times the number of nodes: component c of node i at 6 i + c
     */
    public double[] kineticProducts(double[] free) {
        double[] nodal = expand(free);
        double[] product = parts.store().massTimes(nodal);
        for (int i = 0; i < nodal.length; i++) {
            product[i] *= nodal[i];
        }
        return product;
    }

    /** &iota;<sub>x</sub><sup>T</sup>M&iota;<sub>y</sub> in kg, by which the movable mass varies with the angle in plan. */
    public double planCoupling() {
        return parts.rigid().coupling(0, 1);
    }

    /** What a free degree of freedom is, for sentences: "X of node N4", "rotation about Z of node N4". */
    public String nameOf(int freeDof) {
        return Components.inSentences(componentOf(freeDof)) + " of node " + snapshot.nodes().get(nodeOf(freeDof)).name();
    }

    /** Index of the node that a free degree of freedom belongs to. */
    public int nodeOf(int freeDof) {
        return place(freeDof) / Components.COUNT;
    }

    /** Component 0 to 5 of the node that a free degree of freedom is. */
    public int componentOf(int freeDof) {
        return place(freeDof) % Components.COUNT;
    }

    private int place(int freeDof) {
        return parts.transformation().componentOf(parts.kept()[freeDof]);
    }

    /** The motions that were dropped because they have neither stiffness nor mass. */
    public List<DroppedMotion> dropped() {
        return parts.dropped();
    }
}
