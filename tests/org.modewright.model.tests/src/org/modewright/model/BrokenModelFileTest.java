package org.modewright.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

import org.eclipse.emf.common.util.URI;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Each broken text gives one error that says line, column, what and what to do.
 */
class BrokenModelFileTest {

    private static final String NAMESPACES = "xmi:version=\"2.0\" xmlns:xmi=\"http://www.omg.org/XMI\" "
            + "xmlns:xsi=\"http://www.w3.org/2001/XMLSchema-instance\" xmlns:structure=\"urn:modewright:structure:1\"";

    @TempDir
    Path folder;

    /** The body begins on line 3. */
    private static String document(String... body) {
        return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<structure:StructuralModel " + NAMESPACES + " formatVersion=\"1\">\n"
                + String.join("\n", body) + "\n</structure:StructuralModel>\n";
    }

    private static ModelFileException refused(String text) {
        return refused(text.getBytes(StandardCharsets.UTF_8));
    }

    private static ModelFileException refused(byte[] text) {
        return assertThrows(ModelFileException.class, () -> ModelFile.load(new ByteArrayInputStream(text), "hall.modewright"));
    }

    private static void assertFault(String text, int line, int column, String message) {
        ModelFileException e = refused(text);
        assertTrue(e.getMessage().contains(message), e.getMessage());
        assertEquals(line + ":" + column, e.line() + ":" + e.column(), e.getMessage());
        assertTrue(e.getMessage().startsWith("hall.modewright, line " + line + ", column " + column + ": "), e.getMessage());
        assertFalse(e.remedy().isBlank());
    }

    @Test
    void theSoundTwinLoads() throws IOException {
        String text = document("  <materials id=\"mat1\" name=\"Steel\"/>", "  <nodes id=\"n1\" name=\"A\"/>", "  <nodes id=\"n2\"/>",
                "  <members id=\"m1\" start=\"n1\" end=\"n2\" material=\"mat1\" startFree=\"ry rz\"/>",
                "  <rigidFloors id=\"f1\" nodes=\"n1 n2\"/>");
        assertEquals(2, ModelFile.load(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "x").getRigidFloors().get(0)
                .getNodes().size());
    }

    @Test
    void unknownAttribute() {
        assertFault(document("  <nodes id=\"n1\" colour=\"red\"/>"), 3, 18, "A Node has no property 'colour'.");
    }

    @Test
    void unknownElement() {
        assertFault(document("  <nodes id=\"n1\"/>", "    <walls id=\"w1\"/>"), 4, 6, "A StructuralModel has no property 'walls'.");
    }

    @Test
    void valueThatIsNoNumber() {
        assertFault(document("  <nodes id=\"n1\" x=\"1,5\"/>"), 3, 18, "The x of a Node is '1,5', which is not a number.");
        assertFault(document("  <analysis modes=\"ten\"/>"), 3, 13, "is not a whole number");
        assertFault(document("  <audit x=\"yes\"/>"), 3, 10, "is not true or false");
        assertFault(document("  <members id=\"m1\" mass=\"heavy\"/>"), 3, 20,
                "The mass of a Member is 'heavy', which is not one of 'as the model', 'consistent', 'lumped'.");
        assertFault(document("  <members id=\"m1\" startFree=\"ry rq\"/>"), 3, 20, "is 'ry rq', which is not a list of 'ux'");
    }

    @Test
    void danglingReference() {
        assertFault(document("  <nodes id=\"n1\"/>", "  <members id=\"m1\" name=\"B1\" start=\"n1\" end=\"n9\"/>",
                "  <nodes id=\"n2\"/>"), 4, 46, "The end of member B1 refers to 'n9', which is not in the file.");
        assertFault(document("  <nodes id=\"n1\"/>", "  <rigidFloors id=\"f1\" nodes=\"n1 n2\"/>"), 4, 34, "refers to 'n2'");
        assertFault(document("  <rigidFloors id=\"f1\" nodes=\"n1 n2 n3 n4 n5 n6 n7\"/>"), 3, 31, "refers to 'n1'");
    }

    @Test
    void referenceToTheWrongKind() {
        assertFault(document("  <materials id=\"mat1\" name=\"Steel\"/>", "  <members id=\"m1\" start=\"mat1\"/>",
                "  <nodes id=\"n2\"/>"), 4, 20,
                "The start of member m1 refers to material Steel, not to a Node.");
        assertFault(document("  <materials id=\"mat1\"/>", "  <rigidFloors id=\"f1\" nodes=\"mat1\"/>", "  <nodes id=\"n2\"/>"), 4, 24,
                "refers to material mat1, not to a Node.");
    }

    @Test
    void repeatedMissingAndBadIds() {
        assertFault(document("  <nodes id=\"n1\"/>", "  <nodes name=\"n1\" id=\"n1\"/>"), 4, 24, "The id 'n1' of a Node is already taken");
        assertFault(document("  <nodes name=\"A\"/>"), 3, 3, "A Node has no id.");
        assertFault(document("  <nodes id=\"a b\"/>"), 3, 14, "The id 'a b' of a Node is not valid.");
    }

    @Test
    void brokenXml() {
        ModelFileException e = refused(document("  <members id=\"m1\"/>", "  <nodes id=\"n1\">"));
        assertTrue(e.getMessage().contains("not well-formed XML"), e.getMessage());
        assertEquals(5, e.line());
        assertFault("", 1, 1, "not well-formed XML");
        ModelFileException cut = refused(document("  <nodes id=\"n1\"/>").substring(0, 150));
        assertEquals(2, cut.line());
    }

    @Test
    void wrongEncoding() {
        byte[] latin = document("  <nodes id=\"n1\" name=\"Stütze\"/>").getBytes(StandardCharsets.ISO_8859_1);
        ModelFileException e = refused(latin);
        assertTrue(e.getMessage().contains("not text in the encoding"), e.getMessage());
    }

    @Test
    void doctypeAndEntitiesAreRefused() throws IOException {
        Path secret = Files.writeString(folder.resolve("secret.txt"), "do-not-tell");
        String text = "<?xml version=\"1.0\"?>\n<!DOCTYPE m [<!ENTITY e SYSTEM \"" + secret.toUri() + "\">]>\n"
                + "<structure:StructuralModel " + NAMESPACES + " name=\"&e;\" notes=\"x\"><notes>&e;</notes></structure:StructuralModel>";
        ModelFileException e = refused(text);
        assertTrue(e.getMessage().contains("A DOCTYPE is not allowed in a model file."), e.getMessage());
        assertEquals(2, e.line());
        assertFalse(e.getMessage().contains("do-not-tell"));
    }

    @Test
    void entityBombsAreRefused() {
        String text = "<?xml version=\"1.0\"?>\n<!DOCTYPE m [<!ENTITY a \"aaaaaaaaaa\"><!ENTITY b \"&a;&a;&a;&a;&a;&a;&a;&a;\">]>\n"
                + "<structure:StructuralModel " + NAMESPACES + " name=\"&b;\"/>";
        assertTrue(refused(text).getMessage().contains("DOCTYPE"));
    }

    @Test
    void nothingOutsideTheFileIsRead() throws IOException {
        Path other = folder.resolve("other.modewright");
        Files.writeString(other, document("  <nodes id=\"n7\"/>"));
        assertFault(document("  <members id=\"m1\" start=\"" + other.toUri() + "#n7\"/>"), 3, 27,
                "A reference leads out of the file");
        assertFault(document("  <members id=\"m1\">", "    <start href=\"other.modewright#n7\"/>", "  </members>"), 4, 18,
                "A reference leads out of the file ('other.modewright#n7').");
    }

    @Test
    void foreignPackagesAreRefused() {
        String text = document("  <loadPatterns id=\"p\"><loads xsi:type=\"ecore:EClass\"/></loadPatterns>").replace("xmlns:xsi",
                "xmlns:ecore=\"http://www.eclipse.org/emf/2002/Ecore\" xmlns:xsi");
        ModelFileException e = refused(text);
        assertTrue(e.getMessage().contains("The namespace 'http://www.eclipse.org/emf/2002/Ecore' has no place in a model file."),
                e.getMessage());
        assertEquals(3, e.line());
    }

    @Test
    void wrongAndAbstractKinds() {
        ModelFileException unknown = refused(document("  <loadPatterns id=\"p\">", "    <loads xsi:type=\"structure:WindLoad\"/>",
                "  </loadPatterns>"));
        assertEquals(4, unknown.line(), unknown.getMessage());
        assertTrue(unknown.getMessage().contains("WindLoad"), unknown.getMessage());
        ModelFileException abstractKind = refused(document("  <loadPatterns id=\"p\">", "    <loads value=\"1\"/>", "  </loadPatterns>"));
        assertEquals(4, abstractKind.line(), abstractKind.getMessage());
        assertTrue(abstractKind.getMessage().contains("GravityLoad"), abstractKind.getMessage());
    }

    @Test
    void notAModelFile() {
        assertFault("<?xml version=\"1.0\"?>\n<html><body/></html>", 2, 2, "This is not a model file");
        assertFault("<xmi:XMI xmlns:xmi=\"http://www.omg.org/XMI\"/>", 1, 2, "This is not a model file");
        assertFault("<s:Node xmlns:s=\"urn:modewright:structure:1\" id=\"n1\"/>", 1, 2,
                "The root element is s:Node, not a StructuralModel.");
    }

    @Test
    void newerVersionsAreSaid() {
        String newer = document("  <panels id=\"p1\"/>").replace("formatVersion=\"1\"", "formatVersion=\"2\"");
        ModelFileException attribute = refused(newer);
        assertTrue(attribute.getMessage().contains("written by a newer Modewright (file format 2; this one reads up to 1)."),
                attribute.getMessage());
        assertEquals(2, attribute.line());
        assertEquals(newer.lines().toList().get(1).indexOf("formatVersion") + 1, attribute.column());
        ModelFileException namespace = refused(document().replace("structure:1", "structure:3"));
        assertTrue(namespace.getMessage().contains("file format 3"), namespace.getMessage());
    }

    @Test
    void versionsThatAreNoneAreSaid() {
        assertTrue(refused(document().replace("formatVersion=\"1\"", "formatVersion=\"one\"")).getMessage().contains("'one'"));
        assertTrue(refused(document().replace("formatVersion=\"1\"", "formatVersion=\"0\"")).getMessage().contains("no file format 0"));
    }

    @Test
    void textBetweenElementsThatMeansNothingIsHarmless() throws IOException {
        String text = document("  <!-- remark --> <nodes id=\"n1\"> </nodes>");
        assertEquals(1, ModelFile.load(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "x").getNodes().size());
    }

    @Test
    void aResourceKeepsNothingOfABrokenFile() throws IOException {
        Path file = Files.writeString(folder.resolve("broken.modewright"), document("  <nodes id=\"n1\"/>", "  <nodes id=\"n1\"/>"));
        StructureResource resource = new StructureResource(URI.createFileURI(file.toString()));
        ModelFileException e = assertThrows(ModelFileException.class, () -> resource.load(null));
        assertEquals(4, e.line());
        assertEquals(0, resource.getContents().size());
        assertEquals(file.toString(), e.file());
    }
}
