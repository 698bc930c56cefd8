package org.modewright.exchange.internal;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;

/** Writes a file as a whole: beside its place, flushed to the disk, then renamed; a crash leaves the old file or the new one. */
public final class AtomicOutput {

    private AtomicOutput() {
    }

    /** Writes the content of a file to the path that it is given. */
    @FunctionalInterface
    public interface Writer {
        /** Writes everything to the path. */
        void write(Path path) throws IOException;
    }

    /** Replaces or creates a file by what the writer makes. */
    public static void write(Path file, Writer writer) throws IOException {
        Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
        if (!Files.isDirectory(target.getParent())) {
            throw new NoSuchFileException(file.toString(), null, "its folder does not exist");
        }
        Path temporary = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID() + ".tmp");
        try {
            writer.write(temporary);
            try (FileChannel channel = FileChannel.open(temporary, StandardOpenOption.WRITE)) {
                channel.force(true);
            }
            Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(temporary);
        }
    }

    /** Replaces or creates a file by these bytes. */
    public static void write(Path file, byte[] bytes) throws IOException {
        write(file, path -> Files.write(path, bytes, StandardOpenOption.CREATE_NEW));
    }
}
