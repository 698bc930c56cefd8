package org.modewright.fem.internal;

import java.util.Arrays;

/**
 * The forces of energy carriers as rows over unknowns: k T and m T of each, scaled by the largest entries of its matrix and of its rows
 * of T, so that entries far below 1 are round-off. A motion with neither stiffness nor mass makes all of them zero.
 */
final class CarrierRows {

    private final CarrierStore store;
    private final Transformation transformation;

    CarrierRows(CarrierStore store, Transformation transformation) {
        this.store = store;
        this.transformation = transformation;
    }

    /** The unknowns that move a carrier, ascending. */
    int[] unknowns(int carrier) {
        return own(carrier).unknowns();
    }

    private ElementTransformation own(int carrier) {
        boolean[] all = new boolean[store.places(carrier).length];
        Arrays.fill(all, true);
        return ElementTransformation.of(transformation, store.places(carrier), all);
    }

    /**
     * Eliminates the rows of some carriers.
     *
     * @param carriers the carriers
     * @param columns the unknowns that may move, ascending; all others are zero
     */
    SmallNullSpace nullSpace(int[] carriers, int[] columns) {
        int height = 0;
        for (int carrier : carriers) {
            height += 2 * store.places(carrier).length;
        }
        double[] system = new double[height * columns.length];
        int row = 0;
        for (int carrier : carriers) {
            ElementTransformation own = own(carrier);
            row = stack(own, store.stiffness(carrier), columns, system, row);
            row = stack(own, store.mass(carrier), columns, system, row);
        }
        return new SmallNullSpace(system, height, columns.length);
    }

    /** Adds the rows of A T over the chosen columns; returns the next free row. */
    private static int stack(ElementTransformation own, double[] packed, int[] columns, double[] system, int row) {
        int count = own.unknowns().length;
        if (packed.length == 0 || count == 0) {
            return row;
        }
        double[] product = own.times(packed);
        double scale = largest(packed) * largest(own.rows());
        int height = product.length / count;
        for (int j = 0; j < count && scale > 0.0; j++) {
            int column = Arrays.binarySearch(columns, own.unknowns()[j]);
            for (int i = 0; i < height && column >= 0; i++) {
                system[(row + i) * columns.length + column] = product[i * count + j] / scale;
            }
        }
        return row + height;
    }

    private static double largest(double[] values) {
        double largest = 0.0;
        for (double value : values) {
            largest = Math.max(largest, Math.abs(value));
        }
        return largest;
    }
}
