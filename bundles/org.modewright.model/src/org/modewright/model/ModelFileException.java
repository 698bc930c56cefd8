package org.modewright.model;

import java.io.IOException;

/**
 * A model file that cannot be read or written: says where, what and how to mend it.
 */
public final class ModelFileException extends IOException {

    private static final long serialVersionUID = 1L;

    private final String file;
    private final int line;
    private final int column;
    private final String reason;
    private final String remedy;

    /**
     * @param file   name of the file for people
     * @param line   line from 1, or 0 where the fault has no place in the text
     * @param column column from 1, or 0 where the fault has no place in the text
     * @param reason one sentence: what is wrong
     * @param remedy one sentence: what to do about it
     * @param cause  what was caught, or null
     */
    public ModelFileException(String file, int line, int column, String reason, String remedy, Throwable cause) {
        super(message(file, line, column, reason, remedy), cause);
        this.file = file;
        this.line = line;
        this.column = column;
        this.reason = reason;
        this.remedy = remedy;
    }

    private static String message(String file, int line, int column, String reason, String remedy) {
        String place = line > 0 ? file + ", line " + line + ", column " + column : file;
        return place + ": " + reason + " " + remedy;
    }

    /** @return name of the file for people */
    public String file() {
        return file;
    }

    /** @return line from 1, or 0 where the fault has no place in the text */
    public int line() {
        return line;
    }

    /** @return column from 1, or 0 where the fault has no place in the text */
    public int column() {
        return column;
    }

    /** @return one sentence: what is wrong */
    public String reason() {
        return reason;
    }

    /** @return one sentence: what to do about it */
    public String remedy() {
        return remedy;
    }
}
