package org.modewright.ui.widgets;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;

/**
 * How numbers are written in tables, sentences and on the clipboard: as many digits as mean something on screen, every digit when
 * copied. The decimal sign is a point whatever the platform's language, as in files and reports.
 */
public final class Numbers {

    private static final double LARGE = 1e6;
    private static final double SMALL = 1e-3;

    private Numbers() {
    }

    /** Four significant digits, thousands grouped: 1,840; 0.4123; 3.100e-11. */
    public static String significant(double value) {
        return significant(value, 4);
    }

    /**
     * A number of significant digits.
     *
     * @param value any number; infinite and undefined ones are written as a sign
     * @param digits 1 or more
     */
    public static String significant(double value, int digits) {
        if (Double.isNaN(value)) {
            return "–";
        }
        if (Double.isInfinite(value)) {
            return value > 0 ? "∞" : "−∞";
        }
        if (value == 0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
        double size = Math.abs(rounded.doubleValue());
        if (size >= LARGE * 1e3 || size < SMALL) {
            return String.format(Locale.ROOT, "%." + (digits - 1) + "e", value);
        }
        int decimals = Math.max(0, digits - 1 - (int) Math.floor(Math.log10(size)));
        return String.format(Locale.ROOT, "%,." + decimals + "f", rounded);
    }

    /** A share of one as percent with one decimal: 96.2 %. */
    public static String percent(double share) {
        return Double.isNaN(share) ? "–" : String.format(Locale.ROOT, "%.1f %%", share * 100);
    }

    /** A share of one as a number of percent with one decimal, for columns whose header says "%": 96.2. */
    public static String percentNumber(double share) {
        return Double.isNaN(share) ? "–" : String.format(Locale.ROOT, "%.1f", share * 100);
    }

    /** A period in seconds, three or four digits: 0.412 s. */
    public static String period(double seconds) {
        return Double.isInfinite(seconds) ? "rigid" : significant(seconds, 3) + " s";
    }

    /** A frequency in hertz: 2.43 Hz. */
    public static String frequency(double hertz) {
        return significant(hertz, 3) + " Hz";
    }

    /** A whole number, thousands grouped. */
    public static String count(long value) {
        return String.format(Locale.ROOT, "%,d", value);
    }

    /** "1 mode", "3 modes". */
    public static String counted(long value, String one, String many) {
        return count(value) + " " + (value == 1 ? one : many);
    }

    /** Full double precision, for the clipboard and tooltips; reads back as the same number. */
    public static String exact(double value) {
        return Double.toString(value);
    }
}
