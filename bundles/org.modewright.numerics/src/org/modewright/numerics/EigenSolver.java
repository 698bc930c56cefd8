package org.modewright.numerics;

/** A method for the symmetric eigenproblem. Stateless: every problem gets a session of its own. */
public interface EigenSolver {

    /**
     * Opens a session that keeps factors and basis, so that asking for more eigenpairs goes on from where it stands.
     *
     * @param problem K and M
     * @param progress told of the stages; a cancel is obeyed
     * @throws SingularPencilException if K and M share a null vector, so that every number is an eigenvalue;
     *         {@link PencilReduction} takes such motions out beforehand
     * @throws CancelledException on a cancel
     */
    EigenSession open(EigenProblem problem, Progress progress);
}
