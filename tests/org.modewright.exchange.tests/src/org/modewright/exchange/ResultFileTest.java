package org.modewright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;

import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.modewright.audit.AuditRequest;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditRun;
import org.modewright.exchange.samples.SampleModels;
import org.modewright.fem.Assembly;
import org.modewright.fem.Snapshot;
import org.modewright.modal.Direction;
import org.modewright.modal.MatrixRun;
import org.modewright.modal.ModalRequest;
import org.modewright.modal.ModalResult;
import org.modewright.modal.ModalRun;
import org.modewright.model.structure.StructuralModel;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;

/** Result files, shapes and tables hold what the result holds, to the last digit. */
class ResultFileTest {

    private static final ModelFacts FACTS = new ModelFacts("Modewright 0.1.0", "quay-house", "demo.modewright", "0".repeat(64));
    private static AuditResult demo;

    @TempDir
    Path temporary;

    @BeforeAll
    static void auditDemo() {
        StructuralModel model = SampleModels.all().get("demo");
        demo = AuditRun.standard().run(model, AuditRequest.of(model).withModes(20), Progress.NONE);
    }

    @Test
    void theFileFollowsItsSchema() throws IOException {
        Path file = temporary.resolve("r.json");
        for (boolean allElements : new boolean[] {false, true}) {
            ResultFile.write(demo, FACTS, file, allElements);
            assertEquals(List.of(), SchemaCheck.faults(schema(), new JsonMapper().readTree(file.toFile())));
        }
        ResultFile.write(demo.modal(), FACTS, file, false);
        assertEquals(List.of(), SchemaCheck.faults(schema(), new JsonMapper().readTree(file.toFile())));
    }

    private static JsonNode schema() throws IOException {
        try (InputStream stream = ResultFileTest.class.getResourceAsStream("result.schema.json")) {
            return new JsonMapper().readTree(stream);
        }
    }

    @Test
    void everyDigitComesBack() throws IOException {
        Path file = temporary.resolve("r.json");
        ResultFile.write(demo, FACTS, file, false);
        StoredResult stored = ResultFile.read(file);
        ModalResult modal = demo.modal();
        assertEquals("Modewright 0.1.0", stored.program());
        assertEquals(new StoredResult.Model("quay-house", "demo.modewright", "0".repeat(64), modal.nodeCount(), modal.memberCount(), 0,
                modal.freeDofs()), stored.model());
        assertEquals(modal.mass().movable()[1], stored.mass().movable().get("y"));
        assertEquals(modal.mass().onSupports()[2], stored.mass().onSupports().get("z"));
        assertEquals(modal.mass().centre()[2], stored.mass().centre().get(2));
        assertEquals(modal.mass().rotary()[2], stored.mass().rotary().get("rz"));
        assertEquals(modal.certificate().belowHz(), stored.certificate().belowHz());
        assertEquals(20, stored.modes().size());
        for (int i = 0; i < 20; i++) {
            assertEquals(modal.modes().get(i).frequency(), stored.modes().get(i).frequency());
            assertEquals(modal.modes().get(i).period(), stored.modes().get(i).period());
            assertEquals(modal.modes().get(i).spread(), stored.modes().get(i).spread());
            assertEquals(modal.modes().get(i).character().text(), stored.modes().get(i).character());
            for (Direction direction : Direction.values()) {
                assertEquals(modal.modes().get(i).participation(direction), stored.modes().get(i).participation().get(direction.word()));
                assertEquals(modal.modes().get(i).effectiveMassShare(direction),
                        stored.modes().get(i).effectiveMassShare().get(direction.word()));
            }
        }
        assertEquals(demo.verdicts().size(), stored.verdicts().size());
        assertEquals(demo.verdicts().get(1).text(), stored.verdicts().get(1).text());
        assertEquals(demo.verdicts().get(1).captured(), stored.verdicts().get(1).captured());
        assertEquals(demo.findings().get(0).objects().get(0).name(), stored.findings().get(0).objects().get(0));
    }

    /** The sum over the modes is the captured share; a sum of twenty doubles below 1 errs by less than 20 ulp. */
    @Test
    void captureIsTheSumOfTheModes() throws IOException {
        Path file = temporary.resolve("r.json");
        ResultFile.write(demo, FACTS, file, false);
        StoredResult stored = ResultFile.read(file);
        for (String direction : List.of("x", "y", "z")) {
            double sum = stored.modes().stream().mapToDouble(mode -> mode.effectiveMassShare().get(direction)).sum();
            assertEquals(sum, stored.capture().get(direction), 20 * Math.ulp(1.0));
        }
    }

    @Test
    void energyListsHoldTheLeadingElementsOrAll() throws IOException {
        Path file = temporary.resolve("r.json");
        ResultFile.write(demo, FACTS, file, false);
        for (StoredResult.Mode mode : ResultFile.read(file).modes()) {
            for (List<StoredResult.EnergyShare> list : List.of(mode.strainEnergy(), mode.kineticEnergy())) {
                double sum = list.stream().mapToDouble(StoredResult.EnergyShare::share).sum();
                double withoutLast = sum - list.get(list.size() - 1).share();
                assertTrue(list.size() == 20 || sum >= 0.8, list.toString());
                assertTrue(list.size() <= 20 && withoutLast < 0.8, list.toString());
            }
        }
        ResultFile.write(demo, FACTS, file, true);
        StoredResult.Mode first = ResultFile.read(file).modes().get(0);
        assertTrue(first.strainEnergy().size() > 20);
        // shares of one mode sum to 1; some 700 of them err by at most one rounding each
        assertEquals(1, first.strainEnergy().stream().mapToDouble(StoredResult.EnergyShare::share).sum(), 1e-12);
        assertEquals(1, first.kineticEnergy().stream().mapToDouble(StoredResult.EnergyShare::share).sum(), 1e-12);
    }

    @Test
    void aRigidBodyModeHasNoPeriod() throws IOException {
        StructuralModel model = TablePackage.read(new PackageFixture().remove("supports.csv").remove("springs.csv")
                .remove("rigid_links.csv").remove("rigid_floors.csv").describe().folder(temporary)).model();
        ModalResult result = ModalRun.run(Snapshot.of(model), ModalRequest.ofModes(8), Progress.NONE);
        Path file = temporary.resolve("r.json");
        ResultFile.write(result, FACTS, file, false);
        StoredResult stored = ResultFile.read(file);
        assertEquals(0, stored.modes().get(0).frequency());
        assertNull(stored.modes().get(0).period());
        assertEquals(List.of(), stored.verdicts());
        assertEquals(List.of(), SchemaCheck.faults(schema(), new JsonMapper().readTree(file.toFile())));
    }

    @Test
    void aPairOfMatricesHasNoModelAndNoDirections() throws IOException {
        SymmetricMatrix stiffness = SymmetricMatrix.builder(2).add(0, 0, 4).add(1, 1, 9).build();
        SymmetricMatrix mass = SymmetricMatrix.builder(2).add(0, 0, 1).add(1, 1, 1).build();
        MatrixRun.Result result = MatrixRun.run(stiffness, mass, ModalRequest.ofModes(2), Progress.NONE);
        Path file = temporary.resolve("r.json");
        ResultFile.write(result, "Modewright", Map.of("eigen", 1.5), file);
        JsonNode json = new JsonMapper().readTree(file.toFile());
        for (String property : List.of("model", "mass", "capture", "verdicts", "findings")) {
            assertFalse(json.has(property), property);
        }
        StoredResult stored = ResultFile.read(file);
        // omega = 2 and 3 rad/s
        assertEquals(1 / Math.PI, stored.modes().get(0).frequency(), 1e-15);
        assertEquals(1.5 / Math.PI, stored.modes().get(1).frequency(), 1e-15);
        assertNull(stored.modes().get(0).participation());
        assertEquals(1.5, stored.seconds().get("eigen"));
    }

    @Test
    void otherFilesAndVersionsAreRefused() throws IOException {
        Path file = temporary.resolve("r.json");
        ResultFile.write(demo, FACTS, file, false);
        String text = Files.readString(file);
        Files.writeString(file, text.replaceFirst("\"version\" : 1", "\"version\" : 2"));
        assertTrue(assertThrows(IOException.class, () -> ResultFile.read(file)).getMessage().contains("version 2"));
        Files.writeString(file, text.substring(0, text.length() / 2));
        assertTrue(assertThrows(IOException.class, () -> ResultFile.read(file)).getMessage().contains("line"));
        Files.writeString(file, "[]");
        assertThrows(IOException.class, () -> ResultFile.read(file));
    }

    @Test
    void shapesComeBackNodeByNode() throws IOException {
        Path file = temporary.resolve("shapes.h5");
        ShapesFile.write(demo.modal(), file);
        ShapesFile.Shapes shapes = ShapesFile.read(file);
        assertEquals(20, shapes.frequency().length);
        assertEquals(demo.modal().nodes().stream().map(node -> node.name()).toList(), shapes.node());
        for (int mode = 0; mode < 20; mode++) {
            assertEquals(demo.modal().modes().get(mode).frequency(), shapes.frequency()[mode]);
            double[] shape = demo.modal().shape(mode);
            for (int i = 0; i < shape.length; i++) {
                assertEquals(shape[i], shapes.shape()[mode][i / 6][i % 6]);
            }
        }
        Files.writeString(file, "no shapes");
        assertThrows(IOException.class, () -> ShapesFile.read(file));
    }

    @Test
    void tablesHoldTheSameNumbers() throws IOException {
        ResultTables.write(demo, temporary.resolve("tables"));
        List<CSVRecord> modes = table("modes.csv");
        assertEquals(20, modes.size());
        assertEquals(demo.modal().modes().get(3).frequency(), Double.parseDouble(modes.get(3).get("frequency (Hz)")));
        assertEquals(demo.modal().capture(Direction.Y), Double.parseDouble(modes.get(19).get("captured up to here y")));
        assertEquals(demo.findings().size(), table("findings.csv").size());
        assertEquals("D2-1; K1", table("findings.csv").stream().filter(row -> row.get("finding").equals("nodes-not-joined")).findFirst()
                .orElseThrow().get("objects"));
        assertEquals(2, table("verdicts.csv").size());
        double movable = table("mass.csv").stream().filter(row -> !row.get("origin").equals("all") && row.get("direction").equals("x"))
                .mapToDouble(row -> Double.parseDouble(row.get("movable (kg)"))).sum();
        // five sources of some 1e5 kg: rounding far below a milligram
        assertEquals(demo.modal().mass().movable()[0], movable, 1e-6);
        for (String roll : List.of("groups.csv", "levels.csv")) {
            double sum = table(roll).stream().filter(row -> row.get("mode").equals("4") && row.get("energy").equals("strain"))
                    .mapToDouble(row -> Double.parseDouble(row.get("share"))).sum();
            assertEquals(1, sum, 1e-12);
        }
    }

    @Test
    void tablesAreSafeForSpreadsheets() throws IOException {
        StructuralModel model = SampleModels.all().get("tip-mass");
        model.getNodes().get(1).setName("=HYPERLINK(\"x\")");
        AuditResult result = AuditRun.standard().run(model, AuditRequest.of(model), Progress.NONE);
        ResultTables.write(result, temporary.resolve("tables"), true);
        List<CSVRecord> energy = table("energy.csv");
        assertTrue(energy.stream().anyMatch(row -> row.get("element").equals("'=HYPERLINK(\"x\")")));
        assertTrue(energy.stream().noneMatch(row -> row.get("element").startsWith("=")));
    }

    @Test
    void matricesOfAModelGiveItsFrequencies() throws IOException {
        StructuralModel model = SampleModels.all().get("cantilever");
        List<Path> files = MatrixFiles.write(Assembly.of(Snapshot.of(model), Progress.NONE), temporary.resolve("c.mtx"));
        assertEquals(List.of("c.K.mtx", "c.M.mtx", "c.dofs.csv"), files.stream().map(file -> file.getFileName().toString()).toList());
        MatrixRun.Result pair = MatrixRun.run(MatrixMarket.read(files.get(0)), MatrixMarket.read(files.get(1)), ModalRequest.ofModes(9),
                Progress.NONE);
        ModalResult modes = ModalRun.run(Snapshot.of(model), ModalRequest.ofModes(9), Progress.NONE);
        for (int i = 0; i < 9; i++) {
            // the same matrices, so the same frequencies but for the rounding of the eigen solution
            assertEquals(modes.modes().get(i).frequency(), pair.frequencies()[i], 1e-9 * pair.frequencies()[i]);
        }
        try (CSVParser parser = CSVParser.parse(files.get(2), StandardCharsets.UTF_8, CSVFormat.RFC4180)) {
            List<CSVRecord> rows = parser.getRecords();
            assertEquals(List.of("row", "node", "component"), rows.get(0).toList());
            assertEquals(19, rows.size());
            assertEquals(List.of("1", "1", "ux"), rows.get(1).toList());
        }
    }

    private List<CSVRecord> table(String name) throws IOException {
        CSVFormat format = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get();
        try (CSVParser parser = CSVParser.parse(temporary.resolve("tables").resolve(name), StandardCharsets.UTF_8,
                format)) {
            return parser.getRecords();
        }
    }
}
