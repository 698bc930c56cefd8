package org.modewright.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.audit.RulePackException.Problem;

/** Rule packs: the built-in one, an office's own, and what is said of broken ones. */
class RulePackFileTest {

    private static final String GOOD = """
            {"formatVersion": 1, "id": "office-95", "title": "Office rule", "version": "3", "source": "office handbook",
                    "provenance": "read",
             "clauses": [{"id": "mass", "measure": "captured-mass", "required": 0.95, "statement": "At least 95 %."}]}
            """;

    private static RulePack read(String json) throws IOException {
        return RulePackFile.read(new ByteArrayInputStream(json.getBytes(StandardCharsets.UTF_8)), "pack.json");
    }

    @Test
    void commonPracticeIsBuiltIn() {
        RulePack pack = RulePacks.builtIn().get("common-90");
        assertEquals(0.9, pack.capturedMass().required());
        assertEquals("common practice, no source", pack.source());
        assertEquals(List.of(pack), RulePacks.builtIn().all());
    }

    @Test
    void goodFileIsRead() throws IOException {
        RulePack pack = read(GOOD);
        assertEquals("office-95", pack.id());
        assertEquals("3", pack.version());
        assertEquals(0.95, pack.capturedMass().required());
        assertEquals("At least 95 %.", pack.clauses().get(0).statement());
    }

    @Test
    void unknownPackIsRefusedWithTheList() {
        String message = assertThrows(IllegalArgumentException.class, () -> RulePacks.builtIn().get("none")).getMessage();
        assertEquals("There is no rule pack \"none\"; there are: common-90.", message);
    }

    /** One change to the good file each: what to replace, by what, and the place and words of the message. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
        "\"formatVersion\": 1|\"formatVersion\": 2|/formatVersion|use a newer program",
        "\"formatVersion\": 1|\"formatVersion\": \"1\"|/formatVersion|must be the number 1",
        "\"formatVersion\": 1, |``|/formatVersion|is missing",
        "\"id\": \"office-95\"|\"id\": \"Office 95\"|/id|lower-case letters, digits and single hyphens",
        "\"id\": \"office-95\", |``|/id|is missing",
        "\"title\": \"Office rule\"|\"title\": \" \"|/title|must be a text",
        "\"version\": \"3\"|\"version\": 3|/version|must be a text",
        "\"source\": \"office handbook\", |``|/source|is missing",
        "\"provenance\": \"read\"|\"provenance\": \"read\", \"colour\": \"red\"|/colour|is not known; the properties here are",
        "\"clauses\": [|\"clauses\": [SAME, |/clauses/1/id|used by an earlier",
        "\"clauses\": [|\"clauses\": [OTHER, |/clauses|exactly one",
        "\"clauses\": [|\"clauses\": [7, |/clauses/0|must be an object",
        "\"required\": 0.95|\"required\": 95|/clauses/0/required|such as 0.9 for 90 %",
        "\"required\": 0.95|\"required\": 0|/clauses/0/required|above 0",
        "\"required\": 0.95|\"required\": \"0.95\"|/clauses/0/required|give a share",
        "\"required\": 0.95, |``|/clauses/0/required|is missing",
        "captured-mass|number-of-modes|/clauses/0/measure|the measures are: captured-mass",
        "\"statement\": \"At least 95 %.\"|\"statement\": null|/clauses/0/statement|must be a text",
    })
    void brokenFileNamesThePlace(String from, String to, String pointer, String words) {
        String change = to == null ? "" : to.replace("SAME", clause("mass")).replace("OTHER", clause("more"));
        String broken = GOOD.replace(from, change);
        RulePackException refused = assertThrows(RulePackException.class, () -> read(broken));
        assertEquals(1, refused.problems().size(), refused.getMessage());
        Problem problem = refused.problems().get(0);
        assertEquals("pack.json", problem.file());
        assertEquals(pointer, problem.pointer());
        assertTrue(problem.text().contains(words), problem.text());
    }

    private static String clause(String id) {
        return "{\"id\": \"" + id + "\", \"measure\": \"captured-mass\", \"required\": 0.9, \"statement\": \"x\"}";
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', value = {"{\"id\": }|line 1", "{\"id\": \"a\", \"id\": \"b\"}|line 1",
            "|is one JSON object",
        "[]|is one JSON object", "{} {}|line 1"})
    void whatIsNoPackIsRefused(String json, String words) {
        RulePackException refused = assertThrows(RulePackException.class, () -> read(json == null ? "" : json));
        assertTrue(refused.getMessage().contains("pack.json"), refused.getMessage());
        assertTrue(refused.getMessage().contains(words), refused.getMessage());
    }

    @Test
    void allFaultsComeAtOnce() {
        RulePackException refused = assertThrows(RulePackException.class, () -> read("{\"formatVersion\": 1, \"clauses\": []}"));
        assertEquals(List.of("/id", "/provenance", "/source", "/title", "/version", "/clauses"),
                refused.problems().stream().map(Problem::pointer).toList());
    }

    @Test
    void folderAddsAnOfficesOwnPacks(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("b.json"), GOOD);
        Files.writeString(folder.resolve("a.json"), GOOD.replace("office-95", "office-99").replace("0.95", "0.99"));
        Files.writeString(folder.resolve("notes.txt"), "no pack");
        RulePacks packs = RulePacks.builtIn().with(folder);
        assertEquals(List.of("common-90", "office-99", "office-95"), packs.all().stream().map(RulePack::id).toList());
        assertEquals(1, RulePacks.builtIn().all().size());
    }

    @Test
    void folderWithFaultsNamesEveryFile(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("a.json"), GOOD.replace("office-95", "common-90"));
        Files.writeString(folder.resolve("b.json"), "{");
        RulePackException refused = assertThrows(RulePackException.class, () -> RulePacks.builtIn().with(folder));
        assertEquals(List.of("a.json", "b.json"), refused.problems().stream().map(Problem::file).toList());
        assertTrue(refused.getMessage().contains("taken by another rule pack"), refused.getMessage());
        RulePackException missing = assertThrows(RulePackException.class, () -> RulePacks.builtIn().with(folder.resolve("nowhere")));
        assertTrue(missing.getMessage().contains("nowhere"), missing.getMessage());
    }
}
