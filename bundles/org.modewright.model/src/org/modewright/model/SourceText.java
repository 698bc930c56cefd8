package org.modewright.model;

import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * The text of a model file, to say where in it a fault sits. A parser reports the end of a tag; people look for its beginning, or for the
 * attribute at fault.
 */
final class SourceText {

    /** Line and column from 1; 0 and 0 where there is none. */
    record Place(int line, int column) {
    }

    private final byte[] bytes;

    SourceText(byte[] bytes) {
        this.bytes = bytes;
    }

    /**
     * @param line   line that the parser reported, from 1
     * @param column column that the parser reported: just behind the tag
     * @param words  what to look for inside the tag, each behind the one before: name, then value; empty for the tag itself
     * @return the place of the last word that is found, of the tag where none is, or what the parser said where there is no tag
     */
    Place locate(int line, int column, List<String> words) {
        if (line < 1) {
            return new Place(0, 0);
        }
        String text = new String(bytes, StandardCharsets.UTF_8);
        int end = offset(text, line, column);
        int tag = text.lastIndexOf('<', Math.max(0, end - 1));
        if (end < 0 || tag < 0 || words.isEmpty() && !text.substring(tag, end).contains(">")) {
            return new Place(line, Math.max(1, column));
        }
        int found = tag;
        for (String word : words) {
            int at = word == null || word.isEmpty() ? -1 : wordIn(text, found + 1, end, word);
            found = at < 0 ? found : at;
        }
        return place(text, found);
    }

    private static int wordIn(String text, int from, int to, String word) {
        for (int at = text.indexOf(word, from); at >= 0 && at + word.length() <= to; at = text.indexOf(word, at + 1)) {
            boolean begins = !Character.isLetterOrDigit(text.charAt(at - 1));
            boolean ends = at + word.length() == text.length() || !Character.isLetterOrDigit(text.charAt(at + word.length()));
            if (begins && ends) {
                return at;
            }
        }
        return -1;
    }

    private static int offset(String text, int line, int column) {
        int start = 0;
        for (int n = 1; n < line; n++) {
            start = nextLine(text, start);
            if (start < 0) {
                return -1;
            }
        }
        return Math.min(text.length(), start + Math.max(0, column - 1));
    }

    private static int nextLine(String text, int from) {
        for (int i = from; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '\n' || c == '\r') {
                boolean pair = c == '\r' && i + 1 < text.length() && text.charAt(i + 1) == '\n';
                return pair ? i + 2 : i + 1;
            }
        }
        return -1;
    }

    private static Place place(String text, int offset) {
        int line = 1;
        int start = 0;
        for (int next = nextLine(text, 0); next >= 0 && next <= offset; next = nextLine(text, next)) {
            line++;
            start = next;
        }
        return new Place(line, offset - start + 1);
    }
}
