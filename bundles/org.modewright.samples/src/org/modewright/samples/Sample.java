package org.modewright.samples;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
import java.util.Objects;

/**
 * A model that comes with the program.
 *
 * @param name what the command line calls it; its file is the name with the extension {@code .modewright}
 * @param title what it is, for people
 */
public record Sample(String name, String title) {

    private static final String FOLDER = "/samples/";
    private static final String EXTENSION = ".modewright";

    /** Checks that both are there. */
    public Sample {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(title, "title");
    }

    /** Name of the model file. */
    public String fileName() {
        return name + EXTENSION;
    }

    /**
     * Opens the model file; the caller closes it.
     *
     * @throws IOException if the program is incomplete
     */
    public InputStream open() throws IOException {
        InputStream stream = Sample.class.getResourceAsStream(FOLDER + fileName());
        if (stream == null) {
            throw new FileNotFoundException(fileName() + " is not part of this program; install it anew");
        }
        return stream;
    }
}
