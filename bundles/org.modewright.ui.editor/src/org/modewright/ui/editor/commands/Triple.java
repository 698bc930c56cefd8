package org.modewright.ui.editor.commands;

import org.modewright.ui.editor.Messages;

/** Three numbers on one line. */
public final class Triple {

    private Triple() {
    }

    /**
     * The numbers.
     *
     * @throws IllegalArgumentException if the text is not three finite numbers
     */
    public static double[] parse(String text) {
        String[] words = text.strip().split("[\\s,;]+");
        if (words.length != 3) {
            throw new IllegalArgumentException(Messages.Act_triple);
        }
        double[] numbers = new double[3];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = number(words[i]);
        }
        return numbers;
    }

    private static double number(String word) {
        try {
            double number = Double.parseDouble(word);
            if (Double.isFinite(number)) {
                return number;
            }
        } catch (NumberFormatException notANumber) {
            throw new IllegalArgumentException(Messages.Act_triple, notANumber);
        }
        throw new IllegalArgumentException(Messages.Act_triple);
    }

    /** The numbers as text. */
    public static String text(double x, double y, double z) {
        return word(x) + " " + word(y) + " " + word(z);
    }

    private static String word(double number) {
        return number == Math.rint(number) && Math.abs(number) < 1e9 ? Long.toString((long) number) : Double.toString(number);
    }

    /** Why a text is not three numbers; null if it is. */
    public static String fault(String text) {
        try {
            parse(text);
            return null;
        } catch (IllegalArgumentException fault) {
            return Messages.Act_triple;
        }
    }
}
