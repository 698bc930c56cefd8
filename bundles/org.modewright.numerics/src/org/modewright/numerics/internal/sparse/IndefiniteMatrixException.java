package org.modewright.numerics.internal.sparse;

/** Elimination without pivoting met a pivot that is not positive: the matrix must be factorised with pivoting. */
final class IndefiniteMatrixException extends Exception {

    private static final long serialVersionUID = 1L;

    IndefiniteMatrixException() {
        super(null, null, false, false);
    }
}
