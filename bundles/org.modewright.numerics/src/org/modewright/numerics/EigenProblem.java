package org.modewright.numerics;

import java.util.Objects;

/**
 * K &phi; = &lambda; M &phi;.
 *
 * @param stiffness K, symmetric; semidefinite for a stable structure, indefinite if compressed members have buckled
 * @param mass M, symmetric positive semidefinite, of the same order
 */
public record EigenProblem(SymmetricMatrix stiffness, SymmetricMatrix mass) {

    /** Checks that both matrices have the same order. */
    public EigenProblem {
        Objects.requireNonNull(stiffness, "stiffness");
        Objects.requireNonNull(mass, "mass");
        if (stiffness.order() != mass.order()) {
            throw new IllegalArgumentException("Stiffness has order " + stiffness.order() + " and mass has order " + mass.order()
                    + "; both must describe the same degrees of freedom.");
        }
    }

    /** Number of degrees of freedom. */
    public int order() {
        return stiffness.order();
    }
}
