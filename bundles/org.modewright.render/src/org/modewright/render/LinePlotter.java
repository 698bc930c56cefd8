package org.modewright.render;

/**
 * Straight lines with a width in pixels. A line is walked along its longer direction; in each column (or row) the pixels take the share of their height (or
 * width) that the line covers, which is exact but for the ends. Columns count from the first whose centre lies in [start, end), so that
 * the pieces of a chain meet without a gap and without a doubled pixel.
 *
 * <p>Ends far outside the picture are harmless: only what lies inside is walked.
 */
final class LinePlotter {

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
        double deepening = ((double) z1 - z0) * inverse;
        double half = width / 2 * Math.sqrt(1 + slope * slope);
        double cap = cap(width);
        double low = Math.max(x0 - cap, 0);
        double high = Math.min(x1 + cap, strip.width);
        if (Math.min(y0, y1) - half < strip.firstRow || Math.max(y0, y1) + half > strip.endRow) {
            low = Math.max(low, entry(x0, y0, slope, strip.firstRow - half - 1, strip.endRow + half + 1));
            high = Math.min(high, exit(x0, y0, slope, strip.firstRow - half - 1, strip.endRow + half + 1));
        }
        int end = (int) Math.ceil(high - 0.5);
        for (int x = (int) Math.ceil(low - 0.5); x < end; x++) {
            double along = x + 0.5 - x0;
            double top = y0 + along * slope - half;
            double bottom = top + 2 * half;
            float z = z0 == Strip.IN_FRONT ? z0 : (float) (z0 + along * deepening);
            int argb = argb0 == argb1 ? argb0 : Argb.mix(argb0, argb1, along * inverse);
            int first = Math.max(strip.firstRow, (int) Math.floor(top));
            int last = Math.min(strip.endRow, (int) Math.ceil(bottom));
            for (int y = first, index = first * strip.width + x; y < last; y++, index += strip.width) {
                strip.plot(index, z, argb, Math.min(bottom, y + 1) - Math.max(top, y));
            }
        }
    }

    private void rows(double x0, double y0, float z0, int argb0, double x1, double y1, float z1, int argb1, double width) {
        double inverse = 1 / (y1 - y0);
        double slope = (x1 - x0) * inverse;
        double deepening = ((double) z1 - z0) * inverse;
        double half = width / 2 * Math.sqrt(1 + slope * slope);
        double cap = cap(width);
        double low = Math.max(y0 - cap, strip.firstRow);
        double high = Math.min(y1 + cap, strip.endRow);
        if (Math.min(x0, x1) - half < 0 || Math.max(x0, x1) + half > strip.width) {
            low = Math.max(low, entry(y0, x0, slope, -half - 1, strip.width + half + 1));
            high = Math.min(high, exit(y0, x0, slope, -half - 1, strip.width + half + 1));
        }
        int end = (int) Math.ceil(high - 0.5);
        for (int y = (int) Math.ceil(low - 0.5); y < end; y++) {
            double along = y + 0.5 - y0;
            double left = x0 + along * slope - half;
            double right = left + 2 * half;
            float z = z0 == Strip.IN_FRONT ? z0 : (float) (z0 + along * deepening);
            int argb = argb0 == argb1 ? argb0 : Argb.mix(argb0, argb1, along * inverse);
            int first = Math.max(0, (int) Math.floor(left));
            int last = Math.min(strip.width, (int) Math.ceil(right));
            for (int x = first, index = y * strip.width + first; x < last; x++, index++) {
                strip.plot(index, z, argb, Math.min(right, x + 1) - Math.max(left, x));
            }
        }
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
