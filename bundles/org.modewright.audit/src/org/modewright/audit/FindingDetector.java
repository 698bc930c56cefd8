package org.modewright.audit;

import java.util.List;

/** Looks for one kind of suspicious thing in a solved model. The list of detectors is open: {@link AuditRun} takes further ones. */
@FunctionalInterface
public interface FindingDetector {

    /** What it finds; an empty list where all is well. */
    List<Finding> detect(AuditContext context);
}
