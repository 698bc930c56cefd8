package org.modewright.ui.tests.views;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.modewright.modal.Character.Kind;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalResult;
import org.modewright.ui.modes.ModeColumn;
import org.modewright.ui.modes.ModeFilter;
import org.modewright.ui.modes.ModeRows;
import org.modewright.ui.modes.ModesSentence;

/** What the table of modes shows, sorts by, filters, marks and copies. */
class ModeTableContentTest {

    private static final double[] STRAIN = {0.5, 0.3, 0.2, 0};
    private static final double[] KINETIC = {0.02, 0.02, 0, 0.96};

    /** Frequencies 1, 1.05 (close to the first), 2 and 4 Hz; the third local. */
    private static ModalResult four() {
        return new SmallResults().mode(1, Kind.SWAY_X, 0.7, 0.02, STRAIN, KINETIC).mode(1.05, Kind.SWAY_Y, 0.001, 0.8, STRAIN, KINETIC)
                .mode(2, Kind.LOCAL, 0.0004, 0, new double[] {0.01, 0, 0.99, 0}, new double[] {0.01, 0, 0.5, 0.49})
                .mode(4, Kind.SWAY_X, 0.2, 0.1, STRAIN, KINETIC).build();
    }

    private final ModeRows rows = new ModeRows(four());

    @Test
    void sharesAreShownInPercentWithOneDecimalAndCopiedInFull() {
        assertEquals("70.0", ModeColumn.MASS_X.text(rows, 0));
        assertEquals("0.0", ModeColumn.MASS_X.text(rows, 2));
        assertEquals(Double.toString(0.0004 * 100), ModeColumn.MASS_X.exact(rows, 2));
        assertEquals("90.1", ModeColumn.RUNNING_X.text(rows, 3));
        assertEquals("92.0", ModeColumn.RUNNING_Y.text(rows, 3));
    }

    @Test
    void aDirectionWithoutMassShowsADash() {
        assertEquals("–", ModeColumn.MASS_Z.text(rows, 0));
    }

    @Test
    void unitsStandInTheHeaders() {
        assertTrue(ModeColumn.PERIOD.header().endsWith(" s"), ModeColumn.PERIOD.header());
        assertTrue(ModeColumn.FREQUENCY.header().endsWith(" Hz"), ModeColumn.FREQUENCY.header());
        assertTrue(ModeColumn.MASS_X.header().endsWith("%"), ModeColumn.MASS_X.header());
        assertEquals("0.5000", ModeColumn.PERIOD.text(rows, 2));
    }

    @ParameterizedTest
    @EnumSource(ModeColumn.class)
    void everyColumnSaysWhatItIsAndHasADistinctHeader(ModeColumn column) {
        assertFalse(column.tip().isBlank());
        assertEquals(1, Arrays.stream(ModeColumn.values()).filter(other -> other.header().equals(column.header())).count());
    }

    @ParameterizedTest
    @EnumSource(ModeColumn.class)
    void everyColumnSortsAllModesByWhatItShows(ModeColumn column) {
        List<Integer> order = IntStream.range(0, 4).boxed().sorted(column.order(rows)).toList();
        assertEquals(Set.of(0, 1, 2, 3), Set.copyOf(order));
        for (int i = 1; i < 4 && column.isNumeric(); i++) {
            assertTrue(column.value(rows, order.get(i - 1)) <= column.value(rows, order.get(i)), column + " " + order);
        }
    }

    @Test
    void charactersSortByTheirWords() {
        assertEquals(2, IntStream.range(0, 4).boxed().min(ModeColumn.CHARACTER.order(rows)).orElseThrow(), "local before sway");
    }

    @Test
    void barsNeverLeaveTheirCell() {
        assertEquals(0.7, ModeColumn.MASS_X.bar(rows, 0));
        assertEquals(0, ModeColumn.PERIOD.bar(rows, 0));
        ModeRows more = new ModeRows(new SmallResults().mode(1, 1 + 1e-12, 0).build());
        assertEquals(1, ModeColumn.RUNNING_X.bar(more, 0));
    }

    @Test
    void filtersKeepWhatTheySay() {
        assertEquals(List.of(0, 1, 2, 3), kept(ModeFilter.ALL));
        assertEquals(List.of(2), kept(new ModeFilter(ModeFilter.Kind.LOCAL, 0, null)));
        assertEquals(List.of(0, 1, 3), kept(new ModeFilter(ModeFilter.Kind.NOT_LOCAL, 0, null)));
        assertEquals(List.of(0, 3), kept(new ModeFilter(ModeFilter.Kind.AT_LEAST, 0.05, Direction.X)));
        assertEquals(List.of(0, 1, 3), kept(new ModeFilter(ModeFilter.Kind.AT_LEAST, 0.05, null)));
        assertEquals(List.of(), kept(new ModeFilter(ModeFilter.Kind.AT_LEAST, 0.05, Direction.Z)));
    }

    private List<Integer> kept(ModeFilter filter) {
        return IntStream.range(0, rows.count()).filter(mode -> filter.accepts(rows, mode)).boxed().toList();
    }

    @Test
    void neighboursWithinTenPercentAreClose() {
        assertEquals(1, rows.closeTo(0));
        assertEquals(0, rows.closeTo(1));
        assertEquals(-1, rows.closeTo(2));
        assertTrue(rows.reasons(0).contains("mode 2") && rows.reasons(0).contains("5.0 %"), rows.reasons(0));
    }

    @Test
    void rigidModesAreCloseToNone() {
        ModeRows rigid = new ModeRows(new SmallResults().mode(0, 1, 0).mode(0, 0, 1).mode(1, 0, 0).build());
        assertEquals(-1, rigid.closeTo(0));
        assertEquals(-1, rigid.closeTo(1));
        assertEquals(-1, rigid.closeTo(2));
    }

    @Test
    void signsAreExplained() {
        assertEquals("\u2248 ", rows.signs(0));
        assertEquals("\u25c7 ", rows.signs(2));
        assertTrue(rows.reasons(2).contains("local: 2 members"), rows.reasons(2));
        assertEquals("", rows.signs(3));
        assertEquals("", rows.reasons(3));
    }

    @Test
    void modesThatHoldTheSelectionAreMarked() {
        rows.mark(Set.of("m3"), 0.5);
        assertEquals("\u25cf\u25c7 ", rows.signs(2));
        assertTrue(rows.reasons(2).contains("99.0 %") && rows.reasons(2).contains("50.0 %"), rows.reasons(2));
        assertEquals("", rows.signs(3));
        rows.mark(Set.of(), 0.5);
        assertEquals("\u25c7 ", rows.signs(2));
    }

    @Test
    void theSentenceCountsAndCarries() {
        String sentence = ModesSentence.of(four());
        assertTrue(sentence.startsWith("4 modes, 1.00 s to 0.250 s"), sentence);
        assertTrue(sentence.contains("together they carry 90.1 % of X"), sentence);
        assertTrue(sentence.endsWith("1 local"), sentence);
    }

    @Test
    void theSentenceTakesTheFewestModesThatCarry() {
        ModalResult result = new SmallResults().mode(1, 0.03, 0.2).mode(2, 0.6, 0.2).mode(3, 0.36, 0.6).build();
        assertTrue(ModesSentence.of(result).contains("2 carry 95.0 % of X"), ModesSentence.of(result));
    }

    @Test
    void theSentenceSpeaksOfADirectionThatMoves() {
        String sentence = ModesSentence.of(new SmallResults().withoutMassInY().mode(1, 0.97, 0).mode(2, 0.03, 0).build());
        assertTrue(sentence.contains("1 carries 95.0 % of X"), sentence);
    }

    @Test
    void theSentenceOfNoModeSaysSo() {
        assertTrue(ModesSentence.of(new SmallResults().build()).startsWith("No mode was found"));
    }
}
