package org.modewright.render;

import java.util.Arrays;
import java.util.function.IntPredicate;

/**
 * What is drawn: geometry that stays (made by a {@link SceneBuilder}) and marks and colours that change. Held as arrays of primitives, so
 * that a frame of many thousand members needs no object per member. Positions are kept relative to the middle of the scene, which keeps
 * single precision enough for structures far from the origin.
 *
 * <p>Not thread-safe: change it on the thread that renders it.
 */
public final class Scene {

    final double[] origin;
    final Bounds bounds;
    final float[] position;

    final int[] firstVertex;
    final int[] segments;
    /** 1 for a member whose vertices lie evenly on a straight line at rest. */
    final int[] straight;
    final float[] axisY;
    final float[] sizeY;
    final float[] sizeZ;

    final int[] corners;

    final int[] markerVertex;
    final MarkerShape[] markerShape;

    final int[] labelVertex;
    final String[] labelText;

    private final int[][] ids = new int[PrimitiveKind.values().length][];
    private final byte[][] marks = new byte[PrimitiveKind.values().length][];
    private final int[][] colours = new int[PrimitiveKind.values().length][];
    private int[] vertexColours;
    private int version;

    Scene(SceneBuilder b) {
        double[] xyz = b.xyz.toArray();
        bounds = Bounds.of(xyz);
        origin = bounds.centre();
        position = new float[xyz.length];
        for (int i = 0; i < xyz.length; i++) {
            position[i] = (float) (xyz[i] - origin[i % 3]);
        }
        firstVertex = b.firstVertex.toArray();
        segments = b.segments.toArray();
        straight = b.straight.toArray();
        axisY = b.axisY.toFloats();
        sizeY = b.sizeY.toFloats();
        sizeZ = b.sizeZ.toFloats();
        corners = b.corners.toArray();
        markerVertex = b.markerVertex.toArray();
        markerShape = b.markerShape.toArray(MarkerShape[]::new);
        labelVertex = b.labelVertex.toArray();
        labelText = b.labelText.toArray(String[]::new);
        for (PrimitiveKind kind : PrimitiveKind.values()) {
            ids[kind.ordinal()] = b.ids(kind).toArray();
            marks[kind.ordinal()] = new byte[ids[kind.ordinal()].length];
            colours[kind.ordinal()] = new int[ids[kind.ordinal()].length];
        }
        System.arraycopy(b.triangleColour.toArray(), 0, colours(PrimitiveKind.TRIANGLE), 0, triangleCount());
    }

    public static SceneBuilder builder() {
        return new SceneBuilder();
    }

    public int vertexCount() {
        return position.length / 3;
    }

    public int memberCount() {
        return count(PrimitiveKind.MEMBER);
    }

    public int triangleCount() {
        return count(PrimitiveKind.TRIANGLE);
    }

    public int markerCount() {
        return count(PrimitiveKind.MARKER);
    }

    public int count(PrimitiveKind kind) {
        return ids[kind.ordinal()].length;
    }

    /** The caller's id of a primitive. */
    public int id(PrimitiveKind kind, int index) {
        return ids[kind.ordinal()][index];
    }

    /** The box around all vertices at rest. */
    public Bounds bounds() {
        return bounds;
    }

    /** A member's vertices are {@code firstVertex} to {@code firstVertex + segments}. */
    public int firstVertex(int member) {
        return firstVertex[member];
    }

    public int segments(int member) {
        return segments[member];
    }

    /** The position of a vertex at rest, in model coordinates. */
    public double[] vertex(int vertex) {
        return new double[] {
            origin[0] + position[3 * vertex], origin[1] + position[3 * vertex + 1], origin[2] + position[3 * vertex + 2]};
    }

    /** Sets the mark on every primitive of a kind whose id passes, and clears it on the others. */
    public void mark(PrimitiveKind kind, Mark mark, IntPredicate byId) {
        version++;
        byte[] state = marks(kind);
        int[] id = ids[kind.ordinal()];
        for (int i = 0; i < state.length; i++) {
            state[i] = (byte) (byId.test(id[i]) ? state[i] | mark.bit() : state[i] & ~mark.bit());
        }
    }

    /** Clears a mark everywhere. */
    public void clear(Mark mark) {
        for (PrimitiveKind kind : PrimitiveKind.values()) {
            mark(kind, mark, id -> false);
        }
    }

    public boolean marked(PrimitiveKind kind, int index, Mark mark) {
        return (marks(kind)[index] & mark.bit()) != 0;
    }

    /** Gives a primitive a colour of its own; 0 returns to the theme's. */
    public void colour(PrimitiveKind kind, int index, int argb) {
        colours(kind)[index] = argb;
    }

    /** Gives all primitives of a kind one colour; 0 returns to the theme's. */
    public void colourAll(PrimitiveKind kind, int argb) {
        Arrays.fill(colours(kind), argb);
    }

    /**
     * Colours the primitives of a kind by a value each.
     *
     * @param value one value a primitive; NaN gives the theme's colour
     * @param low   the value at the ramp's light end
     * @param high  the value at the ramp's dark end
     * @throws IllegalArgumentException if the count of values differs from the count of primitives
     */
    public void colourByScalar(PrimitiveKind kind, double[] value, ColourRamp ramp, double low, double high) {
        int[] colour = colours(kind);
        if (value.length != colour.length) {
            throw new IllegalArgumentException(
                value.length + " values were given for " + colour.length + " primitives of kind " + kind + ".");
        }
        for (int i = 0; i < colour.length; i++) {
            colour[i] = ramped(value[i], ramp, low, high);
        }
    }

    /**
     * Colours members along their length by a value per vertex; the members' own colours rest meanwhile.
     *
     * @param value one value a vertex, or null to switch this off; NaN gives the theme's colour
     */
    public void colourVertices(float[] value, ColourRamp ramp, double low, double high) {
        if (value == null) {
            vertexColours = null;
            return;
        }
        if (value.length != vertexCount()) {
            throw new IllegalArgumentException(value.length + " values were given for " + vertexCount() + " vertices.");
        }
        vertexColours = new int[value.length];
        for (int i = 0; i < value.length; i++) {
            vertexColours[i] = ramped(value[i], ramp, low, high);
        }
    }

    private static int ramped(double value, ColourRamp ramp, double low, double high) {
        if (Double.isNaN(value)) {
            return 0;
        }
        return ramp.argb(high > low ? (value - low) / (high - low) : 0);
    }

    /** Grows with every change of a mark. */
    int version() {
        return version;
    }

    byte[] marks(PrimitiveKind kind) {
        return marks[kind.ordinal()];
    }

    int[] colours(PrimitiveKind kind) {
        return colours[kind.ordinal()];
    }

    int[] vertexColours() {
        return vertexColours;
    }
}
