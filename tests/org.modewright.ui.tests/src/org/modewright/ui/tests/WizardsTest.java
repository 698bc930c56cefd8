package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.eclipse.core.resources.ResourcesPlugin;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.modewright.exchange.TablePackage;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.StructuralModel;
import org.modewright.samples.Sample;
import org.modewright.samples.Samples;
import org.modewright.testsupport.DialogObject;
import org.modewright.testsupport.TableObject;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.StructureEditorPart;
import org.modewright.ui.UiIds;

@ExtendWith(WorkbenchExtension.class)
class WizardsTest {

    private static final String TITLE = "Import table package";

    @Test
    void aSoundPackageIsShownAndImported(Workbench workbench, @TempDir Path folder) throws Exception {
        StructuralModel sample = sample();
        TablePackage.write(sample, folder.resolve("package"));
        DialogObject wizard = workbench.executeForDialog(UiIds.IMPORT_COMMAND, TITLE);
        wizard.type("import.source", folder.resolve("package").toString());
        TableObject counts = wizard.table("import.counts").waitForRows();
        assertTrue(counts.rowCount() >= 4);
        wizard.type("import.project", "Imported");
        wizard.press("Finish");
        wizard.waitUntilClosed();
        StructureEditorPart editor = workbench.structureEditor();
        assertEquals("Imported", workbench.ask(() -> editor.getModelFile().getProject().getName()));
        assertEquals(sample.getMembers().size(), workbench.ask(() -> editor.getLiveModel().getMembers().size()));
    }

    @Test
    void everyErrorIsListedAndNothingIsImported(Workbench workbench, @TempDir Path folder) throws Exception {
        Path faulty = folder.resolve("package");
        TablePackage.write(sample(), faulty);
        Path nodes = faulty.resolve("nodes.csv");
        String text = Files.readString(nodes, StandardCharsets.UTF_8);
        String[] lines = text.split("\r?\n");
        String[] cells = lines[1].split(",");
        cells[1] = "wide";
        lines[1] = String.join(",", cells);
        Files.writeString(nodes, String.join("\n", lines) + "\n", StandardCharsets.UTF_8);
        DialogObject wizard = workbench.executeForDialog(UiIds.IMPORT_COMMAND, TITLE);
        wizard.type("import.source", faulty.toString());
        wizard.type("import.project", "Imported").type("import.file", "model");
        TableObject problems = wizard.table("import.problems").waitForRows();
        assertEquals("nodes.csv", problems.text(0, "File"));
        assertEquals("2", problems.text(0, "Row"));
        assertEquals("wide", problems.text(0, "Value"));
        assertFalse(wizard.isEnabled("Finish"));
        wizard.press("Cancel");
        wizard.waitUntilClosed();
        assertFalse(ResourcesPlugin.getWorkspace().getRoot().getProject("Imported").exists());
    }

    @Test
    void aNewProjectBeginsWithAnEmptyModelInItsUnits(Workbench workbench) {
        DialogObject wizard = workbench.executeForDialog(UiIds.NEW_PROJECT_COMMAND, "New project");
        assertFalse(wizard.isEnabled("Finish"));
        wizard.type("newProject.name", "Bridge");
        wizard.type("newProject.units", "kip-ft");
        wizard.press("Finish");
        wizard.waitUntilClosed();
        StructureEditorPart editor = workbench.structureEditor();
        assertEquals("Bridge.modewright", workbench.ask(() -> editor.getModelFile().getName()));
        assertEquals("kip-ft", workbench.ask(() -> editor.getLiveModel().getUnits().getLiteral()));
        assertEquals(0, workbench.ask(() -> editor.getLiveModel().getNodes().size()));
    }

    @Test
    void aNewProjectCanBeginWithACopyOfASample(Workbench workbench) throws Exception {
        DialogObject wizard = workbench.executeForDialog(UiIds.NEW_PROJECT_COMMAND, "New project");
        wizard.type("newProject.name", "Copy").choose("newProject.fromSample");
        wizard.press("Finish");
        wizard.waitUntilClosed();
        StructureEditorPart editor = workbench.structureEditor();
        try (var bytes = Samples.all().get(0).open()) {
            StructuralModel original = ModelFile.load(bytes, "sample");
            assertEquals(original.getMembers().size(), workbench.ask(() -> editor.getLiveModel().getMembers().size()));
        }
    }

    @Test
    void anExportedModelReadsBackAsTheSame(Workbench workbench, @TempDir Path folder) throws Exception {
        workbench.openSample();
        StructuralModel model = workbench.structureEditor().getLiveModel();
        DialogObject wizard = workbench.executeForDialog(UiIds.EXPORT_COMMAND, "Export table package");
        assertFalse(wizard.isEnabled("Finish"));
        Path zip = folder.resolve("quay.zip");
        wizard.type("export.target", zip.toString());
        wizard.press("Finish");
        workbench.ui().waitUntil("the exported file", () -> Files.exists(zip));
        workbench.closeDialog("What the table package does not hold");
        wizard.waitUntilClosed();
        StructuralModel back = TablePackage.read(zip).model();
        assertEquals(workbench.ask(() -> model.getMembers().size()), back.getMembers().size());
        assertEquals(workbench.ask(() -> model.getNodes().size()), back.getNodes().size());
        assertEquals(workbench.ask(model::getUnits), back.getUnits());
    }

    private static StructuralModel sample() throws Exception {
        Sample last = Samples.all().get(Samples.all().size() - 1);
        for (Sample sample : Samples.all()) {
            if (sample.fileName().startsWith("three")) {
                last = sample;
            }
        }
        try (var bytes = last.open()) {
            return ModelFile.load(bytes, last.fileName());
        }
    }
}
