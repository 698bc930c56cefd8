package org.modewright.workspace;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.DataOutputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Arrays;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.jobs.Job;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.audit.AuditRequest;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditRun;
import org.modewright.fem.Carrier;
import org.modewright.fem.MassLedger;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.model.Snapshots;
import org.modewright.model.structure.StructuralModel;
import org.modewright.numerics.Progress;

class RunStoreTest {

    private final RunStore store = new RunStore();
    private TemporaryProject project;
    private IFile file;
    private StoredRun run;

    @BeforeEach
    void solve() throws Exception {
        project = new TemporaryProject("store");
        StructuralModel model = TemporaryProject.cantilever();
        file = project.write("mast.modewright", model);
        AuditResult result = AuditRun.standard().run(model, AuditRequest.of(model), Progress.NONE);
        run = new StoredRun(result, Snapshots.sha256(model), Instant.ofEpochMilli(1_700_000_000_000L));
    }

    @AfterEach
    void remove() throws Exception {
        project.close();
    }

    @Test
    void thereIsNothingBeforeTheFirstRun() throws Exception {
        assertTrue(store.load(file).isEmpty());
    }

    @Test
    void everythingComesBack() throws Exception {
        store.save(file, run);
        StoredRun back = new RunStore().load(file).orElseThrow();
        assertEquals(run.modelHash(), back.modelHash());
        assertEquals(run.finished(), back.finished());
        assertEquals(run.result().verdicts(), back.result().verdicts());
        assertEquals(run.result().findings(), back.result().findings());
        assertEquals(run.result().status(), back.result().status());
        assertEquals(run.result().summary(), back.result().summary());
        assertModal(run.result().modal(), back.result().modal());
    }

    @Test
    void theFileStandsBesideTheModelAndIsDerived() throws Exception {
        store.save(file, run);
        IFile kept = project.project().getFile("mast.modes");
        assertTrue(kept.exists());
        assertTrue(kept.isDerived());
        try (var names = Files.list(kept.getLocation().toPath().getParent())) {
            assertFalse(names.anyMatch(path -> path.toString().endsWith(".part")), "the scratch file must be gone");
        }
    }

    @Test
    void aLaterRunTakesThePlaceOfTheFirst() throws Exception {
        store.save(file, run);
        StoredRun later = new StoredRun(run.result(), "another", run.finished());
        store.save(file, later);
        assertEquals("another", store.load(file).orElseThrow().modelHash());
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, 0.02, 0.3, 0.7, 0.9})
    void aFileCutShortIsAnErrorThatSaysWhatToDo(double share) throws Exception {
        store.save(file, run);
        byte[] whole = Files.readAllBytes(kept());
        Files.write(kept(), Arrays.copyOf(whole, (int) (share * whole.length)));
        RunStoreException error = assertThrows(RunStoreException.class, () -> store.load(file));
        assertTrue(error.getMessage().contains("mast.modes"), error.getMessage());
        assertTrue(error.getMessage().contains("Run the audit again"), error.getMessage());
    }

    @Test
    void aFlippedByteIsNoticedWhereverItIs() throws Exception {
        store.save(file, run);
        byte[] whole = Files.readAllBytes(kept());
        int data = 40;
        for (int at = data; at < whole.length - 200; at += Math.max(1, whole.length / 50)) {
            byte[] damaged = whole.clone();
            damaged[at] ^= 0x10;
            Files.write(kept(), damaged);
            assertThrows(RunStoreException.class, () -> store.load(file), "byte " + at);
        }
    }

    @Test
    void aFileOfSomethingElseIsAnError() throws Exception {
        Files.write(kept(), "not a result".getBytes(StandardCharsets.UTF_8));
        assertThrows(RunStoreException.class, () -> store.load(file));
    }

    @Test
    void aNewerFormatSaysSo() throws Exception {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
            zip.putNextEntry(new ZipEntry("run"));
            DataOutputStream out = new DataOutputStream(zip);
            out.writeInt(0x4D574D31);
            out.writeInt(99);
        }
        try (OutputStream out = Files.newOutputStream(kept())) {
            bytes.writeTo(out);
        }
        RunStoreException error = assertThrows(RunStoreException.class, () -> store.load(file));
        assertTrue(error.getMessage().contains("newer version"), error.getMessage());
    }

    @Test
    void aKeptRunFollowsItsModelAndGoesWithIt() throws Exception {
        store.save(file, run);
        IFile renamed = project.project().getFile("tower.modewright");
        file.move(renamed.getFullPath(), true, null);
        Job.getJobManager().join(AuditJob.FAMILY, null);
        assertFalse(project.project().getFile("mast.modes").exists());
        assertEquals(run.modelHash(), store.load(renamed).orElseThrow().modelHash());
        renamed.delete(true, null);
        Job.getJobManager().join(AuditJob.FAMILY, null);
        assertFalse(project.project().getFile("tower.modes").exists());
    }

    private Path kept() {
        return store.fileOf(file).getLocation().toPath();
    }

    private static void assertModal(ModalResult expected, ModalResult actual) {
        assertEquals(expected.modelName(), actual.modelName());
        assertEquals(expected.memberCount(), actual.memberCount());
        assertEquals(expected.freeDofs(), actual.freeDofs());
        assertEquals(expected.nodes(), actual.nodes());
        assertEquals(expected.certificate(), actual.certificate());
        assertEquals(expected.isExhausted(), actual.isExhausted());
        assertEquals(expected.planCoupling(), actual.planCoupling());
        assertEquals(expected.instabilities(), actual.instabilities());
        assertEquals(expected.remarks(), actual.remarks());
        assertEquals(expected.seconds(), actual.seconds());
        assertMass(expected.mass(), actual.mass());
        assertCarriers(expected, actual);
        assertFalse(expected.modes().isEmpty());
        assertEquals(expected.modes().size(), actual.modes().size());
        for (int i = 0; i < expected.modes().size(); i++) {
            assertMode(expected.modes().get(i), actual.modes().get(i));
            assertArrayEquals(expected.shape(i), actual.shape(i));
            assertArrayEquals(expected.strainShares(i), actual.strainShares(i));
            assertArrayEquals(expected.kineticShares(i), actual.kineticShares(i));
        }
    }

    private static void assertMode(Mode expected, Mode actual) {
        assertEquals(expected.number(), actual.number());
        assertEquals(expected.eigenvalue(), actual.eigenvalue());
        assertEquals(expected.frequency(), actual.frequency());
        assertEquals(expected.period(), actual.period());
        assertEquals(expected.residual(), actual.residual());
        assertEquals(expected.errorBound(), actual.errorBound());
        assertEquals(expected.spread(), actual.spread());
        assertEquals(expected.character(), actual.character());
        assertArrayEquals(expected.participation(), actual.participation());
        assertArrayEquals(expected.effectiveMassShare(), actual.effectiveMassShare());
        assertArrayEquals(expected.split(), actual.split());
    }

    private static void assertMass(MassLedger expected, MassLedger actual) {
        assertArrayEquals(expected.movable(), actual.movable());
        assertArrayEquals(expected.onSupports(), actual.onSupports());
        assertArrayEquals(expected.centre(), actual.centre());
        assertArrayEquals(expected.rotary(), actual.rotary());
        assertEquals(expected.balance(), actual.balance());
        assertEquals(expected.sources().size(), actual.sources().size());
        for (int i = 0; i < expected.sources().size(); i++) {
            assertEquals(expected.sources().get(i).name(), actual.sources().get(i).name());
            assertArrayEquals(expected.sources().get(i).movable(), actual.sources().get(i).movable());
            assertArrayEquals(expected.sources().get(i).onSupports(), actual.sources().get(i).onSupports());
        }
    }

    private static void assertCarriers(ModalResult expected, ModalResult actual) {
        assertEquals(expected.carriers().size(), actual.carriers().size());
        for (int i = 0; i < expected.carriers().size(); i++) {
            Carrier before = expected.carriers().get(i);
            Carrier after = actual.carriers().get(i);
            assertEquals(before.kind(), after.kind());
            assertEquals(before.id(), after.id());
            assertEquals(before.name(), after.name());
            assertArrayEquals(before.nodes(), after.nodes());
            assertEquals(before.group(), after.group());
            assertEquals(before.section(), after.section());
            assertEquals(before.material(), after.material());
            assertEquals(before.level(), after.level());
        }
    }
}
