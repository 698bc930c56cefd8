package org.modewright.model;

import java.io.CharConversionException;
import java.util.List;

import org.eclipse.emf.ecore.xmi.XMIException;
import org.xml.sax.SAXParseException;

/**
 * The first fault met while a model file is read; ends the reading.
 */
final class LoadFault extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final int line;
    private final int column;
    private final transient List<String> words;
    private final String reason;
    private final String remedy;

    LoadFault(int line, int column, List<String> words, String reason, String remedy, Throwable cause) {
        super(reason, cause);
        this.line = line;
        this.column = column;
        this.words = words;
        this.reason = reason;
        this.remedy = remedy;
    }

    int line() {
        return line;
    }

    int column() {
        return column;
    }

    List<String> words() {
        return words;
    }

    String reason() {
        return reason;
    }

    String remedy() {
        return remedy;
    }

    static LoadFault of(Throwable e) {
        if (e instanceof LoadFault fault) {
            return fault;
        }
        if (e instanceof SAXParseException fault) {
            return ofParser(fault);
        }
        if (e instanceof XMIException fault) {
            Throwable cause = fault.getCause() == null ? fault : fault.getCause();
            return new LoadFault(fault.getLine(), fault.getColumn(), List.of(), "The model cannot be read (" + cause.getMessage() + ").",
                    "Correct the line or restore an earlier version of the file.", fault);
        }
        if (e instanceof CharConversionException) {
            return new LoadFault(0, 0, List.of(), "The file is not text in the encoding that it states (UTF-8 if it states none).",
                    "Save it as UTF-8.", e);
        }
        return new LoadFault(0, 0, List.of(), "The model cannot be read (" + e.getMessage() + ").",
                "Restore an earlier version of the file.", e);
    }

    private static LoadFault ofParser(SAXParseException e) {
        int line = Math.max(1, e.getLineNumber());
        int column = Math.max(1, e.getColumnNumber());
        String text = String.valueOf(e.getMessage());
        if (text.contains(StructureLoad.DISALLOW_DOCTYPE)) {
            return new LoadFault(line, column, List.of(), "A DOCTYPE is not allowed in a model file.",
                    "Remove the DOCTYPE and its entities.", e);
        }
        String detail = text.strip().replaceAll("[.\\s]+$", "");
        return new LoadFault(line, column, List.of(), "The text is not well-formed XML (" + detail + ").",
                "Correct it at this place or restore an earlier version of the file.", e);
    }
}
