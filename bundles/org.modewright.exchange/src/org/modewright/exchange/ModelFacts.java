package org.modewright.exchange;

import java.util.Objects;

/**
 * Where a result comes from, as its file states it.
 *
 * @param program the program and its version
 * @param name name of the model
 * @param file the file that the model was read from, as the user gave it
 * @param sha256 lower-case hexadecimal SHA-256 of that file, see {@link FileHash}
 */
public record ModelFacts(String program, String name, String file, String sha256) {

    /** Checks that every text is there. */
    public ModelFacts {
        Objects.requireNonNull(program, "program");
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(file, "file");
        Objects.requireNonNull(sha256, "sha256");
    }

    /** Facts of a result whose program states no version. */
    public ModelFacts(String name, String file, String sha256) {
        this("Modewright", name, file, sha256);
    }
}
