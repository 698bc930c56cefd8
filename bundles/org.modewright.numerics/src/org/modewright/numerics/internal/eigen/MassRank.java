package org.modewright.numerics.internal.eigen;

import org.modewright.numerics.Factorisation;
import org.modewright.numerics.Factorisers;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/** Rank of a positive semidefinite mass matrix, from the zero pivots of its factors. */
final class MassRank {

    private MassRank() {
    }

    /**
     * The rank.
     *
     * @throws IllegalArgumentException if the mass has a negative eigenvalue
     */
    static int of(SymmetricMatrix mass, Progress progress) {
        Factorisation factorisation = Factorisers.sparse(mass, progress).factorise(mass, null, 0.0, progress);
        int negative = factorisation.inertia().negative();
        if (negative > 0) {
            throw new IllegalArgumentException("The mass matrix has " + negative
                    + " negative eigenvalue(s); mass must be positive semidefinite. Look for negative masses or densities.");
        }
        return mass.order() - factorisation.inertia().zero();
    }
}
