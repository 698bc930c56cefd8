package org.modewright.cli.internal;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A table of plain text: columns as wide as their cells, text to the left, numbers to the right. */
final class TextTable {

    private static final String INDENT = "  ";
    private static final String GAP = "  ";

    private final boolean[] right;
    private final List<String[]> rows = new ArrayList<>();

    /** @param headers names of the columns; those that begin with {@code >} are aligned to the right */
    TextTable(String... headers) {
        right = new boolean[headers.length];
        String[] names = new String[headers.length];
        for (int i = 0; i < headers.length; i++) {
            right[i] = headers[i].startsWith(">");
            names[i] = right[i] ? headers[i].substring(1) : headers[i];
        }
        rows.add(names);
    }

    TextTable row(String... cells) {
        if (cells.length != right.length) {
            throw new IllegalArgumentException("A row of " + cells.length + " cells does not fit " + right.length + " columns.");
        }
        rows.add(cells.clone());
        return this;
    }

    void print(PrintWriter out) {
        int[] widths = new int[right.length];
        rows.forEach(row -> Arrays.setAll(widths, i -> Math.max(widths[i], row[i].length())));
        for (String[] row : rows) {
            StringBuilder line = new StringBuilder(INDENT);
            for (int i = 0; i < row.length; i++) {
                String space = " ".repeat(widths[i] - row[i].length());
                line.append(i == 0 ? "" : GAP).append(right[i] ? space + row[i] : row[i] + space);
            }
            out.println(line.toString().stripTrailing());
        }
    }
}
