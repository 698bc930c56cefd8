package org.modewright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Packages that would read outside themselves or fill the memory are refused. */
class PackageSafetyTest {

    private static final int LINK = 0120777;
    private static final int PIPE = 0010777;

    @TempDir
    Path temporary;

    @ParameterizedTest
    @ValueSource(strings = {"../evil.csv", "a/../../evil.csv", "..", "/etc/passwd", "C:/evil.csv", "a\\..\\evil.csv", "~/evil",
            "file:evil", "a\u0001b"})
    void entriesThatLeaveThePackageAreRefused(String name) throws IOException {
        Path zip = new PackageFixture().put(name, "x").zip(temporary.resolve("p.zip"));
        Problem problem = only(zip);
        assertEquals("p.zip", problem.file());
        assertEquals(name, problem.value());
        assertTrue(problem.text().startsWith("entry refused"), problem.text());
        assertFalse(Files.exists(temporary.resolve("evil.csv")));
    }

    @Test
    void linksInAZipAreRefused() throws IOException {
        Path zip = new PackageFixture().put("link.csv", "/etc/passwd").zip(temporary.resolve("p.zip"));
        setKind(zip, "link.csv", LINK);
        assertTrue(only(zip).text().contains("it is a link"));
        setKind(zip, "link.csv", PIPE);
        assertTrue(only(zip).text().contains("neither a file nor a folder"));
    }

    @Test
    void anEntryThatExpandsTooFarIsRefused() throws IOException {
        StringBuilder nodes = new StringBuilder("id,x,y,z\n");
        nodes.append(" ".repeat(40 << 20));
        Problem problem = only(new PackageFixture().put("nodes.csv", nodes.toString()).zip(temporary.resolve("p.zip")));
        assertEquals("nodes.csv", problem.file());
        assertTrue(problem.text().contains("200 times its stored size"), problem.text());
    }

    /** What the zip declares is judged before a row is read: rows by the million would fill the memory on the way to the limit. */
    @Test
    void rowsOfAnEntryThatExpandsTooFarAreNotRead() throws IOException {
        String nodes = "id,x,y,z\n" + "N,0,0,0\n".repeat(1 << 20);
        Problem problem = only(new PackageFixture().put("nodes.csv", nodes).zip(temporary.resolve("p.zip")));
        assertEquals("nodes.csv", problem.file());
        assertTrue(problem.text().contains("200 times its stored size"), problem.text());
    }

    @Test
    void anHonestLargeTableIsRead() throws IOException {
        StringBuilder nodes = new StringBuilder("id,x,y,z\nN1,0,0,0\nN2,0,0,3\nN3,4,0,3\nN4,4,0,0\n");
        for (int i = 0; i < 60_000; i++) {
            nodes.append("K").append(i).append(',').append(i % 100 * 6).append(',').append(i / 100 * 6).append(",3.5\n");
        }
        assertEquals(60_004, TablePackage.read(new PackageFixture().put("nodes.csv", nodes.toString()).zip(temporary.resolve("p.zip")))
                .model().getNodes().size());
    }

    @Test
    void manyEntriesAreRefused() throws IOException {
        Path zip = temporary.resolve("p.zip");
        try (OutputStream out = Files.newOutputStream(zip); ZipOutputStream stream = new ZipOutputStream(out)) {
            for (int i = 0; i < 10_001; i++) {
                stream.putNextEntry(new ZipEntry("f" + i));
                stream.closeEntry();
            }
        }
        assertTrue(only(zip).text().contains("10001 entries"));
    }

    @Test
    void theDescriptionMustStandAtTheRoot() throws IOException {
        Path zip = temporary.resolve("p.zip");
        try (OutputStream out = Files.newOutputStream(zip); ZipOutputStream stream = new ZipOutputStream(out)) {
            stream.putNextEntry(new ZipEntry("portal/datapackage.json"));
            stream.write("{}".getBytes(StandardCharsets.UTF_8));
        }
        Problem problem = only(zip);
        assertEquals("portal/datapackage.json", problem.value());
        assertTrue(problem.text().contains("root of the zip"), problem.text());
    }

    @Test
    void anEntryTwiceIsRefused() throws IOException {
        Path zip = new PackageFixture().put("nodes2csv", "id,x,y,z\n").zip(temporary.resolve("p.zip"));
        byte[] bytes = Files.readAllBytes(zip);
        String text = new String(bytes, StandardCharsets.ISO_8859_1).replace("nodes2csv", "nodes.csv");
        Files.write(zip, text.getBytes(StandardCharsets.ISO_8859_1));
        assertTrue(only(zip).text().contains("twice"));
    }

    @Test
    void brokenZipsGiveOneProblem() throws IOException {
        Path zip = new PackageFixture().zip(temporary.resolve("p.zip"));
        byte[] bytes = Files.readAllBytes(zip);
        Files.write(zip, Arrays.copyOf(bytes, bytes.length / 2));
        assertEquals(1, assertThrows(PackageException.class, () -> TablePackage.read(zip)).total());
        Files.writeString(zip, "this is no zip");
        assertTrue(only(zip).text().contains("no zip"));
        Files.write(zip, new byte[0]);
        assertTrue(only(zip).text().contains("no zip"));
    }

    @Test
    void linksThatLeaveAFolderAreRefused() throws IOException {
        Path outside = Files.writeString(temporary.resolve("levels.csv"), "id,elevation\nx,1\n");
        Path folder = new PackageFixture().folder(Files.createDirectory(temporary.resolve("p")));
        Files.delete(folder.resolve("levels.csv"));
        Files.createSymbolicLink(folder.resolve("levels.csv"), outside);
        Problem problem = only(folder);
        assertEquals("levels.csv", problem.file());
        assertTrue(problem.text().contains("link that leaves the package"), problem.text());
        Files.delete(folder.resolve("levels.csv"));
        Files.createSymbolicLink(folder.resolve("levels.csv"), Files.writeString(folder.resolve("storeys.txt"), "id,elevation\nx,1\n"));
        assertEquals("x", TablePackage.read(folder).model().getLevels().get(0).getName());
    }

    @Test
    void aDescriptionThatIsALinkToOutsideIsRefused() throws IOException {
        Path inside = new PackageFixture().folder(Files.createDirectory(temporary.resolve("p")));
        Path other = Files.createDirectory(temporary.resolve("q"));
        Files.createSymbolicLink(other.resolve("datapackage.json"), inside.resolve("datapackage.json"));
        assertTrue(only(other).text().contains("link that leaves the package"));
    }

    @Test
    void aFolderInPlaceOfATableIsRefused() throws IOException {
        Path folder = new PackageFixture().folder(temporary);
        Files.delete(folder.resolve("levels.csv"));
        Files.createDirectory(folder.resolve("levels.csv"));
        assertTrue(only(folder).text().contains("not a file"));
    }

    /** Marks an entry of the central directory as made on Unix and of this kind. */
    private static void setKind(Path zip, String name, int mode) throws IOException {
        ByteBuffer bytes = ByteBuffer.wrap(Files.readAllBytes(zip)).order(ByteOrder.LITTLE_ENDIAN);
        for (int at = 0; at < bytes.limit() - 46; at++) {
            if (bytes.getInt(at) == 0x02014b50) {
                byte[] entry = new byte[bytes.getShort(at + 28)];
                bytes.get(at + 46, entry);
                if (new String(entry, StandardCharsets.UTF_8).equals(name)) {
                    bytes.put(at + 5, (byte) 3).putInt(at + 38, mode << 16);
                }
            }
        }
        Files.write(zip, bytes.array());
    }

    private static Problem only(Path location) {
        PackageException exception = assertThrows(PackageException.class, () -> TablePackage.read(location));
        assertEquals(1, exception.total(), exception.getMessage());
        return exception.problems().get(0);
    }
}
