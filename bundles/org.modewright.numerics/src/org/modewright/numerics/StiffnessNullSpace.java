package org.modewright.numerics;

/**
 * Motions without stiffness: mechanisms and rigid-body motions of a structure, found as the zero pivots of K. A motion counts as such
 * if its energy cannot be told from the round-off of K, by the rule of {@link PencilReduction}; a near mechanism with a stiffness of a
 * billionth of its neighbours' is none.
 *
 * @param degreesOfFreedom one per motion, ascending: holding them takes all the motions away
 * @param vectors the motions in the same order: 1 at its own degree of freedom, 0 at the others
 * @param inertia of K; a negative count tells of buckled parts
 */
public record StiffnessNullSpace(int[] degreesOfFreedom, double[][] vectors, Inertia inertia) {

    /**
     * Factorises K and collects its zero pivots.
     *
     * @param stiffness K
     * @param progress told of the factorisation; a cancel is obeyed
     * @throws CancelledException on a cancel
     */
    public static StiffnessNullSpace of(SymmetricMatrix stiffness, Progress progress) {
        Factoriser factoriser = Factorisers.sparse(stiffness, progress);
        Factorisation factorisation = factoriser.factorise(stiffness, null, 0.0, progress);
        return new StiffnessNullSpace(factorisation.zeroPivots(), factoriser.nullVectors(factorisation), factorisation.inertia());
    }

    /** Whether the stiffness has no such motion. */
    public boolean isEmpty() {
        return degreesOfFreedom.length == 0;
    }
}
