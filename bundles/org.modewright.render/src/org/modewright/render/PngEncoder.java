package org.modewright.render;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.CRC32;
import java.util.zip.DeflaterOutputStream;

/** Writes a raster as PNG (ISO/IEC 15948): 8 bits a channel with opacity, no interlace, each row filtered by the row above. */
public final class PngEncoder {

    private static final byte[] SIGNATURE = {(byte) 0x89, 'P', 'N', 'G', '\r', '\n', 0x1A, '\n'};
    private static final int HEADER_LENGTH = 13;
    private static final int EIGHT_BITS = 8;
    private static final int COLOUR_WITH_ALPHA = 6;
    private static final int FILTER_UP = 2;

    private PngEncoder() {
    }

    public static byte[] encode(Raster raster) {
        ByteArrayOutputStream png = new ByteArrayOutputStream();
        png.writeBytes(SIGNATURE);
        ByteBuffer header = ByteBuffer.allocate(HEADER_LENGTH).putInt(raster.width()).putInt(raster.height());
        header.put((byte) EIGHT_BITS).put((byte) COLOUR_WITH_ALPHA);
        chunk(png, "IHDR", header.array());
        chunk(png, "IDAT", compressed(raster));
        chunk(png, "IEND", new byte[0]);
        return png.toByteArray();
    }

    public static void write(Raster raster, Path file) throws IOException {
        Files.write(file, encode(raster));
    }

    private static byte[] compressed(Raster raster) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        byte[] row = new byte[4 * raster.width()];
        byte[] above = new byte[row.length];
        byte[] filtered = new byte[row.length + 1];
        filtered[0] = FILTER_UP;
        try (DeflaterOutputStream deflater = new DeflaterOutputStream(bytes)) {
            for (int y = 0; y < raster.height(); y++) {
                fill(raster, y, row);
                for (int i = 0; i < row.length; i++) {
                    filtered[i + 1] = (byte) (row[i] - above[i]);
                }
                deflater.write(filtered);
                byte[] swap = above;
                above = row;
                row = swap;
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return bytes.toByteArray();
    }

    private static void fill(Raster raster, int y, byte[] row) {
        for (int x = 0; x < raster.width(); x++) {
            int argb = raster.pixel(x, y);
            row[4 * x] = (byte) (argb >> 16);
            row[4 * x + 1] = (byte) (argb >> 8);
            row[4 * x + 2] = (byte) argb;
            row[4 * x + 3] = (byte) (argb >>> 24);
        }
    }

    private static void chunk(ByteArrayOutputStream png, String name, byte[] data) {
        byte[] type = name.getBytes(StandardCharsets.US_ASCII);
        CRC32 check = new CRC32();
        check.update(type);
        check.update(data);
        png.writeBytes(ByteBuffer.allocate(4).putInt(data.length).array());
        png.writeBytes(type);
        png.writeBytes(data);
        png.writeBytes(ByteBuffer.allocate(4).putInt((int) check.getValue()).array());
    }
}
