package org.modewright.ui.tests.views;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.modewright.modal.Character.Kind;
import org.modewright.modal.Dominance;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.Dominance.RollUp;
import org.modewright.modal.ModalResult;
import org.modewright.ui.modes.DominanceRow;
import org.modewright.ui.modes.DominanceSentence;

/** Rows and sentences of the view of dominance. */
class DominanceContentTest {

    private static final double ROUND_OFF = 1e-12;

    private static ModalResult result() {
        return new SmallResults()
                .mode(1, Kind.SWAY_X, 0.7, 0, new double[] {0.5, 0.31, 0.19, 0}, new double[] {0.02, 0.01, 0.03, 0.94})
                .mode(3, Kind.LOCAL, 0, 0, new double[] {0.04, 0, 0.96, 0}, new double[] {0.01, 0, 0.99, 0}).build();
    }

    @Test
    void rowsPairBothEnergiesAndRunOverTheRankedOne() {
        List<DominanceRow> rows = DominanceRow.of(result(), 0, RollUp.ELEMENT, Energy.STRAIN);
        assertEquals(List.of("B1", "B2", "C1", "2"), rows.stream().map(DominanceRow::label).toList());
        assertEquals(0.5, rows.get(0).strain(), ROUND_OFF);
        assertEquals(0.02, rows.get(0).kinetic(), ROUND_OFF);
        assertEquals(0.81, rows.get(1).running(), ROUND_OFF);
        assertEquals(1, rows.get(3).running(), ROUND_OFF);
        assertEquals(0, rows.get(3).strain(), "a node has no strain energy");
    }

    @Test
    void rowsRankByKineticEnergyToo() {
        List<DominanceRow> rows = DominanceRow.of(result(), 0, RollUp.ELEMENT, Energy.KINETIC);
        assertEquals(List.of("2", "C1", "B1", "B2"), rows.stream().map(DominanceRow::label).toList());
        assertEquals(0.97, rows.get(1).running(), ROUND_OFF);
    }

    @Test
    void groupsSumTheirMembers() {
        List<DominanceRow> rows = DominanceRow.of(result(), 0, RollUp.GROUP, Energy.STRAIN);
        assertEquals(List.of("braces", "columns", ""), rows.stream().map(DominanceRow::label).toList());
        assertEquals(0.81, rows.get(0).strain(), ROUND_OFF);
        assertEquals(0.03, rows.get(0).kinetic(), ROUND_OFF);
        assertEquals(0.94, rows.get(2).kinetic(), ROUND_OFF);
    }

    @Test
    void aRowOfARollUpStandsForAllItsElements() {
        ModalResult result = result();
        List<DominanceRow> groups = DominanceRow.of(result, 0, RollUp.GROUP, Energy.STRAIN);
        assertEquals(Set.of("m1", "m2"), groups.get(0).elementIds(result, RollUp.GROUP));
        assertEquals(Set.of("n2"), groups.get(2).elementIds(result, RollUp.GROUP), "elements without a group");
        DominanceRow first = DominanceRow.of(result, 0, RollUp.ELEMENT, Energy.STRAIN).get(0);
        assertEquals(Set.of("m1"), first.elementIds(result, RollUp.ELEMENT));
    }

    @Test
    void theSentenceNamesTheLeadingGroupAndWhereTheMassMoves() {
        assertEquals("Mode 1, 1.00 s: 81.0 % of the strain energy in 2 members of group braces; 94.0 % of the moving mass in node 2 on "
                + "level 2", DominanceSentence.of(result(), 0));
    }

    @Test
    void theSentenceNamesASingleElement() {
        String sentence = DominanceSentence.of(result(), 1);
        assertTrue(sentence.contains("96.0 % of the strain energy in member C1 of group columns"), sentence);
    }

    @Test
    void aRigidModeHasNoStrainEnergy() {
        ModalResult rigid = new SmallResults().mode(0, Kind.RIGID, 1, 0, new double[4], new double[] {0, 0, 0, 1}).build();
        assertTrue(DominanceSentence.of(rigid, 0).startsWith("Mode 1 has no strain energy; 100.0 % of the moving mass in node 2"),
                DominanceSentence.of(rigid, 0));
    }

    @Test
    void theReverseSentenceCountsTheModesOfTheSelection() {
        ModalResult result = result();
        Set<String> column = Set.of("m3");
        assertEquals("Member C1 holds at least 50.0 % of the strain or kinetic energy in 1 of 2 modes",
                DominanceSentence.modesOf(result, column, 0.5, new Dominance(result).modesOf(column, 0.5)));
        assertEquals("Member B1 holds less than 60.0 % in every mode found.",
                DominanceSentence.modesOf(result, Set.of("m1"), 0.6, List.of()));
        Set<String> both = Set.of("m1", "m2");
        assertTrue(DominanceSentence.modesOf(result, both, 0.6,
                new Dominance(result).modesOf(both, 0.6)).contains("together hold at least 60.0 %"));
        assertTrue(DominanceSentence.modesOf(result, Set.of(), 0.5, List.of()).startsWith("Select an element"));
    }
}
