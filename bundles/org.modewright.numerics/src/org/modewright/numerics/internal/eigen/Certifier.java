package org.modewright.numerics.internal.eigen;

import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SpectrumCertificate;

/** Judges eigenpairs by an inertia count and by recomputed residuals. */
final class Certifier {

    private static final double LARGEST_RESIDUAL = 1e-6;
    private static final double LARGEST_ORTHOGONALITY = 1e-8;

    private final ShiftedProblem shifted;

    Certifier(ShiftedProblem shifted) {
        this.shifted = shifted;
    }

    /**
     * The certificate.
     *
     * @param pairs to be judged
     * @param beyond eigenvalues known beyond the last pair and below the count: the rest of its cluster
     * @param count inertia count above them
     */
    SpectrumCertificate certify(EigenPairs pairs, int beyond, ShiftedProblem.Count count, Progress progress) {
        double worstResidual = 0.0;
        boolean accurate = true;
        for (int i = 0; i < pairs.count(); i++) {
            progress.checkCancelled();
            double residual = EigenPairChecks.residual(shifted.problem(), pairs.values()[i], pairs.vectors()[i]);
            worstResidual = Math.max(worstResidual, residual);
            accurate &= residual <= LARGEST_RESIDUAL
                    || residual <= EigenPairChecks.unavoidableResidual(shifted.problem(), pairs.values()[i], pairs.vectors()[i]);
        }
        progress.checkCancelled();
        double orthogonality = EigenPairChecks.worstOrthogonality(shifted.problem().mass(), pairs.vectors());
        int found = pairs.count() + beyond;
        boolean complete = count.below() == found && accurate && orthogonality <= LARGEST_ORTHOGONALITY;
        return new SpectrumCertificate(complete, count.shift(), count.below(), found, worstResidual, orthogonality);
    }
}
