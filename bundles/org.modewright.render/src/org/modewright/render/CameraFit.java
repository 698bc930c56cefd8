package org.modewright.render;

/**
 * Finds the nearest camera of a given direction that sees a whole box.
 *
 * <p>A corner at (r, d) right of and behind the target is seen if |r - r0| &lt;= H + t d, where r0 is the target's shift, H the half
 * width at the target and t = tan(half the angle of view). So H &gt;= (max(r - t d) - min(r + t d)) / 2 and r0 is the mean of both
 * extremes; likewise upwards.
 */
final class CameraFit {

    private CameraFit() {
    }

    static Camera fit(Camera camera, Bounds b, double aspect, double margin) {
        double[] centre = b.centre();
        Camera start = new Camera(centre, camera.azimuth(), camera.elevation(), camera.height(), camera.fieldOfView());
        Projection view = start.projection(1, 1);
        double inside = 1 - 2 * margin;
        double tangent = Math.tan(camera.fieldOfView() / 2) * inside;
        double[] across = extremes(b, centre, view.right(), view.forward(), tangent * aspect);
        double[] upwards = extremes(b, centre, view.up(), view.forward(), tangent);
        double halfHeight = Math.max((across[1] - across[0]) / 2 / aspect, (upwards[1] - upwards[0]) / 2) / inside;
        if (!(halfHeight > 0)) {
            halfHeight = 1;
        }
        Camera sized = new Camera(centre, camera.azimuth(), camera.elevation(), 2 * halfHeight, camera.fieldOfView());
        return sized.moved(view, (across[0] + across[1]) / 2, (upwards[0] + upwards[1]) / 2);
    }

    private static double[] extremes(Bounds b, double[] centre, double[] axis, double[] forward, double tangent) {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int corner = 0; corner < 8; corner++) {
            double x = ((corner & 1) == 0 ? b.minX() : b.maxX()) - centre[0];
            double y = ((corner & 2) == 0 ? b.minY() : b.maxY()) - centre[1];
            double z = ((corner & 4) == 0 ? b.minZ() : b.maxZ()) - centre[2];
            double along = x * axis[0] + y * axis[1] + z * axis[2];
            double behind = x * forward[0] + y * forward[1] + z * forward[2];
            high = Math.max(high, along - tangent * behind);
            low = Math.min(low, along + tangent * behind);
        }
        return new double[] {low, high};
    }
}
