package org.modewright.ui.editor.fields;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.osgi.util.NLS;

/** A number: every digit in fields, as many as mean something in tables. */
final class NumberField extends FeatureField {

    private static final MathContext SHOWN = new MathContext(7, RoundingMode.HALF_EVEN);
    private static final double LARGE = 1e9;
    private static final double SMALL = 1e-4;

    NumberField(FieldContext context, EObject sample, EAttribute attribute) {
        super(context, sample, attribute);
    }

    @Override
    public String text(EObject object) {
        return format((Double) value(object));
    }

    @Override
    public String shown(EObject object) {
        return rounded((Double) value(object));
    }

    @Override
    public Comparable<?> sortKey(EObject object) {
        return (Double) value(object);
    }

    @Override
    public boolean isNumber() {
        return true;
    }

    @Override
    public String warning(EObject object, String text) {
        try {
            return ValueChecks.of(context().model(), object, feature(), number(text));
        } catch (IllegalArgumentException saidElsewhere) {
            return null;
        }
    }

    @Override
    Object parse(String text) {
        return number(text);
    }

    /** Reads back as the same number. */
    static String format(double value) {
        if (value == Math.rint(value) && Math.abs(value) < LARGE) {
            return Long.toString((long) value);
        }
        return Double.toString(value).replace(".0E", "e").replace("E", "e");
    }

    /** Seven significant digits at most, without zeros that mean nothing. */
    static String rounded(double value) {
        if (!Double.isFinite(value)) {
            return Double.toString(value);
        }
        BigDecimal shown = new BigDecimal(value).round(SHOWN);
        double size = Math.abs(shown.doubleValue());
        if (size != 0 && (size < SMALL || size >= LARGE)) {
            return format(shown.doubleValue());
        }
        return shown.signum() == 0 ? "0" : shown.stripTrailingZeros().toPlainString();
    }

    static double number(String text) {
        double value;
        try {
            value = Double.parseDouble(plain(text));
        } catch (NumberFormatException notANumber) {
            throw new IllegalArgumentException(NLS.bind(FieldMessages.notANumber, text.strip()), notANumber);
        }
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(FieldMessages.notFinite);
        }
        return value;
    }

    /** Java's own suffixes d and f and its hexadecimal numbers are no numbers to an engineer; a typographic minus is one. */
    private static String plain(String text) {
        String plain = text.strip().replace('\u2212', '-');
        if (!plain.matches("[-+0-9.eE]*")) {
            throw new NumberFormatException(text);
        }
        return plain;
    }
}
