package org.modewright.workspace;

/** A kept result that cannot be read or written; the message says which file, why, and what to do. */
public final class RunStoreException extends Exception {

    private static final long serialVersionUID = 1L;

    public RunStoreException(String message, Throwable cause) {
        super(message, cause);
    }
}
