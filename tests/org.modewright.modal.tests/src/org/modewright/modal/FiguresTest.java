package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Numbers as sentences show them. */
class FiguresTest {

    @Test
    void significantDigitsArePadded() {
        assertEquals("14.2", Figures.significant(14.2123, 3));
        assertEquals("0.500", Figures.significant(0.5, 3));
        assertEquals("10.0", Figures.significant(9.9999, 3));
        assertEquals("60000", Figures.significant(60000, 3));
        assertEquals("-0.0120", Figures.significant(-0.012, 3));
        assertEquals("0", Figures.significant(0, 3));
        assertEquals("3.20e-05", Figures.significant(3.2e-5, 3));
        assertEquals("infinite", Figures.significant(Double.POSITIVE_INFINITY, 3));
    }

    @Test
    void scientificHasOneDigit() {
        assertEquals("3e-11", Figures.scientific(3.2e-11));
        assertEquals("7e-5", Figures.scientific(6.6e-5));
        assertEquals("0", Figures.scientific(0));
        assertEquals("2e7", Figures.scientific(2.1e7));
    }

    @Test
    void percentHasOneDecimal() {
        assertEquals("96.2 %", Figures.percent(0.96213));
        assertEquals("1 mode", Figures.count(1, "mode", "modes"));
        assertEquals("0 modes", Figures.count(0, "mode", "modes"));
    }
}
