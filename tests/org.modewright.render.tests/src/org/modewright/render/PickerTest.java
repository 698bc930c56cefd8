package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import org.junit.jupiter.api.Test;

/** Seen along +Y as in {@link SceneRendererTest}: 10 pixels a unit. */
class PickerTest {

    private final Raster raster = new Raster(100, 100);
    private final SceneRenderer renderer = new SceneRenderer();
    private final Camera front = new Camera(new double[] {5, 0, 5}, 0, 0, 10, 0);
    private final RenderOptions options = new RenderOptions();

    private Pick pick(Scene scene, double x, double y, double tolerance) {
        renderer.render(scene, front, null, 0, options, raster);
        return renderer.pick(x, y, tolerance);
    }

    @Test
    void nothingIsFoundBeforeTheFirstFrame() {
        assertNull(renderer.pick(1, 1, 100));
        assertEquals(0, renderer.pickRectangle(PrimitiveKind.MEMBER, 0, 0, 100, 100, true).length);
    }

    @Test
    void aMemberIsFoundWithinTheToleranceOnly() {
        SceneBuilder b = Scene.builder();
        b.member(7, 0, 0, 5, 10, 0, 5, 4);
        Scene scene = b.build();
        Pick hit = pick(scene, 25, 53, 4);
        assertEquals(PrimitiveKind.MEMBER, hit.kind());
        assertEquals(7, hit.id());
        assertEquals(0.25, hit.along(), 1e-6);
        assertEquals(3 - options.lineWidth() / 2, hit.distance(), 1e-4);
        assertNull(pick(scene, 25, 57, 4));
        assertNull(pick(scene, 25, 53, 1));
    }

    @Test
    void ofTwoMembersUnderThePointerTheNearerToTheViewerIsFound() {
        SceneBuilder b = Scene.builder();
        b.member(1, 0, 2, 0, 10, 2, 10, 1);
        b.member(2, 0, -2, 10, 10, -2, 0, 1);
        assertEquals(2, pick(b.build(), 50, 50, 4).id());
    }

    @Test
    void ofTwoMembersBesideThePointerTheCloserIsFound() {
        SceneBuilder b = Scene.builder();
        b.member(1, 0, 2, 5.3, 10, 2, 5.3, 1);
        b.member(2, 0, -2, 4.3, 10, -2, 4.3, 1);
        assertEquals(1, pick(b.build(), 50, 50, 9).id());
    }

    @Test
    void aSectionIsFoundAllOverItsThickness() {
        SceneBuilder b = Scene.builder();
        b.member(1, 0, 0, 5, 10, 0, 5, 1, new double[] {0, 1, 0}, 2, 2);
        Scene scene = b.build();
        assertEquals(0, pick(scene, 50, 58, 0).distance(), 0);
        options.thickness(Thickness.LINES);
        assertNull(pick(scene, 50, 58, 2));
    }

    @Test
    void aNodeWinsOverTheMembersThatMeetInIt() {
        SceneBuilder b = Scene.builder();
        b.member(1, 0, 0, 5, 5, 0, 5, 1);
        b.member(2, 5, 0, 5, 10, 0, 5, 1);
        b.marker(33, b.vertex(5, 0, 5), MarkerShape.NODE);
        Scene scene = b.build();
        Pick hit = pick(scene, 52, 51, 3);
        assertEquals(PrimitiveKind.MARKER, hit.kind());
        assertEquals(33, hit.id());
        assertEquals(PrimitiveKind.MEMBER, pick(scene, 70, 51, 3).kind());
        options.markers(false);
        assertEquals(PrimitiveKind.MEMBER, pick(scene, 52, 51, 3).kind());
    }

    @Test
    void anOpaquePanelHidesAndATranslucentOneDoesNot() {
        for (int argb : new int[] {0xFF00FF00, 0x6000FF00}) {
            SceneBuilder b = Scene.builder();
            b.member(1, 0, 2, 5, 10, 2, 5, 1);
            b.triangle(5, b.vertex(0, -1, 0), b.vertex(10, -1, 0), b.vertex(5, -1, 10), argb);
            Pick hit = pick(b.build(), 50, 50, 3);
            assertEquals(argb == 0x6000FF00 ? PrimitiveKind.MEMBER : PrimitiveKind.TRIANGLE, hit.kind());
        }
    }

    @Test
    void theDepthFoundLeadsBackToThePoint() {
        SceneBuilder b = Scene.builder();
        b.triangle(5, b.vertex(0, 3, 0), b.vertex(10, 3, 0), b.vertex(5, 3, 10), 0);
        Pick hit = pick(b.build(), 50, 60, 0);
        double[] point = front.projection(100, 100).unproject(50, 60, hit.depth());
        assertArrayEquals(new double[] {5, 3, 4}, point, 1e-5);
    }

    @Test
    void hiddenAndUnpickableThingsAreNotFound() {
        SceneBuilder b = Scene.builder();
        b.member(1, 0, 0, 5, 10, 0, 5, 1);
        b.line(-1, 0, 0, 2, 10, 0, 2);
        Scene scene = b.build();
        assertNull(pick(scene, 50, 80, 3));
        scene.mark(PrimitiveKind.MEMBER, Mark.HIDDEN, id -> id == 1);
        assertNull(pick(scene, 50, 50, 3));
    }

    @Test
    void theDeformedShapeIsWhatIsPicked() {
        SceneBuilder b = Scene.builder();
        b.member(1, 0, 0, 2, 10, 0, 2, 4);
        Scene scene = b.build();
        Deformation up = new Deformation(scene);
        up.member(0, new double[] {0, 0, 1, 0, 0, 0, 0, 0, 1, 0, 0, 0});
        renderer.render(scene, front, up, 5, options, raster);
        assertEquals(1, renderer.pick(50, 30, 2).id());
        assertNull(renderer.pick(50, 80, 2), "the ghost is not picked");
    }

    @Test
    void aRectangleFindsWhatLiesInsideOrCrosses() {
        SceneBuilder b = Scene.builder();
        b.member(3, 1, 0, 5, 3, 0, 5, 2);
        b.member(2, 2, 0, 5, 9, 0, 5, 2);
        b.member(8, 0, 0, 1, 9, 0, 1, 2);
        b.member(3, 1, 0, 6, 3, 0, 6, 2);
        b.marker(4, b.vertex(2, 0, 5), MarkerShape.NODE);
        renderer.render(b.build(), front, null, 0, options, raster);
        assertArrayEquals(new int[] {3}, renderer.pickRectangle(PrimitiveKind.MEMBER, 5, 30, 40, 60, false));
        assertArrayEquals(new int[] {2, 3}, renderer.pickRectangle(PrimitiveKind.MEMBER, 40, 60, 5, 30, true));
        assertArrayEquals(new int[] {2}, renderer.pickRectangle(PrimitiveKind.MEMBER, 50, 40, 55, 60, true),
            "crossing without a vertex inside");
        assertArrayEquals(new int[] {4}, renderer.pickRectangle(PrimitiveKind.MARKER, 5, 30, 40, 60, false));
    }
}
