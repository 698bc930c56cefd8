package org.modewright.fem;

/** Words for the six components of motion: translations along x, y, z (0 to 2) and rotations about x, y, z (3 to 5). */
public final class Components {

    /** Number of components of a node. */
    public static final int COUNT = 6;

    private static final String[] FILE = {"ux", "uy", "uz", "rx", "ry", "rz"};
    private static final String[] SENTENCE = {"X", "Y", "Z", "rotation about X", "rotation about Y", "rotation about Z"};

    private Components() {
    }

    /** The word in files: ux, uy, uz, rx, ry or rz. */
    public static String inFiles(int component) {
        return FILE[component];
    }

    /** The words in sentences: X, Y, Z, rotation about X, rotation about Y or rotation about Z. */
    public static String inSentences(int component) {
        return SENTENCE[component];
    }
}
