package org.modewright.numerics;

import org.modewright.numerics.internal.eigen.DenseEigenSolver;
import org.modewright.numerics.internal.eigen.LanczosEigenSolver;

/** The eigen solvers on offer. */
public final class EigenSolvers {

    /** Up to this order the dense method is as fast as the sparse one. */
    private static final int DENSE_ORDER = 400;

    private EigenSolvers() {
    }

    /** Dense matrices, all eigenpairs at once: the reference method for small problems. */
    public static EigenSolver dense() {
        return new DenseEigenSolver();
    }

    /** Sparse shift-invert block Lanczos with thick restart. */
    public static EigenSolver lanczos() {
        return new LanczosEigenSolver();
    }

    /** The method that suits a problem of order n. */
    public static EigenSolver forOrder(int n) {
        return n <= DENSE_ORDER ? dense() : lanczos();
    }
}
