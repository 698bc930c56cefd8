package org.modewright.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.modewright.audit.detect.Detectors;
import org.modewright.fem.Assembly;
import org.modewright.fem.Snapshot;
import org.modewright.modal.Certificate;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalRequest;
import org.modewright.modal.ModalResult;
import org.modewright.modal.ModalRun;
import org.modewright.modal.Mode;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.UnitSystem;
import org.modewright.numerics.Progress;

/** Each detector with a model that it must see and a twin in which it must be silent. */
class FindingsTest {

    private static List<Finding> audit(Structures structures) {
        return AuditRun.standard().run(structures.snapshot(), AuditRequest.standard(), Progress.NONE).findings();
    }

    private static List<Finding> of(List<Finding> findings, String id) {
        return findings.stream().filter(finding -> finding.id().equals(id)).toList();
    }

    private static Finding only(List<Finding> findings, String id) {
        List<Finding> found = of(findings, id);
        assertEquals(1, found.size(), id + " in " + findings);
        return found.get(0);
    }

    private static List<String> names(Finding finding) {
        return finding.objects().stream().map(ObjectRef::name).toList();
    }

    /** No false alarms: a sound building has no finding above info. */
    @Test
    void soundBuildingHasNothingAboveInfo() {
        AuditResult result = AuditRun.standard().run(Structures.building(4).snapshot(), AuditRequest.standard(), Progress.NONE);
        assertEquals(AuditStatus.PASSED, result.status());
        assertEquals(List.of(), result.findings().stream().filter(finding -> finding.severity() != Severity.INFO).toList());
    }

    @Test
    void gravestComesFirst() {
        Structures s = Structures.building(2);
        s.node("spare", 1, 1, 1).node("twin", 6, 5, 3.503).node("q", 6, 5, 5).with("post", "twin", "q");
        List<Finding> findings = audit(s);
        for (int i = 1; i < findings.size(); i++) {
            assertTrue(findings.get(i - 1).severity().compareTo(findings.get(i).severity()) <= 0);
        }
        assertEquals(Severity.ERROR, findings.get(0).severity());
    }

    @Test
    void loosePart() {
        Structures s = Structures.building(2).node("p", 30, 0, 0).node("q", 30, 0, 3).with("post", "p", "q");
        Finding finding = only(audit(s), "loose-part");
        assertEquals(Severity.ERROR, finding.severity());
        assertEquals(List.of("post", "p", "q"), names(finding));
        assertEquals("A part of 2 nodes (p and q) is not connected to any support, so it can float away in X, Y and Z and turn about each: its"
                + " lowest modes lie at 0 Hz.",
                finding.text());
        assertEquals(List.of(), of(audit(s), "mechanism"));
        assertEquals(List.of(), of(audit(s.support("p", "ux uy uz rx ry rz")), "loose-part"));
    }

    @Test
    void partOnSpringsIsNotLoose() {
        Structures s = Structures.building(2).node("p", 30, 0, 0).node("q", 30, 0, 3).with("post", "p", "q");
        s.spring("mount", "p", null, 1e6, 1e6, 1e6, 1e6, 1e6, 1e6);
        List<Finding> findings = audit(s);
        assertEquals(List.of(), of(findings, "loose-part"));
        assertEquals(List.of(), of(findings, "mechanism"));
    }

    @Test
    void partTiedToTheStructureIsNotLoose() {
        Structures s = Structures.building(2).node("p", 12, 10, 8).node("q", 12, 10, 10).with("post", "p", "q").link("foot", "n28", "p");
        assertEquals(List.of(), of(audit(s), "loose-part"));
    }

    @Test
    void structureWithoutSupport() {
        Structures s = new Structures("free").material("steel", 2.1e11, 0.3, 7850).section("bar", 0.01, 2e-5, 2e-5, 3e-5);
        s.node("a", 0, 0, 0).node("b", 4, 0, 0).with("ab", "a", "b");
        Finding finding = only(audit(s), "loose-part");
        assertTrue(finding.text().startsWith("The whole structure of 2 nodes (a and b) is not connected to any support"), finding.text());
        assertEquals("Support the structure.", finding.remedy());
    }

    @Test
    void mechanism() {
        Structures s = new Structures("posts").material("steel", 2.1e11, 0.3, 7850).section("bar", 0.01, 2e-5, 2e-5, 3e-5);
        s.node("a", 0, 0, 0).support("a", "ux uy uz rz").node("b", 0, 0, 4).with("ab", "a", "b");
        Finding finding = only(audit(s), "mechanism");
        assertEquals(Severity.ERROR, finding.severity());
        assertTrue(names(finding).contains("b"));
        assertTrue(finding.text().contains("rotation about X"), finding.text());
        s.spring("guy", "b", null, 1e5, 1e5, 0, 0, 0, 0);
        assertEquals(List.of(), of(audit(s), "mechanism"));
    }

    @Test
    void indefiniteStiffness() {
        Structures s = Structures.building(2);
        s.model().getMembers().get(0).setAxialForce(-1e9);
        Finding finding = only(audit(s), "indefinite-stiffness");
        assertEquals("c10", finding.objects().get(0).name());
        assertEquals("member", finding.objects().get(0).kind());
        assertTrue(finding.text().contains("the compression in member c10"), finding.text());
        s.model().getMembers().get(0).setAxialForce(-1e6);
        assertEquals(List.of(), of(audit(s), "indefinite-stiffness"));
    }

    private static AuditContext context(Structures structures, Certificate certificate) {
        Snapshot snapshot = structures.snapshot();
        Assembly assembly = Assembly.of(snapshot, Progress.NONE);
        ModalResult modal = ModalRun.run(assembly, ModalRequest.ofModes(3), Progress.NONE);
        ModalResult.Builder changed = ModalResult.builder().model(modal.modelName(), 0, 0, modal.freeDofs()).nodes(modal.nodes())
                .carriers(modal.carriers()).mass(modal.mass(), 0).certificate(certificate, false);
        for (Mode mode : modal.modes()) {
            int index = mode.number() - 1;
            changed.mode(mode, modal.shape(index), modal.strainShares(index), modal.kineticShares(index));
        }
        return new AuditContext(snapshot, assembly, changed.build(), List.of(), AuditRequest.standard());
    }

    private static List<Finding> detected(AuditContext context) {
        return Detectors.builtIn().stream().flatMap(detector -> detector.detect(context).stream()).toList();
    }

    @Test
    void incompleteCertificate() {
        Structures s = Structures.building(2);
        Finding missing = only(detected(context(s, new Certificate(false, 14.2, 5, 3, 1e-12, 1e-13))), "incomplete-certificate");
        assertEquals("The modes are not proven complete: the inertia count finds 5 eigenvalues below 14.2 Hz, the solver 3.",
                missing.text());
        Finding inaccurate = only(detected(context(s, new Certificate(false, 14.2, 3, 3, 1e-3, 1e-13))), "incomplete-certificate");
        assertTrue(inaccurate.text().contains("worst residual 1e-3"), inaccurate.text());
        assertEquals(List.of(), of(detected(context(s, new Certificate(true, 14.2, 3, 3, 1e-12, 1e-13))), "incomplete-certificate"));
    }

    @Test
    void unusedNode() {
        Structures s = Structures.building(2).node("spare 1", 1, 1, 1).node("spare 2", 2, 2, 2);
        Finding finding = only(audit(s), "unused-node");
        assertEquals(Severity.INFO, finding.severity());
        assertEquals(List.of("spare 1", "spare 2"), names(finding));
        assertEquals(List.of(), of(audit(s), "motion-dropped"));
        assertEquals(List.of(), of(audit(Structures.building(2)), "unused-node"));
    }

    @Test
    void massWithoutStiffness() {
        Structures s = Structures.building(2).node("lost", 1, 1, 1).mass("lost", 700, 700, 700, 0, 0, 0);
        List<Finding> findings = audit(s);
        Finding finding = only(findings, "mass-without-stiffness");
        assertEquals("There is mass (700.0 kg) at node lost, where no element and no support gives it stiffness.", finding.text());
        assertEquals(List.of(), of(findings, "unused-node"));
        assertEquals(List.of(), of(findings, "mechanism"));
        assertEquals(List.of(), of(audit(s.link("arm", "n14", "lost")), "mass-without-stiffness"));
    }

    @Test
    void heldMassIsNoMassWithoutStiffness() {
        Structures s = Structures.building(2).node("held", 1, 1, 1).mass("held", 700, 700, 700, 0, 0, 0).support("held",
                "ux uy uz rx ry rz");
        assertEquals(List.of(), audit(s).stream().filter(finding -> finding.severity() != Severity.INFO).toList());
    }

    /** A canopy on its own posts whose node was left unjoined, 4 mm from a node of the building. */
    private static Structures canopy(double gap) {
        Structures s = Structures.building(2);
        s.node("canopy", 6 + gap, 0, 3.5).node("outer", 6, -4, 3.5).node("post foot", 6, -4, 0).support("post foot", "ux uy uz rx ry rz");
        return s.with("post", "post foot", "outer").with("canopy beam", "outer", "canopy");
    }

    @Test
    void nodesNotJoined() {
        Finding finding = only(audit(canopy(0.004)), "nodes-not-joined");
        assertEquals(Severity.WARNING, finding.severity());
        assertEquals(List.of("n11", "canopy"), names(finding));
        assertEquals("Nodes n11 and canopy are only 0.00400 m apart and nothing joins them, so the structure has a gap there.",
                finding.text());
        assertEquals(List.of(), of(audit(canopy(0.4)), "nodes-not-joined"));
        assertEquals(List.of(), of(audit(canopy(0.004).link("joint", "n11", "canopy")), "nodes-not-joined"));
        assertEquals(List.of(), of(audit(canopy(0.004).spring("bearing", "n11", "canopy", 1e8, 1e8, 1e8, 0, 0, 0)), "nodes-not-joined"));
    }

    @Test
    void nodesAtTheSamePlace() {
        Finding finding = only(audit(canopy(0)), "nodes-not-joined");
        assertTrue(finding.text().contains("lie at the same place"), finding.text());
    }

    /** A common rigid floor ties two nodes in its plane only. */
    @Test
    void nodesOfOneFloorAreNotJoined() {
        Structures s = Structures.building(2).node("twin", 6.004, 5, 7).node("top", 6.004, 5, 9).with("stub", "twin", "top");
        s.model().getRigidFloors().get(1).getNodes().add(s.node("twin"));
        s.support("top", "ux uy uz");
        assertEquals(List.of("n24", "twin"), names(only(audit(s), "nodes-not-joined")));
    }

    /** The distance is told in the model's own unit, and the limit is the user's. */
    @Test
    void limitAndUnitOfTheCoincidence() {
        Structures s = new Structures("inches").material("steel", 3e7, 0.3, 7.3e-4).section("bar", 10, 100, 100, 100);
        s.model().setUnits(UnitSystem.POUND_INCH);
        s.node("a", 0, 0, 0).support("a", "ux uy uz rx ry rz").node("b", 0, 0, 100).with("ab", "a", "b");
        s.node("c", 0, 0.5, 100).node("d", 0, 80, 100).support("d", "ux uy uz rx ry rz").with("cd", "c", "d");
        Snapshot snapshot = s.snapshot();
        assertEquals(List.of(), ModelFindings.of(snapshot, Thresholds.DEFAULT));
        Thresholds wide = new Thresholds(0.0254, 0.1, 0.1, 0.01, 0.1, 1e-9);
        List<Finding> findings = ModelFindings.of(snapshot, wide);
        assertTrue(only(findings, "nodes-not-joined").text().contains("0.500 in apart"), findings.toString());
    }

    /** A chain of members shorter than the limit is joined to itself. */
    @Test
    void shortMembersAreNoGap() {
        Structures s = Structures.building(2).node("s1", 12.005, 10, 7).node("s2", 12.010, 10, 7).with("t1", "n28", "s1").with("t2", "s1",
                "s2");
        assertEquals(List.of(), of(audit(s), "nodes-not-joined"));
    }

    @Test
    void localModesOfOnePlaceAreOneFinding() {
        Structures s = Structures.building(3).section("pole", 0.002, 1e-7, 1e-7, 2e-6).node("m1", 6, 5, 13).node("m2", 6, 5, 15.5);
        Group mast = s.group("roof mast");
        s.member("pole 1", "n34", "m1").setGroup(mast);
        s.member("pole 2", "m1", "m2").setGroup(mast);
        Finding finding = only(audit(s), "local-modes");
        assertEquals(Severity.INFO, finding.severity());
        assertTrue(finding.text()
                .matches("Modes 1, 2.* are local to group roof mast\\. Each moves less than 0\\.1 % of the mass in X, Y or Z\\."),
                finding.text());
        assertTrue(names(finding).contains("pole 1"));
        assertEquals(List.of(), of(audit(Structures.building(3)), "local-modes"));
    }

    @Test
    void closeModes() {
        Structures tuned = Structures.chain(new double[] {1000, 1}, new double[] {1e6, 1e3});
        Finding finding = only(audit(tuned), "close-modes");
        assertEquals(Severity.INFO, finding.severity());
        assertTrue(finding.text().startsWith("In X these modes lie within 10 % of each other: 1 and 2 (4."), finding.text());
        assertTrue(finding.remedy().contains("CQC"));
        assertEquals(List.of(), of(audit(Structures.chain(new double[] {1000, 1}, new double[] {1e6, 4e3})), "close-modes"));
    }

    private static Structures torsional(double perimeter, double core) {
        Structures s = new Structures("floor").node("c", 0, 0, 4).mass("c", 1000, 1000, 0, 0, 0, 60000).support("c", "uz rx ry");
        for (int i = 0; i < 4; i++) {
            s.node("p" + i, (i % 2) * 12 - 6.0, (i / 2) * 12 - 6.0, 4).spring("frame " + i, "p" + i, null, perimeter, perimeter * 1.2, 0,
                    0, 0, 0);
        }
        return s.spring("core", "c", null, core, core, 0, 0, 0, 0).floor("floor", "c", "p0", "p1", "p2", "p3");
    }

    @Test
    void torsionFirst() {
        Finding finding = only(audit(torsional(1e4, 4e6)), "torsion-first");
        assertEquals(Severity.WARNING, finding.severity());
        assertTrue(finding.text().startsWith("The structure's first mode (mode 1, "), finding.text());
        assertTrue(finding.text().contains("100.0 % of the spin inertia"), finding.text());
        assertEquals(List.of(), of(audit(torsional(1e6, 4e4)), "torsion-first"));
    }

    @Test
    void massOnSupports() {
        Structures s = Structures.chain(new double[] {1000}, new double[] {1e6}).mass("base", 300, 0, 0, 0, 0, 0);
        Finding finding = only(audit(s), "mass-on-supports");
        assertEquals(Severity.INFO, finding.severity());
        assertTrue(finding.text().contains("23.1 % in X"), finding.text());
        assertEquals(List.of(), of(audit(Structures.chain(new double[] {1000}, new double[] {1e6}).mass("base", 100, 0, 0, 0, 0, 0)),
                "mass-on-supports"));
    }

    @Test
    void massBalance() {
        Thresholds none = new Thresholds(0, 0.1, 0.1, 0.01, 0.1, -1);
        AuditRequest strict = new AuditRequest("common-90", EnumSet.of(Direction.X), 0, 0, 1, none);
        Snapshot snapshot = Structures.building(2).snapshot();
        assertEquals(Severity.ERROR, only(AuditRun.standard().run(snapshot, strict, Progress.NONE).findings(), "mass-balance").severity());
        assertEquals(List.of(), of(audit(Structures.building(2)), "mass-balance"));
    }

    /** The motions of a pin joint between bars are left out and said so, once. */
    @Test
    void droppedMotions() {
        Structures s = Structures.building(2).node("pin", 20, 5, 3.5).node("far", 26, 5, 3.5).support("far", "ux uy uz");
        s.member("bar", "n15", "pin").setAxialOnly(true);
        s.member("tie", "pin", "far").setAxialOnly(true);
        s.spring("stay", "pin", null, 0, 1e6, 1e6, 0, 0, 0);
        Finding finding = only(audit(s), "motion-dropped");
        assertEquals(Severity.INFO, finding.severity());
        assertTrue(names(finding).contains("pin"), finding.toString());
        assertTrue(finding.text().contains("rotation about X, rotation about Y and rotation about Z"), finding.text());
    }

    @Test
    void releasesThatLeaveAMemberFree() {
        Structures s = Structures.building(2).node("end", 18, 5, 3.5).support("end", "uy uz rx ry rz");
        Structures.free(s.member("slide", "n15", "end"), true, Component.UX);
        assertEquals(List.of("end"), names(only(audit(s), "mechanism")));
    }

    /** Twenty thousand nodes on a grid, one of them doubled: found without comparing all pairs. */
    @Test
    void largeModelsAreSearchedByPlace() {
        Structures s = new Structures("large").material("steel", 2.1e11, 0.3, 7850).section("bar", 0.01, 2e-5, 2e-5, 3e-5);
        for (int i = 0; i < 20000; i++) {
            s.node("n" + i, i % 30, i / 30 % 30, i / 900);
            if (i > 0) {
                s.with("m" + i, "n" + (i - 1), "n" + i);
            }
        }
        s.support("n0", "ux uy uz rx ry rz").node("double", 7, 11, 5.002).node("end", 7, 11.5, 5.5).with("stub", "double", "end")
                .support("end", "ux");
        List<Finding> findings = ModelFindings.of(s.snapshot(), Thresholds.DEFAULT);
        assertEquals(1, findings.size(), findings.toString());
        assertEquals(List.of("n4837", "double"), names(findings.get(0)));
    }
}
