package org.modewright.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.modewright.audit.Structures.filled;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.modewright.modal.Direction;
import org.modewright.model.structure.AnalysisSettings;
import org.modewright.model.structure.AuditSettings;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.UnitSystem;
import org.modewright.numerics.CancelledException;
import org.modewright.numerics.Progress;

/** Verdicts, status and summary of an audit. */
class AuditRunTest {

    private static final AuditRequest IN_X = AuditRequest.standard().withDirections(EnumSet.of(Direction.X));

    private static Structures building(int storeys) {
        return Structures.chain(filled(storeys, 1000), filled(storeys, 1e6));
    }

    private static AuditResult audit(Structures structures, AuditRequest request) {
        return AuditRun.standard().run(structures.snapshot(), request, Progress.NONE);
    }

    /** Uniform five-storey building: 87.95 % with one mode, 96.67 % with two (Chopra, Dynamics of Structures, chapter 13). */
    @Test
    void twoModesOfTheFiveStoreyBuildingAreEnough() {
        AuditResult result = audit(building(5), IN_X);
        assertEquals(AuditStatus.PASSED, result.status());
        assertEquals(0, result.status().exitStatus());
        Verdict verdict = result.verdicts().get(0);
        assertEquals(1, result.verdicts().size());
        assertEquals("common-90", verdict.rulePack());
        assertEquals("captured-mass", verdict.clause());
        assertEquals(Direction.X, verdict.direction());
        assertEquals(2, verdict.reachedAtMode());
        assertEquals(0, verdict.moreModes());
        assertEquals(1, verdict.captured(), 1e-12);
        assertEquals(0.1, verdict.margin(), 1e-12);
        assertEquals("X: 100.0 % of the mass by mode 5, enough: mode 2 reaches the 90.0 % required.", verdict.text());
        assertEquals("The modes are enough: X 100.0 % of the 90.0 % required with 5 modes.", result.summary());
    }

    @Test
    void oneModeOfTheFiveStoreyBuildingIsNot() {
        AuditResult result = audit(building(5), IN_X.withModes(1));
        assertEquals(AuditStatus.NOT_PASSED, result.status());
        assertEquals(1, result.status().exitStatus());
        Verdict verdict = result.verdicts().get(0);
        assertFalse(verdict.pass());
        assertEquals(0, verdict.reachedAtMode());
        assertEquals(0.87953, verdict.captured(), 0.5e-5);
        assertEquals("X: 88.0 % of the mass by mode 1, 2.0 % short of the 90.0 % required: how many more modes it takes cannot be told from"
                + " these.", verdict.text());
        assertEquals("capture-short", result.findings().get(0).id());
        assertEquals(verdict.text(), result.findings().get(0).text());
        assertEquals("The modes are not enough: X 88.0 % of the 90.0 % required with 1 mode.", result.summary());
    }

    /** A missing share that falls as 1/n: 20 % after 10 modes needs 20 for 10 %, so 10 more. */
    @Test
    void estimateFollowsTheFallOfTheMissingMass() {
        double[] running = new double[10];
        for (int n = 1; n <= 10; n++) {
            running[n - 1] = 1 - 2.0 / n;
        }
        assertEquals(10, Judge.moreModes(running, 0.9));
        assertEquals(30, Judge.moreModes(running, 0.95));
        assertEquals(-1, Judge.moreModes(filled(10, 0.5), 0.9));
        assertEquals(-1, Judge.moreModes(new double[] {0.5}, 0.9));
        assertEquals(-1, Judge.moreModes(running, 1));
    }

    @Test
    void estimateIsSaidWithItsMethod() {
        double[] masses = filled(40, 100);
        double[] stiffnesses = filled(40, 1e6);
        Arrays.fill(masses, 0, 8, 500);
        AuditResult result = audit(Structures.chain(masses, stiffnesses), IN_X.withModes(2));
        Verdict verdict = result.verdicts().get(0);
        assertFalse(verdict.pass());
        assertTrue(verdict.moreModes() > 0);
        assertTrue(verdict.text().endsWith(verdict.moreModes() + (verdict.moreModes() == 1 ? " mode" : " modes")
                + " more, if the missing mass goes on falling as from mode 1 to mode 2."), verdict.text());
    }

    @Test
    void directionWithoutMassIsNotJudged() {
        AuditResult result = audit(building(5), AuditRequest.standard());
        assertEquals(1, result.verdicts().size());
        assertEquals(AuditStatus.PASSED, result.status());
        Finding finding = result.findings().get(0);
        assertEquals("no-mass", finding.id());
        assertEquals(Severity.INFO, finding.severity());
        assertEquals(List.of(new ObjectRef("direction", "y", "Y")), finding.objects());
    }

    @Test
    void nothingToJudgeIsNoPass() {
        AuditResult result = audit(building(5), AuditRequest.standard().withDirections(EnumSet.of(Direction.Z)));
        assertEquals(AuditStatus.NOT_PASSED, result.status());
        assertEquals("Nothing can be judged: no mass can move in the directions asked for.", result.summary());
        assertEquals(Severity.ERROR, result.findings().get(0).severity());
    }

    @Test
    void noDirectionIsNoPass() {
        AuditResult result = audit(building(5), AuditRequest.standard().withDirections(EnumSet.noneOf(Direction.class)));
        assertEquals(AuditStatus.NOT_PASSED, result.status());
        assertEquals("Nothing is judged: no direction is asked for.", result.summary());
    }

    @Test
    void unstableStructureIsNotJudged() {
        Structures s = building(3);
        s.node("stray", 5, 0, 0).support("stray", "uy uz rx ry rz").mass("stray", 10, 0, 0, 0, 0, 0);
        AuditResult result = audit(s, IN_X);
        assertEquals(AuditStatus.UNSTABLE, result.status());
        assertEquals(3, result.status().exitStatus());
        assertEquals(List.of(), result.verdicts());
        assertTrue(result.summary().startsWith("The structure is unstable. Node stray"), result.summary());
        assertEquals(Severity.ERROR, result.findings().get(0).severity());
        assertEquals("mechanism", result.findings().get(0).id());
        assertEquals("stray", result.findings().get(0).objects().get(0).name());
    }

    @Test
    void unknownRulePackIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> audit(building(2), IN_X.withRulePack("other")));
    }

    @Test
    void furtherDetectorsTakePart() {
        FindingDetector own = context -> List.of(new Finding("own", Severity.WARNING, List.of(), "Seen " + context.modal().modes().size()
                + " modes.", "None."));
        AuditResult result = new AuditRun(RulePacks.builtIn(), List.of(own)).run(building(4).snapshot(), IN_X, Progress.NONE);
        assertEquals(List.of("Seen 4 modes."), result.findings().stream().filter(finding -> finding.id().equals("own")).map(Finding::text)
                .toList());
    }

    @Test
    void timesOfEveryStageAreKept() {
        assertTrue(audit(building(4), IN_X).modal().seconds().keySet().containsAll(List.of("assemble", "factor", "eigen", "audit")));
    }

    @Test
    void cancelStopsTheAudit() {
        Progress cancelled = new Progress() {
            @Override
            public void report(String stage, double fraction) {
            }

            @Override
            public boolean isCancelled() {
                return true;
            }
        };
        assertThrows(CancelledException.class, () -> AuditRun.standard().run(building(4).snapshot(), IN_X, cancelled));
    }

    @Test
    void requestComesFromTheModelsSettings() {
        StructuralModel model = building(2).model();
        assertEquals(AuditRequest.standard(), AuditRequest.of(model));
        model.setUnits(UnitSystem.NEWTON_MILLIMETRE);
        AnalysisSettings analysis = StructureFactory.eINSTANCE.createAnalysisSettings();
        analysis.setModes(17);
        analysis.setBelow(33);
        model.setAnalysis(analysis);
        AuditSettings audit = StructureFactory.eINSTANCE.createAuditSettings();
        audit.setRulePack("office-95");
        audit.setX(false);
        audit.setZ(true);
        audit.setLocalNodes(0.25);
        audit.setCoincidence(12);
        model.setAudit(audit);
        AuditRequest request = AuditRequest.of(model);
        assertEquals("office-95", request.rulePack());
        assertEquals(EnumSet.of(Direction.Y, Direction.Z), request.directions());
        assertEquals(17, request.modes());
        assertEquals(33, request.belowHz());
        assertEquals(0.25, request.thresholds().localNodes());
        assertEquals(0.012, request.thresholds().coincidence(), 1e-15);
    }
}
