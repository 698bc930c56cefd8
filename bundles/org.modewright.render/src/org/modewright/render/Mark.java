package org.modewright.render;

/** A state of a primitive that changes how it is drawn; several may hold at once. */
public enum Mark {
    /** Not drawn and not picked. */
    HIDDEN,
    /** Outlined in the selection colour. */
    SELECTED,
    /** Outlined in the hover colour. */
    HOVERED,
    /** Drawn pale, so that the others stand out. */
    MUTED,
    /** Drawn thicker. */
    EMPHASISED;

    int bit() {
        return 1 << ordinal();
    }
}
