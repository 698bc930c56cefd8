package org.modewright.exchange;

import java.io.IOException;
import java.util.List;
import java.util.stream.Collectors;

/** A table package that cannot be read; nothing of it was imported. */
public final class PackageException extends IOException {

    private static final long serialVersionUID = 1L;

    private final transient List<Problem> problems;
    private final int total;

    /**
     * @param problems the first problems of the package, in the order of its tables
     * @param total how many problems there are in all
     */
    public PackageException(List<Problem> problems, int total) {
        super(message(problems, total));
        this.problems = List.copyOf(problems);
        this.total = total;
    }

    /** The problems that were kept, at most 100. */
    public List<Problem> problems() {
        return problems;
    }

    /** How many problems the package has, kept or not. */
    public int total() {
        return total;
    }

    private static String message(List<Problem> problems, int total) {
        String lines = problems.stream().map(Problem::toString).collect(Collectors.joining("\n"));
        return total > problems.size() ? lines + "\n(" + (total - problems.size()) + " more)" : lines;
    }
}
