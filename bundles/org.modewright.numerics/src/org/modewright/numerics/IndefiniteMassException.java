package org.modewright.numerics;

/** A mass matrix with negative eigenvalues: some motion would have a negative kinetic energy, so there are no modes to find. */
public final class IndefiniteMassException extends IllegalArgumentException {

    private static final long serialVersionUID = 1L;

    /**
     * Refuses the matrix.
     *
     * @param sentence what is wrong and how to mend it
     */
    public IndefiniteMassException(String sentence) {
        super(sentence);
    }
}
