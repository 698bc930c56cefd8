package org.modewright.exchange.internal;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.StringTokenizer;

import org.modewright.exchange.MatrixMarketException;
import org.modewright.numerics.SymmetricMatrix;

/** Reads one MatrixMarket file line by line. */
public final class MatrixReader {

    private static final String HEADER = "%%matrixmarket";

    private final Path file;
    private BufferedReader reader;
    private int line;
    private boolean general;
    private int order;
    private int entries;
    private int[] rows;
    private int[] columns;
    private double[] values;
    private int[] lines;

    public MatrixReader(Path file) {
        this.file = file;
    }

    /** The matrix of the file. */
    public SymmetricMatrix read() throws IOException {
        try (BufferedReader in = Files.newBufferedReader(file, StandardCharsets.UTF_8)) {
            reader = in;
            header();
            size();
            entries();
        } catch (CharacterCodingException e) {
            throw fault("this is no text; a MatrixMarket file is expected");
        }
        return general ? fromGeneral() : fromSymmetric();
    }

    private void header() throws IOException {
        String text = next();
        String[] words = text == null ? new String[0] : text.strip().toLowerCase(Locale.ROOT).split("\\s+");
        if (words.length == 0 || !words[0].equals(HEADER)) {
            throw fault("the first line must read %%MatrixMarket matrix coordinate real symmetric");
        }
        boolean real = words.length == 5 && (words[3].equals("real") || words[3].equals("integer"));
        if (!real || !words[1].equals("matrix") || !words[2].equals("coordinate")) {
            throw fault("only matrices of the kind coordinate real symmetric can be read, not \"" + text.strip() + "\"");
        }
        general = words[4].equals("general");
        if (!general && !words[4].equals("symmetric")) {
            throw fault("the matrix must be symmetric, not " + words[4]);
        }
    }

    private void size() throws IOException {
        String text = nextContent();
        if (text == null) {
            throw fault("the line with the numbers of rows, columns and entries is missing");
        }
        StringTokenizer words = new StringTokenizer(text);
        if (words.countTokens() != 3) {
            throw fault("give the numbers of rows, columns and entries");
        }
        order = count(words.nextToken());
        int width = count(words.nextToken());
        entries = count(words.nextToken());
        if (order != width || order == 0) {
            throw fault("the matrix has " + order + " rows and " + width + " columns; it must be square and not empty");
        }
        long most = (long) order * order;
        if (entries > most) {
            throw fault("a matrix of " + order + " rows cannot have " + entries + " entries");
        }
    }

    private void entries() throws IOException {
        int capacity = Math.min(entries, 1 << 16);
        rows = new int[capacity];
        columns = new int[capacity];
        values = new double[capacity];
        lines = new int[capacity];
        int found = 0;
        for (String text = nextContent(); text != null; text = nextContent()) {
            if (found == entries) {
                throw fault("there are more entries than the " + entries + " that the file announces");
            }
            if (found == rows.length) {
                grow();
            }
            entry(new StringTokenizer(text), found++);
        }
        if (found < entries) {
            line = 0;
            throw fault("there are " + found + " entries but the file announces " + entries + "; it may be cut short");
        }
    }

    private void grow() {
        int capacity = (int) Math.min(entries, 2L * rows.length);
        rows = Arrays.copyOf(rows, capacity);
        columns = Arrays.copyOf(columns, capacity);
        values = Arrays.copyOf(values, capacity);
        lines = Arrays.copyOf(lines, capacity);
    }

    private void entry(StringTokenizer words, int index) throws IOException {
        if (words.countTokens() != 3) {
            throw fault("an entry needs its row, its column and its value");
        }
        rows[index] = position(words.nextToken(), "row");
        columns[index] = position(words.nextToken(), "column");
        values[index] = value(words.nextToken());
        lines[index] = line;
        if (!general && rows[index] < columns[index]) {
            throw fault("the entry stands above the diagonal; a symmetric file holds the lower triangle alone");
        }
    }

    private SymmetricMatrix fromSymmetric() throws IOException {
        refuseRepeated(sortedByPlace());
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(order);
        for (int i = 0; i < entries; i++) {
            builder.add(rows[i], columns[i], values[i]);
        }
        return builder.build();
    }

    private SymmetricMatrix fromGeneral() throws IOException {
        long[] places = sortedByPlace();
        refuseRepeated(places);
        double[] byPlace = new double[entries];
        int[] lineOf = new int[entries];
        for (int i = 0; i < entries; i++) {
            int at = Arrays.binarySearch(places, place(rows[i], columns[i]));
            byPlace[at] = values[i];
            lineOf[at] = lines[i];
        }
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(order);
        for (int at = 0; at < entries; at++) {
            int row = (int) (places[at] % order);
            int column = (int) (places[at] / order);
            int across = Arrays.binarySearch(places, place(column, row));
            if (across < 0 && byPlace[at] != 0 || across >= 0 && byPlace[across] != byPlace[at]) {
                line = lineOf[at];
                throw fault("the general matrix is not symmetric: entry (" + (row + 1) + ", " + (column + 1)
                        + ") has no equal across the diagonal");
            }
            if (row >= column) {
                builder.add(row, column, byPlace[at]);
            }
        }
        return builder.build();
    }

    private long[] sortedByPlace() {
        long[] places = new long[entries];
        for (int i = 0; i < entries; i++) {
            places[i] = place(rows[i], columns[i]);
        }
        Arrays.sort(places);
        return places;
    }

    private void refuseRepeated(long[] places) throws IOException {
        for (int at = 1; at < entries; at++) {
            if (places[at] == places[at - 1]) {
                line = lastLineOf(places[at]);
                throw fault("the entry (" + (places[at] % order + 1) + ", " + (places[at] / order + 1) + ") is there twice");
            }
        }
    }

    private int lastLineOf(long place) {
        int last = 0;
        for (int i = 0; i < entries; i++) {
            last = place(rows[i], columns[i]) == place ? lines[i] : last;
        }
        return last;
    }

    private long place(int row, int column) {
        return (long) column * order + row;
    }

    private int count(String word) throws IOException {
        try {
            int count = Integer.parseInt(word);
            if (count >= 0) {
                return count;
            }
        } catch (NumberFormatException e) {
            throw fault("\"" + word + "\" is no number of rows, columns or entries");
        }
        throw fault("\"" + word + "\" is negative");
    }

    private int position(String word, String what) throws IOException {
        int position = count(word);
        if (position < 1 || position > order) {
            throw fault("the " + what + " " + word + " lies outside 1 to " + order);
        }
        return position - 1;
    }

    private double value(String word) throws IOException {
        double value;
        try {
            value = Double.parseDouble(word.replace('D', 'E').replace('d', 'e'));
        } catch (NumberFormatException e) {
            throw fault("\"" + word + "\" is not a number");
        }
        if (!Double.isFinite(value)) {
            throw fault("\"" + word + "\" is not finite");
        }
        return value;
    }

    private String nextContent() throws IOException {
        String text = next();
        while (text != null && (text.isBlank() || text.startsWith("%"))) {
            text = next();
        }
        return text;
    }

    private String next() throws IOException {
        line++;
        return reader.readLine();
    }

    private MatrixMarketException fault(String text) {
        return new MatrixMarketException(String.valueOf(file.getFileName()), line, text);
    }
}
