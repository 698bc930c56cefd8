package org.modewright.modal;

import java.util.ArrayList;
import java.util.List;

/**
 * Shares of energy by mode and carrier, kept in single precision where the table is large: a share is shown with three digits, and the
 * differences that checks take from it are taken on small models.
 */
final class ShareTable {

    private static final long DOUBLE_ENTRIES = 4_000_000;

    private final List<double[]> exact = new ArrayList<>();
    private final List<float[]> compact = new ArrayList<>();

    ShareTable(List<double[]> rows) {
        long entries = rows.stream().mapToLong(row -> row.length).sum();
        for (double[] row : rows) {
            if (entries <= DOUBLE_ENTRIES) {
                exact.add(row);
            } else {
                compact.add(narrow(row));
            }
        }
    }

    double[] row(int mode) {
        return compact.isEmpty() ? exact.get(mode).clone() : widen(compact.get(mode));
    }

    double share(int mode, int carrier) {
        return compact.isEmpty() ? exact.get(mode)[carrier] : compact.get(mode)[carrier];
    }

    private static float[] narrow(double[] row) {
        float[] narrow = new float[row.length];
        for (int i = 0; i < row.length; i++) {
            narrow[i] = (float) row[i];
        }
        return narrow;
    }

    private static double[] widen(float[] row) {
        double[] wide = new double[row.length];
        for (int i = 0; i < row.length; i++) {
            wide[i] = row[i];
        }
        return wide;
    }
}
