package org.modewright.cli;

/** Exit statuses of the command line. */
public final class ExitStatus {

    /** The audit passes, or the work is done. */
    public static final int PASSED = 0;
    /** The audit does not pass. */
    public static final int NOT_PASSED = 1;
    /** The input is bad or the options are wrong. */
    public static final int BAD_INPUT = 2;
    /** The run could not be completed. */
    public static final int NOT_COMPLETED = 3;

    private ExitStatus() {
    }
}
