package org.modewright.ui.tests.editor;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.ui.editor.commands.Triple;

/** Three numbers on one line. */
class TripleTest {

    @ParameterizedTest
    @ValueSource(strings = {"1.5 -2 3e2", " 1.5\t-2\t3e2 ", "1.5, -2, 3e2", "1.5;-2;300"})
    void numbersStandApartBySpacesTabsCommasOrSemicolons(String text) {
        assertArrayEquals(new double[] {1.5, -2, 300}, Triple.parse(text));
        assertNull(Triple.fault(text));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "1", "1 2", "1 2 3 4", "1 2 x", "1 2 NaN", "1 2 1e999"})
    void whatIsNotThreeFiniteNumbersIsRefused(String text) {
        assertNotNull(Triple.fault(text));
        assertThrows(IllegalArgumentException.class, () -> Triple.parse(text));
    }

    @Test
    void theTextReadsBackAsTheSameNumbers() {
        assertEquals("0 -12 0.1", Triple.text(0, -12, 0.1));
        double third = 1.0 / 3;
        assertArrayEquals(new double[] {third, 2e9, -1e-7}, Triple.parse(Triple.text(third, 2e9, -1e-7)));
    }
}
