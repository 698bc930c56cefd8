package org.modewright.exchange.internal.tables;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.SeekableByteChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * The central directory of a zip as far as safety needs it: names and kinds of entries. The JDK does not tell links from files; the upper
 * half of the external attributes of an entry made on Unix does (PKWARE, .ZIP File Format Specification, sections 4.3.12, 4.3.16 and
 * 4.4.15).
 */
final class ZipDirectory {

    private static final int END_SIGNATURE = 0x06054b50;
    private static final int END_LENGTH = 22;
    private static final int LONGEST_COMMENT = 0xffff;
    private static final int ENTRY_SIGNATURE = 0x02014b50;
    private static final int ENTRY_LENGTH = 46;
    private static final int LONGEST_DIRECTORY = 64 << 20;
    private static final int UNIX_KIND = 0170000;
    private static final int UNIX_LINK = 0120000;
    private static final int UNIX_FILE = 0100000;
    private static final int UNIX_FOLDER = 0040000;

    private ZipDirectory() {
    }

    /** An entry: its name, whether it is a link, and whether it is neither file, folder nor link. */
    record Entry(String name, boolean link, boolean special) {
    }

    /** The entries in the order of the directory. */
    static List<Entry> read(Path zip) throws IOException {
        try (SeekableByteChannel channel = Files.newByteChannel(zip)) {
            ByteBuffer end = end(channel);
            long length = Integer.toUnsignedLong(end.getInt(end.position() + 12));
            long start = Integer.toUnsignedLong(end.getInt(end.position() + 16));
            if (length > LONGEST_DIRECTORY || start + length > channel.size()) {
                throw new IOException("the directory of the zip is damaged or of the 64-bit kind; write a plain zip");
            }
            ByteBuffer directory = read(channel, start, (int) length);
            return entries(directory);
        }
    }

    private static ByteBuffer end(SeekableByteChannel channel) throws IOException {
        int tail = (int) Math.min(channel.size(), END_LENGTH + LONGEST_COMMENT);
        ByteBuffer buffer = read(channel, channel.size() - tail, tail);
        for (int at = tail - END_LENGTH; at >= 0; at--) {
            if (buffer.getInt(at) == END_SIGNATURE) {
                return buffer.position(at);
            }
        }
        throw new IOException("this is no zip, or it is cut short");
    }

    private static List<Entry> entries(ByteBuffer directory) throws IOException {
        List<Entry> entries = new ArrayList<>();
        while (directory.remaining() >= ENTRY_LENGTH && directory.getInt(directory.position()) == ENTRY_SIGNATURE) {
            int at = directory.position();
            int nameLength = Short.toUnsignedInt(directory.getShort(at + 28));
            int next = at + ENTRY_LENGTH + nameLength + Short.toUnsignedInt(directory.getShort(at + 30))
                    + Short.toUnsignedInt(directory.getShort(at + 32));
            if (next > directory.limit()) {
                throw new IOException("the directory of the zip is damaged");
            }
            byte[] name = new byte[nameLength];
            directory.position(at + ENTRY_LENGTH).get(name).position(next);
            int kind = directory.getInt(at + 38) >>> 16 & UNIX_KIND;
            boolean plain = kind == 0 || kind == UNIX_FILE || kind == UNIX_FOLDER;
            entries.add(new Entry(new String(name, StandardCharsets.UTF_8), kind == UNIX_LINK, !plain && kind != UNIX_LINK));
        }
        return entries;
    }

    private static ByteBuffer read(SeekableByteChannel channel, long start, int length) throws IOException {
        ByteBuffer buffer = ByteBuffer.allocate(length).order(ByteOrder.LITTLE_ENDIAN);
        channel.position(start);
        while (buffer.hasRemaining() && channel.read(buffer) >= 0) {
            continue;
        }
        return buffer.flip();
    }
}
