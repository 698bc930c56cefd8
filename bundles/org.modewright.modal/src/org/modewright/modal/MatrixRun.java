package org.modewright.modal;

import java.util.List;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/** Modes of a pair of matrices without a model: no elements and no directions. */
public final class MatrixRun {

    private MatrixRun() {
    }

    /**
     * The modes of K&phi; = &lambda;M&phi;.
     *
     * @param pairs eigenvalues (rad&sup2;/s&sup2; in the matrices' own units of time) and vectors
     * @param certificate the inertia count just above the last one
     * @param remarks what the run did of its own accord
     */
    public record Result(int order, EigenPairs pairs, Certificate certificate, List<String> remarks) {
        public Result {
            remarks = List.copyOf(remarks);
        }

        /** Frequencies in Hz, 0 where the eigenvalue is 0 or negative. */
        public double[] frequencies() {
            double[] frequencies = new double[pairs.values().length];
            for (int i = 0; i < frequencies.length; i++) {
                frequencies[i] = Spectrum.frequency(pairs.values()[i]);
            }
            return frequencies;
        }
    }

    /**
     * Solves a pair of matrices.
     *
     * @param request number of modes and frequency limit; a target has no meaning here
     * @throws IllegalArgumentException if the orders differ
     * @throws org.modewright.numerics.SingularPencilException if some motion has neither stiffness nor mass
     */
    public static Result run(SymmetricMatrix stiffness, SymmetricMatrix mass, ModalRequest request, Progress progress) {
        if (stiffness.order() != mass.order()) {
            throw new IllegalArgumentException("The stiffness matrix has order " + stiffness.order() + " and the mass matrix "
                    + mass.order() + "; both need the same order.");
        }
        try (Spectrum spectrum = Spectrum.open(stiffness, mass, progress)) {
            spectrum.solve(new SolveOn(request), pairs -> true, progress);
            return new Result(stiffness.order(), spectrum.pairs(), spectrum.certify(progress), spectrum.remarks());
        }
    }
}
