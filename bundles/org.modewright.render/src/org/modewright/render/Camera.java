package org.modewright.render;

/**
 * Where the viewer stands: a turntable camera that keeps Z upright. Immutable; every act returns another camera.
 *
 * <p>The camera looks at a target from an azimuth and an elevation (see {@link StandardView} for the signs); {@link #height()} is the
 * model length that fills the picture's height in the plane through the target. With a field of view of 0 the projection is
 * orthographic; otherwise the viewer stands at the distance height / (2 tan(field of view / 2)) from the target.
 */
public final class Camera {

    /** A mild perspective, radians. */
    public static final double MILD = Math.toRadians(22);

    private static final double RADIANS_PER_PIXEL = Math.toRadians(0.4);
    private static final double FIT_MARGIN = 0.1;

    private final double targetX;
    private final double targetY;
    private final double targetZ;
    private final double azimuth;
    private final double elevation;
    private final double height;
    private final double fieldOfView;

    /**
     * @param target      the point looked at, x, y, z in model coordinates
     * @param azimuth     radians
     * @param elevation   radians, kept within a quarter turn up or down
     * @param height      model length over the picture's height at the target, positive
     * @param fieldOfView vertical angle of view in radians, 0 for orthographic, below 2.5
     */
    public Camera(double[] target, double azimuth, double elevation, double height, double fieldOfView) {
        if (!(height > 0) || Double.isInfinite(height)) {
            throw new IllegalArgumentException("The camera's height must be a positive length, not " + height + ".");
        }
        if (!(fieldOfView >= 0 && fieldOfView < 2.5)) {
            throw new IllegalArgumentException("The field of view must be 0 to 2.5 radians, not " + fieldOfView + ".");
        }
        targetX = target[0];
        targetY = target[1];
        targetZ = target[2];
        this.azimuth = Math.IEEEremainder(azimuth, 2 * Math.PI);
        this.elevation = Math.max(-Math.PI / 2, Math.min(Math.PI / 2, elevation));
        this.height = height;
        this.fieldOfView = fieldOfView;
    }

    /** A standard view that shows the whole box, orthographic. */
    public static Camera standard(StandardView view, Bounds bounds, int width, int height) {
        Camera camera = new Camera(bounds.centre(), view.azimuth(), view.elevation(), 1, 0);
        return camera.fit(bounds, width, height);
    }

    public double[] target() {
        return new double[] {targetX, targetY, targetZ};
    }

    public double azimuth() {
        return azimuth;
    }

    public double elevation() {
        return elevation;
    }

    public double height() {
        return height;
    }

    public double fieldOfView() {
        return fieldOfView;
    }

    /** Walks the viewer round the target, angles in radians. */
    public Camera orbit(double azimuthStep, double elevationStep) {
        return new Camera(target(), azimuth + azimuthStep, elevation + elevationStep, height, fieldOfView);
    }

    /** Orbits by a drag of the mouse: the structure follows the pointer. */
    public Camera orbitPixels(double dx, double dy) {
        return orbit(-dx * RADIANS_PER_PIXEL, dy * RADIANS_PER_PIXEL);
    }

    /** Moves the picture by pixels: what lies in the target's plane follows the pointer. */
    public Camera pan(double dxPixels, double dyPixels, int width, int heightPixels) {
        Projection view = projection(width, heightPixels);
        return moved(view, -dxPixels * view.pixelSize(), dyPixels * view.pixelSize());
    }

    /**
     * Zooms so that the point of the target's plane under the pointer stays there.
     *
     * @param factor above 1 shows the structure larger
     */
    public Camera zoomAt(double factor, double px, double py, int width, int heightPixels) {
        Projection view = projection(width, heightPixels);
        double keep = 1 - 1 / factor;
        double right = (px - width / 2.0) * view.pixelSize();
        double up = (heightPixels / 2.0 - py) * view.pixelSize();
        Camera shifted = moved(view, right * keep, up * keep);
        return new Camera(shifted.target(), azimuth, elevation, height / factor, fieldOfView);
    }

    /** The same direction, moved so that the whole box is seen with a margin of a tenth of the picture on each side. */
    public Camera fit(Bounds bounds, int width, int heightPixels) {
        return CameraFit.fit(this, bounds, width / (double) heightPixels, FIT_MARGIN);
    }

    /** The same target and size, seen in a standard direction. */
    public Camera view(StandardView view) {
        return new Camera(target(), view.azimuth(), view.elevation(), height, fieldOfView);
    }

    public Camera withPerspective(double newFieldOfView) {
        return new Camera(target(), azimuth, elevation, height, newFieldOfView);
    }

    /**
     * A camera between this one and another, for a smooth change of view: angles by the shorter way, size in equal ratios, eased at both
     * ends (3t² - 2t³).
     *
     * @param t 0 gives this camera, 1 the other
     */
    public Camera towards(Camera other, double t) {
        if (t <= 0) {
            return this;
        }
        if (t >= 1) {
            return other;
        }
        double s = t * t * (3 - 2 * t);
        double[] point = {
            targetX + s * (other.targetX - targetX), targetY + s * (other.targetY - targetY), targetZ + s * (other.targetZ - targetZ)};
        double turn = Math.IEEEremainder(other.azimuth - azimuth, 2 * Math.PI);
        return new Camera(point, azimuth + s * turn, elevation + s * (other.elevation - elevation),
            height * Math.pow(other.height / height, s), fieldOfView + s * (other.fieldOfView - fieldOfView));
    }

    public Projection projection(int width, int heightPixels) {
        return new Projection(this, width, heightPixels);
    }

    Camera moved(Projection view, double right, double up) {
        double[] r = view.right();
        double[] u = view.up();
        double[] point = {
            targetX + right * r[0] + up * u[0], targetY + right * r[1] + up * u[1], targetZ + right * r[2] + up * u[2]};
        return new Camera(point, azimuth, elevation, height, fieldOfView);
    }
}
