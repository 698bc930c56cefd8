package org.modewright.render;

import java.util.ArrayList;
import java.util.List;

/** Collects the geometry of a {@link Scene}. Indices are given out in order, from 0. Lengths are in model units. */
public final class SceneBuilder {

    final Numbers xyz = new Numbers();
    final Integers firstVertex = new Integers();
    final Integers segments = new Integers();
    final Integers straight = new Integers();
    final Numbers axisY = new Numbers();
    final Numbers sizeY = new Numbers();
    final Numbers sizeZ = new Numbers();
    final Integers corners = new Integers();
    final Integers triangleColour = new Integers();
    final Integers markerVertex = new Integers();
    final List<MarkerShape> markerShape = new ArrayList<>();
    final Integers labelVertex = new Integers();
    final List<String> labelText = new ArrayList<>();
    private final Integers[] ids = {new Integers(), new Integers(), new Integers(), new Integers()};

    SceneBuilder() {
    }

    /** Adds a point; answers its vertex index. */
    public int vertex(double x, double y, double z) {
        if (!Double.isFinite(x + y + z)) {
            throw new IllegalArgumentException("The vertex (" + x + ", " + y + ", " + z + ") is not finite.");
        }
        xyz.add(x);
        xyz.add(y);
        xyz.add(z);
        return xyz.size() / 3 - 1;
    }

    /** Adds a member drawn as a line; answers its member index. */
    public int member(int id, double x0, double y0, double z0, double x1, double y1, double z1, int segmentCount) {
        return member(id, x0, y0, z0, x1, y1, z1, segmentCount, new double[3], 0, 0);
    }

    /**
     * Adds a member with vertices of its own, equally spaced from end to end; answers its member index.
     *
     * @param id           the caller's id; negative: not pickable
     * @param segmentCount straight pieces, at least 1; a bent member needs some 4 to 8
     * @param localY       unit vector of the section's y axis, square to the member
     * @param width        the section's outer size along local y; 0 for a member that is always a line
     * @param depth        the section's outer size along local z
     */
    public int member(int id, double x0, double y0, double z0, double x1, double y1, double z1, int segmentCount, double[] localY,
        double width, double depth) {
        if (segmentCount < 1) {
            throw new IllegalArgumentException("A member needs at least one segment, not " + segmentCount + ".");
        }
        int first = xyz.size() / 3;
        for (int i = 0; i <= segmentCount; i++) {
            double t = i / (double) segmentCount;
            vertex(x0 + t * (x1 - x0), y0 + t * (y1 - y0), z0 + t * (z1 - z0));
        }
        return chain(id, first, segmentCount, true, localY, width, depth);
    }

    /** Adds a plain line through points x, y, z, x, y, z…; answers its member index. A negative id is not pickable. */
    public int line(int id, double... points) {
        if (points.length < 6 || points.length % 3 != 0) {
            throw new IllegalArgumentException("A line needs x, y, z of at least two points, not " + points.length + " numbers.");
        }
        int first = xyz.size() / 3;
        for (int i = 0; i < points.length; i += 3) {
            vertex(points[i], points[i + 1], points[i + 2]);
        }
        return chain(id, first, points.length / 3 - 1, points.length == 6, new double[3], 0, 0);
    }

    private int chain(int id, int first, int segmentCount, boolean isStraight, double[] localY, double width, double depth) {
        straight.add(isStraight ? 1 : 0);
        firstVertex.add(first);
        segments.add(segmentCount);
        for (int i = 0; i < 3; i++) {
            axisY.add(localY[i]);
        }
        sizeY.add(width);
        sizeZ.add(depth);
        return added(PrimitiveKind.MEMBER, id);
    }

    /**
     * Adds a filled triangle; answers its triangle index. Both faces are seen.
     *
     * @param argb its colour; 0 for the theme's panel colour; an alpha below 255 lets what is behind shine through
     */
    public int triangle(int id, int v0, int v1, int v2, int argb) {
        corners.add(checked(v0));
        corners.add(checked(v1));
        corners.add(checked(v2));
        triangleColour.add(argb);
        return added(PrimitiveKind.TRIANGLE, id);
    }

    /** Adds a sign at a vertex; answers its marker index. */
    public int marker(int id, int vertex, MarkerShape shape) {
        markerVertex.add(checked(vertex));
        markerShape.add(shape);
        return added(PrimitiveKind.MARKER, id);
    }

    /** Adds a text beside a vertex; answers its label index. */
    public int label(int id, int vertex, String text) {
        labelVertex.add(checked(vertex));
        labelText.add(text);
        return added(PrimitiveKind.LABEL, id);
    }

    public Scene build() {
        return new Scene(this);
    }

    Integers ids(PrimitiveKind kind) {
        return ids[kind.ordinal()];
    }

    private int added(PrimitiveKind kind, int id) {
        ids(kind).add(id);
        return ids(kind).size() - 1;
    }

    private int checked(int vertex) {
        if (vertex < 0 || vertex >= xyz.size() / 3) {
            throw new IllegalArgumentException("There is no vertex " + vertex + "; the scene has " + xyz.size() / 3 + " so far.");
        }
        return vertex;
    }
}
