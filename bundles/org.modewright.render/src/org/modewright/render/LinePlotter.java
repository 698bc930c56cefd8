package org.modewright.render;

/**
 * Straight lines with a width in pixels. A line is walked along its longer direction; in each column (or row) the pixels take the share
 * of their height (or width) that the line covers, which is exact but for the ends. Columns count from the first whose centre lies in
 * [start, end), so that
 * the pieces of a chain meet without a gap and without a doubled pixel.
 *
 * <p>Ends far outside the picture are harmless: only what lies inside is walked.
 */
final class LinePlotter {

    /** Places across a line are whole numbers of 1/65536 pixel, so that a line is the same in whatever strip its walk begins. */
    private static final int BITS = 16;
    private static final long ONE = 1 << BITS;
    private static final long MASK = ONE - 1;

    private final Strip strip;

    LinePlotter(Strip strip) {
        this.strip = strip;
    }

    /** One colour; wide lines are drawn out by a little at both ends, so that chains stay closed where they turn. */
    void line(double x0, double y0, float z0, double x1, double y1, float z1, double width, int argb) {
        line(x0, y0, z0, argb, x1, y1, z1, argb, width);
    }

    void line(double x0, double y0, float z0, int argb0, double x1, double y1, float z1, int argb1, double width) {
        double dx = x1 - x0;
        double dy = y1 - y0;
        double reach = width + 1;
        if (Math.max(y0, y1) + reach < strip.firstRow || Math.min(y0, y1) - reach > strip.endRow
            || Math.max(x0, x1) + reach < 0 || Math.min(x0, x1) - reach > strip.width) {
            return;
        }
        if (Math.abs(dx) >= Math.abs(dy)) {
            if (dx >= 0) {
                columns(x0, y0, z0, argb0, x1, y1, z1, argb1, width);
            } else {
                columns(x1, y1, z1, argb1, x0, y0, z0, argb0, width);
            }
        } else if (dy >= 0) {
            rows(x0, y0, z0, argb0, x1, y1, z1, argb1, width);
        } else {
            rows(x1, y1, z1, argb1, x0, y0, z0, argb0, width);
        }
    }

    private void columns(double x0, double y0, float z0, int argb0, double x1, double y1, float z1, int argb1, double width) {
        double length = x1 - x0;
        double inverse = length > 0 ? 1 / length : 0;
        double slope = (y1 - y0) * inverse;
        double half = width / 2 * Math.sqrt(1 + slope * slope);
        double cap = cap(width);
        int origin = (int) Math.ceil(Math.max(x0 - cap, 0) - 0.5);
        int from = origin;
        double high = Math.min(x1 + cap, strip.width);
        if (Math.min(y0, y1) - half < strip.firstRow || Math.max(y0, y1) + half > strip.endRow) {
            double low = entry(x0, y0, slope, strip.firstRow - half - 1, strip.endRow + half + 1);
            from = Math.max(from, (int) Math.ceil(Math.min(low, strip.width) - 0.5));
            high = Math.min(high, exit(x0, y0, slope, strip.firstRow - half - 1, strip.endRow + half + 1));
        }
        int end = (int) Math.ceil(high - 0.5);
        long step = Math.round(slope * ONE);
        long thick = Math.max(1, Math.round(2 * half * ONE));
        long top = Math.round((y0 + (origin + 0.5 - x0) * slope - half) * ONE) + (from - origin) * step;
        float deepening = (float) (((double) z1 - z0) * inverse);
        boolean front = z0 == Strip.IN_FRONT;
        float shift = (float) (0.5 - x0);
        for (int x = from; x < end; x++, top += step) {
            float z = front ? z0 : z0 + (x + shift) * deepening;
            int argb = argb0 == argb1 ? argb0 : Argb.mix(argb0, argb1, (x + 0.5 - x0) * inverse);
            long bottom = top + thick - 1;
            int first = (int) (top >> BITS);
            int last = (int) (bottom >> BITS);
            if (first < strip.firstRow || last >= strip.endRow) {
                cutColumn(x, first, last, top, bottom, z, argb);
                continue;
            }
            int index = first * strip.width + x;
            if (first == last) {
                strip.blend(index, z, argb, (int) (thick >> BITS - 8));
                continue;
            }
            strip.blend(index, z, argb, (int) (ONE - (top & MASK) >> BITS - 8));
            index += strip.width;
            for (int y = first + 1; y < last; y++, index += strip.width) {
                strip.blend(index, z, argb, 256);
            }
            strip.blend(index, z, argb, (int) ((bottom & MASK) + 1 >> BITS - 8));
        }
    }

    private void cutColumn(int x, int first, int last, long top, long bottom, float z, int argb) {
        int end = Math.min(strip.endRow - 1, last);
        for (int y = Math.max(strip.firstRow, first); y <= end; y++) {
            strip.blend(y * strip.width + x, z, argb, weight(y, top, bottom));
        }
    }

    private void rows(double x0, double y0, float z0, int argb0, double x1, double y1, float z1, int argb1, double width) {
        double inverse = 1 / (y1 - y0);
        double slope = (x1 - x0) * inverse;
        double half = width / 2 * Math.sqrt(1 + slope * slope);
        double cap = cap(width);
        int origin = (int) Math.ceil(Math.max(y0 - cap, 0) - 0.5);
        int from = Math.max(origin, strip.firstRow);
        double high = Math.min(y1 + cap, strip.endRow);
        if (Math.min(x0, x1) - half < 0 || Math.max(x0, x1) + half > strip.width) {
            double low = entry(y0, x0, slope, -half - 1, strip.width + half + 1);
            from = Math.max(from, (int) Math.ceil(Math.min(low, strip.endRow) - 0.5));
            high = Math.min(high, exit(y0, x0, slope, -half - 1, strip.width + half + 1));
        }
        int end = (int) Math.ceil(high - 0.5);
        long step = Math.round(slope * ONE);
        long thick = Math.max(1, Math.round(2 * half * ONE));
        long left = Math.round((x0 + (origin + 0.5 - y0) * slope - half) * ONE) + (from - origin) * step;
        float deepening = (float) (((double) z1 - z0) * inverse);
        boolean front = z0 == Strip.IN_FRONT;
        float shift = (float) (0.5 - y0);
        for (int y = from; y < end; y++, left += step) {
            float z = front ? z0 : z0 + (y + shift) * deepening;
            int argb = argb0 == argb1 ? argb0 : Argb.mix(argb0, argb1, (y + 0.5 - y0) * inverse);
            long right = left + thick - 1;
            int first = (int) (left >> BITS);
            int last = (int) (right >> BITS);
            int row = y * strip.width;
            if (first < 0 || last >= strip.width) {
                cutRow(row, first, last, left, right, z, argb);
                continue;
            }
            if (first == last) {
                strip.blend(row + first, z, argb, (int) (thick >> BITS - 8));
                continue;
            }
            strip.blend(row + first, z, argb, (int) (ONE - (left & MASK) >> BITS - 8));
            for (int x = first + 1; x < last; x++) {
                strip.blend(row + x, z, argb, 256);
            }
            strip.blend(row + last, z, argb, (int) ((right & MASK) + 1 >> BITS - 8));
        }
    }

    private void cutRow(int row, int first, int last, long left, long right, float z, int argb) {
        int end = Math.min(strip.width - 1, last);
        for (int x = Math.max(0, first); x <= end; x++) {
            strip.blend(row + x, z, argb, weight(x, left, right));
        }
    }

    /** Share of one pixel, in 256ths, between two places in fixed point of which the second is the last inside. */
    private static int weight(int pixel, long low, long high) {
        long start = Math.max(low, (long) pixel << BITS);
        long end = Math.min(high, ((long) pixel << BITS) + ONE - 1);
        return (int) (end - start + 1 >> BITS - 8);
    }

    private static double cap(double width) {
        return width > 2 ? width / 4 : 0;
    }

    /** Where a line enters a band across its walk. */
    private static double entry(double start, double across, double slope, double bandLow, double bandHigh) {
        if (slope == 0) {
            return across < bandLow || across > bandHigh ? Double.POSITIVE_INFINITY : Double.NEGATIVE_INFINITY;
        }
        return start + ((slope > 0 ? bandLow : bandHigh) - across) / slope;
    }

    private static double exit(double start, double across, double slope, double bandLow, double bandHigh) {
        if (slope == 0) {
            return Double.POSITIVE_INFINITY;
        }
        return start + ((slope > 0 ? bandHigh : bandLow) - across) / slope;
    }
}
