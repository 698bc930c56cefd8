package org.modewright.render;

import java.util.Arrays;

/** A growing array of int. */
final class Integers {

    private int[] values = new int[64];
    private int size;

    void add(int value) {
        if (size == values.length) {
            values = Arrays.copyOf(values, 2 * size);
        }
        values[size++] = value;
    }

    int size() {
        return size;
    }

    void clear() {
        size = 0;
    }

    int get(int index) {
        return values[index];
    }

    int[] toArray() {
        return Arrays.copyOf(values, size);
    }
}
