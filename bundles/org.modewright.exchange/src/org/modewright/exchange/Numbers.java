package org.modewright.exchange;

import java.util.regex.Pattern;

/** Numbers as text, in full double precision. */
public final class Numbers {

    private static final double LARGEST_PLAIN_INTEGER = 1e15;

    private static final Pattern DECIMAL = Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?");

    private Numbers() {
    }

    /** The shortest common text that reads back as the same double; integers without a decimal point; not-a-number and infinity blank. */
    public static String text(double value) {
        if (!Double.isFinite(value)) {
            return "";
        }
        if (value == Math.rint(value) && Math.abs(value) < LARGEST_PLAIN_INTEGER) {
            return Long.toString((long) value);
        }
        return Double.toString(value);
    }

    /** Whether a text is a number as the tables hold it: with a decimal point and an optional exponent, nothing else. */
    public static boolean isDecimal(String text) {
        return DECIMAL.matcher(text).matches();
    }
}
