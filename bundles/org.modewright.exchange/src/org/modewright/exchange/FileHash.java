package org.modewright.exchange;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.DigestOutputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;

/**
 * The fingerprint by which a result names the model it was made from: SHA-256 of the file. For the folder of a table package it is the
 * SHA-256 of the lines that the usual check-sum tools print for {@code datapackage.json} and the {@code .csv} files of the folder, sorted
 * by name: hash, two blanks, name, line feed.
 */
public final class FileHash {

    private FileHash() {
    }

    /** Fingerprint of a file or of the folder of a table package, 64 lower-case hexadecimal digits. */
    public static String sha256(Path location) throws IOException {
        if (Files.isDirectory(location)) {
            return folder(location);
        }
        return location.endsWith(TablePackage.DESCRIPTOR) ? folder(location.toAbsolutePath().getParent()) : file(location);
    }

    private static String folder(Path folder) throws IOException {
        StringBuilder lines = new StringBuilder();
        try (Stream<Path> content = Files.list(folder)) {
            List<Path> files = content.filter(FileHash::counts).sorted().toList();
            for (Path file : files) {
                lines.append(file(file)).append("  ").append(file.getFileName()).append('\n');
            }
        }
        return HexFormat.of().formatHex(digest().digest(lines.toString().getBytes(StandardCharsets.UTF_8)));
    }

    private static boolean counts(Path file) {
        String name = file.getFileName().toString();
        return Files.isRegularFile(file) && (name.equals(TablePackage.DESCRIPTOR) || name.toLowerCase(Locale.ROOT).endsWith(".csv"));
    }

    private static String file(Path file) throws IOException {
        MessageDigest digest = digest();
        try (InputStream in = Files.newInputStream(file);
                DigestOutputStream out = new DigestOutputStream(OutputStream.nullOutputStream(), digest)) {
            in.transferTo(out);
        }
        return HexFormat.of().formatHex(digest.digest());
    }

    private static MessageDigest digest() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("Every Java platform has SHA-256.", e);
        }
    }
}
