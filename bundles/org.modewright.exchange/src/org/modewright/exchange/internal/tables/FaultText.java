package org.modewright.exchange.internal.tables;

import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.AccessDeniedException;
import java.nio.file.NoSuchFileException;

/** Faults of reading in words that say what to do. */
final class FaultText {

    private FaultText() {
    }

    static String of(IOException fault) {
        if (fault instanceof CharacterCodingException) {
            return "the file is not UTF-8; save it as UTF-8";
        }
        if (fault instanceof NoSuchFileException) {
            return "the file is missing";
        }
        if (fault instanceof AccessDeniedException) {
            return "the file may not be read; check its permissions";
        }
        return fault.getMessage() == null ? "the file cannot be read" : fault.getMessage();
    }
}
