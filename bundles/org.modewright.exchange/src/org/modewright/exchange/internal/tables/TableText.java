package org.modewright.exchange.internal.tables;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import org.modewright.exchange.Numbers;
import org.modewright.exchange.SpreadsheetText;

/** Builds the text of one CSV file (RFC 4180): numbers in full, text safe for spreadsheets. */
public final class TableText {

    private final StringBuilder text = new StringBuilder();
    private final CSVPrinter printer;
    private final List<String> row = new ArrayList<>();
    private int rows;

    /** Begins a table with the names of its columns. */
    public TableText(List<String> columns) {
        try {
            printer = new CSVPrinter(text, CSVFormat.RFC4180);
            printer.printRecord(columns);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Adds a cell of text to the current row. */
    public TableText text(String value) {
        row.add(value == null ? "" : SpreadsheetText.escape(value));
        return this;
    }

    /** Adds a number in full double precision; what is not finite is blank. */
    public TableText number(double value) {
        row.add(Numbers.text(value));
        return this;
    }

    /** Adds a number, blank where it is 0. */
    TableText optional(double value) {
        return value == 0 ? blank() : number(value);
    }

    /** Adds 1 for true, blank for false. */
    TableText flag(boolean value) {
        row.add(value ? "1" : "");
        return this;
    }

    /** Adds an empty cell. */
    public TableText blank() {
        row.add("");
        return this;
    }

    /** Ends the current row. */
    public void end() {
        try {
            printer.printRecord(row);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        row.clear();
        rows++;
    }

    /** How many rows stand below the header. */
    int rows() {
        return rows;
    }

    /** The file in UTF-8. */
    public byte[] bytes() {
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }
}
