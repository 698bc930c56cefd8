package org.modewright.exchange;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

import org.modewright.exchange.internal.AtomicOutput;
import org.modewright.exchange.internal.tables.PackageReader;
import org.modewright.exchange.internal.tables.PackageWriter;
import org.modewright.model.Defect;
import org.modewright.model.Severity;
import org.modewright.model.WellFormedness;
import org.modewright.model.structure.StructuralModel;

/**
 * The open way in and out for a structure: a folder, or the same folder as a zip, that is a Tabular Data Package of CSV files.
 * The ids of a package are the names of the model's objects; the model's own ids are given anew.
 */
public final class TablePackage {

    /** Name of the file that describes a package. */
    public static final String DESCRIPTOR = "datapackage.json";

    private static final LocalDateTime NO_TIME = LocalDateTime.of(1980, 1, 1, 0, 0);

    private TablePackage() {
    }

    /** Whether a path names a table package by its form: a folder, a zip or a {@code datapackage.json}. */
    public static boolean isNamedBy(Path location) {
        return Files.isDirectory(location) || isZip(location) || location.endsWith(DESCRIPTOR);
    }

    /**
     * Reads a package.
     *
     * @param location its folder, its zip, or its {@code datapackage.json}
     * @return the structure, and what the package holds that is not known
     * @throws PackageException with every problem of the package; nothing is imported then
     * @throws IOException if the folder itself cannot be read
     */
    public static Imported read(Path location) throws IOException {
        return PackageReader.read(location);
    }

    /**
     * Writes a package. A folder is made where it is missing; files that are not part of the package stay as they are.
     *
     * @param model a structure without errors
     * @param location a folder, a path that ends with {@code .zip}, or a {@code datapackage.json}
     * @return what a package cannot hold, each in a sentence with the names
     * @throws PackageException if the structure has errors, so that its package could not be read
     * @throws IOException if it cannot be written
     */
    public static List<String> write(StructuralModel model, Path location) throws IOException {
        refuseDefects(model);
        PackageWriter.Written written = PackageWriter.write(model);
        if (isZip(location)) {
            AtomicOutput.write(location, path -> zip(written.files(), path));
        } else {
            folder(written.files(), location.endsWith(DESCRIPTOR) ? location.toAbsolutePath().getParent() : location);
        }
        return written.warnings();
    }

    private static void refuseDefects(StructuralModel model) throws PackageException {
        List<Problem> problems = new ArrayList<>();
        for (Defect defect : WellFormedness.check(model)) {
            if (defect.severity() == Severity.ERROR) {
                problems.add(new Problem(String.valueOf(model.getName()), 0, "", "", defect.text() + " " + defect.remedy()));
            }
        }
        if (!problems.isEmpty()) {
            throw new PackageException(problems, problems.size());
        }
    }

    private static boolean isZip(Path location) {
        return !Files.isDirectory(location) && location.getFileName() != null
                && location.getFileName().toString().toLowerCase(Locale.ROOT).endsWith(".zip");
    }

    private static void folder(Map<String, byte[]> files, Path folder) throws IOException {
        Files.createDirectories(folder);
        for (Map.Entry<String, byte[]> file : files.entrySet()) {
            AtomicOutput.write(folder.resolve(file.getKey()), file.getValue());
        }
    }

    private static void zip(Map<String, byte[]> files, Path path) throws IOException {
        try (OutputStream out = Files.newOutputStream(path, StandardOpenOption.CREATE_NEW);
                ZipOutputStream zip = new ZipOutputStream(out)) {
            for (Map.Entry<String, byte[]> file : files.entrySet()) {
                ZipEntry entry = new ZipEntry(file.getKey());
                entry.setTimeLocal(NO_TIME);
                zip.putNextEntry(entry);
                zip.write(file.getValue());
                zip.closeEntry();
            }
        }
    }
}
