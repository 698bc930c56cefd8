package org.modewright.exchange.internal.tables;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipFile;

import org.modewright.exchange.PackageException;

/**
 * A package in a zip. Every name is checked before anything is read, and reading stops at the limits whatever the zip says of its sizes.
 */
final class ZipContent implements PackageContent {

    private final ZipFile zip;
    private final ZipLimits limits;
    private final Map<String, ZipEntry> files = new HashMap<>();
    private long expanded;

    private ZipContent(ZipFile zip, ZipLimits limits) {
        this.zip = zip;
        this.limits = limits;
        zip.stream().filter(entry -> !entry.isDirectory()).forEach(entry -> files.put(PackagePath.normalised(entry.getName()), entry));
    }

    /**
     * Opens a zip and checks the names of its entries.
     *
     * @throws PackageException if it is no zip, or an entry is unsafe, or the description is not at its root
     */
    static ZipContent open(Path location, ZipLimits limits) throws IOException {
        ProblemList problems = new ProblemList();
        String name = String.valueOf(location.getFileName());
        ZipFile zip = null;
        try {
            checkNames(name, ZipDirectory.read(location), limits, problems);
            problems.throwIfAny();
            zip = new ZipFile(location.toFile());
        } catch (ZipException e) {
            problems.add(name, 0, "", "", "the zip cannot be read: " + e.getMessage());
        } catch (PackageException e) {
            throw e;
        } catch (IOException e) {
            problems.add(name, 0, "", "", e.getMessage());
        }
        problems.throwIfAny();
        return new ZipContent(zip, limits);
    }

    private static void checkNames(String zip, List<ZipDirectory.Entry> entries, ZipLimits limits, ProblemList problems) {
        if (entries.size() > limits.entries()) {
            problems.add(zip, 0, "", "", "the zip holds " + entries.size() + " entries; a package has at most " + limits.entries());
            return;
        }
        Set<String> seen = new HashSet<>();
        for (ZipDirectory.Entry entry : entries) {
            PackagePath.objection(entry.name()).ifPresent(text -> problems.add(zip, 0, "", entry.name(), "entry refused: " + text));
            if (entry.link() || entry.special()) {
                problems.add(zip, 0, "", entry.name(), entry.link() ? "entry refused: it is a link; zip the file itself"
                        : "entry refused: it is neither a file nor a folder");
            }
            if (!seen.add(PackagePath.normalised(entry.name()))) {
                problems.add(zip, 0, "", entry.name(), "the zip holds this entry twice");
            }
        }
        if (!seen.contains(DESCRIPTOR)) {
            seen.stream().filter(path -> path.endsWith("/" + DESCRIPTOR)).sorted().findFirst().ifPresentOrElse(
                    path -> problems.add(zip, 0, "", path,
                            "datapackage.json must stand at the root of the zip; zip the files, not their folder"),
                    () -> problems.add(zip, 0, "", "", "the zip holds no datapackage.json at its root"));
        }
    }

    @Override
    public boolean has(String path) {
        return files.containsKey(path);
    }

    @Override
    public InputStream open(String path) throws IOException {
        ZipEntry entry = files.get(path);
        long stored = Math.max(1, entry.getCompressedSize());
        // What the zip itself declares to be too much need not be read until the limit, and fill the memory, to be refused.
        checkSize(entry.getSize(), stored);
        checkTotal(expanded + Math.max(0, entry.getSize()));
        return new Limited(zip.getInputStream(entry), stored);
    }

    @Override
    public List<String> rootTables() {
        return files.keySet().stream().filter(path -> path.indexOf('/') < 0 && path.toLowerCase(Locale.ROOT).endsWith(".csv")).sorted()
                .toList();
    }

    @Override
    public void close() throws IOException {
        zip.close();
    }

    /** Stops reading at the limits. */
    private final class Limited extends FilterInputStream {

        private final long stored;
        private long read;

        Limited(InputStream in, long stored) {
            super(in);
            this.stored = stored;
        }

        @Override
        public int read() throws IOException {
            int value = super.read();
            count(value < 0 ? 0 : 1);
            return value;
        }

        @Override
        public int read(byte[] bytes, int offset, int length) throws IOException {
            int count = super.read(bytes, offset, length);
            count(Math.max(0, count));
            return count;
        }

        @Override
        public boolean markSupported() {
            return false;
        }

        private void count(int bytes) throws IOException {
            read += bytes;
            expanded += bytes;
            checkTotal(expanded);
            checkSize(read, stored);
        }
    }

    private void checkTotal(long bytes) throws UnsafeContentException {
        if (bytes > limits.expanded()) {
            throw new UnsafeContentException("the files of the zip expand to more than " + limits.expanded() + " bytes");
        }
    }

    private void checkSize(long bytes, long stored) throws UnsafeContentException {
        if (bytes > limits.harmless() && bytes > stored * limits.ratio()) {
            throw new UnsafeContentException("the entry expands to more than " + limits.ratio() + " times its stored size");
        }
    }
}
