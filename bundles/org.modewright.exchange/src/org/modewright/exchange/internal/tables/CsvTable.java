package org.modewright.exchange.internal.tables;

import java.io.IOException;
import java.io.InputStream;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Reads one CSV file of a package against its schema (RFC 4180, first row the column names). */
final class CsvTable {

    private static final String OTHER_DELIMITERS = ";\t|";

    private final TableSchema schema;
    private final String file;
    private final ProblemList problems;
    private final List<String> warnings;

    CsvTable(TableSchema schema, String file, ProblemList problems, List<String> warnings) {
        this.schema = schema;
        this.file = file;
        this.problems = problems;
        this.warnings = warnings;
    }

    /** The rows below the header; empty, with problems, where the file cannot be read. */
    Optional<List<Row>> read(PackageContent content) {
        if (!content.has(file)) {
            problems.add(file, 0, "", "", "the file of the resource " + schema.resource() + " is missing");
            return Optional.empty();
        }
        int[] at = {1};
        try (InputStream in = content.open(file); Reader reader = DescriptorReader.utf8(in);
                CSVParser parser = CSVParser.parse(reader, CSVFormat.RFC4180)) {
            return rows(parser.iterator(), at);
        } catch (UncheckedIOException e) {
            problems.add(file, at[0], "", "", rowFault(e.getCause()));
        } catch (IOException e) {
            problems.add(file, at[0], "", "", rowFault(e));
        }
        return Optional.empty();
    }

    private static String rowFault(IOException fault) {
        String text = FaultText.of(fault);
        return text.contains("encapsulated token") ? "a quoted cell is not closed properly; close it with \" before the next comma" : text;
    }

    private Optional<List<Row>> rows(Iterator<CSVRecord> records, int[] at) {
        if (!records.hasNext()) {
            problems.add(file, 1, "", "", "the file is empty; its first row must name the columns");
            return Optional.empty();
        }
        Map<String, Integer> columns = header(records.next().values());
        if (columns == null) {
            return Optional.empty();
        }
        List<Row> rows = new ArrayList<>();
        at[0]++;
        for (; records.hasNext(); at[0]++) {
            String[] cells = records.next().values();
            if (!isBlank(cells)) {
                surplus(cells, columns.size(), at[0]);
                rows.add(new Row(file, at[0], columns, cells, problems));
            }
        }
        return Optional.of(rows);
    }

    private static boolean isBlank(String[] cells) {
        for (String cell : cells) {
            if (!cell.isBlank()) {
                return false;
            }
        }
        return true;
    }

    private void surplus(String[] cells, int columns, int row) {
        for (int i = columns; i < cells.length; i++) {
            if (!cells[i].isBlank()) {
                problems.add(file, row, String.valueOf(i + 1), cells[i], "the row has more cells than the header; "
                        + "put cells that hold a comma between quotes");
                return;
            }
        }
    }

    /**
     * Index of each column; null, with a problem, where the first row is no header of this table. Unnamed columns count but hold nothing.
     */
    private Map<String, Integer> header(String[] names) {
        if (wrongDelimiter(names)) {
            return null;
        }
        Map<String, Integer> columns = new HashMap<>();
        for (int i = 0; i < names.length; i++) {
            String name = names[i].strip();
            if (columns.putIfAbsent(name.isEmpty() ? "\0" + i : name, i) != null) {
                problems.add(file, 1, name, name, "the column is there twice");
            } else if (!schema.has(name)) {
                warnings.add(name.isEmpty() ? file + ": column " + (i + 1) + " has no name and was ignored"
                        : file + ": the column " + name + " is not known and was ignored");
            }
        }
        for (TableSchema.Column column : schema.columns()) {
            if (column.required() && !columns.containsKey(column.name())) {
                problems.add(file, 1, column.name(), "", "the column is missing; " + schema.resource() + " must have it");
            }
        }
        return columns;
    }

    private boolean wrongDelimiter(String[] names) {
        if (names.length > 1) {
            return false;
        }
        for (char delimiter : OTHER_DELIMITERS.toCharArray()) {
            if (names[0].indexOf(delimiter) >= 0) {
                String word = delimiter == ';' ? "semicolons" : delimiter == '\t' ? "tabs" : "bars";
                problems.add(file, 1, "", names[0], "the cells are separated by " + word + "; separate them by commas");
                return true;
            }
        }
        return false;
    }
}
