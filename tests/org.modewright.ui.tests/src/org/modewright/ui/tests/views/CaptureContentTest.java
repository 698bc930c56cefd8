package org.modewright.ui.tests.views;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditStatus;
import org.modewright.audit.Verdict;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalResult;
import org.modewright.ui.modes.CaptureScale;
import org.modewright.ui.modes.CaptureSentence;
import org.modewright.ui.modes.MassRow;
import org.modewright.ui.widgets.SentenceBar.Sign;

/** What the view of mass capture says, where its staircase stands and what its ledger lists. */
class CaptureContentTest {

    private static final double ROUND_OFF = 1e-12;

    private static ModalResult result() {
        return new SmallResults().mode(1, 0.7, 0.3).mode(2, 0.25, 0.2).mode(10, 0.03, 0.34).build();
    }

    private static AuditResult audit(AuditStatus status, Verdict... verdicts) {
        return new AuditResult(result(), List.of(verdicts), List.of(), status, "The structure is a mechanism.");
    }

    private static final Verdict X_PASSES = new Verdict("pack", "clause", Direction.X, 0.98, 0.9, true, 2, 0, "long text of X");
    private static final Verdict Y_FAILS = new Verdict("pack", "clause", Direction.Y, 0.84, 0.9, false, 0, 25, "long text of Y");
    private static final Verdict Y_UNKNOWN = new Verdict("pack", "clause", Direction.Y, 0.84, 0.9, false, 0, -1, "long text of Y");

    @Test
    void theSentenceSaysWhatIsEnoughAndWhatIsShort() {
        assertEquals("X: 95.0 % by mode 2, enough.\nY: 84.0 % by mode 3, 6.0 % short: about 25 modes more, or add the static correction.",
                CaptureSentence.of(audit(AuditStatus.NOT_PASSED, X_PASSES, Y_FAILS)));
        assertEquals("X: 95.0 % by mode 2, enough.", CaptureSentence.of(audit(AuditStatus.PASSED, X_PASSES)));
    }

    @Test
    void anUnknownNumberOfModesIsNotInvented() {
        String sentence = CaptureSentence.of(audit(AuditStatus.NOT_PASSED, Y_UNKNOWN));
        assertFalse(sentence.contains("-1"), sentence);
        assertTrue(sentence.contains("6.0 % short: take more modes"), sentence);
    }

    @Test
    void anUnstableStructureIsNotJudged() {
        AuditResult unstable = audit(AuditStatus.UNSTABLE, X_PASSES);
        assertEquals("The structure is a mechanism.", CaptureSentence.of(unstable));
        assertEquals(Sign.ERROR, CaptureSentence.sign(unstable));
        assertEquals(Sign.FAILED, CaptureSentence.sign(audit(AuditStatus.NOT_PASSED)));
        assertEquals(Sign.PASSED, CaptureSentence.sign(audit(AuditStatus.PASSED)));
    }

    @Test
    void modesStandEvenlyByNumber() {
        CaptureScale scale = new CaptureScale(result(), false);
        assertEquals(1.0 / 3, scale.position(0), ROUND_OFF);
        assertEquals(1, scale.position(2), ROUND_OFF);
        assertEquals(1, scale.nearest(0.6));
    }

    @Test
    void modesStandByTheLogarithmOfTheirPeriod() {
        CaptureScale scale = new CaptureScale(result(), true);
        assertEquals(1, scale.position(2), ROUND_OFF, "the shortest period stands at the end");
        double first = scale.position(0);
        assertTrue(first > 0 && first < 0.1, "the step of the longest period is seen, at " + first);
        double share = (scale.position(1) - first) / (1 - first);
        assertEquals(Math.log(2) / Math.log(10), share, ROUND_OFF);
        assertEquals(1, scale.nearest(scale.positionOf(0.45)));
    }

    @Test
    void oneModeAloneStandsByItsNumber() {
        CaptureScale scale = new CaptureScale(new SmallResults().mode(1, 1, 1).build(), true);
        assertFalse(scale.isByPeriod());
        assertEquals(1, scale.position(0), ROUND_OFF);
    }

    @Test
    void rigidModesStandAtTheBeginningOfThePeriods() {
        CaptureScale scale = new CaptureScale(new SmallResults().mode(0, 0.1, 0).mode(1, 0.7, 0).mode(2, 0.2, 0).build(), true);
        assertEquals(0, scale.position(0), ROUND_OFF);
        assertTrue(scale.position(1) > 0);
        assertEquals(1, scale.longest(), ROUND_OFF);
        assertEquals(0.5, scale.shortest(), ROUND_OFF);
    }

    @Test
    void ticksAreRoundAndFew() {
        assertEquals(List.of("1", "2", "3"), new CaptureScale(result(), false).ticks().stream().map(CaptureScale.Tick::text).toList());
        assertEquals(List.of("1", "0.5", "0.2", "0.1"), new CaptureScale(result(),
                true).ticks().stream().map(CaptureScale.Tick::text).toList());
        SmallResults many = new SmallResults();
        for (int mode = 1; mode <= 96; mode++) {
            many.mode(mode, 0.01, 0.01);
        }
        List<CaptureScale.Tick> ticks = new CaptureScale(many.build(), false).ticks();
        assertEquals(List.of("10", "20", "30", "40", "50", "60", "70", "80", "90"), ticks.stream().map(CaptureScale.Tick::text).toList());
        assertEquals(10.0 / 96, ticks.get(0).position(), ROUND_OFF);
    }

    @Test
    void theLedgerListsWhatMovesWhatIsHeldAndWhatIsMissed() {
        List<MassRow> rows = MassRow.of(result());
        assertEquals(List.of("Can move", "self", "dead", "Captured by 3 modes", "Missing", "On supports", "self", "dead"),
                rows.stream().map(MassRow::label).toList());
        assertArrayEquals(new double[] {4000, 4000, 0}, rows.get(0).kilograms());
        assertEquals(0.98 * 4000, rows.get(3).kilograms()[0], 4000 * ROUND_OFF);
        assertEquals(0.16 * 4000, rows.get(4).kilograms()[1], 4000 * ROUND_OFF);
        assertTrue(Double.isNaN(rows.get(3).kilograms()[2]), "nothing moves in Z, so nothing is captured or missing");
        assertArrayEquals(new double[] {1000, 1000, 5000}, rows.get(5).kilograms());
    }

    @Test
    void sourcesAddUpToTheirTotals() {
        List<MassRow> rows = MassRow.of(result());
        for (int axis = 0; axis < 3; axis++) {
            int direction = axis;
            assertEquals(rows.get(0).kilograms()[axis],
                    rows.subList(1, 3).stream().mapToDouble(row -> row.kilograms()[direction]).sum(), 4000 * ROUND_OFF);
            assertEquals(rows.get(5).kilograms()[axis],
                    rows.subList(6, 8).stream().mapToDouble(row -> row.kilograms()[direction]).sum(), 5000 * ROUND_OFF);
        }
        assertTrue(Arrays.stream(new int[] {0, 3, 4, 5}).allMatch(row -> rows.get(row).isTotal()));
    }
}
