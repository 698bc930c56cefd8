package org.modewright.ui.editor.commands;

import org.modewright.ui.editor.Messages;

/** Three numbers on one line. */
final class Triple {

    private Triple() {
    }

    /** The numbers; the text has been found good before. */
    static double[] parse(String text) {
        String[] words = text.strip().split("[\\s,;]+");
        if (words.length != 3) {
            throw new IllegalArgumentException(Messages.Act_triple);
        }
        double[] numbers = new double[3];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = Double.parseDouble(words[i]);
            if (!Double.isFinite(numbers[i])) {
                throw new IllegalArgumentException(Messages.Act_triple);
            }
        }
        return numbers;
    }

    /** Why a text is not three numbers; null if it is. */
    static String fault(String text) {
        try {
            parse(text);
            return null;
        } catch (IllegalArgumentException fault) {
            return Messages.Act_triple;
        }
    }
}
