package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;

import org.junit.jupiter.api.Test;

class LinePlotterTest {

    private static final int WHITE = 0xFFFFFFFF;
    private static final int BLACK = 0xFF000000;
    private static final int RED = 0xFFFF0000;
    private static final int BLUE = 0xFF0000FF;

    private final Raster raster = new Raster(24, 16);
    private final LinePlotter lines = new LinePlotter(new Strip(raster, 0, 16));

    LinePlotterTest() {
        raster.clear(WHITE);
    }

    @Test
    void aLineOnPixelCentresFillsExactlyTheColumnsWhoseCentresItHolds() {
        lines.line(2.5, 5.5, 0, 9.5, 5.5, 0, 1, BLACK);
        for (int y = 0; y < 16; y++) {
            for (int x = 0; x < 24; x++) {
                assertEquals(y == 5 && x >= 2 && x < 9 ? BLACK : WHITE, raster.pixel(x, y), x + ", " + y);
            }
        }
    }

    @Test
    void aLineBetweenTwoRowsCoversEachByHalf() {
        lines.line(2, 6, 0, 10, 6, 0, 1, BLACK);
        assertEquals(0xFF808080, raster.pixel(5, 5));
        assertEquals(0xFF808080, raster.pixel(5, 6));
        assertEquals(WHITE, raster.pixel(5, 4));
        assertEquals(WHITE, raster.pixel(5, 7));
    }

    @Test
    void theWidthIsMeasuredSquareToTheLine() {
        for (double width : new double[] {1, 1.4, 2, 5}) {
            assertEquals(width, crossCover(2, 8, 22, 8, width), 0.02, "level");
            // A 45 degree line of width w covers w sqrt(2) of each column.
            assertEquals(width * Math.sqrt(2), crossCover(2, -2, 22, 18, width), 0.02, "sloping");
        }
    }

    /** Sum of the cover in the column x = 12: grey levels count as shares; 1/256 rounding in each of some 9 pixels. */
    private double crossCover(double x0, double y0, double x1, double y1, double width) {
        raster.clear(WHITE);
        lines.line(x0, y0, 0, x1, y1, 0, width, BLACK);
        double sum = 0;
        for (int y = 0; y < 16; y++) {
            sum += 1 - (raster.pixel(12, y) & 255) / 255.0;
        }
        return sum;
    }

    @Test
    void theNearerLineWinsInEitherOrder() {
        lines.line(0, 8.5, 5, 24, 8.5, 5, 1, RED);
        lines.line(12.5, 0, 9, 12.5, 16, 9, 1, BLUE);
        assertEquals(RED, raster.pixel(12, 8));
        raster.clear(WHITE);
        lines.line(12.5, 0, 9, 12.5, 16, 9, 1, BLUE);
        lines.line(0, 8.5, 5, 24, 8.5, 5, 1, RED);
        assertEquals(RED, raster.pixel(12, 8));
        assertEquals(BLUE, raster.pixel(12, 3));
    }

    @Test
    void onlyPixelsCoveredByHalfOrMoreHideWhatLiesBehind() {
        // The row above takes 0.3 of the line's cover, its own row 0.7.
        lines.line(0, 8.2, 5, 24, 8.2, 5, 1, BLACK);
        assertEquals(Float.POSITIVE_INFINITY, raster.depth()[7 * 24 + 12]);
        assertEquals(5, raster.depth()[8 * 24 + 12]);
    }

    @Test
    void linesThatCrossInDepthChangeSidesWhereTheyMeet() {
        lines.line(0, 8.5, 0, 24, 8.5, 24, 1, RED);
        lines.line(0, 8.5, 12, 24, 8.5, 12, 1, BLUE);
        assertEquals(RED, raster.pixel(6, 8));
        assertEquals(BLUE, raster.pixel(18, 8));
    }

    @Test
    void aChainLooksLikeOneLine() {
        lines.line(1.2, 3.1, 0, 21.2, 9.7, 0, 1.3, BLACK);
        int[] whole = raster.colour().clone();
        raster.clear(WHITE);
        int pieces = 20;
        for (int i = 0; i < pieces; i++) {
            lines.line(1.2 + i, 3.1 + 0.33 * i, 0, 2.2 + i, 3.43 + 0.33 * i, 0, 1.3, BLACK);
        }
        for (int i = 0; i < whole.length; i++) {
            assertEquals(whole[i] & 255, raster.colour()[i] & 255, 1, "pixel " + i);
        }
    }

    @Test
    void endsFarOutsideAreCutAtTheBorders() {
        double[][] directions = {{1, 0.25}, {0.3, 1}, {1, -0.7}, {-0.2, 1}};
        for (double[] d : directions) {
            raster.clear(WHITE);
            lines.line(12 - 40 * d[0], 8 - 40 * d[1], 0, 12 + 40 * d[0], 8 + 40 * d[1], 0, 1.5, BLACK);
            int[] near = raster.colour().clone();
            assertTrue(count(near) > 10);
            raster.clear(WHITE);
            lines.line(12 - 4e6 * d[0], 8 - 4e6 * d[1], 0, 12 + 4e6 * d[0], 8 + 4e6 * d[1], 0, 1.5, BLACK);
            for (int i = 0; i < near.length; i++) {
                assertEquals(near[i] & 255, raster.colour()[i] & 255, 1, "pixel " + i);
            }
        }
    }

    @Test
    void linesOutsideDrawNothing() {
        lines.line(-5, -9, 0, 40, -3, 0, 2, BLACK);
        lines.line(-9, 2, 0, -3, 15, 0, 2, BLACK);
        lines.line(30, 2, 0, 26, 15, 0, 2, BLACK);
        lines.line(3, 19, 0, 9, 30, 0, 2, BLACK);
        assertEquals(0, count(raster.colour()));
    }

    @Test
    void coloursRunAlongTheLine() {
        lines.line(0, 8.5, 0, RED, 24, 8.5, 0, BLUE, 1);
        int before = 256;
        for (int x = 0; x < 24; x++) {
            int red = raster.pixel(x, 8) >> 16 & 255;
            assertTrue(red < before);
            // Share of the way at the pixel's centre; 1/256 rounding of the mix.
            assertEquals(255 * (1 - (x + 0.5) / 24), red, 1.5);
            before = red;
        }
    }

    @Test
    void theCutIntoStripsDoesNotShow() {
        Random random = new Random(7);
        double[][] ends = new double[200][];
        for (int i = 0; i < ends.length; i++) {
            ends[i] = random.doubles(6, -20, 40).toArray();
        }
        draw(ends, lines);
        int[] whole = raster.colour().clone();
        raster.clear(WHITE);
        for (int[] rows : new int[][] {{0, 5}, {5, 6}, {6, 16}}) {
            draw(ends, new LinePlotter(new Strip(raster, rows[0], rows[1])));
        }
        assertArrayEquals(whole, raster.colour());
    }

    private static void draw(double[][] ends, LinePlotter plotter) {
        for (int i = 0; i < ends.length; i++) {
            double[] e = ends[i];
            plotter.line(e[0], e[1], (float) e[2], e[3], e[4], (float) e[5], 0.5 + i % 5, 0xFF000000 | 0x10203 * i);
        }
    }

    private static int count(int[] pixels) {
        int count = 0;
        for (int pixel : pixels) {
            count += pixel == WHITE ? 0 : 1;
        }
        return count;
    }
}
