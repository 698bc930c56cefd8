package org.modewright.exchange.samples;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.audit.AuditRequest;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditRun;
import org.modewright.audit.AuditStatus;
import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.exchange.TablePackage;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.model.ModelFile;
import org.modewright.model.WellFormedness;
import org.modewright.model.structure.StructuralModel;
import org.modewright.numerics.Progress;
import org.modewright.samples.Sample;
import org.modewright.samples.Samples;

/** The models that come with the program: as generated, with their closed-form answers, and with no finding but the one that is meant. */
class SamplesTest {

    /** Closed forms hold to rounding: stiffness and mass enter through a few products, the eigenvalue through a small dense solution. */
    private static final double CLOSED_FORM = 1e-9;

    @TempDir
    Path temporary;

    @Test
    void filesAreWhatTheGeneratorMakes() throws IOException {
        assertEquals(SampleModels.all().keySet(), new LinkedHashSet<>(Samples.all().stream().map(Sample::name).toList()));
        for (Sample sample : Samples.all()) {
            try (InputStream stream = sample.open()) {
                assertEquals(new String(ModelFile.bytes(SampleModels.all().get(sample.name())), StandardCharsets.UTF_8),
                        new String(stream.readAllBytes(), StandardCharsets.UTF_8), sample.name());
            }
        }
    }

    @Test
    void thePackageOfTheDemoIsWhatTheGeneratorMakes() throws IOException {
        assertEquals(List.of(), TablePackage.write(DemoModel.create(), temporary));
        try (Stream<Path> files = Files.list(temporary)) {
            List<Path> written = files.sorted().toList();
            assertEquals(written.stream().map(file -> file.getFileName().toString()).toList(), Samples.demoPackageFiles());
            for (Path file : written) {
                try (InputStream stream = Samples.openDemoPackageFile(file.getFileName().toString())) {
                    assertEquals(Files.readString(file), new String(stream.readAllBytes(), StandardCharsets.UTF_8), file.toString());
                }
            }
        }
        assertEquals(text(DemoModel.create()), text(TablePackage.read(temporary).model()));
    }

    private static String text(StructuralModel model) throws IOException {
        return new String(ModelFile.bytes(model), StandardCharsets.UTF_8);
    }

    @ParameterizedTest
    @ValueSource(strings = {"tip-mass", "two-storeys", "cantilever", "three-storeys", "mass-chain"})
    void teachingCasesPassWithoutAFindingAboveInfo(String name) {
        AuditResult result = audit(name);
        assertEquals(AuditStatus.PASSED, result.status(), result.summary());
        assertTrue(result.findings().stream().allMatch(finding -> finding.severity() == Severity.INFO), result.findings().toString());
        StructuralModel model = SampleModels.all().get(name);
        assertFalse(model.getNotes().isBlank());
        assertEquals(List.of(), WellFormedness.check(model));
    }

    @Test
    void theDemoPassesLateInYAndItsCanopyIsFound() {
        AuditResult result = audit("demo");
        assertEquals(AuditStatus.PASSED, result.status(), result.summary());
        assertEquals(Direction.X, result.verdicts().get(0).direction());
        assertTrue(result.verdicts().get(0).reachedAtMode() < 20, result.verdicts().toString());
        assertTrue(result.verdicts().get(1).reachedAtMode() > 50, result.verdicts().toString());
        List<Finding> grave = result.findings().stream().filter(finding -> finding.severity() != Severity.INFO).toList();
        assertEquals(1, grave.size(), grave.toString());
        assertEquals("nodes-not-joined", grave.get(0).id());
        assertEquals(List.of("D2-1", "K1"), grave.get(0).objects().stream().map(ObjectRef::name).sorted().toList());
        String local = result.findings().stream().filter(finding -> finding.id().equals("local-modes")).map(Finding::text).toList()
                .toString();
        assertTrue(local.contains("entrance canopy") && local.contains("roof mast"), local);
        assertEquals(List.of(), WellFormedness.check(SampleModels.all().get("demo")));
        int members = SampleModels.all().get("demo").getMembers().size();
        assertTrue(members >= 300 && members <= 900, "members: " + members);
    }

    /**
     * f = sqrt(3EI/(mL^3))/2pi, sqrt(EA/(mL))/2pi: deflection and elongation of a cantilever under a force at its tip, any textbook of
     * statics.
     */
    @Test
    void tipMass() {
        ModalResult result = audit("tip-mass").modal();
        double bending = Math.sqrt(3 * 210e9 * 2.0308e-5 / (2000 * 64)) / (2 * Math.PI);
        double axial = Math.sqrt(210e9 * 3.326e-3 / (2000 * 4)) / (2 * Math.PI);
        assertFrequencies(result, bending, bending, axial);
        assertEquals(1, result.capture(Direction.X), 1e-12);
        assertEquals(1, result.capture(Direction.Z), 1e-12);
    }

    /** Two storeys of 24EI/h^3 in series (Chopra, Dynamics of Structures, stiffness of a shear frame; from memory). */
    @Test
    void twoStoreys() {
        double second = Math.pow(0.4, 4) / 12;
        double lower = 24 * 30e6 * second / 64;
        double upper = 24 * 30e6 * second / 27;
        assertFrequencies(audit("two-storeys").modal(), Math.sqrt(lower * upper / (lower + upper) / 30) / (2 * Math.PI));
    }

    /** det(F M - I/omega^2) = 0 with the flexibility F_ij = x_i^2(3x_j - x_i)/6EI, x_i <= x_j, any textbook of statics. */
    @Test
    void cantilever() {
        ModalResult result = audit("cantilever").modal();
        for (int mode = 0; mode < 6; mode++) {
            double omega = 2 * Math.PI * result.modes().get(mode).frequency();
            double below = characteristic(1 / Math.pow(omega * (1 - CLOSED_FORM), 2));
            double above = characteristic(1 / Math.pow(omega * (1 + CLOSED_FORM), 2));
            assertTrue(below * above < 0, "mode " + (mode + 1) + " is no root of the characteristic equation");
        }
        assertEquals(9, result.modes().size());
    }

    private static double characteristic(double value) {
        double[] x = {10, 20, 30};
        double[] mass = {12, 9, 6};
        double[][] a = new double[3][3];
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                double near = Math.min(x[i], x[j]);
                double far = Math.max(x[i], x[j]);
                a[i][j] = near * near * (3 * far - near) / (6 * 210e6 * 7.8e-3) * mass[j] - (i == j ? value : 0);
            }
        }
        return a[0][0] * (a[1][1] * a[2][2] - a[1][2] * a[2][1]) - a[0][1] * (a[1][0] * a[2][2] - a[1][2] * a[2][0])
                + a[0][2] * (a[1][0] * a[2][1] - a[1][1] * a[2][0]);
    }

    /**
     * Shear building m = 1.0, 1.5, 2.0 kip s2/in, k = 60, 120, 180 kip/in from the top: Clough and Penzien, Dynamics of Structures,
     * Example E11-1 with a tenth of its stiffness, as in a university course handout (Example - modal analysis; read), recomputed to the
     * digits given.
     */
    @Test
    void threeStoreys() {
        ModalResult result = audit("three-storeys").modal();
        double[] eigenvalues = {21.087884, 96.395946, 212.516171};
        double[] effectiveMass = {3.661287, 0.649748, 0.188965};
        assertEquals(3, result.modes().size());
        for (int i = 0; i < 3; i++) {
            // half a unit of the last digit given
            assertEquals(eigenvalues[i], result.modes().get(i).eigenvalue(), 6e-7);
            assertEquals(effectiveMass[i] / 4.5, result.modes().get(i).effectiveMassShare(Direction.X), 6e-7 / 4.5);
        }
    }

    /**
     * omega_n = 2 sqrt(k/m) sin((2n-1)pi/(2(2N+1))) of a uniform chain held at one end (Rayleigh, Theory of Sound; any textbook) and the
     * effective masses of the uniform five-storey shear building (closed form, recomputed; A. K. Chopra, Dynamics of Structures, from
     * memory).
     */
    @Test
    void massChain() {
        ModalResult result = audit("mass-chain").modal();
        double[] expected = new double[5];
        for (int n = 1; n <= 5; n++) {
            expected[n - 1] = 2 * Math.sqrt(40_000 / 100.0) * Math.sin((2 * n - 1) * Math.PI / 22) / (2 * Math.PI);
        }
        assertFrequencies(result, expected);
        double[] percent = {87.9530, 8.7177, 2.4216, 0.7509, 0.1568};
        for (int i = 0; i < 5; i++) {
            assertEquals(percent[i], 100 * result.modes().get(i).effectiveMassShare(Direction.X), 6e-5);
        }
    }

    private static void assertFrequencies(ModalResult result, double... expected) {
        assertEquals(expected.length, result.modes().size());
        for (int i = 0; i < expected.length; i++) {
            Mode mode = result.modes().get(i);
            assertEquals(expected[i], mode.frequency(), CLOSED_FORM * expected[i]);
        }
    }

    private static AuditResult audit(String name) {
        StructuralModel model = SampleModels.all().get(name);
        return AuditRun.standard().run(model, AuditRequest.of(model), Progress.NONE);
    }
}
