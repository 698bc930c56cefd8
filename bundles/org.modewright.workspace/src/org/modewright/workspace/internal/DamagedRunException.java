package org.modewright.workspace.internal;

import java.io.IOException;

/** A file of results that is not what it should be; the message is a sentence for people. */
public final class DamagedRunException extends IOException {

    private static final long serialVersionUID = 1L;

    public DamagedRunException(String message, Throwable cause) {
        super(message, cause);
    }
}
