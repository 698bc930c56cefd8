package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class CameraTest {

    private static final int W = 640;
    private static final int H = 480;
    private static final Bounds BOX = new Bounds(100, 200, 0, 124, 212, 18);

    /** Products of a dozen double operations on numbers of some hundreds. */
    private static final double ROUNDING = 1e-9;

    private static Camera[] cameras() {
        Camera c = Camera.standard(StandardView.AXONOMETRIC, BOX, W, H);
        return new Camera[] {c, c.withPerspective(Camera.MILD), c.orbit(2, -0.7).withPerspective(1)};
    }

    private static double[] projected(Camera camera, double x, double y, double z) {
        double[] out = new double[3];
        assertTrue(camera.projection(W, H).project(x, y, z, out));
        return out;
    }

    @Test
    void unprojectUndoesProject() {
        for (Camera camera : cameras()) {
            Projection p = camera.projection(W, H);
            double[] screen = projected(camera, 107, 203, 11);
            assertArrayEquals(new double[] {107, 203, 11}, p.unproject(screen[0], screen[1], screen[2]), ROUNDING);
        }
    }

    @Test
    void theTargetLiesInTheMiddle() {
        for (Camera camera : cameras()) {
            double[] t = camera.target();
            double[] screen = projected(camera, t[0], t[1], t[2]);
            assertArrayEquals(new double[] {W / 2.0, H / 2.0, camera.projection(W, H).targetDepth()}, screen, ROUNDING);
        }
    }

    @Test
    void depthGrowsAwayFromTheViewer() {
        for (Camera camera : cameras()) {
            double[] f = camera.projection(W, H).forward();
            double[] t = camera.target();
            double near = projected(camera, t[0] - f[0], t[1] - f[1], t[2] - f[2])[2];
            double far = projected(camera, t[0] + f[0], t[1] + f[1], t[2] + f[2])[2];
            assertTrue(near < far);
        }
    }

    @Test
    void depthIsLinearInThePicture() {
        for (Camera camera : cameras()) {
            double[] a = projected(camera, 101, 202, 3);
            double[] b = projected(camera, 123, 209, 17);
            // A point of the line, found by its screen place, must have the depth found by the same share.
            double[] m = projected(camera, 101 + 22 * 0.4, 202 + 7 * 0.4, 3 + 14 * 0.4);
            double share = (m[0] - a[0]) / (b[0] - a[0]);
            assertEquals(a[2] + share * (b[2] - a[2]), m[2], ROUNDING);
        }
    }

    @Test
    void standardViewsLookAlongTheirAxes() {
        checkView(StandardView.PLAN, "right", "up", "towards");
        checkView(StandardView.ALONG_PLUS_Y, "right", "away", "up");
        checkView(StandardView.ALONG_MINUS_Y, "left", "towards", "up");
        checkView(StandardView.ALONG_PLUS_X, "away", "left", "up");
        checkView(StandardView.ALONG_MINUS_X, "towards", "right", "up");
    }

    private static void checkView(StandardView view, String x, String y, String z) {
        Camera camera = Camera.standard(view, BOX, W, H);
        double[] t = camera.target();
        assertEquals(x, direction(camera, t, 1, 0, 0), view + " X");
        assertEquals(y, direction(camera, t, 0, 1, 0), view + " Y");
        assertEquals(z, direction(camera, t, 0, 0, 1), view + " Z");
    }

    private static String direction(Camera camera, double[] t, double dx, double dy, double dz) {
        double[] from = projected(camera, t[0], t[1], t[2]);
        double[] to = projected(camera, t[0] + dx, t[1] + dy, t[2] + dz);
        if (Math.abs(to[0] - from[0]) > 1) {
            return to[0] > from[0] ? "right" : "left";
        }
        if (Math.abs(to[1] - from[1]) > 1) {
            return to[1] < from[1] ? "up" : "down";
        }
        return to[2] > from[2] ? "away" : "towards";
    }

    @Test
    void theAxonometricViewShowsXRightYBackAndZUp() {
        Camera camera = Camera.standard(StandardView.AXONOMETRIC, BOX, W, H);
        double[] t = camera.target();
        double[] o = projected(camera, t[0], t[1], t[2]);
        double[] x = projected(camera, t[0] + 1, t[1], t[2]);
        double[] y = projected(camera, t[0], t[1] + 1, t[2]);
        double[] z = projected(camera, t[0], t[1], t[2] + 1);
        assertTrue(x[0] > o[0] && y[2] > o[2] && z[1] < o[1]);
        assertEquals(o[0], z[0], ROUNDING, "Z stays upright");
    }

    @Test
    void fitShowsTheWholeBoxAndTouchesTheMargin() {
        for (Camera any : cameras()) {
            Camera camera = any.fit(BOX, W, H);
            double[] extent = extent(camera);
            assertTrue(extent[0] >= 0.1 * W - 1e-6 && extent[1] <= 0.9 * W + 1e-6, "across");
            assertTrue(extent[2] >= 0.1 * H - 1e-6 && extent[3] <= 0.9 * H + 1e-6, "upwards");
            double spare = Math.min(extent[0] - 0.1 * W, extent[2] - 0.1 * H);
            assertEquals(0, spare, 1e-6, "as large as the margin allows");
        }
    }

    private static double[] extent(Camera camera) {
        double[] e = {1e9, -1e9, 1e9, -1e9};
        for (int i = 0; i < 8; i++) {
            double[] s = projected(camera, (i & 1) == 0 ? BOX.minX() : BOX.maxX(), (i & 2) == 0 ? BOX.minY() : BOX.maxY(),
                (i & 4) == 0 ? BOX.minZ() : BOX.maxZ());
            e[0] = Math.min(e[0], s[0]);
            e[1] = Math.max(e[1], s[0]);
            e[2] = Math.min(e[2], s[1]);
            e[3] = Math.max(e[3], s[1]);
        }
        return e;
    }

    @Test
    void fitOfASinglePointGivesAUsableCamera() {
        Camera camera = Camera.standard(StandardView.PLAN, new Bounds(1, 2, 3, 1, 2, 3), W, H);
        assertTrue(camera.height() > 0);
    }

    @Test
    void zoomKeepsThePointUnderThePointer() {
        for (Camera camera : cameras()) {
            Projection before = camera.projection(W, H);
            double[] point = before.unproject(123, 77, before.targetDepth());
            Camera zoomed = camera.zoomAt(1.7, 123, 77, W, H);
            double[] after = projected(zoomed, point[0], point[1], point[2]);
            assertEquals(123, after[0], 1e-8);
            assertEquals(77, after[1], 1e-8);
            assertEquals(camera.height() / 1.7, zoomed.height(), ROUNDING);
        }
    }

    @Test
    void panMovesThePictureWithThePointer() {
        for (Camera camera : cameras()) {
            double[] t = camera.target();
            double[] after = projected(camera.pan(30, -12, W, H), t[0], t[1], t[2]);
            assertEquals(W / 2.0 + 30, after[0], 1e-8);
            assertEquals(H / 2.0 - 12, after[1], 1e-8);
        }
    }

    @Test
    void dragToTheRightTurnsTheFrontToTheRight() {
        Camera camera = Camera.standard(StandardView.ALONG_PLUS_Y, BOX, W, H).orbitPixels(20, 0);
        double[] t = camera.target();
        double[] front = projected(camera, t[0], t[1] - 5, t[2]);
        assertTrue(front[0] > W / 2.0);
        Camera down = Camera.standard(StandardView.ALONG_PLUS_Y, BOX, W, H).orbitPixels(0, 20);
        assertTrue(projected(down, t[0], t[1] - 5, t[2])[1] > H / 2.0, "dragged down, the front goes down");
    }

    @Test
    void elevationStopsAtTheTop() {
        Camera camera = Camera.standard(StandardView.AXONOMETRIC, BOX, W, H).orbit(0, 9);
        assertEquals(Math.PI / 2, camera.elevation(), 0);
    }

    @Test
    void transitionsStartAndEndExactlyAndTurnTheShorterWay() {
        Camera from = Camera.standard(StandardView.AXONOMETRIC, BOX, W, H).orbit(Math.toRadians(138), 0);
        Camera to = from.orbit(Math.toRadians(40), 0.3).zoomAt(4, 10, 10, W, H);
        assertEquals(from, from.towards(to, 0));
        assertEquals(to, from.towards(to, 1));
        Camera middle = from.towards(to, 0.5);
        assertEquals(0, Math.IEEEremainder(middle.azimuth() - from.azimuth() - Math.toRadians(20), 2 * Math.PI), ROUNDING);
        assertEquals(from.height() / 2, middle.height(), ROUNDING, "geometric mean of 1 and 1/4");
    }

    @Test
    void whatIsBehindTheViewerIsNotProjected() {
        Camera camera = Camera.standard(StandardView.ALONG_PLUS_Y, BOX, W, H).withPerspective(Camera.MILD);
        double distance = camera.height() / 2 / Math.tan(Camera.MILD / 2);
        double[] t = camera.target();
        assertFalse(camera.projection(W, H).project(t[0], t[1] - 1.01 * distance, t[2], new double[3]));
        assertTrue(camera.projection(W, H).project(t[0], t[1] - 0.9 * distance, t[2], new double[3]));
    }

    @Test
    void impossibleCamerasAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> new Camera(new double[3], 0, 0, 0, 0));
        assertThrows(IllegalArgumentException.class, () -> new Camera(new double[3], 0, 0, 1, 3));
    }
}
