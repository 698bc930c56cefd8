package org.modewright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Text that a spreadsheet might run is escaped, and the escape can always be undone. */
class SpreadsheetTextTest {

    @ParameterizedTest
    @ValueSource(strings = {"=1+1", "+x", "-x", "@x", "\tx", "\rx", "\nx", "=", "-", "'=x", "''+x", "\uFF1Dx"})
    void dangerousTextIsEscapedOnce(String text) {
        assertEquals("'" + text, SpreadsheetText.escape(text));
        assertEquals(text, SpreadsheetText.unescape(SpreadsheetText.escape(text)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "x", "N1", "-5", "+3.5e-7", "-.5", "'x", "'", "''", "1=1", "a@b"})
    void harmlessTextStays(String text) {
        assertEquals(text, SpreadsheetText.escape(text));
        assertEquals(text, SpreadsheetText.unescape(text));
    }
}
