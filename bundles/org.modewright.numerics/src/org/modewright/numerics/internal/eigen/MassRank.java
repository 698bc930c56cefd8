package org.modewright.numerics.internal.eigen;

import java.util.Arrays;

import org.modewright.numerics.Factorisation;
import org.modewright.numerics.Factoriser;
import org.modewright.numerics.Factorisers;
import org.modewright.numerics.IndefiniteMassException;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;
import org.modewright.numerics.internal.sparse.SparseFactoriser;

/** Rank of a positive semidefinite mass matrix, from the zero pivots of its factors. */
final class MassRank {

    private MassRank() {
    }

    /**
     * The rank. A consistent mass couples nearly as much as the stiffness, but without its zeros, that tell which degrees of freedom belong
     * together: it is eliminated in the order of the whole problem. A mass with rows of zeros, or hardly more than a diagonal, has a far
     * cheaper order of its own.
     *
     * @param factoriser of the problem
     * @throws IndefiniteMassException if the mass has a negative eigenvalue
     */
    static int of(SymmetricMatrix mass, SparseFactoriser factoriser, Progress progress) {
        Factoriser own = isCoupledThroughout(mass) ? factoriser.forPart(mass) : Factorisers.sparse(mass, progress);
        Factorisation factorisation = own.factorise(mass, null, 0.0, progress);
        int negative = factorisation.inertia().negative();
        if (negative > 0) {
            throw new IndefiniteMassException("The mass matrix has " + (negative == 1 ? "a negative eigenvalue" : negative
                    + " negative eigenvalues") + "; mass must be positive semidefinite. Look for negative masses or densities.");
        }
        return mass.order() - factorisation.inertia().zero();
    }

    private static boolean isCoupledThroughout(SymmetricMatrix mass) {
        return mass.entries() > 2 * mass.order() && Arrays.stream(mass.diagonal()).noneMatch(entry -> entry == 0.0);
    }
}
