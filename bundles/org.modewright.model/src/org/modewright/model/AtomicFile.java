package org.modewright.model;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.UUID;

/**
 * Replaces a file as a whole: write beside it, flush to the disk, rename.
 */
final class AtomicFile {

    private AtomicFile() {
    }

    static void write(Path file, byte[] bytes) throws ModelFileException {
        Path temporary = null;
        try {
            Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
            if (Files.exists(target) && !Files.isWritable(target)) {
                throw new AccessDeniedException(target.toString(), null, "the file is write-protected");
            }
            temporary = target.resolveSibling(".modewright-" + UUID.randomUUID() + ".tmp");
            writeAndFlush(temporary, bytes);
            keepPermissions(target, temporary);
            Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            flushFolder(target.getParent());
        } catch (IOException e) {
            removeQuietly(temporary);
            throw new ModelFileException(file.toString(), 0, 0, "The file cannot be written (" + reason(e) + ").",
                    "Check that its folder exists, is writable and has room on its disk; nothing was changed.", e);
        }
    }

    static String reason(IOException e) {
        if (e instanceof NoSuchFileException) {
            return "no such file or folder";
        }
        if (e instanceof AccessDeniedException) {
            return "access denied";
        }
        if (e instanceof FileSystemException fault && fault.getReason() != null) {
            return fault.getReason();
        }
        return e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
    }

    private static void writeAndFlush(Path file, byte[] bytes) throws IOException {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
            ByteBuffer buffer = ByteBuffer.wrap(bytes);
            while (buffer.hasRemaining()) {
                channel.write(buffer);
            }
            channel.force(true);
        }
    }

    private static void keepPermissions(Path from, Path to) throws IOException {
        if (!Files.exists(from)) {
            return;
        }
        PosixFileAttributeView old = Files.getFileAttributeView(from, PosixFileAttributeView.class);
        if (old != null) {
            Files.setPosixFilePermissions(to, old.readAttributes().permissions());
        }
    }

    /** Makes the rename itself durable; some systems cannot open a folder, and there the rename is as durable as they make it. */
    private static void flushFolder(Path folder) {
        try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
            channel.force(true);
        } catch (IOException e) {
            return;
        }
    }

    private static void removeQuietly(Path file) {
        if (file == null) {
            return;
        }
        try {
            Files.deleteIfExists(file);
        } catch (IOException e) {
            return;
        }
    }
}
