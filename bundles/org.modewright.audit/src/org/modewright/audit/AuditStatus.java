package org.modewright.audit;

/** How an audit ended, with the exit status of the command line. */
public enum AuditStatus {
    /** The modes are proven complete and enough in every direction judged. */
    PASSED(0),
    /** Some direction lacks mass, or nothing could be judged. */
    NOT_PASSED(1),
    /** The structure, or a part of it, can move without resistance or is driven out by compression. */
    UNSTABLE(3),
    /** The certificate does not prove that no mode is missing. */
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
