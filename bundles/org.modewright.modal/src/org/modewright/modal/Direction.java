package org.modewright.modal;

/**
 * The six directions of rigid-body motion: three translations along the global axes and three rotations about the centre of the movable
 * mass. The ordinal is the component's place in every array of six.
 */
public enum Direction {
    X("x", "X"),
    Y("y", "Y"),
    Z("z", "Z"),
    RX("rx", "rotation about X"),
    RY("ry", "rotation about Y"),
    RZ("rz", "rotation about Z");

    private final String word;
    private final String label;

    Direction(String word, String label) {
        this.word = word;
        this.label = label;
    }

    /** Word of the direction in files and options, {@code x} to {@code rz}. */
    public String word() {
        return word;
    }

    /** The direction as a sentence names it: "X", "rotation about Z". */
    public String label() {
        return label;
    }

    /** Whether the direction is a translation. */
    public boolean isTranslation() {
        return ordinal() < 3;
    }
}
