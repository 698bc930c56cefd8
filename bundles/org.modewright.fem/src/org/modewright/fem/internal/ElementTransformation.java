package org.modewright.fem.internal;

import java.util.Arrays;

/**
 * The rows of T that belong to the components of one element, as a small full matrix over the unknowns that appear in them.
 *
 * @param unknowns the unknowns, ascending
 * @param rows factor of unknown j in component i at i * unknowns.length + j
 */
record ElementTransformation(int[] unknowns, double[] rows) {

    /**
     * Gathers the rows.
     *
     * @param places components of the element
     * @param active which of them matter; the rows of the others stay zero
     */
    static ElementTransformation of(Transformation transformation, int[] places, boolean[] active) {
        int[] unknowns = unknowns(transformation, places, active);
        double[] rows = new double[places.length * unknowns.length];
        for (int i = 0; i < places.length; i++) {
            for (int p = transformation.rowStart(places[i]); active[i] && p < transformation.rowStart(places[i] + 1); p++) {
                rows[i * unknowns.length + Arrays.binarySearch(unknowns, transformation.unknownAt(p))] = transformation.factorAt(p);
            }
        }
        return new ElementTransformation(unknowns, rows);
    }

    private static int[] unknowns(Transformation transformation, int[] places, boolean[] active) {
        int[] found = new int[places.length];
        int count = 0;
        for (int i = 0; i < places.length; i++) {
            for (int p = transformation.rowStart(places[i]); active[i] && p < transformation.rowStart(places[i] + 1); p++) {
                if (count == found.length) {
                    found = Arrays.copyOf(found, 2 * count);
                }
                found[count++] = transformation.unknownAt(p);
            }
        }
        return Arrays.stream(found, 0, count).sorted().distinct().toArray();
    }

    /** The same with the absolute values of the factors. */
    ElementTransformation sizes() {
        return new ElementTransformation(unknowns, PackedMatrix.absolute(rows));
    }

    /** A T by rows, A the packed matrix of the element. */
    double[] times(double[] packed) {
        int count = unknowns.length;
        int order = count == 0 ? 0 : rows.length / count;
        double[] product = new double[rows.length];
        int place = 0;
        for (int i = 0; i < order; i++) {
            for (int j = 0; j <= i; j++) {
                double value = packed[place++];
                if (value == 0.0) {
                    continue;
                }
                addRow(product, i, value, j, count);
                if (i != j) {
                    addRow(product, j, value, i, count);
                }
            }
        }
        return product;
    }

    private void addRow(double[] product, int to, double value, int from, int count) {
        for (int a = 0; a < count; a++) {
            product[to * count + a] += value * rows[from * count + a];
        }
    }
}
