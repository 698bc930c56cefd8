package org.modewright.exchange;

import java.util.regex.Pattern;

/**
 * Text that a spreadsheet takes for text. A cell that begins with {@code = + - @}, a tab or a carriage return may be run as a formula; such
 * text gets an apostrophe before it. A plain number is harmless and stays as it is. The escape can be undone: text that itself begins with
 * apostrophes before such a character gets one more.
 */
public final class SpreadsheetText {


    private static final Pattern DANGEROUS = Pattern.compile("[=+\\-@\\s\\uFF1D\\uFF0B\\uFF0D\\uFF20].*", Pattern.DOTALL);
    private static final Pattern ESCAPED = Pattern.compile("'+[=+\\-@\\s\\uFF1D\\uFF0B\\uFF0D\\uFF20].*", Pattern.DOTALL);

    private SpreadsheetText() {
    }

    /** The text with an apostrophe before it where a spreadsheet might run it. */
    public static String escape(String text) {
        boolean runs = DANGEROUS.matcher(text).matches() && !Numbers.isDecimal(text);
        return runs || ESCAPED.matcher(text).matches() ? "'" + text : text;
    }

    /** The text that {@link #escape} was given. */
    public static String unescape(String cell) {
        return ESCAPED.matcher(cell).matches() ? cell.substring(1) : cell;
    }
}
