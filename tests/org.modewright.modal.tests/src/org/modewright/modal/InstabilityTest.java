package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.modewright.model.structure.Component;

/** Free bodies, mechanisms and buckled structures: found, named, and not seen where there are none. */
class InstabilityTest {

    private static Structures steel(String name) {
        return new Structures(name).material("steel", 2.1e11, 0.3, 7850).section("section", 0.01, 8e-5, 3e-5, 1e-6);
    }

    /** A beam that is skew in space, of so many members, unsupported. */
    private static Structures skewBeam(int members) {
        Structures s = steel("free beam");
        for (int i = 0; i <= members; i++) {
            double at = (double) i / members;
            s.node("n" + i, 1.3 + 5.1 * at, -0.7 + 3.3 * at, 2.9 + 4.7 * at);
        }
        for (int i = 0; i < members; i++) {
            s.with("m" + i, "n" + i, "n" + (i + 1));
        }
        return s;
    }

    @Test
    void freeBeamHasSixRigidModes() {
        ModalResult result = skewBeam(5).modes(10);
        for (Mode mode : result.modes()) {
            if (mode.number() <= 6) {
                assertEquals(0, mode.eigenvalue(), "mode " + mode.number());
                assertEquals(0, mode.frequency());
                assertEquals(Double.POSITIVE_INFINITY, mode.period());
                assertEquals(Character.Kind.RIGID, mode.character().kind());
            } else {
                assertTrue(mode.frequency() > 1, "mode " + mode.number());
            }
        }
        for (Direction direction : Direction.values()) {
            assertEquals(1, result.running(direction)[5], 1e-10, direction.word());
        }
        assertTrue(result.certificate().complete(), result.certificate().line());
    }

    @Test
    void freeBeamIsOneFreePart() {
        ModalResult result = skewBeam(5).modes(10);
        assertEquals(1, result.instabilities().size());
        Instability part = result.instabilities().get(0);
        assertEquals(Instability.Kind.FREE_PART, part.kind());
        assertEquals(6, part.nodeIds().size());
        assertEquals(List.of("X", "Y", "Z", "rotation about X", "rotation about Y", "rotation about Z"), part.directions());
        assertEquals("6 nodes (n0, n1, n2, n3, n4 and 1 more) form a part that is not connected to any support and can move as a rigid"
                + " body (X, Y, Z, rotation about X, rotation about Y, rotation about Z); 6 modes at 0 Hz.", part.text());
    }

    /** All six motions are named even where fewer modes were asked for. */
    @Test
    void allMotionsAreNamedWhateverTheNumberOfModes() {
        ModalResult result = skewBeam(5).modes(2);
        assertEquals(2, result.modes().size());
        assertEquals(6, result.instabilities().get(0).directions().size());
        assertTrue(result.instabilities().get(0).text().endsWith("6 modes at 0 Hz."), result.instabilities().get(0).text());
    }

    @Test
    void beamOnOneBallJointCanTurnThreeWays() {
        ModalResult result = skewBeam(4).support("n0", "ux uy uz").modes(6);
        assertEquals(3, result.modes().stream().filter(mode -> mode.eigenvalue() == 0).count());
        Instability part = result.instabilities().get(0);
        assertEquals(1, result.instabilities().size());
        assertEquals(Instability.Kind.FREE_PART, part.kind());
        assertEquals(List.of("rotation about X", "rotation about Y", "rotation about Z"), part.directions());
        assertTrue(part.text().contains("are not held enough"), part.text());
    }

    @Test
    void beamOnTwoBallJointsSpins() {
        Structures s = steel("shaft");
        s.node("a", 0, 0, 0).node("b", 2, 0, 0).node("c", 4, 0, 0).with("ab", "a", "b").with("bc", "b", "c");
        ModalResult result = s.support("a", "ux uy uz").support("c", "uy uz").modes(4);
        Instability part = result.instabilities().get(0);
        assertEquals(1, result.modes().stream().filter(mode -> mode.eigenvalue() == 0).count());
        assertEquals(List.of("rotation about X"), part.directions());
        assertEquals(3, part.nodeIds().size());
    }

    /** Columns pinned at both ends and beams pinned on them: the roof sways without resistance in X and Y and turns. */
    private static Structures pinnedPortal() {
        Structures s = steel("pinned portal");
        s.node("a", 0, 0, 0).node("b", 0, 0, 4).node("c", 6, 0, 4).node("d", 6, 0, 0);
        s.support("a", "ux uy uz rz").support("d", "ux uy uz rz");
        s.support("b", "uy rx rz").support("c", "uy rx rz");
        s.with("ab", "a", "b").with("dc", "d", "c");
        Structures.free(s.member("bc", "b", "c"), true, Component.RY);
        Structures.free(s.model().getMembers().get(2), false, Component.RY);
        return s;
    }

    @Test
    void pinnedPortalIsAMechanismWithNames() {
        ModalResult result = pinnedPortal().modes(4);
        assertEquals(1, result.modes().stream().filter(mode -> mode.eigenvalue() == 0).count());
        assertEquals(1, result.instabilities().size());
        Instability mechanism = result.instabilities().get(0);
        assertEquals(Instability.Kind.MECHANISM, mechanism.kind());
        assertEquals(List.of("b", "c"), mechanism.nodeNames());
        assertEquals(List.of("X"), mechanism.directions());
        assertEquals("Nodes b and c can move without resistance (X); 1 mode at 0 Hz.", mechanism.text());
    }

    @Test
    void bracedPortalIsNone() {
        Structures braced = pinnedPortal();
        braced.member("brace", "a", "c").setAxialOnly(true);
        ModalResult result = braced.modes(4);
        assertEquals(List.of(), result.instabilities());
        assertTrue(result.modes().get(0).frequency() > 1);
    }

    @Test
    void twoMechanismsComeApart() {
        Structures s = new Structures("two");
        s.node("a", 0, 0, 0).support("a", "uy uz rx ry rz").mass("a", 5, 0, 0, 0, 0, 0);
        s.node("b", 9, 0, 0).support("b", "ux uz rx ry rz").mass("b", 0, 8, 0, 0, 0, 0);
        s.node("c", 4, 0, 0).support("c", "ux uy rx ry rz").mass("c", 0, 0, 8, 0, 0, 0).spring("s", "c", null, 0, 0, 1e4, 0, 0, 0);
        ModalResult result = s.allModes();
        assertEquals(2, result.instabilities().size());
        for (Instability instability : result.instabilities()) {
            assertEquals(1, instability.nodeNames().size());
            assertEquals(instability.nodeNames().get(0).equals("a") ? List.of("X") : List.of("Y"), instability.directions());
        }
    }

    /**
     * A mass without rotary inertia that hangs on a translational spring at the mid-point can swing: massive and massless motions mixed.
     */
    @Test
    void swingingMassIsAMechanism() {
        Structures s = new Structures("swing").node("top", 0, 0, 4).support("top", "ux uy uz rx ry rz").node("bob", 0, 0, 2)
                .mass("bob", 50, 50, 50, 0, 0, 0).spring("hanger", "top", "bob", 1e6, 1e6, 1e6, 0, 0, 0);
        ModalResult result = s.allModes();
        assertEquals(3, result.modes().size());
        assertEquals(2, result.modes().stream().filter(mode -> mode.eigenvalue() == 0).count());
        assertEquals(Math.sqrt(1e6 / 50), 2 * Math.PI * result.modes().get(2).frequency(), 1e-9);
        assertEquals(List.of("bob"), result.instabilities().get(0).nodeNames());
        assertEquals(List.of("X", "Y"), result.instabilities().get(0).directions().subList(0, 2));
    }

    /** A very soft structure is no mechanism. */
    @Test
    void softSpringIsNoMechanism() {
        Structures s = Structures.chain(new double[] {1000, 1000}, new double[] {1e9, 1});
        ModalResult result = s.allModes();
        assertEquals(List.of(), result.instabilities());
        assertEquals(Math.sqrt(1.0 / 1000), 2 * Math.PI * result.modes().get(0).frequency(), 1e-8);
    }

    /**
     * Euler's cantilever: critical load &pi;&sup2;EI/4L&sup2;. Just below it the first frequency is small, above it the stiffness is
     * indefinite.
     */
    private static Structures compressedColumn(double ofCritical) {
        Structures s = steel("column").node("n0", 0, 0, 0).support("n0", "ux uy uz rx ry rz");
        double critical = Math.PI * Math.PI * 2.1e11 * 3e-5 / (4 * 36);
        for (int i = 1; i <= 8; i++) {
            s.node("n" + i, 0, 0, 6.0 * i / 8);
            s.member("m" + i, "n" + (i - 1), "n" + i).setAxialForce(-ofCritical * critical);
        }
        return s;
    }

    @Test
    void columnBelowBucklingIsSound() {
        ModalResult result = compressedColumn(0.99).modes(4);
        assertEquals(List.of(), result.instabilities());
        assertTrue(result.modes().get(0).frequency() < 0.2 * compressedColumn(0).modes(1).modes().get(0).frequency());
    }

    @Test
    void buckledColumnIsIndefinite() {
        ModalResult result = compressedColumn(1.2).modes(4);
        assertTrue(result.modes().get(0).eigenvalue() < 0);
        assertEquals(0, result.modes().get(0).frequency());
        assertEquals(Character.Kind.UNSTABLE, result.modes().get(0).character().kind());
        assertTrue(result.certificate().complete(), result.certificate().line());
        assertEquals(1, result.instabilities().size());
        Instability buckling = result.instabilities().get(0);
        assertEquals(Instability.Kind.INDEFINITE, buckling.kind());
        assertEquals(List.of("Y"), buckling.directions());
        assertTrue(buckling.nodeNames().contains("n8"));
        assertTrue(buckling.text().contains("members"), buckling.text());
        assertTrue(!buckling.elementIds().isEmpty());
    }

    /** A column without mass of its own that buckles between its ends shows in no mode, and is found by the inertia of the stiffness. */
    private static Structures masslessColumn(double ofEuler) {
        Structures s = steel("massless column").node("n0", 0, 0, 0).support("n0", "ux uy uz rz");
        double euler = Math.PI * Math.PI * 2.1e11 * 3e-5 / 36;
        for (int i = 1; i <= 6; i++) {
            s.node("n" + i, 0, 0, i);
            s.member("m" + i, "n" + (i - 1), "n" + i).setAxialForce(-ofEuler * euler);
        }
        s.support("n6", "ux uy").mass("n6", 900, 900, 900, 0, 0, 0).model().setSelfMassFactor(0);
        return s;
    }

    @Test
    void bucklingWithoutMassIsFound() {
        assertEquals(List.of(), masslessColumn(0.9).allModes().instabilities());
        ModalResult buckled = masslessColumn(1.1).allModes();
        assertTrue(buckled.modes().stream().allMatch(mode -> mode.eigenvalue() > 0));
        assertEquals(1, buckled.instabilities().size());
        Instability hidden = buckled.instabilities().get(0);
        assertEquals(Instability.Kind.INDEFINITE, hidden.kind());
        assertTrue(hidden.text().startsWith("The stiffness is indefinite in 1 shape without mass"), hidden.text());
        assertEquals(5, hidden.elementIds().size());
    }

    /** A second, unsupported part beside a sound structure. */
    @Test
    void loosePartBesideASoundStructure() {
        Structures s = compressedColumn(0);
        s.node("p", 3, 0, 0).node("q", 3, 2, 0).with("pq", "p", "q");
        ModalResult result = s.modes(8);
        assertEquals(1, result.instabilities().size());
        assertEquals(List.of("p", "q"), result.instabilities().get(0).nodeNames());
        assertEquals(Instability.Kind.FREE_PART, result.instabilities().get(0).kind());
        assertEquals(6, result.modes().stream().filter(mode -> mode.eigenvalue() == 0).count());
    }
}
