package org.modewright.exchange;

/** Numbers as text, in full double precision. */
public final class Numbers {

    private static final double LARGEST_PLAIN_INTEGER = 1e15;

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
}
