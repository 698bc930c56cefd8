package org.modewright.exchange.internal.tables;

/** Text that every file of the program can hold: the characters of XML 1.0, section 2.2. */
final class PlainText {

    private PlainText() {
    }

    static boolean isStorable(String text) {
        return text.codePoints().allMatch(PlainText::isStorable);
    }

    private static boolean isStorable(int c) {
        return c == '\t' || c == '\n' || c == '\r' || c >= 0x20 && c <= 0xD7FF || c >= 0xE000 && c <= 0xFFFD || c >= 0x10000;
    }
}
