package org.modewright.audit;

import java.util.List;
import java.util.stream.Collectors;

/** A rule pack that cannot be used: all that is wrong with it, each with file, place and how to mend it. */
public final class RulePackException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final transient List<Problem> problems;

    /**
     * One thing wrong.
     *
     * @param file name of the file
     * @param pointer the place in it as a JSON pointer (RFC 6901), empty for the whole; or "line 3, column 7" where it is no JSON at all
     * @param text what is wrong and what is expected
     */
    public record Problem(String file, String pointer, String text) {
        @Override
        public String toString() {
            return pointer.isEmpty() ? file + ": " + text : file + ", " + pointer + ": " + text;
        }
    }

    RulePackException(List<Problem> problems) {
        super(problems.stream().map(Problem::toString).collect(Collectors.joining(System.lineSeparator())));
        this.problems = List.copyOf(problems);
    }

    /** All that is wrong. */
    public List<Problem> problems() {
        return problems;
    }
}
