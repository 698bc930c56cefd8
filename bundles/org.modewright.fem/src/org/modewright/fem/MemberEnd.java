package org.modewright.fem;

/**
 * How a frame member meets one of its nodes.
 *
 * @param released which of the six components, in local axes, are free at the end of the flexible part; length 6, not to be written to
 * @param rigidLength length of the rigid zone along the member, m
 * @param offset from the node to the end of the member, global axes, m; length 3, not to be written to
 */
public record MemberEnd(boolean[] released, double rigidLength, double[] offset) {

    /** Joined to its node in all components, without zone or offset. */
    public static MemberEnd joined() {
        return new MemberEnd(new boolean[6], 0.0, new double[3]);
    }
}
