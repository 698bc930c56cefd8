package org.modewright.numerics;

/**
 * Proof, or disproof, that no eigenvalue was missed: by Sylvester's law of inertia K - shift M has as many negative eigenvalues as the
 * pencil has eigenvalues below the shift. The shift lies in a gap above the last eigenvalue, so a cluster is never split.
 *
 * @param complete whether counted equals found and the pairs are eigenpairs at all: orthogonality at most 1e-8, residuals
 *        at most 1e-6 or, for nearly singular K, at most the round-off 32 &epsilon; || |K||&phi;| || of K&phi;; never if the
 *        iteration ended with fewer pairs than were asked for
 * @param shift where the count was taken, in the units of the eigenvalue
 * @param counted eigenvalues below the shift by inertia
 * @param found eigenvalues below the shift that were computed: the pairs, and the rest of the last pair's cluster
 * @param worstResidual largest of the residuals, recomputed, as defined in {@link EigenPairs}
 * @param worstOrthogonality largest |&phi;<sub>i</sub><sup>T</sup>M&phi;<sub>j</sub> - &delta;<sub>ij</sub>|
 */
public record SpectrumCertificate(boolean complete, double shift, int counted, int found, double worstResidual,
        double worstOrthogonality) {
}
