package org.modewright.cli.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

import picocli.CommandLine.Option;

/** Options that say what is written. */
final class OutputOptions {

    @Option(names = "--json", paramLabel = "FILE", description = "Writes the result file (SI, full precision).")
    private Path json;

    @Option(names = "--all-elements", description = "Energy lists hold all elements, not only the leading ones (80 %%, at most 20).")
    private boolean allElements;

    @Option(names = "--csv", paramLabel = "FOLDER", description = "Writes tables for spreadsheets into this folder.")
    private Path csv;

    @Option(names = "--shapes", paramLabel = "FILE.h5", description = "Writes the mode shapes (HDF5).")
    private Path shapes;

    Path json() {
        return json;
    }

    Path csv() {
        return csv;
    }

    Path shapes() {
        return shapes;
    }

    boolean isAllElements() {
        return allElements;
    }

    /** Refuses what cannot be written before a long run is begun. */
    void check() throws IOException {
        checkFile(json);
        checkFile(shapes);
        if (csv != null && Files.exists(csv) && !Files.isDirectory(csv)) {
            throw new IOException(csv + ": this is a file; --csv needs a folder");
        }
    }

    static void checkFile(Path file) throws IOException {
        if (file == null) {
            return;
        }
        Path folder = file.toAbsolutePath().getParent();
        if (folder == null || !Files.isDirectory(folder)) {
            throw new IOException(file + ": its folder does not exist; make it first");
        }
        if (Files.isDirectory(file)) {
            throw new IOException(file + ": this is a folder; give the name of a file");
        }
        if (!Files.isWritable(folder)) {
            throw new IOException(file + ": its folder cannot be written to");
        }
    }
}
