package org.modewright.render;

import java.util.stream.IntStream;

/**
 * Draws scenes into rasters and finds what lies under the pointer in the last frame. Keeps its arrays from frame to frame, so that an
 * animation allocates next to nothing. Use one renderer for each canvas, from one thread.
 */
public final class SceneRenderer {

    private final Frame frame = new Frame();
    private final StrokeFont font = new StrokeFont();
    private final Picker picker = new Picker(frame);
    private Raster raster;
    private int[] colourArray;
    private StripPainter[] painters = new StripPainter[0];

    /**
     * Draws one frame.
     *
     * @param deformation the shape, made for this scene; null draws the structure at rest
     * @param factor      multiplies the shape's displacements
     * @throws IllegalArgumentException if the deformation belongs to another scene
     */
    public void render(Scene scene, Camera camera, Deformation deformation, double factor, RenderOptions options, Raster target) {
        if (deformation != null && deformation.scene() != scene) {
            throw new IllegalArgumentException("The deformation was made for another scene; compute it anew after the scene was rebuilt.");
        }
        frame.begin(scene, camera, deformation, factor, options, target);
        prepare(target, options.strips());
        int parts = painters.length;
        if (parts == 1) {
            frame.transform(0, 1);
            painters[0].paint();
        } else {
            IntStream.range(0, parts).parallel().forEach(i -> frame.transform(i, parts));
            IntStream.range(0, parts).parallel().forEach(i -> painters[i].paint());
        }
    }

    private void prepare(Raster target, int strips) {
        boolean same = raster == target && colourArray == target.colour() && painters.length == strips
            && painters[0].covers(target.width(), target.height());
        if (same) {
            return;
        }
        raster = target;
        colourArray = target.colour();
        painters = new StripPainter[strips];
        for (int i = 0; i < strips; i++) {
            int from = target.height() * i / strips;
            int to = target.height() * (i + 1) / strips;
            painters[i] = new StripPainter(frame, target, from, to, font);
        }
    }

    /**
     * What lies under a place of the last frame.
     *
     * @param tolerancePixels how far beside a member or marker the place may be
     * @return null if nothing is there, or nothing was drawn yet
     */
    public Pick pick(double x, double y, double tolerancePixels) {
        return frame.scene == null ? null : picker.pick(x, y, tolerancePixels);
    }

    /**
     * The ids of what lies in a rectangle of the last frame, hidden by others or not.
     *
     * @param crossing whether touching is enough; else all of the primitive must lie inside
     * @return ascending, each once
     */
    public int[] pickRectangle(PrimitiveKind kind, double x0, double y0, double x1, double y1, boolean crossing) {
        return frame.scene == null ? new int[0] : picker.rectangle(kind, x0, y0, x1, y1, crossing);
    }

    /** Where a vertex was drawn in the last frame: screen x, y and depth; null if it was behind the viewer. */
    public double[] screen(int vertex) {
        ProjectedScene p = frame.deformed;
        return frame.scene != null && p.visible(vertex) ? new double[] {p.x[vertex], p.y[vertex], p.z[vertex]} : null;
    }
}
