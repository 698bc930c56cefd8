package org.modewright.render;

import java.util.BitSet;

/** Keeps texts from lying on one another: the first to ask for a place has it. */
final class LabelGrid {

    private static final int CELL = 6;

    private final BitSet taken = new BitSet();
    private int columns;
    private int rows;

    void begin(int width, int height) {
        columns = width / CELL + 1;
        rows = height / CELL + 1;
        taken.clear();
    }

    /** Takes a rectangle if no part of it inside the picture is taken yet. */
    boolean take(double left, double top, double right, double bottom) {
        int fromX = cell(left, columns);
        int toX = cell(right, columns) + 1;
        int fromY = cell(top, rows);
        int toY = cell(bottom, rows) + 1;
        for (int y = fromY; y < toY; y++) {
            int next = taken.nextSetBit(y * columns + fromX);
            if (next >= 0 && next < y * columns + toX) {
                return false;
            }
        }
        for (int y = fromY; y < toY; y++) {
            taken.set(y * columns + fromX, y * columns + toX);
        }
        return true;
    }

    private static int cell(double pixel, int count) {
        return (int) Math.max(0, Math.min(count - 1, Math.floor(pixel / CELL)));
    }
}
