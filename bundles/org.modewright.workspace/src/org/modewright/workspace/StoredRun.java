package org.modewright.workspace;

import java.time.Instant;
import java.util.Objects;
import org.modewright.audit.AuditResult;

/**
 * A run with what is needed to tell whether it is still that of the model.
 *
 * @param result what was found
 * @param modelHash hash of the model at the run, see {@link org.modewright.model.Snapshots#sha256}
 * @param finished when the run ended
 */
public record StoredRun(AuditResult result, String modelHash, Instant finished) {

    public StoredRun {
        Objects.requireNonNull(result, "result");
        Objects.requireNonNull(modelHash, "modelHash");
        Objects.requireNonNull(finished, "finished");
    }

    /** Whether the run belongs to a model with this hash. */
    public boolean isOf(String hash) {
        return modelHash.equals(hash);
    }
}
