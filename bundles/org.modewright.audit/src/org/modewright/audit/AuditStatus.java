package org.modewright.audit;

/** How an audit ended, with the exit status of the command line. */
public enum AuditStatus {
    PASSED(0),
    NOT_PASSED(1),
    UNSTABLE(3),
    INCOMPLETE(3);

    private final int exitStatus;

    AuditStatus(int exitStatus) {
        this.exitStatus = exitStatus;
    }

    /** Exit status of the command line. */
    public int exitStatus() {
        return exitStatus;
    }
}
