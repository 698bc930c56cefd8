package org.modewright.exchange;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;

import org.modewright.audit.AuditResult;
import org.modewright.exchange.internal.AtomicOutput;
import org.modewright.exchange.internal.ResultReader;
import org.modewright.exchange.internal.ResultWriter;
import org.modewright.modal.MatrixRun;
import org.modewright.modal.ModalResult;

/**
 * The result file: JSON, everything in SI, numbers in full double precision, shares as fractions of 1. What has no finite value, such as
 * the period of a rigid-body mode, is null. Elements and objects of findings are given by their names, which in a table package are their
 * ids.
 */
public final class ResultFile {

    /** Version of the format. */
    public static final int VERSION = 1;

    private ResultFile() {
    }

    /**
     * Writes an audit: modes, capture, verdicts and findings.
     *
     * @param allElements whether the energy lists hold all elements, not only the leading ones
     */
    public static void write(AuditResult result, ModelFacts facts, Path file, boolean allElements) throws IOException {
        AtomicOutput.write(file, path -> {
            try (ResultWriter writer = new ResultWriter(path, allElements)) {
                writer.write(facts, result.modal(), result.verdicts(), result.findings());
            }
        });
    }

    /** Writes modes alone: the lists of verdicts and findings stay empty. */
    public static void write(ModalResult result, ModelFacts facts, Path file, boolean allElements) throws IOException {
        AtomicOutput.write(file, path -> {
            try (ResultWriter writer = new ResultWriter(path, allElements)) {
                writer.write(facts, result, List.of(), List.of());
            }
        });
    }

    /**
     * Writes the modes of a pair of matrices: no model, no elements and no directions.
     *
     * @param program the program and its version
     * @param seconds seconds spent by stage
     */
    public static void write(MatrixRun.Result result, String program, Map<String, Double> seconds, Path file) throws IOException {
        AtomicOutput.write(file, path -> {
            try (ResultWriter writer = new ResultWriter(path, false)) {
                writer.write(result, program, seconds);
            }
        });
    }

    /**
     * Reads a result file.
     *
     * @throws IOException if it cannot be read, is no result file or is of another version; the message says which and where
     */
    public static StoredResult read(Path file) throws IOException {
        return ResultReader.read(file);
    }
}
