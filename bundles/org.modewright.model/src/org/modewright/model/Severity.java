package org.modewright.model;

/**
 * How much a defect or finding matters.
 */
public enum Severity {
    /** No computation is possible, or its result would be meaningless. */
    ERROR,
    /** The computation goes on; its result may not be what was meant. */
    WARNING,
    /** Worth knowing. */
    INFO
}
