package org.modewright.exchange.internal.tables;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;

/** A package in a folder. Links are followed only where they stay inside it. */
final class FolderContent implements PackageContent {

    private final Path root;

    FolderContent(Path root) throws IOException {
        this.root = root.toRealPath();
    }

    @Override
    public boolean has(String path) {
        return Files.exists(root.resolve(path));
    }

    @Override
    public InputStream open(String path) throws IOException {
        Path real = root.resolve(path).toRealPath();
        if (!real.startsWith(root)) {
            throw new UnsafeContentException("the file is a link that leaves the package; put the file itself there");
        }
        if (!Files.isRegularFile(real)) {
            throw new UnsafeContentException("this is not a file");
        }
        return Files.newInputStream(real);
    }

    @Override
    public List<String> rootTables() {
        try (Stream<Path> files = Files.list(root)) {
            return files.map(file -> file.getFileName().toString()).filter(name -> name.toLowerCase(Locale.ROOT).endsWith(".csv"))
                    .sorted().toList();
        } catch (IOException e) {
            return List.of();
        }
    }

    @Override
    public void close() {
        // a folder holds nothing open
    }
}
