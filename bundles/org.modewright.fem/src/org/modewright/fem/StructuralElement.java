package org.modewright.fem;

/**
 * An element between nodes, described in SI units. Which matrices it has is the affair of an {@link ElementFormulation}.
 */
public interface StructuralElement {

    /** What it is. */
    Kind kind();

    /** Stable id in the model. */
    String id();

    /** Name for people. */
    String name();

    /** Indices of its nodes, each once, a new array. */
    int[] nodes();

    /** Name of its group; null without. */
    String group();

    /** Name of its section; null without. */
    String section();

    /** Name of its material; null without. */
    String material();

    /** Its own mass in kg, after the seismic mass rule; known from its description alone, without any matrix. */
    double ownMass();
}
