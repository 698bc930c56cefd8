package org.modewright.numerics;

/** Thrown out of long work that was cancelled through its {@link Progress}. */
public final class CancelledException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    /** The work was cancelled by its caller. */
    public CancelledException() {
        super("The computation was cancelled.");
    }
}
