package org.modewright.render;

/**
 * A camera applied to a picture of given size: model coordinates to pixels and depth, and back.
 *
 * <p>With r, u, f the camera's right, up and forward axes and p the vector from the target to a point, w = 1 (orthographic) or 1 + f·p / D
 * (perspective, D the viewer's distance): screen x = W/2 + s r·p / w and y = H/2 - s u·p / w, where s is pixels per length at the target.
 * Depth is f·p (orthographic) or -D / w (perspective); both are affine in the picture's plane, so that depth may be interpolated linearly
 * there.
 */
public final class Projection {

    /** Nearest visible w: points nearer than 2 % of the viewer's distance are cut off. */
    private static final double NEAREST = 0.02;

    private final int width;
    private final int height;
    private final double[] target;
    private final double[] right;
    private final double[] up;
    private final double[] forward;
    private final double scale;
    private final double distance;

    Projection(Camera camera, int width, int height) {
        this.width = width;
        this.height = height;
        target = camera.target();
        double ca = Math.cos(camera.azimuth());
        double sa = Math.sin(camera.azimuth());
        double ce = Math.cos(camera.elevation());
        double se = Math.sin(camera.elevation());
        right = new double[] {ca, sa, 0};
        up = new double[] {-sa * se, ca * se, ce};
        forward = new double[] {-sa * ce, ca * ce, -se};
        scale = height / camera.height();
        distance = camera.fieldOfView() == 0 ? Double.POSITIVE_INFINITY : camera.height() / 2 / Math.tan(camera.fieldOfView() / 2);
    }

    /**
     * @param out screen x, screen y, depth
     * @return false if the point lies behind the near plane; {@code out} is then not set
     */
    public boolean project(double x, double y, double z, double[] out) {
        double px = x - target[0];
        double py = y - target[1];
        double pz = z - target[2];
        double behind = dot(forward, px, py, pz);
        double w = 1 + behind / distance;
        if (w < NEAREST) {
            return false;
        }
        out[0] = width / 2.0 + scale * dot(right, px, py, pz) / w;
        out[1] = height / 2.0 - scale * dot(up, px, py, pz) / w;
        out[2] = perspective() ? -distance / w : behind;
        return true;
    }

    /** The model point shown at a place of the picture at a given depth. */
    public double[] unproject(double sx, double sy, double depth) {
        double w = perspective() ? -distance / depth : 1;
        double behind = perspective() ? (w - 1) * distance : depth;
        double across = (sx - width / 2.0) * w / scale;
        double upwards = (height / 2.0 - sy) * w / scale;
        double[] point = new double[3];
        for (int i = 0; i < 3; i++) {
            point[i] = target[i] + across * right[i] + upwards * up[i] + behind * forward[i];
        }
        return point;
    }

    /** The depth of the plane through the target, square to the view. */
    public double targetDepth() {
        return perspective() ? -distance : 0;
    }

    /** Depth of a point a length behind the target's plane; taken to the near plane if it lies before that. */
    double depthBehindTarget(double length) {
        return perspective() ? -distance / Math.max(NEAREST, 1 + length / distance) : length;
    }

    double alongRight(double x, double y, double z) {
        return dot(right, x, y, z);
    }

    double alongUp(double x, double y, double z) {
        return dot(up, x, y, z);
    }

    double alongForward(double x, double y, double z) {
        return dot(forward, x, y, z);
    }

    double[] target() {
        return target.clone();
    }

    /** Model length of one pixel at the target. */
    public double pixelSize() {
        return 1 / scale;
    }

    public boolean perspective() {
        return distance != Double.POSITIVE_INFINITY;
    }

    public int width() {
        return width;
    }

    public int height() {
        return height;
    }

    /** Unit vector to the right of the picture. */
    public double[] right() {
        return right.clone();
    }

    /** Unit vector to the top of the picture. */
    public double[] up() {
        return up.clone();
    }

    /** Unit vector into the picture. */
    public double[] forward() {
        return forward.clone();
    }

    /** Pixels per model length at a depth. */
    double pixelsPerLength(double depth) {
        return perspective() ? scale * -depth / distance : scale;
    }

    /** How much the depth grows per model length away from the viewer, at a depth. */
    double depthPerLength(double depth) {
        return perspective() ? depth * depth / (distance * distance) : 1;
    }

    double nearest() {
        return NEAREST;
    }

    /** w of a point, see the class comment; 1 when orthographic. */
    double w(double x, double y, double z) {
        return 1 + dot(forward, x - target[0], y - target[1], z - target[2]) / distance;
    }

    /**
     * Rows that turn a point relative to an origin into (screen x - W/2) w, (H/2 - screen y) w and f·p:
     * each row holds three factors and a constant.
     */
    double[] rows(double[] origin) {
        double[] rows = new double[12];
        double ox = origin[0] - target[0];
        double oy = origin[1] - target[1];
        double oz = origin[2] - target[2];
        for (int i = 0; i < 3; i++) {
            rows[i] = scale * right[i];
            rows[4 + i] = scale * up[i];
            rows[8 + i] = forward[i];
        }
        rows[3] = scale * dot(right, ox, oy, oz);
        rows[7] = scale * dot(up, ox, oy, oz);
        rows[11] = dot(forward, ox, oy, oz);
        return rows;
    }

    double distance() {
        return distance;
    }

    private static double dot(double[] a, double x, double y, double z) {
        return a[0] * x + a[1] * y + a[2] * z;
    }
}
