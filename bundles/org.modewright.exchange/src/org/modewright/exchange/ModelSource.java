package org.modewright.exchange;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;

import org.modewright.model.ModelFile;
import org.modewright.model.structure.StructuralModel;

/** Reads a structure from whatever holds one: a model file or a table package. */
public final class ModelSource {

    private ModelSource() {
    }

    /**
     * Reads a structure and forgets the warnings.
     *
     * @throws IOException as {@link #open}
     */
    public static StructuralModel read(Path location) throws IOException {
        return open(location).model();
    }

    /**
     * Reads a structure.
     *
     * @param location a model file, or the folder, the zip or the {@code datapackage.json} of a table package
     * @throws org.modewright.model.ModelFileException if a model file is broken
     * @throws PackageException if a package is broken
     * @throws IOException if there is no such file
     */
    public static Imported open(Path location) throws IOException {
        if (!Files.exists(location)) {
            throw new NoSuchFileException(location.toString(), null, "there is no such file or folder");
        }
        return TablePackage.isNamedBy(location) ? TablePackage.read(location) : new Imported(ModelFile.load(location), List.of());
    }

    /** Whether a path names a model file by its extension. */
    public static boolean isModelFile(Path location) {
        return location.getFileName() != null
                && location.getFileName().toString().toLowerCase(Locale.ROOT).endsWith("." + ModelFile.EXTENSION);
    }
}
