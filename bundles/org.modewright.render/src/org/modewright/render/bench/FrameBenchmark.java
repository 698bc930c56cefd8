package org.modewright.render.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

import org.modewright.render.Bounds;
import org.modewright.render.Camera;
import org.modewright.render.Deformation;
import org.modewright.render.MarkerShape;
import org.modewright.render.Raster;
import org.modewright.render.RenderOptions;
import org.modewright.render.Scene;
import org.modewright.render.SceneBuilder;
import org.modewright.render.SceneRenderer;
import org.modewright.render.StandardView;

/**
 * Times the frames of an animated space frame: a regular grid of columns and beams of four segments each with its ghost, nodes and
 * supports, swaying and twisting, seen by a camera that stands still (as while a mode plays) or walks
 * round (as while it plays and the mouse drags, when the ghost has to be drawn anew in every frame).
 */
public final class FrameBenchmark {

    private static final int SEGMENTS = 4;
    private static final double BAY = 6;
    private static final double STOREY = 3.5;
    private static final double COLUMN = 0.4;
    private static final int WIDTH = 1280;
    private static final int HEIGHT = 800;
    private static final int WARM_UP = 60;
    private static final int FRAMES = 121;

    /**
     * @param members the count of members drawn
     * @param median  milliseconds per frame, median
     * @param slowest milliseconds per frame, exceeded by one frame in twenty
     * @param strips  threads used
     * @param walking whether the camera moved
     */
    public record Result(int members, double median, double slowest, int strips, boolean walking) {

        @Override
        public String toString() {
            return String.format(Locale.ROOT, "%,9d members  %7.2f ms a frame (median)  %7.2f ms (19 of 20 below)  %d thread%s, %s",
                members, median, slowest, strips, strips == 1 ? "" : "s", walking ? "camera walking" : "camera still");
        }
    }

    private FrameBenchmark() {
    }

    /** Prints one line for each of 2,000, 20,000 and 100,000 members, on one thread and on two, with the camera still and walking. */
    public static void main(String[] arguments) {
        for (Result result : measureAll()) {
            System.out.println(result);
        }
    }

    /** All twelve measurements that {@link #main} prints. */
    public static List<Result> measureAll() {
        List<Result> results = new ArrayList<>();
        for (int strips = 1; strips <= 2; strips++) {
            for (int members : new int[] {2_000, 20_000, 100_000}) {
                results.add(measure(members, strips, false));
                results.add(measure(members, strips, true));
            }
        }
        return results;
    }

    /**
     * Draws frames of {@value #WIDTH} x {@value #HEIGHT} pixels.
     *
     * @param wanted  about how many members; the grid is the smallest that has as many
     * @param strips  threads to use
     * @param walking whether the camera walks round the structure meanwhile
     */
    public static Result measure(int wanted, int strips, boolean walking) {
        Grid grid = Grid.with(wanted);
        Scene scene = grid.scene();
        Deformation shape = grid.shape(scene);
        Bounds bounds = scene.bounds();
        Camera camera = Camera.standard(StandardView.AXONOMETRIC, bounds, WIDTH, HEIGHT);
        double full = 0.05 * bounds.diagonal() / shape.largest();
        RenderOptions options = new RenderOptions().strips(strips);
        Raster raster = new Raster(WIDTH, HEIGHT);
        SceneRenderer renderer = new SceneRenderer();
        double[] milliseconds = new double[FRAMES];
        for (int i = -WARM_UP; i < FRAMES; i++) {
            long start = System.nanoTime();
            renderer.render(scene, walking ? camera.orbit(0.01 * i, 0) : camera, shape, full * Math.sin(0.2 * i), options, raster);
            if (i >= 0) {
                milliseconds[i] = (System.nanoTime() - start) / 1e6;
            }
        }
        Arrays.sort(milliseconds);
        return new Result(scene.memberCount(), milliseconds[FRAMES / 2], milliseconds[FRAMES * 19 / 20], strips, walking);
    }

    /** A grid of bays in plan and storeys in height. */
    private record Grid(int bays, int storeys) {

        static Grid with(int members) {
            int size = 1;
            while (new Grid(size, size + 2).members() < members) {
                size++;
            }
            return new Grid(size, size + 2);
        }

        int members() {
            int lines = bays + 1;
            return storeys * (lines * lines + 2 * bays * lines);
        }

        Scene scene() {
            SceneBuilder builder = Scene.builder();
            int lines = bays + 1;
            for (int level = 0; level <= storeys; level++) {
                for (int i = 0; i < lines * lines; i++) {
                    node(builder, i % lines * BAY, i / lines * BAY, level);
                }
            }
            return builder.build();
        }

        private void node(SceneBuilder builder, double x, double y, int level) {
            double z = level * STOREY;
            int vertex = builder.vertex(x, y, z);
            if (level == 0) {
                builder.marker(vertex, vertex, MarkerShape.PINNED);
                return;
            }
            builder.marker(vertex, vertex, MarkerShape.NODE);
            member(builder, x, y, z - STOREY, x, y, z);
            if (x < bays * BAY) {
                member(builder, x, y, z, x + BAY, y, z);
            }
            if (y < bays * BAY) {
                member(builder, x, y, z, x, y + BAY, z);
            }
        }

        private static void member(SceneBuilder builder, double x0, double y0, double z0, double x1, double y1, double z1) {
            double[] localY = {y1 > y0 ? -1 : 0, y1 > y0 ? 0 : 1, 0};
            builder.member(0, x0, y0, z0, x1, y1, z1, SEGMENTS, localY, COLUMN, COLUMN);
        }

        Deformation shape(Scene scene) {
            Deformation shape = new Deformation(scene);
            double[] ends = new double[12];
            for (int member = 0; member < scene.memberCount(); member++) {
                int first = scene.firstVertex(member);
                movement(scene.vertex(first), ends, 0);
                movement(scene.vertex(first + SEGMENTS), ends, 6);
                shape.member(member, ends);
            }
            return shape;
        }

        /** A sway that grows with the square of the height, with a twist about the corner. */
        private void movement(double[] at, double[] ends, int from) {
            double height = storeys * STOREY;
            double sway = at[2] * at[2] / (height * height);
            ends[from] = sway * (1 - 0.01 * at[1]);
            ends[from + 1] = 0.01 * sway * at[0];
            ends[from + 3] = -0.002 * at[2] / height;
            ends[from + 4] = 0.004 * at[2] / height;
            ends[from + 5] = 0.01 * sway;
        }
    }
}
