package org.modewright.cli;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.exchange.FileHash;
import org.modewright.exchange.ResultFile;
import org.modewright.exchange.ShapesFile;
import org.modewright.exchange.StoredResult;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.StructuralModel;
import org.modewright.samples.Samples;

/** The commands end to end: on every sample, with every kind of file and every exit status. */
class CommandsTest {

    @TempDir
    Path temporary;

    @ParameterizedTest
    @ValueSource(strings = {"demo", "tip-mass", "two-storeys", "cantilever", "three-storeys", "mass-chain"})
    void everySamplePasses(String name) throws IOException {
        Path json = temporary.resolve("r.json");
        Console console = Console.run("check", "sample:" + name, "--json", json.toString());
        assertEquals(0, console.status(), console.toString());
        for (String word : List.of("PASSED", "Mass capture", "Certificate  complete: ", "movable", "on supports", "character", "Findings",
                "licensed engineer")) {
            assertTrue(console.out().contains(word), word + " in " + console);
        }
        assertEquals(1, console.out().split("licensed engineer", -1).length - 1);
        StoredResult result = ResultFile.read(json);
        assertTrue(result.certificate().complete());
        assertEquals(result.certificate().found(), result.certificate().counted());
        for (StoredResult.Verdict verdict : result.verdicts()) {
            double sum = result.modes().stream().mapToDouble(mode -> mode.effectiveMassShare().get(verdict.direction())).sum();
            assertTrue(verdict.pass());
            // a sum of at most 500 shares, each rounded once
            assertEquals(sum, verdict.captured(), 500 * Math.ulp(1.0));
            assertTrue(sum >= 0.9);
        }
        assertEquals(64, result.model().sha256().length());
    }

    @Test
    void theDemoNamesItsCanopyAndSolvesOn() {
        Console console = Console.run("check", "sample:demo");
        assertTrue(console.out().contains("warning  nodes-not-joined: Nodes D2-1 and K1"), console.toString());
        assertTrue(console.out().contains("solved on to"), console.toString());
        assertTrue(console.out().contains("local: "), console.toString());
    }

    @Test
    void tooFewModesEndWithOne() throws IOException {
        Path json = temporary.resolve("r.json");
        Console console = Console.run("check", "sample:demo", "--modes", "12", "--json", json.toString());
        assertEquals(1, console.status(), console.toString());
        assertTrue(console.out().contains("NOT PASSED"), console.toString());
        assertTrue(console.out().contains("not enough"), console.toString());
        StoredResult result = ResultFile.read(json);
        assertEquals(12, result.modes().size());
        assertEquals(List.of(true, false), result.verdicts().stream().map(StoredResult.Verdict::pass).toList());
        assertEquals(0, result.verdicts().get(1).reachedAtMode());
    }

    @Test
    void directionsAndLimitsAreObeyed() throws IOException {
        Path json = temporary.resolve("r.json");
        Console console = Console.run("check", "sample:demo", "--directions", "x", "--below", "5", "--json", json.toString());
        assertEquals(0, console.status(), console.toString());
        StoredResult result = ResultFile.read(json);
        assertEquals(List.of("x"), result.verdicts().stream().map(StoredResult.Verdict::direction).toList());
        assertTrue(result.modes().stream().allMatch(mode -> mode.frequency() < 5));
        assertEquals(1, Console.run("check", "sample:demo", "--directions", "y", "--below", "5").status());
        assertEquals(3, modes("solve", "sample:tip-mass", "--modes", "12"));
        assertEquals(2, modes("solve", "sample:tip-mass", "--modes", "2"));
    }

    private int modes(String... arguments) throws IOException {
        Path json = temporary.resolve("modes.json");
        String[] all = Arrays.copyOf(arguments, arguments.length + 2);
        all[arguments.length] = "--json";
        all[arguments.length + 1] = json.toString();
        Console console = Console.run(all);
        assertEquals(0, console.status(), console.toString());
        return ResultFile.read(json).modes().size();
    }

    @Test
    void aMechanismIsUnstableAndNamed() throws IOException {
        Path folder = stick("N1,1,1,1,1,1,1\n", "ry rz", "");
        Path json = temporary.resolve("r.json");
        Console console = Console.run("check", folder.toString(), "--json", json.toString());
        assertEquals(3, console.status(), console.toString());
        assertTrue(console.out().contains("UNSTABLE"), console.toString());
        assertTrue(console.out().contains("N2"), console.toString());
        assertTrue(ResultFile.read(json).findings().stream().anyMatch(finding -> finding.severity().equals("error")));
    }

    @Test
    void aFreeBodyIsUnstableToCheckAndHasRigidModesToSolve() throws IOException {
        Path folder = stick("", "", "");
        assertEquals(3, Console.run("check", folder.toString()).status());
        Path json = temporary.resolve("r.json");
        Console console = Console.run("solve", folder.toString(), "--modes", "8", "--json", json.toString());
        assertEquals(0, console.status(), console.toString());
        List<StoredResult.Mode> modes = ResultFile.read(json).modes();
        assertEquals(8, modes.size());
        for (int i = 0; i < 6; i++) {
            assertEquals(0, modes.get(i).frequency());
            assertNull(modes.get(i).period());
        }
        assertTrue(modes.get(6).frequency() > 0);
    }

    @Test
    void aBrokenPackageEndsWithTwoAndEveryFault() throws IOException {
        Path folder = stick("N7,1,1,1,1,1,1\nN1,1,1,1,1,1,x\n", "", "");
        Console console = Console.run("check", folder.toString());
        assertEquals(2, console.status());
        assertEquals("", console.out());
        assertTrue(console.err().contains("2 faults:"), console.toString());
        assertTrue(console.err().contains("supports.csv, row 2, column node, value \"N7\""), console.toString());
        assertTrue(console.err().contains("supports.csv, row 3, column rz, value \"x\""), console.toString());
    }

    @Test
    void aBrokenModelFileEndsWithTwoAndItsLine() throws IOException {
        Path file = Files.writeString(temporary.resolve("broken.modewright"), "<?xml version=\"1.0\"?>\n<nonsense>\n");
        Console console = Console.run("check", file.toString());
        assertEquals(2, console.status(), console.toString());
        assertTrue(console.err().contains("broken.modewright, line "), console.toString());
    }

    @Test
    void aModelThatCannotBeComputedEndsWithTwo() throws IOException {
        StructuralModel model = sample("tip-mass");
        model.getMaterials().get(0).setYoung(-1);
        Path file = temporary.resolve("m.modewright");
        ModelFile.save(model, file);
        Console console = Console.run("check", file.toString());
        assertEquals(2, console.status(), console.toString());
        assertTrue(console.err().contains("cannot be computed"), console.toString());
    }

    @Test
    void warningsOfAPackageGoToStandardError() throws IOException {
        Path folder = stick("N1,1,1,1,1,1,1\n", "", "");
        Files.writeString(folder.resolve("nodes.csv"), Files.readString(folder.resolve("nodes.csv")).replace("id,x,y,z", "id,x,y,z,note"));
        Console console = Console.run("solve", folder.toString(), "--quiet");
        assertEquals(0, console.status(), console.toString());
        assertEquals("Warning: nodes.csv: the column note is not known and was ignored", console.err().strip());
    }

    @Test
    void onlyWhatWasAskedForIsWritten() throws IOException {
        Path folder = stick("N1,1,1,1,1,1,1\n", "", "");
        Set<Path> before = files(temporary);
        assertEquals(0, Console.run("check", folder.toString()).status());
        assertEquals(before, files(temporary));
        Path shapes = temporary.resolve("s.h5");
        Path tables = temporary.resolve("tables");
        assertEquals(0, Console.run("check", folder.toString(), "--shapes", shapes.toString(), "--csv", tables.toString()).status());
        Set<Path> after = files(temporary);
        after.removeAll(before);
        assertEquals(Set.of("s.h5", "modes.csv", "energy.csv", "groups.csv", "levels.csv", "mass.csv", "verdicts.csv", "findings.csv"),
                after.stream().map(file -> file.getFileName().toString()).collect(Collectors.toSet()));
        assertEquals(2, ShapesFile.read(shapes).node().size());
    }

    @Test
    void factsOfTheModelAreInTheResult() throws IOException {
        Path folder = stick("N1,1,1,1,1,1,1\n", "", "");
        Path json = temporary.resolve("r.json");
        assertEquals(0, Console.run("check", folder.toString(), "--json", json.toString()).status());
        StoredResult.Model model = ResultFile.read(json).model();
        assertEquals("stick", model.name());
        assertEquals(folder.toString(), model.file());
        assertEquals(FileHash.sha256(folder), model.sha256());
        assertEquals(FileHash.sha256(folder), FileHash.sha256(folder.resolve("datapackage.json")));
        assertEquals(2, model.nodes());
        assertEquals(1, model.members());
        assertEquals(6, model.freeDofs());
    }

    /** model file -> folder -> zip -> model file: nothing is lost. */
    @Test
    void convertGoesRound() throws IOException {
        String folder = temporary.resolve("demo.package") + "/";
        String zip = temporary.resolve("demo.zip").toString();
        Path file = temporary.resolve("demo.modewright");
        for (List<String> step : List.of(List.of("sample:demo", folder), List.of(folder, zip), List.of(zip, file.toString()))) {
            Console console = Console.run("convert", step.get(0), step.get(1));
            assertEquals(0, console.status(), console.toString());
            assertEquals("Wrote " + Path.of(step.get(1)), console.out().strip());
            assertEquals("", console.err());
        }
        assertArrayEquals(ModelFile.bytes(sample("demo")), Files.readAllBytes(file));
    }

    @Test
    void convertNamesWhatIsLost() throws IOException {
        StructuralModel model = sample("tip-mass");
        model.getMembers().get(0).setTorsionFactor(0.5);
        Path file = temporary.resolve("m.modewright");
        ModelFile.save(model, file);
        Console console = Console.run("convert", file.toString(), temporary.resolve("m.zip").toString());
        assertEquals(0, console.status());
        assertTrue(console.err().contains("Warning: Effective-stiffness factors"), console.toString());
    }

    @Test
    void matricesOfAModelSolveToItsFrequencies() throws IOException {
        Path name = temporary.resolve("demo.mtx");
        Console converted = Console.run("convert", "sample:demo", name.toString());
        assertEquals(0, converted.status(), converted.toString());
        assertFalse(Files.exists(name));
        Path ofMatrices = temporary.resolve("matrices.json");
        Path ofModel = temporary.resolve("model.json");
        Console solved = Console.run("solve", temporary.resolve("demo.K.mtx").toString(), temporary.resolve("demo.M.mtx").toString(),
                "--modes", "20", "--json", ofMatrices.toString());
        assertEquals(0, solved.status(), solved.toString());
        assertEquals(0, Console.run("solve", "sample:demo", "--modes", "20", "--json", ofModel.toString()).status());
        StoredResult pair = ResultFile.read(ofMatrices);
        StoredResult model = ResultFile.read(ofModel);
        assertNull(pair.model());
        for (int i = 0; i < 20; i++) {
            // the same matrices: equal but for the solver's own error, which both state
            assertEquals(model.modes().get(i).frequency(), pair.modes().get(i).frequency(), 1e-9 * model.modes().get(i).frequency());
        }
        assertEquals(1 + model.model().freeDofs(), Files.readAllLines(temporary.resolve("demo.dofs.csv")).size());
        assertEquals(List.of(), model.verdicts());
    }

    /**
     * BCSSTK01 and BCSSTM01 (Harwell-Boeing collection, Duff, Grimes, Lewis 1989; read from a Debian source package), 24 of the 48 masses
     * are 0. The finite eigenvalues are recomputed (static condensation and a dense solver, cross-checked by the eigenvalues of the
     * flexibility times mass); their relative tolerance is 1e-8, so half of that in frequency.
     */
    @Test
    void theFortyEightDegreePairHasItsTwentyFourModes() throws IOException {
        double[] expected = {
            27.270485478597507, 69.67379039831948, 77.52223582693743, 155.65142905464523, 258.20594251617956, 442.694085111,
            453.4672583177813, 510.23304711034024, 4656.041789186303, 5095.092452908314, 5130.720110854082, 5162.968163119432,
            10025.499396383928, 23803.734073304982, 26265.375354056876, 27722.87903320297, 27728.78683741727, 27762.09795837693,
            28529.366829529474, 33822.60100349292, 39509.96689196434, 55914.66347391951, 56181.14771162551, 56234.05918002483
        };
        Path json = temporary.resolve("r.json");
        Console console = Console.run("solve", resource("bcsst01.K.mtx"), resource("bcsst01.M.mtx"), "--json", json.toString());
        assertEquals(0, console.status(), console.toString());
        StoredResult result = ResultFile.read(json);
        assertTrue(result.certificate().complete());
        assertEquals(24, result.modes().size());
        for (int i = 0; i < 24; i++) {
            double frequency = Math.sqrt(expected[i]) / (2 * Math.PI);
            assertEquals(frequency, result.modes().get(i).frequency(), 5e-9 * frequency);
        }
        // inertia counts of K - 1000 M and K - 10000 M (Sylvester's law, recomputed): 8 and 12
        assertEquals(8, modes("solve", resource("bcsst01.K.mtx"), resource("bcsst01.M.mtx"), "--below", hertz(1000)));
        assertEquals(12, modes("solve", resource("bcsst01.K.mtx"), resource("bcsst01.M.mtx"), "--below", hertz(10000)));
        assertEquals(5, modes("solve", resource("bcsst01.K.mtx"), resource("bcsst01.M.mtx"), "--modes", "5"));
    }

    private static String hertz(double eigenvalue) {
        return String.valueOf(Math.sqrt(eigenvalue) / (2 * Math.PI));
    }

    @Test
    void aPairThatSharesAZeroMotionCannotBeCompleted() throws IOException {
        String header = "%%MatrixMarket matrix coordinate real symmetric\n";
        Path k = Files.writeString(temporary.resolve("k.mtx"), header + "2 2 1\n1 1 4\n");
        Path m = Files.writeString(temporary.resolve("m.mtx"), header + "2 2 1\n1 1 1\n");
        Console console = Console.run("solve", k.toString(), m.toString());
        assertEquals(3, console.status(), console.toString());
        assertTrue(console.err().contains("rows 2"), console.toString());
    }

    @Test
    void aPairOfDifferentOrdersEndsWithTwo() throws IOException {
        String header = "%%MatrixMarket matrix coordinate real symmetric\n";
        Path k = Files.writeString(temporary.resolve("k.mtx"), header + "2 2 1\n1 1 4\n");
        Path m = Files.writeString(temporary.resolve("m.mtx"), header + "1 1 1\n1 1 1\n");
        assertEquals(2, Console.run("solve", k.toString(), m.toString()).status());
        Files.writeString(m, header + "2 2 1\n1 1 one\n");
        Console console = Console.run("solve", k.toString(), m.toString());
        assertEquals(2, console.status());
        assertTrue(console.err().contains("m.mtx, line 3"), console.toString());
    }

    /** One cantilever N1-N2 of 3 m with these rows of supports and these releases. */
    private Path stick(String supports, String startFree, String endFree) throws IOException {
        Path folder = Files.createTempDirectory(temporary, "stick");
        Files.writeString(folder.resolve("nodes.csv"), "id,x,y,z\nN1,0,0,0\nN2,0,0,3\n");
        Files.writeString(folder.resolve("materials.csv"), "id,young,poisson,density\nsteel,210e9,0.3,7850\n");
        Files.writeString(folder.resolve("frame_sections.csv"), "id,area,iy,iz,torsion\nS,0.01,1e-4,5e-5,1e-6\n");
        Files.writeString(folder.resolve("members.csv"), "id,start,end,section,material,start_free,end_free\nM1,N1,N2,S,steel,"
                + startFree + "," + endFree + "\n");
        Files.writeString(folder.resolve("supports.csv"), "node,ux,uy,uz,rx,ry,rz\n" + supports);
        StringBuilder resources = new StringBuilder();
        for (String name : List.of("nodes", "materials", "frame_sections", "members", "supports")) {
            resources.append(resources.isEmpty() ? "" : ", ").append("{\"name\": \"" + name + "\", \"path\": \"" + name + ".csv\"}");
        }
        Files.writeString(folder.resolve("datapackage.json"),
                "{\"name\": \"stick\", \"structure\": {\"units\": \"N-m-kg\"}, \"resources\": [" + resources + "]}");
        return folder;
    }

    private String resource(String name) throws IOException {
        Path file = temporary.resolve(name);
        try (InputStream stream = CommandsTest.class.getResourceAsStream(name)) {
            Files.write(file, stream.readAllBytes());
        }
        return file.toString();
    }

    private static StructuralModel sample(String name) throws IOException {
        try (InputStream stream = Samples.named(name).orElseThrow().open()) {
            return ModelFile.load(stream, name);
        }
    }

    private static Set<Path> files(Path folder) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            return files.filter(Files::isRegularFile).collect(Collectors.toSet());
        }
    }
}
