package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;

import org.junit.jupiter.api.Test;

class TrianglePlotterTest {

    private static final int SIZE = 64;
    private static final int WHITE = 0xFFFFFFFF;
    private static final int HALF_BLACK = 0x80000000;

    private final Raster raster = new Raster(SIZE, SIZE);
    private final TrianglePlotter triangles = new TrianglePlotter(new Strip(raster, 0, SIZE));

    TrianglePlotterTest() {
        raster.clear(WHITE);
    }

    @Test
    void aPixelBelongsToTheTriangleThatHoldsItsCentre() {
        triangles.triangle(10, 10, 0, 20, 10, 0, 10, 20, 0, 0xFF000000);
        for (int y = 0; y < SIZE; y++) {
            for (int x = 0; x < SIZE; x++) {
                boolean inside = x >= 10 && y >= 10 && x + 0.5 + y + 0.5 < 30;
                assertEquals(inside ? 0xFF000000 : WHITE, raster.pixel(x, y), x + ", " + y);
            }
        }
    }

    @Test
    void trianglesThatShareEdgesLeaveNoGapAndDrawNoPixelTwice() {
        // Translucent black drawn once gives one grey; drawn twice a darker one; a gap stays white.
        Random random = new Random(11);
        for (int round = 0; round < 40; round++) {
            raster.clear(WHITE);
            double px = 8 + random.nextInt(48 * 4) / 4.0;
            double py = 8 + random.nextInt(48 * 4) / 4.0;
            double[][] rim = {{4, 4}, {30.5, 4}, {60, 4}, {60, 33.5}, {60, 60}, {21.5, 60}, {4, 60}, {4, 40.5}};
            for (int i = 0; i < rim.length; i++) {
                double[] a = rim[i];
                double[] b = rim[(i + 1) % rim.length];
                if (i % 2 == 0) {
                    triangles.triangle(px, py, 0, a[0], a[1], 0, b[0], b[1], 0, HALF_BLACK);
                } else {
                    triangles.triangle(b[0], b[1], 0, a[0], a[1], 0, px, py, 0, HALF_BLACK);
                }
            }
            int once = raster.pixel(5, 5);
            assertEquals(127, once & 255, 1);
            for (int y = 0; y < SIZE; y++) {
                for (int x = 0; x < SIZE; x++) {
                    boolean inside = x >= 4 && x < 60 && y >= 4 && y < 60;
                    assertEquals(inside ? once : WHITE, raster.pixel(x, y), x + ", " + y + " with centre " + px + ", " + py);
                }
            }
        }
    }

    @Test
    void depthIsInterpolatedAndDecides() {
        // Depth = x in the first, 20 in the second: they meet at x = 20.
        triangles.triangle(0, 0, 0, 40, 0, 40, 0, 40, 0, 0xFFFF0000);
        triangles.triangle(0, 0, 20, 40, 0, 20, 0, 40, 20, 0xFF0000FF);
        assertEquals(0xFFFF0000, raster.pixel(18, 5));
        assertEquals(0xFF0000FF, raster.pixel(21, 5));
        assertEquals(10.5f, raster.depth()[5 * SIZE + 10], 1e-4f);
    }

    @Test
    void coloursAreInterpolatedBetweenTheCorners() {
        triangles.triangle(0, 0, 0, 0xFFFF0000, 60, 0, 0, 0xFF00FF00, 0, 60, 0, 0xFF0000FF);
        int argb = raster.pixel(20, 10);
        // Shares at the pixel's centre (20.5, 10.5): green 20.5/60, blue 10.5/60.
        assertEquals(255 * 20.5 / 60, argb >> 8 & 255, 1.5);
        assertEquals(255 * 10.5 / 60, argb & 255, 1.5);
        assertEquals(255 * 29.0 / 60, argb >> 16 & 255, 1.5);
    }

    @Test
    void cornersFarOutsideAreCut() {
        triangles.triangle(-1e7, -1e7, 0, 3e7, -1e7, 0, -1e7, 3e7, 0, 0xFF123456);
        for (int i = 0; i < SIZE * SIZE; i++) {
            assertEquals(0xFF123456, raster.colour()[i], "pixel " + i);
        }
    }

    @Test
    void aTriangleWithoutAreaDrawsNothing() {
        triangles.triangle(3, 3, 0, 30, 30, 0, 50, 50, 0, 0xFF000000);
        assertEquals(WHITE, raster.pixel(20, 20));
    }

    @Test
    void theCutIntoStripsDoesNotShow() {
        draw(triangles);
        int[] whole = raster.colour().clone();
        raster.clear(WHITE);
        draw(new TrianglePlotter(new Strip(raster, 0, 17)));
        draw(new TrianglePlotter(new Strip(raster, 17, SIZE)));
        assertArrayEquals(whole, raster.colour());
    }

    private static void draw(TrianglePlotter plotter) {
        Random random = new Random(5);
        for (int i = 0; i < 100; i++) {
            double[] c = random.doubles(9, -20, 90).toArray();
            plotter.triangle(c[0], c[1], c[2], c[3], c[4], c[5], c[6], c[7], c[8], 0xFF000000 | 0x20507 * i);
        }
    }
}
