package org.modewright.render;

/** What the painters of one frame share: scene, projection, options and what follows from them. */
final class Frame {

    final ProjectedScene deformed = new ProjectedScene();
    final ProjectedScene ghost = new ProjectedScene();

    Scene scene;
    Projection projection;
    RenderOptions options;
    Theme theme;
    boolean ghostShown;
    int background;
    /** Typical length of a member in model units: signs at nodes are kept small against it. */
    double memberLength;

    private double nearDepth;
    private double depthRange;
    private final int[] fading = new int[257];

    void begin(Scene newScene, Camera camera, Deformation deformation, double factor, RenderOptions newOptions, Raster target) {
        scene = newScene;
        options = newOptions;
        theme = newOptions.theme();
        background = theme.backgroundMiddle();
        projection = camera.projection(target.width(), target.height());
        ghostShown = newOptions.ghost() && deformation != null;
        deformed.begin(newScene, projection, deformation, factor);
        if (ghostShown) {
            ghost.begin(newScene, projection, null, 0);
        }
        memberLength = typicalLength();
        measureDepth();
        for (int i = 0; i < fading.length; i++) {
            fading[i] = Argb.mix(theme.member(), background, options.depthCue() * i / 256.0);
        }
    }

    /** Projects a share of the vertices. */
    void transform(int part, int parts) {
        int count = scene.vertexCount();
        int from = (int) ((long) count * part / parts);
        int to = (int) ((long) count * (part + 1) / parts);
        deformed.transform(from, to);
        if (ghostShown) {
            ghost.transform(from, to);
        }
    }

    /** The theme's member colour, fading with distance. */
    int faded(float depth) {
        double share = (depth - nearDepth) / depthRange;
        return fading[(int) (256 * Math.max(0, Math.min(1, share)))];
    }

    /** Pixels on the drawing surface for pixels at scale 1. */
    double pixels(double atScaleOne) {
        return atScaleOne * options.scale();
    }

    /** A depth a little nearer to the viewer than the given one, by pixels at that place. */
    float nearer(float depth, double pixels) {
        return (float) (depth - pixels / projection.pixelsPerLength(depth) * projection.depthPerLength(depth));
    }

    private void measureDepth() {
        Bounds b = scene.bounds();
        double[] c = b.centre();
        double[] f = projection.forward();
        double[] t = projection.target();
        double reach = Math.abs(f[0]) * (b.maxX() - b.minX()) / 2 + Math.abs(f[1]) * (b.maxY() - b.minY()) / 2
            + Math.abs(f[2]) * (b.maxZ() - b.minZ()) / 2;
        double middle = f[0] * (c[0] - t[0]) + f[1] * (c[1] - t[1]) + f[2] * (c[2] - t[2]);
        nearDepth = projection.depthBehindTarget(middle - reach);
        depthRange = Math.max(1e-9, projection.depthBehindTarget(middle + reach) - nearDepth);
    }

    private double typicalLength() {
        int count = Math.min(scene.memberCount(), 200);
        double sum = 0;
        int found = 0;
        for (int i = 0; i < count; i++) {
            int member = (int) ((long) scene.memberCount() * i / count);
            double[] a = scene.vertex(scene.firstVertex(member));
            double[] b = scene.vertex(scene.firstVertex(member) + scene.segments(member));
            double length = Math.sqrt((a[0] - b[0]) * (a[0] - b[0]) + (a[1] - b[1]) * (a[1] - b[1]) + (a[2] - b[2]) * (a[2] - b[2]));
            if (scene.sizeY[member] > 0 || scene.id(PrimitiveKind.MEMBER, member) >= 0) {
                sum += length;
                found++;
            }
        }
        return found > 0 && sum > 0 ? sum / found : scene.bounds().diagonal() / 10;
    }
}
