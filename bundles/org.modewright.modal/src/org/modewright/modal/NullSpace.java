package org.modewright.modal;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * A basis of a subspace in reduced row echelon form with complete pivoting: motions on different nodes come apart, because each pivot's
 * component vanishes in all other vectors.
 */
final class NullSpace {

    private static final double ROUND_OFF = 1e-8;

    private NullSpace() {
    }

    /** The reduced basis; each vector's pivot component is 1. Vectors that depend on the others are left out. */
    static List<double[]> reduced(List<double[]> vectors) {
        List<double[]> rows = new ArrayList<>();
        for (double[] vector : vectors) {
            double size = largest(vector);
            rows.add(size > 0 ? scaled(vector, 1 / size) : vector.clone());
        }
        int done = 0;
        while (done < rows.size()) {
            int row = rowOfLargest(rows, done);
            int column = placeOfLargest(rows.get(row));
            double pivot = rows.get(row)[column];
            if (Math.abs(pivot) < ROUND_OFF) {
                break;
            }
            Collections.swap(rows, done, row);
            rows.set(done, scaled(rows.get(done), 1 / pivot));
            eliminate(rows, done, column);
            done++;
        }
        return rows.subList(0, done);
    }

    private static void eliminate(List<double[]> rows, int pivotRow, int column) {
        double[] pivot = rows.get(pivotRow);
        for (int i = 0; i < rows.size(); i++) {
            double factor = rows.get(i)[column];
            if (i != pivotRow && factor != 0) {
                double[] row = rows.get(i);
                for (int j = 0; j < row.length; j++) {
                    row[j] -= factor * pivot[j];
                }
                row[column] = 0;
            }
        }
    }

    private static int rowOfLargest(List<double[]> rows, int from) {
        int best = from;
        for (int i = from + 1; i < rows.size(); i++) {
            if (largest(rows.get(i)) > largest(rows.get(best))) {
                best = i;
            }
        }
        return best;
    }

    private static int placeOfLargest(double[] row) {
        int place = 0;
        for (int j = 1; j < row.length; j++) {
            if (Math.abs(row[j]) > Math.abs(row[place])) {
                place = j;
            }
        }
        return place;
    }

    static double largest(double[] vector) {
        double largest = 0;
        for (double value : vector) {
            largest = Math.max(largest, Math.abs(value));
        }
        return largest;
    }

    private static double[] scaled(double[] vector, double factor) {
        double[] scaled = new double[vector.length];
        for (int i = 0; i < vector.length; i++) {
            scaled[i] = factor * vector[i];
        }
        return scaled;
    }
}
