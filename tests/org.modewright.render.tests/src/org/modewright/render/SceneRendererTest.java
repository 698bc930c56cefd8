package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;

import org.junit.jupiter.api.Test;

/** Scenes are seen along +Y: 100 pixels for 10 units, x = 0 to 10 from left to right, z = 0 to 10 from bottom to top. */
class SceneRendererTest {

    private static final int SIZE = 100;
    private static final int GROUND = 0xFFFFFFFF;
    private static final int RED = 0xFFFF0000;
    private static final int BLUE = 0xFF0000FF;
    private static final int GREEN = 0xFF00FF00;

    private final Raster raster = new Raster(SIZE, SIZE);
    private final SceneRenderer renderer = new SceneRenderer();
    private final Camera front = new Camera(new double[] {5, 0, 5}, 0, 0, 10, 0);
    private final Theme theme = Theme.light().withBackground(GROUND);
    private final RenderOptions options = new RenderOptions().theme(theme).tripod(false).depthCue(0).lineWidth(1);

    private void render(Scene scene) {
        renderer.render(scene, front, null, 0, options, raster);
    }

    private boolean contains(int argb) {
        return Arrays.stream(raster.colour(), 0, raster.width() * raster.height()).anyMatch(c -> c == argb);
    }

    @Test
    void anEmptySceneIsTheBackground() {
        render(Scene.builder().build());
        assertTrue(Arrays.stream(raster.colour()).allMatch(c -> c == GROUND));
    }

    @Test
    void theBackgroundRunsFromTopToBottom() {
        options.theme(Theme.light());
        render(Scene.builder().build());
        assertEquals(Theme.light().backgroundTop(), raster.pixel(3, 0));
        assertEquals(Theme.light().backgroundBottom(), raster.pixel(3, SIZE - 1));
    }

    @Test
    void theNearerMemberHidesTheFartherWhicheverComesFirst() {
        for (boolean nearFirst : new boolean[] {true, false}) {
            SceneBuilder b = Scene.builder();
            int first = b.member(0, 0, nearFirst ? -1 : 1, 5.05, 10, nearFirst ? -1 : 1, 5.05, 1);
            int second = b.member(1, 5.05, nearFirst ? 1 : -1, 0, 5.05, nearFirst ? 1 : -1, 10, 1);
            Scene scene = b.build();
            scene.colour(PrimitiveKind.MEMBER, first, nearFirst ? RED : BLUE);
            scene.colour(PrimitiveKind.MEMBER, second, nearFirst ? BLUE : RED);
            render(scene);
            assertEquals(RED, raster.pixel(50, 49));
        }
    }

    @Test
    void theGhostLiesBehindEvenWhereTheStructureMovesAway() {
        SceneBuilder b = Scene.builder();
        int member = b.member(0, 0, 0, 5.05, 10, 0, 5.05, 4);
        Scene scene = b.build();
        scene.colour(PrimitiveKind.MEMBER, member, RED);
        Deformation away = new Deformation(scene);
        away.member(member, new double[] {0, 3, 0, 0, 0, 0, 0, 3, 0, 0, 0, 0});
        renderer.render(scene, front, away, 1, options, raster);
        assertEquals(RED, raster.pixel(50, 49), "moved straight away from the viewer, it still covers its ghost");
        Deformation up = new Deformation(scene);
        up.member(member, new double[] {0, 0, 2, 0, 0, 0, 0, 0, 2, 0, 0, 0});
        renderer.render(scene, front, up, 1, options, raster);
        assertEquals(RED, raster.pixel(50, 29));
        assertEquals(theme.ghost(), raster.pixel(50, 49));
        renderer.render(scene, front, up, 1, options.ghost(false), raster);
        assertEquals(GROUND, raster.pixel(50, 49));
    }

    @Test
    void aKeptGhostLooksLikeAFreshOne() {
        Scene scene = portal();
        Deformation shape = sway(scene);
        renderer.render(scene, front, shape, 1, options, raster);
        renderer.render(scene, front, shape, 2, options, raster);
        int[] second = raster.colour().clone();
        new SceneRenderer().render(scene, front, shape, 2, options, raster);
        assertArrayEquals(raster.colour(), second);
        Camera aside = front.orbit(0.4, 0);
        renderer.render(scene, aside, shape, 2, options, raster);
        int[] turned = raster.colour().clone();
        new SceneRenderer().render(scene, aside, shape, 2, options, raster);
        assertArrayEquals(raster.colour(), turned);
        scene.mark(PrimitiveKind.MEMBER, Mark.HIDDEN, id -> true);
        renderer.render(scene, front, shape, 2, options, raster);
        assertFalse(contains(theme.ghost()), "hidden members have no ghost");
    }

    private static Scene portal() {
        double[] y = {0, 1, 0};
        SceneBuilder b = Scene.builder();
        b.member(0, 2, 0, 1, 2, 0, 8, 6, y, 0.8, 0.8);
        b.member(1, 8, 0, 1, 8, 0, 8, 6, y, 0.8, 0.8);
        b.member(2, 2, 0, 8, 8, 0, 8, 6, y, 0.5, 0.9);
        b.marker(0, b.vertex(2, 0, 1), MarkerShape.PINNED);
        b.marker(1, b.vertex(8, 0, 1), MarkerShape.HELD);
        b.marker(2, b.vertex(2, 0, 8), MarkerShape.NODE);
        b.label(0, b.vertex(8, 0, 8), "Roof");
        return b.build();
    }

    private static Deformation sway(Scene scene) {
        Deformation shape = new Deformation(scene);
        shape.member(0, new double[] {0, 0, 0, 0, 0, 0, 1, 0, 0, 0, 0.05, 0});
        shape.member(1, new double[] {0, 0, 0, 0, 0, 0, 1, 0, 0, 0, 0.05, 0});
        shape.member(2, new double[] {1, 0, 0, 0, 0.05, 0, 1, 0, 0, 0, 0.05, 0});
        return shape;
    }

    @Test
    void everyNumberOfStripsGivesTheSamePicture() {
        Scene scene = portal();
        scene.mark(PrimitiveKind.MEMBER, Mark.SELECTED, id -> id == 1);
        Deformation shape = sway(scene);
        Camera camera = front.orbit(0.5, 0.3).withPerspective(Camera.MILD);
        for (Thickness thickness : Thickness.values()) {
            options.tripod(true).thickness(thickness).strips(1);
            renderer.render(scene, camera, shape, 1, options, raster);
            int[] one = raster.colour().clone();
            for (int strips : new int[] {2, 3, 7}) {
                renderer.render(scene, camera, shape, 1, options.strips(strips), raster);
                assertArrayEquals(one, raster.colour(), thickness + " in " + strips + " strips");
            }
        }
    }

    @Test
    void aSectionIsDrawnWithItsSizes() {
        SceneBuilder b = Scene.builder();
        b.member(0, 0, 0, 5, 10, 0, 5, 1, new double[] {0, 1, 0}, 1, 3);
        Scene scene = b.build();
        scene.colour(PrimitiveKind.MEMBER, 0, RED);
        render(scene);
        // Depth 3 units = 30 pixels about row 50; local z is up for local y = Y of a member along X.
        assertNotEquals(GROUND, raster.pixel(50, 36));
        assertNotEquals(GROUND, raster.pixel(50, 63));
        assertEquals(GROUND, raster.pixel(50, 32));
        assertEquals(GROUND, raster.pixel(50, 67));
        assertEquals(-0.5f, raster.depth()[50 * SIZE + 50], 1e-5f, "its near face is seen, half its width before its axis");
        render(scene, Thickness.LINES);
        assertEquals(GROUND, raster.pixel(50, 40));
    }

    @Test
    void aSectionTwistsWithItsMember() {
        SceneBuilder b = Scene.builder();
        b.member(0, 0, 0, 5, 10, 0, 5, 2, new double[] {0, 1, 0}, 1, 3);
        Scene scene = b.build();
        Deformation quarterTurn = new Deformation(scene);
        quarterTurn.member(0, new double[] {0, 0, 0, Math.PI / 2, 0, 0, 0, 0, 0, Math.PI / 2, 0, 0});
        renderer.render(scene, front, quarterTurn, 1, options.ghost(false), raster);
        assertNotEquals(GROUND, raster.pixel(50, 46));
        assertEquals(GROUND, raster.pixel(50, 43), "the flat side, 10 pixels high, is seen now");
        assertEquals(-1.5f, raster.depth()[50 * SIZE + 50], 1e-5f);
        renderer.render(scene, front, quarterTurn, 0.5, options, raster);
        // An eighth of a turn: half height = (1 + 3) / 2 * sin 45 degrees = 1.41 units.
        assertNotEquals(GROUND, raster.pixel(50, 37));
        assertEquals(GROUND, raster.pixel(50, 33));
    }

    private void render(Scene scene, Thickness thickness) {
        renderer.render(scene, front, null, 0, options.thickness(thickness), raster);
    }

    @Test
    void facesAreShadedByTheirSlope() {
        SceneBuilder b = Scene.builder();
        b.member(0, 2, 0, 5, 8, 0, 5, 1, new double[] {0, 1, 0}, 3, 3);
        Scene scene = b.build();
        scene.colour(PrimitiveKind.MEMBER, 0, RED);
        renderer.render(scene, front.orbit(0, 0.6), null, 0, options, raster);
        long shades = Arrays.stream(raster.colour()).filter(c -> (c & 0xFFFF) == 0 && (c >> 16 & 255) > 120).distinct().count();
        assertTrue(shades >= 2, "top and front differ");
    }

    @Test
    void selectedHoveredAndMutedMembersLookDifferent() {
        SceneBuilder b = Scene.builder();
        b.member(4, 0, 0, 5.05, 10, 0, 5.05, 2);
        Scene scene = b.build();
        scene.colour(PrimitiveKind.MEMBER, 0, RED);
        scene.mark(PrimitiveKind.MEMBER, Mark.SELECTED, id -> id == 4);
        render(scene);
        assertEquals(RED, raster.pixel(50, 49));
        assertEquals(theme.selection(), raster.pixel(50, 47), "outlined above");
        assertEquals(theme.selection(), raster.pixel(50, 51), "outlined below");
        scene.clear(Mark.SELECTED);
        scene.mark(PrimitiveKind.MEMBER, Mark.HOVERED, id -> id == 4);
        render(scene);
        assertEquals(theme.hover(), raster.pixel(50, 47));
        scene.clear(Mark.HOVERED);
        scene.mark(PrimitiveKind.MEMBER, Mark.MUTED, id -> id == 4);
        render(scene);
        assertTrue((raster.pixel(50, 49) & 255) > 150, "paled");
        scene.mark(PrimitiveKind.MEMBER, Mark.HIDDEN, id -> id == 4);
        render(scene);
        assertEquals(GROUND, raster.pixel(50, 49));
    }

    @Test
    void aSelectedMemberShinesThroughWhatHidesIt() {
        SceneBuilder b = Scene.builder();
        b.member(1, 0, 1, 5.05, 10, 1, 5.05, 1);
        panel(b, 2, -1, RED);
        Scene scene = b.build();
        render(scene);
        int plain = raster.pixel(50, 49);
        scene.mark(PrimitiveKind.MEMBER, Mark.SELECTED, id -> true);
        render(scene);
        assertNotEquals(plain, raster.pixel(50, 49));
        assertEquals(plain, raster.pixel(50, 30), "but the panel stays");
    }

    /** A square panel of two triangles over the whole picture at a depth. */
    private static void panel(SceneBuilder b, int id, double y, int argb) {
        int v0 = b.vertex(0, y, 0);
        int v1 = b.vertex(10, y, 0);
        int v2 = b.vertex(10, y, 10);
        int v3 = b.vertex(0, y, 10);
        b.triangle(id, v0, v1, v2, argb);
        b.triangle(id, v0, v2, v3, argb);
    }

    @Test
    void panelsHideWhatIsBehindThemAndLeaveNoSeam() {
        SceneBuilder b = Scene.builder();
        b.member(0, 0, 1, 5, 10, 1, 5, 1);
        panel(b, 1, 0, GREEN);
        render(b.build());
        int shade = raster.pixel(10, 10);
        assertTrue((shade & 0xFF00FF) == 0 && (shade >> 8 & 255) > 150);
        assertTrue(Arrays.stream(raster.colour()).allMatch(c -> c == shade));
    }

    @Test
    void translucentPanelsAreMixedFarthestFirst() {
        for (boolean nearFirst : new boolean[] {true, false}) {
            SceneBuilder b = Scene.builder();
            panel(b, 0, nearFirst ? -1 : 1, nearFirst ? 0x80FF0000 : 0x800000FF);
            panel(b, 1, nearFirst ? 1 : -1, nearFirst ? 0x800000FF : 0x80FF0000);
            render(b.build());
            int argb = raster.pixel(30, 60);
            assertTrue((argb >> 16 & 255) > (argb & 255), "the near red one lies on top: " + Integer.toHexString(argb));
        }
    }

    @Test
    void membersAreCutAtTheNearPlane() {
        Camera camera = front.withPerspective(Camera.MILD);
        double distance = 5 / Math.tan(Camera.MILD / 2);
        SceneBuilder b = Scene.builder();
        b.member(0, 5.05, 20, 4, 5.05, -3 * distance, 4, 1);
        Scene scene = b.build();
        scene.colour(PrimitiveKind.MEMBER, 0, RED);
        renderer.render(scene, camera, null, 0, options, raster);
        // The line runs 1 below and 0.05 beside the eye's axis towards the viewer. In row 90 it is seen 40.5 pixels below the middle,
        // so w = 10 / 40.5 and it stands 0.5 / w = 2.0 pixels beside the middle.
        assertTrue(contains(RED));
        assertNotEquals(GROUND, raster.pixel(52, 90));
        for (int y = 0; y < 50; y++) {
            for (int x = 0; x < SIZE; x++) {
                assertEquals(GROUND, raster.pixel(x, y), "nothing is folded over from behind the viewer");
            }
        }
    }

    @Test
    void panelsAreCutAtTheNearPlane() {
        Camera camera = front.withPerspective(Camera.MILD);
        double distance = 5 / Math.tan(Camera.MILD / 2);
        SceneBuilder b = Scene.builder();
        int v0 = b.vertex(-100, 50, 2);
        int v1 = b.vertex(110, 50, 2);
        int v2 = b.vertex(5, -5 * distance, 2);
        b.triangle(0, v0, v1, v2, GREEN);
        renderer.render(b.build(), camera, null, 0, options, raster);
        assertEquals(0, raster.pixel(50, 95) & 0xFF, "the floor below the eye");
        assertEquals(GROUND, raster.pixel(50, 20), "no floor above the eye");
    }

    @Test
    void aBentMemberFollowsItsShapeFunctions() {
        SceneBuilder b = Scene.builder();
        int member = b.member(0, 0, 0, 5, 10, 0, 5, 8);
        Scene scene = b.build();
        Deformation shape = new Deformation(scene);
        shape.member(member, new double[] {0, 0, 0, 0, 0, 0, 0, 0, 1, 0, -0.15, 0});
        renderer.render(scene, front, shape, 3, options.ghost(false), raster);
        for (int v = 0; v <= 8; v++) {
            double xi = v / 8.0;
            double[] screen = renderer.screen(scene.firstVertex(member) + v);
            // Single precision of pixels below 100.
            assertEquals(50 - 10 * 3 * xi * xi * (3 - xi) / 2, screen[1], 1e-4);
            assertEquals(100 * xi, screen[0], 1e-4);
            if (v < 8) {
                assertNotEquals(GROUND, raster.pixel((int) screen[0], (int) screen[1]), "drawn at vertex " + v);
            }
        }
        assertEquals(GROUND, raster.pixel(50, 35), "not along the chord");
    }

    @Test
    void valuesColourMembersThroughTheRamp() {
        SceneBuilder b = Scene.builder();
        b.member(0, 0, 0, 2.05, 10, 0, 2.05, 1);
        b.member(1, 0, 0, 5.05, 10, 0, 5.05, 1);
        b.member(2, 0, 0, 8.05, 10, 0, 8.05, 1);
        Scene scene = b.build();
        ColourRamp ramp = ColourRamp.energy();
        scene.colourByScalar(PrimitiveKind.MEMBER, new double[] {0, 4, Double.NaN}, ramp, 0, 4);
        render(scene);
        assertEquals(ramp.argb(0), raster.pixel(50, 79));
        assertEquals(ramp.argb(1), raster.pixel(50, 49));
        assertTrue(contains(theme.member()));
        assertThrows(IllegalArgumentException.class, () -> scene.colourByScalar(PrimitiveKind.MEMBER, new double[2], ramp, 0, 1));
    }

    @Test
    void valuesAtVerticesShadeAMemberAlongItsLength() {
        SceneBuilder b = Scene.builder();
        b.member(0, 0, 0, 5.05, 10, 0, 5.05, 4);
        Scene scene = b.build();
        scene.colourVertices(new float[] {0, 1, 2, 3, 4}, ColourRamp.energy(), 0, 4);
        render(scene);
        double left = Oklch.lab(raster.pixel(5, 49))[0];
        double right = Oklch.lab(raster.pixel(95, 49))[0];
        assertTrue(left > right + 0.3);
    }

    @Test
    void farMembersFade() {
        SceneBuilder b = Scene.builder();
        b.member(0, 0, -4, 2.05, 10, -4, 2.05, 1);
        b.member(1, 0, 4, 8.05, 10, 4, 8.05, 1);
        renderer.render(b.build(), front, null, 0, options.depthCue(0.5), raster);
        assertTrue((raster.pixel(50, 19) & 255) > (raster.pixel(50, 79) & 255) + 40);
    }

    @Test
    void markersLabelsAndTripodCanBeSwitchedOff() {
        SceneBuilder b = Scene.builder();
        int v = b.vertex(5.05, 0, 5.05);
        b.member(0, 0, 0, 0, 10, 0, 10, 1);
        b.marker(0, v, MarkerShape.NODE);
        b.label(0, v, "A1");
        Scene scene = b.build();
        scene.mark(PrimitiveKind.MEMBER, Mark.HIDDEN, id -> true);
        render(scene);
        assertEquals(theme.node(), raster.pixel(50, 49));
        renderer.render(scene, front, null, 0, options.markers(false), raster);
        assertNotEquals(theme.node(), raster.pixel(50, 49));
        assertTrue(contains(theme.text()));
        renderer.render(scene, front, null, 0, options.labels(false).tripod(true), raster);
        assertTrue(contains(DirectionColours.X) && contains(DirectionColours.Z));
        renderer.render(scene, front, null, 0, options.tripod(false), raster);
        assertTrue(Arrays.stream(raster.colour()).allMatch(c -> c == GROUND));
    }

    @Test
    void ofTwoLabelsAtOnePlaceTheFirstIsDrawn() {
        SceneBuilder b = Scene.builder();
        b.vertex(0, 0, 0);
        b.vertex(10, 0, 10);
        b.label(0, b.vertex(3, -1, 5), "Level 1");
        b.label(1, b.vertex(3, 1, 5), "Level 2");
        Scene scene = b.build();
        scene.colour(PrimitiveKind.LABEL, 0, RED);
        scene.colour(PrimitiveKind.LABEL, 1, BLUE);
        render(scene);
        assertTrue(contains(RED));
        assertFalse(contains(BLUE));
    }

    @Test
    void aLabelThatWouldRunOutOnTheRightStandsOnTheLeft() {
        SceneBuilder b = Scene.builder();
        b.vertex(0, 0, 0);
        b.label(0, b.vertex(9.5, 0, 5), "Roof");
        Scene scene = b.build();
        scene.colour(PrimitiveKind.LABEL, 0, RED);
        render(scene);
        assertTrue(contains(RED));
        for (int y = 0; y < SIZE; y++) {
            assertNotEquals(RED, raster.pixel(97, y));
        }
    }

    @Test
    void aStructureFarFromTheOriginIsDrawnAsSharply() {
        SceneBuilder near = Scene.builder();
        near.member(0, 1, 0, 1, 9, 0, 8.5, 3);
        SceneBuilder far = Scene.builder();
        far.member(0, 4_000_001, 500_000, 1, 4_000_009, 500_000, 8.5, 3);
        render(near.build());
        int[] expected = raster.colour().clone();
        Camera camera = new Camera(new double[] {4_000_005, 500_000, 5}, 0, 0, 10, 0);
        renderer.render(far.build(), camera, null, 0, options, raster);
        assertArrayEquals(expected, raster.colour());
    }

    @Test
    void resizingTheRasterIsFollowed() {
        Scene scene = portal();
        render(scene);
        raster.resize(60, 40);
        render(scene);
        Raster fresh = new Raster(60, 40);
        new SceneRenderer().render(scene, front, null, 0, options, fresh);
        assertArrayEquals(fresh.colour(), Arrays.copyOf(raster.colour(), 60 * 40));
    }

    @Test
    void theStillHasTheWantedSizeAndTheSameContent() {
        SceneBuilder b = Scene.builder();
        panel(b, 1, 0, GREEN);
        Raster still = StillImage.render(b.build(), front, null, 0, options, 80, 50);
        assertEquals(80, still.width());
        assertEquals(50, still.height());
        assertEquals(0, still.pixel(40, 25) & 0xFF00FF);
    }

    @Test
    void aDeformationOfAnotherSceneIsRefused() {
        Scene scene = portal();
        Deformation other = new Deformation(portal());
        assertThrows(IllegalArgumentException.class, () -> renderer.render(scene, front, other, 1, options, raster));
    }

    @Test
    void impossibleGeometryIsRefused() {
        SceneBuilder b = Scene.builder();
        assertThrows(IllegalArgumentException.class, () -> b.vertex(0, Double.NaN, 0));
        assertThrows(IllegalArgumentException.class, () -> b.marker(0, 3, MarkerShape.NODE));
        assertThrows(IllegalArgumentException.class, () -> b.member(0, 0, 0, 0, 1, 0, 0, 0));
        assertThrows(IllegalArgumentException.class, () -> b.line(0, 1, 2, 3, 4));
        assertThrows(IllegalArgumentException.class, () -> new Raster(0, 5));
    }
}
