package org.modewright.render;

/** What the painters of one frame share: scene, projection, options and what follows from them. */
final class Frame {

    private static final int SAMPLE = 200;

    final ProjectedScene deformed = new ProjectedScene();
    final ProjectedScene ghost = new ProjectedScene();

    Scene scene;
    Projection projection;
    RenderOptions options;
    Theme theme;
    boolean ghostShown;
    private boolean ghostProjected;
    int background;
    boolean atRest;
    final Backdrop backdrop = new Backdrop();
    /** How far a node's sign is lifted out of the members that meet in it, model units. */
    double bodyThickness;
    /** Depth of two pixels in the target's plane: what a member may bend towards the viewer and still pass as straight. */
    float flatDepth;
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
        boolean kept = ghostShown && backdrop.begin(new Backdrop.Key(newScene, newScene.version(), camera, theme, newOptions.lineWidth(),
            newOptions.scale(), target.width(), target.height()));
        ghostProjected = ghostShown && !kept;
        deformed.begin(newScene, projection, deformation, factor);
        if (ghostProjected) {
            ghost.begin(newScene, projection, null, 0);
        }
        atRest = deformation == null || factor == 0;
        flatDepth = (float) (2 * projection.pixelSize());
        measureMembers();
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
        if (ghostProjected) {
            ghost.transform(from, to);
        }
    }

    /** The theme's member colour, fading with distance. */
    int faded(float depth) {
        return fading[distance(depth)];
    }

    /** A colour that fades with distance half as much as lines do. */
    int faded(int argb, float depth) {
        return Argb.mix(argb, background, options.depthCue() * distance(depth) / 512.0);
    }

    private int distance(float depth) {
        return (int) (256 * Math.max(0, Math.min(1, (depth - nearDepth) / depthRange)));
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

    /** Typical sizes from at most {@value #SAMPLE} members, evenly picked. */
    private void measureMembers() {
        int count = Math.min(scene.memberCount(), SAMPLE);
        double length = 0;
        double thickness = 0;
        int found = 0;
        for (int i = 0; i < count; i++) {
            int member = (int) ((long) scene.memberCount() * i / count);
            if (scene.id(PrimitiveKind.MEMBER, member) >= 0) {
                length += length(member);
                thickness = Math.max(thickness, Math.min(scene.sizeY[member], scene.sizeZ[member]));
                found++;
            }
        }
        memberLength = length > 0 ? length / found : scene.bounds().diagonal() / 10;
        bodyThickness = options.thickness() == Thickness.LINES ? 0 : thickness;
    }

    private double length(int member) {
        double[] a = scene.vertex(scene.firstVertex(member));
        double[] b = scene.vertex(scene.firstVertex(member) + scene.segments(member));
        return Math.sqrt((a[0] - b[0]) * (a[0] - b[0]) + (a[1] - b[1]) * (a[1] - b[1]) + (a[2] - b[2]) * (a[2] - b[2]));
    }
}
