package org.modewright.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.jobs.Job;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.modewright.fem.ModelDefectsException;
import org.modewright.model.Snapshots;
import org.modewright.model.structure.StructuralModel;

class AuditJobTest {

    private final RunStore store = new RunStore();
    private final RunRegistry registry = new RunRegistry(store);
    private final Ends ends = new Ends();
    private TemporaryProject project;

    @BeforeEach
    void create() throws Exception {
        project = new TemporaryProject("jobs");
        registry.addListener(ends);
    }

    @AfterEach
    void remove() throws Exception {
        project.close();
    }

    @Test
    void aRunIsPublishedOnceAndKept() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        IFile file = project.write("mast.modewright", model);
        AuditJob job = AuditJob.of(file, model, registry);
        job.schedule();
        Job.getJobManager().join(AuditJob.FAMILY, null);
        assertTrue(job.getResult().isOK());
        assertEquals(1, ends.runs.size());
        assertEquals(Snapshots.sha256(model), ends.runs.get(0).modelHash());
        assertEquals(ends.runs.get(0), registry.held(file).orElseThrow());
        assertFalse(registry.isRunning(file));
        StoredRun kept = store.load(file).orElseThrow();
        assertEquals(ends.runs.get(0).result().modal().modes().size(), kept.result().modal().modes().size());
        assertEquals(ends.runs.get(0).modelHash(), kept.modelHash());
    }

    @Test
    void editsAfterTheStartDoNotReachTheRun() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        IFile file = project.write("mast.modewright", model);
        String before = Snapshots.sha256(model);
        AuditJob job = AuditJob.of(file, model, registry);
        model.getMaterials().get(0).setYoung(1);
        model.getMembers().clear();
        job.schedule();
        Job.getJobManager().join(AuditJob.FAMILY, null);
        assertEquals(before, ends.runs.get(0).modelHash());
        assertNotEquals(before, Snapshots.sha256(model));
        assertEquals(3, ends.runs.get(0).result().modal().memberCount());
    }

    @Test
    void aCancelledRunPublishesItsEndWithoutAResult() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        IFile file = project.write("mast.modewright", model);
        AuditJob job = AuditJob.of(file, model, registry);
        registry.addListener(new Ends() {
            @Override
            public void runStarted(IFile started) {
                job.cancel();
            }
        });
        job.schedule();
        assertTrue(ends.ended.await(60, TimeUnit.SECONDS));
        job.join();
        assertEquals(IStatus.CANCEL, job.getResult().getSeverity());
        assertEquals(List.of(), ends.runs);
        assertNull(ends.problem);
        assertTrue(store.load(file).isEmpty());
    }

    @Test
    void aModelWithDefectsIsRefusedOnTheSpot() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        model.getMaterials().get(0).setYoung(-1);
        IFile file = project.write("mast.modewright", model);
        assertThrows(ModelDefectsException.class, () -> AuditJob.of(file, model, registry));
    }

    @Test
    void aRulePackThatIsNotThereIsNoFaultOfTheProgram() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        model.getAudit().setRulePack("house-rules");
        IFile file = project.write("mast.modewright", model);
        AuditJob.of(file, model, registry).schedule();
        assertTrue(ends.ended.await(60, TimeUnit.SECONDS));
        assertEquals("There is no rule pack \"house-rules\". Choose another one in the model's settings, or name the folder that holds it"
                + " in the preferences.", ends.problem);
        assertEquals(List.of(), ends.runs);
    }

    @Test
    void findingsOfTheRunBecomeMarkersAndThoseOfTheModelAreNotRepeated() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        model.getMembers().remove(2);
        IFile file = project.write("mast.modewright", model);
        project.build();
        int ofModel = TemporaryProject.markers(file, FindingMarkers.MODEL_FINDING).length;
        assertTrue(ofModel > 0, "the node that no member holds is found without a run");
        AuditJob.of(file, model, registry).schedule();
        Job.getJobManager().join(AuditJob.FAMILY, null);
        int inResult = ends.runs.get(0).result().findings().size();
        IMarker[] all = TemporaryProject.markers(file, FindingMarkers.FINDING);
        assertEquals(ofModel, TemporaryProject.markers(file, FindingMarkers.MODEL_FINDING).length);
        assertTrue(all.length >= inResult, "every finding is marked");
        long distinct = Arrays.stream(all).map(marker -> marker.getAttribute(FindingMarkers.FINDING_ID, "") + '\n'
                + marker.getAttribute(FindingMarkers.ELEMENT_IDS, "")).distinct().count();
        assertEquals(all.length, distinct, "none is marked twice");
    }

    private static class Ends implements RunRegistry.Listener {

        private final List<StoredRun> runs = Collections.synchronizedList(new ArrayList<>());
        private final CountDownLatch ended = new CountDownLatch(1);
        private volatile String problem;

        @Override
        public void runStarted(IFile model) {
            // Only the end is looked at.
        }

        @Override
        public void runEnded(IFile model, StoredRun run, String trouble) {
            if (run != null) {
                runs.add(run);
            }
            problem = trouble;
            ended.countDown();
        }
    }
}
