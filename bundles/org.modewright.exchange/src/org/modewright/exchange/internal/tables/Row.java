package org.modewright.exchange.internal.tables;

import java.util.Map;

import org.modewright.exchange.SpreadsheetText;

/** One row of a table. Cells are read without the blanks around them; what cannot be read becomes a problem with its place. */
final class Row {

    /** Which numbers a cell may hold. */
    enum Range {
        /** Any finite number. */
        ANY("a finite number"),
        /** Zero or more. */
        NOT_NEGATIVE("0 or more"),
        /** More than zero. */
        POSITIVE("greater than 0");

        private final String words;

        Range(String words) {
            this.words = words;
        }

        boolean holds(double value) {
            return switch (this) {
                case ANY -> true;
                case NOT_NEGATIVE -> value >= 0;
                case POSITIVE -> value > 0;
            };
        }
    }

    private final String file;
    private final int number;
    private final Map<String, Integer> columns;
    private final String[] cells;
    private final ProblemList problems;

    Row(String file, int number, Map<String, Integer> columns, String[] cells, ProblemList problems) {
        this.file = file;
        this.number = number;
        this.columns = columns;
        this.cells = cells;
        this.problems = problems;
    }

    String file() {
        return file;
    }

    int number() {
        return number;
    }

    /** The cell as it stands, without the blanks around it; empty where it is blank or its column is absent. */
    String cell(String column) {
        Integer index = columns.get(column);
        return index == null || index >= cells.length ? "" : cells[index].strip();
    }

    boolean isBlank(String column) {
        return cell(column).isEmpty();
    }

    /** An id or a reference, with the spreadsheet escape undone; empty where the cell is blank. */
    String id(String column) {
        String id = SpreadsheetText.unescape(cell(column));
        if (!PlainText.isStorable(id)) {
            problem(column, "the cell holds a control character; remove it");
        }
        return id;
    }

    /** An id that must be there; null, with a problem, where it is not. */
    String requiredId(String column) {
        String id = id(column);
        if (id.isEmpty()) {
            if (columns.containsKey(column)) {
                problem(column, "the cell is blank; a value must stand here");
            }
            return null;
        }
        return id;
    }

    /**
     * A number that must be there; not-a-number, with a problem, where it is not, so that nothing that follows from it is a further
     * fault.
     */
    double required(String column, Range range) {
        if (isBlank(column)) {
            if (columns.containsKey(column)) {
                problem(column, "the cell is blank; a number must stand here");
            }
            return Double.NaN;
        }
        return number(column, range);
    }

    /** A number, 0 where the cell is blank; not-a-number, with a problem, where it is no number of the range. */
    double number(String column, Range range) {
        String text = cell(column);
        if (text.isEmpty()) {
            return 0;
        }
        double value = NumberText.parse(text);
        if (Double.isFinite(value) && range.holds(value)) {
            return value;
        }
        problem(column, Double.isFinite(value) ? "this must be " + range.words : NumberText.objection(text));
        return Double.NaN;
    }

    /** 1 for true, 0 or blank for false; anything else is a problem. */
    boolean flag(String column) {
        String text = cell(column);
        double value = text.isEmpty() ? 0 : NumberText.parse(text);
        if (value != 0 && value != 1) {
            problem(column, "give 1 or 0");
        }
        return value == 1;
    }

    void problem(String column, String text) {
        problems.add(file, number, column, cell(column), text);
    }
}
