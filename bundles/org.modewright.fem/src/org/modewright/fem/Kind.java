package org.modewright.fem;

/** What carries energy in a structure. */
public enum Kind {

    /** A frame member or a bar. */
    MEMBER("member"),
    /** A panel. */
    PANEL("panel"),
    /** A spring, to ground or between nodes, or an elastic support. */
    SPRING("spring"),
    /** A node that carries mass of its own: given there, or made from gravity loads. */
    NODE("node");

    private final String word;

    Kind(String word) {
        this.word = word;
    }

    /** The word of the result file. */
    public String word() {
        return word;
    }
}
