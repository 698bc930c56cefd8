package org.modewright.fem.internal;

import java.util.Arrays;

/** A sparse sum of factor times unknown, unknowns ascending. Immutable. */
final class LinearForm {

    /** What is left of two entries below this share of their sizes is round-off of exact cancellation. */
    private static final double CANCELLED = 1e-13;

    private final int[] unknown;
    private final double[] factor;

    private LinearForm(int[] unknown, double[] factor) {
        this.unknown = unknown;
        this.factor = factor;
    }

    /** The form with these terms, in any order; terms of the same unknown add up. */
    static LinearForm of(int[] unknowns, double[] factors) {
        Integer[] order = new Integer[unknowns.length];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, (a, b) -> Integer.compare(unknowns[a], unknowns[b]));
        int[] sorted = new int[unknowns.length];
        double[] values = new double[unknowns.length];
        int count = 0;
        for (Integer place : order) {
            if (factors[place] == 0.0) {
                continue;
            }
            if (count > 0 && sorted[count - 1] == unknowns[place]) {
                values[count - 1] += factors[place];
            } else {
                sorted[count] = unknowns[place];
                values[count++] = factors[place];
            }
        }
        return new LinearForm(Arrays.copyOf(sorted, count), Arrays.copyOf(values, count));
    }

    int size() {
        return unknown.length;
    }

    int unknown(int term) {
        return unknown[term];
    }

    double factor(int term) {
        return factor[term];
    }

    /** The factor of an unknown; zero if it does not appear. */
    double factorOf(int wanted) {
        int term = Arrays.binarySearch(unknown, wanted);
        return term < 0 ? 0.0 : factor[term];
    }

    double largest() {
        double largest = 0.0;
        for (double value : factor) {
            largest = Math.max(largest, Math.abs(value));
        }
        return largest;
    }

    /** This form with every factor multiplied. */
    LinearForm times(double multiplier) {
        double[] product = factor.clone();
        for (int i = 0; i < product.length; i++) {
            product[i] *= multiplier;
        }
        return new LinearForm(unknown, product);
    }

    /** This form without one unknown. */
    LinearForm without(int dropped) {
        int term = Arrays.binarySearch(unknown, dropped);
        if (term < 0) {
            return this;
        }
        int[] fewer = new int[unknown.length - 1];
        double[] values = new double[fewer.length];
        System.arraycopy(unknown, 0, fewer, 0, term);
        System.arraycopy(unknown, term + 1, fewer, term, fewer.length - term);
        System.arraycopy(factor, 0, values, 0, term);
        System.arraycopy(factor, term + 1, values, term, fewer.length - term);
        return new LinearForm(fewer, values);
    }

    /** This form plus a multiple of another. */
    LinearForm plus(LinearForm other, double multiplier) {
        int[] merged = new int[unknown.length + other.unknown.length];
        double[] values = new double[merged.length];
        int count = 0;
        int i = 0;
        int j = 0;
        while (i < unknown.length || j < other.unknown.length) {
            int next = Math.min(i < unknown.length ? unknown[i] : Integer.MAX_VALUE,
                    j < other.unknown.length ? other.unknown[j] : Integer.MAX_VALUE);
            double mine = i < unknown.length && unknown[i] == next ? factor[i++] : 0.0;
            double theirs = j < other.unknown.length && other.unknown[j] == next ? multiplier * other.factor[j++] : 0.0;
            double sum = mine + theirs;
            if (Math.abs(sum) > CANCELLED * Math.max(Math.abs(mine), Math.abs(theirs))) {
                merged[count] = next;
                values[count++] = sum;
            }
        }
        return new LinearForm(Arrays.copyOf(merged, count), Arrays.copyOf(values, count));
    }
}
