package org.modewright.codegen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The committed generated code is exactly what the generator makes of the committed Ecore and generator model. */
class GeneratedSourcesTest {

    private static final Path BUNDLES = Path.of(System.getProperty("bundles"));

    @Test
    void regeneratingChangesNothing(@TempDir Path scratch) throws IOException {
        new StructureGenerator(BUNDLES).generate(scratch);
        for (String bundle : StructureGenerator.BUNDLES) {
            Map<String, String> generated = sources(scratch.resolve(bundle));
            Map<String, String> committed = sources(BUNDLES.resolve(bundle));
            assertFalse(generated.isEmpty(), bundle + ": nothing was generated");
            assertEquals(generated.keySet(), committed.keySet(), bundle + ": run releng/regenerate and commit");
            generated.forEach((file, text) -> assertEquals(text, committed.get(file), bundle + "/" + file + ": run releng/regenerate and commit"));
        }
    }

    private static Map<String, String> sources(Path bundle) throws IOException {
        Map<String, String> sources = new TreeMap<>();
        StructureGenerator.read(bundle.resolve(StructureGenerator.SOURCE_FOLDER))
                .forEach((file, content) -> sources.put(file.toString(), new String(content, StandardCharsets.UTF_8)));
        return sources;
    }
}
