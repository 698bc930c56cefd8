package org.modewright.render;

/** Signs at a vertex. */
public enum MarkerShape {
    /** A small square. */
    NODE,
    /** A disc. */
    MASS,
    /** All six movements held: a block under the node. */
    HELD,
    /** The three translations held: a pyramid under the node. */
    PINNED,
    /** Only some movements held: a pyramid on a gap. */
    GUIDED,
    /** An elastic support: a zigzag under the node. */
    SPRING
}
