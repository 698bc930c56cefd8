package org.modewright.numerics;

/**
 * Motions without stiffness: mechanisms and rigid-body motions of a structure, found as the zero pivots of K. A motion counts as such
 * if its energy cannot be told from the round-off of K, by the rule of {@link PencilReduction}; a near mechanism with a stiffness of a
 * billionth of its neighbours' is none.
 */
final class StiffnessNullSpace {

    private final Factoriser factoriser;
    private final Factorisation factorisation;
    private final int[] degreesOfFreedom;

    private StiffnessNullSpace(Factoriser factoriser, Factorisation factorisation) {
        this.factoriser = factoriser;
        this.factorisation = factorisation;
        this.degreesOfFreedom = factorisation.zeroPivots();
    }

    /**
     * Factorises K and collects its zero pivots.
     *
     * @param stiffness K
     * @param progress told of the factorisation; a cancel is obeyed
     * @throws CancelledException on a cancel
     */
    public static StiffnessNullSpace of(SymmetricMatrix stiffness, Progress progress) {
        Factoriser factoriser = Factorisers.sparse(stiffness, progress);
        return new StiffnessNullSpace(factoriser, factoriser.factorise(stiffness, null, 0.0, progress));
    }

    /** Whether the stiffness has no such motion. */
    public boolean isEmpty() {
        return degreesOfFreedom.length == 0;
    }

    /** Number of independent motions. */
    public int count() {
        return degreesOfFreedom.length;
    }

    /** One degree of freedom per motion, ascending: holding them takes all the motions away. */
    public int[] degreesOfFreedom() {
        return degreesOfFreedom.clone();
    }

    /** The motion of one of the degrees of freedom: 1 there, 0 at the others. Computed anew by each call. */
    public double[] vector(int index) {
        return factoriser.nullVector(factorisation, index);
    }

    /** Inertia of K; a negative count tells of buckled parts. */
    public Inertia inertia() {
        return factorisation.inertia();
    }
}
