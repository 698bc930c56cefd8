package org.modewright.render;

import java.util.Arrays;

/** A growing array of double. */
final class Numbers {

    private double[] values = new double[64];
    private int size;

    void add(double value) {
        if (size == values.length) {
            values = Arrays.copyOf(values, 2 * size);
        }
        values[size++] = value;
    }

    int size() {
        return size;
    }

    double[] toArray() {
        return Arrays.copyOf(values, size);
    }

    float[] toFloats() {
        float[] floats = new float[size];
        for (int i = 0; i < size; i++) {
            floats[i] = (float) values[i];
        }
        return floats;
    }
}
