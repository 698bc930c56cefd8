package org.modewright.exchange.internal.tables;

import java.util.regex.Pattern;
import org.modewright.exchange.Numbers;

/** Numbers as a table may hold them: decimal point, optional exponent, no separators of thousands, no units. */
final class NumberText {

    private static final Pattern DECIMAL_COMMA = Pattern.compile("[+-]?\\d*,\\d+([eE][+-]?\\d+)?");
    private static final Pattern NOT_FINITE = Pattern.compile("[+-]?(nan|inf|infinity|#n/a|#num!|#div/0!|#value!)",
            Pattern.CASE_INSENSITIVE);

    private NumberText() {
    }

    /** The number; not-a-number where the text is none, infinite where it is too large. */
    static double parse(String text) {
        return Numbers.isDecimal(text) ? Double.parseDouble(text) : Double.NaN;
    }

    /** Why the text is no finite number. */
    static String objection(String text) {
        if (DECIMAL_COMMA.matcher(text).matches()) {
            return "this is not a number; write it with a decimal point";
        }
        if (NOT_FINITE.matcher(text).matches() || Numbers.isDecimal(text)) {
            return "this number is not finite";
        }
        return "this is not a number";
    }
}
