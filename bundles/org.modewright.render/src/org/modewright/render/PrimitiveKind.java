package org.modewright.render;

/** What a scene is made of. */
public enum PrimitiveKind {
    /** Members and plain lines: chains of straight segments. */
    MEMBER,
    /** Filled triangles. */
    TRIANGLE,
    /** Signs of constant size on the screen: nodes, masses, supports. */
    MARKER,
    /** Texts. */
    LABEL
}
