package org.modewright.modal;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Locale;

/** Numbers and lists as sentences show them, with a decimal point whatever the user's language. */
public final class Figures {

    /** So many names are read before a list is taken for a number. */
    static final int NAMED = 5;

    private Figures() {
    }

    /** A number with so many significant digits, without an exponent between 1e-4 and 1e7. */
    public static String significant(double value, int digits) {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            return Double.isNaN(value) ? "unknown" : value > 0 ? "infinite" : "-infinite";
        }
        if (value == 0) {
            return "0";
        }
        double size = Math.abs(value);
        if (size < 1e-4 || size >= 1e7) {
            return String.format(Locale.ROOT, "%." + (digits - 1) + "e", value);
        }
        BigDecimal rounded = BigDecimal.valueOf(value).round(new MathContext(digits, RoundingMode.HALF_UP));
        int decimals = Math.max(0, digits - rounded.precision() + rounded.scale());
        return rounded.setScale(decimals, RoundingMode.HALF_UP).toPlainString();
    }

    /** One significant digit and the exponent, "3e-11". */
    public static String scientific(double value) {
        if (value == 0) {
            return "0";
        }
        String text = String.format(Locale.ROOT, "%.0e", value);
        return text.replace("e-0", "e-").replace("e+0", "e").replace("e+", "e");
    }

    /** A share as a percentage with one decimal, "96.2 %". */
    public static String percent(double share) {
        return String.format(Locale.ROOT, "%.1f %%", 100 * share);
    }

    /** "A", "A and B", "A, B and C"; beyond five "A, B, C, D, E and 7 more". */
    public static String list(List<String> words) {
        int count = words.size();
        if (count > NAMED) {
            return String.join(", ", words.subList(0, NAMED)) + " and " + (count - NAMED) + " more";
        }
        return count < 2 ? String.join("", words) : String.join(", ", words.subList(0, count - 1)) + " and " + words.get(count - 1);
    }

    /** A number of things: "1 mode", "3 modes". */
    public static String count(int number, String one, String several) {
        return number + " " + (number == 1 ? one : several);
    }
}
