package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.ui.widgets.Numbers;

class NumbersTest {

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {"0.412345;0.4123", "1840;1,840", "1840.26;1,840", "12.3456;12.35", "0.999951;1.000",
        "3.1e-11;3.100e-11", "0;0", "-2.5;-2.500", "123456.7;123,500", "0.05;0.05000"})
    void fourDigitsOnScreen(double value, String expected) {
        assertEquals(expected, Numbers.significant(value));
    }

    @Test
    void whatIsNoNumberIsASign() {
        assertEquals("–", Numbers.significant(Double.NaN));
        assertEquals("∞", Numbers.significant(Double.POSITIVE_INFINITY));
        assertEquals("rigid", Numbers.period(Double.POSITIVE_INFINITY));
    }

    @Test
    void percentHasOneDecimal() {
        assertEquals("96.2 %", Numbers.percent(0.96249));
        assertEquals("100.0 %", Numbers.percent(1));
    }

    @Test
    void copiedNumbersReadBackAsTheSame() {
        for (double value : new double[] {0.1, 1.0 / 3, 1e-300, 12345678.9}) {
            assertEquals(value, Double.parseDouble(Numbers.exact(value)));
        }
    }
}
