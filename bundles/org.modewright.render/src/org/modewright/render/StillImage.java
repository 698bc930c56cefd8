package org.modewright.render;

/** Draws single pictures of high quality, for files and reports. */
public final class StillImage {

    private StillImage() {
    }

    /** The scene at the given size, drawn at double size and averaged down. */
    public static Raster render(Scene scene, Camera camera, Deformation deformation, double factor, RenderOptions options,
        int width, int height) {
        Raster large = new Raster(2 * width, 2 * height);
        RenderOptions doubled = options.copy().scale(2 * options.scale());
        new SceneRenderer().render(scene, camera, deformation, factor, doubled, large);
        return large.halved();
    }
}
