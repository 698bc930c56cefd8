package org.modewright.exchange;

import java.io.IOException;

/** A matrix file that cannot be read, with the line at fault. */
public final class MatrixMarketException extends IOException {

    private static final long serialVersionUID = 1L;

    private final int line;

    /**
     * @param file name of the file
     * @param line the line at fault; 0 where it is none
     * @param text what is wrong and how to mend it
     */
    public MatrixMarketException(String file, int line, String text) {
        super(line > 0 ? file + ", line " + line + ": " + text : file + ": " + text);
        this.line = line;
    }

    /** The line at fault, the first being 1; 0 where the fault is in no single line. */
    public int line() {
        return line;
    }
}
