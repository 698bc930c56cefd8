package org.modewright.numerics;

/** An eigenproblem being solved. Not for use by several threads at once. */
public interface EigenSession extends AutoCloseable {

    /**
     * The lowest eigenpairs. May be called again with larger requests, which continues; every answer starts at the lowest pair. A
     * cancelled session may be asked again.
     *
     * @param request how many
     * @param progress told of the pairs converged; a cancel is obeyed
     * @throws CancelledException on a cancel
     */
    EigenPairs solve(EigenRequest request, Progress progress);

    /**
     * Counts the eigenvalues below a shift just above the last of the pairs and compares.
     *
     * @param pairs answer of this session
     * @param progress told of the factorisation; a cancel is obeyed
     * @throws CancelledException on a cancel
     */
    SpectrumCertificate certify(EigenPairs pairs, Progress progress);

    /** Number of finite eigenvalues, which is the rank of M; -1 if it is not known. */
    int finiteEigenvalueCount();

    @Override
    default void close() {
        // Java arrays need no release
    }
}
