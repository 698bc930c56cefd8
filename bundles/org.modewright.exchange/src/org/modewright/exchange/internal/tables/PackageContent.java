package org.modewright.exchange.internal.tables;

import java.io.Closeable;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;

import org.modewright.exchange.PackageException;

/** The files of a package, whether they lie in a folder or in a zip. */
interface PackageContent extends Closeable {

    /** The description that stands at the root of every package. */
    String DESCRIPTOR = "datapackage.json";

    /** Whether the package holds this file. */
    boolean has(String path);

    /**
     * Opens a file of the package.
     *
     * @throws UnsafeContentException if reading it would leave the package or take more than a package may take
     */
    InputStream open(String path) throws IOException;

    /** The tables at the root of the package, whether or not the description names them. */
    List<String> rootTables();

    /** A file of the package that must not be read. */
    final class UnsafeContentException extends IOException {

        private static final long serialVersionUID = 1L;

        UnsafeContentException(String message) {
            super(message);
        }
    }

    /**
     * Opens a folder, a zip, or the folder around a {@code datapackage.json}.
     *
     * @throws PackageException if there is no package or its zip is not safe to read
     */
    static PackageContent of(Path location) throws IOException {
        ProblemList problems = new ProblemList();
        if (Files.isDirectory(location)) {
            return new FolderContent(location);
        }
        if (!Files.exists(location)) {
            problems.add(String.valueOf(location), 0, "", "", "there is no such file or folder");
        } else if (location.endsWith(DESCRIPTOR)) {
            return new FolderContent(location.toAbsolutePath().getParent());
        } else if (String.valueOf(location.getFileName()).toLowerCase(Locale.ROOT).endsWith(".zip")) {
            return ZipContent.open(location, ZipLimits.DEFAULT);
        } else {
            problems.add(String.valueOf(location), 0, "", "",
                    "this is no table package; give its folder, its zip or its datapackage.json");
        }
        problems.throwIfAny();
        throw new IllegalStateException();
    }
}
