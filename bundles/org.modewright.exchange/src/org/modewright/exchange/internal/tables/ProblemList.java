package org.modewright.exchange.internal.tables;

import java.util.ArrayList;
import java.util.List;

import org.modewright.exchange.PackageException;
import org.modewright.exchange.Problem;

/** Collects the problems of a package, so that all of them are reported in one go. */
final class ProblemList {

    /** More than these are counted, not kept. */
    static final int MOST = 100;

    private final List<Problem> kept = new ArrayList<>();
    private int total;

    void add(String file, int row, String column, String value, String text) {
        total++;
        if (kept.size() < MOST) {
            kept.add(new Problem(file, row, column, value, text));
        }
    }

    boolean isEmpty() {
        return total == 0;
    }

    void throwIfAny() throws PackageException {
        if (total > 0) {
            throw new PackageException(kept, total);
        }
    }
}
