package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.modewright.modal.Structures.filled;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.modewright.fem.Assembly;
import org.modewright.model.structure.LoadPattern;
import org.modewright.numerics.CancelledException;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.EigenSolvers;
import org.modewright.numerics.IndefiniteMassException;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;
import org.modewright.testmodels.Parts;

/** How many modes a run finds, its certificate, the sign of shapes, matrices without a model. */
class ModalRunTest {

    private static final CaptureTarget NINETY_X = new CaptureTarget(0.9, EnumSet.of(Direction.X));

    private static Structures building(int storeys) {
        return Structures.chain(filled(storeys, 1000), filled(storeys, 1e6));
    }

    private static ModalResult run(Structures structures, ModalRequest request) {
        return ModalRun.run(structures.snapshot(), request, Progress.NONE);
    }

    @Test
    void noModeBelowTheLimitIsCountedToo() {
        double first = building(6).modes(1).modes().get(0).frequency();
        ModalResult result = run(building(6), new ModalRequest(0, first / 2, null, 500, 1));
        assertEquals(0, result.modes().size());
        assertTrue(result.certificate().complete());
        assertEquals(first / 2, result.certificate().belowHz(), 1e-12 * first);
        assertEquals(0, result.certificate().counted());
    }

    @Test
    void numberOfModesIsExact() {
        for (int count : new int[] {1, 2, 7, 30}) {
            assertEquals(count, building(30).modes(count).modes().size());
        }
        assertEquals(30, building(30).modes(31).modes().size());
        assertTrue(building(30).modes(31).isExhausted());
    }

    @Test
    void frequencyLimitIsKept() {
        ModalResult all = building(20).allModes();
        double limit = 0.5 * (all.modes().get(6).frequency() + all.modes().get(7).frequency());
        ModalResult below = run(building(20), new ModalRequest(0, limit, NINETY_X, 500, 1));
        assertEquals(7, below.modes().size());
        assertEquals(3, run(building(20), new ModalRequest(3, limit, null, 500, 1)).modes().size());
        assertEquals(7, run(building(20), new ModalRequest(15, limit, null, 500, 1)).modes().size());
    }

    @Test
    void nothingBelowTheLimitIsAnEmptyCompleteRun() {
        ModalResult result = run(building(5), new ModalRequest(0, 1e-3, null, 500, 1));
        assertEquals(0, result.modes().size());
        assertEquals(0, result.capture(Direction.X));
        assertEquals(0, result.running(Direction.X).length);
    }

    @Test
    void firstStepIsEnoughWhereItReachesTheTarget() {
        ModalResult result = run(building(30), ModalRequest.of(NINETY_X));
        assertEquals(12, result.modes().size());
        assertEquals(List.of(), result.remarks());
    }

    /** Mass at the foot, stiff there: the modes that hold it come late. */
    private static Structures lateBuilding() {
        double[] masses = filled(40, 10);
        double[] stiffnesses = filled(40, 1e5);
        Arrays.fill(masses, 0, 4, 1000);
        Arrays.fill(stiffnesses, 0, 4, 1e9);
        return Structures.chain(masses, stiffnesses);
    }

    @Test
    void solvesOnInStepsAndSaysSo() {
        ModalResult result = run(lateBuilding(), ModalRequest.of(NINETY_X));
        double[] running = result.running(Direction.X);
        assertTrue(running[11] < 0.9);
        assertTrue(running[running.length - 1] >= 0.9);
        assertTrue(result.modes().size() == 24 || result.modes().size() == 40, "" + result.modes().size());
        assertTrue(result.remarks().get(0).startsWith("The first 12 modes did not reach the target; solved on to "
                + result.modes().size()), result.remarks().toString());
        assertTrue(result.certificate().complete());
    }

    @Test
    void stopsAtTheLimitAndSaysSo() {
        ModalResult result = run(lateBuilding(), new ModalRequest(0, 0, NINETY_X, 20, 1));
        assertEquals(20, result.modes().size());
        assertTrue(result.remarks().contains("Stopped at the limit of 20 modes before the target was reached."), result.remarks()
                .toString());
        assertFalse(result.isExhausted());
    }

    @Test
    void directionWithoutMassCountsAsMet() {
        CaptureTarget both = new CaptureTarget(0.9, EnumSet.of(Direction.X, Direction.Y));
        assertEquals(12, run(building(30), ModalRequest.of(both)).modes().size());
    }

    @Test
    void everythingAskedForComesWithTheExhaustedSpectrum() {
        ModalResult result = run(building(5), ModalRequest.of(new CaptureTarget(1, EnumSet.of(Direction.X))));
        assertEquals(5, result.modes().size());
        assertEquals(List.of("These are all the modes that the model has: 5."), result.remarks());
    }

    @Test
    void certificateLineIsAsSpecified() {
        assertEquals("complete: 60 of 60 below 14.2 Hz; worst residual 3e-11",
                new Certificate(true, 14.2123, 60, 60, 3.2e-11, 1e-13).line());
        assertEquals("incomplete: 58 of 60 below 14.2 Hz; worst residual 0", new Certificate(false, 14.2123, 60, 58, 0, 0).line());
    }

    @Test
    void certificateCountsWhatWasFound() {
        ModalResult result = building(30).modes(9);
        Certificate certificate = result.certificate();
        assertTrue(certificate.complete());
        assertEquals(9, certificate.found());
        assertEquals(9, certificate.counted());
        assertTrue(certificate.belowHz() > result.modes().get(8).frequency());
        assertTrue(certificate.belowHz() < building(30).modes(10).modes().get(9).frequency());
        assertTrue(certificate.worstResidual() < 1e-10);
        assertTrue(certificate.worstOrthogonality() < 1e-12);
    }

    @Test
    void errorBoundCoversTheError() {
        ModalResult result = building(10).allModes();
        for (Mode mode : result.modes()) {
            double exact = 2 * Math.sqrt(1000) * Math.sin((2 * mode.number() - 1) * Math.PI / 42) / (2 * Math.PI);
            double roundOff = 4e-15;
            assertTrue(Math.abs(mode.frequency() / exact - 1) <= mode.errorBound() + roundOff, "mode " + mode.number());
            assertTrue(mode.errorBound() < 1e-9);
        }
        assertEquals(0.5, ModeFigures.frequencyBound(4, 3), 1e-15);
        assertEquals(1, ModeFigures.frequencyBound(4, 5));
        assertEquals(0, ModeFigures.frequencyBound(0, 1e-9));
    }

    /** The largest translation over all nodes, tied ones included, is positive. */
    @Test
    void largestTranslationIsPositive() {
        Structures s = new Structures("bar").node("a", 0, 0, 0).support("a", "ux uy uz rx ry").mass("a", 0, 0, 0, 0, 0, 20)
                .spring("twist", "a", null, 0, 0, 0, 0, 0, 5e3).node("near", 0, 1, 0).node("far", 0, -8, 0).link("1", "a", "near")
                .link("2", "a", "far");
        double[] shape = s.allModes().shape(0);
        assertTrue(shape[12] > 0);
        assertEquals(-1 / 8.0, shape[6] / shape[12], 1e-12);
        for (ModalResult result : List.of(building(7).allModes(), lateBuilding().allModes())) {
            for (int mode = 0; mode < result.modes().size(); mode++) {
                double[] each = result.shape(mode);
                double largest = 0;
                for (double value : each) {
                    largest = Math.abs(value) > Math.abs(largest) * (1 + 1e-9) ? value : largest;
                }
                assertTrue(largest > 0, "mode " + (mode + 1));
            }
        }
    }

    @Test
    void shapesAreMassNormalised() {
        Structures structures = lateBuilding();
        Assembly assembly = Assembly.of(structures.snapshot(), Progress.NONE);
        ModalResult result = ModalRun.run(assembly, ModalRequest.ofModes(5), Progress.NONE);
        for (int mode = 0; mode < 5; mode++) {
            double sum = 0;
            for (double energy : assembly.kineticEnergies(result.shape(mode))) {
                sum += energy;
            }
            assertEquals(1, sum, 1e-12);
        }
    }

    /** Above some hundred degrees of freedom the sparse solver takes over: the same modes as the dense reference gives. */
    @Test
    void sparseRunAgreesWithTheDenseReference() {
        Structures structures = CharacterTest.building(14, 2e-3, 4e-3);
        structures.model().getRigidFloors().clear();
        Assembly assembly = Assembly.of(structures.snapshot(), Progress.NONE);
        assertTrue(assembly.freeDofs() > 600);
        ModalResult result = ModalRun.run(assembly, ModalRequest.ofModes(20), Progress.NONE);
        EigenPairs reference = EigenSolvers.dense().open(new EigenProblem(assembly.stiffness(), assembly.mass()), Progress.NONE)
                .solve(EigenRequest.lowest(20), Progress.NONE);
        double[] alongX = assembly.massTimesRigid(0, assembly.ledger().centre());
        double captured = 0;
        for (int mode = 0; mode < 20; mode++) {
            assertEquals(reference.values()[mode], result.modes().get(mode).eigenvalue(), 1e-9 * reference.values()[mode]);
            double participation = 0;
            for (int i = 0; i < alongX.length; i++) {
                participation += alongX[i] * reference.vectors()[mode][i];
            }
            captured += participation * participation / assembly.ledger().movable()[0];
        }
        assertEquals(captured, result.capture(Direction.X), 1e-9);
        assertTrue(result.certificate().complete(), result.certificate().line());
        assertTrue(result.certificate().worstOrthogonality() < 1e-12);
    }

    @Test
    void structureThatCannotMoveHasNoModes() {
        Structures s = new Structures("held").node("a", 0, 0, 0).support("a", "ux uy uz rx ry rz").mass("a", 1, 1, 1, 0, 0, 0);
        ModalResult result = s.allModes();
        assertEquals(0, result.freeDofs());
        assertEquals(0, result.modes().size());
        assertTrue(result.certificate().complete());
        assertFalse(result.hasMass(Direction.X));
        assertEquals(1, result.mass().onSupports()[0], 1e-15);
    }

    @Test
    void cancelledRunStops() {
        Progress cancelled = new Progress() {
            @Override
            public void report(String stage, double fraction) {
            }

            @Override
            public boolean isCancelled() {
                return true;
            }
        };
        assertThrows(CancelledException.class, () -> ModalRun.run(building(30).snapshot(), ModalRequest.ofModes(3), cancelled));
    }

    @Test
    void timesAreKept() {
        assertEquals(List.of("factor", "eigen", "assemble").stream().sorted().toList(),
                building(3).allModes().seconds().keySet().stream().sorted().toList());
    }

    /**
     * A bar fixed at one end, of 20 kg with consistent mass: M of its free end along X is 20/3 kg, less than the 10 kg of a lumped mass. A
     * load that takes 8 kg away leaves a negative kinetic energy, and one that takes 6 kg does not.
     */
    @Test
    void loadsThatTakeAwayTooMuchMassAreNamed() {
        assertEquals(1, bar(6).allModes().modes().size());
        String sentence = assertThrows(IndefiniteMassException.class, () -> bar(8).allModes()).getMessage();
        assertTrue(sentence.contains("pattern uplift") && sentence.contains("node tip (\u22128.00 kg)"), sentence);
        assertEquals(1, bar(8).lumped().allModes().modes().size());
    }

    private static Structures bar(double lifted) {
        Structures s = new Structures("bar").material("steel", 2e11, 0.3, 1000).section("rod", 0.01, 0, 0, 0);
        s.node("root", 0, 0, 0).node("tip", 2, 0, 0).support("root", "ux uy uz rx ry rz").support("tip", "uy uz");
        s.member("rod", "root", "tip").setAxialOnly(true);
        LoadPattern uplift = new Parts(s.model()).pattern("uplift", 1);
        Parts.load(uplift, s.node("tip"), -9.80665 * lifted);
        return s;
    }

    @Test
    void badRequestsAreRefusedWithASentence() {
        assertThrows(IllegalArgumentException.class, () -> new ModalRequest(-1, 0, null, 500, 1));
        assertThrows(IllegalArgumentException.class, () -> new ModalRequest(0, -1, null, 500, 1));
        assertThrows(IllegalArgumentException.class, () -> new ModalRequest(0, Double.NaN, null, 500, 1));
        assertThrows(IllegalArgumentException.class, () -> new ModalRequest(0, 0, null, 0, 1));
        assertThrows(IllegalArgumentException.class, () -> new CaptureTarget(1.2, EnumSet.of(Direction.X)));
    }

    @Test
    void matrixPairHasModesAndCertificate() {
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(2);
        k.add(0, 0, 3);
        k.add(1, 0, -1);
        k.add(1, 1, 1);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(2);
        m.add(0, 0, 2);
        m.add(1, 1, 1);
        MatrixRun.Result result = MatrixRun.run(k.build(), m.build(), ModalRequest.ofAllModes(), Progress.NONE);
        assertEquals(Math.sqrt(0.5) / (2 * Math.PI), result.frequencies()[0], 1e-14);
        assertEquals(Math.sqrt(2) / (2 * Math.PI), result.frequencies()[1], 1e-14);
        assertTrue(result.certificate().complete());
        SymmetricMatrix other = SymmetricMatrix.builder(3).build();
        assertThrows(IllegalArgumentException.class, () -> MatrixRun.run(other, m.build(), ModalRequest.ofAllModes(), Progress.NONE));
    }
}
