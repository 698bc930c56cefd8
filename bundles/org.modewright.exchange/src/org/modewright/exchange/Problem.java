package org.modewright.exchange;

import java.util.Objects;

/**
 * One thing that is wrong with a table package, with the place where it stands.
 *
 * @param file file inside the package, or the package itself
 * @param row row of a table, 1 for the header; line of a JSON file; 0 where neither applies
 * @param column column of a table, pointer into a JSON file, or empty
 * @param value offending value as it stands in the file, or empty
 * @param text what is wrong and how to mend it
 */
public record Problem(String file, int row, String column, String value, String text) {

    private static final int LONGEST_VALUE = 60;

    /** Checks that every text is there. */
    public Problem {
        Objects.requireNonNull(file);
        Objects.requireNonNull(column);
        Objects.requireNonNull(value);
        Objects.requireNonNull(text);
    }

    /** The place, the value and the text in one line. */
    @Override
    public String toString() {
        StringBuilder line = new StringBuilder(file);
        if (row > 0) {
            line.append(", row ").append(row);
        }
        if (!column.isEmpty()) {
            line.append(", column ").append(column);
        }
        if (!value.isEmpty()) {
            line.append(", value \"").append(shortened(value)).append('"');
        }
        return line.append(": ").append(text).toString();
    }

    private static String shortened(String value) {
        String flat = value.replaceAll("\\p{Cntrl}", " ");
        return flat.length() <= LONGEST_VALUE ? flat : flat.substring(0, LONGEST_VALUE) + "\u2026";
    }
}
