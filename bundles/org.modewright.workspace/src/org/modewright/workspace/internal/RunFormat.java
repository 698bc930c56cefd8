package org.modewright.workspace.internal;

import java.io.BufferedOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.BufferedInputStream;
import java.nio.channels.FileChannel;
import java.nio.channels.Channels;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.util.zip.Deflater;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;
import org.modewright.workspace.StoredRun;

/**
 * The file of a kept run: a zip with one entry, which begins with a magic number, the version of the format, the hash of the model and
 * the time of the run. The zip's own check sum tells of damage.
 */
public final class RunFormat {

    private static final String ENTRY = "run";
    private static final int MAGIC = 0x4D574D31;
    private static final int VERSION = 1;

    private RunFormat() {
    }

    /** Writes a run atomically. */
    public static void write(StoredRun run, Path target) throws IOException {
        Path scratch = target.resolveSibling('.' + target.getFileName().toString() + ".part");
        try {
            try (FileChannel channel = FileChannel.open(scratch, StandardOpenOption.CREATE, StandardOpenOption.TRUNCATE_EXISTING,
                    StandardOpenOption.WRITE)) {
                OutputStream out = new BufferedOutputStream(Channels.newOutputStream(channel), 1 << 16);
                write(run, out);
                out.flush();
                channel.force(true);
            }
            Files.move(scratch, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(scratch);
        }
    }

    private static void write(StoredRun run, OutputStream target) throws IOException {
        ZipOutputStream zip = new ZipOutputStream(target);
        zip.setLevel(Deflater.BEST_SPEED);
        zip.putNextEntry(new ZipEntry(ENTRY));
        DataOutputStream out = new DataOutputStream(new BufferedOutputStream(zip, 1 << 16));
        out.writeInt(MAGIC);
        out.writeInt(VERSION);
        out.writeUTF(run.modelHash());
        out.writeLong(run.finished().toEpochMilli());
        new ResultWriter(out).write(run.result());
        out.flush();
        zip.closeEntry();
        zip.finish();
    }

    /**
     * Reads a run.
     *
     * @throws DamagedRunException if the bytes are not a run, are damaged, or of a newer format
     */
    public static StoredRun read(InputStream source) throws IOException {
        try {
            ZipInputStream zip = new ZipInputStream(new BufferedInputStream(source, 1 << 16));
            ZipEntry entry = zip.getNextEntry();
            if (entry == null || !ENTRY.equals(entry.getName())) {
                throw new DamagedRunException("it is not a file of results.", null);
            }
            StoredRun run = read(new DataInputStream(new BufferedInputStream(zip, 1 << 16)));
            if (zip.read() >= 0) {
                throw new DamagedRunException("it holds more than it should.", null);
            }
            zip.closeEntry();
            return run;
        } catch (EOFException cut) {
            throw new DamagedRunException("it is cut short.", cut);
        } catch (ZipException damage) {
            throw new DamagedRunException("it is damaged.", damage);
        } catch (IllegalArgumentException | NullPointerException | IndexOutOfBoundsException | NegativeArraySizeException nonsense) {
            throw new DamagedRunException("its content is not that of a result.", nonsense);
        }
    }

    private static StoredRun read(DataInputStream in) throws IOException {
        if (in.readInt() != MAGIC) {
            throw new DamagedRunException("it is not a file of results.", null);
        }
        int version = in.readInt();
        if (version > VERSION) {
            throw new DamagedRunException("it was written by a newer version of Modewright.", null);
        }
        String hash = in.readUTF();
        Instant finished = Instant.ofEpochMilli(in.readLong());
        return new StoredRun(new ResultReader(in).read(), hash, finished);
    }
}
