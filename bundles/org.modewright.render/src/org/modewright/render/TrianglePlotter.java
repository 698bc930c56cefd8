package org.modewright.render;

/**
 * Filled triangles. Corners are rounded to 1/256 pixel and a pixel belongs to the triangle that holds its centre, a centre on an edge to
 * the triangle on the right of or below that edge: triangles that share an edge leave no gap and draw no pixel twice. Depth and colour
 * are linear over the picture.
 */
final class TrianglePlotter {

    private static final int SUBPIXELS = 256;
    private static final double GUARD = 1 << 20;
    private static final double RIM = 8;

    private final Strip strip;
    private final double[] clipped = new double[3 * 8];
    private final double[] spare = new double[3 * 8];

    TrianglePlotter(Strip strip) {
        this.strip = strip;
    }

    /** One colour; with an alpha below 255 the triangle is blended over what lies behind it and hides nothing. */
    void triangle(double x0, double y0, double z0, double x1, double y1, double z1, double x2, double y2, double z2, int argb) {
        triangle(x0, y0, z0, argb, x1, y1, z1, argb, x2, y2, z2, argb);
    }

    void triangle(double x0, double y0, double z0, int argb0, double x1, double y1, double z1, int argb1, double x2, double y2, double z2,
        int argb2) {
        if (outside(y0, y1, y2, strip.firstRow, strip.endRow) || outside(x0, x1, x2, 0, strip.width)) {
            return;
        }
        if (large(x0) || large(y0) || large(x1) || large(y1) || large(x2) || large(y2)) {
            clipped(new double[] {x0, y0, z0, x1, y1, z1, x2, y2, z2}, argb0);
            return;
        }
        fill(x0, y0, z0, argb0, x1, y1, z1, argb1, x2, y2, z2, argb2);
    }

    private static boolean outside(double a, double b, double c, double low, double high) {
        return Math.max(a, Math.max(b, c)) < low || Math.min(a, Math.min(b, c)) > high;
    }

    private static boolean large(double value) {
        return Math.abs(value) > GUARD;
    }

    private void fill(double x0, double y0, double z0, int argb0, double x1, double y1, double z1, int argb1, double x2, double y2,
        double z2, int argb2) {
        long ax = Math.round(x0 * SUBPIXELS);
        long ay = Math.round(y0 * SUBPIXELS);
        long bx = Math.round(x1 * SUBPIXELS);
        long by = Math.round(y1 * SUBPIXELS);
        long cx = Math.round(x2 * SUBPIXELS);
        long cy = Math.round(y2 * SUBPIXELS);
        long area = (bx - ax) * (cy - ay) - (cx - ax) * (by - ay);
        if (area > 0) {
            fill(ax, ay, z0, argb0, bx, by, z1, argb1, cx, cy, z2, argb2, area);
        } else if (area < 0) {
            fill(ax, ay, z0, argb0, cx, cy, z2, argb2, bx, by, z1, argb1, -area);
        }
    }

    private void fill(long ax, long ay, double az, int a, long bx, long by, double bz, int b, long cx, long cy, double cz, int c,
        long area) {
        int left = (int) Math.max(0, Math.min(ax, Math.min(bx, cx)) / SUBPIXELS - 1);
        int right = (int) Math.min(strip.width - 1, Math.max(ax, Math.max(bx, cx)) / SUBPIXELS + 1);
        int top = (int) Math.max(strip.firstRow, Math.min(ay, Math.min(by, cy)) / SUBPIXELS - 1);
        int bottom = (int) Math.min(strip.endRow - 1, Math.max(ay, Math.max(by, cy)) / SUBPIXELS + 1);
        long stepA = -(cy - by) * SUBPIXELS;
        long stepB = -(ay - cy) * SUBPIXELS;
        long stepC = -(by - ay) * SUBPIXELS;
        double perArea = 1.0 / area;
        double deepening = (stepA * az + stepB * bz + stepC * cz) * perArea;
        boolean flat = a == b && b == c;
        for (int y = top; y <= bottom; y++) {
            long py = (long) y * SUBPIXELS + SUBPIXELS / 2;
            long px = (long) left * SUBPIXELS + SUBPIXELS / 2;
            long wa = edge(bx, by, cx, cy, px, py);
            long wb = edge(cx, cy, ax, ay, px, py);
            long wc = edge(ax, ay, bx, by, px, py);
            double rowDepth = (wa * az + wb * bz + wc * cz) * perArea;
            long ea = wa - open(bx, by, cx, cy);
            long eb = wb - open(cx, cy, ax, ay);
            long ec = wc - open(ax, ay, bx, by);
            int index = y * strip.width + left;
            for (int x = left; x <= right; x++, index++) {
                if ((ea | eb | ec) >= 0) {
                    int argb = flat ? a : mixed(a, b, c, ea * perArea, eb * perArea);
                    plot(index, (float) (rowDepth + (x - left) * deepening), argb);
                }
                ea += stepA;
                eb += stepB;
                ec += stepC;
            }
        }
    }

    private void plot(int index, float z, int argb) {
        if (z > strip.depth[index]) {
            return;
        }
        int alpha = argb >>> 24;
        if (alpha == 255) {
            strip.colour[index] = argb;
            strip.depth[index] = z;
        } else {
            strip.colour[index] = Argb.mix256(strip.colour[index], argb | 0xFF000000, alpha * 256 / 255);
        }
    }

    private static long edge(long ax, long ay, long bx, long by, long px, long py) {
        return (bx - ax) * (py - ay) - (by - ay) * (px - ax);
    }

    /** 0 for an edge whose centres belong to the triangle (top and left edges), else 1. */
    private static long open(long ax, long ay, long bx, long by) {
        return by < ay || by == ay && bx > ax ? 0 : 1;
    }

    private static int mixed(int a, int b, int c, double shareA, double shareB) {
        int result = 0;
        for (int shift = 0; shift < 32; shift += 8) {
            double v = shareA * (a >>> shift & 255) + shareB * (b >>> shift & 255) + (1 - shareA - shareB) * (c >>> shift & 255);
            result |= (int) Math.max(0, Math.min(255, v + 0.5)) << shift;
        }
        return result;
    }

    /** A triangle that reaches far out is first cut to the picture with a rim, in which its edges stay exact enough. */
    private void clipped(double[] corners, int argb) {
        System.arraycopy(corners, 0, clipped, 0, corners.length);
        int count = 3;
        count = cut(count, 0, -RIM, 1);
        count = cut(count, 0, strip.width + RIM, -1);
        count = cut(count, 1, strip.firstRow - RIM, 1);
        count = cut(count, 1, strip.endRow + RIM, -1);
        for (int i = 1; i + 1 < count; i++) {
            fill(clipped[0], clipped[1], clipped[2], argb, clipped[3 * i], clipped[3 * i + 1], clipped[3 * i + 2], argb,
                clipped[3 * i + 3], clipped[3 * i + 4], clipped[3 * i + 5], argb);
        }
    }

    private int cut(int count, int axis, double limit, int sign) {
        int kept = 0;
        for (int i = 0; i < count; i++) {
            int j = (i + 1) % count;
            double here = sign * (clipped[3 * i + axis] - limit);
            double next = sign * (clipped[3 * j + axis] - limit);
            if (here >= 0) {
                System.arraycopy(clipped, 3 * i, spare, 3 * kept++, 3);
            }
            if (here >= 0 != next >= 0) {
                double t = here / (here - next);
                for (int k = 0; k < 3; k++) {
                    spare[3 * kept + k] = clipped[3 * i + k] + t * (clipped[3 * j + k] - clipped[3 * i + k]);
                }
                kept++;
            }
        }
        System.arraycopy(spare, 0, clipped, 0, 3 * kept);
        return kept;
    }
}
