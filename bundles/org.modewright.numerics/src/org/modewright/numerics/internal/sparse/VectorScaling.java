package org.modewright.numerics.internal.sparse;

/** Scaling of null vectors. */
final class VectorScaling {

    private VectorScaling() {
    }

    /** Divides a vector by one of its components. */
    static void toUnit(double[] vector, int component) {
        double divisor = vector[component];
        for (int i = 0; i < vector.length; i++) {
            vector[i] /= divisor;
        }
    }
}
